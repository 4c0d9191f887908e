#pragma once
// What follows ±: "0.1 bar", "1 %", "0.5 % FS 250 bar", "0.5 °C (uniform)".

#include "core/units/measure.h"
#include "core/units/unit.h"

namespace quasistat::units
{

/// What the uncertainty belongs to.
struct Stated {
    double number;    ///< as typed, in its own unit
    const Unit *unit; ///< null for a plain number
};

/// `text` after the sign ±. Units count as differences: no offset, no gauge. Fails with Reason::syntax, wrongType (a
/// unit of another dimension) or outOfRange (negative, k ≤ 0).
[[nodiscard]] Outcome<Uncertainty> uncertaintyOf(std::string_view text, const Stated &stated);

/// A typed quantity in front of "±" or "+/-", and what stands behind it.
struct SplitText {
    std::string_view value;
    std::optional<std::string_view> uncertainty;
};
[[nodiscard]] SplitText splitAtUncertainty(std::string_view text);

} // namespace quasistat::units
