#pragma once
// The ideal part of a multiparameter equation as an ideal-gas heat capacity with its integrals.

#include "core/gas/equation/terms.h"
#include "core/gas/ideal/ideal_function.h"

#include <memory>

namespace quasistat::gas
{

/// From α⁰ as published: h/(R T) = 1 + τ α⁰_τ, c_p/R = 1 − τ² α⁰_ττ, s°/R = τ α⁰_τ − α⁰ at 100 kPa. The equation's own
/// zeros of h and s are replaced by the common reference state: both are zero at 298.15 K.
[[nodiscard]] std::shared_ptr<const IdealFunction> helmholtzIdeal(const IdealTerms &terms);

} // namespace quasistat::gas
