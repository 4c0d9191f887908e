#pragma once
// The two cubic equations of state and the numbers that belong to each.

namespace quasistat::gas
{

/// p = R T/(v − b) − a(T)/((v + Δ₁b)(v + Δ₂b)).
/// Sources: D.-Y. Peng, D. B. Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59; G. Soave, Chem. Eng. Sci. 27 (1972) 1197.
enum class CubicForm { pengRobinson, soaveRedlichKwong };

struct CubicFormFacts {
    double delta1;
    double delta2;
    double omegaA;                  ///< a(T_c) = Ω_a R²T_c²/p_c
    double omegaB;                  ///< b = Ω_b R T_c/p_c
    double criticalCompressibility; ///< p_c v_c/(R T_c) of every pure fluid by this form
};

/// Ω_a and Ω_b follow from ∂p/∂v = ∂²p/∂v² = 0 at the critical point, in closed form and to the last digit; the
/// articles print them rounded to five, which would move the critical point.
[[nodiscard]] CubicFormFacts factsOf(CubicForm form);

/// m(ω) of sqrt(a(T)/a(T_c)) = 1 + m (1 − sqrt(T/T_c)). Peng–Robinson: 1976, above ω = 0.491 the authors' own revision
/// (D. B. Robinson, D.-Y. Peng, GPA Research Report 28, 1978). The other: Soave 1972.
[[nodiscard]] double alphaSlope(CubicForm form, double acentricFactor);

} // namespace quasistat::gas
