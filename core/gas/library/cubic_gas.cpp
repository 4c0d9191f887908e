#include "core/gas/library/cubic_gas.h"

#include "core/gas/constants.h"
#include "core/gas/equation/cubic.h"
#include "core/gas/equation/equation.h"
#include "core/gas/ideal/ideal_mixture.h"
#include "core/gas/ideal/ideal_sum.h"
#include "core/gas/library/ideal_part.h"
#include "core/gas/phase/cubic_fugacities.h"
#include "core/gas/phase/dew_boundary.h"

#include <algorithm>
#include <cassert>
#include <cmath>
#include <limits>

namespace quasistat::gas
{
namespace
{

constexpr double closestTo = 0.9999; // of 1/b: where every search for a density ends

std::optional<Failure> wrong(const CubicComponent &component)
{
    const auto fault = [&](std::string sentence) {
        return Failure{Reason::outOfRange, "", {std::move(sentence), {component.name}}};
    };
    const auto isPositive = [](double value) { return value > 0.0 && std::isfinite(value); };
    const CriticalConstants &critical = component.critical;
    if (!isPositive(critical.temperature)) return fault("the critical temperature of {0} must be above zero");
    if (!isPositive(critical.pressure)) return fault("the critical pressure of {0} must be above zero");
    if (!isPositive(critical.molarMass)) return fault("the molar mass of {0} must be above zero");
    if (!(critical.acentricFactor > -1.0 && critical.acentricFactor < 2.0))
        return fault("the acentric factor of {0} must lie between −1 and 2 (argon 0, water 0.344)");
    return std::nullopt;
}

std::string equationSource(CubicForm form)
{
    switch (form) {
    case CubicForm::pengRobinson:
        return "D.-Y. Peng, D. B. Robinson, Ind. Eng. Chem. Fundam. 15 (1976) 59, with their m(ω) of 1978 above "
               "ω = 0.491";
    case CubicForm::soaveRedlichKwong: break;
    }
    return "G. Soave, Chem. Eng. Sci. 27 (1972) 1197";
}

void append(std::string &list, const std::string &source)
{
    if (source.empty() || list.find(source) != std::string::npos) return;
    list += (list.empty() ? "" : "; ") + source;
}

std::string sourceOf(const CubicRequest &request)
{
    std::string critical;
    std::string ideal;
    for (const CubicComponent &component : request.components) {
        append(critical, component.critical.source);
        append(ideal, component.idealSource);
    }
    return equationSource(request.form) + "; critical constants: " + critical + "; heat capacities: " + ideal;
}

Validity validityOf(const CubicRequest &request)
{
    constexpr double infinity = std::numeric_limits<double>::infinity();
    constexpr double coldestReduced = 0.5;
    const Range hard{coldestIdealPart, hottestIdealPart, infinity};
    Range valid = hard;
    double meanCritical = 0.0;
    for (std::size_t i = 0; i < request.components.size(); ++i) {
        const CubicComponent &component = request.components[i];
        meanCritical += request.fractions[i] * component.critical.temperature;
        valid.lowestTemperature = std::max(valid.lowestTemperature, component.idealRange.lowestTemperature);
        valid.highestTemperature = std::min(valid.highestTemperature, component.idealRange.highestTemperature);
    }
    valid.lowestTemperature = std::max(valid.lowestTemperature, coldestReduced * meanCritical);
    // Ranges that have nothing in common shrink to a point: a warning at every temperature, as it should be.
    valid.lowestTemperature = std::min(valid.lowestTemperature, valid.highestTemperature);
    return {valid, hard, {}};
}

CubicMixture mixtureOf(const CubicRequest &request)
{
    std::vector<CubicSubstance> substances;
    for (const CubicComponent &component : request.components)
        substances.push_back(
            {component.critical.temperature, component.critical.pressure, component.critical.acentricFactor});
    return {request.form, substances, request.interaction};
}

Equation equationOf(const CubicRequest &request, const Composition &composition)
{
    const CubicMixture mixture = mixtureOf(request);
    std::vector<std::shared_ptr<const IdealFunction>> ideals;
    for (const CubicComponent &component : request.components) ideals.push_back(component.ideal);
    const auto residual = std::make_shared<CubicResidual>(mixture, request.fractions);
    return {.gasConstant = molarGasConstant,
            .ideal = idealSum(ideals, request.fractions),
            .mixingEntropy = mixingEntropy(composition, molarGasConstant),
            .residual = residual,
            .highestDensity = closestTo / residual->covolume(),
            .saturation = nullptr,
            .boundary = std::make_shared<DewBoundary>(std::make_shared<CubicFugacities>(mixture), request.fractions,
                                                      coldestIdealPart)};
}

} // namespace

std::string_view keyOf(CubicForm form)
{
    return form == CubicForm::pengRobinson ? "peng-robinson" : "soave-redlich-kwong";
}

Outcome<GasPtr> cubicGas(CubicRequest request)
{
    const std::size_t n = request.components.size();
    assert(request.fractions.size() == n && request.interaction.size() == n * n);
    if (n == 0) return Failure{Reason::missing, "", {"a composition needs at least one gas", {}}};
    RealGasFacts facts{.model = std::string(keyOf(request.form)),
                       .name = request.name,
                       .composition = {},
                       .molarMass = 0.0,
                       .validity = {},
                       .source = {}};
    for (std::size_t i = 0; i < n; ++i) {
        const CubicComponent &component = request.components[i];
        assert(component.ideal);
        if (std::optional<Failure> failure = wrong(component)) return *failure;
        facts.composition.push_back({component.name, request.fractions[i]});
        facts.molarMass += request.fractions[i] * component.critical.molarMass;
    }
    facts.validity = validityOf(request);
    facts.source = sourceOf(request);
    Equation equation = equationOf(request, facts.composition);
    return realGas(std::move(equation), std::move(facts));
}

} // namespace quasistat::gas
