#pragma once
// Fugacities of the components of a mixture: what decides whether a second phase can form.

#include <cstddef>
#include <span>

namespace quasistat::gas
{

/// One equation of state for mixtures of given components, at any composition. Immutable, shared between threads.
class Fugacities
{
public:
    virtual ~Fugacities() = default;

    [[nodiscard]] virtual std::size_t components() const = 0;
    [[nodiscard]] virtual double gasConstant() const = 0; ///< [J/(mol K)]
    /// Critical constants of component i, for first guesses: [K], [Pa], 1.
    struct Critical {
        double temperature;
        double pressure;
        double acentricFactor;
    };
    [[nodiscard]] virtual Critical critical(std::size_t component) const = 0;

    /// Φᵢ = (∂(n α^r)/∂nᵢ)_{T,V} of every component at T [K], ρ [mol/m³] and mole fractions x (> 0, sum 1) of the
    /// homogeneous mixture: ln fᵢ = ln(xᵢ ρ R T) + Φᵢ. Has a meaning where p ≤ 0 too, as searches need it. `result`:
    /// one for each component. Returns the pressure [Pa] of the same state.
    virtual double residualPotentials(double temperature, double density, std::span<const double> fractions,
                                      std::span<double> result) const = 0;
    /// ln φᵢ = Φᵢ − ln Z. Requires p > 0 there.
    void lnFugacityCoefficients(double temperature, double density, std::span<const double> fractions,
                                std::span<double> result) const;

    /// Pressure [Pa] and (∂p/∂ρ)_T [Pa m³/mol] of the homogeneous mixture.
    struct PressureSlope {
        double pressure;
        double slope;
    };
    [[nodiscard]] virtual PressureSlope pressure(double temperature, double density,
                                                 std::span<const double> fractions) const = 0;
    /// A density [mol/m³] no fluid reaches at this composition (1/b of a cubic, about 3.5 ρ_r of GERG-2008).
    [[nodiscard]] virtual double closestPacking(std::span<const double> fractions) const = 0;
};

} // namespace quasistat::gas
