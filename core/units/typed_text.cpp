// Values back into text: what a field or a dragged handle writes into the document.

#include "core/units/measure.h"
#include "core/units/number_text.h"
#include "core/units/unit.h"

#include <fmt/format.h>

#include <charconv>
#include <cmath>
#include <cstdlib>

namespace quasistat::units
{

namespace
{

Failure noUnitOf(std::string_view unit, Quantity quantity)
{
    return typingFailure(Reason::wrongType, "“{0}” is no unit of {1}",
                         {std::string(unit), std::string(facts(quantity).words)});
}

bool isDifference(Quantity quantity)
{
    return quantity == Quantity::pressureDifference || quantity == Quantity::temperatureDifference;
}

/// Typed value of 0 in SI, and SI units per typed unit.
struct Axis {
    double factor;
    double zero;
    [[nodiscard]] double typed(double value) const { return (value - zero) / factor; }
};

Outcome<Axis> axisOf(Quantity quantity, std::string_view text, double surroundingsPressure)
{
    if (quantity == Quantity::number && trimmed(text).empty()) return Axis{1.0, 0.0};
    const Outcome<Unit> unit = unitFrom(text);
    if (!unit) return unit.failure();
    if (unit->siUnit != facts(quantity).unit) return noUnitOf(text, quantity);
    const double gauge = unit->gauge ? surroundingsPressure : 0.0;
    return Axis{unit->factor, isDifference(quantity) ? 0.0 : unit->offset + gauge};
}

/// The value of a number as printed here, whatever the desktop's decimal sign is.
double parsed(const std::string &number)
{
    double value = 0.0;
    std::from_chars(number.data(), number.data() + number.size(), value);
    return value;
}

/// `value` at `digits` significant digits, plain decimal where that stays short.
std::string decimalText(double value, int digits)
{
    const std::string scientific = fmt::format("{:.{}e}", value, digits - 1);
    const int exponent = std::atoi(scientific.c_str() + scientific.find('e') + 1);
    if (value != 0.0 && (exponent < -6 || exponent > 12)) {
        std::string mantissa = scientific.substr(0, scientific.find('e'));
        if (mantissa.find('.') != std::string::npos) mantissa.erase(mantissa.find_last_not_of('0') + 1);
        if (mantissa.ends_with('.')) mantissa.pop_back();
        return fmt::format("{}e{}", mantissa, exponent);
    }
    std::string text = fmt::format("{:.{}f}", parsed(scientific), std::max(0, digits - 1 - exponent));
    if (text.find('.') != std::string::npos) text.erase(text.find_last_not_of('0') + 1);
    if (text.ends_with('.')) text.pop_back();
    return text == "-0" ? "0" : text;
}

} // namespace

Outcome<double> inUnit(double value, Quantity quantity, std::string_view unit, double surroundingsPressure)
{
    const Outcome<Axis> axis = axisOf(quantity, unit, surroundingsPressure);
    if (!axis) return axis.failure();
    return axis->typed(value);
}

Outcome<std::string> typedIn(double value, Quantity quantity, std::string_view unit, double surroundingsPressure,
                             int significantDigits)
{
    const Outcome<Axis> axis = axisOf(quantity, unit, surroundingsPressure);
    if (!axis) return axis.failure();
    const double typed = axis->typed(value);
    if (!std::isfinite(typed))
        return typingFailure(Reason::outOfRange, "the value is too large for “{0}”", {std::string(unit)});
    // Digits count from the quantity itself, not from the zero of °C or of a gauge: 0.01 °C is not four digits of
    // 273.16 K.
    const double magnitude = std::abs(value / axis->factor);
    const double tolerance =
        magnitude > 0.0 ? 0.5 * std::pow(10.0, std::floor(std::log10(magnitude)) + 1 - significantDigits) : 0.0;
    std::string number = decimalText(typed, 17);
    if (std::abs(typed) <= tolerance) number.assign(1, '0');
    for (int digits = 1; digits < 17 && number != "0"; ++digits) {
        const std::string shorter = decimalText(typed, digits);
        if (std::abs(parsed(shorter) - typed) <= tolerance * (1.0 + 1e-12)) {
            number = shorter;
            break;
        }
    }
    const std::string_view name = trimmed(unit);
    return name.empty() ? number : number + " " + std::string(name);
}

} // namespace quasistat::units
