#pragma once
// The account of the whole path.

#include "core/path/input.h"
#include "core/path/result.h"

namespace quasistat::path
{

/// Totals of a complete path (format of results, "Derived figures"). `states` and `segments` as in PathResult. Sums are
/// compensated (W. Kahan, Communications of the ACM 8 (1965) 40).
[[nodiscard]] Totals totalsOf(const std::vector<StateResult> &states, const std::vector<SegmentResult> &segments,
                              const std::optional<double> &rate);

} // namespace quasistat::path
