#pragma once
// What the views read from a design and how they write one key of it: the JSON seen through Qt's strings.

#include "core/document/design.h"

#include <QString>

namespace quasistat::ui
{

/// Number of entries of "segments"; 0 where there is no such array.
[[nodiscard]] int segmentCount(const document::Design &design);

/// The segment `index` (from 0); null where it does not exist.
[[nodiscard]] const document::Json *segmentAt(const document::Design &design, int index);

/// The value at a JSON Pointer; null where it does not exist.
[[nodiscard]] const document::Json *valueAt(const document::Json &json, const std::string &pointer);

/// A value as a person typed it: strings as they are, numbers as JSON prints them, else empty.
[[nodiscard]] QString typed(const document::Json *value);
[[nodiscard]] QString typedAt(const document::Json &json, const std::string &pointer);

/// `design` with `value` at `pointer`; objects on the way are made, never an entry of an array.
[[nodiscard]] document::Design withValue(const document::Design &design, const std::string &pointer,
                                         document::Json value);
/// `design` without what is at `pointer`; unchanged where nothing is.
[[nodiscard]] document::Design withoutValue(const document::Design &design, const std::string &pointer);
/// Sets `text` as a string, or removes the key where it is blank.
[[nodiscard]] document::Design withText(const document::Design &design, const std::string &pointer,
                                        const QString &text);

/// "/segments/3" + `key`.
[[nodiscard]] std::string segmentPointer(int index, const std::string &key = {});
/// The segment a pointer of the document lies in, from 0; −1: none.
[[nodiscard]] int segmentOf(const std::string &pointer);

} // namespace quasistat::ui
