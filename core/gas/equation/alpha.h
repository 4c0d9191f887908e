#pragma once
// The reduced Helmholtz energy and its derivatives, in the one form all equations of state share here.

namespace quasistat::gas
{

/// α = a/(R T) and its scaled derivatives a_ij = τⁱ δʲ ∂ⁱ⁺ʲα/∂τⁱ∂δʲ, with τ ∝ 1/T and δ ∝ ρ. Scaled, they do not
/// depend on the reducing temperature and density: any equation's can be read without knowing them. Dimensionless.
struct Alpha {
    double a00 = 0.0;
    double a10 = 0.0;
    double a01 = 0.0;
    double a20 = 0.0;
    double a11 = 0.0;
    double a02 = 0.0;
};

} // namespace quasistat::gas
