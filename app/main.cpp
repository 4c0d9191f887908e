// The program: a subcommand runs without a display, anything else opens the window.

#include "app/command_line/streams.h"
#include "app/command_line/subcommands.h"
#include "ui/window/run_window.h"

#include <QApplication>

#include <exception>
#include <string>
#include <vector>

using namespace quasistat;

namespace
{

int exitCode(app::ExitStatus status)
{
    return static_cast<int>(status);
}

int window(int argc, char **argv)
{
    QApplication application(argc, argv);
    QApplication::setApplicationVersion(QStringLiteral(QUASISTAT_VERSION));
    const QStringList words = QApplication::arguments(); // without those that Qt takes for itself
    if (words.size() > 2)
        return exitCode(app::wrongUsage(
            {.text = "the window opens one file, not {0}", .arguments = {std::to_string(words.size() - 1)}}, ""));
    return ui::runWindow(application, words.value(1));
}

int run(int argc, char **argv)
{
    const std::vector<std::string> words{argv + 1, argv + argc};
    if (!words.empty() && app::isCommand(words.front())) return exitCode(app::commandLine(words));
    return window(argc, argv);
}

} // namespace

int main(int argc, char **argv)
{
    try {
        return run(argc, argv);
    } catch (const std::exception &error) {
        // Our own functions do not throw; memory may still run out.
        app::complain({.text = "{0}", .arguments = {std::string(error.what())}});
        return exitCode(app::ExitStatus::wrongDocument);
    }
}
