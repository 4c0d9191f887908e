#pragma once
// Where a dragged end comes to lie: the point of a segment's own law nearest to a place on the p–V plane.

#include "core/path/input.h"
#include "core/path/result.h"

namespace quasistat::path {

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

/// The point where `segment`, starting in `from`, would end if its end followed the pointer at (volume, pressure), along
/// the curve both ways. Kinds: along the law; constant external pressure along its level up to balance; stepped along
/// the balance states; free expansion along its states (larger volumes only); linear without stiffness anywhere.
[[nodiscard]] Outcome<SlidePoint> nearestEnd(const gas::State &from, const Segment &segment, double volume, double pressure,
                                             const PlaneMetric &metric);

/// `point` as a value of `key` for a segment that starts in `from` and has got there [SI]. For work and heat the caller
/// evaluates the segment with another key and reads them off.
[[nodiscard]] std::optional<double> endValueAt(const gas::State &from, const SlidePoint &point, EndKey key);

} // namespace quasistat::path
