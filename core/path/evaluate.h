#pragma once
// The one dispatch over segment kinds: from what the user said to a computed path.

#include "core/path/input.h"
#include "core/path/result.h"

namespace quasistat::path
{

/// Computes the start state, every segment in turn and the totals. Never throws; what cannot be computed is a Failure
/// at its pointer and the path before it stands. Same input, same bits.
[[nodiscard]] PathResult evaluate(const PathInput &input);

} // namespace quasistat::path
