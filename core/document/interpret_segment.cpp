#include "core/document/faults.h"
#include "core/document/interpret_parts.h"

#include <algorithm>
#include <array>

namespace quasistat::document
{

namespace
{

using path::Process;
using units::Quantity;

// More steps than anyone lays weights; keeps a mistyped number from running for minutes.
constexpr int mostSteps = 100000;

/// What a kind's own keys are read with.
struct Reading {
    const Fields &fields;
    int statesReached;
    const units::Conversion &conversion;
};

template <class T>
struct Choice {
    std::string_view name;
    T value;
};

/// One of a few words at `key`; the first is the default.
template <class T, std::size_t N>
Outcome<T> chosen(const Fields &fields, std::string_view key, const std::array<Choice<T>, N> &choices)
{
    const Outcome<std::optional<std::string>> text = fields.text(key);
    if (!text) return text.failure();
    if (!text->has_value()) return choices.front().value;
    std::array<std::string_view, N> names{};
    for (std::size_t i = 0; i < N; ++i) {
        if (choices[i].name == **text) return choices[i].value;
        names[i] = choices[i].name;
    }
    return unknownName(fields.pointerTo(key), std::string(key) + " of this kind", **text, names);
}

constexpr std::array contactFirst{Choice{"isothermal", path::Thermal::isothermal},
                                  Choice{"adiabatic", path::Thermal::adiabatic}};
constexpr std::array insulatedFirst{Choice{"adiabatic", path::Thermal::adiabatic},
                                    Choice{"isothermal", path::Thermal::isothermal}};
constexpr std::array spacings{Choice{"ratio", path::Spacing::ratio}, Choice{"pressure", path::Spacing::pressure}};

Outcome<Process> polytropic(const Reading &reading)
{
    path::Polytropic process;
    if (const std::optional<Place> place = reading.fields.find("exponent")) {
        const Outcome<double> exponent = numberAt(*place);
        if (!exponent) return exponent.failure();
        process.exponent = *exponent;
    }
    return Process(process);
}

Outcome<Process> linear(const Reading &reading)
{
    path::Linear process;
    if (const std::optional<Place> place = reading.fields.find("stiffness")) {
        const Outcome<double> stiffness = quantityAt(*place, Quantity::stiffness, reading.conversion);
        if (!stiffness) return stiffness.failure();
        process.stiffness = *stiffness;
    }
    return Process(process);
}

Outcome<Process> constantExternalPressure(const Reading &reading)
{
    const Outcome<Place> place = reading.fields.required("external_pressure");
    if (!place) return place.failure();
    const Outcome<path::Thermal> thermal = chosen(reading.fields, "thermal", contactFirst);
    if (!thermal) return thermal.failure();
    path::ConstantExternalPressure process{.externalPressure = 0.0, .thermal = *thermal};
    const Outcome<std::optional<path::SameAs>> reference = referenceFrom(*place, reading.statesReached);
    if (!reference) return reference.failure();
    if (reference->has_value()) {
        process.externalPressure = **reference;
        return Process(process);
    }
    const Outcome<double> pressure = positiveQuantityAt(*place, Quantity::pressure, reading.conversion);
    if (!pressure) return pressure.failure();
    process.externalPressure = *pressure;
    return Process(process);
}

Outcome<Process> stepped(const Reading &reading)
{
    const Outcome<Place> place = reading.fields.required("steps");
    if (!place) return place.failure();
    const Outcome<int> steps = wholeNumberAt(*place, 1, mostSteps);
    if (!steps) return steps.failure();
    const Outcome<path::Spacing> spacing = chosen(reading.fields, "spacing", spacings);
    if (!spacing) return spacing.failure();
    const Outcome<path::Thermal> thermal = chosen(reading.fields, "thermal", contactFirst);
    if (!thermal) return thermal.failure();
    return Process(path::Stepped{.steps = *steps, .spacing = *spacing, .thermal = *thermal});
}

Outcome<Process> freeExpansion(const Reading &reading)
{
    const Outcome<path::Thermal> thermal = chosen(reading.fields, "thermal", insulatedFirst);
    if (!thermal) return thermal.failure();
    return Process(path::FreeExpansion{.thermal = *thermal});
}

Outcome<Process> processOf(path::Kind kind, const Reading &reading)
{
    using path::Kind;
    switch (kind) {
    case Kind::isothermal: return Process(path::Isothermal{});
    case Kind::isobaric: return Process(path::Isobaric{});
    case Kind::isochoric: return Process(path::Isochoric{});
    case Kind::polytropic: return polytropic(reading);
    case Kind::isentropic: return Process(path::Isentropic{});
    case Kind::linear: return linear(reading);
    case Kind::constantExternalPressure: return constantExternalPressure(reading);
    case Kind::stepped: return stepped(reading);
    case Kind::freeExpansion: return freeExpansion(reading);
    }
    return fault(Reason::unknownName, reading.fields.pointer(), "this kind is not known");
}

Failure unknownKind(const Place &place, const std::string &name)
{
    std::vector<std::string_view> names;
    for (const path::KindFacts &row : path::kindTable) names.push_back(row.key);
    for (const std::string_view key : path::kindsNotComputed()) names.push_back(key);
    return unknownName(place.pointer, "kind of segment", name, names);
}

Outcome<path::Kind> kindOf(const Fields &fields)
{
    const Outcome<Place> place = fields.required("kind");
    if (!place) return place.failure();
    const Outcome<std::string> name = textAt(*place);
    if (!name) return name.failure();
    if (const std::optional<path::Kind> kind = path::kindFromKey(*name)) return *kind;
    const auto others = path::kindsNotComputed();
    if (std::ranges::find(others, *name) != others.end())
        return notComputed(place->pointer, "a segment of kind “" + *name + "”");
    return unknownKind(*place, *name);
}

/// A key of the format that this kind takes and this version does not compute: refused, because leaving it out would
/// change the result without a word.
std::optional<Failure> keyNotComputed(const Fields &fields, const KindKeys &kindKeys)
{
    for (const Keys list : {kindKeys.notComputed, Keys(keys::segmentNotComputed)})
        for (const std::string_view key : list)
            if (const std::optional<Place> place = fields.find(key))
                return notComputed(place->pointer, "“" + std::string(key) + "”");
    return std::nullopt;
}

/// An unknown key and a key of other kinds are both kept and not used; the words differ.
void warnOfKeys(const Fields &fields, const Json &segment, path::Kind kind, Warnings &warnings)
{
    const KindKeys kindKeys = ownKeys(kind);
    std::vector<std::string_view> ofOtherKinds;
    for (const auto &item : segment.items()) {
        const auto has = [&](Keys list) { return std::ranges::find(list, item.key()) != list.end(); };
        if (has(kindKeys.own) || has(kindKeys.notComputed) || !isSegmentKey(item.key())) continue;
        ofOtherKinds.push_back(item.key());
        warnings.push_back(remark(fields.pointerTo(item.key()),
                                  "“{0}” does not belong to a segment of kind {1}; it is kept and not used",
                                  {item.key(), std::string(path::facts(kind).key)}));
    }
    fields.warnOfUnknown({keys::segment, kindKeys.own, ofOtherKinds}, warnings);
}

} // namespace

Outcome<std::optional<path::SameAs>> referenceFrom(const Place &place, int statesReached)
{
    if (!place.value->is_string()) return std::optional<path::SameAs>();
    const std::string text = place.value->get<std::string>();
    if (!text.starts_with('@')) return std::optional<path::SameAs>();
    const std::string digits = text.substr(1);
    const bool isNumber =
        !digits.empty() && digits.size() < 8 && digits.find_first_not_of("0123456789") == std::string::npos;
    if (!isNumber)
        return fault(Reason::syntax, place.pointer,
                     "“{0}” is no reference; write for instance “@1” for the value of state 1", {text});
    const int state = std::stoi(digits);
    if (state < 1 || state > statesReached)
        return fault(Reason::outOfRange, place.pointer,
                     "state {0} is not reached yet here: a reference can name states 1 to {1}",
                     {std::to_string(state), std::to_string(statesReached)});
    return std::optional(path::SameAs{state});
}

Outcome<path::Segment> segmentFrom(const Place &place, std::size_t index, const units::Conversion &conversion,
                                   Warnings &warnings)
{
    const Outcome<Fields> fields = Fields::of(place);
    if (!fields) return fields.failure();
    const Outcome<path::Kind> kind = kindOf(*fields);
    if (!kind) return kind.failure();
    warnOfKeys(*fields, *place.value, *kind, warnings);
    if (const std::optional<Failure> failure = keyNotComputed(*fields, ownKeys(*kind))) return *failure;
    const Outcome<std::optional<std::string>> label = fields->text("label");
    if (!label) return label.failure();
    const int statesReached = static_cast<int>(index) + 1;
    Outcome<Process> process = processOf(*kind, {*fields, statesReached, conversion});
    if (!process) return process.failure();
    Outcome<path::End> end = endFrom(*fields, *process, statesReached, conversion, warnings);
    if (!end) return end.failure();
    return path::Segment{.process = *process, .end = std::move(*end), .label = label->value_or(std::string())};
}

} // namespace quasistat::document
