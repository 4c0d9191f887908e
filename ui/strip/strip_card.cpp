#include "ui/strip/strip_card.h"

#include <QApplication>
#include <QContextMenuEvent>
#include <QKeyEvent>
#include <QMouseEvent>

namespace quasistat::ui
{

StripCard::StripCard(std::function<void(StripCard &)> paint, QWidget *parent)
    : QWidget(parent), m_paint(std::move(paint))
{
    setFocusPolicy(Qt::StrongFocus);
    setCursor(Qt::PointingHandCursor);
}

void StripCard::paintEvent(QPaintEvent *)
{
    m_paint(*this);
}

void StripCard::enterEvent(QEnterEvent *)
{
    setHovered(true);
}

void StripCard::leaveEvent(QEvent *)
{
    setHovered(false);
}

void StripCard::setHovered(bool hovered)
{
    if (hovered == m_hovered) return;
    m_hovered = hovered;
    update();
    emit hoverChanged(hovered);
}

void StripCard::mousePressEvent(QMouseEvent *event)
{
    if (event->button() != Qt::LeftButton) return;
    m_pressed = true;
    m_pressedAt = event->globalPosition().toPoint();
}

void StripCard::mouseMoveEvent(QMouseEvent *event)
{
    if (!m_pressed || !m_draggable) return;
    const int dx = event->globalPosition().toPoint().x() - m_pressedAt.x();
    if (!m_dragging && std::abs(dx) < QApplication::startDragDistance()) return;
    m_dragging = true;
    setCursor(Qt::ClosedHandCursor);
    emit dragged(dx);
}

void StripCard::mouseReleaseEvent(QMouseEvent *event)
{
    if (event->button() != Qt::LeftButton || !m_pressed) return;
    m_pressed = false;
    if (m_dragging) {
        m_dragging = false;
        setCursor(Qt::PointingHandCursor);
        emit dropped(event->globalPosition().toPoint().x() - m_pressedAt.x());
    } else if (rect().contains(event->position().toPoint()))
        emit clicked(event->position().toPoint());
}

void StripCard::contextMenuEvent(QContextMenuEvent *event)
{
    emit menuRequested(event->globalPos());
}

void StripCard::focusInEvent(QFocusEvent *event)
{
    QWidget::focusInEvent(event);
    update();
}

void StripCard::focusOutEvent(QFocusEvent *event)
{
    QWidget::focusOutEvent(event);
    update();
}

void StripCard::keyPressEvent(QKeyEvent *event)
{
    if (event->key() == Qt::Key_Escape && m_pressed) { // a drag given up
        m_pressed = false;
        m_dragging = false;
        setCursor(Qt::PointingHandCursor);
        emit dragCancelled();
        return;
    }
    event->ignore(); // arrows, Enter and the rest are the strip's
}

} // namespace quasistat::ui
