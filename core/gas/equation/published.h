#pragma once
// Multiparameter equations evaluated as they are written: one term after the other, to be read beside the publication.
// Slow, and the reference that the compiled plan is tested against.

#include "core/gas/equation/alpha.h"
#include "core/gas/equation/terms.h"

namespace quasistat::gas
{

/// α^r and its scaled derivatives at T [K], ρ [mol/m³].
[[nodiscard]] Alpha publishedResidual(const ResidualTerms &terms, double temperature, double density);

} // namespace quasistat::gas
