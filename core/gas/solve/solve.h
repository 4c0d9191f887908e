#pragma once
// A state from any two of p, v, T, s, h, u.

#include "core/gas/gas.h"

namespace quasistat::gas
{

struct Given {
    Property property;
    double value; ///< SI, molar
};

/// The state in which both properties have the given values. `guess`: a state nearby (the previous point of a path) or
/// null. Safeguarded Newton in ln T, ln v on analytic derivatives, converged to the last bits. Fails with
/// Reason::unreachable where no state of the model has these values, outsideModel where it lies beyond the hard range,
/// undetermined where the two do not fix a state (T and h of an ideal gas), outOfRange for non-finite or non-positive
/// p, v, T.
[[nodiscard]] Outcome<MolarState> stateFrom(const Gas &gas, Given first, Given second,
                                            const MolarState *guess = nullptr);

} // namespace quasistat::gas
