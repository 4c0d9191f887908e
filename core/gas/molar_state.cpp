#include "core/gas/molar_state.h"

#include <cmath>
#include <limits>

namespace quasistat::gas
{

double isobaricHeatCapacity(const MolarState &state)
{
    if (!(state.dpdv < 0.0)) return std::numeric_limits<double>::infinity();
    return state.isochoricHeatCapacity + state.temperature * state.dpdT * state.dpdT / -state.dpdv;
}

double speedOfSound(const MolarState &state, double molarMass)
{
    const double stiffening = state.temperature * state.dpdT * state.dpdT / state.isochoricHeatCapacity;
    return state.molarVolume * std::sqrt((stiffening - state.dpdv) / molarMass);
}

} // namespace quasistat::gas
