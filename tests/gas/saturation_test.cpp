// Vapour and liquid in equilibrium, and the states between them.

#include "core/gas/phase/saturation.h"
#include "core/gas/solve/solve.h"
#include "tests/support/gases.h"

#include <cmath>

namespace quasistat::gas
{
namespace
{

double gibbs(const MolarState &s)
{
    return s.enthalpy - s.temperature * s.entropy;
}

std::vector<std::string> pureFluids()
{
    std::vector<std::string> names;
    for (const ComponentFacts &facts : test::library().components("reference"))
        if (test::reference(facts.name)->equation()->saturation) names.push_back(facts.name);
    return names;
}

TEST(Saturation, HasEqualPressureAndGibbsEnergyInBothPhasesFromTheTriplePointToTheCritical)
{
    const auto fluids = pureFluids();
    EXPECT_EQ(fluids.size(), 28u); // all but air
    for (const std::string &fluid : fluids) {
        const GasPtr gas = test::reference(fluid);
        const Saturation &saturation = *gas->equation()->saturation;
        const double coldest = saturation.lowestTemperature();
        const double critical = saturation.criticalTemperature();
        for (const double share : {0.0, 0.1, 0.3, 0.5, 0.7, 0.9, 0.97, 0.99, 0.999, 0.9999}) {
            const double T = coldest + (critical - coldest) * share;
            SCOPED_TRACE(testing::Message() << fluid << " at " << T << " K");
            const auto pair = saturation.atTemperature(T);
            ASSERT_TRUE(pair.has_value());
            const double RT = gas->gasConstant() * T;
            EXPECT_GT(pair->vapour.molarVolume, pair->liquid.molarVolume);
            EXPECT_NEAR(gibbs(pair->liquid), gibbs(pair->vapour), 1e-10 * RT);
            // The pressure of a cold liquid is the small difference of two that are larger by its compression factor.
            const MolarState liquid = homogeneousState(*gas->equation(), T, pair->liquid.molarVolume);
            EXPECT_NEAR(liquid.pressure, pair->vapour.pressure,
                        1e-12 * (pair->vapour.pressure + 20.0 * RT / pair->liquid.molarVolume));
        }
    }
}

TEST(Saturation, AtAPressureIsThatOfItsTemperature)
{
    for (const std::string &fluid : pureFluids()) {
        const GasPtr gas = test::reference(fluid);
        const Saturation &saturation = *gas->equation()->saturation;
        for (const double share : {0.02, 0.2, 0.5, 0.8, 0.99}) {
            const double T = saturation.lowestTemperature() +
                             (saturation.criticalTemperature() - saturation.lowestTemperature()) * share;
            const auto pair = saturation.atTemperature(T);
            ASSERT_TRUE(pair.has_value());
            const auto back = saturation.atPressure(pair->vapour.pressure);
            ASSERT_TRUE(back.has_value()) << fluid << " at " << T;
            EXPECT_NEAR(back->vapour.temperature, T, 1e-12 * T) << fluid;
            EXPECT_EQ(back->vapour.pressure, pair->vapour.pressure);
        }
    }
}

TEST(Saturation, EndsAtTheTriplePointAndAtTheCriticalPoint)
{
    const GasPtr gas = test::reference("nitrogen");
    const Saturation &saturation = *gas->equation()->saturation;
    EXPECT_FALSE(saturation.atTemperature(63.0));
    EXPECT_FALSE(saturation.atTemperature(126.2));
    EXPECT_FALSE(saturation.atPressure(12000.0));
    EXPECT_FALSE(saturation.atPressure(3.4e6));
}

TEST(TwoPhaseState, FollowsTheLeverRule)
{
    const GasPtr gas = test::reference("carbon dioxide");
    const auto pair = *gas->equation()->saturation->atTemperature(260.0);
    for (const double x : {0.1, 0.5, 0.9}) {
        const double v = (1.0 - x) * pair.liquid.molarVolume + x * pair.vapour.molarVolume;
        const MolarState s = gas->at(260.0, v);
        ASSERT_TRUE(s.vapourFraction.has_value());
        EXPECT_NEAR(*s.vapourFraction, x, 1e-12);
        EXPECT_EQ(s.pressure, pair.vapour.pressure);
        EXPECT_NEAR(s.enthalpy, (1.0 - x) * pair.liquid.enthalpy + x * pair.vapour.enthalpy, 1e-9);
        EXPECT_NEAR(s.enthalpy, s.internalEnergy + s.pressure * v, 1e-9);
    }
}

TEST(TwoPhaseState, HasTheHeatCapacityAndPressureSlopeOfItsOwnDifferences)
{
    for (const char *fluid : {"nitrogen", "carbon dioxide", "water", "hydrogen"}) {
        const GasPtr gas = test::reference(fluid);
        const Saturation &saturation = *gas->equation()->saturation;
        const double T = 0.5 * (saturation.lowestTemperature() + saturation.criticalTemperature());
        const auto pair = *saturation.atTemperature(T);
        const double v = 0.7 * pair.liquid.molarVolume + 0.3 * pair.vapour.molarVolume;
        const double h = 1e-4 * T;
        const auto slope = [&](double MolarState::*property) {
            return (8.0 * (gas->at(T + h, v).*property - gas->at(T - h, v).*property) -
                    (gas->at(T + 2 * h, v).*property - gas->at(T - 2 * h, v).*property)) /
                   (12.0 * h);
        };
        const MolarState s = gas->at(T, v);
        EXPECT_NEAR(s.isochoricHeatCapacity, slope(&MolarState::internalEnergy), 1e-7 * s.isochoricHeatCapacity);
        EXPECT_NEAR(s.dpdT, slope(&MolarState::pressure), 1e-7 * s.dpdT);
        EXPECT_NEAR(s.isochoricHeatCapacity / T, slope(&MolarState::entropy), 1e-7 * s.isochoricHeatCapacity / T);
    }
}

TEST(PhaseBoundary, IsInterpolatedAsCloselyAsItSays)
{
    for (const std::string &fluid : pureFluids()) {
        const GasPtr gas = test::reference(fluid);
        const PhaseBoundary &boundary = *gas->equation()->boundary;
        const Saturation &saturation = *gas->equation()->saturation;
        for (int i = 1; i < 200; ++i) {
            const double T = saturation.lowestTemperature() +
                             (saturation.criticalTemperature() - saturation.lowestTemperature()) * i / 200.0;
            const auto pair = *saturation.atTemperature(T);
            EXPECT_NEAR(boundary.temperatureNear(pair.vapour.molarVolume), T, 1e-4 * T) << fluid;
            EXPECT_NEAR(boundary.temperatureAt(pair.vapour.molarVolume), T, 1e-11 * T) << fluid;
        }
    }
}

TEST(PhaseBoundary, OfPseudoPureAirIsItsPublishedDewLine)
{
    // E. W. Lemmon et al., J. Phys. Chem. Ref. Data 29 (2000) 331, dew pressure at 100 K from the ancillary equation.
    const GasPtr air = test::reference("air");
    const auto dew = (*test::library().data("air"))->reference->saturationPressure;
    const auto justAbove =
        stateFrom(*air, {Property::temperature, 100.0}, {Property::pressure, valueOf(*dew, 100.0) * (1.0 - 1e-6)});
    ASSERT_TRUE(justAbove);
    const auto beyond =
        stateFrom(*air, {Property::temperature, 100.0}, {Property::pressure, valueOf(*dew, 100.0) * (1.0 + 1e-3)});
    ASSERT_FALSE(beyond);
    EXPECT_EQ(beyond.failure().reason, Reason::condenses);
}

} // namespace
} // namespace quasistat::gas
