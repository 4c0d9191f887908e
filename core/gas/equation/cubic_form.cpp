#include "core/gas/equation/cubic_form.h"

#include <cmath>
#include <numbers>

namespace quasistat::gas
{
namespace
{

/// At the critical point the cubic in Z is (Z − Z_c)³. With u = Δ₁ + Δ₂, w = Δ₁Δ₂ its coefficients give
/// 3 Z_c = 1 + (1 − u) B and 3 Z_c² = A + w B² − u B − u B², which leave a closed form in the reduced density
/// η = b/v_c = B/Z_c.
CubicFormFacts fromCriticalDensity(double delta1, double delta2, double eta)
{
    const double u = delta1 + delta2;
    const double w = delta1 * delta2;
    const double compressibility = 1.0 / (3.0 - (1.0 - u) * eta);
    const double omegaB = eta * compressibility;
    const double omegaA = 3.0 * compressibility * compressibility + omegaB * (u + omegaB * (u - w));
    return {delta1, delta2, omegaA, omegaB, compressibility};
}

} // namespace

CubicFormFacts factsOf(CubicForm form)
{
    constexpr double root2 = std::numbers::sqrt2;
    switch (form) {
    case CubicForm::pengRobinson:
        // Z_c³ = A B + w B² + w B³ becomes x³ = 6 x + 8 in x = 1/η − 1.
        return fromCriticalDensity(1.0 + root2, 1.0 - root2,
                                   1.0 / (1.0 + std::cbrt(4.0 - 2.0 * root2) + std::cbrt(4.0 + 2.0 * root2)));
    case CubicForm::soaveRedlichKwong: break;
    }
    // The same condition is (1 + η)³ = 2 here.
    return fromCriticalDensity(1.0, 0.0, std::cbrt(2.0) - 1.0);
}

double alphaSlope(CubicForm form, double acentricFactor)
{
    const double omega = acentricFactor;
    if (form == CubicForm::soaveRedlichKwong) return 0.480 + omega * (1.574 - 0.176 * omega);
    constexpr double lastOf1976 = 0.491;
    if (omega <= lastOf1976) return 0.37464 + omega * (1.54226 - 0.26992 * omega);
    return 0.379642 + omega * (1.48503 + omega * (-0.164423 + 0.016666 * omega));
}

} // namespace quasistat::gas
