#pragma once
// The state of a charge: an amount of a gas in a volume. An immutable value; evacuated is a state too.

#include "core/gas/gas.h"

namespace quasistat::gas
{

class State
{
public:
    /// `amount` [mol] > 0 of `gas` in the intensive state `molar`.
    State(GasPtr gas, double amount, const MolarState &molar);
    /// A volume [m³] ≥ 0 with no gas in it. `gas` says which model will enter.
    [[nodiscard]] static State evacuated(GasPtr gas, double volume);

    [[nodiscard]] bool isEvacuated() const { return !m_molar; }
    [[nodiscard]] const Gas &gas() const { return *m_gas; }
    [[nodiscard]] const GasPtr &sharedGas() const { return m_gas; }
    /// Precondition: not evacuated.
    [[nodiscard]] const MolarState &molar() const { return *m_molar; }

    [[nodiscard]] double amount() const { return m_amount; }                            ///< [mol]
    [[nodiscard]] double mass() const { return m_amount * m_gas->molarMass(); }         ///< [kg]
    [[nodiscard]] double volume() const { return m_volume; }                            ///< [m³]
    [[nodiscard]] double pressure() const { return m_molar ? m_molar->pressure : 0.0; } ///< [Pa]
    [[nodiscard]] double internalEnergy() const;                                        ///< U [J], whole charge
    [[nodiscard]] double enthalpy() const;                                              ///< H [J]
    [[nodiscard]] double entropy() const;                                               ///< S [J/K]
    [[nodiscard]] std::optional<double> temperature() const;                            ///< [K]; none if evacuated
    [[nodiscard]] std::optional<double> compressibility() const; ///< p v/(R T); none if evacuated

private:
    State() = default;
    GasPtr m_gas;
    double m_amount = 0.0;
    double m_volume = 0.0;
    std::optional<MolarState> m_molar;
};

} // namespace quasistat::gas
