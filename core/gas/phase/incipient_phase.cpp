#include "core/gas/phase/incipient_phase.h"

#include <algorithm>
#include <cassert>
#include <cmath>

namespace quasistat::gas
{
namespace
{

constexpr double smallestFraction = 1e-290; // a trace never quite lacks a component
constexpr double longestStep = 0.7;         // of any logarithm in one step of Newton
constexpr int mostSteps = 40;
constexpr double converged = 1e-10;
constexpr double rounding = 1e-8;

double largest(std::span<const double> values)
{
    double result = 0.0;
    for (const double value : values) {
        if (!std::isfinite(value)) return INFINITY;
        result = std::max(result, std::abs(value));
    }
    return result;
}

} // namespace

IncipientPhase::IncipientPhase(const Fugacities &fugacities, std::vector<double> fractions)
    : m_fugacities(fugacities), m_fractions(std::move(fractions)), m_trace(m_fractions),
      m_mixturePotentials(m_fractions.size()), m_tracePotentials(m_fractions.size()), m_system(m_fractions.size() + 3)
{
    assert(fugacities.components() == m_fractions.size());
}

double IncipientPhase::distance(const IncipientState &state) const
{
    return largest(std::span(state).first(components() + 1));
}

void IncipientPhase::evaluateMixture(const IncipientState &state)
{
    m_mixturePressure = m_fugacities.residualPotentials(std::exp(state[temperature()]), std::exp(state[density()]),
                                                        m_fractions, m_mixturePotentials);
}

void IncipientPhase::evaluateTrace(const IncipientState &state)
{
    m_sum = 0.0;
    for (std::size_t i = 0; i < components(); ++i) {
        m_trace[i] = std::max(m_fractions[i] * std::exp(state[i]), smallestFraction);
        m_sum += m_trace[i];
    }
    for (double &fraction : m_trace) fraction /= m_sum;
    m_tracePressure = m_fugacities.residualPotentials(
        std::exp(state[temperature()]), std::exp(state[density()] + state[densityRatio()]), m_trace, m_tracePotentials);
}

void IncipientPhase::residuals(const IncipientState &state, std::span<double> result) const
{
    const std::size_t n = components();
    for (std::size_t i = 0; i < n; ++i)
        result[i] = state[i] + state[densityRatio()] + m_tracePotentials[i] - m_mixturePotentials[i];
    result[n] = (m_tracePressure - m_mixturePressure) / m_pressureScale;
    result[n + 1] = m_sum - 1.0;
}

/// The derivatives by differences: they decide how fast Newton converges, not where to. Central ones near the critical
/// point, where the column of ln T is as small as the distance to it.
bool IncipientPhase::linearise(const IncipientState &state, std::size_t given)
{
    const bool isCentral = distance(state) < 0.5;
    const double step = isCentral ? 1e-5 : 1e-6;
    const std::size_t equations = unknowns() - 1;
    std::vector<double> lower(equations);
    std::vector<double> upper(equations);
    evaluateMixture(state);
    evaluateTrace(state);
    // The denser of both decides: its pressure is what answers to everything.
    m_pressureScale = m_fugacities.gasConstant() *
                      std::exp(state[temperature()] + state[density()] + std::max(state[densityRatio()], 0.0));
    residuals(state, lower);
    IncipientState moved = state;
    const auto evaluate = [&](std::size_t k, double by, std::span<double> result) {
        moved[k] = state[k] + by;
        if (k >= temperature()) evaluateMixture(moved);
        evaluateTrace(moved);
        residuals(moved, result);
        moved[k] = state[k];
    };
    for (std::size_t k = 0; k < unknowns(); ++k) {
        evaluate(k, step, upper);
        if (isCentral) evaluate(k, -step, lower);
        const double width = isCentral ? 2.0 * step : step;
        for (std::size_t row = 0; row < equations; ++row) m_system.entry(row, k) = (upper[row] - lower[row]) / width;
        m_system.entry(equations, k) = k == given ? 1.0 : 0.0;
    }
    return m_system.factor();
}

bool IncipientPhase::solve(IncipientState &state, std::size_t given)
{
    std::vector<double> step(unknowns());
    double previous = INFINITY;
    bool isFresh = false;
    const double fixed = state[given];
    for (m_steps = 1; m_steps <= mostSteps; ++m_steps) {
        // One linearisation serves as long as it brings the solution much nearer with each step.
        if (m_steps == 1 || !isFresh) {
            if (!linearise(state, given)) return false;
            isFresh = true;
        }
        evaluateMixture(state);
        evaluateTrace(state);
        residuals(state, std::span(step).first(unknowns() - 1));
        step.back() = 0.0;
        m_system.solve(step);
        const double length = largest(step);
        if (!std::isfinite(length)) return false;
        const double part = std::min(1.0, longestStep / length);
        for (std::size_t k = 0; k < unknowns(); ++k) state[k] -= part * step[k];
        state[given] = fixed;
        // Near the critical point rounding is felt before that.
        const bool isStill = length < rounding && length > 0.5 * previous;
        if (length < converged || isStill) return distance(state) > 1e-6;
        isFresh = part == 1.0 && length < 0.1 * previous && length < 0.05;
        previous = length;
    }
    return false;
}

std::optional<IncipientState> IncipientPhase::tangent(const IncipientState &state, std::size_t given)
{
    if (!linearise(state, given)) return std::nullopt;
    IncipientState slope(unknowns(), 0.0);
    slope.back() = 1.0;
    m_system.solve(slope);
    if (!std::isfinite(largest(slope))) return std::nullopt;
    return slope;
}

} // namespace quasistat::gas
