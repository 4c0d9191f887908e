#include "ui/report/prose.h"

namespace quasistat::ui
{
namespace
{

constexpr double px = pageUnitsPerPixel;
constexpr double markIndent = 22.0 * px;
constexpr double cautionInset = 16.0 * px;
constexpr double cautionPadding = 9.0 * px;

void paintMark(QPainter &painter, QPointF centre, StateMark mark, const Palette &look)
{
    painter.save();
    painter.translate(centre);
    painter.scale(px, px);
    drawMark(painter, mark, {},
             mark == StateMark::warning ? look.warning
             : mark == StateMark::cross ? look.error
                                        : look.ink,
             look.ground);
    painter.restore();
}

double paintLines(QPainter &painter, QPointF at, const std::vector<RichText> &text, const QFont &font)
{
    for (const RichText &line : text) {
        drawLine(painter, at, line, font);
        at.ry() += lineHeight(font);
    }
    return at.y();
}

} // namespace

Block heading(const QString &text, double width, const RichText &remark)
{
    return {.height = lineHeight(printHeadingFace()) + 4.0 * px,
            .paint =
                [=](QPainter &painter, QPointF at) {
                    const Palette look = printPalette();
                    painter.setPen(look.ink);
                    drawLine(painter, at, RichText::plain(text), printHeadingFace());
                    if (remark.isEmpty()) return;
                    painter.setPen(look.secondary());
                    drawLine(painter, at + QPointF(width, 3.0 * px), remark, printBodyFace(), Align::right);
                },
            .keepWithNext = true};
}

Block paragraph(const RichText &text, double width, std::optional<StateMark> mark)
{
    const double indent = mark ? markIndent : 0.0;
    const QFont font = printBodyFace();
    const auto broken = lines(text, font, width - indent);
    return {.height = static_cast<double>(broken.size()) * lineHeight(font) + 4.0 * px,
            .paint = [=](QPainter &painter, QPointF at) {
                const Palette look = printPalette();
                if (mark) paintMark(painter, at + QPointF(7.0 * px, lineHeight(font) / 2.0), *mark, look);
                painter.setPen(look.ink);
                paintLines(painter, at + QPointF(indent, 0.0), broken, font);
            }};
}

Block caution(const std::vector<RichText> &paragraphs, double width)
{
    const QFont font = printBodyFace();
    std::vector<std::vector<RichText>> broken;
    double height = 2.0 * cautionPadding;
    for (const RichText &text : paragraphs) {
        broken.push_back(lines(text, font, width - 2.0 * cautionInset));
        height += static_cast<double>(broken.back().size()) * lineHeight(font) + (broken.size() > 1 ? 4.0 * px : 0.0);
    }
    return {.height = height, .paint = [=](QPainter &painter, QPointF at) {
                const Palette look = printPalette();
                const QRectF frame(at, QSizeF(width, height));
                painter.setPen(QPen(look.warning, 1.2 * px));
                painter.setBrush(Qt::NoBrush);
                painter.drawRoundedRect(frame, 3.0 * px, 3.0 * px);
                painter.fillRect(QRectF(at, QSizeF(5.0 * px, height)), look.warning);
                painter.setPen(look.ink);
                QPointF line = at + QPointF(cautionInset, cautionPadding);
                for (const auto &text : broken) {
                    line.setY(paintLines(painter, line, text, font) + 4.0 * px);
                }
            }};
}

} // namespace quasistat::ui
