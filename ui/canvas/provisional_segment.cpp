#include "ui/canvas/provisional_segment.h"

#include "core/path/slide.h"
#include "ui/canvas/typed_end.h"

#include <algorithm>

namespace quasistat::ui
{
namespace
{

using document::Json;
using path::EndKey;
using path::Kind;

path::Process beginning(Kind kind, double pressure)
{
    switch (kind) {
    case Kind::isothermal: return path::Isothermal{};
    case Kind::isobaric: return path::Isobaric{};
    case Kind::isochoric: return path::Isochoric{};
    case Kind::polytropic: return path::Polytropic{1.3};
    case Kind::isentropic: return path::Isentropic{};
    case Kind::linear: return path::Linear{};
    case Kind::constantExternalPressure: return path::ConstantExternalPressure{pressure};
    case Kind::stepped: return path::Stepped{.steps = 5};
    case Kind::freeExpansion: return path::FreeExpansion{};
    }
    return path::Isothermal{};
}

std::vector<EndKey> endKeys(const path::Process &process)
{
    const auto choice = path::endChoice(process);
    if (choice.needed == 2) return {EndKey::pressure, EndKey::volume};
    const auto found = std::find_if(choice.keys.begin(), choice.keys.end(),
                                    [](EndKey key) { return key == EndKey::pressure || key == EndKey::volume; });
    return {found == choice.keys.end() ? EndKey::volume : *found};
}

Outcome<Json> ends(const path::Segment &segment, const Snapshot &before, const Pull &pull)
{
    const auto &states = before.evaluation->path.states;
    const auto point = path::nearestEnd(states, segment, {pull.volume, pull.pressure}, pull.plane.metric());
    if (!point) return point.failure();
    Json end = Json::object();
    for (const EndKey key : endKeys(segment.process)) {
        const auto value = path::endValueAt(states.back().state, *point, key);
        if (!value) return Failure{Reason::undetermined, "/end", {"This kind has no end there.", {}}};
        auto typed = typedEnd(*value, key, Json(), before, pull.plane);
        if (!typed) return typed.failure();
        end[std::string(path::keyOf(key))] = *typed;
    }
    return end;
}

} // namespace

Outcome<document::Edited> segmentPlaced(const Snapshot &before, Kind kind, const Pull &pull)
{
    const path::PathResult &path = before.evaluation->path;
    const path::Segment segment{beginning(kind, pull.pressure), {}, {}};
    const std::size_t index = path.failures.size();
    if (!path.complete() || path.states.empty())
        return Failure{Reason::notReached, "/segments", {"The path stops before its last segment.", {}}};

    Json json{{"kind", path::facts(kind).key}};
    if (kind == Kind::polytropic) json["exponent"] = 1.3;
    if (kind == Kind::stepped) json["steps"] = 5;
    if (kind == Kind::constantExternalPressure) {
        if (!(pull.pressure > 0.0)) return Failure{Reason::outOfRange, "/external_pressure", {"Above zero.", {}}};
        auto pressure = typedEnd(pull.pressure, EndKey::pressure, Json(), before, pull.plane);
        if (!pressure) return pressure.failure();
        json["external_pressure"] = *pressure;
        json["end"] = "balance";
    } else {
        auto end = ends(segment, before, pull);
        if (!end) return end.failure();
        json["end"] = *end;
    }
    return document::segmentInserted(before.design, index, json, path);
}

} // namespace quasistat::ui
