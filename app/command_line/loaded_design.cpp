#include "app/command_line/loaded_design.h"

#include "core/document/edit.h"
#include "core/document/faults.h"
#include "core/document/file.h"
#include "core/document/interpret.h"

namespace quasistat::app
{

namespace
{

using document::Design;

/// `design` with one POINTER=VALUE put in.
Outcome<Design> withValue(const Design &design, const std::string &assignment)
{
    const std::size_t equals = assignment.find('=');
    if (equals == std::string::npos)
        return document::fault(Reason::syntax, "", "--set takes POINTER=VALUE, not “{0}”", {assignment});
    return document::valueSet(design, assignment.substr(0, equals), assignment.substr(equals + 1));
}

} // namespace

std::variant<LoadedDesign, ExitStatus> loadedDesign(const Options &options, std::string_view subcommand)
{
    if (options.operands().size() != 1)
        return wrongUsage(document::fault(Reason::missing, "",
                                          "{0} takes one file, “-” for standard input; {1} are given",
                                          {std::string(subcommand), std::to_string(options.operands().size())})
                              .message,
                          subcommand);
    LoadedDesign loaded;
    loaded.source.file = options.operands().front();
    const Outcome<std::string> text = document::fileText(loaded.source.file);
    if (!text) {
        complain(text.failure().message);
        return ExitStatus::unreadable;
    }
    loaded.source.text = *text;
    document::Position position;
    Outcome<Design> design = document::read(loaded.source.text, position);
    if (!design) {
        complain(loaded.source, position, design.failure(), {});
        return ExitStatus::wrongDocument;
    }
    for (const std::string &assignment : options.all("--set")) {
        Outcome<Design> changed = withValue(*design, assignment);
        if (!changed) return wrongUsage(changed.failure().message, subcommand);
        design = std::move(changed);
    }
    loaded.design = std::move(*design);
    loaded.units = document::displayUnits(loaded.design);
    return loaded;
}

std::variant<analysis::Evaluation, ExitStatus> evaluated(const LoadedDesign &loaded, const gas::Library &library)
{
    Outcome<analysis::Evaluation> evaluation = document::evaluate(loaded.design, library);
    if (evaluation) return std::move(*evaluation);
    complain(loaded.source, evaluation.failure(), loaded.units);
    return ExitStatus::wrongDocument;
}

bool complainedOfFailures(const LoadedDesign &loaded, const analysis::Evaluation &evaluation)
{
    bool complained = false;
    if (evaluation.path.startFailure) {
        complain(loaded.source, *evaluation.path.startFailure, loaded.units);
        complained = true;
    }
    for (const std::optional<Failure> &failure : evaluation.path.failures) {
        if (!failure || failure->reason == Reason::notReached) continue;
        complain(loaded.source, *failure, loaded.units);
        complained = true;
    }
    return complained;
}

} // namespace quasistat::app
