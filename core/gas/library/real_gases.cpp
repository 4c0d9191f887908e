#include "core/gas/library/real_gases.h"

#include "core/gas/equation/equation.h"
#include "core/gas/equation/plan.h"
#include "core/gas/ideal/helmholtz_ideal.h"
#include "core/gas/ideal/ideal_mixture.h"
#include "core/gas/library/gerg_fugacities.h"
#include "core/gas/library/library.h"
#include "core/gas/phase/dew_boundary.h"
#include "core/gas/phase/pure_saturation.h"
#include "core/gas/solve/density.h"

#include <cassert>

namespace quasistat::gas
{
namespace
{

/// No published equation reaches this many times its critical density within its pressure range.
constexpr double densestOverCritical = 6.0;

/// The density at the highest pressure of the range and the lowest temperature, or where the equation's pressure stops
/// rising: beyond it polynomials have branches that are no fluid.
double highestDensity(const Equation &equation, const Range &hard, double liquidDensity)
{
    constexpr double step = 1.01;
    Isotherm isotherm;
    equation.residual->atTemperature(hard.lowestTemperature, false, isotherm);
    const double RT = equation.gasConstant * hard.lowestTemperature;
    double density = liquidDensity;
    while (density < equation.highestDensity) {
        const auto [a01, a02] = equation.residual->densityDerivatives(isotherm, density * step);
        if (!(1.0 + 2.0 * a01 + a02 > 0.0)) break;
        density *= step;
        if (density * RT * (1.0 + a01) > hard.highestPressure) break;
    }
    return density;
}

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
    if (const auto triple = equilibrium.saturation->atTemperature(data.validity.hard.lowestTemperature))
        equation.highestDensity = highestDensity(equation, data.validity.hard, 1.0 / triple->liquid.molarVolume);
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

GasPtr gergGas(const GergMixture &mixture, const Composition &composition,
               const std::vector<CriticalConstants> &critical, std::string name)
{
    assert(mixture.components.size() == composition.size() && critical.size() == composition.size());
    const GergModel &model = *mixture.model;
    std::vector<double> fractions;
    std::vector<Fugacities::Critical> guesses;
    double molarMass = 0.0;
    for (std::size_t i = 0; i < composition.size(); ++i) {
        fractions.push_back(composition[i].moleFraction);
        guesses.push_back({critical[i].temperature, critical[i].pressure, critical[i].acentricFactor});
        molarMass += composition[i].moleFraction * mixture.components[i].molarMass;
    }
    const auto fugacities = std::make_shared<GergFugacities>(mixture, guesses, model.gasConstant());
    Equation equation{.gasConstant = model.gasConstant(),
                      .ideal = helmholtzIdeal(idealTerms(mixture, fractions)),
                      .mixingEntropy = mixingEntropy(composition, model.gasConstant()),
                      .residual = std::make_shared<ResidualPlan>(residualTerms(mixture, fractions)),
                      .highestDensity = fugacities->closestPacking(fractions)};
    equation.boundary = std::make_shared<DewBoundary>(fugacities, fractions, model.validity().hard.lowestTemperature);
    return realGas(std::move(equation), {.model = "gerg-2008",
                                         .name = std::move(name),
                                         .composition = composition,
                                         .molarMass = molarMass,
                                         .validity = model.validity(),
                                         .source = model.source()});
}

Outcome<GasPtr> Library::reference(std::string_view fluid) const
{
    const auto data = this->data(fluid, "reference");
    if (!data) return data.failure();
    return referenceGas(**data);
}

Outcome<GasPtr> Library::gerg2008(const Composition &composition, std::string name) const
{
    const auto mixture = gergMixture(composition);
    if (!mixture) return mixture.failure();
    std::vector<CriticalConstants> critical;
    for (const Share &share : composition) {
        const auto data = this->data(share.component, "gerg-2008");
        if (!data) return data.failure();
        assert((*data)->critical); // the files of all 21 have it
        critical.push_back(*(*data)->critical);
    }
    return gergGas(*mixture, composition, critical, std::move(name));
}

} // namespace quasistat::gas
