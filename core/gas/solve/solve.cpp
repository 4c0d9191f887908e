#include "core/gas/solve/solve.h"

#include "core/gas/constants.h"
#include "core/gas/equation/equation.h"
#include "core/gas/phase/dew_point.h"
#include "core/gas/phase/saturation.h"
#include "core/gas/solve/density.h"
#include "core/gas/solve/equilibrium.h"
#include "core/gas/solve/newton.h"

#include <algorithm>
#include <cmath>

namespace quasistat::gas
{
namespace
{

using units::Quantity;

/// Whether the two properties of an ideal gas both depend on temperature alone.
bool areBothThermal(Given first, Given second)
{
    const auto isThermal = [](Property p) {
        return p == Property::temperature || p == Property::internalEnergy || p == Property::enthalpy;
    };
    return isThermal(first.property) && isThermal(second.property);
}

bool isPositiveWhereItMustBe(Given given)
{
    if (!std::isfinite(given.value)) return false;
    const bool mustBePositive = given.property == Property::temperature || given.property == Property::molarVolume ||
                                given.property == Property::pressure;
    return !mustBePositive || given.value > 0.0;
}

/// An ideal gas by p and v or p and T, from p v = R T without iteration.
std::optional<MolarState> idealFromPressure(const Gas &gas, Given first, Given second)
{
    const auto p = valueOf(Property::pressure, first, second);
    if (!p) return std::nullopt;
    if (const auto v = valueOf(Property::molarVolume, first, second)) return gas.at(*p * *v / gas.gasConstant(), *v);
    if (const auto T = valueOf(Property::temperature, first, second)) return gas.at(*T, gas.gasConstant() * *T / *p);
    return std::nullopt;
}

Place firstGuess(const Gas &gas, Given first, Given second, const MolarState *guess)
{
    const double temperature =
        valueOf(Property::temperature, first, second).value_or(guess ? guess->temperature : referenceTemperature);
    if (const auto v = valueOf(Property::molarVolume, first, second)) return {temperature, *v};
    if (guess) return {temperature, guess->molarVolume};
    const double pressure = valueOf(Property::pressure, first, second).value_or(referencePressure);
    return {temperature, gas.gasConstant() * temperature / pressure};
}

std::optional<MolarState> idealState(const Gas &gas, Given first, Given second, const MolarState *guess)
{
    if (areBothThermal(first, second)) return std::nullopt;
    if (const auto state = idealFromPressure(gas, first, second)) return state;
    return newton(gas, first, second, firstGuess(gas, first, second, guess));
}

bool isOnEquilibriumSurface(const Equation &equation, const MolarState &state)
{
    return !equation.boundary || !isTwoPhase(*equation.boundary, state.temperature, state.molarVolume);
}

/// Denser than saturated liquids an equation may have a second surface, in what would be the solid, that Newton finds
/// from far away.
bool isDenserThanAnyLiquid(const Equation &equation, const MolarState &state)
{
    return equation.saturation && state.molarVolume < 0.5 * equation.saturation->criticalVolume() &&
           equation.boundary->temperatureNear(state.molarVolume) == 0.0;
}

/// Where the ideal gas of the same equation would be, near enough to begin at: one unknown, as p or v is given.
std::optional<Place> idealPlace(const Equation &equation, Given first, Given second)
{
    const auto p = valueOf(Property::pressure, first, second);
    const auto v = valueOf(Property::molarVolume, first, second);
    const double R = equation.gasConstant;
    if (p && v) return Place{*p * *v / R, *v};
    if (!p && !v) return std::nullopt;
    const bool firstIsFixed = first.property == (p ? Property::pressure : Property::molarVolume);
    const Given other = firstIsFixed ? second : first;
    constexpr int mostSteps = 12;
    constexpr double nearEnough = 1e-3;
    double T = referenceTemperature;
    for (int i = 0; i < mostSteps; ++i) {
        const IdealProperties ideal = equation.ideal->at(T);
        // Heat capacity at constant p or v; u or h with it, s at p or at R T/v.
        const double capacity = p ? ideal.heatCapacity : ideal.heatCapacity - 1.0;
        double step = 0.0;
        if (other.property == Property::entropy) {
            const double pressure = p ? *p : R * T / *v;
            const double entropy =
                R * (ideal.entropy - std::log(pressure / referencePressure)) + equation.mixingEntropy;
            step = (other.value - entropy) / (R * capacity);
        } else {
            const bool isEnthalpy = other.property == Property::enthalpy;
            const double energy = R * (ideal.enthalpy - (isEnthalpy ? 0.0 : T));
            step = (other.value - energy) / (R * T * (isEnthalpy ? ideal.heatCapacity : ideal.heatCapacity - 1.0));
        }
        T *= std::exp(std::clamp(step, -1.0, 1.0));
        if (!(std::abs(step) > nearEnough)) break;
    }
    if (!std::isfinite(T) || T <= 0.0) return std::nullopt;
    return Place{T, v ? *v : R * T / *p};
}

/// The place where the search for a real gas begins: the neighbour, or where the ideal gas would be.
Place realStart(const Gas &gas, Given first, Given second, const MolarState *guess)
{
    if (!guess) {
        if (const auto place = idealPlace(*gas.equation(), first, second)) return *place;
        if (const auto ideal = idealState(gas.idealPart(), first, second, nullptr))
            return {ideal->temperature, ideal->molarVolume};
    }
    return firstGuess(gas, first, second, guess);
}

/// Bracketing in T leaves v to the last digits of T, which near a critical point are too few: Newton's last steps in
/// both.
std::optional<MolarState> polished(const Gas &gas, Given first, Given second, const std::optional<MolarState> &state)
{
    constexpr double same = 1e-6;
    if (!state || state->vapourFraction) return state;
    const auto better = newton(gas, first, second, {state->temperature, state->molarVolume});
    const bool isThere = better && better->dpdv < 0.0 &&
                         std::abs(better->temperature / state->temperature - 1.0) < same &&
                         std::abs(better->molarVolume / state->molarVolume - 1.0) < same;
    return isThere ? better : state;
}

std::optional<MolarState> realState(const Gas &gas, Given first, Given second, const MolarState *guess)
{
    const Equation &equation = *gas.equation();
    const auto T = valueOf(Property::temperature, first, second);
    if (T) {
        if (const auto v = valueOf(Property::molarVolume, first, second)) return gas.at(*T, *v);
        if (const auto p = valueOf(Property::pressure, first, second)) {
            const bool isNear = guess && !guess->vapourFraction;
            const auto v = molarVolumeAt(equation, *T, *p, isNear ? guess->molarVolume : 0.0);
            if (!v) return std::nullopt;
            return homogeneousState(equation, *T, *v);
        }
    }
    // Below the critical temperature an isotherm passes the same entropy in homogeneous states that are not there, too:
    // the saturated phases come first.
    const bool mayMislead = (guess && guess->vapourFraction) ||
                            (T && equation.saturation && *T < equation.saturation->criticalTemperature());
    std::optional<MolarState> quick;
    if (!mayMislead) quick = newton(gas, first, second, realStart(gas, first, second, guess), guess);
    const bool isRight =
        quick && quick->dpdv < 0.0 && insideModel(gas, *quick) && isOnEquilibriumSurface(equation, *quick);
    if (isRight && (guess || !isDenserThanAnyLiquid(equation, *quick))) return quick;
    return polished(gas, first, second, equilibriumState(gas, first, second));
}

} // namespace

namespace
{

/// The state at one end of the temperature range with one of the two given properties (v or p); none if neither is v or
/// p, or the end has no such state.
std::optional<MolarState> stateAtEnd(const Gas &gas, double temperature, Given first, Given second)
{
    if (const auto v = valueOf(Property::molarVolume, first, second)) return gas.at(temperature, *v);
    if (const auto p = valueOf(Property::pressure, first, second)) {
        const auto v = molarVolumeAt(*gas.equation(), temperature, *p);
        if (v) return homogeneousState(*gas.equation(), temperature, *v);
    }
    return std::nullopt;
}

/// Why a real gas has no such state: it would be colder or hotter than its model goes, or simply has none.
Failure whyNoState(const Gas &gas, Given first, Given second)
{
    const Range &hard = gas.validity().hard;
    const bool firstIsFixed = first.property == Property::molarVolume || first.property == Property::pressure;
    const Given other = firstIsFixed ? second : first; // u, h, s and p at constant v all grow with temperature
    const auto coldest = stateAtEnd(gas, hard.lowestTemperature, first, second);
    if (coldest && other.value < valueOf(other.property, *coldest))
        return {Reason::outsideModel,
                "",
                {"the gas would be colder than {0}, where its model ends",
                 {Figure{Quantity::temperature, hard.lowestTemperature}}}};
    const auto hottest = stateAtEnd(gas, hard.highestTemperature, first, second);
    if (hottest && other.value > valueOf(other.property, *hottest))
        return {Reason::outsideModel,
                "",
                {"the gas would be hotter than {0}, where its model ends",
                 {Figure{Quantity::temperature, hard.highestTemperature}}}};
    const Equation &equation = *gas.equation();
    if (!equation.saturation)
        if (const auto state = newton(gas, first, second, realStart(gas, first, second, nullptr));
            state && !isOnEquilibriumSurface(equation, *state))
            return condenses(gas, *state);
    return noState(first, second);
}

} // namespace

Outcome<MolarState> insideModel(const Gas &gas, const MolarState &state)
{
    const Range &hard = gas.validity().hard;
    // A state asked for at the limit itself comes out of a solver off by its last digits.
    constexpr double rounding = 1e-10;
    if (state.temperature < hard.lowestTemperature * (1.0 - rounding) ||
        state.temperature > hard.highestTemperature * (1.0 + rounding))
        return Failure{
            Reason::outsideModel,
            "",
            {"the gas would be at {0}, but its model ends at {1} and {2}",
             {Figure{Quantity::temperature, state.temperature}, Figure{Quantity::temperature, hard.lowestTemperature},
              Figure{Quantity::temperature, hard.highestTemperature}}}};
    if (state.pressure > hard.highestPressure * (1.0 + rounding))
        return Failure{
            Reason::outsideModel,
            "",
            {"the gas would be at {0}, but its model ends at {1}",
             {Figure{Quantity::pressure, state.pressure}, Figure{Quantity::pressure, hard.highestPressure}}}};
    const Equation *equation = gas.equation();
    if (equation && !equation->saturation && !isOnEquilibriumSurface(*equation, state)) return condenses(gas, state);
    return state;
}

Outcome<MolarState> stateAt(const Gas &gas, double temperature, double molarVolume)
{
    return insideModel(gas, gas.at(temperature, molarVolume));
}

Outcome<MolarState> stateFrom(const Gas &gas, Given first, Given second, const MolarState *guess)
{
    for (const Given &given : {first, second})
        if (!isPositiveWhereItMustBe(given))
            return Failure{
                Reason::outOfRange, "", {"{0} must be a finite number greater than zero", {wordsOf(given.property)}}};
    if (first.property == second.property || (gas.isIdeal() && areBothThermal(first, second)))
        return Failure{
            Reason::undetermined,
            "",
            {"{0} and {1} do not fix the state of this gas", {wordsOf(first.property), wordsOf(second.property)}}};
    const auto state = gas.isIdeal() ? idealState(gas, first, second, guess) : realState(gas, first, second, guess);
    if (!state) return gas.isIdeal() ? noState(first, second) : whyNoState(gas, first, second);
    return insideModel(gas, *state);
}

} // namespace quasistat::gas
