#pragma once
// The keys of the document, in one place: the reader, the change of a kind and the test of the schema go by them.

#include "core/path/kind.h"

#include <array>
#include <span>
#include <string_view>

namespace quasistat::document
{

using Keys = std::span<const std::string_view>;

namespace keys
{
inline constexpr std::array<std::string_view, 15> design{
    "quasistat", "title", "notes",  "document", "gas",         "surroundings", "start",       "segments",
    "limits",    "rate",  "traces", "targets",  "annotations", "view",         "correlations"};
inline constexpr std::array<std::string_view, 2> designElsewhere{"alternatives", "steady_cycle"};
inline constexpr std::array<std::string_view, 7> titleBlock{"number",      "revision",   "date",       "organisation",
                                                            "prepared_by", "checked_by", "approved_by"};
inline constexpr std::array<std::string_view, 2> surroundings{"pressure", "temperature"};
inline constexpr std::array<std::string_view, 5> start{"pressure", "temperature", "volume", "amount", "evacuated"};
inline constexpr std::array<std::string_view, 6> limit{"quantity", "label", "min", "max", "max_at", "bore"};

/// Every kind takes these; the second list is part of the format and not computed.
inline constexpr std::array<std::string_view, 3> segment{"kind", "end", "label"};
inline constexpr std::array<std::string_view, 3> segmentNotComputed{"reservoir_temperature", "regenerator",
                                                                    "effectiveness"};
/// Keys of `end` besides those of path::EndKey.
inline constexpr std::array<std::string_view, 2> endBesides{"state", "direction"};

inline constexpr std::array<std::string_view, 6> models{"perfect",   "ideal",    "peng-robinson", "soave-redlich-kwong",
                                                        "gerg-2008", "reference"};
inline constexpr std::array<std::string_view, 4> perfectGas{"model", "name", "heat_capacity_ratio", "molar_mass"};
inline constexpr std::array<std::string_view, 3> mixture{"model", "composition", "composition_by_mass"};
/// What a cubic equation's gas takes beyond a mixture's keys.
inline constexpr std::array<std::string_view, 2> cubicGas{"components", "binary_interaction"};
inline constexpr std::array<std::string_view, 5> ownGas{"critical_temperature", "critical_pressure", "acentric_factor",
                                                        "molar_mass", "heat_capacity"};
inline constexpr std::array<std::string_view, 3> heatCapacity{"cp_over_R", "from", "to"};
inline constexpr std::array<std::string_view, 2> referenceGas{"model", "fluid"};
} // namespace keys

/// What one kind takes beyond the keys that all of them take.
struct KindKeys {
    Keys own;         ///< read by this version
    Keys notComputed; ///< part of the format for this kind, refused
};
[[nodiscard]] KindKeys ownKeys(path::Kind kind);

/// `key` is one of the format's for some kind of segment: it belongs to its kind and does not outlive it.
[[nodiscard]] bool isSegmentKey(std::string_view key);

} // namespace quasistat::document
