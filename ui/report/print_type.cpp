#include "ui/report/print_type.h"

#include "ui/look/type.h"
#include "ui/report/page.h"

#include <QFontMetricsF>

namespace quasistat::ui
{
namespace
{

QFont sized(double pixels, QFont::Weight weight = QFont::Normal)
{
    return printFace(pixels * pageUnitsPerPixel, weight);
}

/// The words of a text with their style; a blank begins a new one.
std::vector<RichText> words(const RichText &text)
{
    std::vector<RichText> result(1);
    for (const Run &run : text.runs()) {
        const QStringList parts = run.text.split(QLatin1Char(' '));
        for (qsizetype i = 0; i < parts.size(); ++i) {
            if (i > 0) result.emplace_back();
            Run part = run;
            part.text = parts[i];
            if (part.text.isEmpty()) continue;
            result.back() += RichText::styled(part);
        }
    }
    return result;
}

/// The longest beginning of a single word that fits.
std::vector<RichText> cutWord(const RichText &word, const QFont &font, double width)
{
    std::vector<RichText> pieces;
    QString rest = word.unstyled();
    while (!rest.isEmpty()) {
        qsizetype count = rest.size();
        while (count > 1 && textWidth(rest.left(count), font) > width) --count;
        pieces.push_back(RichText::plain(rest.left(count)));
        rest = rest.mid(count);
    }
    return pieces;
}

} // namespace

QFont printTitleFace()
{
    return sized(17, QFont::DemiBold);
}
QFont printHeadingFace()
{
    return sized(13, QFont::DemiBold);
}
QFont printValueFace()
{
    return sized(11.5, QFont::Medium);
}
QFont printBodyFace()
{
    return sized(10.5);
}
QFont printStrongFace()
{
    return sized(10.5, QFont::DemiBold);
}
QFont printCaptionFace()
{
    return sized(8.5);
}

std::vector<RichText> lines(const RichText &text, const QFont &font, double width)
{
    std::vector<RichText> result;
    RichText line;
    for (const RichText &word : words(text)) {
        const RichText longer = line.isEmpty() ? word : line + RichText::plain(QStringLiteral(" ")) + word;
        if (textWidth(longer, font) <= width) {
            line = longer;
            continue;
        }
        if (!line.isEmpty()) result.push_back(line);
        if (textWidth(word, font) <= width) {
            line = word;
            continue;
        }
        auto pieces = cutWord(word, font, width);
        line = pieces.back();
        pieces.pop_back();
        result.insert(result.end(), pieces.begin(), pieces.end());
    }
    if (!line.isEmpty() || result.empty()) result.push_back(line);
    return result;
}

double lineHeight(const QFont &font)
{
    return 1.4 * font.pixelSize();
}

void drawLine(QPainter &painter, QPointF topLeft, const RichText &text, const QFont &font, Align align)
{
    const QFontMetricsF metrics(font);
    const double leading = lineHeight(font) - metrics.ascent() - metrics.descent();
    drawText(painter, topLeft + QPointF(0.0, leading / 2.0 + metrics.ascent()), text, font, align);
}

} // namespace quasistat::ui
