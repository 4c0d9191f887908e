// Every pair of properties leads back to the state they were taken from, for every fluid.

#include "tests/support/gases.h"
#include "tests/support/solve_check.h"

namespace quasistat::gas
{
namespace
{

constexpr int states = 2000; // tests/long takes 100 000

std::vector<std::string> fluids()
{
    std::vector<std::string> names;
    for (const ComponentFacts &facts : test::library().components("reference")) names.push_back(facts.name);
    return names;
}

std::string testName(const testing::TestParamInfo<std::string> &info)
{
    std::string name = info.param;
    std::ranges::replace_if(
        name, [](unsigned char c) { return !std::isalnum(c); }, '_');
    return name;
}

class ReferenceFluid : public testing::TestWithParam<std::string>
{
};

TEST_P(ReferenceFluid, ComesBackToAnyStateFromAnyTwoOfItsProperties)
{
    test::expectWayBack(*test::reference(GetParam()), states, 1);
}

INSTANTIATE_TEST_SUITE_P(Solve, ReferenceFluid, testing::ValuesIn(fluids()), testName);

TEST(Solve, ComesBackToAnyStateOfAMixtureAndOfACubicGas)
{
    for (const auto &[name, gas] : test::everyRealGas())
        if (gas->model() != "reference") test::expectWayBack(*gas, states, 2);
}

TEST(Solve, FindsTheStateNextToAKnownOneAsItFindsItFromNothing)
{
    const GasPtr gas = test::reference("nitrogen");
    const auto start = stateFrom(*gas, {Property::pressure, 2e7}, {Property::temperature, 293.15});
    ASSERT_TRUE(start);
    MolarState guess = *start;
    for (int i = 1; i <= 200; ++i) {
        const double v = start->molarVolume * std::pow(42.0, i / 200.0); // through the dome
        const auto near = stateFrom(*gas, {Property::molarVolume, v}, {Property::entropy, start->entropy}, &guess);
        const auto far = stateFrom(*gas, {Property::molarVolume, v}, {Property::entropy, start->entropy});
        ASSERT_TRUE(near);
        ASSERT_TRUE(far);
        EXPECT_NEAR(near->temperature, far->temperature, 1e-11 * far->temperature);
        guess = *near;
    }
}

TEST(Solve, SaysWhereAReferenceEquationEnds)
{
    const GasPtr gas = test::reference("nitrogen");
    const auto cold = stateFrom(*gas, {Property::pressure, 1e4}, {Property::temperature, 60.0});
    ASSERT_FALSE(cold); // below the triple point
    EXPECT_EQ(cold.failure().reason, Reason::outsideModel);
    const auto hot = stateFrom(*gas, {Property::pressure, 1e5}, {Property::temperature, 2100.0});
    ASSERT_FALSE(hot);
    EXPECT_EQ(hot.failure().reason, Reason::outsideModel);
    const auto dense = stateFrom(*gas, {Property::pressure, 3e9}, {Property::temperature, 300.0});
    EXPECT_FALSE(dense);
}

TEST(Solve, NamesTheDewPointOfAMixtureThatCondenses)
{
    const GasPtr gas = test::everyRealGas()[7].gas;
    ASSERT_EQ(gas->model(), "gerg-2008");
    const auto state = stateFrom(*gas, {Property::pressure, 4e6}, {Property::temperature, 190.0});
    ASSERT_FALSE(state);
    EXPECT_EQ(state.failure().reason, Reason::condenses);
    EXPECT_NE(state.failure().message.text.find("dew point"), std::string::npos);
}

} // namespace
} // namespace quasistat::gas
