#pragma once
// Everything a path is computed from, in SI: made by document::interpret, or by hand in a test.

#include "core/gas/gas.h"
#include "core/path/segment.h"

namespace quasistat::path
{

/// Three that fix the state, or a volume that is evacuated.
struct Start {
    std::optional<double> pressure;    ///< [Pa]
    std::optional<double> temperature; ///< [K]
    std::optional<double> volume;      ///< [m³]
    std::optional<double> amount;      ///< [mol]
    bool evacuated = false;
};

struct Surroundings {
    double pressure = 101325.0;  ///< p₀ [Pa]
    double temperature = 298.15; ///< T₀ [K]
    bool pressureStated = false; ///< false: the default, warned about where it enters a result
    bool temperatureStated = false;
};

struct PathInput {
    gas::GasPtr gas;
    Start start;
    std::vector<Outcome<Segment>> segments; ///< a failed one stays in its place, the path stops there
    Surroundings surroundings;
    std::optional<double> rate; ///< cycles per time [1/s]
};

} // namespace quasistat::path
