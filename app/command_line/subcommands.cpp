#include "app/command_line/subcommands.h"

#include "app/command_line/streams.h"
#include "core/document/faults.h"

#include <algorithm>
#include <array>

namespace quasistat::app
{

namespace
{

constexpr OptionRule json{"--json", "", "write JSON, SI units, no rounding"};
constexpr OptionRule set{"--set", "POINTER=VALUE", "change a value of the document first; may be repeated"};

constexpr std::array computeOptions{
    json, set, OptionRule{"--curves", "N", "with --json: N states along each quasi-static segment"},
    OptionRule{"--csv", "", "", true}, OptionRule{"--xlsx", "OUT", "", true}};
constexpr std::array checkOptions{json, set};
constexpr std::array gasesOptions{json};
constexpr OptionRule output{"-o", "OUT", "the file to write"};
constexpr std::array reportOptions{output, OptionRule{"--paper", "SIZE", "A4 (default) or Letter"}, json, set};
constexpr std::array drawOptions{output, OptionRule{"--plane", "PLANE", "p-v"}, json, set};

constexpr std::array table{
    Subcommand{"compute", "FILE", "states, work and heat of every segment, totals", computeOptions, compute},
    Subcommand{"check", "FILE", "audit and envelope, one line per finding", checkOptions, check},
    Subcommand{"gases", "", "gas models and gases with their ranges and sources", gasesOptions, gases},
    Subcommand{"report", "FILE -o OUT", "the report as a PDF, the design attached", reportOptions, report},
    Subcommand{"draw", "FILE -o OUT", "the p–V diagram as .svg, .pdf or .png", drawOptions, draw},
    Subcommand{"sweep", "FILE", "", {}, nullptr},
    Subcommand{"solve", "FILE", "", {}, nullptr},
    Subcommand{"uncertainty", "FILE", "", {}, nullptr},
    Subcommand{"fit", "TRACE", "", {}, nullptr}};

std::string withBlank(std::string_view word)
{
    std::string text(word);
    if (!text.empty()) text.insert(0, 1, ' ');
    return text;
}

std::string helpText()
{
    std::string text = "quasistat [FILE]          opens the window\n";
    for (const Subcommand &subcommand : table) {
        if (!subcommand.run) continue;
        std::string call = "quasistat " + std::string(subcommand.name) + withBlank(subcommand.operands);
        call.resize(std::max<std::size_t>(call.size() + 2, 26), ' ');
        text += call + std::string(subcommand.words) + "\n";
    }
    return text +
           "quasistat SUBCOMMAND --help  its options\nquasistat --version\n\n"
           "FILE is a design (.qpath); “-” reads standard input. Exit status: 0 done, 1 a limit or an audit failed,\n"
           "64 wrong usage, 65 the document is wrong or cannot be computed, 66 input cannot be read,\n"
           "73 output cannot be written.\n";
}

std::string helpText(const Subcommand &subcommand)
{
    std::string text = "quasistat " + std::string(subcommand.name) + withBlank(subcommand.operands) + ": " +
                       std::string(subcommand.words) + "\n";
    for (const OptionRule &rule : subcommand.options) {
        if (rule.planned) continue;
        std::string option = "  " + std::string(rule.name) + withBlank(rule.value);
        option.resize(std::max<std::size_t>(option.size() + 2, 26), ' ');
        text += option + std::string(rule.words) + "\n";
    }
    return text;
}

const Subcommand *find(std::string_view name)
{
    const auto *const found = std::ranges::find(table, name, &Subcommand::name);
    return found == table.end() ? nullptr : found;
}

bool asksForHelp(std::span<const std::string> words)
{
    const auto end = std::ranges::find(words, "--");
    return std::any_of(words.begin(), end, [](const std::string &word) { return word == "--help" || word == "-h"; });
}

} // namespace

std::span<const Subcommand> subcommands()
{
    return table;
}

bool isCommand(std::string_view word)
{
    return word == "--help" || word == "-h" || word == "--version" || find(word) != nullptr;
}

ExitStatus commandLine(std::span<const std::string> words)
{
    const std::string &first = words.front();
    if (first == "--help" || first == "-h") return printed(helpText());
    if (first == "--version") return printed("quasistat " QUASISTAT_VERSION "\n");
    const Subcommand *subcommand = find(first);
    if (!subcommand)
        return wrongUsage(document::fault(Reason::unknownName, "", "“{0}” is no subcommand", {first}).message, "");
    if (!subcommand->run)
        return wrongUsage(document::fault(Reason::notComputed, "", "{0}: not in this version", {first}).message, "");
    const std::span<const std::string> rest = words.subspan(1);
    if (asksForHelp(rest)) return printed(helpText(*subcommand));
    const Outcome<Options> options = Options::from(rest, subcommand->options);
    if (!options) return wrongUsage(options.failure().message, subcommand->name);
    return subcommand->run(*options);
}

} // namespace quasistat::app
