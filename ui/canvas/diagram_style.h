#pragma once
// How a diagram is drawn for its purpose: the window, a drawing of its own, or a page of the report.

#include "ui/look/palette.h"
#include "ui/look/type.h"

#include <QMarginsF>

namespace quasistat::ui
{

enum class Purpose {
    window,  ///< states with pressure and temperature
    drawing, ///< stands alone: states with figures, segments named
    report,  ///< states as numbers only (a table has the rest), segments named
};

struct DiagramStyle {
    Palette palette;
    Purpose purpose = Purpose::window;
    QMarginsF margins{64, 16, 16, 44}; ///< [px] left, top, right, bottom around the plot
    double labelPixels = 12.0;         ///< size of labels; other text in proportion
    double curve = 2.5;                ///< [px] width of a curve
    double emphasisedCurve = 3.5;      ///< [px] width where selected or hovered

    [[nodiscard]] bool isPrint() const { return purpose != Purpose::window; }
    [[nodiscard]] QFont font(double pixels, QFont::Weight weight = QFont::Normal) const
    {
        return isPrint() ? printFace(pixels, weight) : face(pixels, weight);
    }
    [[nodiscard]] double type(double pixels) const
    {
        return pixels * labelPixels / 12.0;
    } ///< size on paper of a screen size
};

[[nodiscard]] inline DiagramStyle windowStyle(Scheme scheme)
{
    return {.palette = palette(scheme)};
}

[[nodiscard]] inline DiagramStyle drawingStyle()
{
    return {.palette = printPalette(), .purpose = Purpose::drawing};
}

[[nodiscard]] inline DiagramStyle reportStyle()
{
    return {.palette = printPalette(),
            .purpose = Purpose::report,
            .margins = {48, 8, 8, 34},
            .labelPixels = 10.0,
            .curve = 2.0,
            .emphasisedCurve = 2.0};
}

} // namespace quasistat::ui
