#pragma once
// An equation of state of a real gas at fixed composition: ideal part, residual part and where the homogeneous fluid
// ends.

#include "core/gas/equation/residual.h"
#include "core/gas/gas.h"
#include "core/gas/ideal/ideal_function.h"
#include "core/gas/phase/phase_boundary.h"

#include <memory>
#include <span>

namespace quasistat::gas
{

class Saturation;

/// Everything a real gas is computed from. Immutable once a gas holds it; shared between threads.
struct Equation {
    double gasConstant = 0.0; ///< R [J/(mol K)] of this equation
    std::shared_ptr<const IdealFunction> ideal;
    double mixingEntropy = 0.0; ///< −R Σ xᵢ ln xᵢ [J/(mol K)]
    std::shared_ptr<const Residual> residual;
    /// Above this density [mol/m³] the equation is not to be asked: the close end of every search for a density.
    double highestDensity = 0.0;
    /// Saturation of a pure fluid whose two-phase states are computed by the lever rule; else null.
    std::shared_ptr<const Saturation> saturation;
    /// Where the homogeneous fluid ends; null where nothing is known of it.
    std::shared_ptr<const PhaseBoundary> boundary;
};

/// State of the homogeneous fluid at T [K], v [m³/mol], whether or not it is what is there.
[[nodiscard]] MolarState homogeneousState(const Equation &equation, double temperature, double molarVolume);
/// The same for many states at once. All three of one length.
void homogeneousStates(const Equation &equation, std::span<const double> temperatures,
                       std::span<const double> molarVolumes, std::span<MolarState> results);

/// What a real gas is besides its equation.
struct RealGasFacts {
    std::string model; ///< key of the document: "reference"
    std::string name;
    Composition composition;
    double molarMass; ///< [kg/mol]
    Validity validity;
    std::string source; ///< one line
};

[[nodiscard]] GasPtr realGas(Equation equation, RealGasFacts facts);

} // namespace quasistat::gas
