#pragma once
// What the best possible machine would have exchanged between the same states.

#include "core/path/result.h"

namespace quasistat::path
{

/// A reversible course to compare with.
struct ReversibleLimit {
    double work;    ///< [J]
    Polyline ghost; ///< its curve
};

/// Isothermal contact: the reversible isothermal between the same two states.
[[nodiscard]] Outcome<ReversibleLimit> isothermalLimit(const gas::State &from, const gas::State &to);

/// Adiabatic: the isentrope from the same state to the same end pressure.
[[nodiscard]] Outcome<ReversibleLimit> adiabaticLimit(const gas::State &from, const gas::State &to);

/// Enters `limit` into `result`: reversible limit work, shortfall = W − W_rev, recovery = W/W_rev expanding, W_rev/W
/// compressing (by volume). Where the limit's own path leaves the model these figures stay empty, with a warning.
void compareWithLimit(SegmentResult &result, const Outcome<ReversibleLimit> &limit);

} // namespace quasistat::path
