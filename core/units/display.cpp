#include "core/units/display.h"

#include "core/units/prefix_family.h"
#include "core/units/unit.h"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <optional>

namespace quasistat::units
{

namespace
{

constexpr std::string_view minusSign = "\u2212";
constexpr std::string_view narrowBlank = "\u202F";
constexpr int columnDigits = 5;
constexpr int singleDigits = 4;
// Beyond these a number in a fixed unit is counted, not read.
constexpr double leastReadable = 1e-3;
constexpr double mostReadable = 1e7;

double largestOf(std::span<const double> values)
{
    double largest = 0.0;
    for (const double value : values)
        if (std::isfinite(value)) largest = std::max(largest, std::abs(value));
    return largest;
}

/// Decimals that show `largest` (in the unit shown) with `digits` significant digits, rounding included: 9.99996
/// is 10.000.
int decimalsFor(double largest, int digits)
{
    if (!(largest > 0.0)) return digits - 2;
    const std::string scientific = fmt::format("{:.{}e}", largest, digits - 1);
    const int exponent = std::atoi(scientific.c_str() + scientific.find('e') + 1);
    return std::clamp(digits - 1 - exponent, 0, 12);
}

std::string superscript(int number)
{
    constexpr std::array<std::string_view, 10> signs{"⁰", "¹", "²", "³", "⁴", "⁵", "⁶", "⁷", "⁸", "⁹"};
    std::string text = number < 0 ? "⁻" : "";
    for (const char digit : std::to_string(std::abs(number))) text += signs[static_cast<std::size_t>(digit - '0')];
    return text;
}

/// `scale` with a power of ten taken into its unit, so that `largest` [SI] becomes a figure of one to three places.
Scale withPowerOfTen(Scale scale, double largest, int digits)
{
    const double logarithm = std::log10(largest) + std::log10(scale.factor);
    const int exponent = 3 * static_cast<int>(std::floor(logarithm / 3.0));
    scale.unit = "×10" + superscript(exponent) + (scale.unit.empty() ? "" : std::string(narrowBlank) + scale.unit);
    // In two steps: 10^−exponent alone can overflow where the product does not.
    scale.factor = scale.factor * std::pow(10.0, -exponent / 3) * std::pow(10.0, -exponent / 3) *
                   std::pow(10.0, -exponent - 2 * (-exponent / 3));
    scale.offset = 0.0;
    const double shown = largest * scale.factor;
    scale.decimals = std::isfinite(shown) ? decimalsFor(shown, digits) : digits - 1;
    return scale;
}

bool isReadable(double shown)
{
    return shown == 0.0 || (shown >= leastReadable && shown < mostReadable);
}

Scale fromFamily(Quantity quantity, double largest, int digits)
{
    const std::span<const PrefixedUnit> family = prefixFamily(quantity);
    const double everyday = quantity == Quantity::pressure ? 1e5 : 1.0;
    // Nothing to choose by: the unit of an everyday figure.
    const double magnitude = largest > 0.0 ? largest : everyday;
    const PrefixedUnit *chosen = &family.front();
    for (const PrefixedUnit &unit : family)
        if (magnitude >= unit.least) chosen = &unit;
    Scale scale{.unit = std::string(chosen->unit), .factor = 1.0 / chosen->factor};
    const double shown = largest * scale.factor;
    scale.decimals = decimalsFor(shown, digits);
    return isReadable(shown) ? scale : withPowerOfTen(scale, largest, digits);
}

/// The unit a design states for `quantity`; empty where the program chooses.
std::string_view statedUnit(Quantity quantity, const DisplayUnits &units)
{
    switch (quantity) {
    case Quantity::pressure:
    case Quantity::pressureDifference: return units.pressure;
    case Quantity::volume: return units.volume;
    case Quantity::temperature:
    case Quantity::temperatureDifference: return units.temperature.empty() ? std::string_view("°C") : units.temperature;
    case Quantity::energy: return units.energy;
    default: return {};
    }
}

Scale temperatureScale(const Unit &unit, std::string_view name, double largest)
{
    Scale scale{
        .unit = printedUnit(name), .factor = 1.0 / unit.factor, .offset = -unit.offset / unit.factor, .decimals = 2};
    if (std::abs(largest * scale.factor) >= 2e3) scale.decimals = 1;
    if (!isReadable(largest * scale.factor)) return withPowerOfTen({.unit = "K"}, largest, columnDigits);
    return scale;
}

/// A temperature difference never takes the degree sign of a scale with an offset; °F keeps its size of degree.
Scale differenceScale(const Unit &unit, double largest, int digits)
{
    const bool fahrenheit = unit.factor != 1.0;
    Scale scale{.unit = fahrenheit ? "°R" : "K", .factor = 1.0 / unit.factor};
    scale.decimals = decimalsFor(largest * scale.factor, digits);
    return isReadable(largest * scale.factor) ? scale : withPowerOfTen(scale, largest, digits);
}

std::string withoutGauge(std::string_view name)
{
    for (const std::string_view suffix : {std::string_view("(g)"), std::string_view("(a)")})
        if (name.ends_with(suffix)) return std::string(name.substr(0, name.size() - suffix.size()));
    if (name == "barg" || name == "bara" || name == "psig" || name == "psia" || name == "mbarg" || name == "kPag" ||
        name == "MPag")
        return std::string(name.substr(0, name.size() - 1));
    return std::string(name);
}

std::optional<Scale> inStatedUnit(Quantity quantity, double largest, const DisplayUnits &units, int digits)
{
    std::string name(statedUnit(quantity, units));
    if (name.empty()) return std::nullopt;
    if (quantity == Quantity::pressureDifference) name = withoutGauge(name);
    const Outcome<Unit> unit = unitFrom(name);
    if (!unit || unit->siUnit != facts(quantity).unit) return std::nullopt;
    if (quantity == Quantity::temperature) return temperatureScale(*unit, name, largest);
    if (quantity == Quantity::temperatureDifference) return differenceScale(*unit, largest, digits);

    Scale scale{.unit = printedUnit(name), .factor = 1.0 / unit->factor};
    if (unit->gauge && quantity == Quantity::pressure) scale.offset = -units.surroundingsPressure / unit->factor;
    scale.decimals = decimalsFor(largest * scale.factor, digits);
    if (isReadable(largest * scale.factor)) return scale;
    if (unit->gauge)
        return std::nullopt; // so far off that the surroundings' pressure no longer matters, or is all there is
    return prefixFamily(quantity).empty() ? withPowerOfTen(scale, largest, digits)
                                          : fromFamily(quantity, largest, digits);
}

Scale chosenScale(Quantity quantity, double largest, const DisplayUnits &units, int digits)
{
    if (const std::optional<Scale> stated = inStatedUnit(quantity, largest, units, digits)) return *stated;
    if (!prefixFamily(quantity).empty()) return fromFamily(quantity, largest, digits);
    const Scale plain{.unit = quantity == Quantity::number ? "" : "K", .decimals = decimalsFor(largest, digits)};
    return isReadable(largest) ? plain : withPowerOfTen(plain, largest, digits);
}

} // namespace

Scale scaleFor(Quantity quantity, std::span<const double> values, const DisplayUnits &units)
{
    return chosenScale(quantity, largestOf(values), units, columnDigits);
}

std::string digits(double value, const Scale &scale)
{
    if (!std::isfinite(value)) return "–";
    const double shown = value * scale.factor + scale.offset;
    if (!std::isfinite(shown)) return "–";
    std::string text = fmt::format("{:.{}f}", shown, scale.decimals);
    if (!text.starts_with('-')) return text;
    text.erase(0, 1);
    const bool isZero = text.find_first_not_of("0.") == std::string::npos;
    return isZero ? text : std::string(minusSign) + text;
}

std::string shown(double value, Quantity quantity, const DisplayUnits &units)
{
    const double magnitude = std::isfinite(value) ? std::abs(value) : 0.0;
    const Scale scale = chosenScale(quantity, magnitude, units, singleDigits);
    const std::string number = digits(value, scale);
    return scale.unit.empty() ? number : number + std::string(narrowBlank) + scale.unit;
}

std::string sentence(const Message &message, const DisplayUnits &units)
{
    std::string text;
    for (std::size_t i = 0; i < message.text.size(); ++i) {
        const std::size_t close = message.text[i] == '{' ? message.text.find('}', i) : std::string::npos;
        std::size_t index = message.arguments.size();
        if (close != std::string::npos && close == i + 2 && message.text[i + 1] >= '0' && message.text[i + 1] <= '9')
            index = static_cast<std::size_t>(message.text[i + 1] - '0');
        if (index >= message.arguments.size()) {
            text += message.text[i];
            continue;
        }
        if (const Figure *figure = std::get_if<Figure>(&message.arguments[index]))
            text += shown(figure->value, figure->quantity, units);
        else
            text += std::get<std::string>(message.arguments[index]);
        i = close;
    }
    return text;
}

} // namespace quasistat::units
