#include "core/document/interpret.h"
#include "core/units/measure.h"

#include <cmath>

namespace quasistat::document
{

namespace
{

using units::Quantity;

const Json *member(const Json &object, const char *key)
{
    if (!object.is_object()) return nullptr;
    const auto found = object.find(key);
    return found == object.end() ? nullptr : &*found;
}

std::optional<units::Measure> measureIn(const Json &object, const char *key, Quantity quantity)
{
    const Json *value = member(object, key);
    if (!value || !value->is_string()) return std::nullopt;
    Outcome<units::Measure> measure = units::measured(value->get<std::string>(), quantity);
    if (!measure) return std::nullopt;
    return std::move(*measure);
}

/// The first quantity of this key that was typed: in the start, at the segments' ends, in the surroundings.
std::optional<units::Measure> firstTyped(const Design &design, const char *key, Quantity quantity)
{
    if (const Json *start = member(design.json, "start"))
        if (auto measure = measureIn(*start, key, quantity)) return measure;
    if (const Json *segments = member(design.json, "segments"); segments && segments->is_array())
        for (const Json &segment : *segments)
            if (const Json *end = member(segment, "end"))
                if (auto measure = measureIn(*end, key, quantity)) return measure;
    if (const Json *surroundings = member(design.json, "surroundings")) return measureIn(*surroundings, key, quantity);
    return std::nullopt;
}

/// The unit for display of what was typed: without gauge (diagrams are absolute unless the view says otherwise), and
/// with a prefix where the bare SI unit would show strings of zeros.
std::string unitForDisplay(const units::Measure &measure)
{
    std::string unit = measure.unit;
    for (const std::string_view suffix : {"(g)", "(a)", "(gauge)", "(abs)", "(absolute)"})
        if (unit.ends_with(suffix)) unit.resize(unit.size() - suffix.size());
    if (measure.quantity == Quantity::pressure && (unit.ends_with("barg") || unit.ends_with("bara") || unit == "psig" ||
                                                   unit == "psia" || unit == "kPag" || unit == "MPag"))
        unit.pop_back();
    while (unit.ends_with(' ')) unit.pop_back();
    if (unit == "Pa" && std::abs(measure.value) >= 1e4) return "kPa";
    if ((unit == "m3" || unit == "m³") && measure.value < 0.1) return "L";
    return unit;
}

void takeTyped(const Design &design, const char *key, Quantity quantity, std::string &unit)
{
    const std::optional<units::Measure> measure = firstTyped(design, key, quantity);
    if (!measure) return;
    const std::string shown = unitForDisplay(*measure);
    if (units::inUnit(1.0, quantity, shown, 0.0)) unit = shown;
}

void takeStated(const Json &stated, const char *key, Quantity quantity, std::string &unit)
{
    const Json *value = member(stated, key);
    if (!value || !value->is_string()) return;
    const std::string text = value->get<std::string>();
    if (text.empty() || units::inUnit(1.0, quantity, text, 0.0)) unit = text;
}

} // namespace

units::DisplayUnits displayUnits(const Design &design)
{
    units::DisplayUnits units;
    takeTyped(design, "pressure", Quantity::pressure, units.pressure);
    takeTyped(design, "volume", Quantity::volume, units.volume);
    takeTyped(design, "temperature", Quantity::temperature, units.temperature);
    if (const Json *surroundings = member(design.json, "surroundings")) {
        const auto pressure = measureIn(*surroundings, "pressure", Quantity::pressure);
        if (pressure && pressure->basis == units::Basis::absolute) units.surroundingsPressure = pressure->value;
    }
    const Json *view = member(design.json, "view");
    if (!view) return units;
    if (const Json *stated = member(*view, "units")) {
        takeStated(*stated, "pressure", Quantity::pressure, units.pressure);
        takeStated(*stated, "volume", Quantity::volume, units.volume);
        takeStated(*stated, "temperature", Quantity::temperature, units.temperature);
        takeStated(*stated, "energy", Quantity::energy, units.energy);
    }
    const Json *sign = member(*view, "sign");
    units.workByGas = sign && *sign == "by the gas";
    return units;
}

} // namespace quasistat::document
