#pragma once
// A menu of the segment kinds with their glyphs.

#include "ui/look/palette.h"

#include <QMenu>

#include <functional>

namespace quasistat::ui
{

/// Adds an entry for each kind to `menu`; choosing one calls `choose`.
void addKinds(QMenu &menu, const Palette &look, const std::function<void(path::Kind)> &choose);

} // namespace quasistat::ui
