#include "core/gas/solve/solve.h"
#include "core/gas/state.h"
#include "tests/support/gases.h"

#include <rapidcheck/gtest.h>

#include <cmath>

namespace quasistat::gas
{
namespace
{

constexpr Property all[]{Property::temperature,    Property::molarVolume, Property::pressure,
                         Property::internalEnergy, Property::enthalpy,    Property::entropy};

double valueOf(const MolarState &s, Property p)
{
    switch (p) {
    case Property::temperature: return s.temperature;
    case Property::molarVolume: return s.molarVolume;
    case Property::pressure: return s.pressure;
    case Property::internalEnergy: return s.internalEnergy;
    case Property::enthalpy: return s.enthalpy;
    case Property::entropy: return s.entropy;
    }
    return 0.0;
}

bool bothThermal(Property a, Property b)
{
    const auto thermal = [](Property p) {
        return p == Property::temperature || p == Property::internalEnergy || p == Property::enthalpy;
    };
    return thermal(a) && thermal(b);
}

RC_GTEST_PROP(Solve, ComesBackToAnyStateFromAnyTwoOfItsProperties, ())
{
    // ε times the condition of each pair stays below 1e-11 for ideal gases: their surfaces are nowhere flat.
    const double T = 60.0 * std::pow(90.0, *rc::gen::inRange(0, 10000) / 1e4);
    const double v = 1e-4 * std::pow(1e6, *rc::gen::inRange(0, 10000) / 1e4);
    const auto gases = test::everyIdealGas();
    const Gas &gas = *gases[*rc::gen::inRange<std::size_t>(0, gases.size())].gas;
    const MolarState s = gas.at(T, v);
    for (const Property a : all)
        for (const Property b : all) {
            if (a == b || bothThermal(a, b)) continue;
            const auto found = stateFrom(gas, {a, valueOf(s, a)}, {b, valueOf(s, b)});
            RC_ASSERT(found.ok());
            RC_ASSERT(std::abs(found->temperature / T - 1.0) < 1e-10);
            RC_ASSERT(std::abs(found->molarVolume / v - 1.0) < 1e-10);
        }
}

TEST(Solve, SaysWhenTwoPropertiesDoNotFixAnIdealGas)
{
    const auto gas = test::perfect();
    for (const auto &[a, b] :
         {std::pair{Property::temperature, Property::enthalpy}, std::pair{Property::internalEnergy, Property::enthalpy},
          std::pair{Property::temperature, Property::temperature}}) {
        const auto state = stateFrom(*gas, {a, 300.0}, {b, 300.0});
        ASSERT_FALSE(state);
        EXPECT_EQ(state.failure().reason, Reason::undetermined);
    }
}

TEST(Solve, RefusesWhatNoGasCanHave)
{
    const auto gas = test::perfect();
    for (const double wrong : {0.0, -1.0, std::nan(""), HUGE_VAL}) {
        const auto state = stateFrom(*gas, {Property::pressure, wrong}, {Property::temperature, 300.0});
        ASSERT_FALSE(state);
        EXPECT_EQ(state.failure().reason, Reason::outOfRange);
    }
}

TEST(Solve, SaysThatThereIsNoStateColderThanAbsoluteZero)
{
    const auto gas = test::perfect();
    const auto state = stateFrom(*gas, {Property::molarVolume, 0.02}, {Property::internalEnergy, -1e5});
    ASSERT_FALSE(state);
    EXPECT_EQ(state.failure().reason, Reason::unreachable);
}

TEST(Solve, SaysWhereTheModelEnds)
{
    const auto state = stateFrom(*test::idealAir(), {Property::pressure, 1e5}, {Property::temperature, 7000.0});
    ASSERT_FALSE(state);
    EXPECT_EQ(state.failure().reason, Reason::outsideModel);
    EXPECT_EQ(state.failure().message.arguments.size(), 3u);
}

TEST(State, OfAnEvacuatedVolumeHasNoAmountAndNoTemperature)
{
    const State state = State::evacuated(test::perfect(), 0.002);
    EXPECT_EQ(state.amount(), 0.0);
    EXPECT_EQ(state.pressure(), 0.0);
    EXPECT_EQ(state.volume(), 0.002);
    EXPECT_EQ(state.entropy(), 0.0);
    EXPECT_FALSE(state.temperature());
    EXPECT_FALSE(state.compressibility());
}

} // namespace
} // namespace quasistat::gas
