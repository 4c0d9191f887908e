#pragma once
// Facts per segment kind: one table that the reader, the cards and the drawings share.

#include "core/path/segment.h"

#include <array>
#include <optional>
#include <span>

namespace quasistat::path
{

/// In the order of path::Process.
enum class Kind {
    isothermal,
    isobaric,
    isochoric,
    polytropic,
    isentropic,
    linear,
    constantExternalPressure,
    stepped,
    freeExpansion
};

/// Colour, dash pattern and glyph go by family (resources/palette.json).
enum class Family {
    isothermal,
    isobaric,
    isochoric,
    polytropic,
    isentropicAdiabatic,
    linearTraced,
    irreversible,
    movingMatter
};

struct KindFacts {
    Kind kind;
    std::string_view key;   ///< in the document: "constant-external-pressure"
    std::string_view words; ///< as read by a person: "constant external pressure"
    Family family;
    bool quasiStatic; ///< the curve's area is the work
};

inline constexpr std::array kindTable{
    KindFacts{Kind::isothermal, "isothermal", "isothermal", Family::isothermal, true},
    KindFacts{Kind::isobaric, "isobaric", "isobaric", Family::isobaric, true},
    KindFacts{Kind::isochoric, "isochoric", "isochoric", Family::isochoric, true},
    KindFacts{Kind::polytropic, "polytropic", "polytropic", Family::polytropic, true},
    KindFacts{Kind::isentropic, "isentropic", "isentropic", Family::isentropicAdiabatic, true},
    KindFacts{Kind::linear, "linear", "linear", Family::linearTraced, true},
    KindFacts{Kind::constantExternalPressure, "constant-external-pressure", "constant external pressure",
              Family::irreversible, false},
    KindFacts{Kind::stepped, "stepped", "stepped", Family::irreversible, false},
    KindFacts{Kind::freeExpansion, "free-expansion", "free expansion", Family::irreversible, false},
};
static_assert(kindTable.size() == std::variant_size_v<Process>, "every kind of Process has its facts");

[[nodiscard]] constexpr const KindFacts &facts(Kind kind)
{
    return kindTable[static_cast<std::size_t>(kind)];
}
[[nodiscard]] inline Kind kindOf(const Process &process)
{
    return static_cast<Kind>(process.index());
}
/// "isothermal" → Kind::isothermal; none for a key that is not computed.
[[nodiscard]] std::optional<Kind> kindFromKey(std::string_view key);
/// Kinds of the format that this version does not compute: refused by name, never ignored.
[[nodiscard]] std::span<const std::string_view> kindsNotComputed();

/// End keys a kind takes, in the order a person is offered them. `pairs`: two of them are needed (polytropic without
/// exponent, linear without stiffness).
struct EndChoice {
    std::span<const EndKey> keys;
    int needed; ///< how many of them: 1 or 2; 0: the kind may end at balance
};
[[nodiscard]] EndChoice endChoice(const Process &process);

} // namespace quasistat::path
