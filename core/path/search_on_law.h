#pragma once
// A search along a law, both ways from its start, for the first point where a function of the state has a given value.

#include "core/path/end_on_law.h"

#include <functional>

namespace quasistat::path
{

/// A figure that is zero at the start or not, and continuous along the curve [any unit].
using AlongCurve = std::function<double(const CurveState &)>;

/// First point where `figure` = `value`. The march stops where the law leaves the model or at farthestCoordinate; a
/// target never met fails with Reason::unreachable and the range of values met, one met both ways without `direction`
/// with Reason::ambiguous.
[[nodiscard]] Outcome<EndPoint> searchOnLaw(const gas::State &from, const Law &law, EndKey key, double value,
                                            const AlongCurve &figure, std::optional<Direction> direction);

} // namespace quasistat::path
