#include "app/command_line/limit_text.h"
#include "app/command_line/loaded_design.h"
#include "app/command_line/subcommands.h"
#include "core/document/interpret.h"
#include "core/document/result_json.h"

namespace quasistat::app
{

namespace
{

using document::Json;
using units::Quantity;

std::string auditLine(std::size_t index, const path::SegmentResult &segment, const units::DisplayUnits &units)
{
    const std::string name = "segment " + std::to_string(index + 1);
    if (segment.audit.ok) return "audit agrees: " + name + "\n";
    return "audit FAILED: " + name + ": ΔU − W − Q is " +
           units::shown(segment.audit.firstLawResidual, Quantity::energy, units) + " of " +
           units::shown(segment.audit.scale, Quantity::energy, units) + "\n";
}

std::string findingsText(const analysis::Evaluation &evaluation, const units::DisplayUnits &units)
{
    std::string text;
    for (std::size_t i = 0; i < evaluation.path.segments.size(); ++i)
        text += auditLine(i, evaluation.path.segments[i], units);
    for (const analysis::Verdict &verdict : evaluation.verdicts) {
        const analysis::Limit &limit = evaluation.limits[verdict.limit];
        text += (verdict.ok ? "limit kept: " : "limit EXCEEDED: ") + limitText(limit, units) + "; worst " +
                verdictText(limit, verdict, units) + "\n";
    }
    for (const Warning &warning : evaluation.path.warnings)
        text += "warning: " + (warning.pointer.empty() ? std::string() : warning.pointer + ": ") +
                units::sentence(warning.message, units) + "\n";
    return text;
}

/// The parts of the result that check is about, and what could not be computed.
Json findingsJson(const LoadedDesign &design, const analysis::Evaluation &evaluation)
{
    const Json result = document::resultJson(design.design, evaluation, 0, QUASISTAT_VERSION);
    Json json = Json::object();
    json["quasistat_check"] = 1;
    Json &audits = json["audits"] = Json::array();
    for (const Json &segment : result.at("segments")) {
        Json audit = segment.at("audit");
        audit["segment"] = segment.at("segment");
        audits.push_back(std::move(audit));
    }
    json["limits"] = result.at("limits");
    json["warnings"] = result.at("warnings");
    Json &failures = json["failures"] = Json::array();
    for (const std::optional<Failure> &failure : evaluation.path.failures)
        if (failure)
            failures.push_back(
                {{"pointer", failure->pointer}, {"message", units::sentence(failure->message, design.units)}});
    return json;
}

} // namespace

ExitStatus check(const Options &options)
{
    const auto loaded = loadedDesign(options, "check");
    if (const ExitStatus *status = std::get_if<ExitStatus>(&loaded)) return *status;
    const LoadedDesign &design = std::get<LoadedDesign>(loaded);
    const gas::Library library;
    const auto computed = evaluated(design, library);
    if (const ExitStatus *status = std::get_if<ExitStatus>(&computed)) return *status;
    const analysis::Evaluation &evaluation = std::get<analysis::Evaluation>(computed);

    const bool failed = complainedOfFailures(design, evaluation);
    const ExitStatus status = printed(options.has("--json") ? findingsJson(design, evaluation).dump(2) + "\n"
                                                            : findingsText(evaluation, design.units));
    if (status != ExitStatus::done) return status;
    if (failed) return ExitStatus::wrongDocument;
    return evaluation.auditsAgree() && evaluation.envelopeHolds() ? ExitStatus::done : ExitStatus::failedCheck;
}

} // namespace quasistat::app
