#include "ui/strip/end_field.h"

#include "core/units/measure.h"

#include <array>

namespace quasistat::ui
{

using path::EndKey;
using units::Quantity;

namespace
{

constexpr std::array endKeyTable{
    EndKeyFacts{EndKey::pressure, Quantity::pressure, QT_TRANSLATE_NOOP("EndKey", "pressure"), "p"},
    EndKeyFacts{EndKey::volume, Quantity::volume, QT_TRANSLATE_NOOP("EndKey", "volume"), "V"},
    EndKeyFacts{EndKey::temperature, Quantity::temperature, QT_TRANSLATE_NOOP("EndKey", "temperature"), "T"},
    EndKeyFacts{EndKey::pressureRatio, Quantity::number, QT_TRANSLATE_NOOP("EndKey", "pressure ratio"), ""},
    EndKeyFacts{EndKey::volumeRatio, Quantity::number, QT_TRANSLATE_NOOP("EndKey", "volume ratio"), ""},
    EndKeyFacts{EndKey::work, Quantity::energy, QT_TRANSLATE_NOOP("EndKey", "work into gas"), "W"},
    EndKeyFacts{EndKey::heat, Quantity::energy, QT_TRANSLATE_NOOP("EndKey", "heat into gas"), "Q"},
};

std::string unitFor(Quantity quantity, double value, const units::DisplayUnits &units)
{
    switch (quantity) {
    case Quantity::pressure: return units.pressure.empty() ? "bar" : units.pressure;
    case Quantity::volume: return units.volume.empty() ? "L" : units.volume;
    case Quantity::temperature: return units.temperature.empty() ? "°C" : units.temperature;
    default: return units::scaleFor(quantity, std::span(&value, 1), units).unit;
    }
}

double reached(const path::SegmentResult &result, EndKey key)
{
    switch (key) {
    case EndKey::pressure: return result.to.pressure();
    case EndKey::volume: return result.to.volume();
    case EndKey::temperature: return result.to.temperature().value_or(0.0);
    case EndKey::pressureRatio: return result.to.pressure() / result.from.pressure();
    case EndKey::volumeRatio: return result.to.volume() / result.from.volume();
    case EndKey::work: return result.work;
    case EndKey::heat: return result.heat;
    }
    return 0.0;
}

} // namespace

const EndKeyFacts &facts(EndKey key)
{
    return endKeyTable[static_cast<std::size_t>(key)];
}

std::optional<EndKey> endKeyFrom(const std::string &key)
{
    for (const EndKeyFacts &entry : endKeyTable)
        if (path::keyOf(entry.key) == key) return entry.key;
    return {};
}

QString endKeyWords(EndKey key)
{
    return QCoreApplication::translate("EndKey", facts(key).words);
}

std::optional<path::Process> processOf(const document::Json &segment)
{
    const auto kind = path::kindFromKey(typedAt(segment, "/kind").toStdString());
    if (!kind) return {};
    switch (*kind) {
    case path::Kind::isothermal: return path::Isothermal{};
    case path::Kind::isobaric: return path::Isobaric{};
    case path::Kind::isochoric: return path::Isochoric{};
    case path::Kind::polytropic:
        return path::Polytropic{valueAt(segment, "/exponent") ? std::optional(1.0) : std::nullopt};
    case path::Kind::isentropic: return path::Isentropic{};
    case path::Kind::linear: return path::Linear{valueAt(segment, "/stiffness") ? std::optional(1.0) : std::nullopt};
    case path::Kind::constantExternalPressure: return path::ConstantExternalPressure{1.0, path::Thermal::isothermal};
    case path::Kind::stepped: return path::Stepped{};
    case path::Kind::freeExpansion: return path::FreeExpansion{};
    }
    return {};
}

std::vector<EndKey> endKeysOf(const document::Json &segment)
{
    std::vector<EndKey> keys;
    const document::Json *end = valueAt(segment, "/end");
    if (!end || !end->is_object()) return keys;
    for (const auto &[name, value] : end->items())
        if (const auto key = endKeyFrom(name)) keys.push_back(*key);
    return keys;
}

QString typedValue(double value, Quantity quantity, const units::DisplayUnits &units)
{
    constexpr int digits = 5;
    if (quantity == Quantity::number) return QString::number(value, 'g', digits);
    const auto in = [&](std::string_view unit) {
        return units::typedIn(value, quantity, unit, units.surroundingsPressure, digits);
    };
    auto text = in(unitFor(quantity, value, units));
    if (!text) text = in(units::facts(quantity).unit); // a figure with a power of ten in place of a prefix
    return text ? QString::fromStdString(*text) : QString();
}

QString reachedValue(const path::SegmentResult &result, EndKey key, const units::DisplayUnits &units)
{
    return typedValue(reached(result, key), facts(key).quantity, units);
}

} // namespace quasistat::ui
