#pragma once
// Cubic equations of state as residual Helmholtz energy.

#include "core/gas/equation/cubic_mixture.h"
#include "core/gas/equation/residual.h"

namespace quasistat::gas
{

/// α^r = −ln(1 − bρ) − q L(bρ) with q = a(T)/(bRT), of one composition; exact molar gas constant. The reduced forms are
/// τ = const/T and δ ∝ ρ, whatever the constants. Since a(T) is quadratic in sqrt(T), q is three terms in τ.
class CubicResidual final : public Residual
{
public:
    CubicResidual(const CubicMixture &mixture, std::span<const double> fractions);

    void atTemperature(double temperature, bool temperatureDerivatives, Isotherm &isotherm) const override;
    [[nodiscard]] Alpha at(const Isotherm &isotherm, double density) const override;
    [[nodiscard]] DensityDerivatives densityDerivatives(const Isotherm &isotherm, double density) const override;
    using Residual::at;

    [[nodiscard]] double covolume() const { return m_covolume; } ///< b [m³/mol]

private:
    CubicFormFacts m_form;
    double m_covolume;
    double m_inverse; ///< q = inverse/T − root/sqrt(T) + constant: [K], [sqrt(K)], 1
    double m_root;
    double m_constant;
};

} // namespace quasistat::gas
