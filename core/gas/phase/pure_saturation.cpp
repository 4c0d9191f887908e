#include "core/gas/phase/pure_saturation.h"

#include <boost/math/tools/toms748_solve.hpp>

#include <algorithm>
#include <cassert>
#include <cmath>

namespace quasistat::gas
{
namespace
{

constexpr int nodeCount = 160;
/// Closer to the critical temperature than this share of it, the two phases differ by less than Newton can tell apart.
constexpr double lastMillionth = 1e-6;
constexpr int mostSteps = 60;
/// Newton squares its error: after a step of this relative size the next is below rounding.
constexpr double lastStep = 1e-9;

/// One phase at one density, reduced: p/(R T), g/(R T) up to a function of T, ∂(p/RT)/∂ρ.
struct Phase {
    double pressure;
    double gibbs;
    double slope;
};

Phase phaseAt(const Residual &residual, double temperature, double density)
{
    const Alpha a = residual.at(temperature, density);
    return {density * (1.0 + a.a01), std::log(density) + a.a00 + a.a01, 1.0 + 2.0 * a.a01 + a.a02};
}

/// Moves a density that lies between the spinodals out of them.
double outOfSpinodal(const Residual &residual, double temperature, double density, double factor)
{
    for (int i = 0; i < 200 && phaseAt(residual, temperature, density).slope <= 0.0; ++i) density *= factor;
    return density;
}

std::optional<SaturatedDensities> equilibrium(const Residual &residual, double temperature, SaturatedDensities guess)
{
    double liquid = outOfSpinodal(residual, temperature, guess.liquid, 1.01);
    double vapour = outOfSpinodal(residual, temperature, guess.vapour, 0.99);
    for (int i = 0; i < mostSteps; ++i) {
        const Phase l = phaseAt(residual, temperature, liquid);
        const Phase v = phaseAt(residual, temperature, vapour);
        const double width = 1.0 / liquid - 1.0 / vapour;
        if (!(l.slope > 0.0 && v.slope > 0.0) || !(width < 0.0)) return std::nullopt;
        // Both equations for the changes of p/(R T) of the two phases. The vapour's is written so that the difference
        // of pressures, which cancels to few digits in a cold liquid, is divided by the liquid's density.
        const double difference = l.pressure - v.pressure;
        const double vapourChange = (v.gibbs - l.gibbs + difference / liquid) / width;
        const double liquidChange = vapourChange - difference;
        double vapourStep = vapourChange / v.slope / vapour;
        double liquidStep = liquidChange / l.slope / liquid;
        const double largest = std::max(std::abs(vapourStep), 5.0 * std::abs(liquidStep));
        const double shrink = largest > 0.5 ? 0.5 / largest : 1.0;
        vapourStep *= shrink;
        liquidStep *= shrink;
        vapour *= 1.0 + vapourStep;
        liquid *= 1.0 + liquidStep;
        if (std::abs(vapourStep) < lastStep && std::abs(liquidStep) < lastStep)
            return SaturatedDensities{liquid, vapour};
    }
    return std::nullopt;
}

double pressureAt(const Equation &equation, double temperature, double density)
{
    return equation.gasConstant * temperature * phaseAt(*equation.residual, temperature, density).pressure;
}

/// Extrapolates straight in w from the two nodes before: close to the critical point no ancillary is near enough.
SaturatedDensities extrapolated(const std::vector<SaturationTable::Node> &nodes, double w)
{
    const auto &a = nodes[nodes.size() - 2];
    const auto &b = nodes.back();
    const double share = (w - b.w) / (a.w - b.w);
    return {b.liquidDensity + share * (a.liquidDensity - b.liquidDensity),
            b.vapourDensity * std::pow(a.vapourDensity / b.vapourDensity, share)};
}

SaturationTable tableOf(const Equation &equation, const PureFluid &fluid)
{
    const double Tc = fluid.critical.temperature;
    const double coldest = std::cbrt(1.0 - fluid.tripleTemperature / Tc);
    const double hottest = std::cbrt(lastMillionth);
    std::vector<SaturationTable::Node> nodes; // from the cold end
    for (int i = 0; i < nodeCount; ++i) {
        const double w = coldest + (hottest - coldest) * i / (nodeCount - 1);
        const double T = i == 0 ? fluid.tripleTemperature : Tc * (1.0 - w * w * w);
        std::optional<SaturatedDensities> found;
        if (nodes.size() >= 2) found = equilibrium(*equation.residual, T, extrapolated(nodes, w));
        if (!found) found = equilibrium(*equation.residual, T, fluid.guess(T));
        if (!found || !(found->vapour < fluid.critical.density && fluid.critical.density < found->liquid)) continue;
        nodes.push_back({w, found->liquid, found->vapour, pressureAt(equation, T, found->vapour)});
    }
    assert(nodes.size() > nodeCount / 2);
    std::reverse(nodes.begin(), nodes.end());
    return {fluid.critical, std::move(nodes)};
}

class PureSaturation final : public Saturation
{
public:
    PureSaturation(Equation equation, const PureFluid &fluid)
        : m_equation(std::move(equation)), m_table(tableOf(m_equation, fluid)),
          m_lowestTemperature(fluid.tripleTemperature)
    {
    }

    double lowestTemperature() const override { return m_lowestTemperature; }
    double criticalTemperature() const override { return m_table.critical().temperature; }
    double criticalPressure() const override { return m_table.critical().pressure; }
    double criticalVolume() const override { return 1.0 / m_table.critical().density; }
    const SaturationTable &table() const { return m_table; }

    std::optional<SaturatedPair> atTemperature(double temperature) const override
    {
        if (!(temperature >= m_lowestTemperature && temperature < criticalTemperature())) return std::nullopt;
        SaturatedDensities densities = m_table.densities(temperature);
        if (temperature <= m_table.hottestNode())
            densities = equilibrium(*m_equation.residual, temperature, densities).value_or(densities);
        SaturatedPair pair{homogeneousState(m_equation, temperature, 1.0 / densities.liquid),
                           homogeneousState(m_equation, temperature, 1.0 / densities.vapour)};
        // The vapour's pressure keeps its digits where the liquid's has lost them.
        MolarState &liquid = pair.liquid;
        liquid.pressure = pair.vapour.pressure;
        liquid.enthalpy = liquid.internalEnergy + liquid.pressure * liquid.molarVolume;
        return pair;
    }

    std::optional<SaturatedPair> atPressure(double pressure) const override
    {
        const auto coldest = atTemperature(m_lowestTemperature);
        if (!coldest || pressure < coldest->vapour.pressure || pressure >= criticalPressure()) return std::nullopt;
        double temperature = std::clamp(m_table.temperatureAtPressure(pressure), m_lowestTemperature,
                                        criticalTemperature() * (1.0 - 1e-12));
        for (int i = 0; i < mostSteps; ++i) {
            const auto pair = atTemperature(temperature);
            if (!pair) return std::nullopt;
            const double slope =
                (pair->vapour.entropy - pair->liquid.entropy) / (pair->vapour.molarVolume - pair->liquid.molarVolume);
            const double step = (pressure - pair->vapour.pressure) / slope;
            if (std::abs(step) <= 4e-16 * temperature || i + 1 == mostSteps) return withPressure(*pair, pressure);
            const double next =
                std::clamp(temperature + step, m_lowestTemperature, 0.5 * (temperature + criticalTemperature()));
            if (std::abs(step) < 1e-9 * temperature) { // the error after this step is its square
                const auto last = atTemperature(next);
                return last ? withPressure(*last, pressure) : std::optional<SaturatedPair>();
            }
            temperature = next;
        }
        return std::nullopt;
    }

private:
    /// The last digit of the pressure is the one asked for.
    static SaturatedPair withPressure(SaturatedPair pair, double pressure)
    {
        for (MolarState *phase : {&pair.liquid, &pair.vapour}) {
            phase->pressure = pressure;
            phase->enthalpy = phase->internalEnergy + pressure * phase->molarVolume;
        }
        return pair;
    }

    Equation m_equation;
    SaturationTable m_table;
    double m_lowestTemperature;
};

/// A dome of two branches, vapour and liquid, that meet at the critical density.
class Dome final : public PhaseBoundary
{
public:
    using Exact = std::function<std::optional<SaturatedDensities>(double temperature)>;

    Dome(SaturationTable table, Exact exact) : m_table(std::move(table)), m_exact(std::move(exact)) {}

    double highestTemperature() const override { return m_table.critical().temperature; }
    double temperatureNear(double molarVolume) const override
    {
        return m_table.temperatureAtDensity(1.0 / molarVolume);
    }

    double temperatureAt(double molarVolume) const override
    {
        const double near = temperatureNear(molarVolume);
        if (near <= 0.0) return near;
        const double density = 1.0 / molarVolume;
        const bool isVapour = density <= m_table.critical().density;
        // Grows with temperature on the vapour branch, falls on the liquid one.
        const auto excess = [&](double T) {
            const auto at = m_exact(T);
            if (!at) return 0.0;
            return isVapour ? std::log(at->vapour / density) : std::log(density / at->liquid);
        };
        for (double width = 1e-4; width < 0.1; width *= 4.0) {
            const double low = std::max(m_table.lowestTemperature(), near * (1.0 - width));
            const double high = std::min(highestTemperature() * (1.0 - 1e-14), near * (1.0 + width));
            const double below = excess(low);
            const double above = excess(high);
            if (below >= 0.0 && low <= m_table.lowestTemperature()) return low;
            if (!(below < 0.0 && above > 0.0)) continue;
            std::uintmax_t steps = 100;
            const auto bracket = boost::math::tools::toms748_solve(
                excess, low, high, below, above, boost::math::tools::eps_tolerance<double>(52), steps);
            return 0.5 * (bracket.first + bracket.second);
        }
        return near;
    }

private:
    SaturationTable m_table;
    Exact m_exact;
};

/// The vapour's density at T and p: the first root from below, by Newton from the ideal gas.
std::optional<double> vapourDensity(const Equation &equation, double temperature, double pressure)
{
    const double target = pressure / (equation.gasConstant * temperature);
    double density = target;
    for (int i = 0; i < mostSteps; ++i) {
        const Phase phase = phaseAt(*equation.residual, temperature, density);
        if (!(phase.slope > 0.0)) return std::nullopt;
        const double step = (target - phase.pressure) / phase.slope;
        density += step;
        if (std::abs(step) < 1e-12 * density) return density;
    }
    return std::nullopt;
}

} // namespace

PureEquilibrium pureEquilibrium(const Equation &equation, const PureFluid &fluid)
{
    const auto saturation = std::make_shared<PureSaturation>(equation, fluid);
    const auto exact = [saturation](double T) -> std::optional<SaturatedDensities> {
        const auto pair = saturation->atTemperature(T);
        if (!pair) return std::nullopt;
        return SaturatedDensities{1.0 / pair->liquid.molarVolume, 1.0 / pair->vapour.molarVolume};
    };
    return {saturation, std::make_shared<Dome>(saturation->table(), exact)};
}

std::shared_ptr<const PhaseBoundary> pseudoPureBoundary(const Equation &equation, const PseudoPureFluid &fluid)
{
    // Closer to the critical point the published liquid density is the small difference of large powers.
    constexpr double nearestToCritical = 0.9999;
    const auto exact = [equation, fluid](double T) -> std::optional<SaturatedDensities> {
        if (T > nearestToCritical * fluid.critical.temperature) return std::nullopt;
        const auto vapour = vapourDensity(equation, T, fluid.dewPressure(T));
        if (!vapour) return std::nullopt;
        return SaturatedDensities{fluid.liquidDensity(T), *vapour};
    };
    const double coldest = std::cbrt(1.0 - fluid.lowestTemperature / fluid.critical.temperature);
    std::vector<SaturationTable::Node> nodes;
    for (int i = nodeCount - 1; i > 0; --i) {
        const double w = coldest * i / (nodeCount - 1);
        const double T = fluid.critical.temperature * (1.0 - w * w * w);
        const auto found = exact(T);
        if (found && found->vapour < fluid.critical.density && found->liquid > fluid.critical.density)
            nodes.push_back({w, found->liquid, found->vapour, fluid.dewPressure(T)});
    }
    std::reverse(nodes.begin(), nodes.end());
    return std::make_shared<Dome>(SaturationTable(fluid.critical, std::move(nodes)), exact);
}

} // namespace quasistat::gas
