#pragma once
// Where a dragged end comes to lie: the point of a segment's own law nearest to a place on the p–V plane.

#include "core/path/input.h"
#include "core/path/result.h"

#include <span>

namespace quasistat::path
{

/// Metric of the canvas: pixels per unit of V and p, or per unit of ln V and ln p on a logarithmic axis.
struct PlaneMetric {
    double volumeScale;
    double pressureScale;
    bool logVolume = false;
    bool logPressure = false;
};

struct SlidePoint {
    double volume;      ///< [m³]
    double pressure;    ///< [Pa]
    double temperature; ///< [K]
    double entropy;     ///< [J/K]
};

/// A place on the p–V plane.
struct Place {
    double volume;   ///< [m³]
    double pressure; ///< [Pa]
};

/// The point where `segment` would end if its end followed the pointer at `place`, along its curve both ways. `states`:
/// those up to and including the segment's start. Kinds: along the law; constant external pressure along its level up
/// to balance; stepped and free expansion at the pointer's pressure and volume; polytropic without exponent and linear
/// without stiffness anywhere. Fails where there is no such point (the law leaves the model).
[[nodiscard]] Outcome<SlidePoint> nearestEnd(std::span<const StateResult> states, const Segment &segment,
                                             const Place &place, const PlaneMetric &metric);

/// `point` as a value of `key` for a segment that starts in `from` and has got there [SI]. For work and heat the caller
/// evaluates the segment with another key and reads them off.
[[nodiscard]] std::optional<double> endValueAt(const gas::State &from, const SlidePoint &point, EndKey key);

} // namespace quasistat::path
