#include "tests/support/gases.h"

#include <atomic>
#include <map>
#include <thread>

namespace quasistat::gas
{
namespace
{

TEST(Library, KnowsItsComponentsByNameAndFormula)
{
    const Library &library = test::library();
    EXPECT_GE(library.components("ideal").size(), 47u);
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

TEST(Library, ReadsFormulasAndAliasesAmongTheGasesOfAModel)
{
    const Library &library = test::library();
    EXPECT_EQ(*library.componentName("R134a", "reference"), "1,1,1,2-tetrafluoroethane");
    EXPECT_EQ(*library.componentName("r134A", "reference"), "1,1,1,2-tetrafluoroethane");
    EXPECT_EQ(*library.componentName("H2", "peng-robinson"), "hydrogen"); // not parahydrogen
    EXPECT_EQ(*library.componentName("H2"), "hydrogen");
    EXPECT_EQ(*library.componentName("C2H6O", "ideal"), "ethanol"); // no heat capacity of dimethyl ether
    EXPECT_EQ(library.componentName("C4H10", "gerg-2008").failure().reason, Reason::ambiguous);
}

TEST(Library, SaysWhichModelsHaveAGasThatThisOneHasNot)
{
    const auto name = test::library().componentName("xenon", "gerg-2008");
    ASSERT_FALSE(name);
    EXPECT_EQ(name.failure().reason, Reason::unknownName);
    const auto &arguments = name.failure().message.arguments;
    EXPECT_EQ(std::get<std::string>(arguments.at(0)), "gerg-2008");
    EXPECT_EQ(std::get<std::string>(arguments.at(1)), "xenon");
    EXPECT_EQ(std::get<std::string>(arguments.at(2)), "ideal, peng-robinson, soave-redlich-kwong, reference");
    EXPECT_FALSE(test::library().componentName("Xe", "gerg-2008"));
    EXPECT_FALSE(test::library().componentName("methylamine", "ideal"));
}

TEST(Library, EachModelHasItsGasesWithRangeAndSource)
{
    const std::map<std::string_view, std::size_t> expected{
        {"ideal", 47}, {"peng-robinson", 40}, {"soave-redlich-kwong", 40}, {"gerg-2008", 21}, {"reference", 29}};
    for (const std::string_view model : modelsOfGases()) {
        SCOPED_TRACE(model);
        const std::vector<ComponentFacts> components = test::library().components(model);
        EXPECT_GE(components.size(), expected.at(model));
        for (const ComponentFacts &facts : components) {
            SCOPED_TRACE(facts.name);
            EXPECT_FALSE(facts.source.empty());
            EXPECT_LT(facts.range.lowestTemperature, facts.range.highestTemperature);
            EXPECT_EQ(*test::library().componentName(facts.name, model), facts.name);
            EXPECT_EQ(*test::library().molarMass(facts.name, model), facts.molarMass);
        }
    }
}

TEST(Library, MolarMassIsThatOfTheModel)
{
    EXPECT_EQ(*test::library().molarMass("nitrogen", "ideal"), 0.028014);
    EXPECT_EQ(*test::library().molarMass("nitrogen", "gerg-2008"), 0.0280134);
    EXPECT_EQ(*test::library().molarMass("nitrogen", "reference"), 0.02801348);
}

TEST(Library, MayBeAskedByManyThreadsAtOnce)
{
    const Library library;
    std::vector<std::thread> threads;
    std::atomic<std::size_t> found = 0;
    for (int i = 0; i < 4; ++i) threads.emplace_back([&] { found += library.components("reference").size(); });
    for (std::thread &thread : threads) thread.join();
    EXPECT_EQ(found, 4u * test::library().components("reference").size());
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
