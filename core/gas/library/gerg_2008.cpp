#include "core/gas/library/gerg_2008.h"

#include <cmath>
#include <tuple>

namespace quasistat::gas
{
namespace
{

/// What a pair adds to a reducing function, over 2 x_i x_j: βγ (x_i + x_j)/(β² x_i + x_j).
double pairWeight(double beta, double gamma, double xi, double xj)
{
    return beta * gamma * (xi + xj) / (beta * beta * xi + xj);
}

/// Coefficients of equal exponents added up.
using Powers = std::map<std::tuple<int, double, int>, double>; // (d, t, l)
using Departures = std::map<std::tuple<int, double, double, double, double, double>, double>;

void addDeparture(const GergPair &pair, double weight, Powers &powers, Departures &departures)
{
    for (const DepartureTerm &term : *pair.departure) {
        const double n = weight * pair.departureFactor * term.n;
        // "eta = beta = 0 gives a plain polynomial term": one more of the components' own kind.
        if (term.eta == 0.0 && term.beta == 0.0)
            powers[{term.d, term.t, 0}] += n;
        else
            departures[{term.d, term.t, term.eta, term.epsilon, term.beta, term.gamma}] += n;
    }
}

} // namespace

GergMixture gergMixture(std::shared_ptr<const GergModel> model, std::span<const std::string> names,
                        std::vector<GergComponent> components)
{
    GergMixture mixture{.model = std::move(model), .components = std::move(components), .pairs = {}};
    for (const std::string &first : names)
        for (const std::string &second : names) mixture.pairs.push_back(mixture.model->pair(first, second));
    return mixture;
}

GergReducing reducing(const GergMixture &mixture, const std::vector<double> &fractions)
{
    double temperature = 0.0;
    double volume = 0.0;
    for (std::size_t i = 0; i < fractions.size(); ++i) {
        const GergComponent &first = mixture.components[i];
        temperature += fractions[i] * fractions[i] * first.criticalTemperature;
        volume += fractions[i] * fractions[i] / first.criticalDensity;
        for (std::size_t j = i + 1; j < fractions.size(); ++j) {
            const double product = fractions[i] * fractions[j];
            if (product == 0.0) continue; // 0/0 where both are absent
            const GergComponent &second = mixture.components[j];
            const GergPair &pair = mixture.pair(i, j);
            const double root = 1.0 / std::cbrt(first.criticalDensity) + 1.0 / std::cbrt(second.criticalDensity);
            volume += 2.0 * product * pairWeight(pair.betaV, pair.gammaV, fractions[i], fractions[j]) * root * root *
                      root / 8.0;
            temperature += 2.0 * product * pairWeight(pair.betaT, pair.gammaT, fractions[i], fractions[j]) *
                           std::sqrt(first.criticalTemperature * second.criticalTemperature);
        }
    }
    return {.temperature = temperature, .density = 1.0 / volume};
}

ResidualTerms residualTerms(const GergMixture &mixture, const std::vector<double> &fractions)
{
    Powers powers;
    Departures departures;
    for (std::size_t i = 0; i < fractions.size(); ++i) {
        for (const PowerTerm &term : mixture.components[i].terms)
            powers[{term.d, term.t, term.l}] += fractions[i] * term.n;
        for (std::size_t j = i + 1; j < fractions.size(); ++j)
            if (const GergPair &pair = mixture.pair(i, j); pair.departure)
                addDeparture(pair, fractions[i] * fractions[j], powers, departures);
    }
    const GergReducing point = reducing(mixture, fractions);
    ResidualTerms terms{.reducingTemperature = point.temperature, .reducingDensity = point.density};
    for (const auto &[key, n] : powers)
        terms.powers.push_back({.n = n, .d = std::get<0>(key), .t = std::get<1>(key), .l = std::get<2>(key)});
    for (const auto &[key, n] : departures) {
        const auto &[d, t, eta, epsilon, beta, gamma] = key;
        terms.departures.push_back(
            {.n = n, .d = d, .t = t, .eta = eta, .epsilon = epsilon, .beta = beta, .gamma = gamma});
    }
    return terms;
}

IdealTerms idealTerms(const GergMixture &mixture, const std::vector<double> &fractions)
{
    // Each component: ln(ρ/ρ_c) + (R*/R)(n₁ + n₂ T_c/T + n₃ ln(T_c/T) + Σ n ln|sinh(θ/T)| − Σ n ln cosh(θ/T)), where
    // ln sinh x = x + ln(1 − e^(−2x)) − ln 2 and ln cosh x = x + ln(1 + e^(−2x)) − ln 2.
    const GergReducing point = reducing(mixture, fractions);
    const double ratio = mixture.model->idealGasConstant() / mixture.model->gasConstant();
    IdealTerms terms{.reducingTemperature = point.temperature};
    for (std::size_t i = 0; i < fractions.size(); ++i) {
        const GergComponent &component = mixture.components[i];
        if (fractions[i] == 0.0) continue;
        const double weight = fractions[i] * ratio;
        const double scale = component.criticalTemperature / point.temperature; // T_c/T = scale τ
        terms.lead[0] += fractions[i] * std::log(point.density / component.criticalDensity) +
                         weight * (component.n0[0] + component.n0[2] * std::log(scale));
        terms.lead[1] += weight * component.n0[1] * scale;
        terms.logTau += weight * component.n0[2];
        for (std::size_t k = 0; k < component.theta0.size(); ++k) {
            const double theta = component.theta0[k] / point.temperature;
            if (theta == 0.0) continue; // the component has no such term
            const bool isSinh = k % 2 == 0;
            const double n = weight * (isSinh ? component.n0[3 + k] : -component.n0[3 + k]);
            terms.lead[0] -= n * std::log(2.0);
            terms.lead[1] += n * theta;
            terms.planckEinstein.push_back({.n = n, .theta = 2.0 * theta, .c = 1.0, .d = isSinh ? -1.0 : 1.0});
        }
    }
    return terms;
}

} // namespace quasistat::gas
