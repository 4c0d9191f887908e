#pragma once
// The residual part of an equation of state at one fixed composition: what makes the gas real.

#include "core/gas/equation/alpha.h"

#include <array>
#include <cstddef>
#include <span>

namespace quasistat::gas
{

/// What of a residual depends on temperature alone, worked out once per temperature: Newton in density and whole
/// isotherms then pay for the density part only. Plain scratch memory, filled by Residual::atTemperature and meaningful
/// to the residual that filled it; lives on the stack.
struct Isotherm {
    static constexpr std::size_t mostColumns = 192;

    double temperature = 0.0; ///< [K]
    /// Factors of the density functions, and their τ∂/∂τ and τ²∂²/∂τ².
    std::array<double, mostColumns> value;
    std::array<double, mostColumns> first;
    std::array<double, mostColumns> second;

    // Deliberately not initialised: the arrays are written before they are read, and clearing them costs more than
    // an evaluation.
    Isotherm() {} // NOLINT(modernize-use-equals-default, cppcoreguidelines-pro-type-member-init)
};

/// α^r's density derivatives alone: all that pressure and its slope need.
struct DensityDerivatives {
    double a01; ///< δ ∂α^r/∂δ; p = ρ R T (1 + a01)
    double a02; ///< δ² ∂²α^r/∂δ²; ∂p/∂ρ = R T (1 + 2 a01 + a02)
};

/// Immutable and shared between threads. T [K] > 0, ρ [mol/m³] > 0 everywhere; α^r → 0 as ρ → 0.
class Residual
{
public:
    virtual ~Residual() = default;

    /// Fills the factors that density derivatives need (`value`), and with `temperatureDerivatives` all of them.
    virtual void atTemperature(double temperature, bool temperatureDerivatives, Isotherm &isotherm) const = 0;
    /// Every derivative. The isotherm must have been filled with temperature derivatives.
    [[nodiscard]] virtual Alpha at(const Isotherm &isotherm, double density) const = 0;
    [[nodiscard]] virtual DensityDerivatives densityDerivatives(const Isotherm &isotherm, double density) const = 0;
    /// Every derivative at each of many states: for curves, quadratures, sweeps. All three of one length.
    virtual void atEach(std::span<const double> temperatures, std::span<const double> densities,
                        std::span<Alpha> results) const;

    [[nodiscard]] virtual Alpha at(double temperature, double density) const;
};

} // namespace quasistat::gas
