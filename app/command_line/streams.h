#pragma once
// Standard output, written with every error noticed, and complaints on standard error.

#include "app/command_line/exit_status.h"
#include "core/document/design.h"
#include "core/units/display.h"

#include <string>
#include <string_view>

namespace quasistat::app
{

/// Writes `text` to standard output to the last byte; a complaint and ExitStatus::unwritable where that fails.
[[nodiscard]] ExitStatus printed(std::string_view text);

/// "quasistat: message" on standard error.
void complain(const Message &message);
/// The same, with a word on where help is; returns ExitStatus::wrongUsage.
[[nodiscard]] ExitStatus wrongUsage(const Message &message, std::string_view subcommand);

/// A document and where it came from, for messages that name line and column.
struct Source {
    std::string file;
    std::string text;
};
/// "FILE:LINE:COLUMN: POINTER: message" on standard error.
void complain(const Source &source, const Failure &failure, const units::DisplayUnits &units);
void complain(const Source &source, document::Position position, const Failure &failure,
              const units::DisplayUnits &units);

} // namespace quasistat::app
