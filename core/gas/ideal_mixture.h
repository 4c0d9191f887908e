#pragma once
// A mixture of ideal gases with heat capacities that vary with temperature.

#include "core/gas/gas.h"
#include "core/gas/heat_capacity.h"

namespace quasistat::gas
{

/// What the mixture is made of besides its heat capacity.
struct IdealMixtureFacts {
    Composition composition;
    double molarMass; ///< [kg/mol]
    Validity validity;
    std::string name;
    std::string source;
};

/// s = s°(T) − R ln(p/p°) − R Σ xᵢ ln xᵢ; h = h(T); R exact.
[[nodiscard]] GasPtr idealMixture(HeatCapacity heatCapacity, IdealMixtureFacts facts);

} // namespace quasistat::gas
