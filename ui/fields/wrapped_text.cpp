#include "ui/fields/wrapped_text.h"

#include <QFontMetricsF>
#include <QTextLayout>

#include <cmath>

namespace quasistat::ui
{

namespace
{

/// Lays the text out in lines and hands each to `visit(line, text, isLast)`.
template <class Visit>
double eachLine(const QString &text, const QFont &font, double width, double height, Visit visit)
{
    const double pitch = std::ceil(QFontMetricsF(font).height());
    QTextLayout layout(text, font);
    layout.beginLayout();
    double y = 0.0;
    for (QTextLine line = layout.createLine(); line.isValid(); line = layout.createLine()) {
        line.setLineWidth(width);
        const bool last = y + 2 * pitch > height;
        const QString rest = text.mid(line.textStart());
        const QString words = last ? QFontMetricsF(font).elidedText(rest, Qt::ElideRight, width)
                                   : text.mid(line.textStart(), line.textLength());
        visit(y, words.trimmed());
        y += pitch;
        if (last) break;
    }
    layout.endLayout();
    return y;
}

} // namespace

double wrappedHeight(const QString &text, const QFont &font, double width)
{
    return eachLine(text, font, width, 1e6, [](double, const QString &) {});
}

void drawWrapped(QPainter &painter, const QRectF &place, const QString &text, const QFont &font)
{
    painter.setFont(font);
    const double ascent = QFontMetricsF(font).ascent();
    eachLine(text, font, place.width(), place.height(), [&](double y, const QString &words) {
        painter.drawText(QPointF(place.left(), place.top() + y + ascent), words);
    });
}

} // namespace quasistat::ui
