#pragma once
// Real gases from their published data.

#include "core/gas/library/gas_files.h"
#include "core/gas/library/gerg_2008.h"

namespace quasistat::gas
{

/// The gas of a reference equation: saturation and two-phase states included, but for a pseudo-pure fluid, which ends
/// at its dew line. `data.reference` must be there.
[[nodiscard]] GasPtr referenceGas(const GasData &data);

/// What GERG-2008 says of itself besides its terms.
struct GergFacts {
    double gasConstant;
    Validity validity;
    std::string source;
};
/// A mixture by GERG-2008. `composition` in the order of `mixture.components`.
[[nodiscard]] GasPtr gergGas(const GergMixture &mixture, const Composition &composition, const GergFacts &facts,
                             std::string name);

} // namespace quasistat::gas
