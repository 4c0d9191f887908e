#include "ui/canvas/plane.h"

namespace quasistat::ui
{
namespace
{

double span(const path::Interval &interval)
{
    return interval.highest - interval.lowest;
}

} // namespace

QPointF Plane::pixel(double volume, double pressure) const
{
    return {rect.left() + (volume - view.volume.lowest) / span(view.volume) * rect.width(),
            rect.bottom() - (pressure - view.pressure.lowest) / span(view.pressure) * rect.height()};
}

QPolygonF Plane::pixels(const path::Polyline &line) const
{
    QPolygonF result;
    result.reserve(static_cast<qsizetype>(line.size()));
    for (const auto &point : line) result.append(pixel(point));
    return result;
}

double Plane::volumeAt(double x) const
{
    return view.volume.lowest + (x - rect.left()) / rect.width() * span(view.volume);
}

double Plane::pressureAt(double y) const
{
    return view.pressure.lowest + (rect.bottom() - y) / rect.height() * span(view.pressure);
}

path::PlaneMetric Plane::metric() const
{
    return {.volumeScale = rect.width() / span(view.volume), .pressureScale = rect.height() / span(view.pressure)};
}

} // namespace quasistat::ui
