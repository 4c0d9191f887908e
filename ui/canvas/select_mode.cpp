#include "ui/canvas/select_mode.h"

#include "ui/canvas/canvas.h"
#include "ui/canvas/drag_mode.h"

namespace quasistat::ui
{
namespace
{

constexpr double handleReach = 14.0; // a target of 28 px
constexpr double ringReach = 6.0;
constexpr double segmentReach = 9.0;
constexpr double dragThreshold = 3.0;

} // namespace

void SelectMode::leave()
{
    canvas().session().hover(-1);
}

void SelectMode::pressed(const QMouseEvent &event)
{
    if (event.button() != Qt::LeftButton) return;
    const Scene &scene = canvas().diagram().scene();
    m_isDown = true;
    m_isPanning = false;
    m_downAt = m_last = event.position();
    m_handle = scene.handleAt(m_downAt, handleReach);
    m_segment = scene.segmentAt(m_downAt, segmentReach);
}

void SelectMode::moved(const QMouseEvent &event)
{
    const QPointF at = event.position();
    if (!m_isDown) {
        hover(at);
        return;
    }
    if (!m_isPanning && QLineF(m_downAt, at).length() < dragThreshold) return;
    if (m_handle >= 0) {
        m_isDown = false;
        canvas().enter(std::make_unique<DragMode>(canvas(), stateToDrag(m_handle), m_downAt, at));
        return;
    }
    if (m_segment >= 0) return;
    m_isPanning = true;
    canvas().pan(at - m_last);
    m_last = at;
}

void SelectMode::released(const QMouseEvent &event)
{
    if (!m_isDown || event.button() != Qt::LeftButton) return;
    m_isDown = false;
    if (m_isPanning) return;
    int segment = m_segment;
    // The ring itself stands for its state: its segment's end, or the start.
    if (m_handle >= 0 && (segment < 0 || isOnRing())) segment = segmentEndingIn(stateToDrag(m_handle));
    if (segment >= canvas().diagram().scene().segments.size()) segment = -1;
    canvas().session().select(segment);
}

bool SelectMode::isOnRing() const
{
    const QPointF centre = canvas().diagram().scene().handles.at(m_handle).centre;
    return QLineF(centre, m_downAt).length() < ringReach;
}

void SelectMode::hover(QPointF at)
{
    const Scene &scene = canvas().diagram().scene();
    const int handle = scene.handleAt(at, handleReach);
    const int segment = scene.segmentAt(at, segmentReach);
    canvas().session().hover(segment);
    canvas().setCursor(handle >= 0 ? Qt::SizeAllCursor : segment >= 0 ? Qt::PointingHandCursor : Qt::ArrowCursor);
}

// Where states lie on each other: the end of the selected segment, else its start, else the last of them.
int SelectMode::stateToDrag(int handle) const
{
    const QList<int> &states = canvas().diagram().scene().handles.at(handle).states;
    const int selected = canvas().session().selected();
    if (selected >= 0)
        for (const int state : {selected + 2, selected + 1})
            if (states.contains(state)) return state;
    return states.last();
}

} // namespace quasistat::ui
