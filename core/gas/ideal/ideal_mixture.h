#pragma once
// A mixture of ideal gases with heat capacities that vary with temperature.

#include "core/gas/gas.h"
#include "core/gas/ideal/ideal_function.h"

namespace quasistat::gas
{

/// What the mixture is made of besides its heat capacity.
struct IdealMixtureFacts {
    std::string model; ///< key of the document: "ideal"
    Composition composition;
    double molarMass;   ///< [kg/mol]
    double gasConstant; ///< R [J/(mol K)] of the equation whose ideal part this is
    Validity validity;
    std::string name;
    std::string source;
};

/// −R Σ xᵢ ln xᵢ [J/(mol K)].
[[nodiscard]] double mixingEntropy(const Composition &composition, double gasConstant);

/// s = s°(T) − R ln(p/p°) − R Σ xᵢ ln xᵢ; h = h(T). `function`: of the mixture, Σ xᵢ of its components'.
[[nodiscard]] GasPtr idealMixture(std::shared_ptr<const IdealFunction> function, IdealMixtureFacts facts);

} // namespace quasistat::gas
