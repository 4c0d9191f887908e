#include "core/analysis/phase_lines.h"

#include "core/gas/equation/equation.h"
#include "core/gas/phase/saturation.h"

#include <cmath>

namespace quasistat::analysis
{
namespace
{

constexpr int points = 120;

using Point = std::pair<double, double>;

/// Pairs from the coldest to just below the critical point, closer together where the dome bends.
std::vector<gas::SaturatedPair> pairsOf(const gas::Saturation &saturation)
{
    std::vector<gas::SaturatedPair> pairs;
    const double critical = saturation.criticalTemperature();
    const double coldest = std::cbrt(1.0 - saturation.lowestTemperature() / critical);
    for (int i = 0; i < points; ++i) {
        const double w = coldest * (1.0 - static_cast<double>(i) / points);
        const double T = i == 0 ? saturation.lowestTemperature() : critical * (1.0 - w * w * w);
        if (const auto pair = saturation.atTemperature(T)) pairs.push_back(*pair);
    }
    return pairs;
}

/// The line of equal vapour fraction through all pairs, to the critical point.
PhaseLine lineAt(PhaseLine::Kind kind, double vapourFraction, const std::vector<gas::SaturatedPair> &pairs,
                 const Point &critical, double amount)
{
    PhaseLine line{kind, vapourFraction, {}};
    for (const gas::SaturatedPair &pair : pairs) {
        const double v =
            pair.liquid.molarVolume + vapourFraction * (pair.vapour.molarVolume - pair.liquid.molarVolume);
        line.points.emplace_back(amount * v, pair.vapour.pressure);
    }
    line.points.push_back(critical);
    return line;
}

PhaseLines linesOfDome(const gas::Saturation &saturation, double amount)
{
    using Kind = PhaseLine::Kind;
    const auto pairs = pairsOf(saturation);
    const Point critical{amount * saturation.criticalVolume(), saturation.criticalPressure()};
    PhaseLines lines{.lines = {}, .critical = critical};
    lines.lines.push_back(lineAt(Kind::saturatedVapour, 1.0, pairs, critical, amount));
    lines.lines.push_back(lineAt(Kind::saturatedLiquid, 0.0, pairs, critical, amount));
    for (int tenth = 1; tenth <= 9; ++tenth)
        lines.lines.push_back(lineAt(Kind::equalVapourFraction, 0.1 * tenth, pairs, critical, amount));
    return lines;
}

/// From the thin side to the dense, as far as the boundary is known.
PhaseLines lineOfDew(const gas::Equation &equation, double amount)
{
    constexpr double thinnest = 10.0; // ln v [m³/mol]: far below a pascal
    constexpr double step = 0.04;
    PhaseLine line{PhaseLine::Kind::dewLine, 1.0, {}};
    for (double lnV = thinnest; lnV > -std::log(equation.highestDensity); lnV -= step) {
        const double v = std::exp(lnV);
        const double T = equation.boundary->temperatureNear(v);
        if (!(T > 0.0)) continue;
        const double pressure = gas::homogeneousState(equation, T, v).pressure;
        if (pressure > 0.0) line.points.emplace_back(amount * v, pressure);
    }
    if (line.points.size() < 2) return {};
    return {.lines = {std::move(line)}, .critical = std::nullopt};
}

} // namespace

PhaseLines phaseLines(const gas::State &charge)
{
    const gas::Equation *equation = charge.gas().equation();
    if (charge.isEvacuated() || !equation || !equation->boundary) return {};
    if (equation->saturation) return linesOfDome(*equation->saturation, charge.amount());
    return lineOfDew(*equation, charge.amount());
}

} // namespace quasistat::analysis
