#pragma once
// A walk over the text of a JSON document, for what the parsed value no longer knows: places and repeated keys.

#include "core/document/design.h"

#include <functional>
#include <optional>
#include <string>
#include <string_view>

namespace quasistat::document
{

/// Line and column (in characters, from 1) of a byte.
[[nodiscard]] Position positionAt(std::string_view text, std::size_t byte);

/// How deeply brackets nest outside of strings; also meaningful for text that is not valid JSON.
[[nodiscard]] int nestingDepth(std::string_view text);

/// Walks over valid JSON and reports every value with its pointer and the byte it begins at, a parent before its
/// children. `visit` returns false to stop. Precondition: `text` parses, nestingDepth is small.
struct Place {
    std::string_view pointer;
    std::size_t byte;    ///< where the value begins
    std::size_t keyByte; ///< where its key begins; `byte` in arrays
    bool isRepeatedKey;  ///< an earlier member of the same object has this key
};
void walkPlaces(std::string_view text, const std::function<bool(const Place &)> &visit);

} // namespace quasistat::document
