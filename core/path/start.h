#pragma once
// The start state of a path.

#include "core/gas/state.h"
#include "core/path/input.h"

namespace quasistat::path
{

/// From three of p, T, V, n, or evacuated. Fails with Reason::contradiction unless exactly three are given, else as
/// gas::stateFrom; pointers are relative to the start.
[[nodiscard]] Outcome<gas::State> startState(const gas::GasPtr &gas, const Start &start);

} // namespace quasistat::path
