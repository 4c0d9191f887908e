#include "app/command_line/gas_listing.h"

#include "app/command_line/table.h"
#include "core/units/display.h"

#include <algorithm>
#include <cmath>

namespace quasistat::app
{
namespace
{

using gas::ComponentFacts;
using Components = std::vector<ComponentFacts>;

constexpr std::size_t lineWidth = 110;

/// Sources in the order they are first named.
class Sources
{
public:
    std::string mark(const std::string &source)
    {
        auto known = std::ranges::find(m_sources, source);
        if (known == m_sources.end()) known = m_sources.insert(m_sources.end(), source);
        return "[" + std::to_string(known - m_sources.begin() + 1) + "]";
    }
    [[nodiscard]] const std::vector<std::string> &all() const { return m_sources; }

private:
    std::vector<std::string> m_sources;
};

/// `text` in lines no longer than lineWidth, the first behind `lead`, the others indented as far.
std::string wrapped(const std::string &lead, const std::string &text)
{
    const std::string indent(characterCount(lead), ' ');
    std::string result;
    std::string line = lead;
    bool isBegun = false;
    for (std::size_t from = 0; from < text.size();) {
        const std::size_t blank = std::min(text.find(' ', from), text.size());
        const std::string word = text.substr(from, blank - from);
        from = blank + 1;
        if (isBegun && characterCount(line) + 1 + characterCount(word) > lineWidth) {
            result += line + "\n";
            line = indent;
            isBegun = false;
        }
        line += (isBegun ? " " : "") + word;
        isBegun = true;
    }
    return result + line + "\n";
}

/// A figure to 0.01 in a column aligned by its decimal point: without zeros at the end, blanks in their place.
std::string figure(double value)
{
    if (!std::isfinite(value)) return {};
    std::string text = units::digits(value, {.unit = {}, .factor = 1.0, .offset = 0.0, .decimals = 2});
    std::size_t zeros = text.size() - text.find_last_not_of('0') - 1;
    if (text[text.size() - zeros - 1] == '.') ++zeros;
    return text.replace(text.size() - zeros, zeros, zeros, ' ');
}

std::string tableOf(const Components &components, Sources &sources)
{
    Table table({{"gas", Align::left},
                 {"formula", Align::left},
                 {"M/(g/mol)"},
                 {"from/K"},
                 {"to/K"},
                 {"to/MPa"},
                 {"extended to/K"},
                 {"and to/MPa"},
                 {"source"}});
    const units::Scale mass{.unit = "g/mol", .factor = 1e3, .offset = 0.0, .decimals = 3};
    constexpr double megapascal = 1e6;
    for (const ComponentFacts &facts : components) {
        // Ideal parts all end at the same temperatures, which the heading says.
        const bool isReal = std::isfinite(facts.hard.highestPressure);
        const bool isHotter = isReal && facts.hard.highestTemperature > facts.range.highestTemperature;
        const bool isDenser = isReal && facts.hard.highestPressure > facts.range.highestPressure;
        table.addRow({facts.name, facts.formula, units::digits(facts.molarMass, mass),
                      figure(facts.range.lowestTemperature), figure(facts.range.highestTemperature),
                      figure(facts.range.highestPressure / megapascal),
                      isHotter ? figure(facts.hard.highestTemperature) : "",
                      isDenser ? figure(facts.hard.highestPressure / megapascal) : "", sources.mark(facts.source)});
    }
    return table.text();
}

/// Gases that share range and source: said once, then by name.
std::string uniformTable(const Components &components)
{
    Table table({{"gas", Align::left}, {"formula", Align::left}, {"M/(g/mol)"}});
    const units::Scale mass{.unit = "g/mol", .factor = 1e3, .offset = 0.0, .decimals = 4};
    for (const ComponentFacts &facts : components)
        table.addRow({facts.name, facts.formula, units::digits(facts.molarMass, mass)});
    return table.text();
}

std::string rangeWords(const gas::Range &range)
{
    const units::Scale whole{.unit = {}, .factor = 1.0, .offset = 0.0, .decimals = 0};
    return units::digits(range.lowestTemperature, whole) + " K to " + units::digits(range.highestTemperature, whole) +
           " K, up to " + units::digits(range.highestPressure / 1e6, whole) + " MPa";
}

std::string uncertainties(const Components &components)
{
    std::size_t width = 0;
    for (const ComponentFacts &facts : components)
        if (!facts.uncertainty.empty()) width = std::max(width, characterCount(facts.name));
    std::string text;
    for (const ComponentFacts &facts : components) {
        if (facts.uncertainty.empty()) continue;
        const std::string blanks(width - characterCount(facts.name) + 2, ' ');
        text += wrapped("  " + facts.name + blanks, facts.uncertainty);
    }
    return text;
}

std::string heading(const std::string &model, const std::string &words)
{
    return wrapped(model + "  ", words);
}

} // namespace

std::string perfectGasSource()
{
    const Outcome<gas::GasPtr> gas = gas::perfectGas({.heatCapacityRatio = 1.4, .molarMass = 0.029, .name = {}});
    return gas ? std::string((*gas)->source()) : std::string();
}

std::string gasListing(const gas::Library &library)
{
    Sources sources;
    std::string text = heading("perfect", "any gas, from heat_capacity_ratio and molar_mass: " + perfectGasSource());

    text += "\n" + heading("ideal", "these gases and their mixtures; “air” is nitrogen 0.7812, oxygen 0.2096, argon "
                                    "0.0092. Beyond its range a heat capacity stays what it is at the range's end; "
                                    "none below 50 K and above 6000 K.");
    text += tableOf(library.components("ideal"), sources);

    text +=
        "\n" + heading("peng-robinson, soave-redlich-kwong",
                       "these gases, your own, and their mixtures. The range is that of the ideal part; the source, "
                       "that of the critical constants.");
    text += tableOf(library.components("peng-robinson"), sources);

    const Components gerg = library.components("gerg-2008");
    if (!gerg.empty()) {
        const ComponentFacts &any = gerg.front();
        text += "\n" + heading("gerg-2008", "these gases and their mixtures, from " + rangeWords(any.range) +
                                                "; extended from " + rangeWords(any.hard) +
                                                ". Uncertainty: " + any.uncertainty + ". " + sources.mark(any.source));
        text += uniformTable(gerg);
    }

    const Components reference = library.components("reference");
    text += "\n" + heading("reference", "single gases, each by its own published equation; liquid and two-phase states "
                                        "too (air: gas only).");
    text += tableOf(reference, sources);
    text += "\nUncertainty of reference equations, as published, where it is known here\n" + uncertainties(reference);

    text += "\nSources\n";
    const std::size_t width = std::to_string(sources.all().size()).size() + 2;
    for (const std::string &source : sources.all()) {
        const std::string mark = sources.mark(source);
        text += wrapped("  " + std::string(width - mark.size(), ' ') + mark + " ", source);
    }
    return text;
}

} // namespace quasistat::app
