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

constexpr int formWidth = 348;
constexpr int gasWidth = 420;
constexpr int edgeX = 14;
constexpr int edgeY = 12;

/// Also true for the opened list of a choice, which is a window of its own, and of a text field, which has no parent
/// but hands its keys on.
bool belongsTo(const QWidget *widget, const QWidget *ancestor)
{
    if (const QWidget *field = widget->window()->focusProxy()) return belongsTo(field, ancestor);
    for (; widget; widget = widget->parentWidget())
        if (widget == ancestor) return true;
    return false;
}

} // namespace

HeaderPopover::HeaderPopover(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_look(ui::palette(Scheme::light)), m_form(new FormView(this)),
      m_gasArea(new QScrollArea(this)), m_gas(new GasEditor(session))
{
    auto *column = new QVBoxLayout(this);
    column->setContentsMargins(edgeX, edgeY, edgeX, edgeY);
    column->setSpacing(0);
    column->addWidget(m_form);
    column->addWidget(m_gasArea);
    m_gasArea->setWidget(m_gas);
    m_gasArea->setWidgetResizable(true);
    m_gasArea->setFrameShape(QFrame::NoFrame);
    m_gasArea->setHorizontalScrollBarPolicy(Qt::ScrollBarAlwaysOff);
    m_form->setRejectsInvalid(true);
    m_gas->installEventFilter(this); // its height may change at any time
    hide();
    connect(&session, &Session::snapshotChanged, this, &HeaderPopover::refresh);
    connectForm(*m_form);
    connectForm(m_gas->form());
    connect(m_gas, &GasEditor::escaped, this, &QWidget::hide);
}

void HeaderPopover::connectForm(FormView &form)
{
    connect(&form, &FormView::chosen, this, &HeaderPopover::choose);
    connect(&form, &FormView::typed, this, &HeaderPopover::type);
    connect(&form, &FormView::entered, this, &HeaderPopover::enter);
    connect(&form, &FormView::restored, &m_session, &Session::cancelPreview);
    connect(&form, &FormView::escaped, this, &QWidget::hide);
}

void HeaderPopover::setLook(const Palette &look)
{
    m_look = look;
    m_form->setLook(look);
    m_gas->setLook(look);
    update();
}

void HeaderPopover::openFor(HeaderPart part, const QPoint &at)
{
    finish();
    m_part = part;
    const bool isGas = part == HeaderPart::gas;
    m_form->setVisible(!isGas);
    m_gasArea->setVisible(isGas);
    if (isGas)
        m_gas->refresh();
    else
        m_form->setForm(headerForm(part, m_session.now()));
    form().setSentences({});
    const int wide = isGas ? gasWidth : formWidth;
    resize(wide, 10);
    move(std::min(at.x(), parentWidget()->width() - wide - 8), at.y());
    show();
    raise();
    fit();
    if (isGas && m_gas->composition().isVisible())
        m_gas->composition().nameField(0)->setFocus(Qt::OtherFocusReason);
    else
        form().focusFirst();
}

void HeaderPopover::finish()
{
    if (!isVisible()) return;
    if (m_part == HeaderPart::gas) m_gas->finishTyping();
    form().finishTyping();
    form().forgetTyping();
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
    if (m_part == HeaderPart::gas)
        m_gas->refresh();
    else
        m_form->setForm(headerForm(m_part, m_session.now()));
    fit();
}

void HeaderPopover::fit()
{
    int high = 0;
    if (m_part == HeaderPart::gas) {
        QLayout &content = *m_gas->layout();
        content.activate();
        const int inner = gasWidth - 2 * edgeX;
        high = 2 * edgeY + (content.hasHeightForWidth() ? content.heightForWidth(inner) : content.sizeHint().height());
    } else {
        layout()->activate();
        high = layout()->hasHeightForWidth() ? layout()->heightForWidth(formWidth) : layout()->sizeHint().height();
    }
    resize(width(), std::min(high, parentWidget()->height() - y() - 16));
}

void HeaderPopover::choose(const QString &id, const QString &key)
{
    const FormField field = *form().field(id);
    if (field.chosen == key.toStdString()) return;
    m_session.cancelPreview();
    if (m_part == HeaderPart::gas)
        m_gas->chooseModel(key.toStdString());
    else
        m_session.apply(headerChosen(m_session.base(), field, key.toStdString()), tr("Change %1").arg(field.caption));
}

void HeaderPopover::type(const QString &id, const QString &text)
{
    const document::Design design = headerEntered(m_session.base().design, *form().field(id), text);
    // While the text does not do, the picture of the last one that did stays.
    if (!m_session.faultIn(design)) m_session.preview(design);
}

void HeaderPopover::enter(const QString &id, const QString &text)
{
    const FormField field = *form().field(id);
    const document::Design design = headerEntered(m_session.base().design, field, text);
    const auto fault = m_session.faultIn(design);
    // A design that could not be computed before may be mended one field at a time.
    if (fault && !m_session.faultIn(m_session.base().design)) {
        m_session.cancelPreview();
        form().refuse(id, sentenceOf(*fault, m_session.now().units));
        fit();
        return;
    }
    m_session.apply(design, tr("Change %1").arg(field.caption));
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
    if (watched == m_gas) {
        if (event->type() == QEvent::LayoutRequest && isVisible()) fit();
        return false;
    }
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
