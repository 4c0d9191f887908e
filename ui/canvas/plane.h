#pragma once
// From pressure and volume to pixels and back, and the part of the p–V plane that is shown.

#include "core/path/result.h"
#include "core/path/slide.h"

#include <QPolygonF>
#include <QRectF>

namespace quasistat::ui
{

/// The part of the plane that is shown [m³, Pa].
struct View {
    path::Interval volume{0.0, 1e-3};
    path::Interval pressure{0.0, 1e5};
};

/// A view laid over a rectangle of the screen; volume runs to the right, pressure upwards, both linear.
struct Plane {
    QRectF rect; ///< [px]
    View view;

    [[nodiscard]] QPointF pixel(double volume, double pressure) const;
    [[nodiscard]] QPointF pixel(const path::CurvePoint &point) const { return pixel(point.volume, point.pressure); }
    [[nodiscard]] QPolygonF pixels(const path::Polyline &line) const;
    [[nodiscard]] double volumeAt(double x) const;   ///< [m³]
    [[nodiscard]] double pressureAt(double y) const; ///< [Pa]
    [[nodiscard]] path::PlaneMetric metric() const;
};

} // namespace quasistat::ui
