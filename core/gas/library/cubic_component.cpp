// Components of cubic equations: from the data, or as a user states them.

#include "core/gas/ideal/held_ideal.h"
#include "core/gas/ideal/helmholtz_ideal.h"
#include "core/gas/library/cubic_gas.h"
#include "core/gas/library/ideal_part.h"

#include <algorithm>
#include <cassert>
#include <cmath>
#include <limits>

namespace quasistat::gas
{
namespace
{

constexpr std::size_t mostCoefficients = 20;

Failure outOfRange(std::string pointer, std::string sentence, std::vector<std::variant<Figure, std::string>> figures)
{
    return {Reason::outOfRange, std::move(pointer), {std::move(sentence), std::move(figures)}};
}

Figure kelvin(double temperature)
{
    return {units::Quantity::temperature, temperature};
}

} // namespace

CubicComponent cubicComponent(const GasData &data)
{
    assert(data.critical && (data.idealGas || data.reference));
    constexpr double infinity = std::numeric_limits<double>::infinity();
    CubicComponent component{
        .name = data.name, .critical = *data.critical, .ideal = {}, .idealRange = {}, .idealSource = {}};
    if (data.idealGas) {
        component.ideal = std::make_shared<HeatCapacity>(heatCapacityOf(*data.idealGas));
        component.idealRange = {data.idealGas->limits.front(), data.idealGas->limits.back(), infinity};
        component.idealSource = data.idealGas->source;
        return component;
    }
    const Range &valid = data.reference->validity.valid;
    component.ideal =
        heldIdeal(helmholtzIdeal(data.reference->ideal), valid.lowestTemperature, valid.highestTemperature);
    component.idealRange = {valid.lowestTemperature, valid.highestTemperature, infinity};
    component.idealSource = data.reference->source;
    return component;
}

Outcome<std::shared_ptr<const IdealFunction>> idealFunctionOf(const StatedHeatCapacity &stated)
{
    if (stated.coefficients.empty())
        return Failure{Reason::missing, "/cp_over_R", {"a heat capacity needs at least one coefficient", {}}};
    if (stated.coefficients.size() > mostCoefficients)
        return outOfRange("/cp_over_R", "a heat capacity takes at most {0} coefficients, not {1}",
                          {std::to_string(mostCoefficients), std::to_string(stated.coefficients.size())});
    if (!(stated.from < stated.to))
        return outOfRange("/to", "the range of a heat capacity ends at {0}, but begins at {1}",
                          {kelvin(stated.to), kelvin(stated.from)});
    const double from = std::max(stated.from, coldestIdealPart);
    const double to = std::min(stated.to, hottestIdealPart);
    if (!(from < to))
        return outOfRange("", "this range of a heat capacity lies outside {0} to {1}",
                          {kelvin(coldestIdealPart), kelvin(hottestIdealPart)});
    const auto polynomial = std::make_shared<HeatCapacity>(
        heatCapacityOf({.molarMass = 0.0, .limits = {from, to}, .rows = {stated.coefficients}, .source = {}}));
    constexpr int looks = 200; // a polynomial a person fitted has no bend between two of them
    for (int k = 0; k <= looks; ++k) {
        const double temperature = from + (to - from) * k / looks;
        const double ratio = polynomial->at(temperature).heatCapacity;
        if (!(ratio > 1.0) || !std::isfinite(ratio))
            return outOfRange(
                "/cp_over_R",
                "at {0} this heat capacity is {1} R; c_p is greater than R at every temperature "
                "(the coefficients are ascending powers of T in kelvin)",
                {kelvin(temperature), Figure{units::Quantity::number, std::isfinite(ratio) ? ratio : 0.0}});
    }
    return std::shared_ptr<const IdealFunction>(polynomial);
}

} // namespace quasistat::gas
