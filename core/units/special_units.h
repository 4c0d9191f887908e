#pragma once
// Units that UDUNITS-2 lacks, or reads otherwise than an engineer means them. Looked up before its own names.

#include <array>
#include <string_view>

namespace quasistat::units
{

struct SpecialUnit {
    std::string_view name;
    std::string_view siUnit; ///< as UDUNITS-2 reads it
    double factor;           ///< value [siUnit] = typed · factor + offset
    double offset = 0.0;     ///< left out in a product of units ("J/°C") and after ±
};

namespace exact
{
// SI Brochure, 9th ed. (2019): k · N_A.
inline constexpr double gasConstant = 8.31446261815324;
// NIST SP 811 (2008), appendix B: exact by definition.
inline constexpr double gravity = 9.80665;
inline constexpr double atmosphere = 101325.0;
inline constexpr double inch = 0.0254;
inline constexpr double foot = 0.3048;
inline constexpr double pound = 0.45359237;
inline constexpr double calorie = 4.184;
inline constexpr double calorieIT = 4.1868;
inline constexpr double btuIT = 1055.05585262;
inline constexpr double psi = pound * gravity / (inch * inch);
// Density of water and mercury of the conventional columns, NIST SP 811 appendix B: "conventional".
inline constexpr double waterColumn = 1000.0 * gravity;
inline constexpr double mercuryColumn = 13595.1 * gravity;
inline constexpr double fahrenheit = 5.0 / 9.0;
inline constexpr double usGallon = 231.0 * inch * inch * inch;
inline constexpr double imperialGallon = 4.54609e-3;

/// Amount [mol] of ideal gas in 1 m³: n = p V/(R T).
constexpr double idealAmount(double pressure, double temperature)
{
    return pressure / (gasConstant * temperature);
}
inline constexpr double normalCubicMetre = idealAmount(atmosphere, 273.15);   // 0 °C, 101.325 kPa
inline constexpr double standardCubicMetre = idealAmount(atmosphere, 288.15); // 15 °C, 101.325 kPa
// 60 °F and 14.696 psi, as the trade defines the standard cubic foot.
inline constexpr double standardCubicFoot =
    idealAmount(14.696 * psi, (60.0 + 459.67) * fahrenheit) * foot * foot * foot;
} // namespace exact

/// Longer names stand before their own beginnings where a digit follows ("Nm3" is not (Nm)³).
inline constexpr std::array specialUnits{
    // Temperatures: NIST SP 811, appendix B.8.
    SpecialUnit{"°C", "K", 1.0, 273.15},
    SpecialUnit{"℃", "K", 1.0, 273.15},
    SpecialUnit{"degC", "K", 1.0, 273.15},
    SpecialUnit{"°F", "K", exact::fahrenheit, 459.67 * exact::fahrenheit},
    SpecialUnit{"℉", "K", exact::fahrenheit, 459.67 * exact::fahrenheit},
    SpecialUnit{"degF", "K", exact::fahrenheit, 459.67 * exact::fahrenheit},
    SpecialUnit{"°R", "K", exact::fahrenheit},
    SpecialUnit{"degR", "K", exact::fahrenheit},
    SpecialUnit{"degK", "K", 1.0},
    SpecialUnit{"K", "K", 1.0},
    // Pressure: NIST SP 811, appendix B.8.
    SpecialUnit{"psi", "Pa", exact::psi},
    SpecialUnit{"ksi", "Pa", 1000.0 * exact::psi},
    SpecialUnit{"psf", "Pa", exact::pound *exact::gravity / (exact::foot * exact::foot)},
    SpecialUnit{"atm", "Pa", exact::atmosphere},
    SpecialUnit{"at", "Pa", exact::gravity * 1e4},
    SpecialUnit{"torr", "Pa", exact::atmosphere / 760.0},
    SpecialUnit{"Torr", "Pa", exact::atmosphere / 760.0},
    SpecialUnit{"mtorr", "Pa", exact::atmosphere / 760.0 * 1e-3},
    SpecialUnit{"mTorr", "Pa", exact::atmosphere / 760.0 * 1e-3},
    SpecialUnit{"mmHg", "Pa", exact::mercuryColumn * 1e-3},
    SpecialUnit{"inHg", "Pa", exact::mercuryColumn *exact::inch},
    SpecialUnit{"mmH2O", "Pa", exact::waterColumn * 1e-3},
    SpecialUnit{"cmH2O", "Pa", exact::waterColumn * 1e-2},
    SpecialUnit{"mH2O", "Pa", exact::waterColumn},
    SpecialUnit{"inH2O", "Pa", exact::waterColumn *exact::inch},
    SpecialUnit{"ftH2O", "Pa", exact::waterColumn *exact::foot},
    // Energy: NIST SP 811, appendix B.8. The calorie without index is the thermochemical one; UDUNITS-2 has the other.
    SpecialUnit{"cal_IT", "J", exact::calorieIT},
    SpecialUnit{"kcal_IT", "J", 1e3 * exact::calorieIT},
    SpecialUnit{"cal_th", "J", exact::calorie},
    SpecialUnit{"kcal_th", "J", 1e3 * exact::calorie},
    SpecialUnit{"cal", "J", exact::calorie},
    SpecialUnit{"kcal", "J", 1e3 * exact::calorie},
    SpecialUnit{"Mcal", "J", 1e6 * exact::calorie},
    SpecialUnit{"Btu", "J", exact::btuIT},
    SpecialUnit{"BTU", "J", exact::btuIT},
    SpecialUnit{"kBtu", "J", 1e3 * exact::btuIT},
    SpecialUnit{"MMBtu", "J", 1e6 * exact::btuIT},
    SpecialUnit{"Wh", "J", 3600.0},
    SpecialUnit{"kWh", "J", 3.6e6},
    SpecialUnit{"MWh", "J", 3.6e9},
    // Amounts of ideal gas: the molar gas constant and the reference conditions of the trade (document format,
    // "Quantity").
    SpecialUnit{"Nm3", "mol", exact::normalCubicMetre},
    SpecialUnit{"Nm³", "mol", exact::normalCubicMetre},
    SpecialUnit{"NL", "mol", exact::normalCubicMetre * 1e-3},
    SpecialUnit{"Nl", "mol", exact::normalCubicMetre * 1e-3},
    SpecialUnit{"Sm3", "mol", exact::standardCubicMetre},
    SpecialUnit{"Sm³", "mol", exact::standardCubicMetre},
    SpecialUnit{"scf", "mol", exact::standardCubicFoot},
    SpecialUnit{"lbmol", "mol", 1e3 * exact::pound},
    // Volume: NIST SP 811, appendix B.8. To UDUNITS-2 "gal" is the galileo, an acceleration.
    SpecialUnit{"gal_UK", "m3", exact::imperialGallon},
    SpecialUnit{"gal_US", "m3", exact::usGallon},
    SpecialUnit{"gal", "m3", exact::usGallon},
    SpecialUnit{"cc", "m3", 1e-6},
    SpecialUnit{"ccm", "m3", 1e-6},
    SpecialUnit{"cuft", "m3", exact::foot *exact::foot *exact::foot},
    SpecialUnit{"cuin", "m3", exact::inch *exact::inch *exact::inch},
    // Cycles are counted, not measured in radians (ISO 80000-3, rotational frequency).
    SpecialUnit{"rpm", "1/s", 1.0 / 60.0},
    SpecialUnit{"rps", "1/s", 1.0},
    SpecialUnit{"rev", "1", 1.0},
    SpecialUnit{"revolution", "1", 1.0},
    SpecialUnit{"revolutions", "1", 1.0},
    SpecialUnit{"cycle", "1", 1.0},
    SpecialUnit{"cycles", "1", 1.0},
    SpecialUnit{"stroke", "1", 1.0},
    SpecialUnit{"strokes", "1", 1.0},
};

} // namespace quasistat::units
