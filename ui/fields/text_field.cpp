#include "ui/fields/text_field.h"

#include <QFocusEvent>
#include <QKeyEvent>

namespace quasistat::ui
{

TextField::TextField(QWidget *parent) : QLineEdit(parent) {}

void TextField::show(const QString &text)
{
    m_shown = text;
    if (isBeingTyped() || text == this->text()) return;
    setText(text);
    setModified(false);
    setCursorPosition(0);
}

bool TextField::event(QEvent *event)
{
    if (event->type() == QEvent::ShortcutOverride && !isModified()) {
        const auto *key = static_cast<QKeyEvent *>(event);
        if (key->matches(QKeySequence::Undo) || key->matches(QKeySequence::Redo)) {
            event->ignore();
            return false;
        }
    }
    return QLineEdit::event(event);
}

void TextField::keyPressEvent(QKeyEvent *event)
{
    switch (event->key()) {
    case Qt::Key_Return:
    case Qt::Key_Enter:
        enter();
        emit confirmed();
        return;
    case Qt::Key_Escape:
        if (isModified()) {
            setText(m_shown);
            setModified(false);
            selectAll();
            emit restored();
        } else
            emit escaped();
        return;
    default: QLineEdit::keyPressEvent(event);
    }
}

void TextField::focusOutEvent(QFocusEvent *event)
{
    QLineEdit::focusOutEvent(event);
    // A menu of the field itself, or another window in front, is not leaving it.
    if (event->reason() != Qt::PopupFocusReason && event->reason() != Qt::ActiveWindowFocusReason) enter();
}

void TextField::enter()
{
    if (!isModified()) return;
    setModified(false);
    emit entered(text());
}

} // namespace quasistat::ui
