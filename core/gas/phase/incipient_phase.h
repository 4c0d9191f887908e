#pragma once
// A homogeneous mixture on the point of parting: the equations between it and the first trace of a second phase.

#include "core/gas/phase/fugacity.h"
#include "core/gas/phase/linear_system.h"

#include <cstddef>
#include <optional>
#include <span>
#include <vector>

namespace quasistat::gas
{

/// Unknowns, all logarithms: ln Kᵢ = ln wᵢ/zᵢ for each component, ln(ρ_w/ρ), ln T, ln ρ; z and ρ of the mixture, w and
/// ρ_w of the trace. Equations: equal fugacities, equal pressures, Σ zᵢKᵢ = 1; one unknown is given. A pure fluid is no
/// special case: its ln K is 0.
using IncipientState = std::vector<double>;

/// Solves them. Not thread-safe (scratch memory); cheap to make. Precondition of everything: fractions > 0, sum 1.
class IncipientPhase
{
public:
    IncipientPhase(const Fugacities &fugacities, std::vector<double> fractions);

    [[nodiscard]] std::size_t components() const { return m_fractions.size(); }
    [[nodiscard]] std::size_t unknowns() const { return components() + 3; }
    [[nodiscard]] std::size_t densityRatio() const { return components(); }
    [[nodiscard]] std::size_t temperature() const { return components() + 1; }
    [[nodiscard]] std::size_t density() const { return components() + 2; }
    [[nodiscard]] const std::vector<double> &fractions() const { return m_fractions; }

    /// How far the trace is from being the mixture itself: the greatest |ln K| or |ln(ρ_w/ρ)|.
    [[nodiscard]] double distance(const IncipientState &state) const;

    /// Newton's method from `state` with unknown `given` kept at its value. False where it does not converge to a
    /// trace that differs from the mixture; `state` is then spoilt. Converged: the last step was below 1e-10, or
    /// below 1e-8 and no shorter than the one before.
    [[nodiscard]] bool solve(IncipientState &state, std::size_t given);
    /// d(state)/d(state[given]) along the solutions; none where they turn back in this unknown. `state` is a solution.
    [[nodiscard]] std::optional<IncipientState> tangent(const IncipientState &state, std::size_t given);
    /// Steps of the last solve.
    [[nodiscard]] int steps() const { return m_steps; }

private:
    void evaluateMixture(const IncipientState &state);
    void evaluateTrace(const IncipientState &state);
    void residuals(const IncipientState &state, std::span<double> result) const;
    [[nodiscard]] bool linearise(const IncipientState &state, std::size_t given);

    const Fugacities &m_fugacities;
    std::vector<double> m_fractions;
    std::vector<double> m_trace; ///< w, normalised
    double m_sum = 0.0;          ///< Σ zᵢKᵢ
    std::vector<double> m_mixturePotentials;
    std::vector<double> m_tracePotentials;
    double m_mixturePressure = 0.0;
    double m_tracePressure = 0.0;
    double m_pressureScale = 1.0;
    LinearSystem m_system;
    int m_steps = 0;
};

} // namespace quasistat::gas
