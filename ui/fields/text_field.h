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
    [[nodiscard]] bool isBeingTyped() const { return hasFocus() && isModified(); }

signals:
    void entered(const QString &text); ///< Enter, or focus left, after a change
    void restored();                   ///< Esc, after a change
    void escaped();                    ///< Esc without a change

protected:
    void keyPressEvent(QKeyEvent *event) override;
    void focusOutEvent(QFocusEvent *event) override;

private:
    QString m_shown;
};

} // namespace quasistat::ui
