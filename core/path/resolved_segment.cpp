#include "core/path/resolved_segment.h"

#include <fmt/format.h>

namespace quasistat::path
{
namespace
{

Outcome<const gas::State *> stateNumber(int number, std::span<const StateResult> states, const std::string &pointer)
{
    if (number >= 1 && static_cast<std::size_t>(number) <= states.size())
        return &states[static_cast<std::size_t>(number) - 1].state;
    return Failure{
        Reason::outOfRange,
        pointer,
        {fmt::format("state {} is not reached yet here: a reference can name states 1 to {}", number, states.size()),
         {}}};
}

std::string pointerOf(EndKey key)
{
    return "/end/" + std::string(keyOf(key));
}

Outcome<double> valueIn(const gas::State &state, EndKey key)
{
    switch (key) {
    case EndKey::pressure: return state.pressure();
    case EndKey::volume: return state.volume();
    case EndKey::temperature:
        if (const auto temperature = state.temperature()) return *temperature;
        return Failure{Reason::undetermined, pointerOf(key), {"an evacuated state has no temperature", {}}};
    case EndKey::pressureRatio:
    case EndKey::volumeRatio:
    case EndKey::work:
    case EndKey::heat: break;
    }
    return Failure{Reason::wrongType,
                   pointerOf(key),
                   {"“@k” stands for the pressure, volume or temperature of a state; {0} is not a property of one",
                    {std::string(keyOf(key))}}};
}

/// The number itself, or the state's value of `key`.
Outcome<double> valueOf(const std::variant<double, SameAs> &said, EndKey key, std::span<const StateResult> states,
                        const std::string &pointer)
{
    if (const double *number = std::get_if<double>(&said)) return *number;
    const auto state = stateNumber(std::get<SameAs>(said).state, states, pointer);
    if (!state) return state.failure();
    return valueIn(**state, key);
}

} // namespace

Outcome<ResolvedSegment> resolved(const Segment &segment, std::span<const StateResult> states)
{
    ResolvedSegment result{.process = segment.process,
                           .label = segment.label,
                           .ends = {},
                           .arrival = std::nullopt,
                           .arrivalNumber = segment.end.state.value_or(0),
                           .direction = segment.end.direction};
    for (const EndValue &end : segment.end.values) {
        const auto value = valueOf(end.value, end.key, states, pointerOf(end.key));
        if (!value) return value.failure();
        result.ends.emplace_back(end.key, *value);
    }
    if (segment.end.state) {
        const auto state = stateNumber(*segment.end.state, states, "/end/state");
        if (!state) return state.failure();
        result.arrival = **state;
    }
    if (auto *piston = std::get_if<ConstantExternalPressure>(&result.process)) {
        const auto pressure = valueOf(piston->externalPressure, EndKey::pressure, states, "/external_pressure");
        if (!pressure) return pressure.failure();
        piston->externalPressure = *pressure;
    }
    return result;
}

} // namespace quasistat::path
