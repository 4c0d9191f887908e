#include "app/command_line/gas_listing.h"
#include "app/command_line/streams.h"
#include "app/command_line/subcommands.h"
#include "core/document/faults.h"

#include <cmath>

namespace quasistat::app
{

namespace
{

using document::Json;

/// null where a model sets no limit.
Json limit(double value)
{
    return std::isfinite(value) ? Json(value) : Json();
}

Json rangeJson(const gas::Range &range)
{
    return {{"temperature", Json::array({range.lowestTemperature, range.highestTemperature})},
            {"pressure_max", limit(range.highestPressure)}};
}

Json componentJson(const gas::ComponentFacts &component)
{
    Json json{{"name", component.name}, {"formula", component.formula}, {"molar_mass", component.molarMass}};
    json.update(rangeJson(component.range));
    json["extended"] = rangeJson(component.hard);
    json["source"] = component.source;
    json["uncertainty"] = component.uncertainty.empty() ? Json() : Json(component.uncertainty);
    return json;
}

Json gasesJson(const gas::Library &library)
{
    Json json = Json::object();
    json["quasistat_gases"] = 1;
    json["models"] = Json::array({{{"model", "perfect"}, {"source", perfectGasSource()}}});
    for (const std::string_view model : gas::modelsOfGases()) {
        Json components = Json::array();
        for (const gas::ComponentFacts &component : library.components(model))
            components.push_back(componentJson(component));
        json["models"].push_back({{"model", model}, {"gases", std::move(components)}});
    }
    return json;
}

} // namespace

ExitStatus gases(const Options &options)
{
    if (!options.operands().empty())
        return wrongUsage(document::fault(Reason::contradiction, "", "gases takes no file").message, "gases");
    const gas::Library library;
    return printed(options.has("--json") ? gasesJson(library).dump(2) + "\n" : gasListing(library));
}

} // namespace quasistat::app
