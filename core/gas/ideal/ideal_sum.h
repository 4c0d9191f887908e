#pragma once
// The ideal part of a mixture whose components' ideal parts were published in different forms.

#include "core/gas/ideal/ideal_function.h"

#include <memory>
#include <span>
#include <vector>

namespace quasistat::gas
{

/// Σ xᵢ of the components' functions; `weights` xᵢ > 0, one for each. All polynomials among them become one.
[[nodiscard]] std::shared_ptr<const IdealFunction>
idealSum(const std::vector<std::shared_ptr<const IdealFunction>> &components, std::span<const double> weights);

} // namespace quasistat::gas
