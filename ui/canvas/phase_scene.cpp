#include "ui/canvas/phase_scene.h"

#include "ui/canvas/pixel_geometry.h"
#include "ui/look/figure_text.h"
#include "ui/session/design_reading.h"

#include <QCoreApplication>

#include <algorithm>
#include <cmath>

namespace quasistat::ui
{
namespace
{

using analysis::PhaseLine;
using analysis::PhaseLines;

PhaseLines scaled(PhaseLines lines, double factor)
{
    for (PhaseLine &line : lines.lines)
        for (auto &point : line.points) point.first *= factor;
    if (lines.critical) lines.critical->first *= factor;
    return lines;
}

QPolygonF pixels(const PhaseLine &line, const Plane &plane)
{
    QPolygonF result;
    for (const auto &[volume, pressure] : line.points) result.append(plane.pixel(volume, pressure));
    return result;
}

/// Liquid upwards to the critical point, vapour down again: the inside of the dome.
QPolygonF insideOf(const PhaseLines &lines, const Plane &plane)
{
    QPolygonF liquid;
    QPolygonF vapour;
    for (const PhaseLine &line : lines.lines) {
        if (line.kind == PhaseLine::Kind::saturatedLiquid) liquid += pixels(line, plane);
        if (line.kind == PhaseLine::Kind::saturatedVapour) vapour += pixels(line, plane);
    }
    if (liquid.size() < 2 || vapour.size() < 2) return {};
    if (liquid.first().y() < liquid.last().y()) std::reverse(liquid.begin(), liquid.end());
    if (vapour.first().y() > vapour.last().y()) std::reverse(vapour.begin(), vapour.end());
    if (lines.critical) liquid.append(plane.pixel(lines.critical->first, lines.critical->second));
    return liquid + vapour;
}

/// In a low dome only as many lines as can be told apart.
void addFractions(PhaseScene &scene, const PhaseLines &lines, const Plane &plane)
{
    constexpr double leastForEven = 50.0; // [px]
    constexpr double leastForAll = 140.0;
    const double height = scene.inside.boundingRect().height();
    for (const PhaseLine &line : lines.lines) {
        if (line.kind != PhaseLine::Kind::equalVapourFraction) continue;
        const bool isEven = std::lround(10.0 * line.vapourFraction) % 2 == 0;
        if (height < (isEven ? leastForEven : leastForAll)) continue;
        for (const QPolygonF &piece : clippedLine(thinned(pixels(line, plane)), plane.rect))
            scene.fractions.append({piece, line.vapourFraction});
    }
}

bool isFree(const QRectF &plate, const Scene &scene, const QPolygonF *own)
{
    if (!scene.plane.rect.adjusted(3, 3, -3, -3).contains(plate)) return false;
    const QRectF wide = plate.adjusted(-3, -2, 3, 2);
    for (const LabelScene &label : scene.labels)
        if (label.plate.intersects(wide)) return false;
    for (const HandleScene &handle : scene.handles)
        if (wide.adjusted(-8, -8, 8, 8).contains(handle.centre)) return false;
    for (const PhaseLabel &label : scene.phase.labels)
        if (label.plate.intersects(wide)) return false;
    const auto crosses = [&](const QPolygonF &line) {
        return &line != own && line.boundingRect().adjusted(-1, -1, 1, 1).intersects(wide) &&
               !clippedLine(line, wide).isEmpty();
    };
    for (const SegmentScene &segment : scene.segments)
        if (std::ranges::any_of(segment.line, crosses)) return false;
    return std::ranges::none_of(scene.phase.boundary, crosses) && std::ranges::none_of(scene.boundary.lines, crosses) &&
           std::ranges::none_of(scene.phase.fractions, [&](const FractionLine &line) { return crosses(line.line); });
}

} // namespace

const PhaseLines *PhaseCache::linesFor(const Snapshot &snapshot)
{
    if (!snapshot.evaluation || snapshot.evaluation->path.states.empty()) return nullptr;
    const gas::State &charge = snapshot.evaluation->path.states.front().state;
    if (charge.isEvacuated() || charge.amount() <= 0.0) return nullptr;
    const document::Json *gas = valueAt(snapshot.design.json, "/gas");
    const std::string key = gas ? gas->dump() : std::string();
    if (key != m_gas || key.empty()) {
        m_gas = key;
        m_perMole = scaled(analysis::phaseLines(charge), 1.0 / charge.amount());
        m_amount = 0.0;
    }
    if (m_perMole.lines.empty()) return nullptr;
    if (m_amount != charge.amount()) {
        m_amount = charge.amount();
        m_lines = scaled(m_perMole, m_amount);
    }
    return &m_lines;
}

PhaseScene phaseScene(const PhaseLines &lines, const Plane &plane)
{
    PhaseScene scene;
    for (const PhaseLine &line : lines.lines) {
        const QList<QPolygonF> pieces = clippedLine(thinned(pixels(line, plane)), plane.rect);
        scene.isDewLine = scene.isDewLine || line.kind == PhaseLine::Kind::dewLine;
        if (line.kind != PhaseLine::Kind::equalVapourFraction) scene.boundary += pieces;
    }
    scene.inside = clippedArea(thinned(insideOf(lines, plane)), plane.rect);
    addFractions(scene, lines, plane);
    if (lines.critical) {
        const QPointF at = plane.pixel(lines.critical->first, lines.critical->second);
        if (plane.rect.contains(at)) scene.critical = at;
    }
    return scene;
}

QList<CrossingScene> crossingScenes(const path::PathResult &path, const Plane &plane)
{
    QList<CrossingScene> crossings;
    for (std::size_t k = 0; k < path.segments.size(); ++k)
        for (const path::PhaseCrossing &crossing : path.segments[k].phaseCrossings) {
            const QPointF at = plane.pixel(crossing.state.volume(), crossing.state.pressure());
            if (plane.rect.contains(at))
                crossings.append({at, static_cast<int>(k), crossing.entersTwoPhase, crossing.state.pressure()});
        }
    return crossings;
}

void addCriticalLabel(Scene &scene, const DiagramStyle &style)
{
    if (!scene.phase.critical) return;
    const QFont font = style.font(style.type(10));
    const QString text = QCoreApplication::translate("Diagram", "critical point");
    const QSizeF size(textWidth(text, font) + 6.0, font.pixelSize() + 4.0);
    const double above = size.height() + 7.0;
    for (const double left : {-0.5 * size.width(), 2.0, -2.0 - size.width()}) {
        const QRectF plate(*scene.phase.critical + QPointF(left, -above), size);
        if (!isFree(plate, scene, nullptr)) continue;
        scene.phase.labels.append({plate, text});
        return;
    }
}

void addFractionLabels(Scene &scene, const DiagramStyle &style)
{
    const QFont font = style.font(style.type(10));
    for (const FractionLine &fraction : scene.phase.fractions) {
        const double length = lengthOf(fraction.line);
        if (length < 60.0) continue;
        const QString text = QString::number(fraction.vapourFraction, 'g', 2);
        const QSizeF size(textWidth(text, font) + 6.0, font.pixelSize() + 2.0);
        for (const double share : {0.5, 0.6, 0.4, 0.7, 0.3, 0.8, 0.2}) {
            const QPointF centre = pointAlong(fraction.line, share * length).point;
            const QRectF plate(centre - QPointF(size.width(), size.height()) / 2.0, size);
            if (!isFree(plate, scene, &fraction.line)) continue;
            scene.phase.labels.append({plate, text});
            break;
        }
    }
}

} // namespace quasistat::ui
