#pragma once
// The limits of the equipment, checked along the whole of each segment, and their boundary on the p–V plane.

#include "core/path/result.h"

#include <vector>

namespace quasistat::analysis
{

enum class LimitQuantity { pressure, volume, temperature, pressureRatio, work, heat, amount, storedEnergy };

struct Rating {
    double temperature; ///< [K]
    double pressure;    ///< highest allowed [Pa]
};

struct Limit {
    LimitQuantity quantity;
    std::string label;
    std::optional<double> min; ///< SI
    std::optional<double> max;
    std::vector<Rating> maxAt; ///< ascending temperatures; piecewise linear, constant beyond its ends
};

/// A stretch of one segment that breaks a limit, for the halo.
struct Violation {
    int segment;            ///< from 1
    path::Polyline stretch; ///< empty for limits on a whole segment (work, heat, pressure ratio)
};

struct Verdict {
    std::size_t limit;           ///< index into the limits
    std::optional<double> worst; ///< the value nearest to or furthest beyond the limit [SI]; none: nothing to check
    std::optional<double> worstAllowed; ///< what is allowed there (the rating at that temperature; else min or max)
    int segment = 0; ///< where `worst` is, from 1; 0 if at a state only (amount, or a path of no segments)
    int state = 0;   ///< a state in which `worst` occurs, from 1; 0 if between states
    bool ok = true;
    std::vector<Violation> violations;
};

[[nodiscard]] std::vector<Verdict> verdicts(const std::vector<Limit> &limits, const path::PathResult &path,
                                            double surroundingsPressure);

/// The edge of the allowed region of p–V for a charge like state 1: one boundary for all limits together.
struct BoundaryStretch {
    std::size_t limit;                             ///< whose label belongs here
    bool forbiddenAbove;                           ///< for volume limits: forbidden at larger volume
    std::vector<std::pair<double, double>> points; ///< (V, p), V ascending; vertical for volume limits
};
struct Window {
    path::Interval volume;   ///< [m³] as shown
    path::Interval pressure; ///< [Pa]
    bool logVolume = false;
};
[[nodiscard]] std::vector<BoundaryStretch> boundary(const std::vector<Limit> &limits, const gas::State &charge,
                                                    const Window &window);

} // namespace quasistat::analysis
