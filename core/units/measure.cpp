#include "core/units/measure.h"

#include "core/units/number_text.h"
#include "core/units/uncertainty_text.h"
#include "core/units/unit.h"

#include <cmath>

namespace quasistat::units
{

namespace
{

/// What a person could have written, for the sentence that says what would be right.
std::string_view exampleOf(Quantity quantity)
{
    switch (quantity) {
    case Quantity::number: return "1.3";
    case Quantity::pressure: return "8 bar";
    case Quantity::pressureDifference: return "0.2 bar";
    case Quantity::temperature: return "35 °C";
    case Quantity::temperatureDifference: return "5 K";
    case Quantity::volume: return "2.5 L";
    case Quantity::amount: return "0.85 mol";
    case Quantity::mass: return "120 g";
    case Quantity::molarMass: return "28.96 g/mol";
    case Quantity::energy: return "1.8 kJ";
    case Quantity::power: return "2 kW";
    case Quantity::entropy: return "5 J/K";
    case Quantity::molarEnergy: return "3 kJ/mol";
    case Quantity::molarEntropy: return "29 J/(mol K)";
    case Quantity::specificEntropy: return "1 kJ/(kg K)";
    case Quantity::frequency: return "600 1/min";
    case Quantity::stiffness: return "2e8 Pa/m3";
    case Quantity::length: return "50 mm";
    case Quantity::area: return "20 cm2";
    case Quantity::duration: return "10 s";
    case Quantity::speed: return "3 m/s";
    }
    return {};
}

Failure otherDimension(std::string_view text, Quantity quantity)
{
    // 25 C is a charge, 70 F a capacitance: what was meant is plain, but never guessed.
    const bool lacksDegree = quantity == Quantity::temperature && (text == "C" || text == "F" || text == "R");
    if (lacksDegree)
        return typingFailure(Reason::wrongType, "“{0}” is no unit of temperature; write “°{0}” or “deg{0}”",
                             {std::string(text)});
    return typingFailure(Reason::wrongType, "“{0}” is no unit of {1}; write for instance “{2}”",
                         {std::string(text), std::string(facts(quantity).words), std::string(exampleOf(quantity))});
}

Failure noUnit(std::string_view text, Quantity quantity)
{
    return typingFailure(Reason::syntax, "“{0}” has no unit; write for instance “{1}”",
                         {std::string(text), std::string(exampleOf(quantity))});
}

Failure unknownUnit(const Failure &failure, Quantity quantity)
{
    if (failure.reason == Reason::unreadable) return failure;
    Failure explained = failure;
    explained.message.text += "; write for instance “{1}”";
    explained.message.arguments.resize(1);
    explained.message.arguments.emplace_back(std::string(exampleOf(quantity)));
    return explained;
}

Failure notPositive(std::string_view text, Quantity quantity)
{
    return typingFailure(Reason::outOfRange, "“{0}” is not above absolute zero: no {1} can be that low",
                         {std::string(text), std::string(facts(quantity).words)});
}

bool mustBePositive(Quantity quantity)
{
    return quantity == Quantity::pressure || quantity == Quantity::temperature;
}

/// Unit and SI value of `measure`, whose number and unit text are set.
Outcome<Unit> unitOf(Measure &measure, double number)
{
    const Outcome<Unit> unit = unitFrom(measure.unit);
    if (!unit) return unknownUnit(unit.failure(), measure.quantity);
    if (!measures(*unit, measure.quantity)) return otherDimension(measure.unit, measure.quantity);
    const bool isDifference =
        measure.quantity == Quantity::temperatureDifference || measure.quantity == Quantity::pressureDifference;
    measure.value = number * unit->factor + (isDifference ? 0.0 : unit->offset);
    if (unit->gauge && measure.quantity == Quantity::pressure) measure.basis = Basis::gauge;
    if (measure.quantity == Quantity::amount && unit->siUnit == facts(Quantity::mass).unit)
        measure.basis = Basis::byMass;
    return unit;
}

Measure typedMeasure(Quantity quantity, std::string_view text, const TypedNumber &number)
{
    Measure measure;
    measure.quantity = quantity;
    measure.value = number.value;
    measure.text = trimmed(text);
    measure.number = number.text;
    return measure;
}

Outcome<Measure> withUncertainty(Measure measure, const SplitText &split, const Stated &stated)
{
    if (!split.uncertainty) return measure;
    const Outcome<Uncertainty> uncertainty = uncertaintyOf(*split.uncertainty, stated);
    if (!uncertainty) return uncertainty.failure();
    measure.uncertainty = *uncertainty;
    return measure;
}

} // namespace

Outcome<Measure> measured(std::string_view text, Quantity quantity)
{
    if (quantity == Quantity::number) return plainNumber(text);
    const SplitText split = splitAtUncertainty(text);
    const Outcome<TypedNumber> number = leadingNumber(split.value);
    if (!number) return number.failure();
    Measure measure = typedMeasure(quantity, text, *number);
    measure.unit = trimmed(split.value.substr(number->length));
    if (measure.unit.empty()) return noUnit(measure.text, quantity);
    const Outcome<Unit> unit = unitOf(measure, number->value);
    if (!unit) return unit.failure();
    if (!std::isfinite(measure.value))
        return typingFailure(Reason::outOfRange, "“{0}” is too large or too small a number", {measure.text});
    if (mustBePositive(quantity) && measure.basis == Basis::absolute && !(measure.value > 0.0))
        return notPositive(measure.text, quantity);
    return withUncertainty(std::move(measure), split, {.number = number->value, .unit = &*unit});
}

Outcome<Measure> plainNumber(std::string_view text)
{
    const SplitText split = splitAtUncertainty(text);
    const Outcome<TypedNumber> number = leadingNumber(split.value);
    if (!number) return number.failure();
    if (number->length != split.value.size())
        return typingFailure(Reason::syntax, "“{0}” is not a plain number such as “1.3”", {std::string(trimmed(text))});
    Measure measure = typedMeasure(Quantity::number, text, *number);
    return withUncertainty(std::move(measure), split, {.number = number->value, .unit = nullptr});
}

Outcome<double> siValue(const Measure &measure, const Conversion &conversion)
{
    switch (measure.basis) {
    case Basis::absolute: return measure.value;
    case Basis::byMass: return measure.value / conversion.molarMass;
    case Basis::gauge: break;
    }
    const double absolute = measure.value + conversion.surroundingsPressure;
    if (!(absolute > 0.0)) return notPositive(measure.text, measure.quantity);
    return absolute;
}

} // namespace quasistat::units
