#include "tests/support/gases.h"

namespace quasistat::gas
{
namespace
{

TEST(Library, KnowsItsComponentsByNameAndFormula)
{
    const Library &library = test::library();
    EXPECT_EQ(library.components("ideal").size(), 47u);
    EXPECT_EQ(*library.componentName("N2"), "nitrogen");
    EXPECT_EQ(*library.componentName("carbon dioxide"), "carbon dioxide");
    EXPECT_EQ(*library.componentName("n-butane"), "n-butane");
    EXPECT_EQ(*library.componentName("Helium"), "helium");
}

TEST(Library, SaysWhatIsNearAnUnknownName)
{
    const auto name = test::library().componentName("nitrogin");
    ASSERT_FALSE(name);
    EXPECT_EQ(name.failure().reason, Reason::unknownName);
    EXPECT_NE(std::get<std::string>(name.failure().message.arguments.at(1)).find("nitrogen"), std::string::npos);
}

TEST(Library, WeighsMolarMassesByFraction)
{
    // Molar mass of the three-component dry air of the data: 0.0289586 kg/mol, half a unit of its last digit; the
    // components' own masses are given to 1e-6 kg/mol.
    EXPECT_NEAR(test::idealAir()->molarMass(), 0.0289586, 1.5e-6);
}

TEST(Library, RefusesAMixtureOfNothingAndOfStrangers)
{
    EXPECT_EQ(test::library().idealGas({}, "").failure().reason, Reason::missing);
    EXPECT_EQ(test::library().idealGas({{"phlogiston", 1.0}}, "").failure().reason, Reason::unknownName);
}

TEST(Library, RangeOfAMixtureIsWhereAllItsComponentsHold)
{
    const auto gas = test::ideal({{"nitrogen", 0.5}, {"sulfur hexafluoride", 0.5}});
    EXPECT_DOUBLE_EQ(gas->validity().valid.lowestTemperature, 300.0);
    EXPECT_DOUBLE_EQ(gas->validity().valid.highestTemperature, 5000.0);
}

} // namespace
} // namespace quasistat::gas
