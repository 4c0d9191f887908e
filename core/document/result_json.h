#pragma once
// The machine-readable result of `compute --json`: SI, no rounding, null for what does not exist.

#include "core/analysis/evaluation.h"
#include "core/document/design.h"

namespace quasistat::document
{

/// `curvePoints` > 1 adds to each quasi-static segment `curve` with that many points, even in ln V (on an isochore in
/// p).
[[nodiscard]] Json resultJson(const Design &design, const analysis::Evaluation &evaluation, int curvePoints,
                              std::string_view programVersion);

} // namespace quasistat::document
