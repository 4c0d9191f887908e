#pragma once
// Components of a cubic equation of state with what their critical constants give: van der Waals one-fluid mixing.

#include "core/gas/equation/cubic_form.h"

#include <cstddef>
#include <span>
#include <vector>

namespace quasistat::gas
{

/// What a cubic equation knows of one substance.
struct CubicSubstance {
    double criticalTemperature; ///< [K]
    double criticalPressure;    ///< [Pa]
    double acentricFactor;
};

/// a = ΣΣ xᵢxⱼ(1 − kᵢⱼ) αᵢαⱼ and b = Σ xᵢbᵢ, with αᵢ(T) = sqrt(aᵢ(T)) = Aᵢ − Bᵢ sqrt(T).
///
/// αᵢ keeps the sign of Soave's bracket 1 + m(1 − sqrt(T/T_c)), which passes zero far above T_c (nitrogen: at 1390 K by
/// Peng and Robinson's function, at 1030 K by Soave's). The usual |αᵢ| would put a kink into a(T) of a mixture there:
/// c_v would jump and Newton's method stumble. With the sign kept everything is smooth, and a pure gas stays as
/// published, for only αᵢ² enters. Between the zeros of two components their cross term repels, as weak as it is there.
class CubicMixture
{
public:
    /// `interaction`: kᵢⱼ row by row, symmetric, components² entries; its diagonal is not read.
    CubicMixture(CubicForm form, const std::vector<CubicSubstance> &substances, std::vector<double> interaction);

    [[nodiscard]] const CubicFormFacts &form() const { return m_form; }
    [[nodiscard]] const std::vector<CubicSubstance> &substances() const { return m_substances; }
    [[nodiscard]] std::size_t size() const { return m_substances.size(); }

    /// αᵢ = constant − slope · sqrt(T) [sqrt(Pa) m³/mol].
    struct Root {
        double constant;
        double slope;
    };
    [[nodiscard]] const Root &root(std::size_t i) const { return m_roots[i]; }
    [[nodiscard]] double covolume(std::size_t i) const { return m_covolumes[i]; } ///< bᵢ [m³/mol]
    [[nodiscard]] double covolume(std::span<const double> fractions) const;       ///< b [m³/mol]
    /// 1 − kᵢⱼ; 1 for i = j.
    [[nodiscard]] double factor(std::size_t i, std::size_t j) const { return m_factors[i * size() + j]; }

private:
    CubicFormFacts m_form;
    std::vector<CubicSubstance> m_substances;
    std::vector<Root> m_roots;
    std::vector<double> m_covolumes;
    std::vector<double> m_factors;
};

/// The density part both forms share, in the packing y = bρ < 1: L(y) = ln((1 + Δ₁y)/(1 + Δ₂y))/(Δ₁ − Δ₂).
struct CubicPacking {
    double logFree;    ///< −ln(1 − y)
    double free1;      ///< y ∂/∂y of it
    double free2;      ///< y² ∂²/∂y²
    double attraction; ///< L
    double attraction1;
    double attraction2;
};
inline constexpr double closestCubicPacking = 1.0 - 1e-9;
/// At or beyond close packing the fluid is taken at closestCubicPacking: finite, steep and of the right sign for a
/// search that strays there. Every figure keeps its digits as y → 0.
[[nodiscard]] CubicPacking cubicPacking(const CubicFormFacts &form, double packing);

} // namespace quasistat::gas
