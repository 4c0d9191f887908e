#pragma once
// Options of one subcommand. A table says which there are; the rest of the words are operands.

#include "core/outcome/outcome.h"

#include <optional>
#include <span>
#include <string>
#include <string_view>
#include <vector>

namespace quasistat::app
{

struct OptionRule {
    std::string_view name;  ///< "--set", "-o"
    std::string_view value; ///< what it takes, as help shows it: "POINTER=VALUE"; empty: nothing
    std::string_view words; ///< help
    bool planned = false;   ///< part of the command line that this version does not have
};

struct GivenOption {
    std::string name;
    std::string value;
};

class Options
{
public:
    /// Reads `words` by `rules`: "--set VALUE" or "--set=VALUE"; "--" ends the options; "-" is an operand. Fails with
    /// Reason::unknownName, missing (a value), contradiction (a value where none is taken) or notComputed (planned).
    [[nodiscard]] static Outcome<Options> from(std::span<const std::string> words, std::span<const OptionRule> rules);

    [[nodiscard]] const std::vector<std::string> &operands() const { return m_operands; }
    [[nodiscard]] bool has(std::string_view name) const;
    [[nodiscard]] std::optional<std::string> last(std::string_view name) const; ///< the value given last
    [[nodiscard]] std::vector<std::string> all(std::string_view name) const;    ///< in the order given

private:
    std::vector<std::string> m_operands;
    std::vector<GivenOption> m_given;
};

} // namespace quasistat::app
