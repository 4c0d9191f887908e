#pragma once
// The end of a segment: which quantities it may be given by, and the value a state has of them.

#include "core/path/result.h"
#include "core/units/display.h"
#include "ui/session/design_reading.h"

#include <QCoreApplication>
#include <QString>

#include <optional>

namespace quasistat::ui
{

struct EndKeyFacts {
    path::EndKey key;
    units::Quantity quantity;
    const char *words;  ///< for the choice; translated through endKeyWords
    const char *symbol; ///< italic where it stands alone; empty: none
};

[[nodiscard]] const EndKeyFacts &facts(path::EndKey key);
[[nodiscard]] std::optional<path::EndKey> endKeyFrom(const std::string &key);
[[nodiscard]] QString endKeyWords(path::EndKey key);

/// The process a segment of the document has, as far as its end choice depends on it.
[[nodiscard]] std::optional<path::Process> processOf(const document::Json &segment);

/// Keys of the segment's end that are quantities, in document order.
[[nodiscard]] std::vector<path::EndKey> endKeysOf(const document::Json &segment);

/// The value a computed segment has of `key`, as it would be typed in the units shown: "8.372 bar".
[[nodiscard]] QString reachedValue(const path::SegmentResult &result, path::EndKey key,
                                   const units::DisplayUnits &units);

/// `value` [SI] as it would be typed in the unit shown for its quantity.
[[nodiscard]] QString typedValue(double value, units::Quantity quantity, const units::DisplayUnits &units);

} // namespace quasistat::ui
