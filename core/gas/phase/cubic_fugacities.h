#pragma once
// Fugacities of cubic equations of state.

#include "core/gas/equation/cubic_mixture.h"
#include "core/gas/phase/fugacity.h"

namespace quasistat::gas
{

/// Closed forms: n α^r = −n ln(1 − B/V) − (D/(B R T)) L(B/V), B = Σ nᵢbᵢ, D = ΣΣ nᵢnⱼaᵢⱼ, differentiated.
class CubicFugacities final : public Fugacities
{
public:
    explicit CubicFugacities(CubicMixture mixture) : m_mixture(std::move(mixture)) {}

    [[nodiscard]] std::size_t components() const override { return m_mixture.size(); }
    [[nodiscard]] double gasConstant() const override;
    [[nodiscard]] Critical critical(std::size_t component) const override;
    double residualPotentials(double temperature, double density, std::span<const double> fractions,
                              std::span<double> result) const override;
    [[nodiscard]] PressureSlope pressure(double temperature, double density,
                                         std::span<const double> fractions) const override;
    [[nodiscard]] double closestPacking(std::span<const double> fractions) const override;

private:
    CubicMixture m_mixture;
};

} // namespace quasistat::gas
