#include "core/gas/library/gerg_fugacities.h"

#include "core/gas/library/gerg_reducing.h"

#include <algorithm>
#include <array>
#include <cassert>
#include <cmath>
#include <numeric>

namespace quasistat::gas
{
namespace
{

constexpr int highestDensityPower = 32; // the published terms reach 8
constexpr int highestDecay = 8;         // of exp(−δˡ); the published terms reach 6

} // namespace

class GergFugacities::Shared
{
public:
    Shared(double tau, double delta, const std::vector<double> &exponents) : m_delta(delta), m_tau(exponents.size())
    {
        m_powers[0] = 1.0;
        for (std::size_t d = 1; d < m_powers.size(); ++d) m_powers[d] = m_powers[d - 1] * delta;
        m_decays[0] = 1.0;
        for (std::size_t l = 1; l < m_decays.size(); ++l) m_decays[l] = std::exp(-m_powers[l]);
        const double lnTau = std::log(tau);
        for (std::size_t k = 0; k < exponents.size(); ++k) m_tau[k] = std::exp(exponents[k] * lnTau);
    }

    [[nodiscard]] double delta() const { return m_delta; }
    [[nodiscard]] double power(int d) const { return m_powers[static_cast<std::size_t>(d)]; }
    [[nodiscard]] double decay(int l) const { return m_decays[static_cast<std::size_t>(l)]; }
    [[nodiscard]] double tau(std::size_t exponent) const { return m_tau[exponent]; }

private:
    double m_delta;
    std::array<double, highestDensityPower + 1> m_powers{};
    std::array<double, highestDecay + 1> m_decays{};
    std::vector<double> m_tau;
};

GergFugacities::GergFugacities(GergMixture mixture, std::vector<Critical> critical, double gasConstant)
    : m_mixture(std::move(mixture)), m_critical(std::move(critical)), m_gasConstant(gasConstant)
{
    const std::size_t n = components();
    assert(n > 0 && m_critical.size() == n && m_mixture.pairs.size() == n * n);
    for (const GergComponent &component : m_mixture.components) {
        auto &powers = m_temperaturePowers.emplace_back();
        for (const PowerTerm &term : component.terms) {
            assert(term.d >= 0 && term.d <= highestDensityPower && term.l >= 0 && term.l <= highestDecay);
            assert(term.g == 1.0);
            powers.push_back(exponent(term.t));
        }
    }
    for (std::size_t i = 0; i < n; ++i)
        for (std::size_t j = i + 1; j < n; ++j) {
            const GergPair &pair = m_mixture.pair(i, j);
            if (!pair.departure || pair.departureFactor == 0.0) continue;
            auto known = std::ranges::find(m_departures, pair.departure, &Departure::terms);
            if (known == m_departures.end()) {
                Departure function{pair.departure, {}};
                for (const DepartureTerm &term : *pair.departure)
                    function.temperaturePowers.push_back(exponent(term.t));
                known = m_departures.insert(m_departures.end(), std::move(function));
            }
            m_pairs.push_back({i, j, pair.departureFactor, static_cast<std::size_t>(known - m_departures.begin())});
        }
}

std::size_t GergFugacities::exponent(double t)
{
    const auto known = std::ranges::find(m_exponents, t);
    const auto index = static_cast<std::size_t>(known - m_exponents.begin());
    if (known == m_exponents.end()) m_exponents.push_back(t);
    return index;
}

GergFugacities::Part GergFugacities::pure(const Shared &shared, std::size_t component) const
{
    const auto &terms = m_mixture.components[component].terms;
    const auto &powers = m_temperaturePowers[component];
    Part sum;
    for (std::size_t k = 0; k < terms.size(); ++k) {
        const PowerTerm &term = terms[k];
        const double value = term.n * shared.power(term.d) * shared.tau(powers[k]) * shared.decay(term.l);
        // δ ∂/∂δ multiplies by d − l δˡ; δ² ∂²/∂δ² by that times one less, less l² δˡ.
        const double decay = term.l == 0 ? 0.0 : term.l * shared.power(term.l);
        const double slope = term.d - decay;
        sum.a00 += value;
        sum.a10 += value * term.t;
        sum.a01 += value * slope;
        sum.a02 += value * (slope * (slope - 1.0) - term.l * decay);
    }
    return sum;
}

GergFugacities::Part GergFugacities::departure(const Shared &shared, const Departure &function)
{
    const double delta = shared.delta();
    Part sum;
    for (std::size_t k = 0; k < function.terms->size(); ++k) {
        const DepartureTerm &term = (*function.terms)[k];
        double value = term.n * shared.power(term.d) * shared.tau(function.temperaturePowers[k]);
        double slope = term.d;
        double curvature = 0.0;
        if (term.eta != 0.0 || term.beta != 0.0) {
            const double distance = delta - term.epsilon;
            value *= std::exp(-term.eta * distance * distance - term.beta * (delta - term.gamma));
            slope -= delta * (2.0 * term.eta * distance + term.beta);
            curvature = 2.0 * term.eta * delta * delta;
        }
        sum.a00 += value;
        sum.a10 += value * term.t;
        sum.a01 += value * slope;
        sum.a02 += value * (slope * slope - term.d - curvature);
    }
    return sum;
}

double GergFugacities::residualPotentials(double temperature, double density, std::span<const double> fractions,
                                          std::span<double> result) const
{
    const std::size_t n = components();
    assert(fractions.size() == n && result.size() == n);
    const GergReducingSlopes reduced = reducingSlopes(m_mixture, fractions);
    const Shared shared(reduced.temperature / temperature, density * reduced.volume, m_exponents);

    // result: ∂α^r/∂xᵢ first.
    Part alpha;
    const auto add = [&alpha](double weight, const Part &part) {
        alpha.a00 += weight * part.a00;
        alpha.a10 += weight * part.a10;
        alpha.a01 += weight * part.a01;
    };
    for (std::size_t i = 0; i < n; ++i) {
        const Part part = pure(shared, i);
        result[i] = part.a00;
        add(fractions[i], part);
    }
    std::vector<Part> parts;
    for (const Departure &function : m_departures) parts.push_back(departure(shared, function));
    for (const Pair &pair : m_pairs) {
        const Part &part = parts[pair.departure];
        result[pair.i] += fractions[pair.j] * pair.factor * part.a00;
        result[pair.j] += fractions[pair.i] * pair.factor * part.a00;
        add(fractions[pair.i] * fractions[pair.j] * pair.factor, part);
    }

    const auto mean = [&](std::span<const double> values) {
        return std::inner_product(fractions.begin(), fractions.end(), values.begin(), 0.0);
    };
    const double meanSlope = mean(result);
    const double meanTemperature = mean(reduced.temperatureSlopes);
    const double meanVolume = mean(reduced.volumeSlopes);
    for (std::size_t i = 0; i < n; ++i) {
        // n ∂ ln δ/∂nᵢ and n ∂ ln τ/∂nᵢ at constant T and V.
        const double packing = 1.0 + (reduced.volumeSlopes[i] - meanVolume) / reduced.volume;
        const double heating = (reduced.temperatureSlopes[i] - meanTemperature) / reduced.temperature;
        result[i] = alpha.a00 + alpha.a01 * packing + alpha.a10 * heating + result[i] - meanSlope;
    }
    return density * m_gasConstant * temperature * (1.0 + alpha.a01);
}

Fugacities::PressureSlope GergFugacities::pressure(double temperature, double density,
                                                   std::span<const double> fractions) const
{
    const GergReducingSlopes reduced = reducingSlopes(m_mixture, fractions);
    const Shared shared(reduced.temperature / temperature, density * reduced.volume, m_exponents);
    double a01 = 0.0;
    double a02 = 0.0;
    const auto add = [&](double weight, const Part &part) {
        a01 += weight * part.a01;
        a02 += weight * part.a02;
    };
    for (std::size_t i = 0; i < components(); ++i) add(fractions[i], pure(shared, i));
    std::vector<Part> parts;
    for (const Departure &function : m_departures) parts.push_back(departure(shared, function));
    for (const Pair &pair : m_pairs) add(fractions[pair.i] * fractions[pair.j] * pair.factor, parts[pair.departure]);
    const double RT = m_gasConstant * temperature;
    return {density * RT * (1.0 + a01), RT * (1.0 + 2.0 * a01 + a02)};
}

double GergFugacities::closestPacking(std::span<const double> fractions) const
{
    return 3.5 / reducingSlopes(m_mixture, fractions).volume;
}

} // namespace quasistat::gas
