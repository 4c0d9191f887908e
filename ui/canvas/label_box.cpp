#include "ui/canvas/label_box.h"

#include "ui/look/figure_text.h"
#include "ui/look/type.h"

#include <algorithm>

namespace quasistat::ui
{
namespace
{

constexpr double disc = 8.5;       // radius of a state number
constexpr double discPitch = 32.0; // from disc to disc, "=" between
constexpr double inset = 7.0;
constexpr double discInset = 4.5;
constexpr double figureGap = 16.0;

double lineHeight(const QFont &font)
{
    return font.pixelSize() * 1.25;
}

// Left edge of the lines within the plate.
double textLeft(const LabelScene &label)
{
    if (label.numbers.isEmpty()) return inset;
    return discInset + 2.0 * disc + discPitch * static_cast<double>(label.numbers.size() - 1) + 5.5;
}

double numberPlace(const QRectF &plate, qsizetype index)
{
    return plate.left() + discInset + disc + discPitch * static_cast<double>(index);
}

void drawNumbers(QPainter &painter, const LabelScene &label, const Palette &palette)
{
    const QFont font = face(11, QFont::DemiBold);
    const double y = label.plate.center().y();
    for (qsizetype i = 0; i < label.numbers.size(); ++i) {
        const double x = numberPlace(label.plate, i);
        painter.setPen(Qt::NoPen);
        painter.setBrush(palette.ink);
        painter.drawEllipse(QPointF(x, y), disc, disc);
        painter.setPen(palette.ground);
        drawText(painter, {x, y + 3.9}, QString::number(label.numbers.at(i)), font, Align::centre);
        if (i == 0) continue;
        painter.setPen(palette.ink);
        drawText(painter, {x - discPitch / 2.0, y + 4.0}, QStringLiteral("="), font, Align::centre);
    }
}

} // namespace

QSizeF labelSize(const LabelScene &label)
{
    double text = 0.0;
    double height = 0.0;
    for (const auto &line : label.lines) {
        const double figure = line.figure.isEmpty() ? 0.0 : textWidth(line.figure, line.font) + figureGap;
        text = std::max(text, textWidth(line.text, line.font) + figure);
        height += lineHeight(line.font);
    }
    if (label.lines.isEmpty()) return {textLeft(label) - 5.5 + discInset, 2.0 * (disc + 3.0)};
    const double least = label.numbers.isEmpty() ? 0.0 : 2.0 * (disc + 3.0);
    return {textLeft(label) + text + inset, std::max(height + 5.0, least)};
}

void drawLeader(QPainter &painter, const LabelScene &label, const Palette &palette)
{
    if (!label.leader) return;
    painter.setPen(QPen(faded(label.colour, 0.6), 1.0));
    painter.drawLine(*label.leader);
    if (!label.dotted) return;
    painter.setPen(Qt::NoPen);
    painter.setBrush(palette.ink);
    painter.drawEllipse(label.leader->p2(), 2.0, 2.0);
}

void drawLabel(QPainter &painter, const LabelScene &label, const Palette &palette)
{
    painter.setPen(Qt::NoPen);
    painter.setBrush(faded(palette.ground, label.plateOpacity));
    painter.drawRoundedRect(label.plate, 5.0, 5.0);
    if (!label.numbers.isEmpty()) drawNumbers(painter, label, palette);
    double height = 0.0;
    for (const auto &line : label.lines) height += lineHeight(line.font);
    double top = label.plate.center().y() - height / 2.0;
    for (const auto &line : label.lines) {
        const double baseline = top + 0.5 * lineHeight(line.font) + 0.36 * line.font.pixelSize();
        painter.setPen(faded(label.colour, line.opacity));
        drawText(painter, {label.plate.left() + textLeft(label), baseline}, line.text, line.font);
        if (!line.figure.isEmpty())
            drawText(painter, {label.plate.right() - inset, baseline}, line.figure, line.font, Align::right);
        top += lineHeight(line.font);
    }
}

QStringList wrapped(const QString &text, const QFont &font, double width)
{
    QStringList lines;
    QString line;
    for (const auto &word : text.split(QLatin1Char(' '), Qt::SkipEmptyParts)) {
        const QString longer = line.isEmpty() ? word : line + QLatin1Char(' ') + word;
        if (!line.isEmpty() && textWidth(longer, font) > width) {
            lines.append(line);
            line = word;
        } else {
            line = longer;
        }
    }
    if (!line.isEmpty()) lines.append(line);
    return lines;
}

} // namespace quasistat::ui
