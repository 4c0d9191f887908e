#include "core/gas/library/gas_files.h"

#include "core/gas/library/json_rows.h"
#include "core/gas/library/reference_data.h"
#include "resources/embedded_text.h"

#include <algorithm>
#include <cstdio>
#include <exception>

namespace quasistat::resources
{
std::span<const EmbeddedText> gases();
}

namespace quasistat::gas
{
namespace
{

CriticalConstants criticalFrom(const Json &critical)
{
    return {.temperature = critical.at("temperature").get<double>(),
            .pressure = critical.at("pressure").get<double>(),
            .acentricFactor = critical.at("acentric_factor").get<double>(),
            .molarMass = critical.at("molar_mass").get<double>(),
            .source = critical.at("source").get<std::string>()};
}

IdealGasData idealGasFrom(const Json &ideal)
{
    // Columns 6 and 7 only place the zeros of h and s, which are ours to place.
    constexpr std::size_t heatCapacityColumns = 5;
    IdealGasData data{.molarMass = ideal.at("molar_mass").get<double>(),
                      .limits = ideal.at("ranges").get<std::vector<double>>(),
                      .rows = {},
                      .source = ideal.at("source").get<std::string>()};
    for (const Json &published : ideal.at("coefficients")) {
        std::vector<double> row;
        for (std::size_t k = 0; k < heatCapacityColumns; ++k) row.push_back(published.at(k).get<double>());
        data.rows.push_back(std::move(row));
    }
    return data;
}

GergComponent gergFrom(const Json &gerg)
{
    return {.molarMass = gerg.at("molar_mass").get<double>(),
            .criticalTemperature = gerg.at("critical_temperature").get<double>(),
            .criticalDensity = gerg.at("critical_density").get<double>(),
            .n0 = gerg.at("n0").get<std::array<double, 7>>(),
            .theta0 = gerg.at("theta0").get<std::array<double, 4>>(),
            .terms = eachRow(gerg, [](const TableRow &row) {
                return PowerTerm{.n = row["n"], .d = row.whole("d"), .t = row["t"], .l = row.whole("c")};
            })};
}

GasData gasFrom(const Json &gas)
{
    GasData data{.name = gas.at("name").get<std::string>(),
                 .formula = gas.at("formula").get<std::string>(),
                 .aliases = gas.value("aliases", std::vector<std::string>{}),
                 .critical = {},
                 .idealGas = {},
                 .gerg = {},
                 .reference = {}};
    if (gas.contains("critical")) data.critical = criticalFrom(gas.at("critical"));
    if (gas.contains("ideal_gas")) data.idealGas = idealGasFrom(gas.at("ideal_gas"));
    if (gas.contains("gerg_2008")) data.gerg = gergFrom(gas.at("gerg_2008"));
    if (gas.contains("reference")) data.reference = referenceFrom(gas.at("reference"));
    return data;
}

/// What is compiled in was tested when the program was built: a file that cannot be read is a broken program.
[[noreturn]] void stopOver(std::string_view name, const char *why)
{
    std::fprintf(stderr, "the data of “%.*s” compiled into the program cannot be read: %s\n",
                 static_cast<int>(name.size()), name.data(), why);
    std::terminate();
}

} // namespace

const std::vector<std::string> &gasNames()
{
    static const std::vector<std::string> names = [] {
        std::vector<std::string> list;
        for (const resources::EmbeddedText &file : resources::gases()) list.emplace_back(file.name);
        return list;
    }();
    return names;
}

GasData readGas(std::string_view name)
{
    const auto files = resources::gases();
    const auto file = std::ranges::lower_bound(files, name, {}, &resources::EmbeddedText::name);
    if (file == files.end() || file->name != name) stopOver(name, "there is no such file");
    try {
        GasData data = gasFrom(Json::parse(file->text));
        if (data.name != name) stopOver(name, "its name is not that of its file");
        return data;
    } catch (const Json::exception &error) {
        stopOver(name, error.what());
    }
}

} // namespace quasistat::gas
