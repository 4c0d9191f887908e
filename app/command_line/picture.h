#pragma once
// What draw and report share: a design made ready to be drawn without a display, and the picture written to its file.

#include "app/command_line/exit_status.h"
#include "app/command_line/loaded_design.h"
#include "ui/session/session.h"

#include <QByteArray>

#include <functional>

namespace quasistat::app
{

/// Makes a picture of the snapshot: the bytes of a file.
using Picture = std::function<Outcome<QByteArray>(const ui::Snapshot &)>;

/// Loads the one operand, evaluates it, makes the picture with the offscreen platform and writes it whole to the value
/// of -o. Complains where that fails. An audit that failed makes the status failedCheck; the picture is written all the
/// same.
[[nodiscard]] ExitStatus pictured(const Options &options, std::string_view subcommand, const Picture &picture);

} // namespace quasistat::app
