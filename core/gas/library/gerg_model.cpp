// The data of GERG-2008 that belong to no single component.

#include "core/gas/library/gerg_2008.h"
#include "core/gas/library/json_rows.h"

#include <cstdio>
#include <exception>

namespace quasistat::resources
{
std::string_view gerg2008();
}

namespace quasistat::gas
{
namespace
{

Range rangeFrom(const Json &range)
{
    return {range.at("temperature").at(0).get<double>(), range.at("temperature").at(1).get<double>(),
            range.at("pressure").get<double>()};
}

DepartureTerm departureFrom(const TableRow &row)
{
    return {.n = row["n"],
            .d = row.whole("d"),
            .t = row["t"],
            .eta = row["eta"],
            .epsilon = row["epsilon"],
            .beta = row["beta"],
            .gamma = row["gamma"]};
}

std::pair<std::string, std::string> pairNames(const Json &entry)
{
    return {entry.at(0).get<std::string>(), entry.at(1).get<std::string>()};
}

} // namespace

GergModel::GergModel()
try {
    const Json json = Json::parse(resources::gerg2008());
    m_gasConstant = json.at("gas_constant").get<double>();
    m_idealGasConstant = json.at("gas_constant_of_ideal_part").get<double>();
    m_validity = {rangeFrom(json.at("limits").at("normal")), rangeFrom(json.at("limits").at("extended")),
                  uncertaintyFrom(json)};
    m_source = json.at("source").at(0).get<std::string>() + "; ISO 20765-2:2015";
    for (const auto &[name, terms] : json.at("departure_functions").items())
        m_departures.emplace(name, eachRow(terms, departureFrom));
    for (const Json &entry : json.at("pairs"))
        m_pairs[pairNames(entry)] = {.betaV = entry.at(2).get<double>(),
                                     .gammaV = entry.at(3).get<double>(),
                                     .betaT = entry.at(4).get<double>(),
                                     .gammaT = entry.at(5).get<double>()};
    for (const Json &entry : json.at("departure_pairs")) {
        GergPair &pair = m_pairs[pairNames(entry)];
        pair.departureFactor = entry.at(2).get<double>();
        pair.departure = &m_departures[entry.at(3).get<std::string>()];
    }
} catch (const Json::exception &error) {
    // Compiled in and tested: a broken program, not a user's mistake.
    std::fprintf(stderr, "the data of GERG-2008 compiled into the program cannot be read: %s\n", error.what());
    std::terminate();
}

GergPair GergModel::pair(std::string_view first, std::string_view second) const
{
    const auto printed = m_pairs.find(std::pair{std::string(first), std::string(second)});
    if (printed != m_pairs.end()) return printed->second;
    const auto reversed = m_pairs.find(std::pair{std::string(second), std::string(first)});
    if (reversed == m_pairs.end()) return {}; // a component with itself
    GergPair pair = reversed->second;
    pair.betaV = 1.0 / pair.betaV;
    pair.betaT = 1.0 / pair.betaT;
    return pair;
}

} // namespace quasistat::gas
