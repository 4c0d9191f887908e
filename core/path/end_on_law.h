#pragma once
// Where along its law a segment reaches the end that was asked for.

#include "core/path/quasi_static_curve.h"
#include "core/path/segment.h"

namespace quasistat::path
{

struct EndPoint {
    double coordinate; ///< x of QuasiStaticCurve
    gas::MolarState state;
    std::vector<Message> remarks; ///< other solutions further on
};

/// The first point of `law` from `from` on where `key` has `value` [SI, whole charge; ratios to the start]. `direction`
/// chooses where both ways reach it. Fails with Reason::unreachable (saying what can be reached), ambiguous,
/// undetermined, outsideModel.
[[nodiscard]] Outcome<EndPoint> endOnLaw(const gas::State &from, const Law &law, EndKey key, double value,
                                         std::optional<Direction> direction);

/// "the gas cannot reach 2 bar on this segment: why".
[[nodiscard]] Failure unreachable(EndKey key, double value, const Message &why);

/// Coordinates beyond this (26 decades of volume) are taken for infinity.
inline constexpr double farthestCoordinate = 60.0;

} // namespace quasistat::path
