#include "app/command_line/options.h"

#include "core/document/faults.h"

#include <algorithm>

namespace quasistat::app
{

namespace
{

Failure unknownOption(std::string_view name, std::span<const OptionRule> rules)
{
    std::vector<std::string_view> names;
    for (const OptionRule &rule : rules)
        if (!rule.planned) names.push_back(rule.name);
    return document::unknownName("", "option of this subcommand", name, names);
}

} // namespace

Outcome<Options> Options::from(std::span<const std::string> words, std::span<const OptionRule> rules)
{
    Options options;
    bool optionsEnded = false;
    for (std::size_t i = 0; i < words.size(); ++i) {
        const std::string &word = words[i];
        if (optionsEnded || word.size() < 2 || word.front() != '-') {
            options.m_operands.push_back(word);
            continue;
        }
        if (word == "--") {
            optionsEnded = true;
            continue;
        }
        const std::size_t equals = word.starts_with("--") ? word.find('=') : std::string::npos;
        const std::string name = word.substr(0, equals);
        const auto rule = std::ranges::find(rules, name, &OptionRule::name);
        if (rule == rules.end()) return unknownOption(name, rules);
        if (rule->planned)
            return document::fault(Reason::notComputed, "", "{0}{1}{2}: not in this version",
                                   {name, std::string(rule->value.empty() ? "" : " "), std::string(rule->value)});
        std::string value;
        if (equals != std::string::npos) value = word.substr(equals + 1);
        if (rule->value.empty() && equals != std::string::npos)
            return document::fault(Reason::contradiction, "", "{0} takes no value", {name});
        if (!rule->value.empty() && equals == std::string::npos) {
            if (i + 1 == words.size())
                return document::fault(Reason::missing, "", "{0} needs a value: {1}", {name, std::string(rule->value)});
            value = words[++i];
        }
        options.m_given.push_back({name, std::move(value)});
    }
    return options;
}

bool Options::has(std::string_view name) const
{
    return std::ranges::find(m_given, name, &GivenOption::name) != m_given.end();
}

std::optional<std::string> Options::last(std::string_view name) const
{
    const std::vector<std::string> values = all(name);
    if (values.empty()) return std::nullopt;
    return values.back();
}

std::vector<std::string> Options::all(std::string_view name) const
{
    std::vector<std::string> values;
    for (const GivenOption &option : m_given)
        if (option.name == name) values.push_back(option.value);
    return values;
}

} // namespace quasistat::app
