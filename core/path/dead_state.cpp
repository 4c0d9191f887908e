#include "core/path/dead_state.h"

#include "core/gas/solve/solve.h"

#include <cmath>

namespace quasistat::path
{

using gas::Property;

Outcome<gas::MolarState> deadState(const gas::Gas &gas, const Surroundings &surroundings)
{
    return gas::stateFrom(gas, {Property::pressure, surroundings.pressure},
                          {Property::temperature, surroundings.temperature});
}

double availableWork(const gas::State &state, const gas::MolarState &dead, const Surroundings &surroundings)
{
    const double p0 = surroundings.pressure;
    if (state.isEvacuated()) return p0 * state.volume();
    const gas::MolarState &s = state.molar();
    return state.amount() * (s.internalEnergy - dead.internalEnergy + p0 * (s.molarVolume - dead.molarVolume) -
                             surroundings.temperature * (s.entropy - dead.entropy));
}

std::optional<StoredEnergy> storedEnergy(const gas::State &state, double surroundingsPressure)
{
    constexpr double rounding = 1e-12; // a charge at p₀ itself has a stored energy: none
    if (state.isEvacuated() || state.pressure() < surroundingsPressure * (1.0 - rounding)) return std::nullopt;
    const gas::MolarState &s = state.molar();
    const auto released =
        gas::stateFrom(state.gas(), {Property::entropy, s.entropy}, {Property::pressure, surroundingsPressure}, &s);
    if (!released) return std::nullopt;
    const double gamma = gas::idealHeatCapacityRatio(state.gas(), s.temperature);
    const double ratio = std::pow(surroundingsPressure / s.pressure, (gamma - 1.0) / gamma);
    return StoredEnergy{.ideal = s.pressure * state.volume() / (gamma - 1.0) * (1.0 - ratio),
                        .real = state.amount() * (s.internalEnergy - released->internalEnergy)};
}

} // namespace quasistat::path
