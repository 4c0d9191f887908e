#include "core/gas/phase/fugacity.h"

#include <cassert>
#include <cmath>

namespace quasistat::gas
{

void Fugacities::lnFugacityCoefficients(double temperature, double density, std::span<const double> fractions,
                                        std::span<double> result) const
{
    const double pressure = residualPotentials(temperature, density, fractions, result);
    assert(pressure > 0.0);
    const double lnZ = std::log(pressure / (density * gasConstant() * temperature));
    for (double &value : result) value -= lnZ;
}

} // namespace quasistat::gas
