#include "core/document/faults.h"
#include "core/document/interpret_parts.h"

#include <array>

namespace quasistat::document
{

namespace
{

using units::Quantity;

Outcome<path::Start> evacuatedStart(const Fields &fields, const units::Conversion &conversion)
{
    for (const std::string_view key : {"pressure", "temperature", "amount"})
        if (fields.has(key))
            return fault(Reason::contradiction, fields.pointerTo(key), "an evacuated start has a volume and no {0}",
                         {std::string(key)});
    const Outcome<Place> place = fields.required("volume");
    if (!place) return place.failure();
    const Outcome<double> volume = positiveQuantityAt(*place, Quantity::volume, conversion);
    if (!volume) return volume.failure();
    path::Start start;
    start.volume = *volume;
    start.evacuated = true;
    return start;
}

Outcome<bool> evacuatedFlag(const Fields &fields)
{
    const std::optional<Place> place = fields.find("evacuated");
    if (!place) return false;
    if (!place->value->is_boolean())
        return fault(Reason::wrongType, place->pointer, "here stands {0}, not true or false",
                     {typeWords(*place->value)});
    return place->value->get<bool>();
}

/// The value at `key`, if the key is there.
Outcome<std::optional<double>> valueOf(const Fields &fields, std::string_view key, Quantity quantity,
                                       const units::Conversion &conversion)
{
    const std::optional<Place> place = fields.find(key);
    if (!place) return std::optional<double>();
    // A cylinder at top dead centre without clearance: only an intake can follow, which is not computed.
    if (quantity == Quantity::volume) {
        const Outcome<double> volume = quantityAt(*place, quantity, conversion);
        if (volume && *volume == 0.0) return notComputed(place->pointer, "a start with volume 0, before an intake");
    }
    const Outcome<double> value = positiveQuantityAt(*place, quantity, conversion);
    if (!value) return value.failure();
    return std::optional(*value);
}

} // namespace

Outcome<path::Surroundings> surroundingsFrom(const std::optional<Place> &place, Warnings &warnings)
{
    path::Surroundings surroundings;
    if (!place) return surroundings;
    const Outcome<Fields> fields = Fields::of(*place);
    if (!fields) return fields.failure();
    fields->warnOfUnknown({keys::surroundings}, warnings);
    if (const std::optional<Place> pressure = fields->find("pressure")) {
        if (pressure->value->is_string()) {
            const auto measure = units::measured(pressure->value->get<std::string>(), Quantity::pressure);
            if (measure && measure->basis == units::Basis::gauge)
                return fault(
                    Reason::contradiction, pressure->pointer,
                    "gauge pressures count from this pressure: write it as an absolute one, for instance “1.013 bar”");
        }
        const Outcome<double> value = positiveQuantityAt(*pressure, Quantity::pressure, {0.0, 1.0});
        if (!value) return value.failure();
        surroundings.pressure = *value;
        surroundings.pressureStated = true;
    }
    if (const std::optional<Place> temperature = fields->find("temperature")) {
        const Outcome<double> value = positiveQuantityAt(*temperature, Quantity::temperature, {0.0, 1.0});
        if (!value) return value.failure();
        surroundings.temperature = *value;
        surroundings.temperatureStated = true;
    }
    return surroundings;
}

Outcome<path::Start> startFrom(const Place &place, const units::Conversion &conversion, Warnings &warnings)
{
    const Outcome<Fields> fields = Fields::of(place);
    if (!fields) return fields.failure();
    fields->warnOfUnknown({keys::start}, warnings);
    const Outcome<bool> evacuated = evacuatedFlag(*fields);
    if (!evacuated) return evacuated.failure();
    if (*evacuated) return evacuatedStart(*fields, conversion);

    path::Start start;
    struct Field {
        std::string_view key;
        Quantity quantity;
        std::optional<double> *value;
    };
    int count = 0;
    for (const Field &field :
         {Field{"pressure", Quantity::pressure, &start.pressure},
          Field{"temperature", Quantity::temperature, &start.temperature},
          Field{"volume", Quantity::volume, &start.volume}, Field{"amount", Quantity::amount, &start.amount}}) {
        const Outcome<std::optional<double>> value = valueOf(*fields, field.key, field.quantity, conversion);
        if (!value) return value.failure();
        *field.value = *value;
        count += value->has_value() ? 1 : 0;
    }
    if (count < 3)
        return fault(Reason::missing, place.pointer,
                     "the start needs three of pressure, temperature, volume and amount; it has {0}",
                     {std::to_string(count)});
    if (count > 3)
        return fault(Reason::contradiction, place.pointer,
                     "three of pressure, temperature, volume and amount fix the start: remove one of the four");
    return start;
}

} // namespace quasistat::document
