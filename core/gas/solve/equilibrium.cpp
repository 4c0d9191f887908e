#include "core/gas/solve/equilibrium.h"

#include "core/gas/phase/saturation.h"
#include "core/gas/solve/bracketed_root.h"
#include "core/gas/solve/density.h"

#include <algorithm>
#include <cmath>
#include <limits>

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
        const double boundary = m_equation.boundary ? m_equation.boundary->temperatureNear(molarVolume) : 0.0;
        const auto T = boundary > 0.0 ? risingRoot(excess, m_coldest, m_hottest, boundary) : hottestRoot(excess);
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
            if (!s) return {-std::numeric_limits<double>::max(), 0.0}; // denser than any fluid: too cold
            return {valueOf(other.property, *s) - other.value, slopeAtPressure(other.property, *s)};
        };
        const auto T = risingRoot(excess, coldest, hottest, 0.0);
        if (!T) return std::nullopt;
        return stateAt(*T);
    }

    std::optional<MolarState> onIsotherm(double temperature, Given other) const
    {
        Branches branches = branchesAt(temperature);
        if (m_equation.saturation) {
            if (const auto pair = m_equation.saturation->atTemperature(temperature)) {
                const Side side = sideOf(*pair, other);
                if (side.is == Side::Is::between) return side.mixture;
                branches.densestVapour = pair->vapour.molarVolume;
                branches.thinnestLiquid = pair->liquid.molarVolume;
            }
        }
        const auto excess = [&](double lnV) -> ValueAndSlope {
            const MolarState s = homogeneousState(m_equation, temperature, std::exp(lnV));
            return {valueOf(other.property, s) - other.value, slopeAtTemperature(other.property, s)};
        };
        const bool isLiquid = branches.thinnestLiquid && excess(std::log(*branches.thinnestLiquid)).value > 0.0;
        const double low = std::log(isLiquid || !branches.densestVapour ? branches.smallest : *branches.densestVapour);
        const double high = std::log(isLiquid ? *branches.thinnestLiquid : branches.largest);
        const auto lnV = risingRoot(excess, low, high, isLiquid ? high - 0.01 : low + 1.0);
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
    /// On an isochore that meets no boundary: denser than any saturated liquid, where the equation goes on into what
    /// would be the solid and may pass the same value again. The fluid's state is the one met first on the way down.
    template <class Function>
    [[nodiscard]] std::optional<double> hottestRoot(const Function &excess) const
    {
        constexpr double step = 0.85;
        for (double high = m_hottest; high > m_coldest; high *= step) {
            const double low = std::max(high * step, m_coldest);
            if (excess(low).value <= 0.0) return risingRoot(excess, low, high, high);
        }
        return std::nullopt;
    }

    /// Molar volumes between which an isotherm is homogeneous: smallest … thinnestLiquid and densestVapour … largest,
    /// or all the way.
    struct Branches {
        double smallest;
        double largest;
        std::optional<double> thinnestLiquid;
        std::optional<double> densestVapour;
    };

    Branches branchesAt(double temperature) const
    {
        // Far beyond any use, yet inside what a double can hold.
        constexpr double thinnest = 1e12;
        Branches branches{1.0 / m_equation.highestDensity, thinnest, std::nullopt, std::nullopt};
        const PhaseBoundary *boundary = m_equation.boundary.get();
        if (!boundary || m_equation.saturation || temperature >= boundary->highestTemperature()) return branches;
        // Without saturation states the ends are as near as the boundary is interpolated, on the homogeneous side.
        constexpr double step = 0.02;
        constexpr double longest = 25.0;
        const double start = std::log(branches.smallest);
        bool wasUnder = false;
        for (double lnV = start; lnV < start + longest; lnV += step) {
            const bool isUnder = boundary->temperatureNear(std::exp(lnV)) > temperature;
            if (isUnder && !wasUnder && !branches.thinnestLiquid)
                branches.thinnestLiquid = edge(temperature, lnV, lnV - step);
            if (wasUnder && !isUnder) branches.densestVapour = edge(temperature, lnV - step, lnV);
            wasUnder = isUnder;
        }
        return branches;
    }

    /// v at the edge of the two-phase region, between ln v under and outside the boundary.
    double edge(double temperature, double under, double outside) const
    {
        for (int i = 0; i < 40; ++i) {
            const double middle = 0.5 * (under + outside);
            (m_equation.boundary->temperatureNear(std::exp(middle)) > temperature ? under : outside) = middle;
        }
        return std::exp(outside);
    }

    /// Two values of ln v, ascending, between which `other` passes its value: from the coldest state of the isentrope
    /// towards the dense side or from the hottest towards the thin.
    std::optional<std::pair<double, double>> bracketOnIsentrope(double entropy, Given other) const
    {
        if (const auto bracket = bracketFrom(m_coldest * (1.0 + 1e-12), -1.0, entropy, other)) return bracket;
        return bracketFrom(0.5 * m_hottest, 1.0, entropy, other);
    }

    /// In steps of ln v that grow, as far as the model goes.
    std::optional<std::pair<double, double>> bracketFrom(double temperature, double sign, double entropy,
                                                         Given other) const
    {
        const auto start = onIsotherm(temperature, {Property::entropy, entropy});
        if (!start) return std::nullopt;
        const bool startsAbove = valueOf(other.property, *start) > other.value;
        if (startsAbove != (sign > 0.0)) return std::nullopt; // u and h fall as the volume grows
        const double densest = -std::log(m_equation.highestDensity);
        double here = std::log(start->molarVolume);
        double step = 1e-3;
        while (here >= densest && here < densest + 60.0 && step > 1e-6) {
            const double next = std::max(here + sign * step, densest);
            const auto state = onIsochore(std::exp(next), {Property::entropy, entropy});
            if (!state) { // beyond what the model has
                step *= 0.25;
                continue;
            }
            if ((valueOf(other.property, *state) > other.value) != startsAbove)
                return std::pair(std::min(here, next), std::max(here, next));
            if (next == densest) return std::nullopt;
            here = next;
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

namespace
{

std::optional<MolarState> found(const Equilibrium &equilibrium, Given first, Given second)
{
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

/// A search that ends where the other property jumps, from liquid to vapour of a gas whose two-phase states are not
/// computed, has found no state.
bool isThere(const MolarState &state, Given given, double gasConstant)
{
    constexpr double farFromRounding = 1e-6;
    const double RT = gasConstant * state.temperature;
    const double scale =
        given.property == Property::entropy ? gasConstant
        : given.property == Property::pressure || given.property == Property::molarVolume ||
                given.property == Property::temperature
            ? std::abs(given.value) + (given.property == Property::pressure ? RT / state.molarVolume : 0.0)
            : RT + std::abs(given.value);
    return std::abs(valueOf(given.property, state) - given.value) <= farFromRounding * scale;
}

} // namespace

std::optional<MolarState> equilibriumState(const Gas &gas, Given first, Given second)
{
    const auto state = found(Equilibrium(gas), first, second);
    if (!state || !isThere(*state, first, gas.gasConstant()) || !isThere(*state, second, gas.gasConstant()))
        return std::nullopt;
    return state;
}

} // namespace quasistat::gas
