#include "core/gas/phase/cubic_fugacities.h"

#include "core/gas/constants.h"
#include "core/gas/equation/cubic.h"

#include <cassert>
#include <cmath>

namespace quasistat::gas
{

double CubicFugacities::gasConstant() const
{
    return molarGasConstant;
}

Fugacities::Critical CubicFugacities::critical(std::size_t component) const
{
    const CubicSubstance &substance = m_mixture.substances()[component];
    return {substance.criticalTemperature, substance.criticalPressure, substance.acentricFactor};
}

double CubicFugacities::residualPotentials(double temperature, double density, std::span<const double> fractions,
                                           std::span<double> result) const
{
    const std::size_t n = m_mixture.size();
    assert(fractions.size() == n && result.size() == n);
    const double rootT = std::sqrt(temperature);
    const auto root = [&](std::size_t i) { return m_mixture.root(i).constant - m_mixture.root(i).slope * rootT; };

    // result: Σ xⱼ aᵢⱼ first, of which a is the mean.
    for (double &value : result) value = 0.0;
    for (std::size_t j = 0; j < n; ++j) {
        const double share = fractions[j] * root(j);
        for (std::size_t i = 0; i < n; ++i) result[i] += share * m_mixture.factor(i, j);
    }
    double a = 0.0;
    for (std::size_t i = 0; i < n; ++i) a += fractions[i] * (result[i] *= root(i));

    const double b = m_mixture.covolume(fractions);
    const double RT = molarGasConstant * temperature;
    const CubicPacking y = cubicPacking(m_mixture.form(), b * density);
    const double q = a / (b * RT);
    for (std::size_t i = 0; i < n; ++i) {
        const double size = m_mixture.covolume(i) / b;
        result[i] = y.logFree + size * y.free1 - (2.0 * result[i] / (b * RT) - q * size) * y.attraction -
                    q * size * y.attraction1;
    }
    return density * RT * (1.0 + y.free1 - q * y.attraction1);
}

Fugacities::PressureSlope CubicFugacities::pressure(double temperature, double density,
                                                    std::span<const double> fractions) const
{
    const CubicResidual residual(m_mixture, fractions);
    Isotherm isotherm;
    residual.atTemperature(temperature, false, isotherm);
    const DensityDerivatives alpha = residual.densityDerivatives(isotherm, density);
    const double RT = molarGasConstant * temperature;
    return {density * RT * (1.0 + alpha.a01), RT * (1.0 + 2.0 * alpha.a01 + alpha.a02)};
}

double CubicFugacities::closestPacking(std::span<const double> fractions) const
{
    return 1.0 / m_mixture.covolume(fractions);
}

} // namespace quasistat::gas
