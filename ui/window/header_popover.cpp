#include "ui/window/header_popover.h"

#include "ui/fields/text_field.h"
#include "ui/session/sentences.h"

#include <QApplication>
#include <QKeyEvent>
#include <QPainter>
#include <QVBoxLayout>

namespace quasistat::ui
{
namespace
{

constexpr int popoverWidth = 348;

/// Also true for the opened list of a choice, which is a window of its own.
bool belongsTo(const QWidget *widget, const QWidget *ancestor)
{
    for (; widget; widget = widget->parentWidget())
        if (widget == ancestor) return true;
    return false;
}

} // namespace

HeaderPopover::HeaderPopover(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_look(ui::palette(Scheme::light)), m_form(new FormView(this))
{
    auto *column = new QVBoxLayout(this);
    column->setContentsMargins(14, 12, 14, 12);
    column->addWidget(m_form);
    m_form->setRejectsInvalid(true);
    hide();
    connect(&session, &Session::snapshotChanged, this, &HeaderPopover::refresh);
    connect(m_form, &FormView::chosen, this, &HeaderPopover::choose);
    connect(m_form, &FormView::typed, this, &HeaderPopover::type);
    connect(m_form, &FormView::entered, this, &HeaderPopover::enter);
    connect(m_form, &FormView::restored, &session, &Session::cancelPreview);
    connect(m_form, &FormView::escaped, this, &QWidget::hide);
}

void HeaderPopover::setLook(const Palette &look)
{
    m_look = look;
    m_form->setLook(look);
    update();
}

void HeaderPopover::openFor(HeaderPart part, const QPoint &at)
{
    finish();
    m_part = part;
    m_form->setForm(headerForm(part, m_session.now()));
    m_form->setSentences({});
    resize(popoverWidth, 10);
    move(std::min(at.x(), parentWidget()->width() - popoverWidth - 8), at.y());
    show();
    raise();
    fit();
    m_form->focusFirst();
}

void HeaderPopover::finish()
{
    if (!isVisible()) return;
    m_form->finishTyping();
    m_form->forgetTyping();
    m_session.cancelPreview();
    hide();
}

void HeaderPopover::refresh()
{
    if (!isVisible()) return;
    if (!m_session.hasDesign()) {
        hide();
        return;
    }
    m_form->setForm(headerForm(m_part, m_session.now()));
    fit();
}

void HeaderPopover::fit()
{
    layout()->activate();
    const int high =
        layout()->hasHeightForWidth() ? layout()->heightForWidth(popoverWidth) : layout()->sizeHint().height();
    resize(popoverWidth, high);
}

void HeaderPopover::choose(const QString &id, const QString &key)
{
    const FormField field = *m_form->field(id);
    if (field.chosen == key.toStdString()) return;
    m_session.cancelPreview();
    m_session.apply(headerChosen(m_part, m_session.base(), field, key.toStdString()),
                    tr("Change %1").arg(field.caption));
}

void HeaderPopover::type(const QString &id, const QString &text)
{
    const HeaderEdit edit = headerEntered(m_part, m_session.base().design, *m_form->field(id), text);
    // While the text does not do, the picture of the last one that did stays.
    if (edit.complaint.isEmpty() && !m_session.faultIn(edit.design)) m_session.preview(edit.design);
}

void HeaderPopover::enter(const QString &id, const QString &text)
{
    const FormField field = *m_form->field(id);
    const HeaderEdit edit = headerEntered(m_part, m_session.base().design, field, text);
    QString complaint = edit.complaint;
    if (const auto fault = complaint.isEmpty() ? m_session.faultIn(edit.design) : std::nullopt)
        complaint = sentenceOf(*fault, m_session.now().units);
    // A design that could not be computed before may be mended one field at a time.
    const bool wasWhole = !m_session.faultIn(m_session.base().design);
    if (!edit.complaint.isEmpty() || (!complaint.isEmpty() && wasWhole)) {
        m_session.cancelPreview();
        m_form->refuse(id, complaint);
        fit();
        return;
    }
    m_session.apply(edit.design, tr("Change %1").arg(field.caption));
}

void HeaderPopover::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.setRenderHint(QPainter::Antialiasing);
    painter.setPen(QPen(m_look.accent, 2));
    painter.setBrush(m_look.ground);
    painter.drawRoundedRect(QRectF(rect()).adjusted(1, 1, -1, -1), 6, 6);
}

void HeaderPopover::keyPressEvent(QKeyEvent *event)
{
    if (event->key() == Qt::Key_Escape)
        hide();
    else if (event->key() == Qt::Key_Return || event->key() == Qt::Key_Enter)
        finish();
    else
        QWidget::keyPressEvent(event);
}

bool HeaderPopover::event(QEvent *event)
{
    // A sentence under a field has come or gone.
    if (event->type() == QEvent::LayoutRequest && isVisible()) fit();
    return QWidget::event(event);
}

bool HeaderPopover::eventFilter(QObject *watched, QEvent *event)
{
    if (event->type() == QEvent::MouseButtonPress)
        if (const auto *widget = qobject_cast<QWidget *>(watched); widget && !belongsTo(widget, this)) finish();
    return false;
}

void HeaderPopover::showEvent(QShowEvent *)
{
    qApp->installEventFilter(this);
}

void HeaderPopover::hideEvent(QHideEvent *)
{
    qApp->removeEventFilter(this);
}

} // namespace quasistat::ui
