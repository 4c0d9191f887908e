#pragma once
// What dragging a state means for the design: the end of its segment, in the user's own quantity and unit.

#include "ui/canvas/plane.h"
#include "ui/session/session.h"

namespace quasistat::ui
{

/// A place on the plane that a state is pulled to, on the plane as shown (its resolution sets the digits written).
struct Pull {
    double volume;   ///< [m³]
    double pressure; ///< [Pa]
    Plane plane;
};

/// The design of `before` with state `number` (from 1) dragged as near to the place as the segment that ends there can
/// come. The end keeps its quantity and unit; work, heat, another state or balance become a pressure or volume, with a
/// remark. State 1 changes the pressure and volume that the start gives. Fails where the segment has no such end.
/// Precondition: `before` has an evaluation that reaches the state.
[[nodiscard]] Outcome<document::Edited> stateDragged(const Snapshot &before, int number, const Pull &pull);

} // namespace quasistat::ui
