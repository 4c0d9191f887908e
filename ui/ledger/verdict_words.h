#pragma once
// A verdict on a limit in words: what it allows, where it is exceeded, where it is worst.

#include "core/analysis/evaluation.h"
#include "core/units/display.h"
#include "ui/look/rich_text.h"

namespace quasistat::ui
{

/// "<i>T</i> ≤ 140 °C", as marked text.
[[nodiscard]] QString limitTerms(const analysis::Limit &limit, const units::DisplayUnits &units);

/// The worst value with its unit: "161.52 °C"; empty where nothing could be checked.
[[nodiscard]] QString worstFigure(const analysis::Limit &limit, const analysis::Verdict &verdict,
                                  const units::DisplayUnits &units);

/// "Exceeded above 8.372 bar on segment 3, and at the start of segment 4; worst at state 4." Empty where the limit
/// holds.
[[nodiscard]] QString verdictSentence(const analysis::Evaluation &evaluation, const analysis::Verdict &verdict,
                                      const units::DisplayUnits &units);

/// For the card of `segment` (from 0): "Passes 140 °C at 8.372 bar." Empty where the limit holds on it.
[[nodiscard]] QString passingSentence(const analysis::Evaluation &evaluation, const analysis::Verdict &verdict,
                                      int segment, const units::DisplayUnits &units);

} // namespace quasistat::ui
