#include "core/document/faults.h"
#include "core/document/interpret_parts.h"

#include <algorithm>
#include <array>

namespace quasistat::document
{

namespace
{

using path::End;
using path::EndKey;

constexpr std::array allEndKeys{EndKey::pressure,    EndKey::volume, EndKey::temperature, EndKey::pressureRatio,
                                EndKey::volumeRatio, EndKey::work,   EndKey::heat};

/// What an end is read with.
struct Reading {
    const path::Process &process;
    int statesReached;
    const units::Conversion &conversion;
    path::EndChoice choice;

    [[nodiscard]] std::string kind() const { return std::string(path::facts(path::kindOf(process)).words); }
    [[nodiscard]] bool takes(EndKey key) const { return std::ranges::find(choice.keys, key) != choice.keys.end(); }
    [[nodiscard]] std::string offered() const
    {
        std::vector<std::string_view> names;
        for (const EndKey key : choice.keys) names.push_back(path::keyOf(key));
        return listed(names, "or");
    }
};

bool isStateProperty(EndKey key)
{
    return key == EndKey::pressure || key == EndKey::volume || key == EndKey::temperature;
}

Outcome<double> plainValue(const Place &place, EndKey key, const units::Conversion &conversion)
{
    if (isStateProperty(key)) return positiveQuantityAt(place, path::quantityOf(key), conversion);
    if (key == EndKey::work || key == EndKey::heat) return quantityAt(place, path::quantityOf(key), conversion);
    const Outcome<double> ratio = numberAt(place);
    if (ratio && !(*ratio > 0.0)) return fault(Reason::outOfRange, place.pointer, "a ratio is above zero");
    return ratio;
}

Outcome<path::EndValue> endValue(const Place &place, EndKey key, const Reading &reading)
{
    const Outcome<std::optional<path::SameAs>> reference = referenceFrom(place, reading.statesReached);
    if (!reference) return reference.failure();
    if (reference->has_value()) {
        if (!isStateProperty(key))
            return fault(Reason::wrongType, place.pointer,
                         "a reference stands for the pressure, volume or temperature of a state; {0} is none of them",
                         {std::string(path::keyOf(key))});
        return path::EndValue{key, **reference};
    }
    const Outcome<double> value = plainValue(place, key, reading.conversion);
    if (!value) return value.failure();
    return path::EndValue{key, *value};
}

Failure notAnEndOf(const std::string &pointer, std::string_view key, const Reading &reading)
{
    return fault(Reason::contradiction, pointer, "a segment of kind {0} does not end by {1}, but by {2}",
                 {reading.kind(), std::string(key), reading.offered()});
}

/// A key of `end` that is none of the values, nor `state` and `direction`.
Failure unknownEnd(const std::string &pointer, std::string_view key, const Reading &reading)
{
    // Ends of the kinds that move matter.
    if (key == "amount" || key == "amount_moved") return notAnEndOf(pointer, key, reading);
    std::vector<std::string_view> names;
    for (const EndKey offered : reading.choice.keys) names.push_back(path::keyOf(offered));
    return unknownName(pointer, "end", key, names);
}

Outcome<std::optional<path::Direction>> directionOf(const Fields &end)
{
    const Outcome<std::optional<std::string>> text = end.text("direction");
    if (!text) return text.failure();
    if (!text->has_value()) return std::optional<path::Direction>();
    if (**text == "compress") return std::optional(path::Direction::compress);
    if (**text == "expand") return std::optional(path::Direction::expand);
    constexpr std::array<std::string_view, 2> names{"compress", "expand"};
    return unknownName(end.pointerTo("direction"), "direction", **text, names);
}

std::optional<Failure> wrongCount(const std::string &pointer, std::size_t count, const Reading &reading)
{
    const auto needed = static_cast<std::size_t>(reading.choice.needed);
    const bool mayBalance = reading.choice.needed == 0;
    if (count == needed || (mayBalance && count == 1)) return std::nullopt;
    const bool isPolytropic = std::holds_alternative<path::Polytropic>(reading.process);
    const bool isLinear = std::holds_alternative<path::Linear>(reading.process);
    if (count < needed && isPolytropic && needed == 2)
        return fault(Reason::missing, pointer,
                     "a polytropic segment needs an exponent, or two of pressure, volume and temperature at its end");
    if (count < needed && isLinear && needed == 2)
        return fault(Reason::missing, pointer,
                     "a linear segment ends by pressure and volume, or has a stiffness and one of them");
    if (count < needed)
        return fault(Reason::missing, pointer, "the end of this segment is missing: {0}", {reading.offered()});
    return fault(Reason::contradiction, pointer,
                 needed == 2 ? "two values fix this end: remove the others"
                             : "one value fixes this end: remove the others");
}

/// {"state": k}: arrive exactly at an earlier state.
Outcome<End> arrival(const Fields &fields, End end, const Reading &reading)
{
    if (!end.values.empty())
        return fault(Reason::contradiction, fields.pointer(), "an end at a state takes no other value beside it");
    const Outcome<int> state = wholeNumberAt(*fields.find("state"), 1, reading.statesReached);
    if (!state) {
        if (state.failure().reason != Reason::outOfRange) return state.failure();
        return fault(Reason::outOfRange, fields.pointerTo("state"),
                     "state {0} is not reached yet here: a reference can name states 1 to {1}",
                     {fields.find("state")->value->dump(), std::to_string(reading.statesReached)});
    }
    end.state = *state;
    return end;
}

Outcome<End> endOf(const Place &place, const Reading &reading, Warnings &warnings)
{
    const Outcome<Fields> fields = Fields::of(place);
    if (!fields) return fields.failure();
    End end;
    for (const auto &item : place.value->items()) {
        if (std::ranges::find(keys::endBesides, item.key()) != keys::endBesides.end()) continue;
        const auto key = std::ranges::find(allEndKeys, item.key(), &path::keyOf);
        const std::string pointer = fields->pointerTo(item.key());
        if (key == allEndKeys.end()) return unknownEnd(pointer, item.key(), reading);
        if (!reading.takes(*key)) return notAnEndOf(pointer, item.key(), reading);
        Outcome<path::EndValue> value = endValue({&item.value(), pointer}, *key, reading);
        if (!value) return value.failure();
        end.values.push_back(*value);
    }
    const Outcome<std::optional<path::Direction>> direction = directionOf(*fields);
    if (!direction) return direction.failure();
    end.direction = *direction;
    if (fields->has("state")) return arrival(*fields, std::move(end), reading);
    if (const std::optional<Failure> failure = wrongCount(place.pointer, end.values.size(), reading)) return *failure;
    end.balance = end.values.empty();
    (void)warnings;
    return end;
}

} // namespace

Outcome<End> endFrom(const Fields &segment, const path::Process &process, int statesReached,
                     const units::Conversion &conversion, Warnings &warnings)
{
    const Reading reading{process, statesReached, conversion, path::endChoice(process)};
    const std::optional<Place> place = segment.find("end");
    const bool mayBalance = reading.choice.needed == 0;
    End balance;
    balance.balance = true;
    if (!place) {
        if (mayBalance) return balance;
        if (const std::optional<Failure> failure = wrongCount(segment.pointer(), 0, reading)) return *failure;
    }
    if (place->value->is_string()) {
        if (place->value->get<std::string>() == "balance" && mayBalance) return balance;
        return fault(Reason::contradiction, place->pointer, "“{0}” is no end of a segment of kind {1}; it ends by {2}",
                     {place->value->get<std::string>(), reading.kind(), reading.offered()});
    }
    return endOf(*place, reading, warnings);
}

} // namespace quasistat::document
