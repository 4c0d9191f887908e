#pragma once
// What a charge could still do against the surroundings: available work and stored energy.

#include "core/path/input.h"
#include "core/path/result.h"

namespace quasistat::path
{

/// The gas at the pressure and temperature of the surroundings.
[[nodiscard]] Outcome<gas::MolarState> deadState(const gas::Gas &gas, const Surroundings &surroundings);

/// (U − U₀) + p₀ (V − V₀) − T₀ (S − S₀) [J]; p₀ V for an evacuated volume. `dead` is of the same gas.
[[nodiscard]] double availableWork(const gas::State &state, const gas::MolarState &dead,
                                   const Surroundings &surroundings);

/// Work of an isentropic release to the surroundings' pressure, U₁ − U(s₁, p₀) [J], without taking off p₀ ΔV: `real`
/// with the gas's own equation, `ideal` in closed form p V/(γ − 1) · (1 − (p₀/p)^((γ−1)/γ)) with γ of the ideal part at
/// the state's temperature (the form ASME PCC-2 uses for pneumatic tests). None below p₀, evacuated, or where the
/// release leaves the model.
[[nodiscard]] std::optional<StoredEnergy> storedEnergy(const gas::State &state, double surroundingsPressure);

} // namespace quasistat::path
