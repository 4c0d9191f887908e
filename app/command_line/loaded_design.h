#pragma once
// A document read from a file, with the values of --set put in, and its evaluation.

#include "app/command_line/options.h"
#include "app/command_line/streams.h"
#include "core/analysis/evaluation.h"
#include "core/gas/library/library.h"

#include <variant>

namespace quasistat::app
{

struct LoadedDesign {
    Source source;
    document::Design design;
    units::DisplayUnits units;
};

/// Reads the one operand of `options` and applies every --set in order. What went wrong has been complained about
/// already; then the status is given instead.
[[nodiscard]] std::variant<LoadedDesign, ExitStatus> loadedDesign(const Options &options, std::string_view subcommand);

/// Evaluates; a document that cannot be computed as a whole is complained about. Faults of single segments stay inside
/// the evaluation.
[[nodiscard]] std::variant<analysis::Evaluation, ExitStatus> evaluated(const LoadedDesign &loaded,
                                                                       const gas::Library &library);

/// Complains about every fault of a segment that is not merely the consequence of an earlier one; true if there was
/// any.
[[nodiscard]] bool complainedOfFailures(const LoadedDesign &loaded, const analysis::Evaluation &evaluation);

} // namespace quasistat::app
