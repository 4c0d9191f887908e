#include "ui/fields/choice_field.h"

#include <QPainter>
#include <QWheelEvent>

namespace quasistat::ui
{

void ChoiceField::paintEvent(QPaintEvent *event)
{
    QComboBox::paintEvent(event);
    QPainter painter(this);
    painter.setRenderHint(QPainter::Antialiasing);
    QColor ink = QWidget::palette().color(QPalette::Text);
    ink.setAlphaF(0.7F);
    painter.setPen(QPen(ink, 1.5, Qt::SolidLine, Qt::RoundCap, Qt::RoundJoin));
    const QPointF middle(width() - 13.0, height() / 2.0);
    painter.drawPolyline(QPolygonF{middle + QPointF(-4, -2), middle + QPointF(0, 2), middle + QPointF(4, -2)});
}

void ChoiceField::wheelEvent(QWheelEvent *event)
{
    if (hasFocus())
        QComboBox::wheelEvent(event);
    else
        event->ignore();
}

} // namespace quasistat::ui
