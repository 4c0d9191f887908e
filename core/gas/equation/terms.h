#pragma once
// Multiparameter equations of state as they are published: lists of terms with their coefficients. Nothing is
// computed here; published.h evaluates them as written, plan.h compiles them.

#include <vector>

namespace quasistat::gas
{

/// n δᵈ τᵗ exp(−g δˡ); without the exponential where l = 0.
struct PowerTerm {
    double n;
    int d;
    double t;
    int l = 0;
    double g = 1.0;
};

/// n δᵈ τᵗ exp(−η(δ − ε)² − β(τ − γ)²).
struct GaussianTerm {
    double n;
    int d;
    double t;
    double eta;
    double epsilon;
    double beta;
    double gamma;
};

/// n δᵈ τᵗ exp(−η(δ − ε)² − β(δ − γ)): departure functions of GERG-2008. Source: O. Kunz, W. Wagner, J. Chem. Eng.
/// Data 57 (2012) 3032, eq. (17) (equation number from memory).
struct DepartureTerm {
    double n;
    int d;
    double t;
    double eta;
    double epsilon;
    double beta;
    double gamma;
};

/// n δᵈ τᵗ exp(η(δ − ε)² + 1/(β(τ − γ)² + b)), η < 0. Source: K. Gao et al., J. Phys. Chem. Ref. Data 52 (2023) 013102.
struct AssociatingTerm {
    double n;
    int d;
    double t;
    double eta;
    double epsilon;
    double beta;
    double gamma;
    double b;
};

/// n Δᵇ δ ψ with θ = 1 − τ + A((δ−1)²)^(1/(2β)), Δ = θ² + B((δ−1)²)ᵃ, ψ = exp(−C(δ−1)² − D(τ−1)²): the critical
/// region of carbon dioxide and water. Source: R. Span, W. Wagner, J. Phys. Chem. Ref. Data 25 (1996) 1509.
struct NonAnalyticTerm {
    double n;
    double a;
    double b;
    double beta;
    double A;
    double B;
    double C;
    double D;
};

/// α^r(τ, δ), τ = T_r/T, δ = ρ/ρ_r.
struct ResidualTerms {
    double reducingTemperature; ///< T_r [K]
    double reducingDensity;     ///< ρ_r [mol/m³]
    std::vector<PowerTerm> powers;
    std::vector<GaussianTerm> gaussians;
    std::vector<DepartureTerm> departures;
    std::vector<AssociatingTerm> associating;
    std::vector<NonAnalyticTerm> nonAnalytic;
};

struct IdealPowerTerm {
    double n;
    double t;
};
/// n ln(c + d exp(−θ τ)).
struct PlanckEinsteinTerm {
    double n;
    double theta;
    double c = 1.0;
    double d = -1.0;
};

/// α⁰(τ, δ) = ln δ + lead[0] + lead[1] τ + logTau ln τ + Σ n τᵗ + Σ n ln(c + d exp(−θτ)). A log term may stand for a
/// heat capacity that GERG-2008 writes with sinh and cosh: ln sinh x = x + ln(1 − e^(−2x)) − ln 2.
struct IdealTerms {
    double reducingTemperature; ///< T_r [K]
    double lead[2] = {0.0, 0.0};
    double logTau = 0.0;
    std::vector<IdealPowerTerm> powers;
    std::vector<PlanckEinsteinTerm> planckEinstein;
};

} // namespace quasistat::gas
