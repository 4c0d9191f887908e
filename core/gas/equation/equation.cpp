#include "core/gas/equation/equation.h"

#include "core/gas/constants.h"

#include <algorithm>
#include <array>
#include <cassert>
#include <cmath>

namespace quasistat::gas
{
namespace
{

MolarState stateFrom(const Equation &equation, const Alpha &r, double temperature, double molarVolume)
{
    const double R = equation.gasConstant;
    const IdealProperties ideal = equation.ideal->at(temperature);
    const double idealPressure = R * temperature / molarVolume;
    const double pressure = idealPressure * (1.0 + r.a01);
    const double internalEnergy = R * (ideal.enthalpy + temperature * (r.a10 - 1.0));
    return {.temperature = temperature,
            .molarVolume = molarVolume,
            .pressure = pressure,
            .internalEnergy = internalEnergy,
            .enthalpy = internalEnergy + pressure * molarVolume,
            .entropy = R * (ideal.entropy - std::log(idealPressure / referencePressure) + r.a10 - r.a00) +
                       equation.mixingEntropy,
            .isochoricHeatCapacity = R * (ideal.heatCapacity - 1.0 - r.a20),
            .dpdT = R / molarVolume * (1.0 + r.a01 - r.a11),
            .dpdv = -idealPressure / molarVolume * (1.0 + 2.0 * r.a01 + r.a02),
            .vapourFraction = std::nullopt};
}

} // namespace

MolarState homogeneousState(const Equation &equation, double temperature, double molarVolume)
{
    return stateFrom(equation, equation.residual->at(temperature, 1.0 / molarVolume), temperature, molarVolume);
}

void homogeneousStates(const Equation &equation, std::span<const double> temperatures,
                       std::span<const double> molarVolumes, std::span<MolarState> results)
{
    assert(temperatures.size() == molarVolumes.size() && molarVolumes.size() == results.size());
    constexpr std::size_t block = 64;
    std::array<double, block> densities;
    std::array<Alpha, block> alphas;
    for (std::size_t from = 0; from < results.size(); from += block) {
        const std::size_t count = std::min(block, results.size() - from);
        for (std::size_t i = 0; i < count; ++i) densities[i] = 1.0 / molarVolumes[from + i];
        equation.residual->atEach(temperatures.subspan(from, count), std::span(densities).first(count),
                                  std::span(alphas).first(count));
        for (std::size_t i = 0; i < count; ++i)
            results[from + i] = stateFrom(equation, alphas[i], temperatures[from + i], molarVolumes[from + i]);
    }
}

} // namespace quasistat::gas
