#include "ui/canvas/place_mode.h"

#include "ui/canvas/canvas.h"
#include "ui/canvas/provisional_segment.h"

#include <QCoreApplication>

namespace quasistat::ui
{

PlaceMode::PlaceMode(Canvas &canvas, path::Kind kind) : Mode(canvas), m_kind(kind), m_before(canvas.session().shared())
{
}

void PlaceMode::enter()
{
    canvas().setCursor(Qt::CrossCursor);
    canvas().session().hover(-1);
    follow(canvas().mapFromGlobal(QCursor::pos()));
}

void PlaceMode::leave()
{
    if (canvas().session().isPreviewing()) canvas().session().cancelPreview();
    canvas().setCursor(Qt::ArrowCursor);
}

void PlaceMode::pressed(const QMouseEvent &event)
{
    if (event.button() != Qt::LeftButton) return;
    m_isDown = true;
    follow(event.position());
}

void PlaceMode::moved(const QMouseEvent &event)
{
    follow(event.position());
}

void PlaceMode::follow(QPointF at)
{
    const Plane &plane = canvas().diagram().plane();
    if (!plane.rect.contains(at)) return;
    auto placed = segmentPlaced(*m_before, m_kind, {plane.volumeAt(at.x()), plane.pressureAt(at.y()), plane});
    if (!placed) return;
    canvas().session().preview(placed->design);
    m_result = std::move(*placed);
}

void PlaceMode::released(const QMouseEvent &event)
{
    if (event.button() != Qt::LeftButton || !m_isDown) return;
    m_isDown = false;
    if (!m_result) return; // nothing can be set there: the mode goes on
    const auto words = path::facts(m_kind).words;
    Session &session = canvas().session();
    const int index = static_cast<int>(m_before->evaluation->path.failures.size());
    session.apply(*m_result, Canvas::tr("Place %1", "a kind of segment")
                                 .arg(QCoreApplication::translate("Kind", std::string(words).c_str())));
    canvas().finishMode();
    session.select(index);
}

} // namespace quasistat::ui
