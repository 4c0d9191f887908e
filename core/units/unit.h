#pragma once
// What a typed unit means: its SI unit, factor and offset.

#include "core/outcome/outcome.h"
#include "core/units/quantity.h"

#include <string_view>

namespace quasistat::units
{

struct Unit {
    std::string_view
        siUnit;          ///< that of quantityTable it converts to; empty if no quantity of the table has its dimension
    double factor = 1.0; ///< SI value = typed · factor + offset
    double offset = 0.0;
    bool gauge = false; ///< a pressure relative to the surroundings
};

/// The unit of `text`: "psi", "°C", "bar(g)", "kgf/cm2", "L·atm", "1/min". Fails with Reason::syntax or unknownName, or
/// unreadable where the unit table of UDUNITS-2 is not installed. Thread-safe; a text seen before costs a table
/// look-up.
[[nodiscard]] Outcome<Unit> unitFrom(std::string_view text);

/// `unit` measures `quantity`, an amount also by mass.
[[nodiscard]] bool measures(const Unit &unit, Quantity quantity);

/// `text` as it is printed: "degC" → "°C", "cm3" → "cm³", "L.atm" → "L·atm".
[[nodiscard]] std::string printedUnit(std::string_view text);

} // namespace quasistat::units
