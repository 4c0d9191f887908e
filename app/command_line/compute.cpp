#include "app/command_line/account_text.h"
#include "app/command_line/loaded_design.h"
#include "app/command_line/subcommands.h"
#include "core/document/faults.h"
#include "core/document/result_json.h"

#include <charconv>

namespace quasistat::app
{

namespace
{

constexpr int mostCurvePoints = 1000000;

/// The number of --curves, 0 without it.
Outcome<int> curvePoints(const Options &options)
{
    const std::optional<std::string> text = options.last("--curves");
    if (!text) return 0;
    if (!options.has("--json"))
        return document::fault(Reason::contradiction, "", "--curves adds to the result of --json: give both");
    int points = 0;
    const auto [end, error] = std::from_chars(text->data(), text->data() + text->size(), points);
    if (error != std::errc{} || end != text->data() + text->size() || points < 2 || points > mostCurvePoints)
        return document::fault(Reason::outOfRange, "", "--curves takes a whole number from 2 to {0}, not “{1}”",
                               {std::to_string(mostCurvePoints), *text});
    return points;
}

} // namespace

ExitStatus compute(const Options &options)
{
    const Outcome<int> points = curvePoints(options);
    if (!points) return wrongUsage(points.failure().message, "compute");
    const auto loaded = loadedDesign(options, "compute");
    if (const ExitStatus *status = std::get_if<ExitStatus>(&loaded)) return *status;
    const LoadedDesign &design = std::get<LoadedDesign>(loaded);
    const gas::Library library;
    const auto computed = evaluated(design, library);
    if (const ExitStatus *status = std::get_if<ExitStatus>(&computed)) return *status;
    const analysis::Evaluation &evaluation = std::get<analysis::Evaluation>(computed);
    // A path that stops half-way would read like a whole one: nothing on standard output then.
    if (complainedOfFailures(design, evaluation)) return ExitStatus::wrongDocument;

    const std::string text =
        options.has("--json")
            ? document::resultJson(design.design, evaluation, *points, QUASISTAT_VERSION).dump(2) + "\n"
            : accountText(design.design, evaluation, design.units);
    const ExitStatus status = printed(text);
    if (status != ExitStatus::done) return status;
    return evaluation.auditsAgree() ? ExitStatus::done : ExitStatus::failedCheck;
}

} // namespace quasistat::app
