#include "ui/canvas/state_drag.h"

#include "ui/session/design_reading.h"

#include "core/path/slide.h"
#include "ui/canvas/typed_end.h"

#include <QtGlobal>

#include <algorithm>
#include <cmath>

namespace quasistat::ui
{
namespace
{

using document::Edited;
using document::Json;
using path::EndKey;
using States = std::span<const path::StateResult>;

bool isEnergy(EndKey key)
{
    return key == EndKey::work || key == EndKey::heat;
}

std::string pointerOf(std::size_t segment)
{
    return "/segments/" + std::to_string(segment) + "/end";
}

// The first end of this kind that is a pressure or a volume: what a place on the plane fixes.
EndKey plainKey(const path::Process &process)
{
    const auto keys = path::endChoice(process).keys;
    const auto found = std::find_if(keys.begin(), keys.end(),
                                    [](EndKey key) { return key == EndKey::pressure || key == EndKey::volume; });
    return found == keys.end() ? EndKey::volume : *found;
}

std::vector<EndKey> keysToWrite(const path::Segment &segment)
{
    std::vector<EndKey> keys;
    for (const auto &value : segment.end.values)
        keys.push_back(isEnergy(value.key) ? plainKey(segment.process) : value.key);
    if (!keys.empty()) return keys;
    if (path::endChoice(segment.process).needed == 2) return {EndKey::pressure, EndKey::volume};
    return {plainKey(segment.process)};
}

Warning remark(std::size_t segment, const char *text, std::string word = {})
{
    return {pointerOf(segment), {text, {std::to_string(segment + 1), std::move(word)}}};
}

// What has to be said when the end becomes another thing than it was.
std::vector<Warning> remarksOn(std::size_t index, const path::Segment &segment, const std::vector<EndKey> &keys)
{
    const std::string key(path::keyOf(keys.front()));
    if (segment.end.state)
        return {remark(index, "Segment {0} no longer ends in a named state; its end is now a {1}.", key)};
    if (segment.end.balance)
        return {remark(index, "Segment {0} no longer runs to balance; its end is now a {1}.", key)};
    for (const auto &value : segment.end.values) {
        if (isEnergy(value.key)) return {remark(index, "The end of segment {0} is now a {1}.", key)};
        if (std::holds_alternative<path::SameAs>(value.value))
            return {remark(index,
                           "The end of segment {0} no longer follows another state; its {1} is now a value of its own.",
                           key)};
    }
    return {};
}

const Json &typedBefore(const Json &segment, EndKey key)
{
    static const Json nothing;
    const Json *value = valueAt(segment, "/end/" + std::string(path::keyOf(key)));
    return value ? *value : nothing;
}

// A level against constant external pressure ends at balance; pulled up to there or beyond, it says so.
bool isAtBalance(States states, const path::Segment &segment, const path::SlidePoint &point, const Plane &plane)
{
    if (path::kindOf(segment.process) != path::Kind::constantExternalPressure) return false;
    const double start = states.back().state.volume();
    const double far = start * (point.volume > start ? 1e3 : 1e-3);
    const auto balance = path::nearestEnd(states, segment, {far, point.pressure}, plane.metric());
    return balance && std::abs(balance->volume - point.volume) * plane.metric().volumeScale < 3.0;
}

// The end object with the keys of the kind's ends replaced; whatever else stands in it stays.
Json endWithout(const Json &segment, const path::Process &process)
{
    Json end = Json::object();
    if (const auto before = segment.find("end"); before != segment.end() && before->is_object()) end = *before;
    end.erase("state");
    end.erase("direction");
    for (const EndKey key : path::endChoice(process).keys) end.erase(std::string(path::keyOf(key)));
    return end;
}

Outcome<Edited> endDragged(const Snapshot &before, std::size_t index, const Pull &pull)
{
    const auto &evaluation = *before.evaluation;
    const auto &parsed = evaluation.input.segments.at(index);
    if (!parsed) return parsed.failure();
    const path::Segment &segment = *parsed;
    const States states = States(evaluation.path.states).first(index + 1);
    const gas::State &from = states.back().state;
    const auto point = path::nearestEnd(states, segment, {pull.volume, pull.pressure}, pull.plane.metric());
    if (!point) return point.failure();

    Edited edited{before.design, {}};
    Json &json = edited.design.json.at("segments").at(index);
    if (isAtBalance(states, segment, *point, pull.plane)) {
        json["end"] = "balance";
        return edited;
    }
    const auto keys = keysToWrite(segment);
    Json end = endWithout(json, segment.process);
    for (const EndKey key : keys) {
        const auto value = path::endValueAt(from, *point, key);
        if (!value) return Failure{Reason::undetermined, pointerOf(index), {"This end cannot be dragged.", {}}};
        auto typed = typedEnd(*value, key, typedBefore(json, key), before, pull.plane);
        if (!typed) return typed.failure();
        end[std::string(path::keyOf(key))] = *typed;
    }
    json["end"] = end;
    edited.remarks = remarksOn(index, segment, keys);
    return edited;
}

Outcome<Edited> startDragged(const Snapshot &before, const Pull &pull)
{
    Edited edited{before.design, {}};
    Json &start = edited.design.json.at("start");
    for (const auto &[key, value] :
         {std::pair{EndKey::pressure, pull.pressure}, std::pair{EndKey::volume, pull.volume}}) {
        const std::string name(path::keyOf(key));
        if (!start.contains(name)) continue;
        if (!(value > 0.0)) return Failure{Reason::outOfRange, "/start/" + name, {"Above zero.", {}}};
        auto typed = typedEnd(value, key, start.at(name), before, pull.plane);
        if (!typed) return typed.failure();
        start[name] = *typed;
    }
    return edited;
}

} // namespace

Outcome<Edited> stateDragged(const Snapshot &before, int number, const Pull &pull)
{
    Q_ASSERT(before.evaluation && number >= 1);
    if (number == 1) return startDragged(before, pull);
    return endDragged(before, static_cast<std::size_t>(number - 2), pull);
}

} // namespace quasistat::ui
