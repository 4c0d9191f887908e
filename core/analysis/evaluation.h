#pragma once
// One evaluation of a design: the path with its envelope verdicts. Immutable once made; every view reads the same one.

#include "core/analysis/envelope.h"
#include "core/path/input.h"

namespace quasistat::analysis
{

struct Evaluation {
    path::PathInput input;
    path::PathResult path;
    std::vector<Limit> limits;
    std::vector<Verdict> verdicts; ///< one per limit, in their order

    [[nodiscard]] bool auditsAgree() const; ///< every computed segment's audit is ok
    [[nodiscard]] bool envelopeHolds() const;
};

[[nodiscard]] Evaluation evaluate(path::PathInput input, std::vector<Limit> limits);

} // namespace quasistat::analysis
