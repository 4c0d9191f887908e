#pragma once
// A state from any two of p, v, T, s, h, u.

#include "core/gas/solve/given.h"

namespace quasistat::gas
{

/// The equilibrium state in which both properties have the given values. `guess`: a state of the same gas nearby (the
/// previous point of a path) or null. Newton in ln T, ln v on analytic derivatives, converged to the last bits; where
/// that leads astray, bracketing on the equilibrium surface. T and p of saturation itself give the vapour. Fails with
/// Reason::unreachable where no state of the model has these values, outsideModel where it lies beyond the hard range,
/// condenses where the gas would be in two phases that its model does not compute, undetermined where the two do not
/// fix a state (T and h of an ideal gas), outOfRange for non-finite or non-positive p, v, T.
[[nodiscard]] Outcome<MolarState> stateFrom(const Gas &gas, Given first, Given second,
                                            const MolarState *guess = nullptr);

/// The equilibrium state at T [K] and v [m³/mol]: gas.at() with its limits checked. Fails as stateFrom.
[[nodiscard]] Outcome<MolarState> stateAt(const Gas &gas, double temperature, double molarVolume);

/// Whether a state is inside the hard range and the model's phases: it, or the failure.
[[nodiscard]] Outcome<MolarState> insideModel(const Gas &gas, const MolarState &state);

} // namespace quasistat::gas
