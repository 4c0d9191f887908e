#include "ui/report/page.h"

namespace quasistat::ui
{
namespace
{

constexpr double margin = 56.0 * pageUnitsPerPixel;
constexpr double top = 48.0 * pageUnitsPerPixel;
constexpr double foot = 52.0 * pageUnitsPerPixel;

} // namespace

QSizeF paperSize(PageSize size)
{
    constexpr double millimetre = pageUnitsPerInch / 25.4;
    return size == PageSize::a4 ? QSizeF(210.0, 297.0) * millimetre : QSizeF(8.5, 11.0) * pageUnitsPerInch;
}

QRectF textArea(PageSize size)
{
    const QSizeF paper = paperSize(size);
    return {margin, top, paper.width() - 2.0 * margin, paper.height() - top - foot};
}

QRectF footArea(PageSize size)
{
    const QSizeF paper = paperSize(size);
    return {margin, paper.height() - foot, paper.width() - 2.0 * margin, foot};
}

} // namespace quasistat::ui
