#include "core/document/faults.h"
#include "core/document/interpret_parts.h"
#include "core/document/pointer.h"

#include <algorithm>
#include <array>

namespace quasistat::document
{

namespace
{

using analysis::Limit;
using analysis::LimitQuantity;
using units::Quantity;

struct LimitFacts {
    std::string_view key;
    LimitQuantity quantity;
    Quantity unit;
};
constexpr std::array limitTable{
    LimitFacts{"pressure", LimitQuantity::pressure, Quantity::pressure},
    LimitFacts{"volume", LimitQuantity::volume, Quantity::volume},
    LimitFacts{"temperature", LimitQuantity::temperature, Quantity::temperature},
    LimitFacts{"pressure_ratio", LimitQuantity::pressureRatio, Quantity::number},
    LimitFacts{"work", LimitQuantity::work, Quantity::energy},
    LimitFacts{"heat", LimitQuantity::heat, Quantity::energy},
    LimitFacts{"amount", LimitQuantity::amount, Quantity::amount},
    LimitFacts{"stored_energy", LimitQuantity::storedEnergy, Quantity::energy},
};
constexpr std::string_view rodLoad = "rod_load";

Outcome<const LimitFacts *> factsOf(const Fields &fields)
{
    const Outcome<Place> place = fields.required("quantity");
    if (!place) return place.failure();
    const Outcome<std::string> name = textAt(*place);
    if (!name) return name.failure();
    const auto *const row = std::ranges::find(limitTable, *name, &LimitFacts::key);
    if (row != limitTable.end()) return row;
    if (*name == rodLoad) return notComputed(place->pointer, "a limit on “rod_load”");
    std::vector<std::string_view> names;
    for (const LimitFacts &known : limitTable) names.push_back(known.key);
    return unknownName(place->pointer, "quantity of a limit", *name, names);
}

Outcome<std::optional<double>> bound(const Fields &fields, std::string_view key, const LimitFacts &row,
                                     const units::Conversion &conversion)
{
    const std::optional<Place> place = fields.find(key);
    if (!place) return std::optional<double>();
    const Outcome<double> value =
        row.unit == Quantity::number ? numberAt(*place) : quantityAt(*place, row.unit, conversion);
    if (!value) return value.failure();
    return std::optional(*value);
}

/// One pair [temperature, pressure] of a rating that falls with temperature.
Outcome<analysis::Rating> rating(const Place &place, const units::Conversion &conversion)
{
    if (!place.value->is_array() || place.value->size() != 2)
        return fault(Reason::wrongType, place.pointer, "a rating is a pair, for instance [\"150 °C\", \"10 bar\"]");
    const Outcome<double> temperature =
        quantityAt({&(*place.value)[0], pointerTo(place.pointer, std::size_t{0})}, Quantity::temperature, conversion);
    if (!temperature) return temperature.failure();
    const Outcome<double> pressure =
        quantityAt({&(*place.value)[1], pointerTo(place.pointer, std::size_t{1})}, Quantity::pressure, conversion);
    if (!pressure) return pressure.failure();
    return analysis::Rating{*temperature, *pressure};
}

Outcome<std::vector<analysis::Rating>> ratings(const Fields &fields, const LimitFacts &row,
                                               const units::Conversion &conversion)
{
    std::vector<analysis::Rating> list;
    const std::optional<Place> place = fields.find("max_at");
    if (!place) return list;
    if (row.quantity != LimitQuantity::pressure)
        return fault(Reason::contradiction, place->pointer, "a rating over temperature limits a pressure, not a {0}",
                     {std::string(row.key)});
    if (!place->value->is_array() || place->value->empty())
        return fault(Reason::wrongType, place->pointer,
                     "a rating is a list of pairs, for instance [[\"20 °C\", \"12 bar\"], [\"150 °C\", \"10 bar\"]]");
    for (std::size_t i = 0; i < place->value->size(); ++i) {
        const Outcome<analysis::Rating> pair = rating({&(*place->value)[i], pointerTo(place->pointer, i)}, conversion);
        if (!pair) return pair.failure();
        list.push_back(*pair);
    }
    std::ranges::stable_sort(list, {}, &analysis::Rating::temperature);
    const auto twice = std::ranges::adjacent_find(list, {}, &analysis::Rating::temperature);
    if (twice != list.end())
        return fault(Reason::contradiction, place->pointer, "two ratings stand at {0}",
                     {Figure{Quantity::temperature, twice->temperature}});
    return list;
}

std::optional<Failure> inconsistent(const Fields &fields, const Limit &limit)
{
    if (!limit.min && !limit.max && limit.maxAt.empty())
        return fault(Reason::missing, fields.pointer(), "a limit needs “min”, “max” or “max_at”");
    if (limit.max && !limit.maxAt.empty())
        return fault(Reason::contradiction, fields.pointerTo("max_at"),
                     "“max” and “max_at” exclude each other: remove one");
    if (limit.min && limit.max && *limit.min > *limit.max)
        return fault(Reason::contradiction, fields.pointerTo("min"), "the least value allowed is above the greatest");
    return std::nullopt;
}

Outcome<Limit> limitFrom(const Place &place, const units::Conversion &conversion, Warnings &warnings)
{
    const Outcome<Fields> fields = Fields::of(place);
    if (!fields) return fields.failure();
    const Outcome<const LimitFacts *> row = factsOf(*fields);
    if (!row) return row.failure();
    fields->warnOfUnknown({keys::limit}, warnings);
    const Outcome<std::optional<std::string>> label = fields->text("label");
    if (!label) return label.failure();
    const Outcome<std::optional<double>> least = bound(*fields, "min", **row, conversion);
    if (!least) return least.failure();
    const Outcome<std::optional<double>> most = bound(*fields, "max", **row, conversion);
    if (!most) return most.failure();
    Outcome<std::vector<analysis::Rating>> falling = ratings(*fields, **row, conversion);
    if (!falling) return falling.failure();
    Limit limit{.quantity = (*row)->quantity,
                .label = label->value_or(std::string()),
                .min = *least,
                .max = *most,
                .maxAt = std::move(*falling)};
    if (const std::optional<Failure> failure = inconsistent(*fields, limit)) return *failure;
    return limit;
}

} // namespace

Outcome<std::vector<Limit>> limitsFrom(const Place &place, const units::Conversion &conversion, Warnings &warnings)
{
    if (!place.value->is_array())
        return fault(Reason::wrongType, place.pointer, "here stands {0}, not a list of limits: […]",
                     {typeWords(*place.value)});
    std::vector<Limit> limits;
    for (std::size_t i = 0; i < place.value->size(); ++i) {
        Outcome<Limit> limit = limitFrom({&(*place.value)[i], pointerTo(place.pointer, i)}, conversion, warnings);
        if (!limit) return limit.failure();
        limits.push_back(std::move(*limit));
    }
    return limits;
}

} // namespace quasistat::document
