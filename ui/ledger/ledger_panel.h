#pragma once
// The right side of the window: the ledger, scrolling, and the drawer that slides over it.

#include "ui/ledger/envelope_drawer.h"
#include "ui/ledger/ledger_view.h"

#include <QPropertyAnimation>
#include <QScrollArea>

namespace quasistat::ui
{

class LedgerPanel : public QWidget
{
    Q_OBJECT
public:
    explicit LedgerPanel(Session &session, QWidget *parent = nullptr);

    void setLook(const Palette &look);
    [[nodiscard]] LedgerView &ledger() { return *m_ledger; }
    [[nodiscard]] EnvelopeDrawer &envelope() { return *m_envelope; }
    [[nodiscard]] bool isEnvelopeOpen() const { return m_envelopeOpen; }
    void setEnvelopeOpen(bool open);

protected:
    void resizeEvent(QResizeEvent *event) override;
    void paintEvent(QPaintEvent *event) override;

private:
    void placeDrawer(bool animated);
    void showSelected();

    Session &m_session;
    Palette m_look;
    QScrollArea *m_scroll = nullptr;
    LedgerView *m_ledger = nullptr;
    EnvelopeDrawer *m_envelope = nullptr;
    QPropertyAnimation *m_slide = nullptr;
    bool m_envelopeOpen = false;
};

} // namespace quasistat::ui
