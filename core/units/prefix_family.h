#pragma once
// Units of one quantity in their readable prefixes, and which of them suits a column of figures.

#include "core/units/quantity.h"

#include <span>
#include <string_view>

namespace quasistat::units
{

struct PrefixedUnit {
    std::string_view unit; ///< as printed
    double factor;         ///< SI value of one
    double least;          ///< it is chosen from this SI magnitude of the largest figure on
};

/// Ascending; empty for a quantity that takes no prefix (a plain number).
[[nodiscard]] std::span<const PrefixedUnit> prefixFamily(Quantity quantity);

} // namespace quasistat::units
