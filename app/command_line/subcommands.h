#pragma once
// The subcommands: one table that dispatch and help read.

#include "app/command_line/exit_status.h"
#include "app/command_line/options.h"

#include <span>
#include <string>
#include <string_view>

namespace quasistat::app
{

struct Subcommand {
    std::string_view name;
    std::string_view operands; ///< as help shows them: "FILE"
    std::string_view words;    ///< what it does
    std::span<const OptionRule> options;
    ExitStatus (*run)(const Options &options); ///< null: part of the command line that this version does not have
};

[[nodiscard]] std::span<const Subcommand> subcommands();

/// Runs `words`, the first of them the name of a subcommand, --help or --version.
[[nodiscard]] ExitStatus commandLine(std::span<const std::string> words);

/// `word` belongs to the command line; anything else is a file for the window.
[[nodiscard]] bool isCommand(std::string_view word);

[[nodiscard]] ExitStatus compute(const Options &options);
[[nodiscard]] ExitStatus check(const Options &options);
[[nodiscard]] ExitStatus gases(const Options &options);
[[nodiscard]] ExitStatus report(const Options &options);
[[nodiscard]] ExitStatus draw(const Options &options);

} // namespace quasistat::app
