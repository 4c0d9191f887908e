#pragma once
// The non-analytic terms of the critical region.

#include "core/gas/equation/alpha.h"
#include "core/gas/equation/terms.h"

namespace quasistat::gas
{

/// The term and its scaled derivatives at (τ, δ). At the critical point itself, where the derivatives are singular, the
/// values a relative 1e-10 beside it.
[[nodiscard]] Alpha nonAnalytic(const NonAnalyticTerm &term, double tau, double delta);

/// Adds `b` to `a`.
void add(Alpha &a, const Alpha &b);

} // namespace quasistat::gas
