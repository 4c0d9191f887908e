// Ideal-gas heat capacities and enthalpies against published tables.

#include "core/gas/constants.h"
#include "tests/support/gases.h"

#include <cmath>

namespace quasistat::gas
{
namespace
{

struct Row {
    const char *component;
    double expected;
};

double enthalpy(const Gas &gas, double temperature)
{
    return gas.at(temperature, 1.0).enthalpy;
}

TEST(IdealGas, EnthalpyTo1000KelvinIsThatOfTheJanafTables)
{
    // NIST-JANAF Thermochemical Tables, 4th ed. (1998): H°(1000 K) − H°(298.15 K) [kJ/mol]. Values from memory: 0.3 %.
    for (const Row &row : {Row{"nitrogen", 21.463}, Row{"oxygen", 22.703}, Row{"carbon dioxide", 33.397},
                           Row{"water", 26.000}, Row{"carbon monoxide", 21.690}, Row{"hydrogen", 20.680}})
        EXPECT_NEAR(enthalpy(*test::ideal({{row.component, 1.0}}), 1000.0) / 1000.0, row.expected, 0.003 * row.expected)
            << row.component;
}

TEST(IdealGas, HeatCapacityAtRoomTemperatureIsThatOfTheJanafTables)
{
    // NIST-JANAF Thermochemical Tables, 4th ed. (1998): C_p°(298.15 K) [J/(mol K)]. Values from memory: 0.1 %.
    for (const Row &row : {Row{"nitrogen", 29.124}, Row{"oxygen", 29.378}, Row{"carbon dioxide", 37.129},
                           Row{"carbon monoxide", 29.142}, Row{"hydrogen", 28.836}})
        EXPECT_NEAR(isobaricHeatCapacity(test::ideal({{row.component, 1.0}})->at(298.15, 1.0)), row.expected,
                    0.001 * row.expected)
            << row.component;
}

TEST(IdealGas, DryAirHasTheConstantsOfTheStandardAtmosphere)
{
    // ISO 2533:1975: γ = 1.400, R = 287.053 J/(kg K). The three-component air of the data differs in molar mass by
    // 2e-4.
    const auto air = test::idealAir();
    EXPECT_NEAR(idealHeatCapacityRatio(*air, 288.15), 1.400, 0.001);
    EXPECT_NEAR(air->gasConstant() / air->molarMass(), 287.053, 2.2e-4 * 287.053);
}

TEST(IdealGas, EnthalpyAndEntropyJoinAtTheSeamOfTheirPolynomials)
{
    for (const auto &[name, gas] : test::everyIdealGas())
        for (const double seam : gas->seams()) {
            const MolarState below = gas->at(std::nextafter(seam, 0.0), 1.0);
            const MolarState above = gas->at(std::nextafter(seam, 1e9), 1.0);
            EXPECT_NEAR(below.enthalpy, above.enthalpy, 1e-9) << name << ' ' << seam;
            EXPECT_NEAR(below.entropy, above.entropy, 1e-11) << name << ' ' << seam;
        }
}

TEST(IdealGas, HeatCapacityStaysConstantBelowItsPublishedRange)
{
    const auto nitrogen = test::ideal({{"nitrogen", 1.0}});
    EXPECT_DOUBLE_EQ(nitrogen->validity().valid.lowestTemperature, 200.0);
    EXPECT_DOUBLE_EQ(nitrogen->validity().hard.lowestTemperature, 50.0);
    const double atEnd = isobaricHeatCapacity(nitrogen->at(200.0, 1.0));
    for (const double T : {199.0, 120.0, 51.0})
        EXPECT_NEAR(isobaricHeatCapacity(nitrogen->at(T, 1.0)), atEnd, 1e-10) << T;
}

TEST(IdealGas, MixingAddsTheEntropyOfIdealMixing)
{
    // −R Σ x ln x: the definition.
    const auto pure = test::ideal({{"helium", 1.0}});
    const auto mixed = test::ideal({{"argon", 0.25}, {"helium", 0.75}});
    const double mixing = -molarGasConstant * (0.25 * std::log(0.25) + 0.75 * std::log(0.75));
    // Helium and argon have the same constant heat capacity, so nothing else differs.
    EXPECT_NEAR(mixed->at(350.0, 0.02).entropy - pure->at(350.0, 0.02).entropy, mixing, 1e-10);
}

} // namespace
} // namespace quasistat::gas
