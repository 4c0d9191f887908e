#include "app/command_line/limit_text.h"

namespace quasistat::app
{

namespace
{

using analysis::LimitQuantity;
using units::Quantity;

struct LimitWords {
    Quantity quantity;
    std::string_view words;
};

LimitWords wordsOf(LimitQuantity quantity)
{
    switch (quantity) {
    case LimitQuantity::pressure: return {Quantity::pressure, "pressure"};
    case LimitQuantity::volume: return {Quantity::volume, "volume"};
    case LimitQuantity::temperature: return {Quantity::temperature, "temperature"};
    case LimitQuantity::pressureRatio: return {Quantity::number, "pressure ratio"};
    case LimitQuantity::work: return {Quantity::energy, "work into the gas"};
    case LimitQuantity::heat: return {Quantity::energy, "heat into the gas"};
    case LimitQuantity::amount: return {Quantity::amount, "amount"};
    case LimitQuantity::storedEnergy: return {Quantity::energy, "stored energy"};
    }
    return {Quantity::number, ""};
}

std::string placeText(const analysis::Verdict &verdict)
{
    std::string text;
    if (verdict.state > 0) text += " at state " + std::to_string(verdict.state);
    if (verdict.segment > 0)
        text += std::string(verdict.state > 0 ? "," : " on") + " segment " + std::to_string(verdict.segment);
    return text;
}

} // namespace

std::string limitText(const analysis::Limit &limit, const units::DisplayUnits &units)
{
    const LimitWords words = wordsOf(limit.quantity);
    std::string text = limit.label.empty() ? std::string() : limit.label + ": ";
    if (limit.min) text += units::shown(*limit.min, words.quantity, units) + " ≤ ";
    text += words.words;
    if (limit.max) text += " ≤ " + units::shown(*limit.max, words.quantity, units);
    for (std::size_t i = 0; i < limit.maxAt.size(); ++i)
        text += std::string(i == 0 ? " ≤ " : ", ") + units::shown(limit.maxAt[i].pressure, Quantity::pressure, units) +
                " at " + units::shown(limit.maxAt[i].temperature, Quantity::temperature, units);
    return text;
}

std::string verdictText(const analysis::Limit &limit, const analysis::Verdict &verdict,
                        const units::DisplayUnits &units)
{
    if (!verdict.worst) return "nothing to check";
    const Quantity quantity = wordsOf(limit.quantity).quantity;
    std::string text = units::shown(*verdict.worst, quantity, units) + placeText(verdict);
    if (!verdict.ok && verdict.worstAllowed)
        text += ", where " + units::shown(*verdict.worstAllowed, quantity, units) + " is allowed";
    return text;
}

} // namespace quasistat::app
