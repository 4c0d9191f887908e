#include "core/document/fields.h"

#include "core/document/faults.h"
#include "core/document/pointer.h"

#include <algorithm>
#include <cmath>

namespace quasistat::document
{

namespace
{

Failure otherType(const Place &place, std::string_view expected)
{
    return fault(Reason::wrongType, place.pointer, "here stands {0}, not {1}",
                 {typeWords(*place.value), std::string(expected)});
}

} // namespace

Outcome<Fields> Fields::of(const Place &place)
{
    if (!place.value->is_object()) return otherType(place, "an object: {…}");
    return Fields(*place.value, place.pointer);
}

std::string Fields::pointerTo(std::string_view key) const
{
    return document::pointerTo(m_pointer, key);
}

bool Fields::has(std::string_view key) const
{
    return find(key).has_value();
}

std::optional<Place> Fields::find(std::string_view key) const
{
    const auto found = m_object->find(std::string(key));
    if (found == m_object->end()) return std::nullopt;
    return Place{&*found, pointerTo(key)};
}

Outcome<Place> Fields::required(std::string_view key) const
{
    if (const std::optional<Place> place = find(key)) return *place;
    return fault(Reason::missing, m_pointer, "“{0}” is missing here", {std::string(key)});
}

Outcome<std::optional<std::string>> Fields::text(std::string_view key) const
{
    const std::optional<Place> place = find(key);
    if (!place) return std::optional<std::string>();
    Outcome<std::string> text = textAt(*place);
    if (!text) return text.failure();
    return std::optional(std::move(*text));
}

void Fields::warnOfUnknown(std::initializer_list<Keys> known, std::vector<Warning> &warnings) const
{
    for (const auto &item : m_object->items()) {
        const auto lists = [&](Keys keys) { return std::ranges::find(keys, item.key()) != keys.end(); };
        if (!std::ranges::any_of(known, lists))
            warnings.push_back(
                remark(pointerTo(item.key()), "“{0}” has no meaning here; it is kept and not used", {item.key()}));
    }
}

std::string typeWords(const Json &value)
{
    switch (value.type()) {
    case Json::value_t::object: return "an object";
    case Json::value_t::array: return "a list";
    case Json::value_t::string: return "a text";
    case Json::value_t::boolean: return "true or false";
    case Json::value_t::number_integer:
    case Json::value_t::number_unsigned:
    case Json::value_t::number_float: return "a number";
    case Json::value_t::null:
    case Json::value_t::binary:
    case Json::value_t::discarded: break;
    }
    return "null";
}

Outcome<std::string> textAt(const Place &place)
{
    if (!place.value->is_string()) return otherType(place, "a text");
    return place.value->get<std::string>();
}

Outcome<double> numberAt(const Place &place)
{
    if (place.value->is_number()) {
        const double number = place.value->get<double>();
        if (std::isfinite(number)) return number;
        return fault(Reason::outOfRange, place.pointer, "this number is too large");
    }
    if (!place.value->is_string()) return otherType(place, "a number");
    const Outcome<units::Measure> measure = units::plainNumber(place.value->get<std::string>());
    if (!measure) return at(place.pointer, measure.failure());
    return measure->value;
}

Outcome<int> wholeNumberAt(const Place &place, int least, int most)
{
    if (!place.value->is_number_integer()) return otherType(place, "a whole number");
    const bool fits = place.value->is_number_unsigned()
                          ? place.value->get<std::uint64_t>() <= static_cast<std::uint64_t>(std::max(most, 0))
                          : place.value->get<std::int64_t>() <= most;
    const bool isEnough = place.value->is_number_unsigned()
                              ? (least <= 0 || place.value->get<std::uint64_t>() >= static_cast<std::uint64_t>(least))
                              : place.value->get<std::int64_t>() >= least;
    if (fits && isEnough) return place.value->get<int>();
    return fault(Reason::outOfRange, place.pointer, "{0} is not from {1} to {2}",
                 {place.value->dump(), std::to_string(least), std::to_string(most)});
}

Outcome<double> quantityAt(const Place &place, units::Quantity quantity, const units::Conversion &conversion)
{
    // A bare number has no unit; the sentence about that shows its digits and what would be right.
    if (place.value->is_number()) {
        const Outcome<units::Measure> bare = units::measured(place.value->dump(), quantity);
        if (!bare) return Failure{Reason::wrongType, place.pointer, bare.failure().message};
    }
    if (!place.value->is_string()) return otherType(place, "a text of number and unit");
    const Outcome<units::Measure> measure = units::measured(place.value->get<std::string>(), quantity);
    if (!measure) return at(place.pointer, measure.failure());
    const Outcome<double> value = units::siValue(*measure, conversion);
    if (!value) return at(place.pointer, value.failure());
    return value;
}

Outcome<double> positiveQuantityAt(const Place &place, units::Quantity quantity, const units::Conversion &conversion)
{
    const Outcome<double> value = quantityAt(place, quantity, conversion);
    if (value && !(*value > 0.0))
        return fault(Reason::outOfRange, place.pointer, "“{0}” is not above zero", {place.value->get<std::string>()});
    return value;
}

} // namespace quasistat::document
