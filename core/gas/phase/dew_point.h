#pragma once
// What is said where a gas would condense that its model follows no further.

#include "core/gas/gas.h"

namespace quasistat::gas
{

/// The dew point at T [K] as near as the boundary is interpolated: v and p where the first liquid forms; none where the
/// boundary is not met from the thin side. `gas` must have a boundary.
[[nodiscard]] std::optional<MolarState> dewPointNear(const Gas &gas, double temperature);

/// Reason::condenses, naming the dew point at the state's temperature.
[[nodiscard]] Failure condenses(const Gas &gas, const MolarState &state);

} // namespace quasistat::gas
