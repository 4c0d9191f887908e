#pragma once
// What about a path can hurt someone: said in words beside its results.

#include "core/path/result.h"

namespace quasistat::analysis
{

/// Below this carbon steel is not used without a check [K]: −29 °C. Common practice, no source.
inline constexpr double carbonSteelLimit = 244.15;

/// Cautions that this very path raises, with the segment they belong to ("/segments/k").
[[nodiscard]] std::vector<Warning> cautions(const path::PathResult &path);

} // namespace quasistat::analysis
