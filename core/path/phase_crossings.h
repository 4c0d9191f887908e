#pragma once
// Where a curve of states enters and leaves the two-phase region of its gas.

#include "core/path/quasi_static_curve.h"

#include <optional>
#include <vector>

namespace quasistat::path
{

struct CrossingPoint {
    double coordinate; ///< x of the curve
    gas::MolarState state;
    bool entersTwoPhase;
};

/// Crossings of the phase boundary strictly between `from` and `to`, in path order; none for a gas that has no
/// boundary. Bracketed between nodes and where the curve passes the boundary closely, then found on the exact boundary;
/// the state is that on its homogeneous side.
[[nodiscard]] std::vector<CrossingPoint> phaseCrossings(const QuasiStaticCurve &curve, double from, double to);

/// Coordinates in path order where integrands along the curve are not smooth: seams of the gas, and `crossings` of the
/// phase boundary. `temperatureTurns` as in seamCrossings.
[[nodiscard]] Outcome<std::vector<double>> unevenPoints(const QuasiStaticCurve &curve,
                                                        const std::vector<double> &temperatureTurns,
                                                        const std::vector<CrossingPoint> &crossings);

/// Whether the states under the boundary are computed; if not, a path ends where it would enter.
[[nodiscard]] bool computesTwoPhaseStates(const gas::Gas &gas);

/// The nearest point at which `law` from `from` enters the two-phase region, either way; none if it stays out as far as
/// the model goes.
[[nodiscard]] std::optional<CrossingPoint> firstCondensation(const gas::State &from, const Law &law);

/// Reason::condenses, naming the point at which the charge begins to condense.
[[nodiscard]] Failure condensesAt(const CrossingPoint &point, double amount);

} // namespace quasistat::path
