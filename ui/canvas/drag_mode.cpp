#include "ui/canvas/drag_mode.h"

#include "ui/canvas/canvas.h"
#include "ui/canvas/state_drag.h"

#include <algorithm>

namespace quasistat::ui
{
namespace
{

QPointF handleOf(const Scene &scene, int number, QPointF otherwise)
{
    const auto found = std::find_if(scene.handles.begin(), scene.handles.end(),
                                    [&](const HandleScene &handle) { return handle.states.contains(number); });
    return found == scene.handles.end() ? otherwise : found->centre;
}

} // namespace

DragMode::DragMode(Canvas &canvas, int number, QPointF grabbed, QPointF now)
    : Mode(canvas), m_number(number), m_offset(handleOf(canvas.diagram().scene(), number, grabbed) - grabbed),
      m_now(now), m_before(canvas.session().shared())
{
}

void DragMode::enter()
{
    canvas().setCursor(Qt::ClosedHandCursor);
    canvas().session().select(segmentEndingIn(m_number));
    follow(m_now);
}

void DragMode::leave()
{
    if (canvas().session().isPreviewing()) canvas().session().cancelPreview();
    canvas().setCursor(Qt::ArrowCursor);
}

void DragMode::moved(const QMouseEvent &event)
{
    follow(event.position());
}

void DragMode::follow(QPointF at)
{
    const Plane &plane = canvas().diagram().plane();
    const QPointF place = at + m_offset;
    auto dragged = stateDragged(*m_before, m_number, {plane.volumeAt(place.x()), plane.pressureAt(place.y()), plane});
    if (!dragged) return; // no such end there: the last one stands
    canvas().session().preview(dragged->design);
    m_result = std::move(*dragged);
}

void DragMode::released(const QMouseEvent &event)
{
    if (event.button() != Qt::LeftButton) return;
    if (m_result) canvas().session().apply(*m_result, Canvas::tr("Drag state %1").arg(m_number));
    canvas().finishMode();
}

} // namespace quasistat::ui
