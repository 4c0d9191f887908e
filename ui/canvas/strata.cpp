#include "ui/canvas/strata.h"

#include "ui/canvas/label_box.h"
#include "ui/look/figure_text.h"
#include "ui/look/type.h"

#include <cmath>

namespace quasistat::ui
{
namespace
{

constexpr double handleRadius = 4.75;

QPen rounded(const QColor &colour, double width)
{
    return {colour, width, Qt::SolidLine, Qt::RoundCap, Qt::RoundJoin};
}

void drawLines(QPainter &painter, const QList<QPolygonF> &lines)
{
    for (const auto &line : lines) painter.drawPolyline(line);
}

void paintForbidden(QPainter &painter, const Painting &p)
{
    const EnvelopeLook &look = p.style.palette.envelope;
    painter.fillPath(p.scene.boundary.forbidden, faded(look.colour, look.forbiddenOpacity));
}

void paintGrid(QPainter &painter, const Painting &p)
{
    painter.setRenderHint(QPainter::Antialiasing, false);
    const QRectF &rect = p.scene.plane.rect;
    const QColor colour = p.style.palette.grid();
    // Filled, not stroked: a translucent hairline is sharp and cheap that way.
    const auto upright = [&](double x) {
        painter.fillRect(QRectF(std::round(x), rect.top(), 1.0, rect.height()), colour);
    };
    const auto level = [&](double y) {
        painter.fillRect(QRectF(rect.left(), std::round(y), rect.width(), 1.0), colour);
    };
    for (const auto &tick : p.scene.axes.volume) upright(tick.place);
    for (const auto &tick : p.scene.axes.pressure) level(tick.place);
    level(rect.top());
}

void drawDots(QPainter &painter, const QList<QLineF> &rows, const QColor &colour)
{
    if (rows.isEmpty()) return;
    QPen pen(colour, 1.3, Qt::CustomDashLine, Qt::RoundCap);
    pen.setDashPattern({0.01, 7.0 / 1.3 - 0.01});
    painter.setPen(pen);
    painter.drawLines(rows);
}

void paintAreas(QPainter &painter, const Painting &p)
{
    const Palette &palette = p.style.palette;
    const auto look = [&](bool in) -> const WorkFill & { return in ? palette.workIn : palette.workOut; };
    // The edges lie under curves; not smoothed, neighbouring areas join without a seam.
    painter.setRenderHint(QPainter::Antialiasing, false);
    painter.setPen(Qt::NoPen);
    if (!p.scene.netArea.isEmpty()) {
        const WorkFill &fill = look(p.scene.netWorkIn);
        painter.setBrush(faded(fill.colour, fill.netOpacity));
        painter.drawPolygon(p.scene.netArea);
    }
    for (const auto &segment : p.scene.segments) {
        const WorkFill &fill = look(segment.workIn);
        painter.fillPath(segment.fill, faded(fill.colour, fill.opacity));
    }
    painter.setRenderHint(QPainter::Antialiasing);
    drawDots(painter, p.scene.netDots, faded(palette.workOut.colour, 0.7));
    for (const auto &segment : p.scene.segments) drawDots(painter, segment.dots, faded(palette.workOut.colour, 0.7));
}

void drawDiamond(QPainter &painter, QPointF centre, double reach)
{
    painter.drawPolygon(QPolygonF{centre + QPointF(0, -reach), centre + QPointF(reach, 0), centre + QPointF(0, reach),
                                  centre + QPointF(-reach, 0)});
}

void paintPhases(QPainter &painter, const Painting &p)
{
    const PhaseScene &phase = p.scene.phase;
    const QColor &ink = p.style.palette.ink;
    const QColor &ground = p.style.palette.ground;
    painter.setPen(Qt::NoPen);
    painter.setBrush(faded(ink, p.style.palette.scheme == Scheme::dark ? 0.06 : 0.04));
    painter.drawPolygon(phase.inside);
    painter.setBrush(Qt::NoBrush);
    painter.setPen(QPen(faded(ink, 0.26), 0.8));
    for (const FractionLine &fraction : phase.fractions) painter.drawPolyline(fraction.line);
    painter.setPen(rounded(faded(ink, 0.62), p.style.isPrint() ? 1.2 : 1.5));
    drawLines(painter, phase.boundary);
    const QFont font = p.style.font(p.style.type(10));
    for (const PhaseLabel &label : phase.labels) {
        painter.fillRect(label.plate, faded(ground, 0.82));
        painter.setPen(faded(ink, 0.7));
        drawText(painter, label.plate.center() + QPointF(0.0, 0.36 * font.pixelSize()), label.text, font,
                 Align::centre);
    }
    if (!phase.critical) return;
    painter.setPen(Qt::NoPen);
    painter.setBrush(faded(ink, 0.8));
    painter.drawEllipse(*phase.critical, 3.0, 3.0);
}

void paintHatch(QPainter &painter, const Painting &p)
{
    const HatchLook &look = p.style.palette.shortfall;
    painter.setPen(QPen(faded(look.colour, look.opacity), look.line));
    for (const auto &segment : p.scene.segments) painter.drawLines(segment.hatch);
}

void paintAxes(QPainter &painter, const Painting &p)
{
    const QRectF &rect = p.scene.plane.rect;
    const QColor line = faded(p.style.palette.ink, 0.75);
    painter.setPen(QPen(line, 1.25));
    painter.drawLine(QLineF(rect.left(), rect.top() - 4.0, rect.left(), rect.bottom()));
    painter.drawLine(rect.bottomLeft(), rect.bottomRight());
    painter.setPen(QPen(line, 1.0));
    for (const auto &tick : p.scene.axes.volume)
        painter.drawLine(QLineF(tick.place, rect.bottom(), tick.place, rect.bottom() + 5));
    for (const auto &tick : p.scene.axes.pressure)
        painter.drawLine(QLineF(rect.left() - 5, tick.place, rect.left(), tick.place));

    const QFont labels = p.style.font(p.style.labelPixels);
    const double size = p.style.labelPixels;
    painter.setPen(faded(p.style.palette.ink, 0.8));
    for (const auto &tick : p.scene.axes.volume)
        drawText(painter, {tick.place, rect.bottom() + 8.0 + size}, tick.text, labels, Align::centre);
    for (const auto &tick : p.scene.axes.pressure)
        drawText(painter, {rect.left() - 10.0, tick.place + 0.36 * size}, tick.text, labels, Align::right);
    const QFont titles = p.style.font(p.style.type(13));
    painter.setPen(p.style.palette.ink);
    drawText(painter, {rect.right(), rect.bottom() + 12.0 + 2.0 * size}, p.scene.axes.volumeTitle, titles,
             Align::right);
    drawText(painter, {rect.left() - 10.0, rect.top() + 0.66 * size}, p.scene.axes.pressureTitle, titles, Align::right);
}

void paintGhosts(QPainter &painter, const Painting &p)
{
    const QColor &ink = p.style.palette.ink;
    painter.setBrush(Qt::NoBrush);
    painter.setPen(QPen(faded(ink, 0.6), 1.0));
    for (const auto &segment : p.scene.segments) drawLines(painter, segment.limit);
    for (const auto &segment : p.scene.segments) {
        const QColor colour = p.style.palette.family(segment.kind).colour;
        QPen dashed(faded(colour, 0.7), 1.0, Qt::CustomDashLine, Qt::FlatCap);
        dashed.setDashPattern({5.0, 4.0});
        painter.setPen(dashed);
        drawLines(painter, segment.outline);
        QPen dotted(faded(colour, 0.9), 1.25, Qt::CustomDashLine, Qt::FlatCap);
        dotted.setDashPattern({1.6, 2.4});
        painter.setPen(dotted);
        painter.drawLines(segment.drops);
    }
}

void paintBoundary(QPainter &painter, const Painting &p)
{
    const QColor &colour = p.style.palette.envelope.colour;
    painter.setBrush(Qt::NoBrush);
    painter.setPen(QPen(colour, 1.5, Qt::SolidLine, Qt::FlatCap, Qt::RoundJoin));
    drawLines(painter, p.scene.boundary.lines);
    painter.setPen(QPen(faded(colour, 0.9), 1.25));
    painter.drawLines(p.scene.boundary.ticks);
    const QFont font = p.style.font(p.style.labelPixels, QFont::DemiBold);
    for (const auto &label : p.scene.boundary.labels) {
        painter.save();
        painter.translate(label.centre);
        painter.rotate(label.angle);
        painter.setPen(Qt::NoPen);
        painter.setBrush(faded(p.style.palette.ground, 0.86));
        painter.drawRoundedRect(label.plate, 4.0, 4.0);
        painter.setPen(colour);
        drawText(painter, {0.0, 0.36 * font.pixelSize()}, label.text, font, Align::centre);
        painter.restore();
    }
}

void paintHalo(QPainter &painter, const Painting &p)
{
    const EnvelopeLook &look = p.style.palette.envelope;
    painter.setBrush(Qt::NoBrush);
    painter.setPen(rounded(look.violatedHalo, look.halo));
    drawLines(painter, p.scene.boundary.violated);
    painter.setPen(rounded(p.style.palette.ground, look.casing));
    drawLines(painter, p.scene.boundary.violated);
}

// `dashUnit`: the width that dashes are measured in, so that a thickened curve keeps its pattern in place.
void paintCurve(QPainter &painter, const SegmentScene &segment, const FamilyLook &look, double width, double dashUnit)
{
    painter.setBrush(Qt::NoBrush);
    if (look.dash.isEmpty()) {
        painter.setPen(QPen(look.colour, width, Qt::SolidLine, Qt::FlatCap, Qt::RoundJoin));
        drawLines(painter, segment.line);
    } else {
        painter.setPen(QPen(faded(look.colour, 0.55), 1.0));
        drawLines(painter, segment.line);
        QPen dashed(look.colour, width, Qt::CustomDashLine, Qt::FlatCap, Qt::RoundJoin);
        QList<qreal> dash = look.dash;
        for (qreal &length : dash) length *= dashUnit / width;
        dashed.setDashPattern(dash);
        painter.setPen(dashed);
        drawLines(painter, segment.line);
    }
    if (segment.head.isEmpty()) return;
    painter.setPen(Qt::NoPen);
    painter.setBrush(look.colour);
    painter.drawPolygon(segment.head);
}

void paintCurves(QPainter &painter, const Painting &p)
{
    for (const auto &segment : p.scene.segments)
        paintCurve(painter, segment, p.style.palette.family(segment.kind), p.style.curve, p.style.curve);
}

bool isEndOf(const HandleScene &handle, int selected)
{
    if (selected == startSelected) return handle.states.contains(1);
    return selected >= 0 && (handle.states.contains(selected + 1) || handle.states.contains(selected + 2));
}

void paintEmphasis(QPainter &painter, const Painting &p)
{
    if (p.style.isPrint()) return;
    for (const auto &segment : p.scene.segments)
        if (segment.index == p.emphasis.selected || segment.index == p.emphasis.hovered)
            paintCurve(painter, segment, p.style.palette.family(segment.kind), p.style.emphasisedCurve, p.style.curve);
    painter.setBrush(Qt::NoBrush);
    painter.setPen(QPen(p.style.palette.accent, 2.0));
    for (const auto &handle : p.scene.handles)
        if (isEndOf(handle, p.emphasis.selected)) painter.drawEllipse(handle.centre, 9.5, 9.5);
}

void paintHandles(QPainter &painter, const Painting &p)
{
    painter.setPen(QPen(p.style.palette.ink, 1.5));
    painter.setBrush(p.style.palette.ground);
    for (const CrossingScene &crossing : p.scene.crossings) drawDiamond(painter, crossing.centre, 4.5);
    const QRectF visible = p.scene.plane.rect.adjusted(-6, -6, 6, 6);
    const double radius = p.style.purpose == Purpose::report ? 4.0 : handleRadius;
    for (const auto &handle : p.scene.handles)
        if (visible.contains(handle.centre)) painter.drawEllipse(handle.centre, radius, radius);
}

void paintSentence(QPainter &painter, const Painting &p)
{
    const QFont font = bodyFace();
    const QStringList lines = wrapped(p.scene.sentence, font, std::min(460.0, 0.8 * p.scene.plane.rect.width()));
    QPointF at = p.scene.plane.rect.center() - QPointF(0.0, 10.0 * static_cast<double>(lines.size() - 1));
    painter.setPen(p.style.palette.error);
    for (const auto &line : lines) {
        drawText(painter, at, line, font, Align::centre);
        at.ry() += 20.0;
    }
}

void paintLabels(QPainter &painter, const Painting &p)
{
    for (const auto &label : p.scene.labels) drawLeader(painter, label, p.style.palette);
    for (const auto &label : p.scene.labels) drawLabel(painter, label, p.style.palette);
    if (!p.scene.sentence.isEmpty()) paintSentence(painter, p);
}

} // namespace

void paint(Stratum stratum, QPainter &painter, const Painting &painting)
{
    painter.setRenderHint(QPainter::Antialiasing);
    switch (stratum) {
    case Stratum::forbidden: paintForbidden(painter, painting); break;
    case Stratum::grid: paintGrid(painter, painting); break;
    case Stratum::areas: paintAreas(painter, painting); break;
    case Stratum::phases: paintPhases(painter, painting); break;
    case Stratum::hatch: paintHatch(painter, painting); break;
    case Stratum::axes: paintAxes(painter, painting); break;
    case Stratum::ghosts: paintGhosts(painter, painting); break;
    case Stratum::boundary: paintBoundary(painter, painting); break;
    case Stratum::halo: paintHalo(painter, painting); break;
    case Stratum::curves: paintCurves(painter, painting); break;
    case Stratum::emphasis: paintEmphasis(painter, painting); break;
    case Stratum::handles: paintHandles(painter, painting); break;
    case Stratum::labels: paintLabels(painter, painting); break;
    }
}

} // namespace quasistat::ui
