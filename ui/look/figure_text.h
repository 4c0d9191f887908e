#pragma once
// Text whose digits stand in cells of equal width, so that figures line up in any face.

#include "ui/look/rich_text.h"

#include <QFont>
#include <QPainter>

namespace quasistat::ui
{

enum class Align { left, centre, right };

/// Width of the line [px] as `drawText` draws it.
[[nodiscard]] double textWidth(const RichText &text, const QFont &font);
[[nodiscard]] double textWidth(const QString &text, const QFont &font);

/// Draws one line in the painter's pen, its baseline at `anchor.y()`, its left end, middle or right end at
/// `anchor.x()`. Leaves the painter's font changed.
void drawText(QPainter &painter, QPointF anchor, const RichText &text, const QFont &font, Align align = Align::left);
void drawText(QPainter &painter, QPointF anchor, const QString &text, const QFont &font, Align align = Align::left);

/// The longest beginning of `text` with "…" that is no wider than `width` [px]; `text` itself where it fits.
[[nodiscard]] QString elided(const QString &text, const QFont &font, double width);

/// The extent of a column of figures around its decimal sign [px].
struct DecimalColumn {
    double whole = 0.0;    ///< widest part left of the decimal sign
    double fraction = 0.0; ///< widest part from the decimal sign on
    [[nodiscard]] double width() const { return whole + fraction; }
};
[[nodiscard]] DecimalColumn decimalColumn(const QStringList &figures, const QFont &font);

/// Draws `figure` with its decimal sign (or its end, where it has none) at `anchor`.
void drawDecimal(QPainter &painter, QPointF anchor, const QString &figure, const QFont &font);

} // namespace quasistat::ui
