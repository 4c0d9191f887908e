#pragma once
// The heat capacity of an ideal gas from its published polynomials, carried on to where every ideal part ends.

#include "core/gas/ideal/heat_capacity.h"
#include "core/gas/library/gas_files.h"

namespace quasistat::gas
{

/// Hard limits of every ideal part made of polynomials [K] (format of the document, "gas"): beyond them there is no
/// answer.
inline constexpr double coldestIdealPart = 50.0;
inline constexpr double hottestIdealPart = 6000.0;

/// The published rows between the constants that carry c_p on to the hard limits; h and s° joined at every seam.
[[nodiscard]] HeatCapacity heatCapacityOf(const IdealGasData &data);

} // namespace quasistat::gas
