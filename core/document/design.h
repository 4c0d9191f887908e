#pragma once
// The design: the document as the user wrote it. A value: copy, edit, compare, undo, hand to a worker.

#include "core/outcome/outcome.h"

#include <nlohmann/json.hpp>

#include <string>
#include <string_view>

namespace quasistat::document
{

/// Order of keys is kept, so that a file comes back as it was written.
using Json = nlohmann::ordered_json;

/// Line and column, from 1, of a place in a file; 0 if it did not come from one.
struct Position {
    int line = 0;
    int column = 0;
};

/// The JSON is the truth: unknown keys survive and quantities stay as typed because nothing else is stored.
struct Design {
    Json json;
    bool operator==(const Design &other) const { return json == other.json; }
};

/// Reads a document's text. Fails with Reason::syntax (not JSON, duplicate key) or wrongType (not an object);
/// `position` is set to the place of the error.
[[nodiscard]] Outcome<Design> read(std::string_view text, Position &position);

/// The place of `pointer` in `text` (which `read` accepted); of the nearest enclosing value where it does not exist.
[[nodiscard]] Position positionOf(std::string_view text, std::string_view pointer);

/// The document's text: two-space indentation, short arrays and objects on one line, newline at the end.
[[nodiscard]] std::string written(const Design &design);

/// First 12 hexadecimal digits of the SHA-256 (FIPS 180-4) of `written(design)`, in groups of four: "5e1c 90b7 a24d".
[[nodiscard]] std::string fingerprint(const Design &design);

} // namespace quasistat::document
