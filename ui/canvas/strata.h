#pragma once
// The layers of a diagram, each painted from the prepared scene: lines, polygons and text, nothing computed.

#include "ui/canvas/scene.h"

#include <QPainter>

#include <array>

namespace quasistat::ui
{

/// From the bottom to the top. `emphasis` is what follows the pointer and the selection.
enum class Stratum {
    forbidden,
    grid,
    areas,
    phases,
    hatch,
    axes,
    ghosts,
    boundary,
    halo,
    curves,
    emphasis,
    handles,
    labels
};
inline constexpr std::array strata{Stratum::forbidden, Stratum::grid,   Stratum::areas,    Stratum::phases,
                                   Stratum::hatch,     Stratum::axes,   Stratum::ghosts,   Stratum::boundary,
                                   Stratum::halo,      Stratum::curves, Stratum::emphasis, Stratum::handles,
                                   Stratum::labels};

/// Segments from 0; −1: none.
struct Emphasis {
    int selected = -1;
    int hovered = -1;
    bool operator==(const Emphasis &) const = default;
};

struct Painting {
    const Scene &scene;
    const DiagramStyle &style;
    Emphasis emphasis;
};

void paint(Stratum stratum, QPainter &painter, const Painting &painting);

} // namespace quasistat::ui
