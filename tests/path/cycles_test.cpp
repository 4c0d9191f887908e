// Closed paths against the published efficiencies of the air-standard cycles.

#include "tests/support/paths.h"

#include <cmath>

namespace quasistat::path
{
namespace
{

using test::PathOf;
using test::segment;

constexpr double gamma = 1.4;

Segment to(Process process, EndKey key, int state)
{
    return {process, {.values = {{key, SameAs{state}}}}, ""};
}

TEST(Cycle, OttoEfficiencyIsThatOfItsCompressionRatio)
{
    // η = 1 − r^(1−γ) (air-standard Otto cycle).
    const PathOf path{.segments = {segment(Isentropic{}, EndKey::volumeRatio, 0.125),
                                   segment(Isochoric{}, EndKey::temperature, 1800.0),
                                   to(Isentropic{}, EndKey::volume, 1), to(Isochoric{}, EndKey::pressure, 1)},
                      .rate = 10.0};
    const Totals totals = path.evaluated().totals;
    EXPECT_TRUE(totals.closed);
    ASSERT_TRUE(totals.thermalEfficiency);
    EXPECT_NEAR(*totals.thermalEfficiency, 1.0 - std::pow(8.0, 1.0 - gamma), 1e-12);
    EXPECT_FALSE(totals.copHeating);
    EXPECT_NEAR(*totals.power, 10.0 * totals.netWorkOut, 1e-9);
    const double V1 = path.evaluated().states[0].state.volume();
    EXPECT_NEAR(*totals.meanEffectivePressure, totals.netWorkOut / (V1 * 0.875), 1e-9 * *totals.meanEffectivePressure);
    EXPECT_NEAR(*totals.carnotRatio, *totals.thermalEfficiency / (1.0 - 300.0 / 1800.0), 1e-9);
}

TEST(Cycle, DieselEfficiencyDependsOnTheCutOff)
{
    // η = 1 − r^(1−γ) (α^γ − 1)/(γ(α − 1)) (air-standard Diesel cycle).
    const double r = 18.0;
    const double cutOff = 2.2;
    const PathOf path{.segments = {segment(Isentropic{}, EndKey::volumeRatio, 1.0 / r),
                                   segment(Isobaric{}, EndKey::volumeRatio, cutOff),
                                   to(Isentropic{}, EndKey::volume, 1), to(Isochoric{}, EndKey::temperature, 1)}};
    const double expected = 1.0 - std::pow(r, 1.0 - gamma) * (std::pow(cutOff, gamma) - 1.0) / (gamma * (cutOff - 1.0));
    EXPECT_NEAR(path.evaluated().totals.thermalEfficiency.value_or(0.0), expected, 1e-12);
}

TEST(Cycle, BraytonEfficiencyIsThatOfItsPressureRatio)
{
    // η = 1 − r_p^((1−γ)/γ) (air-standard Brayton cycle).
    const PathOf path{.segments = {segment(Isentropic{}, EndKey::pressureRatio, 10.0),
                                   segment(Isobaric{}, EndKey::temperature, 1300.0),
                                   to(Isentropic{}, EndKey::pressure, 1), to(Isobaric{}, EndKey::temperature, 1)}};
    EXPECT_NEAR(path.evaluated().totals.thermalEfficiency.value_or(0.0), 1.0 - std::pow(10.0, (1.0 - gamma) / gamma),
                1e-12);
}

PathOf carnot(double hot, double cold, bool engine)
{
    // Four segments between two isotherms; volumes of the isentropes follow from T v^(γ−1) = constant.
    const double expansion = std::pow(hot / cold, 1.0 / (gamma - 1.0));
    PathOf path{.start = {.pressure = 5e5, .temperature = engine ? hot : cold, .amount = 1.0}};
    if (engine)
        path.segments = {segment(Isothermal{}, EndKey::volumeRatio, 3.0),
                         segment(Isentropic{}, EndKey::volumeRatio, expansion),
                         segment(Isothermal{}, EndKey::volumeRatio, 1.0 / 3.0),
                         {Isentropic{}, {.state = 1}, ""}};
    else
        path.segments = {segment(Isothermal{}, EndKey::volumeRatio, 3.0),
                         segment(Isentropic{}, EndKey::volumeRatio, 1.0 / expansion),
                         segment(Isothermal{}, EndKey::volumeRatio, 1.0 / 3.0),
                         {Isentropic{}, {.state = 1}, ""}};
    return path;
}

TEST(Cycle, CarnotEngineReachesTheBoundItself)
{
    const Totals totals = carnot(600.0, 300.0, true).evaluated().totals;
    EXPECT_NEAR(totals.thermalEfficiency.value_or(0.0), 0.5, 1e-11);
    EXPECT_NEAR(totals.carnotRatio.value_or(0.0), 1.0, 1e-11);
}

TEST(Cycle, CarnotHeatPumpReachesTheBoundItself)
{
    const Totals totals = carnot(320.0, 280.0, false).evaluated().totals;
    EXPECT_FALSE(totals.thermalEfficiency);
    EXPECT_NEAR(totals.copHeating.value_or(0.0), 320.0 / 40.0, 1e-9);
    EXPECT_NEAR(totals.copCooling.value_or(0.0), 280.0 / 40.0, 1e-9);
    EXPECT_NEAR(totals.carnotRatio.value_or(0.0), 1.0, 1e-10);
}

TEST(Cycle, CompressorLoopIsNoHeatPump)
{
    // Heat leaves in the coolers and comes back in the letdown, both at or above the same temperature.
    const PathOf path{.start = {.pressure = 1e5, .temperature = 293.15, .volume = 0.005},
                      .segments = {segment(Polytropic{1.3}, EndKey::pressure, 3e5),
                                   to(Isobaric{}, EndKey::temperature, 1),
                                   {ConstantExternalPressure{1e5}, {.balance = true}, ""}}};
    const Totals totals = path.evaluated().totals;
    EXPECT_TRUE(totals.closed);
    EXPECT_LT(totals.netWorkOut, 0.0);
    EXPECT_FALSE(totals.copHeating);
    EXPECT_FALSE(totals.copCooling);
    EXPECT_FALSE(totals.carnotRatio);
}

TEST(Cycle, OpenPathHasNoEfficiency)
{
    const Totals totals = PathOf{.segments = {segment(Isothermal{}, EndKey::volumeRatio, 2.0)}}.evaluated().totals;
    EXPECT_FALSE(totals.closed);
    EXPECT_FALSE(totals.thermalEfficiency);
    EXPECT_FALSE(totals.meanEffectivePressure);
}

} // namespace
} // namespace quasistat::path
