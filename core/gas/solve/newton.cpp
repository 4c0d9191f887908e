#include "core/gas/solve/newton.h"

#include "core/gas/equation/equation.h"

#include <algorithm>
#include <cmath>

namespace quasistat::gas
{
namespace
{

/// Newton's error after a step of this size is below rounding (it squares), so the stepped-to point is final.
constexpr double lastStep = 1e-8;
constexpr int mostSteps = 100;
/// A real gas that is not there after so many steps is near a boundary or a flat place, where halving does better.
constexpr int mostStepsOfRealGas = 25;
/// Longest steps in ln T and ln v: far enough for any start, short enough to stay where the linearisation means
/// something.
constexpr double longestTemperatureStep = 1.0;
constexpr double longestVolumeStep = 5.0;

struct Step {
    double lnT;
    double lnV;
};

/// The Newton step of both unknowns; none where the two conditions are parallel.
std::optional<Step> newtonStep(const Residue &a, const Residue &b)
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

MolarState homogeneous(const Gas &gas, double temperature, double molarVolume)
{
    const Equation *equation = gas.equation();
    return equation ? homogeneousState(*equation, temperature, molarVolume) : gas.at(temperature, molarVolume);
}

} // namespace

std::optional<MolarState> newton(const Gas &gas, Given first, Given second, Place start, const MolarState *known)
{
    auto [temperature, molarVolume] = start;
    const Range &hard = gas.validity().hard;
    const Equation *equation = gas.equation();
    const double smallest = equation ? 1.0 / equation->highestDensity : 0.0;
    const int most = equation ? mostStepsOfRealGas : mostSteps;
    for (int i = 0; i < most; ++i) {
        const bool isKnown = i == 0 && known && !known->vapourFraction && known->temperature == temperature &&
                             known->molarVolume == molarVolume;
        const MolarState state = isKnown ? *known : homogeneous(gas, temperature, molarVolume);
        const auto step =
            newtonStep(residue(state, first, gas.gasConstant()), residue(state, second, gas.gasConstant()));
        if (!step || !std::isfinite(step->lnT) || !std::isfinite(step->lnV)) return std::nullopt;
        const Step taken = shortened(*step);
        temperature *= std::exp(taken.lnT);
        molarVolume *= std::exp(taken.lnV);
        if (!(temperature > 0.0 && molarVolume > smallest && std::isfinite(temperature) && std::isfinite(molarVolume)))
            return std::nullopt;
        if (std::abs(taken.lnT) < lastStep && std::abs(taken.lnV) < lastStep)
            return homogeneous(gas, temperature, molarVolume);
        // Far outside the model there is nothing to converge to.
        if (temperature < 1e-3 * hard.lowestTemperature || temperature < 1e-30 ||
            (equation && temperature > 10.0 * hard.highestTemperature))
            return std::nullopt;
    }
    return std::nullopt;
}

} // namespace quasistat::gas
