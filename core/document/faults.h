#pragma once
// Failures and warnings about a place in a document, and names that are near a mistyped one.

#include "core/outcome/outcome.h"

#include <initializer_list>
#include <span>
#include <string>
#include <string_view>
#include <variant>

namespace quasistat::document
{

using Argument = std::variant<Figure, std::string>;

[[nodiscard]] Failure fault(Reason reason, std::string pointer, std::string_view sentence,
                            std::initializer_list<Argument> arguments = {});
[[nodiscard]] Warning remark(std::string pointer, std::string_view sentence,
                             std::initializer_list<Argument> arguments = {});

/// Reason::notComputed for a part of the format that this version leaves out. `words` says what: "the gas model
/// “gerg-2008”".
[[nodiscard]] Failure notComputed(std::string pointer, std::string_view words);

/// Reason::unknownName: “name” is no `what`, then the nearest of `names`, or all of them where none is near.
[[nodiscard]] Failure unknownName(std::string pointer, std::string_view what, std::string_view name,
                                  std::span<const std::string_view> names);

/// "a", "a and b", "a, b and c".
[[nodiscard]] std::string listed(std::span<const std::string_view> names, std::string_view conjunction = "and");

} // namespace quasistat::document
