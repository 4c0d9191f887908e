#pragma once
// A computed path as a person reads it in a terminal.

#include "core/analysis/evaluation.h"
#include "core/document/design.h"
#include "core/units/display.h"

#include <string>

namespace quasistat::app
{

/// States, ledger, totals, limits and warnings.
[[nodiscard]] std::string accountText(const document::Design &design, const analysis::Evaluation &evaluation,
                                      const units::DisplayUnits &units);

} // namespace quasistat::app
