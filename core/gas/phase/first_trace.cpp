#include "core/gas/phase/first_trace.h"

#include <algorithm>
#include <cmath>

namespace quasistat::gas
{
namespace
{

/// ln of Wilson's vapour pressure [Pa].
double lnVapourPressure(const Fugacities::Critical &critical, double temperature)
{
    return std::log(critical.pressure) +
           5.373 * (1.0 + critical.acentricFactor) * (1.0 - critical.temperature / temperature);
}

class Search
{
public:
    Search(const Fugacities &fugacities, IncipientPhase &phase)
        : m_fugacities(fugacities), m_phase(phase), m_z(phase.fractions()), m_packing(fugacities.closestPacking(m_z)),
          m_mixturePotentials(m_z.size()), m_tracePotentials(m_z.size())
    {
    }

    std::vector<IncipientState> at(double density)
    {
        const double temperature = raoultTemperature(density);
        std::vector<IncipientState> found;
        const auto tryFrom = [&](std::vector<double> trace) {
            std::optional<IncipientState> state = liquid(temperature, density, std::move(trace));
            if (state && std::ranges::none_of(found, [&](const auto &known) { return isSame(known, *state); }))
                found.push_back(std::move(*state));
        };
        std::vector<double> raoult(m_z.size());
        for (std::size_t i = 0; i < m_z.size(); ++i)
            raoult[i] = m_z[i] * std::exp(-lnVapourPressure(m_fugacities.critical(i), temperature));
        tryFrom(raoult);
        for (std::size_t i = 0; m_z.size() > 1 && i < m_z.size(); ++i) {
            std::vector<double> almostPure(m_z.size());
            for (std::size_t j = 0; j < m_z.size(); ++j) almostPure[j] = (j == i ? 1.0 : 0.01) * m_z[j] / m_z[i];
            tryFrom(std::move(almostPure));
        }
        return found;
    }

    /// A bubble in the cold liquid, whose vapour is ideal: pᵢ = fᵢ at once. `temperature` [K].
    std::optional<IncipientState> bubble(double temperature)
    {
        const double RT = m_fugacities.gasConstant() * temperature;
        IncipientState state(m_phase.unknowns());
        double pressure = 0.0;
        for (int k = 0; k < 3; ++k) { // a liquid's density hardly follows the pressure
            const double density = liquidDensity(temperature, pressure, m_z);
            if (!(density > 0.0)) return std::nullopt;
            m_fugacities.residualPotentials(temperature, density, m_z, m_mixturePotentials);
            pressure = 0.0;
            for (std::size_t i = 0; i < m_z.size(); ++i) {
                state[i] = std::log(density * RT) + m_mixturePotentials[i];
                pressure += m_z[i] * std::exp(state[i]);
            }
            state[m_phase.density()] = std::log(density);
            state[m_phase.densityRatio()] = std::log(pressure / (RT * density));
        }
        if (!std::isfinite(pressure) || state[m_phase.densityRatio()] > -2.0) return std::nullopt; // not ideal
        for (std::size_t i = 0; i < m_z.size(); ++i) state[i] -= std::log(pressure);
        state[m_phase.temperature()] = std::log(temperature);
        if (!m_phase.solve(state, m_phase.temperature())) return std::nullopt;
        if (state[m_phase.densityRatio()] > -1.0) return std::nullopt;
        return state;
    }

private:
    /// Σ zᵢρRT/pᵢ(T) = 1, falling as T rises.
    [[nodiscard]] double raoultTemperature(double density) const
    {
        double low = 1.0;
        double high = 1e4;
        for (int k = 0; k < 50; ++k) {
            const double middle = std::sqrt(low * high);
            const double lnPressure = std::log(density * m_fugacities.gasConstant() * middle);
            double sum = 0.0;
            for (std::size_t i = 0; i < m_z.size(); ++i)
                sum +=
                    m_z[i] * std::exp(std::min(lnPressure - lnVapourPressure(m_fugacities.critical(i), middle), 600.0));
            (sum > 1.0 ? low : high) = middle;
        }
        return std::sqrt(low * high);
    }

    /// The densest root of p(ρ) at this pressure; 0 where the mixture is nowhere so dense.
    [[nodiscard]] double liquidDensity(double temperature, double pressure, const std::vector<double> &fractions) const
    {
        const auto excess = [&](double density) {
            return m_fugacities.pressure(temperature, density, fractions).pressure - pressure;
        };
        double high = 0.99 * m_fugacities.closestPacking(fractions);
        if (!(excess(high) > 0.0)) return 0.0;
        constexpr double stride = 0.97;
        double low = high * stride;
        const double thinnest = 0.2 * high;
        while (low > thinnest && excess(low) > 0.0) {
            high = low;
            low *= stride;
        }
        if (low <= thinnest) return 0.0;
        for (int k = 0; k < 12; ++k) { // Newton takes over
            const double middle = 0.5 * (low + high);
            (excess(middle) > 0.0 ? high : low) = middle;
        }
        return high;
    }

    /// Successive substitution at one temperature: with the trace's fractions the mixture's density follows, since at
    /// low density Σ Wᵢ is proportional to it. Then Newton.
    std::optional<IncipientState> liquid(double temperature, double density, std::vector<double> trace)
    {
        constexpr int most = 40;
        normalise(trace);
        IncipientState state(m_phase.unknowns());
        for (int k = 0; k < most; ++k) {
            const double pressure = m_fugacities.residualPotentials(temperature, density, m_z, m_mixturePotentials);
            const double liquid = liquidDensity(temperature, pressure, trace);
            if (!(liquid > 0.0)) return std::nullopt;
            m_fugacities.residualPotentials(temperature, liquid, trace, m_tracePotentials);
            double sum = 0.0;
            double change = 0.0;
            for (std::size_t i = 0; i < m_z.size(); ++i) {
                const double was = trace[i];
                state[i] = m_mixturePotentials[i] - m_tracePotentials[i] - std::log(liquid / density);
                sum += trace[i] = m_z[i] * std::exp(state[i]);
                change = std::max(change, std::abs(trace[i] - was));
            }
            if (!std::isfinite(sum) || !(sum > 0.0)) return std::nullopt;
            density /= std::clamp(sum, 0.1, 10.0);
            if (density > 0.05 * m_packing) return std::nullopt; // no thin mixture any more
            normalise(trace);
            if (change > 1e-3 && k + 1 < most) continue;
            state[m_phase.densityRatio()] = std::log(liquid / density);
            state[m_phase.temperature()] = std::log(temperature);
            state[m_phase.density()] = std::log(density);
            break;
        }
        if (!m_phase.solve(state, m_phase.temperature())) return std::nullopt;
        if (state[m_phase.densityRatio()] < 0.1) return std::nullopt; // no liquid
        return state;
    }

    static void normalise(std::vector<double> &fractions)
    {
        double sum = 0.0;
        for (const double fraction : fractions) sum += fraction;
        for (double &fraction : fractions) fraction = std::max(fraction / sum, 1e-290);
    }

    [[nodiscard]] bool isSame(const IncipientState &a, const IncipientState &b) const
    {
        return std::abs(a[m_phase.density()] - b[m_phase.density()]) < 1e-6 &&
               std::abs(a[m_phase.densityRatio()] - b[m_phase.densityRatio()]) < 1e-6;
    }

    const Fugacities &m_fugacities;
    IncipientPhase &m_phase;
    const std::vector<double> &m_z;
    double m_packing;
    std::vector<double> m_mixturePotentials;
    std::vector<double> m_tracePotentials;
};

} // namespace

std::vector<IncipientState> firstTraces(const Fugacities &fugacities, IncipientPhase &phase)
{
    Search search(fugacities, phase);
    const double packing = fugacities.closestPacking(phase.fractions());
    for (const double part : {1e-3, 1e-4, 1e-6, 1e-2})
        if (std::vector<IncipientState> found = search.at(part * packing); !found.empty()) return found;
    return {};
}

std::optional<IncipientState> firstBubble(const Fugacities &fugacities, IncipientPhase &phase)
{
    double pseudoCritical = 0.0;
    for (std::size_t i = 0; i < phase.components(); ++i)
        pseudoCritical += phase.fractions()[i] * fugacities.critical(i).temperature;
    Search search(fugacities, phase);
    for (const double part : {0.6, 0.5, 0.7, 0.4})
        if (std::optional<IncipientState> found = search.bubble(part * pseudoCritical)) return found;
    return std::nullopt;
}

} // namespace quasistat::gas
