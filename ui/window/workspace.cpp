#include "ui/window/workspace.h"

#include <QGuiApplication>

namespace quasistat::ui
{

Workspace::Workspace(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_canvas(new Canvas(session, Scheme::light, this)),
      m_strip(new PathStrip(session, this)), m_panel(new CardPanel(session, this))
{
    m_panel->hide();
    m_settle.setSingleShot(true);
    m_settle.setInterval(0);
    m_mode.setInterval(150);
    connect(&m_settle, &QTimer::timeout, this, &Workspace::placePanel);
    connect(&m_mode, &QTimer::timeout, this, &Workspace::watchMode);
    connect(m_strip, &PathStrip::placed, &m_settle, qOverload<>(&QTimer::start));
    connect(m_panel, &CardPanel::resized, &m_settle, qOverload<>(&QTimer::start));
    connect(&session, &Session::selectionChanged, &m_settle, qOverload<>(&QTimer::start));
    connect(&session, &Session::snapshotChanged, &m_settle, qOverload<>(&QTimer::start));
    connect(m_strip, &PathStrip::fieldsRequested, this, [this] {
        placePanel();
        m_panel->focusFirst();
    });
    connect(m_strip, &PathStrip::placeRequested, this, &Workspace::place);
    connect(m_panel, &CardPanel::foldRequested, this, [this] {
        m_strip->setUnfolded(false);
        m_strip->focusSelected();
    });
}

void Workspace::setLook(const Palette &look)
{
    m_canvas->setScheme(look.scheme);
    m_strip->setLook(look);
    m_panel->setLook(look);
}

void Workspace::place(path::Kind kind)
{
    m_strip->setUnfolded(false);
    placePanel();
    m_canvas->place(kind);
    m_canvas->setFocus(Qt::OtherFocusReason);
    if (m_canvas->isSelecting()) return;
    emit hinted(tr("Point to where the segment shall end and click. Esc leaves it."));
    m_mode.start();
}

void Workspace::watchMode()
{
    if (!m_canvas->isSelecting()) return;
    m_mode.stop();
    emit hinted(QString());
}

void Workspace::resizeEvent(QResizeEvent *)
{
    m_canvas->setGeometry(0, 0, width(), height() - PathStrip::height);
    m_strip->setGeometry(0, height() - PathStrip::height, width(), PathStrip::height);
    placePanel();
}

void Workspace::placePanel()
{
    if (QGuiApplication::mouseButtons() != Qt::NoButton) {
        m_settle.setInterval(30);
        m_settle.start();
        return;
    }
    m_settle.setInterval(0);
    QRect card = m_strip->selectedPlace();
    const bool open = m_strip->isUnfolded() && !card.isEmpty() && m_session.hasDesign();
    m_panel->setVisible(open);
    if (!open) {
        m_canvas->setInset(0);
        return;
    }
    card.translate(m_strip->pos());
    m_panel->standOn(card, rect().adjusted(8, 0, -8, 0));
    m_panel->raise();
    m_canvas->setInset(std::max(0, m_strip->y() - m_panel->y()));
}

} // namespace quasistat::ui
