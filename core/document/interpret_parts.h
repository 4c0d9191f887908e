#pragma once
// The parts of a document, each read by a function of its own. All pointers are into the whole document.

#include "core/analysis/envelope.h"
#include "core/document/fields.h"
#include "core/document/known_gases.h"
#include "core/gas/library/cubic_gas.h"
#include "core/gas/library/library.h"
#include "core/path/input.h"

namespace quasistat::document
{

using Warnings = std::vector<Warning>;

[[nodiscard]] Outcome<gas::GasPtr> gasFrom(const Place &place, const gas::Library &library, Warnings &warnings);

/// `peng-robinson` and `soave-redlich-kwong`, a user's own gases included.
[[nodiscard]] Outcome<gas::GasPtr> cubicFrom(const Fields &fields, gas::CubicForm form, const gas::Library &library,
                                             Warnings &warnings);

/// A composition by mole fractions or by mass, sorted by name, fractions summing to 1 (Reason::contradiction where they
/// are further from it than 1e-4; normalised with a warning else).
enum class FractionBasis { amount, mass };
/// `gases`: what the names mean.
[[nodiscard]] Outcome<gas::Composition> compositionFrom(const Place &place, FractionBasis basis,
                                                        const KnownGases &gases, Warnings &warnings);
/// A composition and the place it stands at.
struct PlacedComposition {
    Place place;
    gas::Composition composition;
};
/// `composition` or `composition_by_mass` of a gas, whichever is there. Fails with Reason::contradiction where both
/// are.
[[nodiscard]] Outcome<PlacedComposition> mixtureFrom(const Fields &fields, const KnownGases &gases, Warnings &warnings);
/// "air", the single component's name, else "nitrogen 0.70, oxygen 0.30" with the largest share first.
[[nodiscard]] std::string mixtureName(const gas::Composition &composition);

/// Absent: the default of the format.
[[nodiscard]] Outcome<path::Surroundings> surroundingsFrom(const std::optional<Place> &place, Warnings &warnings);

[[nodiscard]] Outcome<path::Start> startFrom(const Place &place, const units::Conversion &conversion,
                                             Warnings &warnings);

/// The segment with index `index` from 0; `conversion` for gauge pressures.
[[nodiscard]] Outcome<path::Segment> segmentFrom(const Place &place, std::size_t index,
                                                 const units::Conversion &conversion, Warnings &warnings);

/// Where a segment of `process` ends. `statesReached`: states 1 to this one exist when the segment begins.
[[nodiscard]] Outcome<path::End> endFrom(const Fields &segment, const path::Process &process, int statesReached,
                                         const units::Conversion &conversion, Warnings &warnings);

/// "@3" → 3; none for other text. Fails with Reason::outOfRange where the state is not reached, syntax for "@x".
[[nodiscard]] Outcome<std::optional<path::SameAs>> referenceFrom(const Place &place, int statesReached);

[[nodiscard]] Outcome<std::vector<analysis::Limit>> limitsFrom(const Place &place, const units::Conversion &conversion,
                                                               Warnings &warnings);

} // namespace quasistat::document
