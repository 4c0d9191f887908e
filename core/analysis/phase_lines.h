#pragma once
// The phase boundary of a charge on the p–V plane, as lines to draw.

#include "core/gas/state.h"

#include <optional>
#include <utility>
#include <vector>

namespace quasistat::analysis
{

struct PhaseLine {
    enum class Kind { saturatedVapour, saturatedLiquid, dewLine, equalVapourFraction };
    Kind kind;
    double vapourFraction;
    std::vector<std::pair<double, double>> points; ///< volume [m³] of the charge, pressure [Pa]
};

struct PhaseLines {
    std::vector<PhaseLine> lines;
    std::optional<std::pair<double, double>> critical; ///< volume [m³] of the charge, pressure [Pa]
};

/// Empty for ideal gases. About a millisecond, longer for mixtures.
[[nodiscard]] PhaseLines phaseLines(const gas::State &charge);

} // namespace quasistat::analysis
