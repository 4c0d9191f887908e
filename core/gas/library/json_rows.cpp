#include "core/gas/library/json_rows.h"

namespace quasistat::gas
{

std::string joinedLines(const Json &lines)
{
    std::string text;
    for (const Json &line : lines) text += (text.empty() ? "" : "; ") + line.get<std::string>();
    return text;
}

std::string uncertaintyFrom(const Json &equation)
{
    if (!equation.contains("uncertainty")) return {};
    const Json &uncertainty = equation.at("uncertainty");
    return uncertainty.at("text").get<std::string>() + " (" + uncertainty.at("source").get<std::string>() + ")";
}

} // namespace quasistat::gas
