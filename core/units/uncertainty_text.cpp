#include "core/units/uncertainty_text.h"

#include "core/units/number_text.h"

#include <cmath>

namespace quasistat::units
{

namespace
{

Failure notAnUncertainty(std::string_view text)
{
    return typingFailure(Reason::syntax,
                         "“{0}” is not an uncertainty; write for instance “± 0.1 bar”, “± 1 %” or “± 0.5 % FS 250 bar”",
                         {std::string(text)});
}

/// Divisor from what was stated to a standard uncertainty, and the text in front of the parenthesis (JCGM
/// 100:2008, 4.3.3, 4.3.7, 4.3.9: coverage factor, half-width of a rectangular and of a triangular distribution).
struct Coverage {
    std::string_view text;
    double divisor = 1.0;
    Distribution distribution = Distribution::normal;
};

Outcome<Coverage> coverageOf(std::string_view text)
{
    if (!text.ends_with(')')) return Coverage{.text = text};
    const std::size_t open = text.rfind('(');
    if (open == std::string_view::npos) return notAnUncertainty(text);
    // "bar(g)" and "J/(mol K)" belong to the unit; what qualifies an uncertainty stands apart.
    const std::string_view before = trimmed(text.substr(0, open));
    if (before.size() == open || before.ends_with('/')) return Coverage{.text = text};
    const std::string_view inside = trimmed(text.substr(open + 1, text.size() - open - 2));
    if (inside == "uniform") return Coverage{before, std::sqrt(3.0), Distribution::uniform};
    if (inside == "triangular") return Coverage{before, std::sqrt(6.0), Distribution::triangular};
    if (inside.starts_with('k')) {
        const std::string_view equals = trimmed(inside.substr(1));
        if (!equals.starts_with('=')) return notAnUncertainty(text);
        const std::string_view digits = trimmed(equals.substr(1));
        const Outcome<TypedNumber> factor = leadingNumber(digits);
        if (!factor || factor->length != digits.size()) return notAnUncertainty(text);
        if (factor->value <= 0.0)
            return typingFailure(Reason::outOfRange, "the coverage factor k = {0} is not above zero", {factor->text});
        return Coverage{before, factor->value, Distribution::normal};
    }
    return typingFailure(Reason::unknownName,
                         "“({0})” is not known after an uncertainty; (k=2), (uniform) and (triangular) are",
                         {std::string(inside)});
}

/// "0.1 bar" as a difference [SI of the value's unit].
Outcome<double> difference(std::string_view text, const Unit &valueUnit)
{
    const Outcome<TypedNumber> number = leadingNumber(text);
    if (!number) return number.failure();
    const std::string_view name = trimmed(text.substr(number->length));
    if (name.empty()) return typingFailure(Reason::syntax, "the uncertainty “{0}” has no unit", {std::string(text)});
    const Outcome<Unit> unit = unitFrom(name);
    if (!unit) return unit.failure();
    if (unit->siUnit != valueUnit.siUnit)
        return typingFailure(Reason::wrongType, "the uncertainty in “{0}” has another dimension than its value",
                             {std::string(name)});
    return number->value * unit->factor;
}

/// "1 %" of the value, or "0.5 % FS 250 bar" of an instrument's full scale.
Outcome<double> share(double percent, std::string_view after, const Stated &stated)
{
    if (after.empty()) return percent / 100.0 * std::abs(stated.number) * (stated.unit ? stated.unit->factor : 1.0);
    if (!after.starts_with("FS") || !stated.unit) return notAnUncertainty(after);
    const Outcome<double> fullScale = difference(trimmed(after.substr(2)), *stated.unit);
    if (!fullScale) return fullScale;
    return percent / 100.0 * *fullScale;
}

Outcome<double> halfWidth(std::string_view text, const Stated &stated)
{
    const Outcome<TypedNumber> number = leadingNumber(text);
    if (!number) return notAnUncertainty(text);
    const std::string_view after = trimmed(text.substr(number->length));
    if (after.starts_with('%')) return share(number->value, trimmed(after.substr(1)), stated);
    if (stated.unit) return difference(text, *stated.unit);
    if (!after.empty()) return notAnUncertainty(text);
    return number->value;
}

} // namespace

Outcome<Uncertainty> uncertaintyOf(std::string_view text, const Stated &stated)
{
    const Outcome<Coverage> coverage = coverageOf(trimmed(text));
    if (!coverage) return coverage.failure();
    const Outcome<double> width = halfWidth(coverage->text, stated);
    if (!width) return width.failure();
    if (!(*width >= 0.0) || !std::isfinite(*width))
        return typingFailure(Reason::outOfRange, "the uncertainty “{0}” is not a number of zero or above",
                             {std::string(text)});
    return Uncertainty{.standard = *width / coverage->divisor, .distribution = coverage->distribution};
}

SplitText splitAtUncertainty(std::string_view text)
{
    for (const std::string_view sign : {std::string_view("±"), std::string_view("+/-"), std::string_view("+/\u2212")}) {
        const std::size_t place = text.find(sign);
        if (place != std::string_view::npos)
            return {trimmed(text.substr(0, place)), trimmed(text.substr(place + sign.size()))};
    }
    return {trimmed(text), std::nullopt};
}

} // namespace quasistat::units
