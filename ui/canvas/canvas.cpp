#include "ui/canvas/canvas.h"

#include "ui/canvas/place_mode.h"
#include "ui/canvas/select_mode.h"

#include <cmath>

namespace quasistat::ui
{
namespace
{

constexpr double zoomStep = 0.8; // one notch of the wheel, one key press

} // namespace

Canvas::Canvas(Session &session, Scheme scheme, QWidget *parent)
    : QWidget(parent), m_session(session), m_diagram(new Diagram(windowStyle(scheme), this)),
      m_mode(std::make_unique<SelectMode>(*this))
{
    setMouseTracking(true);
    setFocusPolicy(Qt::StrongFocus);
    setMinimumSize(360, 240);
    setAccessibleName(tr("p–V diagram"));
    m_diagram->setAttribute(Qt::WA_TransparentForMouseEvents);
    m_diagram->setFocusPolicy(Qt::NoFocus);
    connect(&m_session, &Session::snapshotChanged, this, &Canvas::showSnapshot);
    connect(&m_session, &Session::selectionChanged, this, &Canvas::showEmphasis);
    connect(&m_session, &Session::hoverChanged, this, &Canvas::showEmphasis);
    connect(&m_session, &Session::fileChanged, this, &Canvas::showFile);
    showSnapshot();
    showEmphasis();
}

Canvas::~Canvas() = default;

void Canvas::setScheme(Scheme scheme)
{
    m_diagram->setStyle(windowStyle(scheme));
}

void Canvas::setInset(int pixels)
{
    m_diagram->setInset(pixels);
    if (m_followsPath) m_diagram->zoomToPath();
}

void Canvas::place(path::Kind kind)
{
    if (!m_session.hasDesign() || !m_session.now().evaluation) return;
    leaveMode();
    if (!m_session.now().evaluation->path.complete()) {
        emit remarked(tr("The path stops before its last segment; put that right first, then place the next one."));
        return;
    }
    setFocus();
    enter(std::make_unique<PlaceMode>(*this, kind));
    emit remarked(tr("Click where the new segment ends; Esc leaves."));
}

void Canvas::zoomToPath()
{
    m_followsPath = true;
    m_diagram->zoomToPath();
}

void Canvas::zoomIn()
{
    m_followsPath = false;
    m_diagram->zoom(zoomStep, m_diagram->plane().rect.center());
}

void Canvas::zoomOut()
{
    m_followsPath = false;
    m_diagram->zoom(1.0 / zoomStep, m_diagram->plane().rect.center());
}

void Canvas::pan(QPointF pixels)
{
    m_followsPath = false;
    m_diagram->pan(pixels);
}

void Canvas::enter(std::unique_ptr<Mode> mode)
{
    dropMode(std::move(mode), false);
    m_mode->enter();
}

void Canvas::finishMode()
{
    setCursor(Qt::ArrowCursor);
    dropMode(std::make_unique<SelectMode>(*this), true);
    showSnapshot();
}

void Canvas::leaveMode()
{
    m_mode->leave();
    dropMode(std::make_unique<SelectMode>(*this), true);
}

void Canvas::dropMode(std::unique_ptr<Mode> next, bool selecting)
{
    m_finished = std::move(m_mode);
    m_mode = std::move(next);
    m_isSelecting = selecting;
}

void Canvas::showSnapshot()
{
    m_diagram->show(m_session.shared());
    if (m_followsPath && !m_session.isPreviewing() && m_diagram->needsFit()) m_diagram->zoomToPath();
}

void Canvas::showEmphasis()
{
    m_diagram->setEmphasis({m_session.selected(), m_session.hovered()});
}

void Canvas::showFile()
{
    // Another document: a mode of the old one means nothing any more, and the view begins afresh.
    if (m_session.filePath() == m_file && m_session.undoStack().count() > 0) return;
    m_file = m_session.filePath();
    if (m_session.undoStack().count() == 0) zoomToPath();
}

void Canvas::mousePressEvent(QMouseEvent *event)
{
    setFocus(Qt::MouseFocusReason);
    m_isPanning = event->button() == Qt::MiddleButton || (event->button() == Qt::LeftButton && m_isSpaceHeld);
    m_panLast = event->position();
    if (!m_isPanning) m_mode->pressed(*event);
}

void Canvas::mouseMoveEvent(QMouseEvent *event)
{
    if (!m_isPanning) {
        m_mode->moved(*event);
        return;
    }
    pan(event->position() - m_panLast);
    m_panLast = event->position();
}

void Canvas::mouseReleaseEvent(QMouseEvent *event)
{
    if (m_isPanning) {
        m_isPanning = false;
        return;
    }
    m_mode->released(*event);
    m_finished.reset();
}

void Canvas::wheelEvent(QWheelEvent *event)
{
    if (event->angleDelta().y() == 0) return;
    m_followsPath = false;
    m_diagram->zoom(std::pow(zoomStep, event->angleDelta().y() / 120.0), event->position());
    event->accept();
}

void Canvas::keyPressEvent(QKeyEvent *event)
{
    if (event->key() == Qt::Key_Escape && !m_isSelecting) {
        leaveMode();
    } else if (event->key() == Qt::Key_Space && !event->isAutoRepeat()) {
        m_isSpaceHeld = true;
        setCursor(Qt::OpenHandCursor);
    } else {
        QWidget::keyPressEvent(event);
    }
}

void Canvas::keyReleaseEvent(QKeyEvent *event)
{
    if (event->key() == Qt::Key_Space && !event->isAutoRepeat()) {
        m_isSpaceHeld = false;
        setCursor(Qt::ArrowCursor);
        return;
    }
    QWidget::keyReleaseEvent(event);
}

void Canvas::leaveEvent(QEvent *event)
{
    m_session.hover(-1);
    QWidget::leaveEvent(event);
}

void Canvas::resizeEvent(QResizeEvent *event)
{
    QWidget::resizeEvent(event);
    m_diagram->setGeometry(rect());
    if (m_followsPath) m_diagram->zoomToPath();
}

} // namespace quasistat::ui
