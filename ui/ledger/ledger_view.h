#pragma once
// The account as it stands at the right of the window: rows that select, figures that open to their formula.

#include "ui/ledger/ledger_rows.h"
#include "ui/look/palette.h"

#include <QWidget>

namespace quasistat::ui
{

class LedgerView : public QWidget
{
    Q_OBJECT
public:
    explicit LedgerView(Session &session, QWidget *parent = nullptr);

    void setLook(const Palette &look);

    [[nodiscard]] const std::vector<LedgerRow> &rows() const { return m_rows; }
    /// The place of the row with this id; empty where there is none.
    [[nodiscard]] QRect placeOf(const QString &id) const;
    /// The place of one of the three figures of a row.
    [[nodiscard]] QRect placeOfFigure(const QString &id, int column) const;
    /// All rows in words, one a line.
    [[nodiscard]] QString spoken() const;

    [[nodiscard]] QSize sizeHint() const override;

signals:
    void envelopeRequested();

protected:
    void paintEvent(QPaintEvent *event) override;
    void resizeEvent(QResizeEvent *event) override;
    void mousePressEvent(QMouseEvent *event) override;
    void mouseMoveEvent(QMouseEvent *event) override;
    void leaveEvent(QEvent *event) override;
    void keyPressEvent(QKeyEvent *event) override;

private:
    void refresh();
    void layOut();
    [[nodiscard]] int heightOf(const LedgerRow &row) const;
    [[nodiscard]] int rowAt(const QPoint &point) const;
    [[nodiscard]] int columnAt(int x) const;
    [[nodiscard]] double columnRight(int column) const;
    /// The name and the first figure of an account row do not fit beside each other.
    [[nodiscard]] bool isTitleAbove(const LedgerRow &row) const;
    [[nodiscard]] double titleLeft(const LedgerRow &row) const;
    void toggleFigure(const QString &id);
    void activate(int row, int column);
    void moveCursor(int by);

    void paintRow(QPainter &painter, const LedgerRow &row, const QRectF &place);
    void paintAccountRow(QPainter &painter, const LedgerRow &row, const QRectF &place);
    void paintOpenedRow(QPainter &painter, const LedgerRow &row, const QRectF &place);
    void paintFigureRow(QPainter &painter, const LedgerRow &row, const QRectF &place);
    void paintTextRow(QPainter &painter, const LedgerRow &row, const QRectF &place);
    void paintLimitRow(QPainter &painter, const LedgerRow &row, const QRectF &place);
    void paintColumns(QPainter &painter, const LedgerRow &row, const QRectF &place);
    void paintSpreadRow(QPainter &painter, const LedgerRow &row, const QRectF &place);
    void paintHeading(QPainter &painter, const LedgerRow &row, const QRectF &place);
    void paintSection(QPainter &painter, const LedgerRow &row, const QRectF &place);

    Session &m_session;
    Palette m_look;
    LedgerOpen m_open;
    std::vector<LedgerRow> m_rows;
    std::vector<QRect> m_places;
    double m_columnWidth = 67.0;
    double m_decimalAt = 88.0; ///< distance of the decimal sign of the path's figures from the right edge [px]
    int m_hovered = -1;
    int m_cursor = -1; ///< row with the keys, −1: none
};

} // namespace quasistat::ui
