#include "ui/ledger/ledger_panel.h"

#include <QPainter>

namespace quasistat::ui
{

LedgerPanel::LedgerPanel(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_look(ui::palette(Scheme::light)), m_scroll(new QScrollArea(this)),
      m_ledger(new LedgerView(session)), m_envelope(new EnvelopeDrawer(session, this)),
      m_slide(new QPropertyAnimation(m_envelope, "pos", this))
{
    m_scroll->setFrameShape(QFrame::NoFrame);
    m_scroll->setWidgetResizable(true);
    m_scroll->setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
    m_scroll->setFocusPolicy(Qt::NoFocus);
    m_scroll->viewport()->setAutoFillBackground(false);
    m_scroll->setWidget(m_ledger);
    m_envelope->hide();
    m_slide->setDuration(120);
    connect(m_slide, &QPropertyAnimation::finished, this, [this] { m_envelope->setVisible(m_envelopeOpen); });
    connect(m_ledger, &LedgerView::envelopeRequested, this, [this] { setEnvelopeOpen(true); });
    connect(m_envelope, &EnvelopeDrawer::closed, this, [this] { setEnvelopeOpen(false); });
    connect(&session, &Session::selectionChanged, this, &LedgerPanel::showSelected);
}

void LedgerPanel::setLook(const Palette &look)
{
    m_look = look;
    m_ledger->setLook(look);
    m_envelope->setLook(look);
    update();
}

void LedgerPanel::setEnvelopeOpen(bool open)
{
    if (open == m_envelopeOpen) return;
    m_envelopeOpen = open;
    placeDrawer(true);
    if (open)
        m_envelope->setFocus(Qt::OtherFocusReason);
    else
        m_ledger->setFocus(Qt::OtherFocusReason);
}

void LedgerPanel::placeDrawer(bool animated)
{
    const QPoint in(0, 0);
    const QPoint out(width(), 0);
    m_envelope->resize(size());
    m_slide->stop();
    if (!animated) {
        m_envelope->move(m_envelopeOpen ? in : out);
        m_envelope->setVisible(m_envelopeOpen);
        return;
    }
    m_envelope->show();
    m_envelope->raise();
    m_slide->setStartValue(m_envelopeOpen ? out : in);
    m_slide->setEndValue(m_envelopeOpen ? in : out);
    m_slide->start();
}

void LedgerPanel::showSelected()
{
    const QRect place = m_ledger->placeOf(QString::number(m_session.selected() + 1));
    if (!place.isEmpty()) m_scroll->ensureVisible(0, place.center().y(), 0, place.height());
}

void LedgerPanel::resizeEvent(QResizeEvent *event)
{
    QWidget::resizeEvent(event);
    m_scroll->setGeometry(1, 0, width() - 1, height());
    placeDrawer(false);
}

void LedgerPanel::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.fillRect(rect(), m_look.panel);
    painter.fillRect(QRect(0, 0, 1, height()), m_look.rule());
}

} // namespace quasistat::ui
