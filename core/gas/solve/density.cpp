#include "core/gas/solve/density.h"

#include "core/gas/phase/saturation.h"
#include "core/gas/solve/bracketed_root.h"

#include <algorithm>
#include <cmath>
#include <vector>

namespace quasistat::gas
{
namespace
{

constexpr int mostSteps = 30;
constexpr double lastStep = 1e-9; // Newton squares: the next would be below rounding

/// One isotherm, reduced by R T: its unknown is the density.
class PressureIsotherm
{
public:
    PressureIsotherm(const Equation &equation, double temperature, double pressure)
        : m_residual(*equation.residual), m_target(pressure / (equation.gasConstant * temperature))
    {
        m_residual.atTemperature(temperature, false, m_isotherm);
    }

    /// p/(R T) − target and its slope in ρ.
    ValueAndSlope operator()(double density) const
    {
        const DensityDerivatives a = m_residual.densityDerivatives(m_isotherm, density);
        return {density * (1.0 + a.a01) - m_target, 1.0 + 2.0 * a.a01 + a.a02};
    }

    /// ρ of the ideal gas.
    [[nodiscard]] double target() const { return m_target; }

    /// Newton in ln ρ on ln p from a start on a branch that rises; none if it leaves the branch.
    [[nodiscard]] std::optional<double> fromStart(double density) const
    {
        for (int i = 0; i < mostSteps; ++i) {
            const auto [excess, slope] = (*this)(density);
            const double pressure = excess + m_target;
            if (!(slope > 0.0 && pressure > 0.0)) return std::nullopt;
            const double step = -std::log1p(excess / m_target) * pressure / (density * slope);
            if (!(std::abs(step) < 2.0)) return std::nullopt;
            density *= std::exp(step);
            if (std::abs(step) < lastStep) return density;
        }
        return std::nullopt;
    }

private:
    const Residual &m_residual;
    double m_target;
    Isotherm m_isotherm;
};

/// The densities at which an isotherm passes the target rising, from thin to dense: vapour, liquid, and where
/// polynomials go astray beyond any fluid, more.
std::vector<double> rootsOf(const Equation &equation, const PressureIsotherm &isotherm)
{
    // In steps fine enough to meet each branch.
    constexpr int stepsPerDecade = 40;
    const double factor = std::pow(10.0, 1.0 / stepsPerDecade);
    std::vector<double> roots;
    double low = 0.5 * std::min(isotherm.target(), equation.highestDensity);
    double atLow = isotherm(low).value;
    while (atLow > 0.0 && low > 1e-12 * isotherm.target()) atLow = isotherm(low *= 0.5).value;
    while (low < equation.highestDensity) {
        const double high = std::min(low * factor, equation.highestDensity);
        const double atHigh = isotherm(high).value;
        if (atLow <= 0.0 && atHigh > 0.0)
            if (const auto root = risingRoot(isotherm, low, high, low)) roots.push_back(*root);
        low = high;
        atLow = atHigh;
    }
    return roots;
}

bool isStable(const Equation &equation, double temperature, double density)
{
    return !equation.boundary || !isTwoPhase(*equation.boundary, temperature, 1.0 / density);
}

/// The root of a vapour below `bound`, a density inside which ∂p/∂ρ > 0.
std::optional<double> vapourDensityBelow(const Equation &equation, double temperature, double pressure, double bound)
{
    const PressureIsotherm isotherm(equation, temperature, pressure);
    if (isotherm(bound).value <= 0.0) return bound; // saturated, to rounding
    return risingRoot(isotherm, 0.0, bound, std::min(isotherm.target(), 0.9 * bound));
}

/// The root of a liquid above `bound`, from which on ∂p/∂ρ > 0.
std::optional<double> liquidDensityAbove(const Equation &equation, double temperature, double pressure, double bound)
{
    const PressureIsotherm isotherm(equation, temperature, pressure);
    double low = bound;
    if (isotherm(low).value >= 0.0) return low;
    while (low < equation.highestDensity) {
        const double high = 1.05 * low;
        if (isotherm(high).value >= 0.0) return risingRoot(isotherm, low, high, low);
        low = high;
    }
    return std::nullopt;
}

std::optional<double> saturatedSide(const Equation &equation, double temperature, double pressure)
{
    const auto pair = equation.saturation->atTemperature(temperature);
    if (!pair) return std::nullopt;
    if (pressure > pair->vapour.pressure)
        return liquidDensityAbove(equation, temperature, pressure, 1.0 / pair->liquid.molarVolume);
    return vapourDensityBelow(equation, temperature, pressure, 1.0 / pair->vapour.molarVolume);
}

} // namespace

std::optional<double> molarVolumeAt(const Equation &equation, double temperature, double pressure, double guess)
{
    const PressureIsotherm isotherm(equation, temperature, pressure);
    auto density = isotherm.fromStart(guess > 0.0 ? 1.0 / guess : isotherm.target());
    if (!density || !(*density < equation.highestDensity) || !isStable(equation, temperature, *density)) {
        if (equation.saturation && temperature < equation.saturation->criticalTemperature()) {
            density = saturatedSide(equation, temperature, pressure);
        } else {
            const std::vector<double> roots = rootsOf(equation, isotherm);
            const auto stable =
                std::ranges::find_if(roots, [&](double root) { return isStable(equation, temperature, root); });
            density.reset();
            if (stable != roots.end())
                density = *stable;
            else if (!roots.empty()) // in two phases: whoever asked will say so
                density = roots.front();
        }
    }
    if (!density) return std::nullopt;
    return 1.0 / *density;
}

} // namespace quasistat::gas
