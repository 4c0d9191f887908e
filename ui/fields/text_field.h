#pragma once
// A line of text that a person edits in place: what is typed is offered while typing, entered by Enter or by leaving,
// and taken back by Esc.

#include "ui/fields/suggestion.h"

#include <QLineEdit>

#include <vector>

namespace quasistat::ui
{

class TextField : public QLineEdit
{
    Q_OBJECT
public:
    explicit TextField(QWidget *parent = nullptr);

    /// Shows what the document holds; a text somebody is typing stays.
    void show(const QString &text);
    using QLineEdit::show;
    /// Offers these while typing; chosen with the arrow keys and Enter, or by a click, which enters.
    void setSuggestions(const std::vector<Suggestion> &suggestions);
    void enter(); ///< as Enter: announces a changed text
    /// Changed and neither entered nor taken back; also a text that was refused.
    [[nodiscard]] bool isBeingTyped() const { return isModified(); }

signals:
    void entered(const QString &text); ///< Enter, or focus left, after a change
    void confirmed();                  ///< Enter, changed or not
    void restored();                   ///< Esc, after a change
    void escaped();                    ///< Esc without a change

protected:
    /// Undo and redo are the window's while nothing is being typed here.
    bool event(QEvent *event) override;
    void changeEvent(QEvent *event) override;
    void keyPressEvent(QKeyEvent *event) override;
    void focusOutEvent(QFocusEvent *event) override;

private:
    void colourSuggestions();
    void takeSuggestion(); ///< the one that the keys stand on

    QString m_shown;
    std::vector<Suggestion> m_suggestions;
};

} // namespace quasistat::ui
