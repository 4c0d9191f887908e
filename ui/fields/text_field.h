#pragma once
// A line of text that a person edits in place: what is typed is offered while typing, entered by Enter or by leaving,
// and taken back by Esc.

#include <QLineEdit>

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
    void keyPressEvent(QKeyEvent *event) override;
    void focusOutEvent(QFocusEvent *event) override;

private:
    QString m_shown;
};

} // namespace quasistat::ui
