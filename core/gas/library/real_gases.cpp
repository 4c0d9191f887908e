#include "core/gas/library/real_gases.h"

#include "core/gas/equation/equation.h"
#include "core/gas/equation/plan.h"
#include "core/gas/ideal/helmholtz_ideal.h"
#include "core/gas/ideal/ideal_mixture.h"
#include "core/gas/phase/pure_saturation.h"

#include <cassert>

namespace quasistat::gas
{
namespace
{

/// No published equation reaches this many times its critical density within its pressure range.
constexpr double densestOverCritical = 6.0;

void addPhases(Equation &equation, const ReferenceData &data)
{
    const SaturationTable::CriticalPoint critical{data.criticalTemperature, data.criticalPressure,
                                                  data.criticalDensity};
    const auto liquid = [ancillary = data.liquidDensity](double T) { return valueOf(ancillary, T); };
    if (data.isPseudoPure) {
        assert(data.saturationPressure);
        const auto dew = [ancillary = *data.saturationPressure](double T) { return valueOf(ancillary, T); };
        equation.boundary = pseudoPureBoundary(equation, {data.validity.hard.lowestTemperature, critical, dew, liquid});
        return;
    }
    const auto guess = [liquid, ancillary = data.vapourDensity](double T) {
        return SaturatedDensities{liquid(T), valueOf(ancillary, T)};
    };
    const auto equilibrium = pureEquilibrium(equation, {data.validity.hard.lowestTemperature, critical, guess});
    equation.saturation = equilibrium.saturation;
    equation.boundary = equilibrium.boundary;
}

} // namespace

GasPtr referenceGas(const GasData &data)
{
    assert(data.reference);
    const ReferenceData &reference = *data.reference;
    Equation equation{.gasConstant = reference.gasConstant,
                      .ideal = helmholtzIdeal(reference.ideal),
                      .mixingEntropy = 0.0,
                      .residual = std::make_shared<ResidualPlan>(reference.residual),
                      .highestDensity = densestOverCritical * reference.criticalDensity};
    addPhases(equation, reference);
    return realGas(std::move(equation), {.model = "reference",
                                         .name = data.name,
                                         .composition = {{data.name, 1.0}},
                                         .molarMass = reference.molarMass,
                                         .validity = reference.validity,
                                         .source = reference.source});
}

GasPtr gergGas(const GergMixture &mixture, const Composition &composition, const GergFacts &facts, std::string name)
{
    assert(mixture.components.size() == composition.size());
    std::vector<double> fractions;
    double molarMass = 0.0;
    for (std::size_t i = 0; i < composition.size(); ++i) {
        fractions.push_back(composition[i].moleFraction);
        molarMass += composition[i].moleFraction * mixture.components[i].molarMass;
    }
    Equation equation{.gasConstant = facts.gasConstant,
                      .ideal = helmholtzIdeal(idealTerms(mixture, fractions)),
                      .mixingEntropy = mixingEntropy(composition, facts.gasConstant),
                      .residual = std::make_shared<ResidualPlan>(residualTerms(mixture, fractions)),
                      .highestDensity = densestOverCritical * reducing(mixture, fractions).density};
    return realGas(std::move(equation), {.model = "gerg-2008",
                                         .name = std::move(name),
                                         .composition = composition,
                                         .molarMass = molarMass,
                                         .validity = facts.validity,
                                         .source = facts.source});
}

} // namespace quasistat::gas
