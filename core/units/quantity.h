#pragma once
// The quantities the program speaks of: one table, read by headings, JSON, documentation and tests.

#include <array>
#include <string_view>

namespace quasistat::units
{

enum class Quantity {
    number,   ///< a plain ratio, exponent or efficiency
    pressure, ///< absolute
    pressureDifference,
    temperature, ///< thermodynamic
    temperatureDifference,
    volume,
    amount, ///< amount of substance; a mass or a standard volume is accepted where an amount is typed
    mass,
    molarMass,
    energy, ///< work, heat, internal energy, enthalpy
    power,
    entropy, ///< also heat capacity of a body
    molarEnergy,
    molarEntropy, ///< also molar heat capacity
    specificEntropy,
    frequency, ///< cycles in time: 600 1/min
    stiffness, ///< dp/dV
    length,
    area,
    duration,
    speed,
};

/// What one quantity is called and measured in.
struct QuantityFacts {
    Quantity quantity;
    std::string_view key;    ///< key of the document and of the result where there is one
    std::string_view symbol; ///< as printed, italic; empty if none is usual
    std::string_view unit;   ///< SI unit, as UDUNITS reads it
    std::string_view words;  ///< in a sentence: "a pressure", so: "pressure"
};

inline constexpr std::array quantityTable{
    QuantityFacts{Quantity::number, "number", "", "1", "number"},
    QuantityFacts{Quantity::pressure, "pressure", "p", "Pa", "pressure"},
    QuantityFacts{Quantity::pressureDifference, "pressure_difference", "Δp", "Pa", "pressure difference"},
    QuantityFacts{Quantity::temperature, "temperature", "T", "K", "temperature"},
    QuantityFacts{Quantity::temperatureDifference, "temperature_difference", "ΔT", "K", "temperature difference"},
    QuantityFacts{Quantity::volume, "volume", "V", "m3", "volume"},
    QuantityFacts{Quantity::amount, "amount", "n", "mol", "amount of substance"},
    QuantityFacts{Quantity::mass, "mass", "m", "kg", "mass"},
    QuantityFacts{Quantity::molarMass, "molar_mass", "M", "kg/mol", "molar mass"},
    QuantityFacts{Quantity::energy, "energy", "E", "J", "energy"},
    QuantityFacts{Quantity::power, "power", "P", "W", "power"},
    QuantityFacts{Quantity::entropy, "entropy", "S", "J/K", "entropy"},
    QuantityFacts{Quantity::molarEnergy, "molar_energy", "", "J/mol", "molar energy"},
    QuantityFacts{Quantity::molarEntropy, "molar_entropy", "", "J/(mol K)", "molar entropy"},
    QuantityFacts{Quantity::specificEntropy, "specific_entropy", "s", "J/(kg K)", "specific entropy"},
    QuantityFacts{Quantity::frequency, "rate", "", "1/s", "rate"},
    QuantityFacts{Quantity::stiffness, "stiffness", "", "Pa/m3", "stiffness dp/dV"},
    QuantityFacts{Quantity::length, "length", "", "m", "length"},
    QuantityFacts{Quantity::area, "area", "", "m2", "area"},
    QuantityFacts{Quantity::duration, "duration", "t", "s", "duration"},
    QuantityFacts{Quantity::speed, "speed", "w", "m/s", "speed"},
};

[[nodiscard]] constexpr const QuantityFacts &facts(Quantity quantity)
{
    return quantityTable[static_cast<std::size_t>(quantity)];
}

namespace detail
{
constexpr bool tableIsInOrder()
{
    for (std::size_t i = 0; i < quantityTable.size(); ++i)
        if (static_cast<std::size_t>(quantityTable[i].quantity) != i) return false;
    return quantityTable.size() == static_cast<std::size_t>(Quantity::speed) + 1;
}
} // namespace detail
static_assert(detail::tableIsInOrder(), "quantityTable lists every Quantity once, in its order");

} // namespace quasistat::units
