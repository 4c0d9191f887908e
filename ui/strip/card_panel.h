#pragma once
// The fields of the selected card, unfolded upward over the canvas: every change is previewed while typing and becomes
// one undo step when entered.

#include "ui/fields/form_view.h"
#include "ui/session/session.h"

#include <QLabel>

namespace quasistat::ui
{

class CardPanel : public QWidget
{
    Q_OBJECT
public:
    explicit CardPanel(Session &session, QWidget *parent = nullptr);

    void setLook(const Palette &look);
    /// Stands on `card` (the parent's coordinates), as wide or wider, and inside `bounds`.
    void standOn(const QRect &card, const QRect &bounds);
    [[nodiscard]] FormView &form() { return *m_form; }
    /// The sentences below the fields, as plain text.
    [[nodiscard]] QStringList notes() const;
    void focusFirst() { m_form->focusFirst(); }

signals:
    void resized();       ///< the fields or sentences need another height
    void foldRequested(); ///< Esc with nothing to take back

protected:
    void paintEvent(QPaintEvent *event) override;
    bool event(QEvent *event) override;
    void mousePressEvent(QMouseEvent *event) override; ///< stays here: the canvas below must not take it

private:
    void turnTo(int segment);
    void refresh();
    void showNotes();
    void choose(const QString &id, const QString &key);
    void type(const QString &id, const QString &text);
    void enter(const QString &id, const QString &text);
    [[nodiscard]] document::Design edited(const QString &id, const QString &text) const;
    [[nodiscard]] bool isStart() const { return m_segment == startSelected; }

    Session &m_session;
    int m_segment = -1; ///< whose fields are shown
    Palette m_look;
    FormView *m_form = nullptr;
    QLabel *m_error = nullptr;
    QLabel *m_warning = nullptr;
    QLabel *m_remark = nullptr;
    QRect m_card; ///< in the parent's coordinates
};

} // namespace quasistat::ui
