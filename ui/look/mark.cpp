#include "ui/look/mark.h"

#include <QPolygonF>

namespace quasistat::ui
{
namespace
{

QPen stroke(const QColor &colour, double width)
{
    return {colour, width, Qt::SolidLine, Qt::RoundCap, Qt::RoundJoin};
}

void drawTick(QPainter &painter, const QColor &colour)
{
    painter.setPen(stroke(colour, 1.75));
    painter.drawPolyline(QPolygonF{{-4.25, 0.25}, {-1.25, 3.25}, {4.25, -3.25}});
}

void drawTriangle(QPainter &painter, const QColor &colour, const QColor &ground)
{
    painter.setPen(stroke(colour, 1.0));
    painter.setBrush(colour);
    painter.drawPolygon(QPolygonF{{0.0, -5.5}, {6.5, 5.5}, {-6.5, 5.5}});
    painter.setPen(stroke(ground, 1.5));
    painter.drawLine(QLineF(0.0, -1.7, 0.0, 1.7));
    painter.setPen(Qt::NoPen);
    painter.setBrush(ground);
    painter.drawEllipse(QPointF(0.0, 3.8), 0.9, 0.9);
}

void drawCross(QPainter &painter, const QColor &colour)
{
    painter.setPen(stroke(colour, 1.75));
    painter.drawLine(QLineF(-3.5, -3.5, 3.5, 3.5));
    painter.drawLine(QLineF(-3.5, 3.5, 3.5, -3.5));
}

void drawDots(QPainter &painter, const QColor &colour)
{
    painter.setPen(Qt::NoPen);
    painter.setBrush(colour);
    for (const double x : {-5.0, 0.0, 5.0}) painter.drawEllipse(QPointF(x, 0.0), 1.4, 1.4);
}

} // namespace

void drawMark(QPainter &painter, StateMark mark, QPointF centre, const QColor &colour, const QColor &ground)
{
    painter.save();
    painter.setRenderHint(QPainter::Antialiasing);
    painter.setBrush(Qt::NoBrush);
    painter.translate(centre);
    switch (mark) {
    case StateMark::tick: drawTick(painter, colour); break;
    case StateMark::warning: drawTriangle(painter, colour, ground); break;
    case StateMark::cross: drawCross(painter, colour); break;
    case StateMark::dots: drawDots(painter, colour); break;
    }
    painter.restore();
}

} // namespace quasistat::ui
