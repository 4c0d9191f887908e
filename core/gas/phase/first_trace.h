#pragma once
// First traces of a second phase, where they are easily found: a liquid in the thin mixture, a bubble in the cold one.

#include "core/gas/phase/incipient_phase.h"

#include <optional>
#include <vector>

namespace quasistat::gas
{

/// Every incipient liquid found in the thin mixture: one for most mixtures, more where liquids do not mix (water beside
/// oil). Each is a solution of `phase`'s equations at the same temperature, near the Raoult dew point of a density of a
/// thousandth of close packing (or less, where none is found there). Vapour pressures for the first guess: G. M. Wilson
/// (1968), ln(p/p_c) = 5.373 (1 + ω)(1 − T_c/T). Empty where no liquid was found.
[[nodiscard]] std::vector<IncipientState> firstTraces(const Fugacities &fugacities, IncipientPhase &phase);

/// The bubble of the cold liquid, at 0.4 to 0.7 of the mean critical temperature; none where no liquid stands under the
/// pressure of its own ideal vapour (mixtures with much hydrogen or helium).
[[nodiscard]] std::optional<IncipientState> firstBubble(const Fugacities &fugacities, IncipientPhase &phase);

/// The trace that takes over where one ends in a cusp, `end`: another phase has begun to form before that, so that a
/// third coexists with both. Found by letting the trace slide to where it is stable a little beyond the cusp, and then
/// warming the mixture until it only just forms. None where that leads to no other phase.
[[nodiscard]] std::optional<IncipientState> traceBeyond(const Fugacities &fugacities, IncipientPhase &phase,
                                                        const IncipientState &end);

} // namespace quasistat::gas
