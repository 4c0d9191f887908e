#include "core/gas/equation/cubic.h"

#include "core/gas/constants.h"

#include <algorithm>
#include <cmath>

namespace quasistat::gas
{

CubicResidual::CubicResidual(const CubicMixture &mixture, std::span<const double> fractions)
    : m_form(mixture.form()), m_covolume(mixture.covolume(fractions))
{
    // a(T) = Σ Σ xᵢxⱼ(1 − kᵢⱼ)(Aᵢ − Bᵢ√T)(Aⱼ − Bⱼ√T), multiplied out.
    double AA = 0.0;
    double AB = 0.0;
    double BB = 0.0;
    for (std::size_t i = 0; i < mixture.size(); ++i)
        for (std::size_t j = 0; j < mixture.size(); ++j) {
            const double weight = fractions[i] * fractions[j] * mixture.factor(i, j);
            AA += weight * mixture.root(i).constant * mixture.root(j).constant;
            AB += weight * mixture.root(i).constant * mixture.root(j).slope;
            BB += weight * mixture.root(i).slope * mixture.root(j).slope;
        }
    const double bR = m_covolume * molarGasConstant;
    m_inverse = AA / bR;
    m_root = 2.0 * AB / bR;
    m_constant = BB / bR;
}

void CubicResidual::atTemperature(double temperature, bool /*temperatureDerivatives: two products*/,
                                  Isotherm &isotherm) const
{
    const double inverse = m_inverse / temperature;
    const double root = m_root / std::sqrt(temperature);
    isotherm.temperature = temperature;
    isotherm.value[0] = inverse - root + m_constant;
    isotherm.first[0] = inverse - 0.5 * root;
    isotherm.second[0] = 0.25 * root;
}

Alpha CubicResidual::at(const Isotherm &isotherm, double density) const
{
    const CubicPacking y = cubicPacking(m_form, m_covolume * density);
    const double q = isotherm.value[0];
    return {.a00 = y.logFree - q * y.attraction,
            .a10 = -isotherm.first[0] * y.attraction,
            .a01 = y.free1 - q * y.attraction1,
            .a20 = -isotherm.second[0] * y.attraction,
            .a11 = -isotherm.first[0] * y.attraction1,
            .a02 = y.free2 - q * y.attraction2};
}

DensityDerivatives CubicResidual::densityDerivatives(const Isotherm &isotherm, double density) const
{
    const double y = std::min(m_covolume * density, closestCubicPacking);
    // Without the logarithms of cubicPacking.
    const double free = y / (1.0 - y);
    const double first = y / ((1.0 + m_form.delta1 * y) * (1.0 + m_form.delta2 * y));
    const double second = -first * first * (m_form.delta1 + m_form.delta2 + 2.0 * m_form.delta1 * m_form.delta2 * y);
    const double q = isotherm.value[0];
    return {free - q * first, free * free - q * second};
}

} // namespace quasistat::gas
