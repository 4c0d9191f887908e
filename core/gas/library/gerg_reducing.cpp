#include "core/gas/library/gerg_reducing.h"

#include <cassert>
#include <cmath>

namespace quasistat::gas
{
namespace
{

/// f = xᵢxⱼ(xᵢ + xⱼ)/(β²xᵢ + xⱼ) and its slopes.
struct PairShape {
    double value;
    double byFirst;
    double bySecond;
};

PairShape pairShape(double xi, double xj, double beta)
{
    const double sum = xi + xj;
    const double weighted = beta * beta * xi + xj;
    if (!(weighted > 0.0)) return {0.0, 0.0, 0.0}; // neither is there; the limit of f and of its slopes
    const double value = xi * xj * sum / weighted;
    const double common = xi * xj / weighted;
    return {value, xj * sum / weighted + common - value * beta * beta / weighted,
            xi * sum / weighted + common - value / weighted};
}

} // namespace

GergReducingSlopes reducingSlopes(const GergMixture &mixture, std::span<const double> fractions)
{
    const std::size_t n = mixture.components.size();
    assert(fractions.size() == n);
    GergReducingSlopes sum{0.0, 0.0, std::vector<double>(n), std::vector<double>(n)};
    std::vector<double> edges(n); // of the cube that one mole fills at the critical point
    for (std::size_t i = 0; i < n; ++i) {
        const GergComponent &own = mixture.components[i];
        const double x = fractions[i];
        edges[i] = std::cbrt(1.0 / own.criticalDensity);
        sum.temperature += x * x * own.criticalTemperature;
        sum.temperatureSlopes[i] += 2.0 * x * own.criticalTemperature;
        sum.volume += x * x / own.criticalDensity;
        sum.volumeSlopes[i] += 2.0 * x / own.criticalDensity;
    }
    for (std::size_t i = 0; i < n; ++i)
        for (std::size_t j = i + 1; j < n; ++j) {
            const GergPair &pair = mixture.pair(i, j);
            const double edge = 0.5 * (edges[i] + edges[j]);
            const double volume = 2.0 * pair.betaV * pair.gammaV * edge * edge * edge;
            const PairShape v = pairShape(fractions[i], fractions[j], pair.betaV);
            sum.volume += volume * v.value;
            sum.volumeSlopes[i] += volume * v.byFirst;
            sum.volumeSlopes[j] += volume * v.bySecond;
            const double temperature =
                2.0 * pair.betaT * pair.gammaT *
                std::sqrt(mixture.components[i].criticalTemperature * mixture.components[j].criticalTemperature);
            const PairShape t = pairShape(fractions[i], fractions[j], pair.betaT);
            sum.temperature += temperature * t.value;
            sum.temperatureSlopes[i] += temperature * t.byFirst;
            sum.temperatureSlopes[j] += temperature * t.bySecond;
        }
    return sum;
}

} // namespace quasistat::gas
