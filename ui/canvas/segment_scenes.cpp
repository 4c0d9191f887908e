#include "ui/canvas/segment_scenes.h"

#include "ui/canvas/pixel_geometry.h"

#include <algorithm>
#include <cmath>

namespace quasistat::ui
{
namespace
{

constexpr double dotPitch = 7.0;
constexpr double headLength = 10.0;
constexpr double roomForHead = 34.0;

// Strokes may stand out of the plot by this much before they are cut.
QRectF drawn(const Plane &plane)
{
    return plane.rect.adjusted(-2, -2, 2, 2);
}

QPolygonF pixels(const Plane &plane, const path::Polyline &line)
{
    return thinned(plane.pixels(line));
}

// The line in the family's dash: against a constant pressure the level alone, which dotted drops join to the states.
const path::Polyline &drawnLine(const path::SegmentResult &segment)
{
    return segment.kind == path::Kind::constantExternalPressure ? segment.drawing.workLine : segment.drawing.curve;
}

QPolygonF downToZero(QPolygonF line, const Plane &plane)
{
    if (line.size() < 2) return {};
    const double zero = plane.pixel(0.0, 0.0).y();
    line.append({line.last().x(), zero});
    line.append({line.first().x(), zero});
    return line;
}

// The straight piece of a line at a distance along it.
QPolygonF pieceAt(const QPolygonF &line, double distance)
{
    for (qsizetype i = 0; i + 1 < line.size(); ++i) {
        const double length = QLineF(line.at(i), line.at(i + 1)).length();
        if (distance <= length) return {line.at(i), line.at(i + 1)};
        distance -= length;
    }
    return line;
}

QPolygonF arrowHead(const QPolygonF &whole)
{
    const double middle = lengthOf(whole) / 2.0;
    if (2.0 * middle < roomForHead) return {};
    // On a staircase the middle of the step, not its corner.
    const QPolygonF step = pieceAt(whole, middle);
    const QPolygonF line = lengthOf(step) > 1.5 * headLength ? step : whole;
    const double length = lengthOf(line);
    const auto [tip, along] = pointAlong(line, length / 2.0 + headLength / 2.0);
    const QPointF across(-along.y(), along.x());
    const QPointF back = tip - along * headLength;
    return {tip, back + across * 4.5, back + along * 2.5, back - across * 4.5};
}

// The middle of what is visible: the longest piece.
QPolygonF longest(const QList<QPolygonF> &pieces)
{
    const auto found = std::max_element(pieces.begin(), pieces.end(),
                                        [](const auto &a, const auto &b) { return lengthOf(a) < lengthOf(b); });
    return found == pieces.end() ? QPolygonF() : *found;
}

// Dotted lines from the two states to the ends of the drawn line where these lie apart.
QList<QLineF> drops(const path::SegmentResult &segment, const QPolygonF &line, const Plane &plane)
{
    QList<QLineF> result;
    const auto add = [&](const gas::State &state, QPointF end) {
        const QPointF at = plane.pixel(state.volume(), state.pressure());
        if (QLineF(at, end).length() > 1.5)
            for (const auto &piece : clippedLine({at, end}, drawn(plane)))
                result.append(QLineF(piece.first(), piece.last()));
    };
    if (line.isEmpty()) return result;
    add(segment.from, line.first());
    add(segment.to, line.last());
    return result;
}

void addLimit(SegmentScene &scene, const path::Drawing &drawing, const Plane &plane, const DiagramStyle &style)
{
    const QPolygonF limit = pixels(plane, drawing.reversibleLimit);
    scene.limit = clippedLine(limit, drawn(plane));
    if (!drawing.hatchShortfall || limit.size() < 2) return;
    QPolygonF between = pixels(plane, drawing.workLine);
    std::for_each(limit.rbegin(), limit.rend(), [&](QPointF point) { between.append(point); });
    scene.hatch = hatchLines(clippedArea(between, plane.rect), style.palette.shortfall.pitch);
}

SegmentScene segmentScene(int index, const path::SegmentResult &segment, const Plane &plane, const DiagramStyle &style)
{
    const path::Drawing &drawing = segment.drawing;
    SegmentScene scene;
    scene.index = index;
    scene.kind = segment.kind;
    const QPolygonF line = pixels(plane, drawnLine(segment));
    scene.line = clippedLine(line, drawn(plane));
    scene.drops = drops(segment, line, plane);
    scene.head = arrowHead(longest(scene.line));
    scene.workIn = segment.work > 0.0;
    if (drawing.areaIsWork && segment.work != 0.0)
        scene.area = clippedArea(downToZero(pixels(plane, drawing.workLine), plane), plane.rect);
    if (drawing.dashedOutline) {
        QPolygonF outline = downToZero(pixels(plane, drawing.curve), plane);
        if (!outline.isEmpty()) outline.append(outline.first());
        scene.outline = clippedLine(outline, plane.rect);
    }
    addLimit(scene, drawing, plane, style);
    return scene;
}

bool coincide(const gas::State &first, const gas::State &second)
{
    const auto near = [](double a, double b) { return std::abs(a - b) <= 1e-6 * std::max(std::abs(a), std::abs(b)); };
    return near(first.volume(), second.volume()) && near(first.pressure(), second.pressure());
}

} // namespace

QList<SegmentScene> segmentScenes(const path::PathResult &path, const Plane &plane, const DiagramStyle &style)
{
    QList<SegmentScene> scenes;
    for (std::size_t k = 0; k < path.segments.size(); ++k) {
        scenes.append(segmentScene(static_cast<int>(k), path.segments[k], plane, style));
        scenes.last().fill.addPolygon(scenes.last().area);
    }
    return scenes;
}

void addNetArea(Scene &scene, const path::PathResult &path, const DiagramStyle &style)
{
    const bool areasAreWork = std::all_of(path.segments.begin(), path.segments.end(),
                                          [](const auto &segment) { return segment.drawing.areaIsWork; });
    if (path.totals.closed && areasAreWork && path.totals.netWorkOut != 0.0) {
        QPolygonF loop;
        for (const auto &segment : path.segments) loop += pixels(scene.plane, segment.drawing.workLine);
        scene.netArea = clippedArea(loop, scene.plane.rect);
        scene.netWorkIn = path.totals.netWorkOut < 0.0;
        QPainterPath net;
        net.addPolygon(scene.netArea);
        for (auto &segment : scene.segments)
            if (!segment.area.isEmpty()) segment.fill = segment.fill.subtracted(net);
    }
    if (!style.isPrint()) return;
    if (!scene.netWorkIn) scene.netDots = dotRows(scene.netArea, dotPitch);
    for (auto &segment : scene.segments)
        if (!segment.workIn)
            for (const auto &piece : segment.fill.toFillPolygons()) segment.dots += dotRows(piece, dotPitch);
}

QList<HandleScene> handleScenes(const path::PathResult &path, const Plane &plane)
{
    QList<HandleScene> handles;
    for (std::size_t i = 0; i < path.states.size(); ++i) {
        const gas::State &state = path.states[i].state;
        const auto same = std::find_if(handles.begin(), handles.end(), [&](const HandleScene &handle) {
            return coincide(path.states[static_cast<std::size_t>(handle.states.first() - 1)].state, state);
        });
        if (same != handles.end())
            same->states.append(static_cast<int>(i) + 1);
        else
            handles.append({plane.pixel(state.volume(), state.pressure()), {static_cast<int>(i) + 1}});
    }
    return handles;
}

} // namespace quasistat::ui
