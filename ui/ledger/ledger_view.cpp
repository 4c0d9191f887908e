#include "ui/ledger/ledger_view.h"

#include "ui/fields/wrapped_text.h"
#include "ui/look/figure_text.h"
#include "ui/look/type.h"

#include <QKeyEvent>
#include <QMouseEvent>

namespace quasistat::ui
{
namespace
{

constexpr int margin = 16;
constexpr double markWidth = 38.0; // from the right edge to the last column
constexpr int unitWidth = 44;

bool isAccount(const LedgerRow &row)
{
    return row.kind == LedgerRowKind::segment || row.kind == LedgerRowKind::total;
}

double wrappedIndent(const LedgerRow &row)
{
    if (row.kind == LedgerRowKind::warning) return 22.0;
    return row.lead.isEmpty() ? 0.0 : 22.0;
}

} // namespace

LedgerView::LedgerView(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_look(ui::palette(Scheme::light))
{
    setMouseTracking(true);
    setFocusPolicy(Qt::StrongFocus);
    setAccessibleName(tr("Ledger"));
    connect(&session, &Session::snapshotChanged, this, &LedgerView::refresh);
    connect(&session, &Session::selectionChanged, this, &LedgerView::refresh);
    connect(&session, &Session::hoverChanged, this, qOverload<>(&QWidget::update));
    refresh();
}

void LedgerView::setLook(const Palette &look)
{
    m_look = look;
    update();
}

void LedgerView::refresh()
{
    m_rows = ledgerRows(m_session.now(), m_session.selected(), m_open, m_session.beforeModelChange());
    if (m_cursor >= static_cast<int>(m_rows.size())) m_cursor = -1;
    m_hovered = -1;
    setAccessibleDescription(spoken());
    layOut();
    update();
}

QString LedgerView::spoken() const
{
    QStringList lines;
    for (const LedgerRow &row : m_rows) lines << row.spoken();
    return lines.join(QLatin1Char('\n'));
}

int LedgerView::heightOf(const LedgerRow &row) const
{
    const auto wrapped = [&](const QFont &font, double pad) {
        const double width = this->width() - 2.0 * margin - wrappedIndent(row);
        return static_cast<int>(wrappedHeight(row.label.unstyled(), font, width) + pad);
    };
    switch (row.kind) {
    case LedgerRowKind::heading: return 40;
    case LedgerRowKind::columns: return 22;
    case LedgerRowKind::segment: return isTitleAbove(row) ? 46 : 30;
    case LedgerRowKind::spread: return isTitleAbove(row) ? 64 : 48;
    case LedgerRowKind::total: return 32;
    case LedgerRowKind::formula: return 30;
    case LedgerRowKind::route: return row.opened ? 18 : 24;
    case LedgerRowKind::source: return 26;
    case LedgerRowKind::section: return 36;
    case LedgerRowKind::figure: return 28;
    case LedgerRowKind::limit: return 28;
    case LedgerRowKind::sentence: return wrapped(labelFace(), 8.0);
    case LedgerRowKind::warning:
    case LedgerRowKind::fault: return wrapped(labelFace(), 8.0);
    }
    return 24;
}

void LedgerView::layOut()
{
    QStringList account;
    QStringList fractions;
    for (const LedgerRow &row : m_rows) {
        if (isAccount(row)) account += row.figures;
        if (row.kind == LedgerRowKind::figure) fractions += row.figures;
    }
    for (const LedgerRow &row : m_rows)
        if (row.kind == LedgerRowKind::spread) account += row.figures + row.remarks;
    m_columnWidth = std::min(67.0, (width() - 139.0) / 3.0);
    for (const QString &figure : account)
        m_columnWidth = std::max(m_columnWidth, textWidth(figure, face(13, QFont::DemiBold)) + 8.0);
    m_decimalAt = margin + unitWidth + decimalColumn(fractions, bodyFace()).fraction;

    int y = 0;
    m_places.clear();
    for (const LedgerRow &row : m_rows) {
        const int high = heightOf(row);
        m_places.emplace_back(0, y, width(), high);
        y += high;
    }
    setFixedHeight(std::max(y + 12, 40));
}

double LedgerView::titleLeft(const LedgerRow &row) const
{
    return row.kind == LedgerRowKind::total ? margin : margin + 7 + std::max(7.0, textWidth(row.lead, labelFace()));
}

bool LedgerView::isTitleAbove(const LedgerRow &row) const
{
    const double firstFigure = columnRight(0) - textWidth(row.figures.value(0), bodyFace());
    // As wide as it gets when the row is selected, so that selecting moves nothing.
    return textWidth(row.label, face(13, QFont::DemiBold)) > firstFigure - 4 - titleLeft(row);
}

QSize LedgerView::sizeHint() const
{
    return {340, m_places.empty() ? 40 : m_places.back().bottom() + 12};
}

void LedgerView::resizeEvent(QResizeEvent *event)
{
    QWidget::resizeEvent(event);
    if (event->oldSize().width() != event->size().width()) layOut();
}

QRect LedgerView::placeOf(const QString &id) const
{
    for (std::size_t i = 0; i < m_rows.size(); ++i)
        if (m_rows[i].id == id) return m_places[i];
    return {};
}

double LedgerView::columnRight(int column) const
{
    return width() - markWidth - (2 - column) * m_columnWidth;
}

QRect LedgerView::placeOfFigure(const QString &id, int column) const
{
    const QRect row = placeOf(id);
    const int right = static_cast<int>(columnRight(column));
    return row.isEmpty() ? QRect() : QRect(right - 40, row.top(), 40, row.height());
}

int LedgerView::rowAt(const QPoint &point) const
{
    for (std::size_t i = 0; i < m_places.size(); ++i)
        if (m_places[i].contains(point)) return static_cast<int>(i);
    return -1;
}

int LedgerView::columnAt(int x) const
{
    for (int column = 0; column < 3; ++column)
        if (x <= columnRight(column) + 6 && x > columnRight(column) - m_columnWidth + 6) return column;
    return -1;
}

void LedgerView::toggleFigure(const QString &id)
{
    m_open.figure = m_open.figure == id ? QString() : id;
}

void LedgerView::activate(int row, int column)
{
    if (row < 0) return;
    const LedgerRow what = m_rows[static_cast<std::size_t>(row)]; // a copy: selecting makes the rows anew
    if (what.kind == LedgerRowKind::segment) {
        static constexpr const char *names[] = {".W", ".Q", ".U"};
        if (column >= 0) toggleFigure(what.id + QLatin1String(names[column]));
        m_session.select(what.segment);
    } else if (what.kind == LedgerRowKind::figure) {
        toggleFigure(what.id);
    } else if (what.id == QLatin1String("segment")) {
        m_open.segmentFigures = !m_open.segmentFigures;
    } else if (what.id == QLatin1String("spread")) {
        m_open.spread = !m_open.spread;
    } else if (what.id == QLatin1String("envelope")) {
        emit envelopeRequested();
    } else if (what.segment >= 0) {
        m_session.select(what.segment);
    }
    refresh();
}

void LedgerView::mousePressEvent(QMouseEvent *event)
{
    if (event->button() != Qt::LeftButton) return;
    const QPoint at = event->position().toPoint();
    m_cursor = -1;
    activate(rowAt(at), columnAt(at.x()));
}

void LedgerView::mouseMoveEvent(QMouseEvent *event)
{
    const int row = rowAt(event->position().toPoint());
    if (row == m_hovered) return;
    m_hovered = row;
    const LedgerRow *over = row >= 0 ? &m_rows[static_cast<std::size_t>(row)] : nullptr;
    const bool acts = over && (!over->id.isEmpty() || over->segment >= 0);
    setCursor(acts ? Qt::PointingHandCursor : Qt::ArrowCursor);
    m_session.hover(over && over->kind == LedgerRowKind::segment ? over->segment : -1);
    update();
}

void LedgerView::leaveEvent(QEvent *)
{
    m_hovered = -1;
    m_session.hover(-1);
    update();
}

void LedgerView::moveCursor(int by)
{
    const int count = static_cast<int>(m_rows.size());
    for (int row = m_cursor + by; row >= 0 && row < count; row += by)
        if (!m_rows[static_cast<std::size_t>(row)].id.isEmpty()) {
            m_cursor = row;
            break;
        }
    update();
}

void LedgerView::keyPressEvent(QKeyEvent *event)
{
    switch (event->key()) {
    case Qt::Key_Down: moveCursor(+1); return;
    case Qt::Key_Up: moveCursor(-1); return;
    case Qt::Key_Return:
    case Qt::Key_Enter:
    case Qt::Key_Space: activate(m_cursor, 0); return;
    default: QWidget::keyPressEvent(event);
    }
}

} // namespace quasistat::ui
