#pragma once
// A segment with every reference to another state replaced by the value that state has.

#include "core/path/result.h"

#include <span>
#include <utility>

namespace quasistat::path
{

struct ResolvedSegment {
    Process process; ///< externalPressure holds a number
    std::string label;
    std::vector<std::pair<EndKey, double>> ends; ///< SI
    std::optional<gas::State> arrival;           ///< the state to arrive at exactly
    int arrivalNumber = 0;                       ///< its number, for messages
    std::optional<Direction> direction;
};

/// `states[k − 1]` is state k; all up to the start of this segment. Fails at the pointer of a reference that points
/// ahead, to nothing, or to a quantity that a state has not.
[[nodiscard]] Outcome<ResolvedSegment> resolved(const Segment &segment, std::span<const StateResult> states);

} // namespace quasistat::path
