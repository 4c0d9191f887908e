#include "core/gas/library/component_facts.h"

#include "core/gas/library/ideal_part.h"

#include <array>
#include <limits>

namespace quasistat::gas
{
namespace
{

constexpr double infinity = std::numeric_limits<double>::infinity();

struct Ranges {
    Range valid;
    Range hard;
};

Ranges rangesOf(const IdealGasData &ideal)
{
    return {.valid = {ideal.limits.front(), ideal.limits.back(), infinity},
            .hard = {coldestIdealPart, hottestIdealPart, infinity}};
}

/// A cubic equation sets no limits; its ideal part does, of the polynomials or else of the reference equation.
Ranges rangesOfCubic(const GasData &data)
{
    if (data.idealGas) return rangesOf(*data.idealGas);
    const Range &valid = data.reference->validity.valid;
    return {.valid = {valid.lowestTemperature, valid.highestTemperature, infinity},
            .hard = {coldestIdealPart, hottestIdealPart, infinity}};
}

} // namespace

std::span<const std::string_view> modelsOfGases()
{
    static constexpr std::array<std::string_view, 5> models{"ideal", "peng-robinson", "soave-redlich-kwong",
                                                            "gerg-2008", "reference"};
    return models;
}

bool isIn(std::string_view model, const GasData &data)
{
    if (model == "ideal") return data.idealGas.has_value();
    if (model == "gerg-2008") return data.gerg.has_value();
    if (model == "reference") return data.reference.has_value();
    return data.critical && (data.idealGas || data.reference);
}

double molarMassIn(std::string_view model, const GasData &data)
{
    if (model == "ideal") return data.idealGas->molarMass;
    if (model == "gerg-2008") return data.gerg->molarMass;
    if (model == "reference") return data.reference->molarMass;
    return data.critical->molarMass;
}

std::optional<ComponentFacts> factsIn(std::string_view model, const GasData &data, GasStore &store)
{
    if (!isIn(model, data)) return std::nullopt;
    ComponentFacts facts{.name = data.name, .formula = data.formula, .molarMass = molarMassIn(model, data)};
    const auto fill = [&](const Ranges &ranges, const std::string &source, const std::string &uncertainty) {
        facts.range = ranges.valid;
        facts.hard = ranges.hard;
        facts.source = source;
        facts.uncertainty = uncertainty;
    };
    if (model == "ideal") {
        fill(rangesOf(*data.idealGas), data.idealGas->source, {});
    } else if (model == "gerg-2008") {
        const auto gerg = store.gergModel();
        fill({gerg->validity().valid, gerg->validity().hard}, gerg->source(), gerg->validity().uncertainty);
    } else if (model == "reference") {
        const Validity &validity = data.reference->validity;
        fill({validity.valid, validity.hard}, data.reference->source, validity.uncertainty);
    } else {
        fill(rangesOfCubic(data), data.critical->source, {});
    }
    return facts;
}

} // namespace quasistat::gas
