#pragma once
// Real gases from their published data.

#include "core/gas/library/gas_files.h"
#include "core/gas/library/gerg_2008.h"

namespace quasistat::gas
{

/// The gas of a reference equation: saturation and two-phase states included, but for a pseudo-pure fluid, which ends
/// at its dew line. `data.reference` must be there.
[[nodiscard]] GasPtr referenceGas(const GasData &data);

/// A mixture by GERG-2008, to its dew line. `composition` in the order of `mixture.components`; `critical`: constants
/// of each, for the first guesses of the dew line.
[[nodiscard]] GasPtr gergGas(const GergMixture &mixture, const Composition &composition,
                             const std::vector<CriticalConstants> &critical, std::string name);

} // namespace quasistat::gas
