#pragma once
// The small editor that opens under a field of the header: not modal, closed by Esc or by a click elsewhere.

#include "ui/fields/form_view.h"
#include "ui/gas/gas_editor.h"
#include "ui/window/header_forms.h"

#include <QScrollArea>

namespace quasistat::ui
{

class HeaderPopover : public QWidget
{
    Q_OBJECT
public:
    explicit HeaderPopover(Session &session, QWidget *parent);

    void setLook(const Palette &look);
    /// Opens for `part`, its upper left corner at `at` (the parent's coordinates) as far as the parent leaves room.
    void openFor(HeaderPart part, const QPoint &at);
    void finish(); ///< enters what is being typed and closes
    /// The fields of the part that is open.
    [[nodiscard]] FormView &form() { return m_part == HeaderPart::gas ? m_gas->form() : *m_form; }
    [[nodiscard]] GasEditor &gas() { return *m_gas; }
    [[nodiscard]] HeaderPart part() const { return m_part; }

protected:
    void paintEvent(QPaintEvent *event) override;
    bool event(QEvent *event) override;
    void keyPressEvent(QKeyEvent *event) override;
    bool eventFilter(QObject *watched, QEvent *event) override;
    void hideEvent(QHideEvent *event) override;
    void showEvent(QShowEvent *event) override;

private:
    void connectForm(FormView &form);
    void refresh();
    void fit();
    void choose(const QString &id, const QString &key);
    void type(const QString &id, const QString &text);
    void enter(const QString &id, const QString &text);

    Session &m_session;
    Palette m_look;
    FormView *m_form = nullptr;
    QScrollArea *m_gasArea = nullptr; ///< where the gas needs more height than the window has
    GasEditor *m_gas = nullptr;
    HeaderPart m_part = HeaderPart::title;
};

} // namespace quasistat::ui
