#include "core/gas/library/reference_data.h"

#include <algorithm>
#include <cmath>

namespace quasistat::gas
{
namespace
{

IdealPowerTerm powerOfIdeal(const TableRow &row)
{
    return {.n = row["n"], .t = row["t"]};
}

IdealTerms idealFrom(const Json &alpha0, double reducingTemperature)
{
    return {.reducingTemperature = reducingTemperature,
            .lead = {alpha0.at("lead").at(0).get<double>(), alpha0.at("lead").at(1).get<double>()},
            .logTau = alpha0.at("log_tau").get<double>(),
            .powers = eachRow(alpha0, "power", powerOfIdeal),
            .planckEinstein = eachRow(alpha0, "planck_einstein", [](const TableRow &row) {
                return PlanckEinsteinTerm{
                    .n = row["n"], .theta = row["theta"], .c = row.valueOr("c", 1.0), .d = row.valueOr("d", -1.0)};
            })};
}

PowerTerm powerFrom(const TableRow &row)
{
    return {.n = row["n"], .d = row.whole("d"), .t = row["t"], .l = row.whole("l"), .g = row.valueOr("g", 1.0)};
}

GaussianTerm gaussianFrom(const TableRow &row)
{
    return {.n = row["n"],
            .d = row.whole("d"),
            .t = row["t"],
            .eta = row["eta"],
            .epsilon = row["epsilon"],
            .beta = row["beta"],
            .gamma = row["gamma"]};
}

AssociatingTerm associatingFrom(const TableRow &row)
{
    return {.n = row["n"],
            .d = row.whole("d"),
            .t = row["t"],
            .eta = row["eta"],
            .epsilon = row["epsilon"],
            .beta = row["beta"],
            .gamma = row["gamma"],
            .b = row["b"]};
}

NonAnalyticTerm nonAnalyticFrom(const TableRow &row)
{
    return {.n = row["n"],
            .a = row["a"],
            .b = row["b"],
            .beta = row["beta"],
            .A = row["A"],
            .B = row["B"],
            .C = row["C"],
            .D = row["D"]};
}

ResidualTerms residualFrom(const Json &alphar, const Json &reducing)
{
    return {.reducingTemperature = reducing.at("T").get<double>(),
            .reducingDensity = reducing.at("rho").get<double>(),
            .powers = eachRow(alphar, "power", powerFrom),
            .gaussians = eachRow(alphar, "gaussian", gaussianFrom),
            .departures = {},
            .associating = eachRow(alphar, "gao_b", associatingFrom),
            .nonAnalytic = eachRow(alphar, "nonanalytic", nonAnalyticFrom)};
}

Ancillary ancillaryFrom(const Json &ancillary)
{
    return {.isLinear = ancillary.at("form").get<std::string>() == "linear",
            .hasTauFactor = ancillary.at("tau_factor").get<bool>(),
            .reducingTemperature = ancillary.at("T_r").get<double>(),
            .reducingValue = ancillary.at("y_r").get<double>(),
            .terms = eachRow(ancillary, powerOfIdeal)};
}

Validity validityFrom(const Json &reference)
{
    const Json &limits = reference.at("limits");
    const double lowest = limits.at("temperature").at(0).get<double>();
    const double highest = limits.at("temperature").at(1).get<double>();
    const double pressure = limits.at("pressure").get<double>();
    return {.valid = {lowest, highest, pressure},
            .hard = {std::max(lowest, reference.at("triple").at("T").get<double>()),
                     limits.value("temperature_extrapolated", highest),
                     limits.value("pressure_extrapolated", pressure)},
            .uncertainty = uncertaintyFrom(reference)};
}

} // namespace

double valueOf(const Ancillary &ancillary, double temperature)
{
    const double ratio = temperature / ancillary.reducingTemperature;
    const double theta = std::max(1.0 - ratio, 0.0);
    double sum = 0.0;
    for (const IdealPowerTerm &term : ancillary.terms) sum += term.n * std::pow(theta, term.t);
    if (ancillary.isLinear) return ancillary.reducingValue * (1.0 + sum);
    return ancillary.reducingValue * std::exp(ancillary.hasTauFactor ? sum / ratio : sum);
}

ReferenceData referenceFrom(const Json &reference)
{
    const Json &critical =
        reference.at(reference.contains("critical_of_equation") ? "critical_of_equation" : "critical");
    const Json &ancillaries = reference.at("ancillaries");
    const bool isPseudoPure = reference.value("pseudo_pure", false);
    const char *pressure = isPseudoPure ? "psat_dew" : "psat";
    ReferenceData data{.molarMass = reference.at("molar_mass").get<double>(),
                       .gasConstant = reference.at("gas_constant").get<double>(),
                       .isPseudoPure = isPseudoPure,
                       .tripleTemperature = reference.at("triple").at("T").get<double>(),
                       .criticalTemperature = critical.at("T").get<double>(),
                       .criticalPressure = critical.at("p").get<double>(),
                       .criticalDensity = critical.at("rho").get<double>(),
                       .ideal = {},
                       .idealEnthalpy298 = reference.at("ideal_gas_298").at("h").get<double>(),
                       .idealEntropy298 = reference.at("ideal_gas_298").at("s").get<double>(),
                       .residual = residualFrom(reference.at("alphar"), reference.at("reducing")),
                       .saturationPressure = {},
                       .liquidDensity = ancillaryFrom(ancillaries.at("rho_liq")),
                       .vapourDensity = ancillaryFrom(ancillaries.at("rho_vap")),
                       .validity = validityFrom(reference),
                       .source = joinedLines(reference.at("source"))};
    data.ideal = idealFrom(reference.at("alpha0"), data.residual.reducingTemperature);
    if (ancillaries.contains(pressure)) data.saturationPressure = ancillaryFrom(ancillaries.at(pressure));
    return data;
}

} // namespace quasistat::gas
