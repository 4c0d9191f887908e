#include "ui/window/edge_grip.h"

#include <QMouseEvent>

namespace quasistat::ui
{

EdgeGrip::EdgeGrip(QWidget *parent) : QWidget(parent)
{
    setCursor(Qt::SplitHCursor);
}

void EdgeGrip::mouseMoveEvent(QMouseEvent *event)
{
    if (event->buttons() & Qt::LeftButton) emit dragged(mapToParent(event->position().toPoint()).x());
}

} // namespace quasistat::ui
