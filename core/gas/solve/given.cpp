#include "core/gas/solve/given.h"

#include <cmath>

namespace quasistat::gas
{
namespace
{

using units::Quantity;

Quantity quantityOf(Property property)
{
    switch (property) {
    case Property::temperature: return Quantity::temperature;
    case Property::pressure: return Quantity::pressure;
    case Property::entropy: return Quantity::molarEntropy;
    case Property::internalEnergy:
    case Property::enthalpy: return Quantity::molarEnergy;
    case Property::molarVolume: return Quantity::number;
    }
    return Quantity::number;
}

} // namespace

std::string wordsOf(Property property)
{
    switch (property) {
    case Property::temperature: return "temperature";
    case Property::pressure: return "pressure";
    case Property::entropy: return "molar entropy";
    case Property::internalEnergy: return "molar internal energy";
    case Property::enthalpy: return "molar enthalpy";
    case Property::molarVolume: return "molar volume [m³/mol]";
    }
    return {};
}

Failure noState(Given first, Given second)
{
    return {Reason::unreachable,
            "",
            {"the gas has no state with {0} {1} and {2} {3}",
             {wordsOf(first.property), Figure{quantityOf(first.property), first.value}, wordsOf(second.property),
              Figure{quantityOf(second.property), second.value}}}};
}

double valueOf(Property property, const MolarState &s)
{
    switch (property) {
    case Property::temperature: return s.temperature;
    case Property::molarVolume: return s.molarVolume;
    case Property::pressure: return s.pressure;
    case Property::internalEnergy: return s.internalEnergy;
    case Property::enthalpy: return s.enthalpy;
    case Property::entropy: return s.entropy;
    }
    return 0.0;
}

std::optional<double> valueOf(Property property, Given first, Given second)
{
    if (first.property == property) return first.value;
    if (second.property == property) return second.value;
    return std::nullopt;
}

Residue residue(const MolarState &s, Given given, double gasConstant)
{
    const double T = s.temperature;
    const double v = s.molarVolume;
    const double RT = gasConstant * T;
    switch (given.property) {
    case Property::temperature: return {std::log(T / given.value), 1.0, 0.0};
    case Property::molarVolume: return {std::log(v / given.value), 0.0, 1.0};
    case Property::pressure:
        if (s.pressure > 0.0)
            return {std::log(s.pressure / given.value), T * s.dpdT / s.pressure, v * s.dpdv / s.pressure};
        return {(s.pressure - given.value) / given.value, T * s.dpdT / given.value, v * s.dpdv / given.value};
    case Property::entropy:
        return {(s.entropy - given.value) / gasConstant, s.isochoricHeatCapacity / gasConstant,
                v * s.dpdT / gasConstant};
    case Property::internalEnergy:
        return {(s.internalEnergy - given.value) / RT, s.isochoricHeatCapacity / gasConstant,
                v * (T * s.dpdT - s.pressure) / RT};
    case Property::enthalpy:
        return {(s.enthalpy - given.value) / RT, (s.isochoricHeatCapacity + v * s.dpdT) / gasConstant,
                v * (T * s.dpdT + v * s.dpdv) / RT};
    }
    return {};
}

} // namespace quasistat::gas
