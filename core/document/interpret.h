#pragma once
// From the document to what is computed: kinds, quantities and references checked, everything in SI.

#include "core/analysis/evaluation.h"
#include "core/document/design.h"
#include "core/gas/library/library.h"
#include "core/units/display.h"

namespace quasistat::document
{

/// What a design says, as far as it can be computed.
struct Interpretation {
    path::PathInput input;
    std::vector<analysis::Limit> limits;
    std::vector<Warning> warnings; ///< unknown keys, normalised fractions, …
};

/// Fails where nothing can be computed (version, gas, start, surroundings, limits, a key that affects all results and
/// is not computed by this version). A fault in a segment fails that segment alone: it stays in its place in
/// `input.segments`. Every pointer is into the document.
[[nodiscard]] Outcome<Interpretation> interpret(const Design &design, const gas::Library &library);

/// interpret, then evaluate; the interpretation's warnings come first in the path's.
[[nodiscard]] Outcome<analysis::Evaluation> evaluate(const Design &design, const gas::Library &library);

/// The first failure of an evaluation in document order, or none: what makes `compute` exit with 65.
[[nodiscard]] std::optional<Failure> firstFailure(const analysis::Evaluation &evaluation);

/// Units for display, from what the user typed in `start` and `surroundings` ("view/units" wins where it is stated).
[[nodiscard]] units::DisplayUnits displayUnits(const Design &design);

} // namespace quasistat::document
