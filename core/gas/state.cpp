#include "core/gas/state.h"

#include <cassert>

namespace quasistat::gas
{

State::State(GasPtr gas, double amount, const MolarState &molar)
    : m_gas(std::move(gas)), m_amount(amount), m_volume(amount * molar.molarVolume), m_molar(molar)
{
    assert(m_gas && amount > 0.0);
}

State State::evacuated(GasPtr gas, double volume)
{
    State state;
    state.m_gas = std::move(gas);
    state.m_volume = volume;
    return state;
}

double State::internalEnergy() const
{
    return m_molar ? m_amount * m_molar->internalEnergy : 0.0;
}

double State::enthalpy() const
{
    return m_molar ? m_amount * m_molar->enthalpy : 0.0;
}

double State::entropy() const
{
    return m_molar ? m_amount * m_molar->entropy : 0.0;
}

std::optional<double> State::temperature() const
{
    if (!m_molar) return std::nullopt;
    return m_molar->temperature;
}

std::optional<double> State::compressibility() const
{
    if (!m_molar) return std::nullopt;
    return m_molar->pressure * m_molar->molarVolume / (m_gas->gasConstant() * m_molar->temperature);
}

} // namespace quasistat::gas
