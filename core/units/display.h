#pragma once
// How figures are shown to a person: unit and prefix chosen once per column, digits fixed, U+2212 for minus.

#include "core/outcome/message.h"
#include "core/units/quantity.h"

#include <span>
#include <string>
#include <string_view>

namespace quasistat::units
{

/// The units a design is shown in. Empty string: the program chooses a readable prefix (bar, L, °C, J, …).
struct DisplayUnits {
    std::string pressure = "bar";
    std::string volume = "L";
    std::string temperature = "°C";
    std::string energy;                     ///< "J", "kJ", …; empty: by magnitude
    double surroundingsPressure = 101325.0; ///< [Pa], for gauge units
    bool workByGas = false;                 ///< display only: turns the sign of work and heat to "by the gas"
};

/// One column's choice: the unit, the factor and offset to it from SI, the decimals that every figure of it gets.
struct Scale {
    std::string unit;    ///< as printed: "kJ", "°C", "bar"
    double factor = 1.0; ///< shown = value · factor + offset
    double offset = 0.0;
    int decimals = 3;
};

/// A scale that shows the largest of `values` [SI] with at least 4 significant digits (5 where it reads well) in a
/// readable prefix, or in the unit of `units` for that quantity. Non-finite values are ignored; none: the unit's
/// default.
[[nodiscard]] Scale scaleFor(Quantity quantity, std::span<const double> values, const DisplayUnits &units);

/// Digits only, with U+2212, at the scale's decimals; "−0.00" is printed as "0.00".
[[nodiscard]] std::string digits(double value, const Scale &scale);

/// Number, U+202F (narrow no-break space), unit, in a scale chosen for this value alone: "8.372 bar". °C takes one too.
[[nodiscard]] std::string shown(double value, Quantity quantity, const DisplayUnits &units);

/// `message` with its figures shown in `units`.
[[nodiscard]] std::string sentence(const Message &message, const DisplayUnits &units);

} // namespace quasistat::units
