#include "core/gas/equation/residual.h"

#include <cassert>

namespace quasistat::gas
{

Alpha Residual::at(double temperature, double density) const
{
    Isotherm isotherm;
    atTemperature(temperature, true, isotherm);
    return at(isotherm, density);
}

void Residual::atEach(std::span<const double> temperatures, std::span<const double> densities,
                      std::span<Alpha> results) const
{
    assert(temperatures.size() == densities.size() && densities.size() == results.size());
    for (std::size_t i = 0; i < results.size(); ++i) results[i] = at(temperatures[i], densities[i]);
}

} // namespace quasistat::gas
