#include "ui/fields/wrapped_text.h"
#include "ui/look/figure_text.h"
#include "ui/look/glyph.h"
#include "ui/look/mark.h"
#include "ui/look/type.h"
#include "ui/strip/card_face.h"

#include <QPainterPath>

namespace quasistat::ui
{

namespace
{

constexpr double inset = 10.0;
constexpr double radius = 6.0;

QColor edgeOf(const CardFace &content, const CardPose &pose, const Palette &look)
{
    // Failed audit over warned over selected; an unfolded card keeps the accent, it is one shape with its fields.
    const bool bad = content.standing == CardStanding::error || content.standing == CardStanding::failedAudit;
    if (bad && !pose.unfolded) return look.error;
    if (pose.selected) return look.accent;
    return faded(look.ink, pose.hovered ? 0.45 : 0.12);
}

void drawElided(QPainter &painter, QPointF at, const RichText &text, const QFont &font, double width)
{
    if (textWidth(text, font) <= width)
        drawText(painter, at, text, font);
    else
        drawText(painter, at, elided(text.unstyled(), font, width), font);
}

void paintHead(QPainter &painter, const QRectF &card, const CardFace &content, const Palette &look)
{
    if (content.kind)
        drawGlyph(painter, QRectF(card.left() + 9, card.top() + 9, 22, 22), *content.kind,
                  look.family(*content.kind).colour);
    const double left = card.left() + 38;
    painter.setPen(look.ink);
    drawElided(painter, {left, card.top() + 18.5}, RichText::plain(content.title), face(13, QFont::DemiBold),
               card.right() - 26 - left);
    painter.setPen(faded(look.ink, 0.75));
    drawElided(painter, {left, card.top() + 34}, content.second, labelFace(), card.right() - inset - left);
    painter.setPen(look.secondary());
    drawText(painter, {card.right() - inset, card.top() + 18.5}, QString::number(content.segment + 1),
             face(12, QFont::DemiBold), Align::right);
}

/// Draws the mark at the right and returns what is left of the line for the end's words.
double paintMark(QPainter &painter, const QRectF &card, const CardFace &content, const CardPose &pose,
                 const Palette &look)
{
    const double y = card.top() + 51.5;
    const double right = card.right() - inset;
    if (pose.hovered && content.standing == CardStanding::good) {
        drawMark(painter, StateMark::dots, {right - 7, y}, look.ink, look.ground);
        return right - 18;
    }
    const bool warned = content.standing == CardStanding::warned;
    const bool bad = content.standing == CardStanding::failedAudit || content.standing == CardStanding::error;
    if (!warned && !bad) {
        if (content.standing == CardStanding::good)
            drawMark(painter, StateMark::tick, {right - 5, y}, look.accent, look.ground);
        return right - 14;
    }
    const QColor colour = warned ? look.warning : look.error;
    const QFont bold = face(12, QFont::DemiBold);
    const double room = (card.width() - 2 * inset) * 0.55;
    const QString words = elided(content.mark, bold, room);
    painter.setPen(colour);
    drawText(painter, {right, card.top() + 56}, words, bold, Align::right);
    const double at = right - textWidth(words, bold) - (words.isEmpty() ? 6 : 11);
    drawMark(painter, warned ? StateMark::warning : StateMark::cross, {at, y}, colour, look.ground);
    return at - 10;
}

struct Bar {
    double value;
    QString text;
    QString symbol;
    double top;
    bool filled;
    bool struck;
};

void paintBarShape(QPainter &painter, const QRectF &bar, const Bar &of, const Palette &look)
{
    if (of.struck) {
        painter.setPen(QPen(look.error, 1, Qt::DotLine));
        painter.setBrush(Qt::NoBrush);
    } else if (of.filled) {
        painter.setPen(Qt::NoPen);
        painter.setBrush(of.value > 0 ? look.workIn.colour : look.workOut.colour);
    } else {
        painter.setPen(QPen(faded(look.ink, 0.6), 1));
        painter.setBrush(faded(look.ink, 0.16));
    }
    painter.drawRoundedRect(bar, 1, 1);
}

void paintFigure(QPainter &painter, QPointF right, const Bar &of, const Palette &look)
{
    painter.setPen(of.struck ? look.error : look.ink);
    drawText(painter, right, of.text, labelFace(), Align::right);
    if (!of.struck) return;
    // Only the digits are struck, not the unit.
    const QString digits = of.text.section(QChar(0x202F), 0, 0);
    const double width = textWidth(of.text, labelFace());
    painter.setPen(QPen(look.error, 1.25));
    painter.drawLine(QPointF(right.x() - width, right.y() - 4),
                     QPointF(right.x() - width + textWidth(digits, labelFace()), right.y() - 4));
}

void paintBar(QPainter &painter, const QRectF &card, const Bar &of, const CardPose &pose, const StripScale &scale,
              const Palette &look)
{
    const double zero = card.left() + 28 + pose.halfBar;
    painter.setPen(look.ink);
    drawText(painter, {card.left() + inset, of.top + 9.5}, RichText::marked(QStringLiteral("<i>%1</i>").arg(of.symbol)),
             labelFace());
    const double length = scale.largest > 0 ? of.value / scale.largest * pose.halfBar : 0.0;
    if (std::abs(length) >= 0.5) {
        const QRectF bar(std::min(zero, zero + length), of.top, std::abs(length), 10);
        paintBarShape(painter, of.filled && !of.struck ? bar : bar.adjusted(0, 0.5, 0, -0.5), of, look);
    }
    paintFigure(painter, {card.right() - inset, of.top + 9.5}, of, look);
}

void paintBars(QPainter &painter, const QRectF &card, const CardFace &content, const CardPose &pose,
               const StripScale &scale, const Palette &look)
{
    const bool failed = content.standing == CardStanding::failedAudit;
    paintBar(painter, card, {content.work, content.workText, QStringLiteral("W"), card.top() + 71, true, false}, pose,
             scale, look);
    paintBar(painter, card, {content.heat, content.heatText, QStringLiteral("Q"), card.top() + 91, false, failed}, pose,
             scale, look);
    const double zero = card.left() + 28 + pose.halfBar;
    painter.setPen(QPen(faded(look.ink, 0.5), 1));
    painter.drawLine(QPointF(zero, card.top() + 68), QPointF(zero, card.top() + 106));
}

} // namespace

QRectF dotsPlace(const QRectF &card)
{
    return {card.right() - 34, card.top() + 37, 34, 29};
}

void paintCardGround(QPainter &painter, const QRectF &card, const CardPose &pose, const QColor &edge,
                     const Palette &look)
{
    const double width = pose.selected ? 2.0 : 1.0;
    QRectF outline = card.adjusted(width / 2, width / 2, -width / 2, -width / 2);
    painter.save();
    if (pose.unfolded) { // the upper edge is the fields' business
        painter.setClipRect(card);
        outline.setTop(card.top() - 12);
    }
    painter.setPen(QPen(edge, width));
    painter.setBrush(look.ground);
    painter.drawRoundedRect(outline, radius, radius);
    painter.restore();
    if (pose.unfolded) {
        painter.setPen(QPen(faded(look.ink, 0.14), 1));
        painter.drawLine(QPointF(card.left() + inset, card.top() + 1.5),
                         QPointF(card.right() - inset, card.top() + 1.5));
    }
    if (pose.focused && !pose.unfolded) {
        painter.setPen(QPen(look.accent, 1, Qt::DotLine));
        painter.setBrush(Qt::NoBrush);
        painter.drawRoundedRect(outline.adjusted(3, 3, -3, -3), radius - 2, radius - 2);
    }
}

void paintCard(QPainter &painter, const QRectF &card, const CardFace &content, const CardPose &pose,
               const StripScale &scale, const Palette &look)
{
    painter.setRenderHint(QPainter::Antialiasing);
    paintCardGround(painter, card, pose, edgeOf(content, pose, look), look);
    paintHead(painter, card, content, look);
    const double right = paintMark(painter, card, content, pose, look);
    painter.setPen(look.ink);
    const QFont endFace = face(13, QFont::Medium);
    const double room = right - card.left() - inset;
    const bool fits = textWidth(content.end, endFace) <= room;
    drawElided(painter, {card.left() + inset, card.top() + 56}, fits ? content.end : content.endInShort, endFace, room);
    if (content.hasFigures()) {
        paintBars(painter, card, content, pose, scale, look);
        return;
    }
    painter.setPen(content.standing == CardStanding::error ? look.error : look.secondary());
    drawWrapped(painter, QRectF(card.left() + inset, card.top() + 62, card.width() - 2 * inset, 48), content.sentence,
                captionFace());
}

} // namespace quasistat::ui
