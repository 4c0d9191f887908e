#include "ui/window/header_field.h"

#include "ui/look/figure_text.h"
#include "ui/look/type.h"

#include <QKeyEvent>
#include <QMouseEvent>

#include <cmath>

namespace quasistat::ui
{
namespace
{

constexpr double dotRoom = 13.0;

QFont valueFace(bool bold)
{
    return face(14, bold ? QFont::DemiBold : QFont::Medium);
}

} // namespace

HeaderField::HeaderField(QWidget *parent) : QWidget(parent), m_look(ui::palette(Scheme::light))
{
    setFocusPolicy(Qt::TabFocus);
    setCursor(Qt::PointingHandCursor);
}

void HeaderField::setText(const QString &caption, const RichText &value)
{
    m_caption = caption;
    m_value = value;
    setAccessibleName(caption + QStringLiteral(": ") + value.unstyled());
    update();
}

void HeaderField::setLook(const Palette &look)
{
    m_look = look;
    update();
}

void HeaderField::setDot(Dot dot)
{
    m_dot = dot;
    update();
}

int HeaderField::naturalWidth() const
{
    const double value = textWidth(m_value, valueFace(m_bold)) + (m_dot == Dot::none ? 0.0 : dotRoom);
    return static_cast<int>(std::ceil(std::max(value, textWidth(m_caption, captionFace())))) + 2;
}

void HeaderField::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.setRenderHint(QPainter::Antialiasing);
    painter.setPen(m_look.secondary());
    drawText(painter, {0, 16}, elided(m_caption, captionFace(), width()), captionFace());
    const double left = m_dot == Dot::none ? 0.0 : dotRoom;
    if (m_dot != Dot::none) {
        const bool filled = m_dot == Dot::filled;
        painter.setPen(filled ? Qt::NoPen : QPen(m_look.warning, 1.5));
        painter.setBrush(filled ? QBrush(m_look.accent) : QBrush());
        painter.drawEllipse(QPointF(4, 29), 3.5, 3.5);
    }
    const QFont font = valueFace(m_bold);
    painter.setPen(m_look.ink);
    if (textWidth(m_value, font) <= width() - left)
        drawText(painter, {left, 33.5}, m_value, font);
    else
        drawText(painter, {left, 33.5}, elided(m_value.unstyled(), font, width() - left), font);
    if (!m_hovered && !hasFocus()) return;
    painter.setPen(QPen(m_look.accent, hasFocus() ? 2.0 : 1.0));
    painter.drawLine(QPointF(0, 39), QPointF(std::min<double>(width(), textWidth(m_value, font) + left), 39));
}

void HeaderField::mouseReleaseEvent(QMouseEvent *event)
{
    if (event->button() == Qt::LeftButton && rect().contains(event->position().toPoint()))
        emit clicked(event->position().y() < 20);
}

void HeaderField::keyPressEvent(QKeyEvent *event)
{
    if (event->key() == Qt::Key_Return || event->key() == Qt::Key_Enter || event->key() == Qt::Key_Space)
        emit clicked(false);
    else
        QWidget::keyPressEvent(event);
}

void HeaderField::enterEvent(QEnterEvent *)
{
    m_hovered = true;
    update();
}

void HeaderField::leaveEvent(QEvent *)
{
    m_hovered = false;
    update();
}

void HeaderField::focusInEvent(QFocusEvent *event)
{
    QWidget::focusInEvent(event);
    update();
}

void HeaderField::focusOutEvent(QFocusEvent *event)
{
    QWidget::focusOutEvent(event);
    update();
}

} // namespace quasistat::ui
