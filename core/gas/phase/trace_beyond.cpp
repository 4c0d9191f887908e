// From the cusp of one trace to the trace that takes over.

#include "core/gas/phase/first_trace.h"

#include <algorithm>
#include <cmath>

namespace quasistat::gas
{
namespace
{

class Slide
{
public:
    Slide(const Fugacities &fugacities, IncipientPhase &phase, double density)
        : m_fugacities(fugacities), m_phase(phase), m_z(phase.fractions()), m_density(density),
          m_mixturePotentials(m_z.size()), m_tracePotentials(m_z.size()), m_trace(m_z.size())
    {
    }

    void begin(const IncipientState &state)
    {
        m_state = state;
        for (std::size_t i = 0; i < m_z.size(); ++i) m_trace[i] = m_z[i] * std::exp(state[i]);
        normalise();
    }

    /// ln Σ Wᵢ of the trace that successive substitution comes to at this temperature [K]: above 0 the mixture parts.
    /// None where the trace becomes the mixture itself.
    std::optional<double> settle(double temperature)
    {
        const double pressure = m_fugacities.residualPotentials(temperature, m_density, m_z, m_mixturePotentials);
        if (!(pressure > 0.0)) return std::nullopt;
        constexpr int most = 400;
        constexpr int perLook = 12; // steps from one look at all roots to the next
        constexpr double isSettled = 1e-6;
        double sum = 1.0;
        double change = 1.0;
        double traceDensity = 0.0;
        for (int k = 0; k < most && change > isSettled; ++k) {
            traceDensity = k % perLook == 0 ? stableDensity(temperature, pressure)
                                            : followedDensity(temperature, pressure, traceDensity);
            if (!(traceDensity > 0.0)) return std::nullopt;
            m_fugacities.residualPotentials(temperature, traceDensity, m_trace, m_tracePotentials);
            m_state[m_phase.densityRatio()] = std::log(traceDensity / m_density);
            change = 0.0;
            sum = 0.0;
            for (std::size_t i = 0; i < m_z.size(); ++i) {
                const double was = m_trace[i];
                m_state[i] = m_mixturePotentials[i] - m_tracePotentials[i] - m_state[m_phase.densityRatio()];
                m_trace[i] = m_z[i] * std::exp(m_state[i]);
                sum += m_trace[i];
                change = std::max(change, std::abs(m_trace[i] - was));
            }
            if (!std::isfinite(sum) || !(sum > 0.0)) return std::nullopt;
            normalise();
        }
        constexpr double itself = 0.02;
        if (m_phase.distance(m_state) < itself) return std::nullopt;
        for (std::size_t i = 0; i < m_z.size(); ++i) m_state[i] -= std::log(sum);
        m_state[m_phase.temperature()] = std::log(temperature);
        m_state[m_phase.density()] = std::log(m_density);
        return std::log(sum);
    }

    [[nodiscard]] const IncipientState &state() const { return m_state; }

private:
    /// The root of p(ρ) next to `density` by Newton's method; where that leads away, the stable one.
    double followedDensity(double temperature, double pressure, double density)
    {
        constexpr int most = 8;
        for (int k = 0; k < most; ++k) {
            const auto [value, slope] = m_fugacities.pressure(temperature, density, m_trace);
            const double step = (pressure - value) / slope;
            if (!(slope > 0.0) || !(std::abs(step) < 0.2 * density)) break;
            density += step;
            if (std::abs(step) < 1e-9 * density) return density;
        }
        return stableDensity(temperature, pressure);
    }

    /// Of all densities with this pressure the one of least Gibbs energy; 0 where there is none.
    double stableDensity(double temperature, double pressure)
    {
        constexpr double stride = 0.95;
        constexpr double thinnest = 1e-3; // of close packing; below, the trace is an ideal gas
        const double packing = m_fugacities.closestPacking(m_trace);
        const auto excess = [&](double density) {
            return m_fugacities.pressure(temperature, density, m_trace).pressure - pressure;
        };
        double best = 0.0;
        double least = INFINITY;
        double above = excess(0.99 * packing);
        for (double high = 0.99 * packing; high > thinnest * packing; high *= stride) {
            const double below = excess(stride * high);
            if (above > 0.0 && below <= 0.0) {
                const double density = root(excess, stride * high, high);
                m_fugacities.residualPotentials(temperature, density, m_trace, m_tracePotentials);
                double energy = std::log(density);
                for (std::size_t i = 0; i < m_z.size(); ++i) energy += m_trace[i] * m_tracePotentials[i];
                if (energy < least) {
                    least = energy;
                    best = density;
                }
            }
            above = below;
        }
        return best;
    }

    template <class Excess>
    static double root(const Excess &excess, double low, double high)
    {
        for (int k = 0; k < 30; ++k) {
            const double middle = 0.5 * (low + high);
            (excess(middle) > 0.0 ? high : low) = middle;
        }
        return 0.5 * (low + high);
    }

    void normalise()
    {
        double sum = 0.0;
        for (const double fraction : m_trace) sum += fraction;
        for (double &fraction : m_trace) fraction = std::max(fraction / sum, 1e-290);
    }

    const Fugacities &m_fugacities;
    IncipientPhase &m_phase;
    const std::vector<double> &m_z;
    double m_density;
    std::vector<double> m_mixturePotentials;
    std::vector<double> m_tracePotentials;
    std::vector<double> m_trace;
    IncipientState m_state;
};

/// From a mixture `denser` times as dense as at the cusp.
std::optional<IncipientState> traceAt(const Fugacities &fugacities, IncipientPhase &phase, const IncipientState &end,
                                      double denser)
{
    constexpr double colder = 0.999;
    constexpr double warming = 1.004;
    constexpr int most = 100;
    Slide slide(fugacities, phase, denser * std::exp(end[phase.density()]));
    slide.begin(end);
    double temperature = colder * std::exp(end[phase.temperature()]);
    std::optional<double> excess = slide.settle(temperature);
    if (!excess || *excess <= 0.0) return std::nullopt;
    for (int k = 0; k < most; ++k) {
        IncipientState parted = slide.state();
        const double before = *excess;
        excess = slide.settle(warming * temperature);
        if (!excess || *excess <= 0.0) {
            if (excess) parted[phase.temperature()] += std::log(warming) * before / (before - *excess);
            if (!phase.solve(parted, phase.density())) return std::nullopt;
            return parted;
        }
        temperature *= warming;
    }
    return std::nullopt;
}

} // namespace

std::optional<IncipientState> traceBeyond(const Fugacities &fugacities, IncipientPhase &phase,
                                          const IncipientState &end)
{
    // A pure liquid may be densest above its freezing point, as water; nothing takes over there.
    if (phase.components() == 1) return std::nullopt;
    for (const double denser : {1.003, 1.02, 1.1})
        if (std::optional<IncipientState> found = traceAt(fugacities, phase, end, denser)) return found;
    return std::nullopt;
}

} // namespace quasistat::gas
