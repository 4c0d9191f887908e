#pragma once
// The drawn marks of a state of affairs: never a colour alone.

#include <QColor>
#include <QPainter>

namespace quasistat::ui
{

enum class StateMark {
    tick,    ///< checked and good
    warning, ///< a limit exceeded: a triangle
    cross,   ///< an audit that failed, an error
    dots,    ///< more: opens the actions of a card
};

/// Draws the mark, about 12 px wide, around `centre` in `colour`; `ground` is what shows through the triangle.
void drawMark(QPainter &painter, StateMark mark, QPointF centre, const QColor &colour, const QColor &ground);

} // namespace quasistat::ui
