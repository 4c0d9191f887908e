#pragma once
// Lines and areas in pixels: cut to a rectangle, measured, hatched. Pure functions; every output format draws their
// result alike, because none of it relies on the painter's clipping or brushes.

#include <QLineF>
#include <QList>
#include <QPolygonF>
#include <QRectF>

namespace quasistat::ui
{

/// `line` with as few of its points as keep it within a tenth of a pixel: what no eye can tell, and much faster to
/// draw.
[[nodiscard]] QPolygonF thinned(const QPolygonF &line);

/// A point deep inside `area`: far from its edges, on a grid of `step` pixels; the middle of its extent if none is
/// inside.
[[nodiscard]] QPointF deepestPoint(const QPolygonF &area, double step);

/// The pieces of `line` inside `rect`.
[[nodiscard]] QList<QPolygonF> clippedLine(const QPolygonF &line, const QRectF &rect);
/// The part of the area inside `rect` (Sutherland–Hodgman; a concave area may keep edges along the rectangle).
[[nodiscard]] QPolygonF clippedArea(const QPolygonF &area, const QRectF &rect);

[[nodiscard]] double lengthOf(const QPolygonF &line);

struct PointOnLine {
    QPointF point;
    QPointF direction; ///< of unit length
};
/// The point `distance` pixels along `line`; its end beyond it. Precondition: two points that differ.
[[nodiscard]] PointOnLine pointAlong(const QPolygonF &line, double distance);
/// The part of `line` between two distances along it.
[[nodiscard]] QPolygonF part(const QPolygonF &line, double from, double to);

/// Distance of `point` to the nearest place on `line` [px]; infinity for a line of no points.
[[nodiscard]] double distanceTo(const QPolygonF &line, QPointF point);

/// Lines at 45° (rising to the right), `pitch` pixels apart, inside `area` (odd–even); in place on the page, so that
/// the hatches of neighbours join.
[[nodiscard]] QList<QLineF> hatchLines(const QPolygonF &area, double pitch);
/// Level lines inside `area`, `pitch` pixels apart, that begin on a multiple of `pitch`: drawn dotted they fill it with
/// dots.
[[nodiscard]] QList<QLineF> dotRows(const QPolygonF &area, double pitch);

} // namespace quasistat::ui
