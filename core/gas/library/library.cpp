#include "core/gas/library/library.h"

#include "core/gas/constants.h"
#include "core/gas/ideal/ideal_mixture.h"
#include "core/gas/library/ideal_part.h"
#include "core/gas/library/real_gases.h"
#include "core/outcome/near_names.h"

#include <algorithm>
#include <cctype>
#include <limits>

namespace quasistat::gas
{
namespace
{

using DataPtr = std::shared_ptr<const GasData>;

std::string lowerCase(std::string_view text)
{
    std::string result(text);
    std::ranges::transform(result, result.begin(), [](unsigned char c) { return static_cast<char>(std::tolower(c)); });
    return result;
}

std::string joined(const std::vector<std::string> &names)
{
    std::string text;
    for (const std::string &name : names) text += (text.empty() ? "" : ", ") + name;
    return text;
}

bool isAlias(const GasData &data, const std::string &lower)
{
    return std::ranges::any_of(data.aliases, [&](const std::string &alias) { return lowerCase(alias) == lower; });
}

bool hasIdealPart(const DataPtr &data)
{
    return data->idealGas || data->reference || data->gerg;
}

/// A sentence repeats what was typed, but not a whole paragraph pasted by mistake.
std::string shown(std::string_view name)
{
    constexpr std::size_t longestShown = 60;
    if (name.size() <= longestShown) return std::string(name);
    std::size_t end = longestShown;
    while (end > 0 && (static_cast<unsigned char>(name[end]) & 0xC0) == 0x80) --end; // whole characters of UTF-8
    return std::string(name.substr(0, end)) + "…";
}

} // namespace

Library::Library() : m_store(std::make_unique<GasStore>()), m_recent(std::make_unique<RecentGases>()) {}

Library::~Library() = default;

std::vector<DataPtr> Library::gases(std::string_view model) const
{
    std::vector<DataPtr> list;
    for (const std::string &name : gasNames())
        if (DataPtr data = m_store->find(name); model.empty() || isIn(model, *data)) list.push_back(std::move(data));
    return list;
}

std::vector<ComponentFacts> Library::components(std::string_view model) const
{
    std::vector<ComponentFacts> list;
    for (const DataPtr &data : gases(model)) list.push_back(*factsIn(model, *data, *m_store));
    return list;
}

Failure Library::unknown(std::string_view name, std::string_view model) const
{
    std::vector<std::string_view> names;
    const std::vector<DataPtr> known = gases(model);
    for (const DataPtr &data : known) names.emplace_back(data->name);
    std::vector<std::string> near;
    for (const std::string_view candidate : namesNear(lowerCase(name), names)) near.emplace_back(candidate);
    if (near.empty())
        return {Reason::unknownName,
                "",
                {"there is no gas named “{0}” here; `quasistat gases` lists them all", {shown(name)}}};
    return {
        Reason::unknownName, "", {"there is no gas named “{0}” here; near it are: {1}", {shown(name), joined(near)}}};
}

Failure Library::elsewhere(const GasData &data, std::string_view model) const
{
    std::vector<std::string> having;
    for (const std::string_view other : modelsOfGases())
        if (isIn(other, data)) having.emplace_back(other);
    if (having.empty())
        return {
            Reason::unknownName,
            "",
            {"the model {0} does not have {1}: no heat capacity is known of it here", {std::string(model), data.name}}};
    return {Reason::unknownName,
            "",
            {"the model {0} does not have {1}; these do: {2}", {std::string(model), data.name, joined(having)}}};
}

Outcome<std::string> Library::componentName(std::string_view nameFormulaOrAlias) const
{
    return componentName(nameFormulaOrAlias, {});
}

Outcome<std::string> Library::componentName(std::string_view nameFormulaOrAlias, std::string_view model) const
{
    const std::string lower = lowerCase(nameFormulaOrAlias);
    // By its name no other file is read.
    if (const DataPtr data = m_store->find(lower)) {
        if (model.empty() || isIn(model, *data)) return data->name;
        return elsewhere(*data, model);
    }
    std::vector<DataPtr> meant;
    for (const DataPtr &data : gases({}))
        if (data->formula == nameFormulaOrAlias || isAlias(*data, lower)) meant.push_back(data);
    if (meant.empty()) return unknown(nameFormulaOrAlias, model);

    const DataPtr example = meant.front();
    if (model.empty()) {
        // H2 is hydrogen, though parahydrogen is known by its critical constants.
        if (std::ranges::any_of(meant, hasIdealPart))
            std::erase_if(meant, [](const DataPtr &data) { return !hasIdealPart(data); });
    } else {
        std::erase_if(meant, [&](const DataPtr &data) { return !isIn(model, *data); });
    }
    if (meant.empty()) return elsewhere(*example, model);
    if (meant.size() == 1) return meant.front()->name;
    std::vector<std::string> names;
    for (const DataPtr &data : meant) names.push_back(data->name);
    return Failure{
        Reason::ambiguous,
        "",
        {"the formula {0} stands for more than one gas: write {1}", {std::string(nameFormulaOrAlias), joined(names)}}};
}

Outcome<DataPtr> Library::data(std::string_view component) const
{
    if (DataPtr data = m_store->find(component)) return data;
    return unknown(component, {});
}

Outcome<DataPtr> Library::data(std::string_view component, std::string_view model) const
{
    DataPtr data = m_store->find(component);
    if (!data) return unknown(component, model);
    if (!isIn(model, *data)) return elsewhere(*data, model);
    return data;
}

Outcome<double> Library::molarMass(std::string_view component, std::string_view model) const
{
    const Outcome<DataPtr> found = data(component, model);
    if (!found) return found.failure();
    return molarMassIn(model, **found);
}

Outcome<GasPtr> Library::idealGas(const Composition &composition, std::string name) const
{
    constexpr Range everywhere{coldestIdealPart, hottestIdealPart, std::numeric_limits<double>::infinity()};
    std::vector<HeatCapacity> functions;
    std::vector<double> weights;
    IdealMixtureFacts facts{.model = "ideal",
                            .composition = composition,
                            .molarMass = 0.0,
                            .gasConstant = molarGasConstant,
                            .validity = {everywhere, everywhere, {}},
                            .name = std::move(name),
                            .source = {}};
    for (const Share &share : composition) {
        const Outcome<DataPtr> found = data(share.component, "ideal");
        if (!found) return found.failure();
        const IdealGasData &ideal = *(*found)->idealGas;
        functions.push_back(heatCapacityOf(ideal));
        weights.push_back(share.moleFraction);
        facts.molarMass += share.moleFraction * ideal.molarMass;
        Range &valid = facts.validity.valid;
        valid.lowestTemperature = std::max(valid.lowestTemperature, ideal.limits.front());
        valid.highestTemperature = std::min(valid.highestTemperature, ideal.limits.back());
        if (facts.source.find(ideal.source) == std::string::npos)
            facts.source += (facts.source.empty() ? "heat capacities: " : "; ") + ideal.source;
    }
    if (functions.empty()) return Failure{Reason::missing, "", {"a composition needs at least one gas", {}}};
    std::vector<const HeatCapacity *> parts;
    for (const HeatCapacity &function : functions) parts.push_back(&function);
    return idealMixture(std::make_shared<HeatCapacity>(weightedSum(parts, weights)), std::move(facts));
}

Outcome<GergMixture> Library::gergMixture(const Composition &composition) const
{
    std::vector<std::string> names;
    std::vector<GergComponent> components;
    for (const Share &share : composition) {
        const Outcome<DataPtr> found = data(share.component, "gerg-2008");
        if (!found) return found.failure();
        names.push_back(share.component);
        components.push_back(*(*found)->gerg);
    }
    if (names.empty()) return Failure{Reason::missing, "", {"a composition needs at least one gas", {}}};
    return quasistat::gas::gergMixture(m_store->gergModel(), names, std::move(components));
}

std::optional<RecentGas> Library::recalled(const std::string &description) const
{
    return m_recent->find(description);
}

void Library::remember(const std::string &description, RecentGas gas) const
{
    m_recent->add(description, std::move(gas));
}

} // namespace quasistat::gas
