#pragma once
// The data files of resources/gases, compiled into the program: one per gas, read when it is asked for.

#include "core/gas/equation/terms.h"
#include "core/gas/gas.h"

#include <array>
#include <optional>
#include <string>
#include <string_view>
#include <vector>

namespace quasistat::gas
{

/// Constants that cubic equations are built from.
struct CriticalConstants {
    double temperature;    ///< [K]
    double pressure;       ///< [Pa]
    double acentricFactor; ///< ω
    double molarMass;      ///< [kg/mol]
    std::string source;
};

/// Ideal-gas polynomials between the temperatures of `limits`, one row of c_p/R = a₀ + a₁T + … each.
struct IdealGasData {
    double molarMass;
    std::vector<double> limits; ///< [K], one more than rows
    std::vector<std::vector<double>> rows;
    std::string source;
};

/// One first guess of a saturation property. Source: the data file; accuracy `dev_max` there.
struct Ancillary {
    bool isLinear;     ///< y_r (1 + Σ n θᵗ), else y_r exp(k Σ n θᵗ), θ = 1 − T/T_r
    bool hasTauFactor; ///< k = T_r/T, else 1
    double reducingTemperature;
    double reducingValue;
    std::vector<IdealPowerTerm> terms;
};
[[nodiscard]] double valueOf(const Ancillary &ancillary, double temperature);

/// A published equation of a single gas.
struct ReferenceData {
    double molarMass;
    double gasConstant;
    bool isPseudoPure;
    double tripleTemperature;
    double criticalTemperature; ///< of the equation itself where the file gives it, as are the next two
    double criticalPressure;
    double criticalDensity;
    IdealTerms ideal;        ///< as published: h and s zeros of the source
    double idealEnthalpy298; ///< [J/mol] at 298.15 K in the source's zero
    double idealEntropy298;  ///< [J/(mol K)] at 298.15 K, 101325 Pa in the source's zero
    ResidualTerms residual;
    std::optional<Ancillary> saturationPressure; ///< pseudo-pure: along the dew line
    Ancillary liquidDensity;
    Ancillary vapourDensity;
    Validity validity;
    std::string source;
};

/// A component of GERG-2008.
struct GergComponent {
    double molarMass;
    double criticalTemperature; ///< [K]
    double criticalDensity;     ///< [mol/m³]
    std::array<double, 7> n0;
    std::array<double, 4> theta0;
    std::vector<PowerTerm> terms;
};

/// One gas, with all that is published of it here; what is absent is not known.
struct GasData {
    std::string name;    ///< "carbon dioxide"
    std::string formula; ///< "CO2"
    std::vector<std::string> aliases;
    std::optional<CriticalConstants> critical;
    std::optional<IdealGasData> idealGas;
    std::optional<GergComponent> gerg;
    std::optional<ReferenceData> reference;
};

/// Names of all gases, from the files' names alone; nothing is read.
[[nodiscard]] const std::vector<std::string> &gasNames();
/// Reads one file. Precondition: `name` is one of gasNames().
[[nodiscard]] GasData readGas(std::string_view name);

} // namespace quasistat::gas
