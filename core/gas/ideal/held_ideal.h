#pragma once
// An ideal part that keeps its heat capacity beyond its published range.

#include "core/gas/ideal/ideal_function.h"

#include <memory>

namespace quasistat::gas
{

/// `function` from `from` to `to` [K]; beyond them c_p stays what it is at the end, h and s° go on without a break.
/// Both are zero at 298.15 K as everywhere, wherever that lies.
[[nodiscard]] std::shared_ptr<const IdealFunction> heldIdeal(std::shared_ptr<const IdealFunction> function, double from,
                                                             double to);

} // namespace quasistat::gas
