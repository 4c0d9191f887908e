#include "ui/window/sample_button.h"

#include "core/document/interpret.h"
#include "ui/fields/wrapped_text.h"
#include "ui/look/figure_text.h"
#include "ui/look/type.h"

#include <QPainter>

#include <cmath>

namespace quasistat::ui
{

SampleButton::SampleButton(Sample sample, const gas::Library &library, QWidget *parent)
    : QPushButton(parent), m_sample(std::move(sample)), m_look(ui::palette(Scheme::light))
{
    setProperty("role", QStringLiteral("sample"));
    setCursor(Qt::PointingHandCursor);
    setObjectName(QStringLiteral("sample.") + m_sample.name);
    setAccessibleName(m_sample.title);
    if (auto evaluation = document::evaluate(m_sample.design, library)) m_path = std::move(evaluation->path);
}

void SampleButton::setLook(const Palette &look)
{
    m_look = look;
    update();
}

void SampleButton::drawPath(QPainter &painter, const QRectF &box) const
{
    path::Interval volume{INFINITY, 0.0};
    path::Interval pressure{INFINITY, 0.0};
    for (const auto &segment : m_path.segments)
        for (const auto &point : segment.drawing.curve) {
            volume = {std::min(volume.lowest, point.volume), std::max(volume.highest, point.volume)};
            pressure = {std::min(pressure.lowest, point.pressure), std::max(pressure.highest, point.pressure)};
        }
    const double wide = std::max(volume.highest - volume.lowest, 1e-12);
    const double high = std::max(pressure.highest - pressure.lowest, 1e-6);
    painter.setPen(QPen(faded(m_look.ink, 0.3), 1));
    painter.drawPolyline(QPolygonF{box.topLeft(), box.bottomLeft(), box.bottomRight()});
    const QRectF inner = box.adjusted(6, 4, -4, -6);
    for (const auto &segment : m_path.segments) {
        QPolygonF line;
        for (const auto &point : segment.drawing.curve)
            line << QPointF(inner.left() + (point.volume - volume.lowest) / wide * inner.width(),
                            inner.bottom() - (point.pressure - pressure.lowest) / high * inner.height());
        painter.setPen(QPen(m_look.family(segment.kind).colour, 2, Qt::SolidLine, Qt::RoundCap, Qt::RoundJoin));
        painter.drawPolyline(line);
    }
}

void SampleButton::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.setRenderHint(QPainter::Antialiasing);
    const bool lively = underMouse() || hasFocus();
    painter.setPen(QPen(lively ? m_look.accent : faded(m_look.ink, 0.12), hasFocus() ? 2 : 1));
    painter.setBrush(m_look.ground);
    painter.drawRoundedRect(QRectF(rect()).adjusted(1, 1, -1, -1), 6, 6);
    painter.setBrush(Qt::NoBrush);
    drawPath(painter, QRectF(12, 12, 92, 64));
    const double left = 120;
    painter.setPen(m_look.ink);
    drawText(painter, {left, 30}, elided(m_sample.title, titleFace(), width() - left - 12), titleFace());
    painter.setPen(m_look.secondary());
    drawWrapped(painter, QRectF(left, 38, width() - left - 12, 42), m_sample.about, labelFace());
}

} // namespace quasistat::ui
