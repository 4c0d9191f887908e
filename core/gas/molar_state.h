#pragma once
// The intensive state of a gas: per mole, with the derivatives that paths and solvers need.

#include <optional>

namespace quasistat::gas
{

/// Equilibrium state at (T, v). All energies and entropies on the common reference state: each component as ideal gas
/// at 298.15 K and 100 kPa has h = 0, s = 0; mixtures include the entropy of mixing.
struct MolarState {
    double temperature;                   ///< [K]
    double molarVolume;                   ///< [m³/mol]
    double pressure;                      ///< [Pa]
    double internalEnergy;                ///< [J/mol]
    double enthalpy;                      ///< [J/mol]
    double entropy;                       ///< [J/(mol K)]
    double isochoricHeatCapacity;         ///< c_v [J/(mol K)], of the equilibrium mixture under the dome
    double dpdT;                          ///< (∂p/∂T)_v [Pa/K]
    double dpdv;                          ///< (∂p/∂v)_T [Pa mol/m³]; 0 under the dome
    std::optional<double> vapourFraction; ///< moles of vapour per mole, 0–1; none outside the dome
};

/// Isobaric heat capacity [J/(mol K)]: c_v + T (∂p/∂T)_v² / −(∂p/∂v)_T. Infinite under the dome.
[[nodiscard]] double isobaricHeatCapacity(const MolarState &state);

/// Speed of sound [m/s]: w² = v²/M · (−(∂p/∂v)_T + T (∂p/∂T)_v² / c_v). `molarMass` [kg/mol].
[[nodiscard]] double speedOfSound(const MolarState &state, double molarMass);

} // namespace quasistat::gas
