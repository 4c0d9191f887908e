// The program: a subcommand runs without a display, anything else opens the window.

#include "app/command_line/streams.h"
#include "app/command_line/subcommands.h"

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

int run(const std::vector<std::string> &words)
{
    if (words.empty() || !app::isCommand(words.front()))
        return exitCode(app::wrongUsage({.text = "the window is not in this version", .arguments = {}}, ""));
    return exitCode(app::commandLine(words));
}

} // namespace

int main(int argc, char **argv)
{
    try {
        return run({argv + 1, argv + argc});
    } catch (const std::exception &error) {
        // Our own functions do not throw; memory may still run out.
        app::complain({.text = "{0}", .arguments = {std::string(error.what())}});
        return exitCode(app::ExitStatus::wrongDocument);
    }
}
