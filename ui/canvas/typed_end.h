#pragma once
// An end as it is written into the document: the user's unit, as many digits as a pixel can tell.

#include "core/document/design.h"
#include "core/path/segment.h"
#include "ui/canvas/state_drag.h"

namespace quasistat::ui
{

/// `value` [SI] of `key` as JSON: in the unit of `typed` (what stood there; null: nothing), else in the display's unit.
/// An uncertainty that was stated stays.
[[nodiscard]] Outcome<document::Json> typedEnd(double value, path::EndKey key, const document::Json &typed,
                                               const Snapshot &snapshot, const Plane &plane);

} // namespace quasistat::ui
