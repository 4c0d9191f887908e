#pragma once
// The equilibrium state from two properties by bracketing: slower than Newton in both unknowns, and always right.

#include "core/gas/solve/given.h"

namespace quasistat::gas
{

/// For a real gas. Every search runs along one property on which the other grows: T at constant v or p, v at constant T
/// or s, with the lever rule between the saturated phases. Reaches pairs of T, p, v with each other and with u, h, s,
/// and s with u or h; none where the equilibrium surface has no such state between the lowest temperature of the model
/// and twice its highest.
[[nodiscard]] std::optional<MolarState> equilibriumState(const Gas &gas, Given first, Given second);

} // namespace quasistat::gas
