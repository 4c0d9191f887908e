#include "core/gas/equation/non_analytic.h"

#include <cmath>

namespace quasistat::gas
{

void add(Alpha &a, const Alpha &b)
{
    a.a00 += b.a00;
    a.a10 += b.a10;
    a.a01 += b.a01;
    a.a20 += b.a20;
    a.a11 += b.a11;
    a.a02 += b.a02;
}

// Letters as in R. Span, W. Wagner, J. Phys. Chem. Ref. Data 25 (1996) 1509, table 32; every power of (δ − 1)² that
// appears is positive, so that δ = 1 needs no special case except at the critical point.
Alpha nonAnalytic(const NonAnalyticTerm &term, double tau, double delta)
{
    const double x = delta - 1.0;
    const double y = tau - 1.0;
    const double q = x * x;
    const double k = 0.5 / term.beta;
    const double qk1 = std::pow(q, k - 1.0);
    const double qa1 = std::pow(q, term.a - 1.0);

    const double theta = -y + term.A * qk1 * q;
    const double thetaD = 2.0 * k * term.A * qk1 * x;
    const double thetaDD = 2.0 * k * (2.0 * k - 1.0) * term.A * qk1;
    const double Delta = theta * theta + term.B * qa1 * q;
    if (Delta < 1e-40) return nonAnalytic(term, tau, delta * (1.0 + 1e-10));
    const double DeltaD = 2.0 * theta * thetaD + 2.0 * term.a * term.B * qa1 * x;
    const double DeltaDD =
        2.0 * (thetaD * thetaD + theta * thetaDD) + 2.0 * term.a * (2.0 * term.a - 1.0) * term.B * qa1;
    const double DeltaT = -2.0 * theta;
    const double DeltaDT = -2.0 * thetaD;

    // f = Δᵇ
    const double b = term.b;
    const double f = std::pow(Delta, b);
    const double f1 = b * f / Delta;
    const double f2 = (b - 1.0) * f1 / Delta;
    const double fD = f1 * DeltaD;
    const double fDD = f2 * DeltaD * DeltaD + f1 * DeltaDD;
    const double fT = f1 * DeltaT;
    const double fTT = f2 * DeltaT * DeltaT + 2.0 * f1;
    const double fDT = f2 * DeltaD * DeltaT + f1 * DeltaDT;

    // g = δ ψ in δ, and ψ alone in τ
    const double psi = std::exp(-term.C * q - term.D * y * y);
    const double g = delta * psi;
    const double slope = 1.0 - 2.0 * term.C * x * delta;
    const double gD = psi * slope;
    const double gDD = psi * (-2.0 * term.C * (2.0 * delta - 1.0) - 2.0 * term.C * x * slope);
    const double psiT = -2.0 * term.D * y;
    const double psiTT = psiT * psiT - 2.0 * term.D;

    const double n = term.n;
    return {.a00 = n * f * g,
            .a10 = n * tau * (fT + f * psiT) * g,
            .a01 = n * delta * (fD * g + f * gD),
            .a20 = n * tau * tau * (fTT + 2.0 * fT * psiT + f * psiTT) * g,
            .a11 = n * tau * delta * (fDT * g + fT * gD + psiT * (fD * g + f * gD)),
            .a02 = n * delta * delta * (fDD * g + 2.0 * fD * gD + f * gDD)};
}

} // namespace quasistat::gas
