#pragma once
// One branch of a mixture's phase boundary as a table over ln ρ, followed from a thin mixture to a dense one.

#include "core/gas/phase/incipient_phase.h"

#include <optional>
#include <vector>

namespace quasistat::gas
{

/// Nodes are solutions of the incipient phase, ascending in density; between them ln T is a cubic through values and
/// slopes of both ends, over the leap across the critical point a polynomial through four nodes. Where Newton finds no
/// further solution, or the branch turns back in density, the table ends.
class BoundaryTrace
{
public:
    /// `start`: a solution. Followed both ways until T falls below `lowestTemperature` [K], the mixture is thinner than
    /// 1e-14 or denser than 0.97 of close packing.
    BoundaryTrace(IncipientPhase &phase, const IncipientState &start, double closestPacking, double lowestTemperature);

    struct Node {
        double lnDensity;
        double lnTemperature;
        double slope;    ///< d ln T/d ln ρ
        double distance; ///< of the trace from the mixture
        IncipientState state;
        IncipientState slopes; ///< d/d ln ρ
    };
    [[nodiscard]] const std::vector<Node> &nodes() const { return m_nodes; }

    /// Whether the dense end is where nothing more is to be followed: close packing or the lowest temperature.
    [[nodiscard]] bool isComplete() const { return m_isComplete; }

    /// ln T of the boundary, interpolated; none outside the table.
    [[nodiscard]] std::optional<double> lnTemperature(double lnDensity) const;
    /// The whole state there, interpolated: what Newton starts from.
    [[nodiscard]] IncipientState near(double lnDensity) const;
    /// So near to the critical point that interpolation is better than Newton's method, whose equations lose a digit
    /// for each one that trace and mixture have in common.
    [[nodiscard]] bool isCritical(double lnDensity) const;

private:
    void follow(IncipientPhase &phase, const IncipientState &start, double direction, double lnLimit,
                double lnLowestTemperature);
    /// Puts nodes between those whose cubic would be off by more than a third of what PhaseBoundary claims.
    void refine(IncipientPhase &phase);
    [[nodiscard]] double interpolationError(std::size_t interval) const;
    [[nodiscard]] bool leapsCriticalPoint(std::size_t interval) const;
    [[nodiscard]] std::size_t interval(double lnDensity) const; ///< index of its lower node

    std::vector<Node> m_nodes;
    bool m_isComplete = false;
};

} // namespace quasistat::gas
