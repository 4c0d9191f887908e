// The lever rule.

#include "core/gas/phase/saturation.h"

namespace quasistat::gas
{
namespace
{

/// Along saturation: dv/dT and du/dT of one phase, from its own slopes and the slope of the pressure.
struct AlongSaturation {
    double volume;         ///< [m³/(mol K)]
    double internalEnergy; ///< [J/(mol K)]
};

AlongSaturation alongSaturation(const MolarState &s, double dpdT)
{
    const double volume = (dpdT - s.dpdT) / s.dpdv;
    return {volume, s.isochoricHeatCapacity + (s.temperature * s.dpdT - s.pressure) * volume};
}

} // namespace

MolarState twoPhaseState(const SaturatedPair &pair, double molarVolume)
{
    const MolarState &l = pair.liquid;
    const MolarState &g = pair.vapour;
    const double width = g.molarVolume - l.molarVolume;
    const double x = (molarVolume - l.molarVolume) / width;
    const auto mixed = [x](double liquid, double vapour) { return liquid + x * (vapour - liquid); };

    // Clausius–Clapeyron; c_v = du/dT at constant v, with matter shifting so that v stays.
    const double dpdT = (g.entropy - l.entropy) / width;
    const AlongSaturation liquid = alongSaturation(l, dpdT);
    const AlongSaturation vapour = alongSaturation(g, dpdT);
    const double dxdT = -mixed(liquid.volume, vapour.volume) / width;
    return {.temperature = g.temperature,
            .molarVolume = molarVolume,
            .pressure = g.pressure,
            .internalEnergy = mixed(l.internalEnergy, g.internalEnergy),
            .enthalpy = mixed(l.enthalpy, g.enthalpy),
            .entropy = mixed(l.entropy, g.entropy),
            .isochoricHeatCapacity =
                mixed(liquid.internalEnergy, vapour.internalEnergy) + dxdT * (g.internalEnergy - l.internalEnergy),
            .dpdT = dpdT,
            .dpdv = 0.0,
            .vapourFraction = x};
}

} // namespace quasistat::gas
