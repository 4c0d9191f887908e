#include "core/gas/solve/equilibrium.h"

#include "core/gas/phase/saturation.h"
#include "core/gas/solve/bracketed_root.h"
#include "core/gas/solve/density.h"

#include <algorithm>
#include <cmath>

namespace quasistat::gas
{
namespace
{

/// Slopes of a property: in T at constant v and at constant p, in ln v at constant T.
double slopeAtVolume(Property property, const MolarState &s)
{
    switch (property) {
    case Property::temperature: return 1.0;
    case Property::molarVolume: return 0.0;
    case Property::pressure: return s.dpdT;
    case Property::internalEnergy: return s.isochoricHeatCapacity;
    case Property::enthalpy: return s.isochoricHeatCapacity + s.molarVolume * s.dpdT;
    case Property::entropy: return s.isochoricHeatCapacity / s.temperature;
    }
    return 0.0;
}

double slopeAtTemperature(Property property, const MolarState &s)
{
    const double v = s.molarVolume;
    switch (property) {
    case Property::temperature: return 0.0;
    case Property::molarVolume: return v;
    case Property::pressure: return v * s.dpdv;
    case Property::internalEnergy: return v * (s.temperature * s.dpdT - s.pressure);
    case Property::enthalpy: return v * (s.temperature * s.dpdT + v * s.dpdv);
    case Property::entropy: return v * s.dpdT;
    }
    return 0.0;
}

double slopeAtPressure(Property property, const MolarState &s)
{
    return slopeAtVolume(property, s) - slopeAtTemperature(property, s) / s.molarVolume * s.dpdT / s.dpdv;
}

/// Where between the phases a property has its value: below, between with the state by the lever rule, or above.
struct Side {
    enum class Is { liquid, between, vapour } is;
    MolarState mixture;
};

Side sideOf(const SaturatedPair &pair, Given given)
{
    const double liquid = valueOf(given.property, pair.liquid);
    const double vapour = valueOf(given.property, pair.vapour);
    if (given.value < liquid) return {Side::Is::liquid, pair.liquid};
    if (given.value > vapour) return {Side::Is::vapour, pair.vapour};
    const double x = (given.value - liquid) / (vapour - liquid);
    const double v = pair.liquid.molarVolume + x * (pair.vapour.molarVolume - pair.liquid.molarVolume);
    return {Side::Is::between, twoPhaseState(pair, v)};
}

class Equilibrium
{
public:
    explicit Equilibrium(const Gas &gas)
        : m_gas(gas), m_equation(*gas.equation()), m_coldest(gas.validity().hard.lowestTemperature),
          m_hottest(2.0 * gas.validity().hard.highestTemperature)
    {
    }

    std::optional<MolarState> onIsochore(double molarVolume, Given other) const
    {
        const auto excess = [&](double T) -> ValueAndSlope {
            const MolarState s = m_gas.at(T, molarVolume);
            return {valueOf(other.property, s) - other.value, slopeAtVolume(other.property, s)};
        };
        const double start = m_equation.boundary ? m_equation.boundary->temperatureNear(molarVolume) : 0.0;
        const auto T = risingRoot(excess, m_coldest, m_hottest, start);
        if (!T) return std::nullopt;
        return m_gas.at(*T, molarVolume);
    }

    std::optional<MolarState> onIsobar(double pressure, Given other) const
    {
        double coldest = m_coldest;
        double hottest = m_hottest;
        if (m_equation.saturation) {
            if (const auto pair = m_equation.saturation->atPressure(pressure)) {
                const Side side = sideOf(*pair, other);
                if (side.is == Side::Is::between) return side.mixture;
                (side.is == Side::Is::vapour ? coldest : hottest) = pair->vapour.temperature;
            }
        }
        const bool isLiquid = hottest < m_hottest;
        const auto stateAt = [&](double T) -> std::optional<MolarState> {
            // At the end of the branch the two phases coexist, and which is meant is known here only.
            const bool atEnd = T == (isLiquid ? hottest : coldest) && m_equation.saturation;
            if (const auto pair = atEnd ? m_equation.saturation->atTemperature(T) : std::nullopt)
                return isLiquid ? pair->liquid : pair->vapour;
            const auto v = molarVolumeAt(m_equation, T, pressure);
            if (!v) return std::nullopt;
            return homogeneousState(m_equation, T, *v);
        };
        const auto excess = [&](double T) -> ValueAndSlope {
            const auto s = stateAt(T);
            if (!s) return {std::nan(""), 0.0};
            return {valueOf(other.property, *s) - other.value, slopeAtPressure(other.property, *s)};
        };
        const auto T = risingRoot(excess, coldest, hottest, 0.0);
        if (!T) return std::nullopt;
        return stateAt(*T);
    }

    std::optional<MolarState> onIsotherm(double temperature, Given other) const
    {
        // Far beyond any use, yet inside what a double can hold.
        constexpr double thinnest = 1e12;
        double smallest = 1.0 / m_equation.highestDensity;
        double largest = thinnest;
        if (m_equation.saturation) {
            if (const auto pair = m_equation.saturation->atTemperature(temperature)) {
                const Side side = sideOf(*pair, other);
                if (side.is == Side::Is::between) return side.mixture;
                (side.is == Side::Is::vapour ? smallest : largest) = side.mixture.molarVolume;
            }
        }
        const auto excess = [&](double lnV) -> ValueAndSlope {
            const MolarState s = homogeneousState(m_equation, temperature, std::exp(lnV));
            return {valueOf(other.property, s) - other.value, slopeAtTemperature(other.property, s)};
        };
        const auto lnV = risingRoot(excess, std::log(smallest), std::log(largest), std::log(smallest) + 1.0);
        if (!lnV) return std::nullopt;
        return homogeneousState(m_equation, temperature, std::exp(*lnV));
    }

    /// `other` is u or h: both fall as the gas expands at constant entropy.
    std::optional<MolarState> onIsentrope(double entropy, Given other) const
    {
        const auto stateAt = [&](double lnV) { return onIsochore(std::exp(lnV), {Property::entropy, entropy}); };
        const auto excess = [&](double minusLnV) -> ValueAndSlope {
            const auto s = stateAt(-minusLnV);
            if (!s) return {std::nan(""), 0.0};
            const double v = s->molarVolume;
            const double dpdv =
                s->dpdv - s->temperature * s->dpdT * s->dpdT / s->isochoricHeatCapacity; // at constant entropy
            const double slope = other.property == Property::enthalpy ? -v * v * dpdv : v * s->pressure;
            return {valueOf(other.property, *s) - other.value, slope};
        };
        const auto range = bracketOnIsentrope(entropy, other);
        if (!range) return std::nullopt;
        const auto x = risingRoot(excess, -range->second, -range->first, 0.0);
        if (!x) return std::nullopt;
        return stateAt(-*x);
    }

private:
    /// Two values of ln v, ascending, between which `other` passes its value: from the coldest state of the isentrope
    /// towards the dense side, in steps that grow.
    std::optional<std::pair<double, double>> bracketOnIsentrope(double entropy, Given other) const
    {
        const auto coldest = onIsotherm(m_coldest * (1.0 + 1e-12), {Property::entropy, entropy});
        if (!coldest || valueOf(other.property, *coldest) > other.value) return std::nullopt;
        const double densest = -std::log(m_equation.highestDensity);
        double large = std::log(coldest->molarVolume);
        double step = 1e-3;
        while (large > densest && step > 1e-6) {
            const double small = std::max(large - step, densest);
            const auto state = onIsochore(std::exp(small), {Property::entropy, entropy});
            if (!state) { // hotter there than the model goes
                step *= 0.25;
                continue;
            }
            if (valueOf(other.property, *state) >= other.value) return std::pair(small, large);
            large = small;
            step *= 1.5;
        }
        return std::nullopt;
    }

    const Gas &m_gas;
    const Equation &m_equation;
    double m_coldest;
    double m_hottest;
};

} // namespace

std::optional<MolarState> equilibriumState(const Gas &gas, Given first, Given second)
{
    const Equilibrium equilibrium(gas);
    const auto has = [&](Property property) { return first.property == property || second.property == property; };
    const auto other = [&](Property property) { return first.property == property ? second : first; };
    const auto value = [&](Property property) { return first.property == property ? first.value : second.value; };
    if (has(Property::molarVolume))
        return equilibrium.onIsochore(value(Property::molarVolume), other(Property::molarVolume));
    if (has(Property::pressure)) return equilibrium.onIsobar(value(Property::pressure), other(Property::pressure));
    if (has(Property::temperature))
        return equilibrium.onIsotherm(value(Property::temperature), other(Property::temperature));
    if (has(Property::entropy)) return equilibrium.onIsentrope(value(Property::entropy), other(Property::entropy));
    return std::nullopt;
}

} // namespace quasistat::gas
