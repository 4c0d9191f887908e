#pragma once
// JSON Pointers (RFC 6901): the one way a place in a document is named.

#include "core/document/design.h"

#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace quasistat::document
{

/// "/a~1b/0" → {"a/b", "0"}; "" → {}. None where the text is no pointer ("a", "/~2").
[[nodiscard]] std::optional<std::vector<std::string>> pointerTokens(std::string_view pointer);

/// `parent` + "/" + `key` with its reserved signs escaped.
[[nodiscard]] std::string pointerTo(std::string_view parent, std::string_view key);
[[nodiscard]] std::string pointerTo(std::string_view parent, std::size_t index);

/// An array index as RFC 6901 writes it: digits without leading zero.
[[nodiscard]] std::optional<std::size_t> arrayIndex(std::string_view token);

} // namespace quasistat::document
