#include "core/gas/solve/solve.h"

#include "core/gas/constants.h"

#include <algorithm>
#include <cmath>
#include <optional>

namespace quasistat::gas
{
namespace
{

using units::Quantity;

/// Newton's error after a step of this size is below rounding (it squares), so the stepped-to point is final.
constexpr double lastStep = 1e-8;
constexpr int mostSteps = 100;
/// Longest steps in ln T and ln v: far enough for any start, short enough to stay where the linearisation means
/// something.
constexpr double longestTemperatureStep = 1.0;
constexpr double longestVolumeStep = 5.0;

Quantity quantityOf(Property property)
{
    switch (property) {
    case Property::temperature: return Quantity::temperature;
    case Property::pressure: return Quantity::pressure;
    case Property::entropy: return Quantity::molarEntropy;
    case Property::internalEnergy:
    case Property::enthalpy: return Quantity::molarEnergy;
    case Property::molarVolume: return Quantity::number;
    }
    return Quantity::number;
}

std::string wordsOf(Property property)
{
    switch (property) {
    case Property::temperature: return "temperature";
    case Property::pressure: return "pressure";
    case Property::entropy: return "molar entropy";
    case Property::internalEnergy: return "molar internal energy";
    case Property::enthalpy: return "molar enthalpy";
    case Property::molarVolume: return "molar volume [m³/mol]";
    }
    return {};
}

Failure noState(Given first, Given second)
{
    return {Reason::unreachable,
            "",
            {"the gas has no state with {0} {1} and {2} {3}",
             {wordsOf(first.property), Figure{quantityOf(first.property), first.value}, wordsOf(second.property),
              Figure{quantityOf(second.property), second.value}}}};
}

/// A residual that is of order one when the property is off by its own size, with its slopes in ln T and ln v.
struct Residual {
    double value;
    double slopeT;
    double slopeV;
};

Residual residual(const MolarState &s, Given given, double gasConstant)
{
    const double T = s.temperature;
    const double v = s.molarVolume;
    const double RT = gasConstant * T;
    switch (given.property) {
    case Property::temperature: return {std::log(T / given.value), 1.0, 0.0};
    case Property::molarVolume: return {std::log(v / given.value), 0.0, 1.0};
    case Property::pressure:
        if (s.pressure > 0.0)
            return {std::log(s.pressure / given.value), T * s.dpdT / s.pressure, v * s.dpdv / s.pressure};
        return {(s.pressure - given.value) / given.value, T * s.dpdT / given.value, v * s.dpdv / given.value};
    case Property::entropy:
        return {(s.entropy - given.value) / gasConstant, s.isochoricHeatCapacity / gasConstant,
                v * s.dpdT / gasConstant};
    case Property::internalEnergy:
        return {(s.internalEnergy - given.value) / RT, s.isochoricHeatCapacity / gasConstant,
                v * (T * s.dpdT - s.pressure) / RT};
    case Property::enthalpy:
        return {(s.enthalpy - given.value) / RT, (s.isochoricHeatCapacity + v * s.dpdT) / gasConstant,
                v * (T * s.dpdT + v * s.dpdv) / RT};
    }
    return {};
}

struct Step {
    double lnT;
    double lnV;
};

/// The Newton step of both unknowns; none where the two conditions are parallel.
std::optional<Step> newtonStep(const Residual &a, const Residual &b)
{
    const double determinant = a.slopeT * b.slopeV - a.slopeV * b.slopeT;
    const double scale = (std::abs(a.slopeT) + std::abs(a.slopeV)) * (std::abs(b.slopeT) + std::abs(b.slopeV));
    if (!(std::abs(determinant) > 1e-14 * scale)) return std::nullopt;
    return Step{(-a.value * b.slopeV + b.value * a.slopeV) / determinant,
                (-b.value * a.slopeT + a.value * b.slopeT) / determinant};
}

Step shortened(Step step)
{
    const double shrink =
        std::min({1.0, longestTemperatureStep / std::abs(step.lnT), longestVolumeStep / std::abs(step.lnV)});
    return {step.lnT * shrink, step.lnV * shrink};
}

std::optional<double> valueOf(Property property, Given first, Given second)
{
    if (first.property == property) return first.value;
    if (second.property == property) return second.value;
    return std::nullopt;
}

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

Outcome<MolarState> insideModel(const Gas &gas, const MolarState &state)
{
    const Range &hard = gas.validity().hard;
    if (state.temperature < hard.lowestTemperature || state.temperature > hard.highestTemperature)
        return Failure{
            Reason::outsideModel,
            "",
            {"the gas would be at {0}, but its model ends at {1} and {2}",
             {Figure{Quantity::temperature, state.temperature}, Figure{Quantity::temperature, hard.lowestTemperature},
              Figure{Quantity::temperature, hard.highestTemperature}}}};
    if (state.pressure > hard.highestPressure)
        return Failure{
            Reason::outsideModel,
            "",
            {"the gas would be at {0}, but its model ends at {1}",
             {Figure{Quantity::pressure, state.pressure}, Figure{Quantity::pressure, hard.highestPressure}}}};
    return state;
}

struct Start {
    double temperature;
    double molarVolume;
};

Start firstGuess(const Gas &gas, Given first, Given second, const MolarState *guess)
{
    const double temperature =
        valueOf(Property::temperature, first, second).value_or(guess ? guess->temperature : referenceTemperature);
    if (const auto v = valueOf(Property::molarVolume, first, second)) return {temperature, *v};
    if (guess) return {temperature, guess->molarVolume};
    const double pressure = valueOf(Property::pressure, first, second).value_or(referencePressure);
    return {temperature, gas.gasConstant() * temperature / pressure};
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

} // namespace

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

    if (gas.isIdeal())
        if (const auto state = idealFromPressure(gas, first, second)) return insideModel(gas, *state);

    auto [temperature, molarVolume] = firstGuess(gas, first, second, guess);
    for (int i = 0; i < mostSteps; ++i) {
        const MolarState state = gas.at(temperature, molarVolume);
        const auto step =
            newtonStep(residual(state, first, gas.gasConstant()), residual(state, second, gas.gasConstant()));
        if (!step || !std::isfinite(step->lnT) || !std::isfinite(step->lnV)) return noState(first, second);
        const Step taken = shortened(*step);
        temperature *= std::exp(taken.lnT);
        molarVolume *= std::exp(taken.lnV);
        if (!(temperature > 0.0 && molarVolume > 0.0 && std::isfinite(temperature) && std::isfinite(molarVolume)))
            return noState(first, second);
        if (std::abs(taken.lnT) < lastStep && std::abs(taken.lnV) < lastStep)
            return insideModel(gas, gas.at(temperature, molarVolume));
        // Far outside the model there is nothing to converge to.
        if (temperature < 1e-3 * gas.validity().hard.lowestTemperature || temperature < 1e-30)
            return noState(first, second);
    }
    return noState(first, second);
}

} // namespace quasistat::gas
