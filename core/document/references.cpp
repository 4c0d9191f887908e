#include "core/document/references.h"

#include "core/document/faults.h"
#include "core/document/interpret_parts.h"
#include "core/document/pointer.h"
#include "core/units/measure.h"

#include <algorithm>
#include <array>
#include <charconv>

namespace quasistat::document
{

namespace
{

using path::EndKey;

// Closure is judged to 1e-6 of the value: a digit more than that keeps a closed path closed.
constexpr int formerDigits = 8;

std::optional<int> referenceNumber(const Json &value)
{
    if (!value.is_string()) return std::nullopt;
    const std::string &text = value.get_ref<const std::string &>();
    if (text.size() < 2 || text.front() != '@') return std::nullopt;
    int number = 0;
    const char *const last = text.data() + text.size();
    const auto [end, error] = std::from_chars(text.data() + 1, last, number);
    if (error != std::errc{} || end != last) return std::nullopt;
    return number;
}

std::string unitFor(EndKey key, const units::DisplayUnits &units)
{
    switch (key) {
    case EndKey::pressure: return units.pressure.empty() ? "bar" : units.pressure;
    case EndKey::volume: return units.volume.empty() ? "L" : units.volume;
    case EndKey::temperature: return units.temperature.empty() ? "°C" : units.temperature;
    default: return {};
    }
}

double valueOf(const gas::State &state, EndKey key)
{
    switch (key) {
    case EndKey::pressure: return state.pressure();
    case EndKey::volume: return state.volume();
    case EndKey::temperature: return state.temperature().value_or(0.0);
    default: return 0.0;
    }
}

std::string numberText(int number)
{
    return std::to_string(number);
}

/// Renumbers the references of one segment.
class SegmentReferences
{
public:
    SegmentReferences(Json &segment, std::size_t index, const Renumbering &renumbering, const FormerValues &former,
                      std::vector<Warning> &remarks)
        : m_segment(segment), m_pointer(pointerTo("/segments", index)), m_statesReached(static_cast<int>(index) + 1),
          m_renumbering(renumbering), m_former(former), m_remarks(remarks)
    {
    }

    void renumber()
    {
        if (!m_segment.is_object()) return;
        if (m_segment.contains("external_pressure"))
            value(m_segment["external_pressure"], EndKey::pressure, pointerTo(m_pointer, "external_pressure"));
        if (m_segment.contains("end") && m_segment["end"].is_object()) end(m_segment["end"]);
        regenerator();
    }

private:
    /// The new number of a state, if this segment may still name it.
    [[nodiscard]] std::optional<int> reachable(int state) const
    {
        const std::optional<int> number = m_renumbering.state(state);
        return number && *number <= m_statesReached ? number : std::nullopt;
    }

    void end(Json &end)
    {
        const std::string pointer = pointerTo(m_pointer, "end");
        for (const EndKey key : {EndKey::pressure, EndKey::volume, EndKey::temperature}) {
            const std::string name(path::keyOf(key));
            if (end.contains(name)) value(end[name], key, pointerTo(pointer, name));
        }
        if (end.contains("state") && end["state"].is_number_integer()) arrival(end, pointer);
    }

    void value(Json &value, EndKey key, const std::string &pointer)
    {
        const std::optional<int> old = referenceNumber(value);
        if (!old) return;
        if (const std::optional<int> number = reachable(*old)) {
            value = std::string("@").append(numberText(*number));
            return;
        }
        const std::optional<std::string> text = m_former.text(*old, key);
        if (!text) {
            lost(pointer, *old);
            return;
        }
        value = *text;
        m_remarks.push_back(remark(pointer, "“@{0}” no longer points to a state before this segment: it became {1}",
                                   {numberText(*old), *text}));
    }

    /// {"state": k} becomes the values of that state that this kind ends by.
    void arrival(Json &end, const std::string &pointer)
    {
        const int old = end["state"].get<int>();
        if (const std::optional<int> number = reachable(old)) {
            end["state"] = *number;
            return;
        }
        Json plain = Json::object();
        std::string words;
        for (const EndKey key : arrivalKeys()) {
            const std::optional<std::string> text = m_former.text(old, key);
            if (!text) {
                lost(pointerTo(pointer, "state"), old);
                return;
            }
            plain[std::string(path::keyOf(key))] = *text;
            words += (words.empty() ? std::string() : std::string(", ")) + *text;
        }
        if (end.contains("direction")) plain["direction"] = end["direction"];
        end = std::move(plain);
        m_remarks.push_back(remark(pointer, "state {0} no longer comes before this segment: its end became {1}",
                                   {numberText(old), words}));
    }

    /// The properties of a state that fix the end of this kind: one, or two where the kind's law is open.
    [[nodiscard]] std::vector<EndKey> arrivalKeys() const
    {
        const std::string kind =
            m_segment.contains("kind") && m_segment["kind"].is_string() ? m_segment["kind"] : Json("");
        const bool isOpenLaw = (kind == "polytropic" && !m_segment.contains("exponent")) ||
                               (kind == "linear" && !m_segment.contains("stiffness"));
        if (isOpenLaw) return {EndKey::pressure, EndKey::volume};
        const bool byVolume = kind == "isobaric" || kind == "constant-external-pressure" || kind == "free-expansion";
        return {byVolume ? EndKey::volume : EndKey::pressure};
    }

    /// A regenerator names its partner, which may come later; without one it has nothing to exchange heat with.
    void regenerator()
    {
        if (!m_segment.contains("regenerator") || !m_segment["regenerator"].is_number_integer()) return;
        const int old = m_segment["regenerator"].get<int>();
        if (const std::optional<int> number = m_renumbering.segment(old)) {
            m_segment["regenerator"] = *number;
            return;
        }
        m_segment.erase("regenerator");
        m_segment.erase("effectiveness");
        m_remarks.push_back(remark(m_pointer,
                                   "segment {0}, its partner in a regenerator, is gone: the regenerator is removed",
                                   {numberText(old)}));
    }

    void lost(const std::string &pointer, int old)
    {
        m_remarks.push_back(remark(pointer,
                                   "state {0} no longer comes before this segment, and its value is not known: "
                                   "write a value here",
                                   {numberText(old)}));
    }

    Json &m_segment;
    std::string m_pointer;
    int m_statesReached;
    const Renumbering &m_renumbering;
    const FormerValues &m_former;
    std::vector<Warning> &m_remarks;
};

} // namespace

std::optional<std::string> FormerValues::text(int state, EndKey key) const
{
    if (state < 1 || static_cast<std::size_t>(state) > path.states.size()) return std::nullopt;
    const gas::State &former = path.states[static_cast<std::size_t>(state) - 1].state;
    if (former.isEvacuated()) return std::nullopt;
    const Outcome<std::string> text = units::typedIn(valueOf(former, key), path::quantityOf(key), unitFor(key, units),
                                                     units.surroundingsPressure, formerDigits);
    if (!text) return std::nullopt;
    return *text;
}

Edited renumbered(Design design, const Renumbering &renumbering, const FormerValues &former)
{
    Edited edited{.design = std::move(design), .remarks = {}};
    Json &segments = edited.design.json["segments"];
    for (std::size_t i = 0; i < segments.size(); ++i)
        SegmentReferences(segments[i], i, renumbering, former, edited.remarks).renumber();
    return edited;
}

} // namespace quasistat::document
