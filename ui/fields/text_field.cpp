#include "ui/fields/text_field.h"

#include <QAbstractItemView>
#include <QCompleter>
#include <QFocusEvent>
#include <QKeyEvent>
#include <QStandardItemModel>

namespace quasistat::ui
{

namespace
{

constexpr int enteredRole = Qt::UserRole + 1;
constexpr int foundByRole = Qt::UserRole + 2;

/// Found by more than the text that it enters.
class Suggester : public QCompleter
{
public:
    using QCompleter::QCompleter;
    [[nodiscard]] QString pathFromIndex(const QModelIndex &index) const override
    {
        return index.data(enteredRole).toString();
    }
};

} // namespace

TextField::TextField(QWidget *parent) : QLineEdit(parent) {}

void TextField::show(const QString &text)
{
    m_shown = text;
    if (isBeingTyped() || text == this->text()) return;
    setText(text);
    setModified(false);
    setCursorPosition(0);
}

void TextField::setSuggestions(const std::vector<Suggestion> &suggestions)
{
    if (suggestions == m_suggestions) return;
    m_suggestions = suggestions;
    auto *list = new Suggester(this);
    auto *items = new QStandardItemModel(list);
    for (const Suggestion &suggestion : suggestions) {
        auto *item = new QStandardItem(suggestion.words);
        item->setData(suggestion.text, enteredRole);
        item->setData(suggestion.text + QLatin1Char(' ') + suggestion.keys, foundByRole);
        items->appendRow(item);
    }
    list->setModel(items);
    list->setCompletionRole(foundByRole);
    list->setFilterMode(Qt::MatchContains);
    list->setCaseSensitivity(Qt::CaseInsensitive);
    list->setMaxVisibleItems(10);
    list->popup()->setFont(font());
    delete completer();
    setCompleter(list);
    // Later: the line itself takes over the text of the choice after this signal.
    colourSuggestions();
    const auto note = [this] { setModified(text() != m_shown); };
    connect(list, qOverload<const QString &>(&QCompleter::highlighted), this, note, Qt::QueuedConnection);
    connect(
        list, qOverload<const QString &>(&QCompleter::activated), this,
        [this, note] {
            note();
            enter();
        },
        Qt::QueuedConnection);
}

void TextField::changeEvent(QEvent *event)
{
    QLineEdit::changeEvent(event);
    if (event->type() == QEvent::PaletteChange || event->type() == QEvent::StyleChange) colourSuggestions();
}

void TextField::colourSuggestions()
{
    // The list is a window of its own and takes no colours from this one.
    if (completer()) completer()->popup()->setPalette(window()->palette());
}

void TextField::takeSuggestion()
{
    if (!completer() || !completer()->popup()->isVisible()) return;
    const QModelIndex chosen = completer()->popup()->currentIndex();
    completer()->popup()->hide();
    if (!chosen.isValid()) return;
    setText(completer()->pathFromIndex(chosen));
    setModified(text() != m_shown);
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
        takeSuggestion();
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
    if (completer()) completer()->popup()->hide();
    if (!isModified()) return;
    setModified(false);
    emit entered(text());
}

} // namespace quasistat::ui
