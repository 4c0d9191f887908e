#include "app/command_line/streams.h"
#include "app/command_line/subcommands.h"
#include "app/command_line/table.h"
#include "core/document/faults.h"
#include "core/gas/library/library.h"

#include <array>

namespace quasistat::app
{

namespace
{

using document::Json;
using units::Quantity;

std::string idealSource(const gas::Library &library, const gas::ComponentFacts &component)
{
    const Outcome<gas::GasPtr> gas = library.idealGas({{component.name, 1.0}}, component.name);
    return gas ? std::string((*gas)->source()) : std::string();
}

std::string perfectSource()
{
    const Outcome<gas::GasPtr> gas = gas::perfectGas({.heatCapacityRatio = 1.4, .molarMass = 0.029, .name = {}});
    return gas ? std::string((*gas)->source()) : std::string();
}

Json gasesJson(const gas::Library &library)
{
    Json json = Json::object();
    json["quasistat_gases"] = 1;
    Json components = Json::array();
    for (const gas::ComponentFacts &component : library.idealComponents())
        components.push_back(
            {{"name", component.name},
             {"formula", component.formula},
             {"molar_mass", component.molarMass},
             {"temperature", Json::array({component.range.lowestTemperature, component.range.highestTemperature})},
             {"source", idealSource(library, component)}});
    json["models"] = Json::array(
        {{{"model", "perfect"}, {"source", perfectSource()}}, {{"model", "ideal"}, {"gases", std::move(components)}}});
    return json;
}

std::string gasesText(const gas::Library &library)
{
    std::string text =
        "perfect  any gas, from heat_capacity_ratio and molar_mass\n         " + perfectSource() + "\n\n";
    text += "ideal    these gases and their mixtures; “air” is nitrogen 0.7812, oxygen 0.2096, argon 0.0092\n";
    if (!library.idealComponents().empty())
        text += "         " + idealSource(library, library.idealComponents().front()) + "\n";
    Table table({{"gas", Align::left}, {"formula", Align::left}, {"M/(g/mol)"}, {"from/K"}, {"to/K"}});
    const units::Scale mass{.unit = "g/mol", .factor = 1e3, .offset = 0.0, .decimals = 3};
    const units::Scale kelvin{.unit = "K", .factor = 1.0, .offset = 0.0, .decimals = 0};
    for (const gas::ComponentFacts &component : library.idealComponents())
        table.addRow({component.name, component.formula, units::digits(component.molarMass, mass),
                      units::digits(component.range.lowestTemperature, kelvin),
                      units::digits(component.range.highestTemperature, kelvin)});
    return text + table.text();
}

} // namespace

ExitStatus gases(const Options &options)
{
    if (!options.operands().empty())
        return wrongUsage(document::fault(Reason::contradiction, "", "gases takes no file").message, "gases");
    const gas::Library library;
    return printed(options.has("--json") ? gasesJson(library).dump(2) + "\n" : gasesText(library));
}

} // namespace quasistat::app
