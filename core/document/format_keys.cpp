#include "core/document/format_keys.h"

#include <algorithm>

namespace quasistat::document
{

namespace
{

constexpr std::array<std::string_view, 1> dissipatedWork{"dissipated_work"};
constexpr std::array<std::string_view, 1> exponent{"exponent"};
constexpr std::array<std::string_view, 1> stiffness{"stiffness"};
constexpr std::array<std::string_view, 2> externalPressure{"external_pressure", "thermal"};
constexpr std::array<std::string_view, 1> load{"load"};
constexpr std::array<std::string_view, 3> stepped{"steps", "spacing", "thermal"};
constexpr std::array<std::string_view, 1> thermal{"thermal"};

// Keys of the kinds that this version does not compute.
constexpr std::array<std::string_view, 20> ofOtherKinds{"isentropic_efficiency",
                                                        "polytropic_efficiency",
                                                        "basis",
                                                        "volume_unit",
                                                        "pressure_unit",
                                                        "points",
                                                        "trace",
                                                        "supply_temperature",
                                                        "supply_pressure",
                                                        "supply_composition",
                                                        "supply_volume",
                                                        "heat",
                                                        "wall_heat_capacity",
                                                        "vessel",
                                                        "vessel_composition",
                                                        "opening",
                                                        "reservoir_temperature",
                                                        "regenerator",
                                                        "effectiveness",
                                                        "amount_moved"};

bool isIn(Keys keys, std::string_view key)
{
    return std::ranges::find(keys, key) != keys.end();
}

} // namespace

KindKeys ownKeys(path::Kind kind)
{
    using path::Kind;
    switch (kind) {
    case Kind::isothermal:
    case Kind::isobaric:
    case Kind::isochoric: return {.own = {}, .notComputed = dissipatedWork};
    case Kind::polytropic: return {.own = exponent, .notComputed = {}};
    case Kind::isentropic: return {};
    case Kind::linear: return {.own = stiffness, .notComputed = {}};
    case Kind::constantExternalPressure: return {.own = externalPressure, .notComputed = load};
    case Kind::stepped: return {.own = stepped, .notComputed = {}};
    case Kind::freeExpansion: return {.own = thermal, .notComputed = {}};
    }
    return {};
}

bool isSegmentKey(std::string_view key)
{
    const auto takes = [key](const path::KindFacts &row) {
        const KindKeys kindKeys = ownKeys(row.kind);
        return isIn(kindKeys.own, key) || isIn(kindKeys.notComputed, key);
    };
    return isIn(ofOtherKinds, key) || std::ranges::any_of(path::kindTable, takes);
}

} // namespace quasistat::document
