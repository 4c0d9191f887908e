#pragma once
// Limits and verdicts in words.

#include "core/analysis/evaluation.h"
#include "core/units/display.h"

#include <string>

namespace quasistat::app
{

/// "discharge: temperature ≤ 140.00 °C".
[[nodiscard]] std::string limitText(const analysis::Limit &limit, const units::DisplayUnits &units);

/// "161.52 °C at state 4, segment 3, where 140.00 °C is allowed"; without the latter where the limit is kept.
[[nodiscard]] std::string verdictText(const analysis::Limit &limit, const analysis::Verdict &verdict,
                                      const units::DisplayUnits &units);

} // namespace quasistat::app
