#pragma once
// The molar volume at temperature and pressure: the one everything else rests on.

#include "core/gas/equation/equation.h"

namespace quasistat::gas
{

/// Molar volume [m³/mol] of the stable homogeneous fluid of a real gas at T [K] and p [Pa]: the only one, or of a
/// vapour and a liquid root that of the lower Gibbs energy. `guess`: a volume nearby, or 0. None where the equation
/// reaches the pressure at no density below its highest.
[[nodiscard]] std::optional<double> molarVolumeAt(const Equation &equation, double temperature, double pressure,
                                                  double guess = 0.0);

} // namespace quasistat::gas
