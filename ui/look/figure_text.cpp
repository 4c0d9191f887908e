#include "ui/look/figure_text.h"

#include <QFontMetricsF>
#include <QGlyphRun>
#include <QPaintEngine>
#include <QRawFont>

#include <algorithm>

namespace quasistat::ui
{
namespace
{

bool isDigit(QChar c)
{
    return c >= QLatin1Char('0') && c <= QLatin1Char('9');
}

// The widest digit of a face, or 0 where all are equal and a line may be drawn in one piece.
double cellWidth(const QFontMetricsF &metrics)
{
    double widest = 0.0;
    double narrowest = 1e9;
    for (char digit = '0'; digit <= '9'; ++digit) {
        const double width = metrics.horizontalAdvance(QLatin1Char(digit));
        widest = std::max(widest, width);
        narrowest = std::min(narrowest, width);
    }
    return widest - narrowest < 0.01 ? 0.0 : widest;
}

QFont runFont(const QFont &font, const Run &run)
{
    QFont result = font;
    if (run.italic) result.setItalic(true);
    if (run.bold) result.setWeight(QFont::DemiBold);
    if (run.subscript) result.setPixelSize(std::max(1, font.pixelSize() * 3 / 4));
    return result;
}

/// A face without the narrow no-break space gets a thin one: a space borrowed from another face would tear the text in two.
QString spelledIn(const QFont &font, const QString &text)
{
    constexpr QChar narrow(0x202f);
    if (!text.contains(narrow) || QRawFont::fromFont(font).supportsCharacter(narrow)) return text;
    QString spelled = text;
    return spelled.replace(narrow, QChar(0x2009));
}

double baselineShift(const QFont &font, const Run &run)
{
    return run.subscript ? 0.2 * font.pixelSize() : 0.0;
}

// A run in pieces: each digit by itself, everything between as a whole.
template <class Visit>
double eachPiece(const QString &text, const QFont &font, Visit visit)
{
    const QFontMetricsF metrics(font);
    const double cell = cellWidth(metrics);
    if (cell == 0.0 || std::none_of(text.begin(), text.end(), isDigit)) {
        visit(0.0, text);
        return metrics.horizontalAdvance(text);
    }
    double x = 0.0;
    for (qsizetype i = 0; i < text.size();) {
        if (isDigit(text.at(i))) {
            visit(x + (cell - metrics.horizontalAdvance(text.at(i))) / 2.0, QString(text.at(i)));
            x += cell;
            ++i;
            continue;
        }
        const qsizetype from = i;
        while (i < text.size() && !isDigit(text.at(i))) ++i;
        const QString between = text.mid(from, i - from);
        visit(x, between);
        x += metrics.horizontalAdvance(between);
    }
    return x;
}

// On a raster the whole run goes out as glyphs at their places: many times faster than a piece a digit. Vector formats
// would lose the characters, so there text stays text. False where the face lacks a character.
bool drawGlyphs(QPainter &painter, QPointF at, const QString &text, const QFont &font, double &width)
{
    if (painter.paintEngine()->type() != QPaintEngine::Raster) return false;
    const QRawFont raw = QRawFont::fromFont(font);
    const QList<quint32> glyphs = raw.glyphIndexesForString(text);
    if (glyphs.size() != text.size() || glyphs.contains(0)) return false;
    const QList<QPointF> advances = raw.advancesForGlyphIndexes(glyphs);
    const double cell = cellWidth(QFontMetricsF(font));
    QList<QPointF> places;
    places.reserve(glyphs.size());
    double x = 0.0;
    for (qsizetype i = 0; i < glyphs.size(); ++i) {
        const double advance = advances.at(i).x();
        const double room = cell > 0.0 && isDigit(text.at(i)) ? cell : advance;
        places.append({x + (room - advance) / 2.0, 0.0});
        x += room;
    }
    QGlyphRun run;
    run.setRawFont(raw);
    run.setGlyphIndexes(glyphs);
    run.setPositions(places);
    painter.drawGlyphRun(at, run);
    width = x;
    return true;
}

qsizetype decimalPlace(const QString &figure)
{
    const qsizetype place = figure.indexOf(QLatin1Char('.'));
    return place < 0 ? figure.size() : place;
}

} // namespace

double textWidth(const RichText &text, const QFont &font)
{
    double width = 0.0;
    for (const auto &run : text.runs()) {
        const QFont used = runFont(font, run);
        width += eachPiece(spelledIn(used, run.text), used, [](double, const QString &) {});
    }
    return width;
}

double textWidth(const QString &text, const QFont &font)
{
    return textWidth(RichText::plain(text), font);
}

void drawText(QPainter &painter, QPointF anchor, const RichText &text, const QFont &font, Align align)
{
    if (align != Align::left) anchor.rx() -= textWidth(text, font) * (align == Align::centre ? 0.5 : 1.0);
    for (const auto &run : text.runs()) {
        const QFont used = runFont(font, run);
        const QPointF at = anchor + QPointF(0.0, baselineShift(font, run));
        if (double width = 0.0; drawGlyphs(painter, at, run.text, used, width)) {
            anchor.rx() += width;
            continue;
        }
        painter.setFont(used);
        const QString spelled = spelledIn(used, run.text);
        // In an SVG file a run stays one piece of text that can be searched and edited; its viewer sets the digits.
        const bool isSvg = painter.paintEngine()->type() == QPaintEngine::SVG;
        if (isSvg) painter.drawText(at, spelled);
        anchor.rx() += eachPiece(spelled, used, [&](double x, const QString &piece) {
            if (!isSvg) painter.drawText(at + QPointF(x, 0.0), piece);
        });
    }
}

void drawText(QPainter &painter, QPointF anchor, const QString &text, const QFont &font, Align align)
{
    drawText(painter, anchor, RichText::plain(text), font, align);
}

QString elided(const QString &text, const QFont &font, double width)
{
    if (textWidth(text, font) <= width) return text;
    QString shorter = text;
    while (!shorter.isEmpty()) {
        shorter.chop(1);
        const QString candidate = shorter.trimmed() + QChar(0x2026);
        if (textWidth(candidate, font) <= width) return candidate;
    }
    return QString(QChar(0x2026));
}

DecimalColumn decimalColumn(const QStringList &figures, const QFont &font)
{
    DecimalColumn column;
    for (const auto &figure : figures) {
        const qsizetype place = decimalPlace(figure);
        column.whole = std::max(column.whole, textWidth(figure.left(place), font));
        column.fraction = std::max(column.fraction, textWidth(figure.mid(place), font));
    }
    return column;
}

void drawDecimal(QPainter &painter, QPointF anchor, const QString &figure, const QFont &font)
{
    const qsizetype place = decimalPlace(figure);
    drawText(painter, anchor, figure.left(place), font, Align::right);
    drawText(painter, anchor, figure.mid(place), font);
}

} // namespace quasistat::ui
