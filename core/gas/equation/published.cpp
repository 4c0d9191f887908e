#include "core/gas/equation/published.h"

#include "core/gas/equation/non_analytic.h"

#include <cmath>

namespace quasistat::gas
{
namespace
{

/// A term's logarithmic derivative x ∂ln φ/∂x, its power apart from the rest, and the rest's own slope x ∂rest/∂x.
struct Logarithmic {
    double power;
    double rest;
    double slope;
    [[nodiscard]] double first() const { return power + rest; }
    /// x² φ_xx/φ = first (first − 1) + slope, multiplied out: in a thin gas the rest is small beside 1.
    [[nodiscard]] double second() const
    {
        return power * (power - 1.0) + rest * (2.0 * power - 1.0) + rest * rest + slope;
    }
};

Alpha termOf(double value, Logarithmic inTau, Logarithmic inDelta)
{
    return {.a00 = value,
            .a10 = value * inTau.first(),
            .a01 = value * inDelta.first(),
            .a20 = value * inTau.second(),
            .a11 = value * inTau.first() * inDelta.first(),
            .a02 = value * inDelta.second()};
}

Alpha valueOf(const PowerTerm &k, double tau, double delta)
{
    const double power = k.n * std::pow(delta, k.d) * std::pow(tau, k.t);
    const double d = k.d;
    if (k.l == 0) return termOf(power, {k.t, 0.0, 0.0}, {d, 0.0, 0.0});
    const double u = k.g * std::pow(delta, k.l);
    return termOf(power * std::exp(-u), {k.t, 0.0, 0.0}, {d, -k.l * u, -k.l * k.l * u});
}

/// Of x to a power times exp(−c (x − x₀)²).
Logarithmic bell(double power, double c, double x0, double x)
{
    return {power, -2.0 * c * x * (x - x0), -2.0 * c * x * (2.0 * x - x0)};
}

Alpha valueOf(const GaussianTerm &k, double tau, double delta)
{
    const double value = k.n * std::pow(delta, k.d) * std::pow(tau, k.t) *
                         std::exp(-k.eta * std::pow(delta - k.epsilon, 2) - k.beta * std::pow(tau - k.gamma, 2));
    return termOf(value, bell(k.t, k.beta, k.gamma, tau), bell(k.d, k.eta, k.epsilon, delta));
}

Alpha valueOf(const DepartureTerm &k, double tau, double delta)
{
    const double value = k.n * std::pow(delta, k.d) * std::pow(tau, k.t) *
                         std::exp(-k.eta * std::pow(delta - k.epsilon, 2) - k.beta * (delta - k.gamma));
    const Logarithmic own = bell(k.d, k.eta, k.epsilon, delta);
    return termOf(value, {k.t, 0.0, 0.0}, {own.power, own.rest - k.beta * delta, own.slope - k.beta * delta});
}

Alpha valueOf(const AssociatingTerm &k, double tau, double delta)
{
    const double x = tau - k.gamma;
    const double w = 1.0 / (k.beta * x * x + k.b);
    const double value =
        k.n * std::pow(delta, k.d) * std::pow(tau, k.t) * std::exp(k.eta * std::pow(delta - k.epsilon, 2) + w);
    // w = 1/(βx² + b): dw/dτ = −2βx w², d²w/dτ² = (8β²x² w − 2β) w²
    const double first = -2.0 * k.beta * x * w * w;
    const double second = (8.0 * k.beta * k.beta * x * x * w - 2.0 * k.beta) * w * w;
    return termOf(value, {k.t, tau * first, tau * first + tau * tau * second}, bell(k.d, -k.eta, k.epsilon, delta));
}

} // namespace

Alpha publishedResidual(const ResidualTerms &terms, double temperature, double density)
{
    const double tau = terms.reducingTemperature / temperature;
    const double delta = density / terms.reducingDensity;
    Alpha sum;
    for (const PowerTerm &term : terms.powers) add(sum, valueOf(term, tau, delta));
    for (const GaussianTerm &term : terms.gaussians) add(sum, valueOf(term, tau, delta));
    for (const DepartureTerm &term : terms.departures) add(sum, valueOf(term, tau, delta));
    for (const AssociatingTerm &term : terms.associating) add(sum, valueOf(term, tau, delta));
    for (const NonAnalyticTerm &term : terms.nonAnalytic) add(sum, nonAnalytic(term, tau, delta));
    return sum;
}

} // namespace quasistat::gas
