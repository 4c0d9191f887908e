#include "ui/report/table.h"

#include <algorithm>

namespace quasistat::ui
{
namespace
{

constexpr double gutter = 8.0 * pageUnitsPerPixel;
constexpr double rowPadding = 5.4 * pageUnitsPerPixel;
constexpr double hairline = 0.5 * pageUnitsPerPixel;
constexpr double heavyLine = 1.0 * pageUnitsPerPixel;

/// A table of so few rows is not torn over two pages.
constexpr std::size_t shortTable = 10;

struct Place {
    double left;
    double width;
};

std::vector<Place> placesOf(const std::vector<TableColumn> &columns, double width)
{
    double shares = 0.0;
    for (const TableColumn &column : columns) shares += column.share;
    std::vector<Place> places;
    double left = 0.0;
    for (const TableColumn &column : columns) {
        const double w = width * column.share / shares;
        places.push_back({left, w});
        left += w;
    }
    return places;
}

/// One row laid out: lines of every cell.
struct LaidRow {
    std::vector<std::vector<RichText>> cells;
    std::vector<std::optional<StateMark>> marks;
    QFont font;
    double height = 0.0;
};

LaidRow laidOut(const std::vector<RichText> &texts, const std::vector<std::optional<StateMark>> &marks,
                const std::vector<Place> &places, const QFont &font)
{
    LaidRow row{.cells = {}, .marks = marks, .font = font, .height = 0.0};
    std::size_t most = 1;
    for (std::size_t i = 0; i < texts.size(); ++i) {
        row.cells.push_back(lines(texts[i], font, places[i].width - gutter));
        most = std::max(most, row.cells.back().size());
    }
    row.height = static_cast<double>(most) * lineHeight(font) + rowPadding;
    return row;
}

QColor markColour(StateMark mark, const Palette &look)
{
    if (mark == StateMark::warning) return look.warning;
    if (mark == StateMark::cross) return look.error;
    return look.ink;
}

void paintRow(QPainter &painter, QPointF at, const LaidRow &row, const std::vector<TableColumn> &columns,
              const std::vector<Place> &places)
{
    const Palette look = printPalette();
    for (std::size_t i = 0; i < row.cells.size(); ++i) {
        const bool isLast = i + 1 == row.cells.size();
        const double left = at.x() + places[i].left;
        const double right = left + places[i].width - (isLast ? 0.0 : gutter);
        double y = at.y() + rowPadding / 2.0;
        painter.setPen(look.ink);
        for (const RichText &line : row.cells[i]) {
            const double x = columns[i].align == Align::left    ? left
                             : columns[i].align == Align::right ? right
                                                                : (left + right) / 2.0;
            drawLine(painter, {x, y}, line, row.font, columns[i].align);
            y += lineHeight(row.font);
        }
        if (!row.marks[i]) continue;
        painter.save();
        painter.translate(right - 6.0 * pageUnitsPerPixel, at.y() + row.height / 2.0);
        painter.scale(pageUnitsPerPixel, pageUnitsPerPixel);
        drawMark(painter, *row.marks[i], {}, markColour(*row.marks[i], look), look.ground);
        painter.restore();
    }
}

void paintRule(QPainter &painter, QPointF from, double width, double weight, const QColor &colour)
{
    painter.fillRect(QRectF(from, QSizeF(width, weight)), colour);
}

Block headOf(const std::vector<TableColumn> &columns, const std::vector<Place> &places, double width)
{
    std::vector<RichText> heads;
    for (const TableColumn &column : columns) heads.push_back(column.head);
    const LaidRow row = laidOut(heads, std::vector<std::optional<StateMark>>(heads.size()), places, printBodyFace());
    return {.height = row.height,
            .paint =
                [=](QPainter &painter, QPointF at) {
                    paintRow(painter, at, row, columns, places);
                    paintRule(painter, {at.x(), at.y() + row.height - heavyLine}, width, heavyLine, printPalette().ink);
                },
            .keepWithNext = true};
}

} // namespace

std::vector<Block> table(const std::vector<TableColumn> &columns, const std::vector<TableRow> &rows, double width)
{
    const std::vector<Place> places = placesOf(columns, width);
    const auto head = std::make_shared<const Block>(headOf(columns, places, width));
    std::vector<Block> blocks{*head};
    for (std::size_t r = 0; r < rows.size(); ++r) {
        std::vector<RichText> texts;
        std::vector<std::optional<StateMark>> marks;
        for (const TableCell &cell : rows[r].cells) {
            texts.push_back(cell.text);
            marks.push_back(cell.mark);
        }
        const bool strong = rows[r].strong;
        const LaidRow row = laidOut(texts, marks, places, strong ? printStrongFace() : printBodyFace());
        const bool isLast = r + 1 == rows.size();
        blocks.push_back({.height = row.height,
                          .paint =
                              [=](QPainter &painter, QPointF at) {
                                  const Palette look = printPalette();
                                  if (strong) paintRule(painter, at, width, heavyLine, look.ink);
                                  paintRow(painter, at, row, columns, places);
                                  if (!strong)
                                      paintRule(painter, {at.x(), at.y() + row.height - hairline}, width, hairline,
                                                faded(look.ink, isLast ? 0.5 : 0.25));
                              },
                          .keepWithNext = r + 2 == rows.size() || (rows.size() <= shortTable && !isLast),
                          .runningHead = head});
    }
    return blocks;
}

} // namespace quasistat::ui
