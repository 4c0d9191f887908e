#pragma once
// How Qt's own input widgets look in the window: one style sheet from the palette.

#include "ui/look/palette.h"

#include <QString>

namespace quasistat::ui
{

/// For the top of the widget tree. Labels with the property "role" = secondary, error or warning take that colour; a
/// button with "role" = primary is the one primary action, "quiet" a text to click.
[[nodiscard]] QString fieldStyle(const Palette &palette);

} // namespace quasistat::ui
