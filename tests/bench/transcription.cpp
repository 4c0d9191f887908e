#include "tests/bench/transcription.h"

#include <cmath>

namespace quasistat::transcription
{

void add(const std::vector<gas::PowerTerm> &terms, double weight, double tau, double delta, Derivatives &sum)
{
    for (const gas::PowerTerm &term : terms) {
        double value = weight * term.n * std::pow(delta, term.d) * std::pow(tau, term.t);
        double decay = 0.0;
        if (term.l > 0) {
            decay = term.g * std::pow(delta, term.l);
            value *= std::exp(-decay);
        }
        const double slope = term.d - term.l * decay;
        sum.a00 += value;
        sum.a10 += value * term.t;
        sum.a01 += value * slope;
        sum.a20 += value * term.t * (term.t - 1.0);
        sum.a11 += value * term.t * slope;
        sum.a02 += value * (slope * (slope - 1.0) - term.l * term.l * decay);
    }
}

void add(const std::vector<gas::GaussianTerm> &terms, double weight, double tau, double delta, Derivatives &sum)
{
    for (const gas::GaussianTerm &term : terms) {
        const double fromEpsilon = delta - term.epsilon;
        const double fromGamma = tau - term.gamma;
        const double value = weight * term.n * std::pow(delta, term.d) * std::pow(tau, term.t) *
                             std::exp(-term.eta * fromEpsilon * fromEpsilon - term.beta * fromGamma * fromGamma);
        const double slope = term.d - 2.0 * term.eta * delta * fromEpsilon;
        const double tauSlope = term.t - 2.0 * term.beta * tau * fromGamma;
        sum.a00 += value;
        sum.a10 += value * tauSlope;
        sum.a01 += value * slope;
        sum.a20 += value * (tauSlope * tauSlope - term.t - 2.0 * term.beta * tau * tau);
        sum.a11 += value * tauSlope * slope;
        sum.a02 += value * (slope * slope - term.d - 2.0 * term.eta * delta * delta);
    }
}

void add(const std::vector<gas::DepartureTerm> &terms, double weight, double tau, double delta, Derivatives &sum)
{
    for (const gas::DepartureTerm &term : terms) {
        const double fromEpsilon = delta - term.epsilon;
        const double value = weight * term.n * std::pow(delta, term.d) * std::pow(tau, term.t) *
                             std::exp(-term.eta * fromEpsilon * fromEpsilon - term.beta * (delta - term.gamma));
        const double slope = term.d - 2.0 * term.eta * delta * fromEpsilon - term.beta * delta;
        sum.a00 += value;
        sum.a10 += value * term.t;
        sum.a01 += value * slope;
        sum.a20 += value * term.t * (term.t - 1.0);
        sum.a11 += value * term.t * slope;
        sum.a02 += value * (slope * slope - term.d - 2.0 * term.eta * delta * delta);
    }
}

Derivatives idealSum(const gas::IdealTerms &terms, double tau, double delta)
{
    Derivatives sum{.a00 = std::log(delta) + terms.lead[0] + terms.lead[1] * tau + terms.logTau * std::log(tau),
                    .a10 = terms.lead[1] * tau + terms.logTau,
                    .a01 = 1.0,
                    .a20 = -terms.logTau,
                    .a11 = 0.0,
                    .a02 = -1.0};
    for (const gas::IdealPowerTerm &term : terms.powers) {
        const double value = term.n * std::pow(tau, term.t);
        sum.a00 += value;
        sum.a10 += value * term.t;
        sum.a20 += value * term.t * (term.t - 1.0);
    }
    for (const gas::PlanckEinsteinTerm &term : terms.planckEinstein) {
        const double x = term.theta * tau;
        const double decay = term.d * std::exp(-x);
        const double inside = term.c + decay;
        sum.a00 += term.n * std::log(inside);
        sum.a10 -= term.n * x * decay / inside;
        sum.a20 += term.n * x * x * term.c * decay / (inside * inside);
    }
    return sum;
}

Properties Fluid::at(double temperature, double density) const
{
    const Derivatives a0 = ideal(temperature, density);
    const Derivatives ar = residual(temperature, density);
    const double r = gasConstant();
    const double a10 = a0.a10 + ar.a10;
    const double a20 = a0.a20 + ar.a20;
    const double isochore = 1.0 + ar.a01 - ar.a11;       // ρ R (…) = (∂p/∂T)_ρ
    const double isotherm = 1.0 + 2.0 * ar.a01 + ar.a02; // R T (…) = (∂p/∂ρ)_T
    Properties result{};
    result.pressure = density * r * temperature * (1.0 + ar.a01);
    result.internalEnergy = r * temperature * a10;
    result.enthalpy = r * temperature * (a10 + 1.0 + ar.a01);
    result.entropy = r * (a10 - a0.a00 - ar.a00);
    result.isochoricHeatCapacity = -r * a20;
    result.isobaricHeatCapacity = r * (-a20 + isochore * isochore / isotherm);
    result.speedOfSound = std::sqrt(r * temperature / molarMass() * (isotherm - isochore * isochore / a20));
    result.densitySlope = r * temperature * isotherm;
    result.temperatureSlope = density * r * isochore;
    result.jouleThomson = (temperature * result.temperatureSlope / (density * result.densitySlope) - 1.0) /
                          (density * result.isobaricHeatCapacity);
    return result;
}

Derivatives ReferenceFluid::ideal(double temperature, double density) const
{
    return idealSum(m_data.ideal, m_data.ideal.reducingTemperature / temperature,
                    density / m_data.residual.reducingDensity);
}

Derivatives ReferenceFluid::residual(double temperature, double density) const
{
    const double tau = m_data.residual.reducingTemperature / temperature;
    const double delta = density / m_data.residual.reducingDensity;
    Derivatives sum;
    add(m_data.residual.powers, 1.0, tau, delta, sum);
    add(m_data.residual.gaussians, 1.0, tau, delta, sum);
    return sum;
}

GergFluid::GergFluid(gas::GergMixture mixture, std::vector<double> fractions)
    : m_mixture(std::move(mixture)), m_fractions(std::move(fractions))
{
    // 1/ρ_r = Σᵢ Σⱼ xᵢ xⱼ β γ (xᵢ + xⱼ)/(β² xᵢ + xⱼ) ⅛ (ρᵢ^(−1/3) + ρⱼ^(−1/3))³, T_r likewise with (Tᵢ Tⱼ)^(1/2)
    double volume = 0.0;
    for (std::size_t i = 0; i < m_fractions.size(); ++i)
        for (std::size_t j = 0; j < m_fractions.size(); ++j) {
            const gas::GergPair &pair = m_mixture.pair(i, j);
            const gas::GergComponent &first = m_mixture.components[i];
            const gas::GergComponent &second = m_mixture.components[j];
            const double xi = m_fractions[i];
            const double xj = m_fractions[j];
            volume +=
                xi * xj * pair.betaV * pair.gammaV * (xi + xj) / (pair.betaV * pair.betaV * xi + xj) / 8.0 *
                std::pow(std::pow(first.criticalDensity, -1.0 / 3.0) + std::pow(second.criticalDensity, -1.0 / 3.0),
                         3.0);
            m_reducingTemperature += xi * xj * pair.betaT * pair.gammaT * (xi + xj) /
                                     (pair.betaT * pair.betaT * xi + xj) *
                                     std::sqrt(first.criticalTemperature * second.criticalTemperature);
        }
    m_reducingDensity = 1.0 / volume;
}

Derivatives GergFluid::ideal(double temperature, double density) const
{
    const double ratio = m_mixture.model->idealGasConstant() / m_mixture.model->gasConstant();
    Derivatives sum{.a01 = 1.0, .a02 = -1.0};
    for (std::size_t i = 0; i < m_fractions.size(); ++i) {
        const gas::GergComponent &component = m_mixture.components[i];
        const auto &n = component.n0;
        const double tau = component.criticalTemperature / temperature;
        double a00 = n[0] + n[1] * tau + n[2] * std::log(tau);
        double a10 = n[1] * tau + n[2];
        double a20 = -n[2];
        for (std::size_t k = 0; k < component.theta0.size(); ++k) {
            const double x = component.theta0[k] / temperature;
            if (x == 0.0) continue;
            if (k % 2 == 0) {
                a00 += n[k + 3] * std::log(std::abs(std::sinh(x)));
                a10 += n[k + 3] * x / std::tanh(x);
                a20 -= n[k + 3] * std::pow(x / std::sinh(x), 2);
            } else {
                a00 -= n[k + 3] * std::log(std::cosh(x));
                a10 -= n[k + 3] * x * std::tanh(x);
                a20 -= n[k + 3] * std::pow(x / std::cosh(x), 2);
            }
        }
        const double x = m_fractions[i];
        sum.a00 += x * (std::log(density / component.criticalDensity) + ratio * a00 + std::log(x));
        sum.a10 += x * ratio * a10;
        sum.a20 += x * ratio * a20;
    }
    return sum;
}

Derivatives GergFluid::residual(double temperature, double density) const
{
    const double tau = m_reducingTemperature / temperature;
    const double delta = density / m_reducingDensity;
    Derivatives sum;
    for (std::size_t i = 0; i < m_fractions.size(); ++i)
        add(m_mixture.components[i].terms, m_fractions[i], tau, delta, sum);
    for (std::size_t i = 0; i < m_fractions.size(); ++i)
        for (std::size_t j = i + 1; j < m_fractions.size(); ++j) {
            const gas::GergPair &pair = m_mixture.pair(i, j);
            if (pair.departure)
                add(*pair.departure, m_fractions[i] * m_fractions[j] * pair.departureFactor, tau, delta, sum);
        }
    return sum;
}

double GergFluid::molarMass() const
{
    double sum = 0.0;
    for (std::size_t i = 0; i < m_fractions.size(); ++i) sum += m_fractions[i] * m_mixture.components[i].molarMass;
    return sum;
}

namespace
{
constexpr int mostSteps = 100;
constexpr double converged = 1e-12;
} // namespace

double densityAt(const Fluid &fluid, double temperature, double pressure)
{
    double density = pressure / (fluid.gasConstant() * temperature);
    for (int i = 0; i < mostSteps; ++i) {
        const Properties here = fluid.at(temperature, density);
        const double step = (pressure - here.pressure) / here.densitySlope;
        density += step;
        if (std::abs(step) < converged * density) break;
    }
    return density;
}

Point pointAt(const Fluid &fluid, double pressure, double entropy, Point guess)
{
    for (int i = 0; i < mostSteps; ++i) {
        const auto [t, rho] = guess;
        const Properties here = fluid.at(t, rho);
        // ∂(p, s)/∂(ln T, ln ρ): (∂s/∂T)_ρ = c_v/T, (∂s/∂ρ)_T = −(∂p/∂T)_ρ/ρ²
        const double pT = t * here.temperatureSlope;
        const double pRho = rho * here.densitySlope;
        const double sT = here.isochoricHeatCapacity;
        const double sRho = -here.temperatureSlope / rho;
        const double determinant = pT * sRho - pRho * sT;
        const double dp = pressure - here.pressure;
        const double ds = entropy - here.entropy;
        const double lnT = (dp * sRho - ds * pRho) / determinant;
        const double lnRho = (ds * pT - dp * sT) / determinant;
        guess = {t * std::exp(lnT), rho * std::exp(lnRho)};
        if (std::abs(lnT) + std::abs(lnRho) < converged) break;
    }
    return guess;
}

} // namespace quasistat::transcription
