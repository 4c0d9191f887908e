#include "ui/fields/wrapped_text.h"
#include "ui/ledger/ledger_view.h"
#include "ui/look/figure_text.h"
#include "ui/look/type.h"

#include <QPaintEvent>

namespace quasistat::ui
{
namespace
{

constexpr double margin = 16.0;
constexpr double unitWidth = 44.0;

QColor markColour(StateMark mark, const Palette &look)
{
    if (mark == StateMark::cross) return look.error;
    return mark == StateMark::warning ? look.warning : look.accent;
}

void drawRule(QPainter &painter, double y, double left, double right, const QColor &colour, double width = 1.0)
{
    painter.setPen(QPen(colour, width));
    painter.drawLine(QPointF(left, y), QPointF(right, y));
}

/// An arrow head that points to the right, or down where the part stands open.
void drawArrowHead(QPainter &painter, QPointF centre, bool down, const QColor &colour)
{
    painter.setPen(QPen(colour, 1.5, Qt::SolidLine, Qt::RoundCap, Qt::RoundJoin));
    if (down)
        painter.drawPolyline(QPolygonF{centre + QPointF(-4, -2), centre + QPointF(0, 2), centre + QPointF(4, -2)});
    else
        painter.drawPolyline(QPolygonF{centre + QPointF(-2, -4), centre + QPointF(2, 0), centre + QPointF(-2, 4)});
}

void drawFitted(QPainter &painter, QPointF at, const RichText &text, const QFont &font, double width)
{
    if (textWidth(text, font) <= width)
        drawText(painter, at, text, font);
    else
        drawText(painter, at, elided(text.unstyled(), font, width), font);
}

} // namespace

void LedgerView::paintEvent(QPaintEvent *event)
{
    QPainter painter(this);
    painter.setRenderHint(QPainter::Antialiasing);
    painter.fillRect(event->rect(), m_look.panel);
    for (std::size_t i = 0; i < m_rows.size(); ++i) {
        if (!m_places[i].intersects(event->rect())) continue;
        paintRow(painter, m_rows[i], m_places[i]);
        if (hasFocus() && static_cast<int>(i) == m_cursor) {
            painter.setPen(QPen(m_look.accent, 1.5));
            painter.setBrush(Qt::NoBrush);
            painter.drawRoundedRect(QRectF(m_places[i]).adjusted(6, 2, -6, -2), 4, 4);
        }
    }
}

void LedgerView::paintRow(QPainter &painter, const LedgerRow &row, const QRectF &place)
{
    switch (row.kind) {
    case LedgerRowKind::heading: paintHeading(painter, row, place); return;
    case LedgerRowKind::columns: paintColumns(painter, row, place); return;
    case LedgerRowKind::segment:
    case LedgerRowKind::total: paintAccountRow(painter, row, place); return;
    case LedgerRowKind::spread: paintSpreadRow(painter, row, place); return;
    case LedgerRowKind::formula:
    case LedgerRowKind::route:
    case LedgerRowKind::source: paintOpenedRow(painter, row, place); return;
    case LedgerRowKind::section: paintSection(painter, row, place); return;
    case LedgerRowKind::figure: paintFigureRow(painter, row, place); return;
    case LedgerRowKind::limit: paintLimitRow(painter, row, place); return;
    case LedgerRowKind::sentence:
    case LedgerRowKind::warning:
    case LedgerRowKind::fault: paintTextRow(painter, row, place); return;
    }
}

void LedgerView::paintHeading(QPainter &painter, const LedgerRow &row, const QRectF &place)
{
    painter.setPen(m_look.ink);
    drawText(painter, {margin, place.top() + 28}, row.label, headingFace());
    painter.setPen(m_look.secondary());
    drawText(painter, {width() - margin, place.top() + 28}, row.unit, labelFace(), Align::right);
}

void LedgerView::paintColumns(QPainter &painter, const LedgerRow &row, const QRectF &place)
{
    painter.setPen(m_look.secondary());
    drawText(painter, {margin, place.top() + 14}, row.label, labelFace());
    painter.setPen(faded(m_look.ink, 0.85));
    for (int column = 0; column < row.figures.size(); ++column)
        drawText(painter, {columnRight(column), place.top() + 14}, RichText::marked(row.figures[column]), bodyFace(),
                 Align::right);
    drawRule(painter, place.bottom() - 0.5, margin, width() - margin, faded(m_look.ink, 0.25));
}

void LedgerView::paintAccountRow(QPainter &painter, const LedgerRow &row, const QRectF &place)
{
    const bool total = row.kind == LedgerRowKind::total;
    const bool selected = !total && row.segment == m_session.selected();
    const bool hovered = !total && row.segment == m_session.hovered();
    if (selected) {
        painter.fillRect(place, faded(m_look.accent, 0.14));
        painter.fillRect(QRectF(0, place.top(), 3, place.height()), m_look.accent);
    } else if (hovered)
        painter.fillRect(place, faded(m_look.ink, 0.04));
    const bool isAbove = !total && isTitleAbove(row);
    const double titleY = place.top() + (total ? 21 : isAbove ? 18 : 20);
    const double y = isAbove ? place.top() + 36 : titleY;
    const QFont name = face(13, total || selected ? QFont::DemiBold : QFont::Normal);
    painter.setPen(m_look.secondary());
    drawText(painter, {margin, titleY}, row.lead, labelFace());
    const double left = titleLeft(row);
    painter.setPen(m_look.ink);
    const double right = isAbove ? width() - margin : columnRight(0) - textWidth(row.figures.value(0), bodyFace()) - 4;
    drawFitted(painter, {left, titleY}, row.label, name, right - left);
    const QFont figures = face(13, total ? QFont::DemiBold : QFont::Normal);
    for (int column = 0; column < row.figures.size(); ++column) {
        const bool struck = row.struck && column == 1;
        painter.setPen(struck ? m_look.error : m_look.ink);
        drawText(painter, {columnRight(column), y}, row.figures[column], figures, Align::right);
        if (struck) {
            const double wide = textWidth(row.figures[column], figures);
            drawRule(painter, y - 4.5, columnRight(column) - wide, columnRight(column), m_look.error, 1.25);
        }
    }
    if (row.mark) drawMark(painter, *row.mark, {width() - 22.0, y - 4.5}, markColour(*row.mark, m_look), m_look.panel);
    if (total)
        drawRule(painter, place.top() + 0.5, margin, width() - margin, faded(m_look.ink, 0.7), 1.25);
    else
        drawRule(painter, place.bottom() - 0.5, margin, width() - margin, faded(m_look.ink, 0.1));
}

void LedgerView::paintSpreadRow(QPainter &painter, const LedgerRow &row, const QRectF &place)
{
    const double left = titleLeft(row);
    const double titleY = place.top() + 18;
    const double figuresY = isTitleAbove(row) ? place.top() + 36 : titleY;
    const double remarksY = figuresY + 17;
    painter.setPen(m_look.secondary());
    drawText(painter, {margin, titleY}, row.lead, labelFace());
    painter.setPen(m_look.ink);
    drawFitted(painter, {left, titleY}, row.label, bodyFace(), width() - margin - left);
    for (int column = 0; column < row.figures.size(); ++column) {
        painter.setPen(m_look.ink);
        drawText(painter, {columnRight(column), figuresY}, row.figures[column], bodyFace(), Align::right);
        painter.setPen(m_look.secondary());
        drawText(painter, {columnRight(column), remarksY}, row.remarks.value(column), labelFace(), Align::right);
    }
    if (!row.remarks.isEmpty()) drawText(painter, {left, remarksY}, tr("off by"), labelFace());
    drawRule(painter, place.bottom() - 0.5, margin, width() - margin, faded(m_look.ink, 0.1));
}

void LedgerView::paintOpenedRow(QPainter &painter, const LedgerRow &row, const QRectF &place)
{
    if (row.opened) {
        painter.fillRect(place, faded(m_look.accent, 0.07));
        painter.fillRect(QRectF(0, place.top(), 3, place.height()), m_look.accent);
    }
    const double left = row.opened ? 30.0 : margin;
    const double right = row.opened ? columnRight(2) : width() - margin;
    if (row.kind == LedgerRowKind::source) {
        painter.setPen(m_look.accent);
        drawFitted(painter, {left, place.top() + 15}, row.label, labelFace(), width() - left - 8);
        return;
    }
    if (row.kind == LedgerRowKind::formula) {
        painter.setPen(m_look.ink);
        drawFitted(painter, {left, place.top() + 20}, row.label, bodyFace(), width() - left - 8);
        return;
    }
    const QString value = row.figures.value(0);
    const QFont font = row.opened ? labelFace() : bodyFace();
    const double y = place.top() + (row.opened ? 13 : 16);
    painter.setPen(row.opened ? faded(m_look.ink, 0.85) : m_look.ink);
    drawFitted(painter, {left, y}, row.label, font, right - textWidth(value, font) - 8 - left);
    painter.setPen(m_look.ink);
    drawText(painter, {right, y}, value, font, Align::right);
}

void LedgerView::paintSection(QPainter &painter, const LedgerRow &row, const QRectF &place)
{
    painter.setPen(m_look.ink);
    drawFitted(painter, {margin, place.top() + 25}, row.label, titleFace(), width() - 2 * margin - 20);
    if (row.opens) drawArrowHead(painter, {width() - margin - 6, place.top() + 21}, row.isOpen, faded(m_look.ink, 0.6));
    drawRule(painter, place.bottom() - 1.5, margin, width() - margin, faded(m_look.ink, 0.25));
}

void LedgerView::paintFigureRow(QPainter &painter, const LedgerRow &row, const QRectF &place)
{
    const double y = place.top() + 18;
    const double decimal = width() - m_decimalAt;
    const QString digits = row.figures.value(0);
    const QString whole = digits.section(QLatin1Char('.'), 0, 0);
    painter.setPen(m_look.ink);
    drawFitted(painter, {margin, y}, row.label, bodyFace(), decimal - textWidth(whole, bodyFace()) - 8 - margin);
    drawDecimal(painter, {decimal, y}, digits, bodyFace());
    painter.setPen(m_look.secondary());
    drawText(painter, {width() - unitWidth, y}, row.unit, labelFace());
    drawRule(painter, place.bottom() - 0.5, margin, width() - margin, faded(m_look.ink, 0.08));
}

void LedgerView::paintLimitRow(QPainter &painter, const LedgerRow &row, const QRectF &place)
{
    const double y = place.top() + 19;
    const QFont font = face(13, row.warned ? QFont::DemiBold : QFont::Normal);
    if (row.mark) drawMark(painter, *row.mark, {margin + 6, y - 4.5}, markColour(*row.mark, m_look), m_look.panel);
    painter.setPen(row.warned ? m_look.warning : m_look.ink);
    const QString worst = row.figures.value(0);
    const double left = margin + 22;
    drawFitted(painter, {left, y}, row.label, font, width() - margin - textWidth(worst, font) - 8 - left);
    drawText(painter, {width() - margin, y}, worst, font, Align::right);
}

void LedgerView::paintTextRow(QPainter &painter, const LedgerRow &row, const QRectF &place)
{
    const bool fault = row.kind == LedgerRowKind::fault;
    const bool warning = row.kind == LedgerRowKind::warning;
    double left = margin;
    if (warning || !row.lead.isEmpty()) left += 22;
    if (warning) drawMark(painter, StateMark::warning, {margin + 6, place.top() + 11}, m_look.warning, m_look.panel);
    painter.setPen(fault ? m_look.error
                         : faded(m_look.ink, row.strong                       ? 1.0
                                             : warning || !row.lead.isEmpty() ? 0.85
                                                                              : 0.66));
    const QString text = row.label.unstyled();
    const double wide = width() - margin - left;
    if (textWidth(row.label, labelFace()) <= wide)
        drawText(painter, {left, place.top() + 15}, row.label, labelFace());
    else
        drawWrapped(painter, QRectF(left, place.top() + 3, wide, place.height()), text, labelFace());
}

} // namespace quasistat::ui
