#include "app/command_line/streams.h"

#include "core/document/faults.h"

#include <cerrno>
#include <cstdio>
#include <cstring>

namespace quasistat::app
{

namespace
{

void writeError(const std::string &line)
{
    // Nothing can be said about standard error failing.
    std::fwrite(line.data(), 1, line.size(), stderr);
}

} // namespace

ExitStatus printed(std::string_view text)
{
    errno = 0;
    const bool wrote = std::fwrite(text.data(), 1, text.size(), stdout) == text.size();
    if (wrote && std::fflush(stdout) == 0) return ExitStatus::done;
    complain(document::fault(Reason::unwritable, "", "standard output cannot be written: {0}",
                             {std::string(std::strerror(errno))})
                 .message);
    return ExitStatus::unwritable;
}

void complain(const Message &message)
{
    writeError("quasistat: " + units::sentence(message, {}) + "\n");
}

ExitStatus wrongUsage(const Message &message, std::string_view subcommand)
{
    complain(message);
    const std::string where = subcommand.empty() ? std::string() : std::string(subcommand) + " ";
    writeError("quasistat: `quasistat " + where + "--help` shows what it takes\n");
    return ExitStatus::wrongUsage;
}

void complain(const Source &source, const Failure &failure, const units::DisplayUnits &units)
{
    complain(source, document::positionOf(source.text, failure.pointer), failure, units);
}

void complain(const Source &source, document::Position position, const Failure &failure,
              const units::DisplayUnits &units)
{
    writeError(source.file + ":" + std::to_string(position.line) + ":" + std::to_string(position.column) + ": " +
               failure.pointer + ": " + units::sentence(failure.message, units) + "\n");
}

} // namespace quasistat::app
