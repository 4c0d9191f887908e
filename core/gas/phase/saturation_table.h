#pragma once
// Saturated densities and pressure of a fluid, tabulated once: first guesses and quick decisions without iteration.

#include <vector>

namespace quasistat::gas
{

struct SaturatedDensities {
    double liquid; ///< [mol/m³]
    double vapour; ///< [mol/m³]
};

/// Nodes even in w = (1 − T/T_c)^(1/3), in which both densities are nearly straight up to the critical point; cubic
/// between them.
class SaturationTable
{
public:
    struct Node {
        double w;
        double liquidDensity; ///< [mol/m³]
        double vapourDensity; ///< [mol/m³]
        double pressure;      ///< [Pa]
    };
    struct CriticalPoint {
        double temperature; ///< [K]
        double pressure;    ///< [Pa]
        double density;     ///< [mol/m³]
    };

    /// `nodes`: w ascending (cold last), at least four, the critical point not among them.
    SaturationTable(const CriticalPoint &critical, std::vector<Node> nodes);

    [[nodiscard]] double temperatureOf(double w) const { return m_critical.temperature * (1.0 - w * w * w); }
    [[nodiscard]] double coordinateOf(double temperature) const;
    [[nodiscard]] const CriticalPoint &critical() const { return m_critical; }
    [[nodiscard]] double lowestTemperature() const { return temperatureOf(m_nodes.back().w); }
    /// Above this temperature [K] the table ends in the critical point alone.
    [[nodiscard]] double hottestNode() const { return temperatureOf(m_nodes[1].w); }

    /// Both densities at T between the lowest and the critical temperature.
    [[nodiscard]] SaturatedDensities densities(double temperature) const;
    /// The temperature [K] at which one of the saturated densities is ρ; 0 for a vapour thinner and a liquid denser
    /// than at the lowest temperature.
    [[nodiscard]] double temperatureAtDensity(double density) const;
    /// The temperature [K] of saturation at p, within the table.
    [[nodiscard]] double temperatureAtPressure(double pressure) const;

private:
    CriticalPoint m_critical;
    std::vector<Node> m_nodes;      ///< the critical point first
    std::vector<double> m_vapour;   ///< ln ρ'' of the nodes: falls
    std::vector<double> m_liquid;   ///< ln ρ' of the nodes: rises as far as m_liquidEnd
    std::vector<double> m_pressure; ///< ln p of the nodes: falls
    std::vector<double> m_w;
    std::size_t m_liquidEnd; ///< one past the densest liquid: water is densest above its triple point
};

} // namespace quasistat::gas
