#pragma once
// A segment that is being placed: a kind and the place of its end.

#include "ui/canvas/state_drag.h"

namespace quasistat::ui
{

/// The design with a segment of `kind` appended whose end lies as near to the place as its law allows. Where the kind
/// asks for more, it gets a beginning: exponent 1.3, five steps, the external pressure at the place. Fails where the
/// path does not reach its last state or the kind has no end near there.
[[nodiscard]] Outcome<document::Edited> segmentPlaced(const Snapshot &before, path::Kind kind, const Pull &pull);

} // namespace quasistat::ui
