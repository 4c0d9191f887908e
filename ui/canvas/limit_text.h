#pragma once
// A limit in words, as it stands on its boundary: "discharge: T ≤ 140 °C".

#include "ui/look/rich_text.h"
#include "ui/session/session.h"

namespace quasistat::ui
{

/// `upper`: its upper bound, else its lower one; the value as the user typed it where the design has it.
[[nodiscard]] RichText limitText(const Snapshot &snapshot, std::size_t limit, bool upper);

/// A typed quantity as it is printed: narrow no-break space before the unit, U+2212, no uncertainty.
[[nodiscard]] QString printed(const QString &typed);

} // namespace quasistat::ui
