#include "core/gas/library/library.h"

#include "core/gas/constants.h"
#include "core/gas/ideal/heat_capacity.h"
#include "core/gas/ideal/ideal_mixture.h"

#include <nlohmann/json.hpp>

#include <algorithm>
#include <cctype>
#include <limits>

namespace quasistat::resources
{
std::string_view nasaPolynomials();
}

namespace quasistat::gas
{
namespace
{

/// Hard limits of every ideal part (format of the document, "gas"): beyond them there is no answer.
constexpr double coldestIdealPart = 50.0;
constexpr double hottestIdealPart = 6000.0;

struct Species {
    ComponentFacts facts;
    HeatCapacity heatCapacity;
};

std::string lowerCase(std::string_view text)
{
    std::string result(text);
    std::transform(result.begin(), result.end(), result.begin(),
                   [](unsigned char c) { return static_cast<char>(std::tolower(c)); });
    return result;
}

/// "R14 (tetrafluoromethane)" → "tetrafluoromethane"; "Nitrogen" → "nitrogen".
std::string canonicalName(std::string_view published)
{
    const auto open = published.find('(');
    const auto close = published.rfind(')');
    if (open != std::string_view::npos && close != std::string_view::npos && open < close)
        return lowerCase(published.substr(open + 1, close - open - 1));
    return lowerCase(published);
}

double heatCapacityAt(const std::array<double, 5> &a, double t)
{
    return a[0] + t * (a[1] + t * (a[2] + t * (a[3] + t * a[4])));
}

/// The published rows between the constants that carry them on to the hard limits.
HeatCapacity heatCapacityOf(const std::vector<double> &limits, const std::vector<std::array<double, 5>> &rows)
{
    std::vector<HeatCapacityPiece> pieces;
    const double coldest = limits.front();
    const double hottest = limits.back();
    if (coldest > coldestIdealPart)
        pieces.push_back({.from = coldestIdealPart, .to = coldest, .a = {heatCapacityAt(rows.front(), coldest)}});
    for (std::size_t i = 0; i < rows.size(); ++i)
        pieces.push_back({.from = limits[i], .to = limits[i + 1], .a = rows[i]});
    if (hottest < hottestIdealPart)
        pieces.push_back({.from = hottest, .to = hottestIdealPart, .a = {heatCapacityAt(rows.back(), hottest)}});
    return HeatCapacity(std::move(pieces));
}

Species speciesFrom(const nlohmann::json &entry)
{
    const auto limits = entry.at("ranges").get<std::vector<double>>();
    std::vector<std::array<double, 5>> rows;
    for (const auto &row : entry.at("coefficients")) {
        std::array<double, 5> a{};
        for (std::size_t k = 0; k < a.size(); ++k) a[k] = row.at(k).get<double>();
        rows.push_back(a); // rows 6 and 7 only place the zeros of h and s, which are ours to place
    }
    return {.facts = {.name = canonicalName(entry.at("name").get<std::string>()),
                      .formula = entry.at("formula").get<std::string>(),
                      .molarMass = entry.at("M").get<double>(),
                      .range = {limits.front(), limits.back(), std::numeric_limits<double>::infinity()}},
            .heatCapacity = heatCapacityOf(limits, rows)};
}

std::string joined(const std::vector<std::string> &names)
{
    std::string text;
    for (const std::string &name : names) text += (text.empty() ? "" : ", ") + name;
    return text;
}

} // namespace

struct Library::Data {
    std::vector<Species> species;
    std::vector<ComponentFacts> facts;
    std::string source;

    [[nodiscard]] const Species *find(std::string_view name) const
    {
        const auto it =
            std::find_if(species.begin(), species.end(), [&](const Species &s) { return s.facts.name == name; });
        return it == species.end() ? nullptr : &*it;
    }
};

Library::Library()
{
    const auto json = nlohmann::json::parse(resources::nasaPolynomials());
    auto data = std::make_unique<Data>();
    for (const auto &entry : json.at("species")) data->species.push_back(speciesFrom(entry));
    for (const Species &species : data->species) data->facts.push_back(species.facts);
    data->source = "heat capacities: B. J. McBride, S. Gordon, M. A. Reno, NASA Technical Memorandum 4513 (1993)";
    m_data = std::move(data);
}

Library::~Library() = default;

const std::vector<ComponentFacts> &Library::idealComponents() const
{
    return m_data->facts;
}

Failure Library::unknown(std::string_view name) const
{
    std::vector<std::string> near;
    for (const ComponentFacts &facts : m_data->facts)
        if (!name.empty() && facts.name.starts_with(lowerCase(name.substr(0, 2)))) near.push_back(facts.name);
    if (near.empty())
        return {Reason::unknownName,
                "",
                {"there is no gas named “{0}” here; `quasistat gases` lists them all", {std::string(name)}}};
    return {Reason::unknownName,
            "",
            {"there is no gas named “{0}” here; near it are: {1}", {std::string(name), joined(near)}}};
}

Outcome<std::string> Library::componentName(std::string_view nameOrFormula) const
{
    if (const Species *species = m_data->find(lowerCase(nameOrFormula))) return species->facts.name;
    std::vector<std::string> sameFormula;
    for (const ComponentFacts &facts : m_data->facts)
        if (facts.formula == nameOrFormula) sameFormula.push_back(facts.name);
    if (sameFormula.size() == 1) return sameFormula.front();
    if (sameFormula.size() > 1)
        return Failure{Reason::ambiguous,
                       "",
                       {"the formula {0} stands for more than one gas: write {1}",
                        {std::string(nameOrFormula), joined(sameFormula)}}};
    return unknown(nameOrFormula);
}

Outcome<double> Library::molarMass(std::string_view component) const
{
    if (const Species *species = m_data->find(component)) return species->facts.molarMass;
    return unknown(component);
}

Outcome<GasPtr> Library::idealGas(const Composition &composition, std::string name) const
{
    std::vector<const HeatCapacity *> parts;
    std::vector<double> weights;
    IdealMixtureFacts facts{.model = "ideal",
                            .composition = composition,
                            .molarMass = 0.0,
                            .gasConstant = molarGasConstant,
                            .validity = {{coldestIdealPart, hottestIdealPart, std::numeric_limits<double>::infinity()},
                                         {coldestIdealPart, hottestIdealPart, std::numeric_limits<double>::infinity()},
                                         {}},
                            .name = std::move(name),
                            .source = m_data->source};
    for (const Share &share : composition) {
        const Species *species = m_data->find(share.component);
        if (!species) return unknown(share.component);
        parts.push_back(&species->heatCapacity);
        weights.push_back(share.moleFraction);
        facts.molarMass += share.moleFraction * species->facts.molarMass;
        Range &valid = facts.validity.valid;
        valid.lowestTemperature = std::max(valid.lowestTemperature, species->facts.range.lowestTemperature);
        valid.highestTemperature = std::min(valid.highestTemperature, species->facts.range.highestTemperature);
    }
    if (parts.empty()) return Failure{Reason::missing, "", {"a composition needs at least one gas", {}}};
    return idealMixture(std::make_shared<HeatCapacity>(weightedSum(parts, weights)), std::move(facts));
}

} // namespace quasistat::gas
