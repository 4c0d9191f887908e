#pragma once
// A quantity as a person typed it: number, unit and uncertainty survive exactly; the SI value comes along.

#include "core/outcome/outcome.h"
#include "core/units/quantity.h"

#include <optional>
#include <string>
#include <string_view>

namespace quasistat::units
{

/// How a stated uncertainty is to be read (format of the document, "Quantity").
enum class Distribution { normal, uniform, triangular };

/// Standard uncertainty [SI unit of the quantity; a difference where the unit has an offset].
struct Uncertainty {
    double standard = 0.0; ///< already divided by k, √3 or √6
    Distribution distribution = Distribution::normal;
};

/// What the SI value still needs before it is the quantity asked for.
enum class Basis {
    absolute, ///< nothing: `value` is the quantity
    gauge,    ///< `value` is a pressure relative to the surroundings
    byMass,   ///< an amount was asked for and a mass [kg] was typed
};

struct Measure {
    Quantity quantity = Quantity::number;
    double value = 0.0; ///< SI, see `basis`
    Basis basis = Basis::absolute;
    std::string text;   ///< as typed, trimmed of outer blanks only
    std::string number; ///< the number as typed: "14.50"
    std::string unit;   ///< the unit as typed: "psi", "°C", "bar(g)"
    std::optional<Uncertainty> uncertainty;
};

/// Reads `text` as `quantity` ("14.5 psi", "35 °C ± 0.5 °C", "5 Nm3", "1.2 bar(g)").
/// Where an amount is expected a mass is accepted (Basis::byMass); Nm3, Sm3 and scf are amounts of ideal gas.
/// Fails with Reason::syntax (not number and unit), wrongType (another dimension; the message names one that fits),
/// outOfRange (an absolute pressure or temperature at or below zero; a gauge value cannot be judged here).
/// Thread-safe: calls into UDUNITS-2, which is not, are serialised.
[[nodiscard]] Outcome<Measure> measured(std::string_view text, Quantity quantity);

/// Reads a plain number that may carry an uncertainty: "1.30 ± 0.02". Fails with Reason::syntax.
[[nodiscard]] Outcome<Measure> plainNumber(std::string_view text);

/// SI value of `measure`: adds the surroundings' pressure [Pa] to a gauge pressure, divides a mass by the molar mass
/// [kg/mol]. Fails with Reason::outOfRange where the result is an absolute pressure at or below zero.
struct Conversion {
    double surroundingsPressure;
    double molarMass;
};
[[nodiscard]] Outcome<double> siValue(const Measure &measure, const Conversion &conversion);

/// `value` [SI] in `unit` (same rules as `measured`, without a number). For gauge units relative to
/// `surroundingsPressure`.
[[nodiscard]] Outcome<double> inUnit(double value, Quantity quantity, std::string_view unit,
                                     double surroundingsPressure);

/// `value` [SI] as text in `unit`, with as few digits as give it back to `significantDigits`: what a field or a dragged
/// handle writes into the document. ASCII minus and '.', a blank before the unit: "8.372 bar".
[[nodiscard]] Outcome<std::string> typedIn(double value, Quantity quantity, std::string_view unit,
                                           double surroundingsPressure, int significantDigits);

} // namespace quasistat::units
