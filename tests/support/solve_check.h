#pragma once
// Random states of a gas, and the way back to each from every pair of its properties.

#include "core/gas/equation/equation.h"
#include "core/gas/phase/saturation.h"
#include "core/gas/solve/solve.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <cmath>
#include <random>

namespace quasistat::test
{

/// States inside the published range, over the whole of it: dilute and dense, under the dome where it is computed, and
/// crowded about the critical point, where everything is flat.
class RandomStates
{
public:
    RandomStates(const gas::Gas &gas, unsigned seed) : m_gas(gas), m_random(seed) {}

    gas::MolarState next()
    {
        for (;;) {
            const auto state = candidate();
            if (state) return *state;
        }
    }

private:
    double between(double a, double b) { return std::uniform_real_distribution<double>(a, b)(m_random); }

    std::optional<gas::MolarState> candidate()
    {
        const gas::Range &valid = m_gas.validity().valid;
        const gas::Equation &equation = *m_gas.equation();
        double T = valid.lowestTemperature +
                   (valid.highestTemperature - valid.lowestTemperature) * std::pow(between(1e-4, 1.0), 2.0);
        double rho = equation.highestDensity * std::exp(between(-16.0, 0.0));
        if (equation.saturation && between(0.0, 1.0) < 0.1) {
            T = equation.saturation->criticalTemperature() * between(0.97, 1.05);
            rho = between(0.5, 1.6) / equation.saturation->criticalVolume();
        }
        const auto state = gas::stateAt(m_gas, T, 1.0 / rho);
        if (!state || !(state->pressure > 0.0 && state->pressure < valid.highestPressure)) return std::nullopt;
        if (isSolid(T, rho) || T < valid.lowestTemperature || (!state->vapourFraction && !(state->dpdv < 0.0)))
            return std::nullopt;
        return *state;
    }

    /// Published pressure ranges reach into the solid, where an equation of the fluid need not be one surface. The
    /// files hold no melting curves; soft spheres freeze at ρ ∝ T^(1/4), about a tenth above the liquid at the triple
    /// point (from memory; only keeps random states among fluids).
    [[nodiscard]] bool isSolid(double temperature, double density) const
    {
        const auto &saturation = m_gas.equation()->saturation;
        if (!saturation) return false;
        const double triple = saturation->lowestTemperature();
        const double liquid = 1.0 / saturation->atTemperature(triple)->liquid.molarVolume;
        return density > 1.1 * liquid * std::pow(temperature / triple, 0.25);
    }

    const gas::Gas &m_gas;
    std::mt19937 m_random;
};

struct PropertyPair {
    gas::Property first;
    gas::Property second;
    const char *name;
};
inline constexpr PropertyPair solvedPairs[]{{gas::Property::temperature, gas::Property::pressure, "T, p"},
                                            {gas::Property::pressure, gas::Property::entropy, "p, s"},
                                            {gas::Property::pressure, gas::Property::enthalpy, "p, h"},
                                            {gas::Property::pressure, gas::Property::internalEnergy, "p, u"},
                                            {gas::Property::molarVolume, gas::Property::internalEnergy, "v, u"},
                                            {gas::Property::molarVolume, gas::Property::entropy, "v, s"},
                                            {gas::Property::temperature, gas::Property::entropy, "T, s"},
                                            {gas::Property::molarVolume, gas::Property::pressure, "v, p"},
                                            {gas::Property::entropy, gas::Property::internalEnergy, "s, u"},
                                            {gas::Property::entropy, gas::Property::enthalpy, "s, h"}};

/// What a property is made of and so what its rounding is a share of: a cold liquid's pressure is the difference of
/// terms as large as those of its compression, an energy counts from 298.15 K.
inline double magnitude(gas::Property property, const gas::MolarState &s, double gasConstant)
{
    const double RT = gasConstant * s.temperature;
    switch (property) {
    case gas::Property::temperature: return s.temperature;
    case gas::Property::molarVolume: return s.molarVolume;
    case gas::Property::pressure:
        return std::max({s.pressure, RT / s.molarVolume, s.temperature * std::abs(s.dpdT), -s.molarVolume * s.dpdv});
    case gas::Property::entropy: return std::max(std::abs(s.entropy), gasConstant);
    case gas::Property::internalEnergy: return std::max(std::abs(s.internalEnergy), RT);
    case gas::Property::enthalpy: return std::max(std::abs(s.enthalpy), RT);
    }
    return 1.0;
}

/// How far T and v (in ln) move when both properties change by their magnitudes: the condition of the pair.
inline double condition(const gas::MolarState &s, const PropertyPair &pair, double gasConstant)
{
    const auto row = [&](gas::Property property) -> std::array<double, 2> {
        const double T = s.temperature;
        const double v = s.molarVolume;
        const double scale = magnitude(property, s, gasConstant);
        switch (property) {
        case gas::Property::temperature: return {1.0, 0.0};
        case gas::Property::molarVolume: return {0.0, 1.0};
        case gas::Property::pressure: return {T * s.dpdT / scale, v * s.dpdv / scale};
        case gas::Property::entropy: return {s.isochoricHeatCapacity / scale, v * s.dpdT / scale};
        case gas::Property::internalEnergy:
            return {T * s.isochoricHeatCapacity / scale, v * (T * s.dpdT - s.pressure) / scale};
        case gas::Property::enthalpy:
            return {T * (s.isochoricHeatCapacity + v * s.dpdT) / scale, v * (T * s.dpdT + v * s.dpdv) / scale};
        }
        return {0.0, 0.0};
    };
    const auto a = row(pair.first);
    const auto b = row(pair.second);
    const double determinant = std::abs(a[0] * b[1] - a[1] * b[0]);
    return (std::abs(a[0]) + std::abs(a[1]) + std::abs(b[0]) + std::abs(b[1])) / determinant;
}

/// Goes back to `count` random states from every pair: the pair's residuals below 1e-11 of their magnitudes, T and v
/// within 1e-9 or 100 ε times the condition of the pair.
inline void expectWayBack(const gas::Gas &gas, int count, unsigned seed)
{
    RandomStates states(gas, seed);
    const double R = gas.gasConstant();
    int failures = 0;
    for (int i = 0; i < count && failures < 10; ++i) {
        const gas::MolarState s = states.next();
        for (const PropertyPair &pair : solvedPairs) {
            // Where the first vapour forms, h and s of a cold liquid change along nearly one line.
            if (pair.second == gas::Property::enthalpy && pair.first == gas::Property::entropy && s.vapourFraction &&
                *s.vapourFraction < 0.01)
                continue;
            // At constant entropy a gas that stops at its dew line is followed from a neighbour on a path only.
            if (!gas.equation()->saturation && pair.first == gas::Property::entropy) continue;
            if (s.vapourFraction && pair.first == gas::Property::temperature && pair.second == gas::Property::pressure)
                continue; // under the dome the two do not fix a state
            const gas::Given a{pair.first, valueOf(pair.first, s)};
            const gas::Given b{pair.second, valueOf(pair.second, s)};
            const auto found = gas::stateFrom(gas, a, b);
            const auto where = testing::Message() << gas.name() << " from " << pair.name << " at T = " << s.temperature
                                                  << " K, v = " << s.molarVolume << " m³/mol, p = " << s.pressure
                                                  << " Pa, x = " << s.vapourFraction.value_or(-1.0);
            if (!found) {
                ADD_FAILURE() << where << ": " << found.failure().message.text;
                ++failures;
                continue;
            }
            const double tolerance = std::max(1e-9, 100.0 * 2.2e-16 * condition(s, pair, R));
            bool isRight = true;
            for (const gas::Given &given : {a, b})
                isRight &=
                    std::abs(valueOf(given.property, *found) - given.value) <= 1e-11 * magnitude(given.property, s, R);
            isRight &= std::abs(std::log(found->temperature / s.temperature)) <= tolerance;
            isRight &= std::abs(std::log(found->molarVolume / s.molarVolume)) <= tolerance;
            if (isRight) continue;
            ++failures;
            ADD_FAILURE() << where << ": found T off by " << found->temperature / s.temperature - 1.0 << ", v off by "
                          << found->molarVolume / s.molarVolume - 1.0 << ", tolerance " << tolerance << ", x "
                          << found->vapourFraction.value_or(-1.0);
        }
    }
}

} // namespace quasistat::test
