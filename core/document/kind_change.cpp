// One segment as another kind, its end kept as far as that kind can.

#include "core/document/edit.h"
#include "core/document/format_keys.h"
#include "core/document/interpret.h"
#include "core/document/references.h"
#include "core/units/measure.h"

#include <algorithm>
#include <array>
#include <cmath>

namespace quasistat::document
{

namespace
{

using path::EndKey;
using path::Kind;

constexpr int usualSteps = 5;
constexpr double usualExponent = 1.3; // between isothermal and isentropic, where two states give none
constexpr double sameValue = 1e-9;    // relative: what did not change cannot say where a segment ends

/// The states a segment joins, as far as they were computed.
struct Ends {
    const gas::State *from = nullptr;
    const gas::State *to = nullptr;
};

Ends endsOf(const path::PathResult &before, std::size_t index)
{
    const auto state = [&](std::size_t i) { return i < before.states.size() ? &before.states[i].state : nullptr; };
    return {state(index), state(index + 1)};
}

double valueOf(const gas::State &state, EndKey key)
{
    if (key == EndKey::pressure) return state.pressure();
    if (key == EndKey::volume) return state.volume();
    return state.temperature().value_or(0.0);
}

bool isStateProperty(EndKey key)
{
    return key == EndKey::pressure || key == EndKey::volume || key == EndKey::temperature;
}

/// n of p Vⁿ = constant through both states; none where the volumes agree or a state is missing.
std::optional<double> exponentThrough(const Ends &ends)
{
    if (!ends.from || !ends.to || ends.from->isEvacuated() || ends.to->isEvacuated()) return std::nullopt;
    const double logVolume = std::log(ends.to->volume() / ends.from->volume());
    if (std::abs(logVolume) < sameValue) return std::nullopt;
    const double exponent = -std::log(ends.to->pressure() / ends.from->pressure()) / logVolume;
    if (!std::isfinite(exponent)) return std::nullopt;
    // As many digits as a person would keep; the end stays where it is typed.
    const double scale = 1e6;
    return std::round(exponent * scale) / scale;
}

class KindChange
{
public:
    KindChange(const Json &segment, std::size_t index, Kind kind, const FormerValues &former)
        : m_segment(segment), m_index(index), m_kind(kind), m_former(former), m_ends(endsOf(former.path, index))
    {
    }

    Json changed()
    {
        m_next["kind"] = path::facts(m_kind).key;
        takeOwnKeys();
        addNeeded();
        placeEnd();
        takeOtherKeys();
        return std::move(m_next);
    }

private:
    void takeOwnKeys()
    {
        for (const std::string_view key : ownKeys(m_kind).own)
            if (m_segment.contains(key)) m_next[std::string(key)] = m_segment.at(std::string(key));
    }

    /// Label and whatever else is no key of a kind.
    void takeOtherKeys()
    {
        for (const auto &item : m_segment.items())
            if (item.key() != "end" && item.key() != "kind" && !isSegmentKey(item.key()))
                m_next[item.key()] = item.value();
    }

    [[nodiscard]] const Json *oldEnd() const
    {
        const auto found = m_segment.find("end");
        return found == m_segment.end() ? nullptr : &*found;
    }

    [[nodiscard]] bool endsAtState() const { return oldEnd() && oldEnd()->is_object() && oldEnd()->contains("state"); }

    void addNeeded()
    {
        if (m_kind == Kind::polytropic && !m_next.contains("exponent") && !endsAtState())
            m_next["exponent"] = exponentThrough(m_ends).value_or(usualExponent);
        if (m_kind == Kind::stepped && !m_next.contains("steps")) m_next["steps"] = usualSteps;
        if (m_kind == Kind::constantExternalPressure && !m_next.contains("external_pressure"))
            m_next["external_pressure"] = externalPressure();
    }

    /// The pressure reached; where nothing was reached, what the end says or the surroundings.
    [[nodiscard]] Json externalPressure() const
    {
        if (const auto text = reached(EndKey::pressure)) return *text;
        if (oldEnd() && oldEnd()->is_object() && oldEnd()->contains("pressure")) return oldEnd()->at("pressure");
        const auto ambient = units::typedIn(m_former.units.surroundingsPressure, units::Quantity::pressure, "bar",
                                            m_former.units.surroundingsPressure, 6);
        return ambient ? *ambient : std::string("1 bar");
    }

    [[nodiscard]] std::optional<std::string> reached(EndKey key) const
    {
        return m_former.text(static_cast<int>(m_index) + 2, key);
    }

    /// The process as far as the choice of its ends depends on it.
    [[nodiscard]] path::EndChoice choice() const
    {
        switch (m_kind) {
        case Kind::isothermal: return path::endChoice(path::Isothermal{});
        case Kind::isobaric: return path::endChoice(path::Isobaric{});
        case Kind::isochoric: return path::endChoice(path::Isochoric{});
        case Kind::polytropic:
            return path::endChoice(path::Polytropic{m_next.contains("exponent") ? std::optional(1.0) : std::nullopt});
        case Kind::isentropic: return path::endChoice(path::Isentropic{});
        case Kind::linear:
            return path::endChoice(path::Linear{m_next.contains("stiffness") ? std::optional(1.0) : std::nullopt});
        case Kind::constantExternalPressure: return path::endChoice(path::ConstantExternalPressure{});
        case Kind::stepped: return path::endChoice(path::Stepped{});
        case Kind::freeExpansion: return path::endChoice(path::FreeExpansion{});
        }
        return path::endChoice(path::Isothermal{});
    }

    void placeEnd()
    {
        // The pressure that it balances is the one reached before, so no stop is needed.
        if (m_kind == Kind::constantExternalPressure) return;
        const path::EndChoice choice = this->choice();
        // Only laws with a free parameter pass through any state.
        const bool isOpenLaw = m_kind == Kind::linear || m_kind == Kind::polytropic;
        if (endsAtState() && isOpenLaw && choice.needed == 2) {
            m_next["end"] = *oldEnd();
            return;
        }
        Json end = keptValues(choice);
        fillUp(end, choice);
        m_next["end"] = std::move(end);
    }

    /// Values of the old end that the new kind takes, as many as it needs.
    [[nodiscard]] Json keptValues(const path::EndChoice &choice) const
    {
        Json end = Json::object();
        const Json *old = oldEnd();
        if (!old || !old->is_object() || old->contains("state")) return end;
        for (const EndKey key : choice.keys) {
            const std::string name(path::keyOf(key));
            if (old->contains(name) && end.size() < static_cast<std::size_t>(choice.needed)) end[name] = old->at(name);
        }
        if (!end.empty() && choice.needed == 1 && old->contains("direction")) end["direction"] = old->at("direction");
        return end;
    }

    void fillUp(Json &end, const path::EndChoice &choice) const
    {
        const auto missing = [&] {
            const std::size_t values = end.size() - (end.contains("direction") ? 1 : 0);
            return values < static_cast<std::size_t>(choice.needed);
        };
        // A property that changed along the segment comes before one that did not.
        for (const bool unchangedToo : {false, true})
            for (const EndKey key : choice.keys) {
                const std::string name(path::keyOf(key));
                if (!missing() || !isStateProperty(key) || end.contains(name) || (!unchangedToo && !changes(key)))
                    continue;
                if (const auto text = reached(key)) end[name] = *text;
            }
    }

    [[nodiscard]] bool changes(EndKey key) const
    {
        if (!m_ends.from || !m_ends.to) return true;
        const double before = valueOf(*m_ends.from, key);
        return std::abs(valueOf(*m_ends.to, key) - before) > sameValue * std::abs(before);
    }

    const Json &m_segment;
    std::size_t m_index;
    Kind m_kind;
    const FormerValues &m_former;
    Ends m_ends;
    Json m_next = Json::object();
};

} // namespace

Edited kindChanged(const Design &design, std::size_t index, path::Kind kind, const path::PathResult &before)
{
    Edited edited{.design = design, .remarks = {}};
    Json &segments = edited.design.json["segments"];
    if (!segments.is_array() || index >= segments.size() || !segments.at(index).is_object())
        return {.design = design, .remarks = {}};
    Json &segment = segments.at(index);
    if (segment.value("kind", Json()) == path::facts(kind).key) return edited;
    const FormerValues former{.path = before, .units = displayUnits(design)};
    segment = KindChange(segment, index, kind, former).changed();
    return edited;
}

} // namespace quasistat::document
