#pragma once
// The header: the design's title, gas, surroundings, sign, units and rate, each to click and edit in place; the state
// of the document; the one primary action.

#include "ui/window/header_field.h"
#include "ui/window/header_forms.h"

#include <QMap>
#include <QPushButton>

namespace quasistat::ui
{

class TextField;

class HeaderBar : public QWidget
{
    Q_OBJECT
public:
    static constexpr int height = 44;

    explicit HeaderBar(Session &session, QWidget *parent = nullptr);

    void setLook(const Palette &look);
    void setLedgerWidth(int width); ///< the document's state stands over the ledger
    [[nodiscard]] HeaderField &field(HeaderPart part) { return *m_fields.value(part); }
    [[nodiscard]] HeaderField &document() { return *m_document; }
    [[nodiscard]] QPushButton &report() { return *m_report; }
    [[nodiscard]] QWidget &menuButton() { return *m_menu; }
    [[nodiscard]] TextField &titleField() { return *m_title; }

signals:
    void partRequested(HeaderPart part); ///< open its editor
    void menuRequested();

protected:
    void paintEvent(QPaintEvent *event) override;
    void resizeEvent(QResizeEvent *event) override;

private:
    void createFields();
    void refresh();
    void layOut();
    void click(HeaderPart part, bool onCaption);
    void editTitle();

    Session &m_session;
    Palette m_look;
    QMap<HeaderPart, HeaderField *> m_fields;
    HeaderField *m_document = nullptr;
    QPushButton *m_report = nullptr;
    QPushButton *m_menu = nullptr;
    TextField *m_title = nullptr;
    int m_ledgerWidth = 340;
};

} // namespace quasistat::ui
