#include "ui/canvas/pixel_geometry.h"

#include <algorithm>
#include <cmath>
#include <limits>
#include <numbers>
#include <optional>
#include <vector>

namespace quasistat::ui
{
namespace
{

// Liang–Barsky: the part of one straight piece inside the rectangle.
std::optional<QLineF> clipped(const QLineF &line, const QRectF &rect)
{
    double from = 0.0;
    double to = 1.0;
    const auto cut = [&](double step, double room) {
        if (step == 0.0) return room >= 0.0;
        const double at = room / step;
        if (step < 0.0)
            from = std::max(from, at);
        else
            to = std::min(to, at);
        return from <= to;
    };
    const bool inside = cut(-line.dx(), line.x1() - rect.left()) && cut(line.dx(), rect.right() - line.x1()) &&
                        cut(-line.dy(), line.y1() - rect.top()) && cut(line.dy(), rect.bottom() - line.y1());
    if (!inside) return std::nullopt;
    return QLineF(line.pointAt(from), line.pointAt(to));
}

// The part of the area on one side of a level or upright line.
template <class Inside, class Crossing>
QPolygonF halfPlane(const QPolygonF &area, Inside inside, Crossing crossing)
{
    QPolygonF result;
    for (qsizetype i = 0; i < area.size(); ++i) {
        const QPointF here = area.at(i);
        const QPointF before = area.at((i + area.size() - 1) % area.size());
        if (inside(here) != inside(before)) result.append(crossing(before, here));
        if (inside(here)) result.append(here);
    }
    return result;
}

QPointF atX(QPointF a, QPointF b, double x)
{
    return {x, a.y() + (b.y() - a.y()) * (x - a.x()) / (b.x() - a.x())};
}
QPointF atY(QPointF a, QPointF b, double y)
{
    return {a.x() + (b.x() - a.x()) * (y - a.y()) / (b.y() - a.y()), y};
}

double norm(QPointF vector)
{
    return std::hypot(vector.x(), vector.y());
}

// Scan lines across an area: `across` numbers the lines, `along` runs on each; both are linear in x and y.
struct Scan {
    QPointF across; ///< coefficients of x and y
    QPointF along;
};

double product(QPointF a, QPointF b)
{
    return a.x() * b.x() + a.y() * b.y();
}

// For each scan line at a multiple of `pitch`: the places where it enters and leaves the area.
template <class Visit>
void eachSpan(const QPolygonF &area, const Scan &scan, double pitch, Visit visit)
{
    if (area.size() < 3) return;
    double lowest = std::numeric_limits<double>::max();
    double highest = std::numeric_limits<double>::lowest();
    for (const auto &point : area) {
        lowest = std::min(lowest, product(point, scan.across));
        highest = std::max(highest, product(point, scan.across));
    }
    const int first = static_cast<int>(std::ceil(lowest / pitch));
    const int last = static_cast<int>(std::floor(highest / pitch));
    if (last < first) return;
    std::vector<std::vector<double>> crossings(static_cast<std::size_t>(last - first + 1));
    for (qsizetype i = 0; i < area.size(); ++i) {
        QPointF a = area.at(i);
        QPointF b = area.at((i + 1) % area.size());
        if (product(a, scan.across) > product(b, scan.across)) std::swap(a, b);
        const double from = product(a, scan.across) / pitch;
        const double to = product(b, scan.across) / pitch;
        // Half open, so that a corner on a scan line counts once.
        for (int k = std::max(first, static_cast<int>(std::ceil(from))); k < to && k <= last; ++k)
            crossings[static_cast<std::size_t>(k - first)].push_back(
                product(a + (b - a) * ((k - from) / (to - from)), scan.along));
    }
    for (int k = first; k <= last; ++k) {
        auto &places = crossings[static_cast<std::size_t>(k - first)];
        std::sort(places.begin(), places.end());
        for (std::size_t i = 0; i + 1 < places.size(); i += 2) visit(k * pitch, places[i], places[i + 1]);
    }
}

} // namespace

QPolygonF thinned(const QPolygonF &line)
{
    constexpr double tolerance = 0.1;
    if (line.size() < 3) return line;
    // From the last point kept, the directions that pass every later point within the tolerance: a sector that narrows
    // until the next point lies outside it. Linear in the number of points.
    QPolygonF result{line.first()};
    qsizetype from = 0;
    double middle = 0.0;
    double lowest = -std::numbers::pi;
    double highest = std::numbers::pi;
    bool isOpen = true;
    for (qsizetype i = 1; i < line.size(); ++i) {
        QPointF step = line.at(i) - line.at(from);
        if (norm(step) <= tolerance) continue;
        double turn = isOpen ? 0.0 : std::remainder(std::atan2(step.y(), step.x()) - middle, 2.0 * std::numbers::pi);
        if (!isOpen && (turn < lowest || turn > highest)) {
            from = i - 1;
            result.append(line.at(from));
            step = line.at(i) - line.at(from);
            turn = 0.0;
            isOpen = true;
        }
        const double reach = norm(step);
        if (isOpen) {
            middle = std::atan2(step.y(), step.x());
            lowest = -std::numbers::pi;
            highest = std::numbers::pi;
            isOpen = false;
        }
        const double half = reach > tolerance ? std::asin(tolerance / reach) : std::numbers::pi;
        lowest = std::max(lowest, turn - half);
        highest = std::min(highest, turn + half);
    }
    result.append(line.last());
    return result;
}

QPointF deepestPoint(const QPolygonF &area, double step)
{
    QPolygonF outline = area;
    if (!outline.isEmpty()) outline.append(outline.first());
    const QRectF extent = area.boundingRect();
    QPointF best = extent.center();
    double depth = 0.0;
    for (double y = extent.top() + step / 2.0; y < extent.bottom(); y += step)
        for (double x = extent.left() + step / 2.0; x < extent.right(); x += step) {
            const QPointF point(x, y);
            if (!area.containsPoint(point, Qt::OddEvenFill)) continue;
            const double here = distanceTo(outline, point);
            if (here <= depth) continue;
            depth = here;
            best = point;
        }
    return best;
}

QList<QPolygonF> clippedLine(const QPolygonF &line, const QRectF &rect)
{
    QList<QPolygonF> pieces;
    for (qsizetype i = 0; i + 1 < line.size(); ++i) {
        const auto inside = clipped(QLineF(line.at(i), line.at(i + 1)), rect);
        if (!inside) continue;
        if (pieces.isEmpty() || pieces.last().last() != inside->p1()) pieces.append(QPolygonF{inside->p1()});
        if (inside->p2() != inside->p1()) pieces.last().append(inside->p2());
    }
    pieces.removeIf([](const QPolygonF &piece) { return piece.size() < 2; });
    return pieces;
}

QPolygonF clippedArea(const QPolygonF &area, const QRectF &rect)
{
    QPolygonF result = area;
    result = halfPlane(
        result, [&](QPointF p) { return p.x() >= rect.left(); },
        [&](QPointF a, QPointF b) { return atX(a, b, rect.left()); });
    result = halfPlane(
        result, [&](QPointF p) { return p.x() <= rect.right(); },
        [&](QPointF a, QPointF b) { return atX(a, b, rect.right()); });
    result = halfPlane(
        result, [&](QPointF p) { return p.y() >= rect.top(); },
        [&](QPointF a, QPointF b) { return atY(a, b, rect.top()); });
    return halfPlane(
        result, [&](QPointF p) { return p.y() <= rect.bottom(); },
        [&](QPointF a, QPointF b) { return atY(a, b, rect.bottom()); });
}

double lengthOf(const QPolygonF &line)
{
    double length = 0.0;
    for (qsizetype i = 0; i + 1 < line.size(); ++i) length += norm(line.at(i + 1) - line.at(i));
    return length;
}

PointOnLine pointAlong(const QPolygonF &line, double distance)
{
    PointOnLine place{line.first(), {1.0, 0.0}};
    for (qsizetype i = 0; i + 1 < line.size(); ++i) {
        const QPointF step = line.at(i + 1) - line.at(i);
        const double length = norm(step);
        if (length == 0.0) continue;
        place = {line.at(i) + step * std::clamp(distance / length, 0.0, 1.0), step / length};
        if (distance <= length) break;
        distance -= length;
    }
    return place;
}

QPolygonF part(const QPolygonF &line, double from, double to)
{
    if (line.size() < 2 || to <= from) return {};
    QPolygonF result{pointAlong(line, from).point};
    double here = 0.0;
    for (qsizetype i = 1; i < line.size(); ++i) {
        here += norm(line.at(i) - line.at(i - 1));
        if (here >= to) break;
        if (here > from) result.append(line.at(i));
    }
    result.append(pointAlong(line, to).point);
    return result;
}

double distanceTo(const QPolygonF &line, QPointF point)
{
    double nearest = std::numeric_limits<double>::infinity();
    for (qsizetype i = 0; i + 1 < line.size(); ++i) {
        const QPointF step = line.at(i + 1) - line.at(i);
        const double square = product(step, step);
        const double share = square > 0.0 ? std::clamp(product(point - line.at(i), step) / square, 0.0, 1.0) : 0.0;
        nearest = std::min(nearest, norm(point - line.at(i) - step * share));
    }
    return nearest;
}

QList<QLineF> hatchLines(const QPolygonF &area, double pitch)
{
    constexpr double root = std::numbers::sqrt2 / 2.0;
    QList<QLineF> lines;
    eachSpan(area, {{root, root}, {root, -root}}, pitch, [&](double across, double from, double to) {
        const auto place = [&](double along) { return QPointF(root * (across + along), root * (across - along)); };
        lines.append(QLineF(place(from), place(to)));
    });
    return lines;
}

QList<QLineF> dotRows(const QPolygonF &area, double pitch)
{
    QList<QLineF> rows;
    eachSpan(area, {{0.0, 1.0}, {1.0, 0.0}}, pitch, [&](double y, double from, double to) {
        const double first = std::ceil(from / pitch) * pitch;
        if (first < to) rows.append(QLineF(first, y, to, y));
    });
    return rows;
}

} // namespace quasistat::ui
