#pragma once
// Sizes of type on paper (resources of the look: 17, 13, 10.5–11.5, captions 8.5) and text in running lines.

#include "ui/look/figure_text.h"
#include "ui/look/palette.h"
#include "ui/look/rich_text.h"

#include <QFont>

#include <vector>

namespace quasistat::ui
{

[[nodiscard]] QFont printTitleFace();   ///< 17/600
[[nodiscard]] QFont printHeadingFace(); ///< 13/600
[[nodiscard]] QFont printValueFace();   ///< 11.5/500, values of the title block
[[nodiscard]] QFont printBodyFace();    ///< 10.5
[[nodiscard]] QFont printStrongFace();  ///< 10.5/600
[[nodiscard]] QFont printCaptionFace(); ///< 8.5

/// `text` in lines no wider than `width` [page units], broken at blanks; a word wider than a line is cut.
[[nodiscard]] std::vector<RichText> lines(const RichText &text, const QFont &font, double width);

/// Distance between base lines of `font` [page units].
[[nodiscard]] double lineHeight(const QFont &font);

/// Draws `text` with the top of its line at `topLeft`.
void drawLine(QPainter &painter, QPointF topLeft, const RichText &text, const QFont &font, Align align = Align::left);

} // namespace quasistat::ui
