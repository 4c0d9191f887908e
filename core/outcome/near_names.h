#pragma once
// Names that are near a mistyped one.

#include <span>
#include <string_view>
#include <vector>

namespace quasistat
{

/// Those of `names` that `name` may have been meant for, in their order: few letters apart (a third of its length, at
/// least two), or holding all of it. Capital letters are not read as small ones; nothing is near a very long name.
[[nodiscard]] std::vector<std::string_view> namesNear(std::string_view name, std::span<const std::string_view> names);

} // namespace quasistat
