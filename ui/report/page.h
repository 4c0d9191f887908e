#pragma once
// The paper: sizes in units of 1/192 inch, so that half pixels of a screen's size are whole ones here.

#include <QRectF>
#include <QSizeF>

namespace quasistat::ui
{

enum class PageSize { a4, letter };

/// Page units per CSS pixel (1/96 inch): what the diagram and the sizes of type are given in is multiplied by this.
inline constexpr double pageUnitsPerPixel = 2.0;
inline constexpr double pageUnitsPerInch = 192.0;

/// Size of the paper [page units].
[[nodiscard]] QSizeF paperSize(PageSize size);
/// Where the text stands: about 15 mm of margin, the foot left out.
[[nodiscard]] QRectF textArea(PageSize size);
/// The foot below the text.
[[nodiscard]] QRectF footArea(PageSize size);

} // namespace quasistat::ui
