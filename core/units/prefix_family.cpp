#include "core/units/prefix_family.h"

#include <array>

namespace quasistat::units
{

namespace
{

// The unit without a prefix keeps figures up to 9999.9: a ledger in J reads better than one in kJ with the same digits.
constexpr std::array pressures{PrefixedUnit{"µbar", 1e-1, 0.0}, PrefixedUnit{"mbar", 1e2, 1e2},
                               PrefixedUnit{"bar", 1e5, 1e5}, PrefixedUnit{"kbar", 1e8, 1e9},
                               PrefixedUnit{"Mbar", 1e11, 1e11}};
constexpr std::array pascals{PrefixedUnit{"µPa", 1e-6, 0.0}, PrefixedUnit{"mPa", 1e-3, 1e-3},
                             PrefixedUnit{"Pa", 1.0, 1.0},   PrefixedUnit{"kPa", 1e3, 1e4},
                             PrefixedUnit{"MPa", 1e6, 1e7},  PrefixedUnit{"GPa", 1e9, 1e9},
                             PrefixedUnit{"TPa", 1e12, 1e12}};
constexpr std::array volumes{PrefixedUnit{"nL", 1e-12, 0.0}, PrefixedUnit{"µL", 1e-9, 1e-9},
                             PrefixedUnit{"mL", 1e-6, 1e-6}, PrefixedUnit{"L", 1e-3, 1e-4},
                             PrefixedUnit{"m³", 1.0, 10.0},  PrefixedUnit{"km³", 1e9, 1e9}};
constexpr std::array amounts{PrefixedUnit{"nmol", 1e-9, 0.0},  PrefixedUnit{"µmol", 1e-6, 1e-6},
                             PrefixedUnit{"mmol", 1e-3, 1e-3}, PrefixedUnit{"mol", 1.0, 1.0},
                             PrefixedUnit{"kmol", 1e3, 1e4},   PrefixedUnit{"Mmol", 1e6, 1e6}};
constexpr std::array masses{PrefixedUnit{"ng", 1e-12, 0.0}, PrefixedUnit{"µg", 1e-9, 1e-9},
                            PrefixedUnit{"mg", 1e-6, 1e-6}, PrefixedUnit{"g", 1e-3, 1e-3},
                            PrefixedUnit{"kg", 1.0, 1.0},   PrefixedUnit{"t", 1e3, 1e4},
                            PrefixedUnit{"kt", 1e6, 1e6}};
constexpr std::array molarMasses{PrefixedUnit{"g/mol", 1e-3, 0.0}, PrefixedUnit{"kg/mol", 1.0, 10.0}};
constexpr std::array energies{PrefixedUnit{"pJ", 1e-12, 0.0}, PrefixedUnit{"nJ", 1e-9, 1e-9},
                              PrefixedUnit{"µJ", 1e-6, 1e-6}, PrefixedUnit{"mJ", 1e-3, 1e-3},
                              PrefixedUnit{"J", 1.0, 1.0},    PrefixedUnit{"kJ", 1e3, 1e4},
                              PrefixedUnit{"MJ", 1e6, 1e6},   PrefixedUnit{"GJ", 1e9, 1e9},
                              PrefixedUnit{"TJ", 1e12, 1e12}, PrefixedUnit{"PJ", 1e15, 1e15}};
constexpr std::array powers{PrefixedUnit{"nW", 1e-9, 0.0},  PrefixedUnit{"µW", 1e-6, 1e-6},
                            PrefixedUnit{"mW", 1e-3, 1e-3}, PrefixedUnit{"W", 1.0, 1.0},
                            PrefixedUnit{"kW", 1e3, 1e4},   PrefixedUnit{"MW", 1e6, 1e6},
                            PrefixedUnit{"GW", 1e9, 1e9},   PrefixedUnit{"TW", 1e12, 1e12}};
constexpr std::array entropies{PrefixedUnit{"nJ/K", 1e-9, 0.0},  PrefixedUnit{"µJ/K", 1e-6, 1e-6},
                               PrefixedUnit{"mJ/K", 1e-3, 1e-3}, PrefixedUnit{"J/K", 1.0, 1.0},
                               PrefixedUnit{"kJ/K", 1e3, 1e4},   PrefixedUnit{"MJ/K", 1e6, 1e6},
                               PrefixedUnit{"GJ/K", 1e9, 1e9}};
constexpr std::array molarEnergies{PrefixedUnit{"J/mol", 1.0, 0.0}, PrefixedUnit{"kJ/mol", 1e3, 1e4},
                                   PrefixedUnit{"MJ/mol", 1e6, 1e6}};
constexpr std::array molarEntropies{PrefixedUnit{"J/(mol K)", 1.0, 0.0}, PrefixedUnit{"kJ/(mol K)", 1e3, 1e4}};
constexpr std::array specificEntropies{PrefixedUnit{"J/(kg K)", 1.0, 0.0}, PrefixedUnit{"kJ/(kg K)", 1e3, 1e3},
                                       PrefixedUnit{"MJ/(kg K)", 1e6, 1e6}};
constexpr std::array stiffnesses{PrefixedUnit{"Pa/m³", 1.0, 0.0}, PrefixedUnit{"kPa/m³", 1e3, 1e4},
                                 PrefixedUnit{"MPa/m³", 1e6, 1e6}, PrefixedUnit{"GPa/m³", 1e9, 1e9},
                                 PrefixedUnit{"TPa/m³", 1e12, 1e12}};
constexpr std::array frequencies{PrefixedUnit{"1/min", 1.0 / 60.0, 0.0}};
constexpr std::array lengths{PrefixedUnit{"nm", 1e-9, 0.0}, PrefixedUnit{"µm", 1e-6, 1e-6},
                             PrefixedUnit{"mm", 1e-3, 1e-3}, PrefixedUnit{"m", 1.0, 1.0}, PrefixedUnit{"km", 1e3, 1e4}};
constexpr std::array areas{PrefixedUnit{"mm²", 1e-6, 0.0}, PrefixedUnit{"cm²", 1e-4, 1e-4},
                           PrefixedUnit{"m²", 1.0, 1.0}};
constexpr std::array durations{PrefixedUnit{"ns", 1e-9, 0.0}, PrefixedUnit{"µs", 1e-6, 1e-6},
                               PrefixedUnit{"ms", 1e-3, 1e-3}, PrefixedUnit{"s", 1.0, 1.0},
                               PrefixedUnit{"h", 3600.0, 36000.0}};
constexpr std::array speeds{PrefixedUnit{"mm/s", 1e-3, 0.0}, PrefixedUnit{"m/s", 1.0, 1.0},
                            PrefixedUnit{"km/s", 1e3, 1e4}};

} // namespace

std::span<const PrefixedUnit> prefixFamily(Quantity quantity)
{
    switch (quantity) {
    case Quantity::number:
    case Quantity::temperature:
    case Quantity::temperatureDifference: return {};
    case Quantity::pressure: return pressures;
    case Quantity::pressureDifference: return pascals;
    case Quantity::volume: return volumes;
    case Quantity::amount: return amounts;
    case Quantity::mass: return masses;
    case Quantity::molarMass: return molarMasses;
    case Quantity::energy: return energies;
    case Quantity::power: return powers;
    case Quantity::entropy: return entropies;
    case Quantity::molarEnergy: return molarEnergies;
    case Quantity::molarEntropy: return molarEntropies;
    case Quantity::specificEntropy: return specificEntropies;
    case Quantity::frequency: return frequencies;
    case Quantity::stiffness: return stiffnesses;
    case Quantity::length: return lengths;
    case Quantity::area: return areas;
    case Quantity::duration: return durations;
    case Quantity::speed: return speeds;
    }
    return {};
}

} // namespace quasistat::units
