#pragma once
// Vapour and liquid of a pure fluid in equilibrium.

#include "core/gas/equation/equation.h"

#include <optional>

namespace quasistat::gas
{

/// Both phases at one temperature, each from the equation at its own density.
struct SaturatedPair {
    MolarState liquid;
    MolarState vapour;
};

/// The saturation curve of a pure fluid: equal temperature, pressure and Gibbs energy of both phases. Immutable and
/// shared between threads.
class Saturation
{
public:
    virtual ~Saturation() = default;

    [[nodiscard]] virtual double lowestTemperature() const = 0;   ///< of the triple point [K]
    [[nodiscard]] virtual double criticalTemperature() const = 0; ///< [K], of this equation
    [[nodiscard]] virtual double criticalPressure() const = 0;    ///< [Pa]
    [[nodiscard]] virtual double criticalVolume() const = 0;      ///< [m³/mol]

    /// Saturation at T [K]; none outside [triple point, critical point).
    [[nodiscard]] virtual std::optional<SaturatedPair> atTemperature(double temperature) const = 0;
    /// Saturation at p [Pa]; none outside the same range.
    [[nodiscard]] virtual std::optional<SaturatedPair> atPressure(double pressure) const = 0;
};

/// The equilibrium mixture of a pair that fills v [m³/mol] between both phases' volumes: every property by the lever
/// rule; c_v with the shift of matter between the phases; ∂p/∂T along saturation; ∂p/∂v = 0.
[[nodiscard]] MolarState twoPhaseState(const SaturatedPair &pair, double molarVolume);

} // namespace quasistat::gas
