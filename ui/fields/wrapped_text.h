#pragma once
// A sentence over several lines.

#include <QFont>
#include <QPainter>

namespace quasistat::ui
{

/// Height [px] of `text` wrapped to `width`.
[[nodiscard]] double wrappedHeight(const QString &text, const QFont &font, double width);

/// Draws `text` from the top of `place` in the painter's pen; lines that do not fit end in "…".
void drawWrapped(QPainter &painter, const QRectF &place, const QString &text, const QFont &font);

} // namespace quasistat::ui
