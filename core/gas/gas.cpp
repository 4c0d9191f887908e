#include "core/gas/gas.h"

namespace quasistat::gas
{

MolarState homogeneousState(const Gas &gas, double temperature, double molarVolume)
{
    const Helmholtz h = gas.helmholtz(temperature, molarVolume);
    const double internalEnergy = h.a - temperature * h.aT;
    return {.temperature = temperature,
            .molarVolume = molarVolume,
            .pressure = -h.av,
            .internalEnergy = internalEnergy,
            .enthalpy = internalEnergy - h.av * molarVolume,
            .entropy = -h.aT,
            .isochoricHeatCapacity = -temperature * h.aTT,
            .dpdT = -h.aTv,
            .dpdv = -h.avv,
            .vapourFraction = std::nullopt};
}

double idealHeatCapacityRatio(const Gas &gas, double temperature)
{
    // The ideal part's heat capacities do not depend on the volume; any will do.
    const MolarState state = gas.idealPart().at(temperature, 1.0);
    return isobaricHeatCapacity(state) / state.isochoricHeatCapacity;
}

} // namespace quasistat::gas
