#include "core/analysis/evaluation.h"

#include "core/path/evaluate.h"

#include <algorithm>

namespace quasistat::analysis
{

bool Evaluation::auditsAgree() const
{
    return std::all_of(path.segments.begin(), path.segments.end(),
                       [](const path::SegmentResult &segment) { return segment.audit.ok; });
}

bool Evaluation::envelopeHolds() const
{
    return std::all_of(verdicts.begin(), verdicts.end(), [](const Verdict &verdict) { return verdict.ok; });
}

Evaluation evaluate(path::PathInput input, std::vector<Limit> limits)
{
    Evaluation evaluation{.input = std::move(input), .path = {}, .limits = std::move(limits), .verdicts = {}};
    evaluation.path = path::evaluate(evaluation.input);
    evaluation.verdicts = verdicts(evaluation.limits, evaluation.path, evaluation.input.surroundings.pressure);
    return evaluation;
}

} // namespace quasistat::analysis
