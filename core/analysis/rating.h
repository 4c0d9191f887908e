#pragma once
// A pressure rating that falls with temperature, as piecewise linear data.

#include "core/analysis/envelope.h"

namespace quasistat::analysis
{

/// Highest allowed pressure at `temperature` [Pa], constant beyond the ends. Precondition: not empty, ascending.
[[nodiscard]] double allowedPressure(const std::vector<Rating> &ratings, double temperature);

/// Its slope [Pa/K]; zero beyond the ends, on a break the slope above it.
[[nodiscard]] double allowedPressureSlope(const std::vector<Rating> &ratings, double temperature);

} // namespace quasistat::analysis
