#include "app/command_line/picture.h"

#include "app/command_line/streams.h"
#include "core/document/file.h"

#include <QApplication>

#include <cstdlib>

namespace quasistat::app
{

namespace
{

ExitStatus written(const Options &options, std::string_view subcommand, const std::string &file,
                   const QByteArray &bytes)
{
    const std::string_view view(bytes.constData(), static_cast<std::size_t>(bytes.size()));
    const auto result = document::writeWhole(file, view);
    if (!result) {
        complain(result.failure().message);
        return ExitStatus::unwritable;
    }
    if (!options.has("--json")) return ExitStatus::done;
    const document::Json json{{"quasistat_" + std::string(subcommand), 1}, {"written", file}};
    return printed(json.dump(2) + "\n");
}

} // namespace

ExitStatus pictured(const Options &options, std::string_view subcommand, const Picture &picture)
{
    const auto output = options.last("-o");
    if (!output) return wrongUsage({.text = "say where to write it: -o OUT", .arguments = {}}, subcommand);
    const auto loaded = loadedDesign(options, subcommand);
    if (const ExitStatus *status = std::get_if<ExitStatus>(&loaded)) return *status;
    const LoadedDesign &design = std::get<LoadedDesign>(loaded);
    const gas::Library library;
    auto computed = evaluated(design, library);
    if (const ExitStatus *status = std::get_if<ExitStatus>(&computed)) return *status;
    auto evaluation = std::make_shared<const analysis::Evaluation>(std::move(std::get<analysis::Evaluation>(computed)));
    if (complainedOfFailures(design, *evaluation)) return ExitStatus::wrongDocument;

    // Drawing needs fonts and a paint engine, but no display.
    setenv("QT_QPA_PLATFORM", "offscreen", 0);
    int count = 1;
    char name[] = "quasistat";
    char *words[] = {name, nullptr};
    const QApplication application(count, words);
    const auto bytes = picture({design.design, evaluation, std::nullopt, design.units});
    if (!bytes) {
        complain(design.source, bytes.failure(), design.units);
        return ExitStatus::wrongDocument;
    }
    const ExitStatus status = written(options, subcommand, *output, *bytes);
    if (status != ExitStatus::done) return status;
    return evaluation->auditsAgree() ? ExitStatus::done : ExitStatus::failedCheck;
}

} // namespace quasistat::app
