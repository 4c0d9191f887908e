#include "ui/canvas/boundary_scene.h"

#include "ui/canvas/limit_text.h"
#include "ui/canvas/pixel_geometry.h"
#include "ui/look/figure_text.h"
#include "ui/look/type.h"

#include <QTransform>

#include <algorithm>
#include <cmath>
#include <limits>
#include <numbers>

namespace quasistat::ui
{
namespace
{

using analysis::BoundaryStretch;

constexpr double tickReach = 6.0; // in x and in y
constexpr double tickPitch = 14.0;
constexpr double labelGap = 10.0; // free line on either side of a label

bool isUpright(const BoundaryStretch &stretch)
{
    return stretch.points.size() > 1 && stretch.points.front().first == stretch.points.back().first;
}

QPolygonF linePixels(const BoundaryStretch &stretch, const Plane &plane)
{
    QPolygonF line;
    for (const auto &[volume, pressure] : stretch.points) line.append(plane.pixel(volume, pressure));
    return thinned(line);
}

// The forbidden side of one stretch, always turning the same way, so that the union of all is one winding fill.
QPolygonF forbiddenSide(const BoundaryStretch &stretch, const QPolygonF &line, const Plane &plane)
{
    if (line.size() < 2) return {};
    QPolygonF area = line;
    if (isUpright(stretch)) {
        // Beyond a volume everything is forbidden, above and below the other limits too.
        const double edge = stretch.forbiddenAbove ? plane.rect.right() : plane.rect.left();
        area = QRectF(QPointF(line.first().x(), plane.rect.top()), QPointF(edge, plane.rect.bottom())).normalized();
        area.removeLast();
    } else {
        const double edge = stretch.forbiddenAbove ? plane.rect.top() : plane.rect.bottom();
        area.append({line.last().x(), edge});
        area.append({line.first().x(), edge});
    }
    area = clippedArea(area, plane.rect);
    double twice = 0.0;
    for (qsizetype i = 0; i < area.size(); ++i) {
        const QPointF a = area.at(i);
        const QPointF b = area.at((i + 1) % area.size());
        twice += a.x() * b.y() - b.x() * a.y();
    }
    if (twice < 0.0) std::reverse(area.begin(), area.end());
    return area;
}

// Of the two diagonals to the forbidden side the one that stands off the line more.
QPointF tickDirection(const BoundaryStretch &stretch, QPointF along)
{
    const double side = stretch.forbiddenAbove ? 1.0 : -1.0;
    const QPointF first(tickReach * side, -tickReach * side);
    const QPointF second = isUpright(stretch) ? QPointF(tickReach * side, tickReach * side)
                                              : QPointF(-tickReach * side, -tickReach * side);
    const auto standOff = [&](QPointF tick) { return std::abs(tick.x() * along.y() - tick.y() * along.x()); };
    return standOff(second) > 1.05 * standOff(first) ? second : first;
}

QList<QLineF> ticksOf(const BoundaryStretch &stretch, const QPolygonF &line)
{
    QList<QLineF> ticks;
    const double length = lengthOf(line);
    for (double at = tickPitch; at < length - 2.0; at += tickPitch) {
        const auto [point, along] = pointAlong(line, at);
        ticks.append(QLineF(point, point + tickDirection(stretch, along)));
    }
    return ticks;
}

// A label's place on a line: the middle of the gap along it, and how well it lies there.
struct GapChoice {
    double middle = 0.0;
    double cost = std::numeric_limits<double>::infinity();
};

double bend(const QPolygonF &piece)
{
    double worst = 0.0;
    const QPolygonF chord{piece.first(), piece.last()};
    for (const auto &point : piece) worst = std::max(worst, distanceTo(chord, point));
    return worst;
}

double covered(const QRectF &plate, const QTransform &place, const std::vector<QPolygonF> &avoid)
{
    const QTransform back = place.inverted();
    double length = 0.0;
    for (const auto &line : avoid) {
        // Lines that only pass far away need not be turned point by point.
        if (!line.boundingRect().adjusted(-1, -1, 1, 1).intersects(place.mapRect(plate))) continue;
        for (const auto &piece : clippedLine(back.map(line), plate)) length += lengthOf(piece);
    }
    return length;
}

QTransform labelTransform(const QPolygonF &line, double middle, double width)
{
    const QPointF from = pointAlong(line, middle - width / 2.0).point;
    const QPointF to = pointAlong(line, middle + width / 2.0).point;
    double angle = std::atan2(to.y() - from.y(), to.x() - from.x()) * 180.0 / std::numbers::pi;
    if (angle > 90.0) angle -= 180.0; // text is never upside down
    if (angle < -90.0) angle += 180.0;
    const QPointF centre = (pointAlong(line, middle).point + (from + to) / 2.0) / 2.0;
    return QTransform().translate(centre.x(), centre.y()).rotate(angle);
}

GapChoice bestGap(const QPolygonF &line, const QRectF &plate, const std::vector<QPolygonF> &avoid)
{
    const double length = lengthOf(line);
    const double need = plate.width() + 2.0 * labelGap;
    GapChoice best;
    for (double middle = need / 2.0; middle <= length - need / 2.0; middle += 12.0) {
        const QPolygonF piece = part(line, middle - plate.width() / 2.0, middle + plate.width() / 2.0);
        if (piece.size() < 2) continue;
        const QTransform place = labelTransform(line, middle, plate.width());
        const double steep = std::abs(place.m12());
        const double cost = 6.0 * std::max(0.0, bend(piece) - 2.0) + 4.0 * covered(plate, place, avoid) + 40.0 * steep +
                            0.01 * std::abs(middle - 0.6 * length);
        if (cost < best.cost) best = {middle, cost};
    }
    return best;
}

// Ticks under a label would look like text: those in its gap go.
void removeTicks(QList<QLineF> &ticks, const QPolygonF &gap)
{
    ticks.removeIf([&](const QLineF &tick) { return distanceTo(gap, tick.p1()) < 2.0; });
}

QRectF plateFor(const RichText &text, const QFont &font)
{
    const double width = textWidth(text, font) + 12.0;
    const double height = font.pixelSize() + 8.0;
    return {-width / 2.0, -height / 2.0, width, height};
}

} // namespace

BoundaryScene boundaryScene(const Snapshot &snapshot, const Plane &plane, const DiagramStyle &style,
                            const std::vector<QPolygonF> &avoid, QList<LooseLabel> &beside)
{
    BoundaryScene scene;
    const analysis::Evaluation &evaluation = *snapshot.evaluation;
    if (evaluation.limits.empty() || evaluation.path.states.empty()) return scene;
    const QFont font = style.font(style.labelPixels, QFont::DemiBold);
    scene.forbidden.setFillRule(Qt::WindingFill);
    const analysis::Window window{plane.view.volume, plane.view.pressure};
    for (const auto &stretch : analysis::boundary(evaluation.limits, evaluation.path.states.front().state, window)) {
        const QPolygonF whole = linePixels(stretch, plane);
        scene.forbidden.addPolygon(forbiddenSide(stretch, whole, plane));
        scene.forbidden.closeSubpath();
        for (const auto &line : clippedLine(whole, plane.rect)) {
            QList<QLineF> ticks = ticksOf(stretch, line);
            const RichText text = limitText(snapshot, stretch.limit, stretch.forbiddenAbove).inBold();
            const QRectF plate = plateFor(text, font);
            const GapChoice gap = bestGap(line, plate, avoid);
            if (gap.cost < 120.0) {
                const double half = plate.width() / 2.0 + labelGap * 0.4;
                const QTransform place = labelTransform(line, gap.middle, plate.width());
                scene.labels.append({place.map(QPointF()),
                                     std::atan2(place.m12(), place.m11()) * 180.0 / std::numbers::pi, plate, text});
                scene.lines.append(part(line, 0.0, gap.middle - half));
                scene.lines.append(part(line, gap.middle + half, lengthOf(line)));
                removeTicks(ticks, part(line, gap.middle - half - 4.0, gap.middle + half));
            } else {
                if (lengthOf(line) > 24.0) beside.append({pointAlong(line, lengthOf(line) / 2.0).point, text});
                scene.lines.append(line);
            }
            scene.ticks += ticks;
        }
    }
    for (const auto &verdict : evaluation.verdicts)
        for (const auto &violation : verdict.violations)
            scene.violated += clippedLine(thinned(plane.pixels(violation.stretch)), plane.rect.adjusted(-8, -8, 8, 8));
    return scene;
}

} // namespace quasistat::ui
