#pragma once
// The start of the window, for the program.

#include <QApplication>
#include <QString>

namespace quasistat::ui
{

/// Shows the window with `file` open (empty: the welcome page) and runs until it is closed. Answers with the exit
/// status.
int runWindow(QApplication &application, const QString &file);

} // namespace quasistat::ui
