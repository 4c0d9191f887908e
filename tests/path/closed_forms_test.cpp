// Work, heat and end states by quadrature and iteration against the closed forms of a perfect gas. Each form follows
// from p v = R T, du = c_v dT and dW = −p dV; 1e-12 of nRT where nothing is iterated, 1e-10 else.

#include "core/gas/constants.h"
#include "tests/support/paths.h"

#include <cmath>

namespace quasistat::path
{
namespace
{

using test::PathOf;
using test::segment;

constexpr double R = gas::molarGasConstant;
constexpr double T1 = 300.0;
constexpr double RT = R * T1;
constexpr double gamma = 1.4;
constexpr double cv = R / (gamma - 1.0);

TEST(ClosedForm, IsothermalWorkIsNRTLogOfVolumes)
{
    for (const double ratio : {1e-6, 0.1, 0.5, 1.0, 2.0, 100.0, 1e6}) {
        const auto r = PathOf{.segments = {segment(Isothermal{}, EndKey::volumeRatio, ratio)}}.only();
        EXPECT_NEAR(r.work, -RT * std::log(ratio), 1e-12 * RT * (1 + std::abs(std::log(ratio)))) << ratio;
        EXPECT_NEAR(r.heat, -r.work, 1e-12 * RT * (1 + std::abs(std::log(ratio))));
        EXPECT_NEAR(r.deltaInternalEnergy, 0.0, 1e-12 * RT);
        EXPECT_TRUE(r.audit.ok);
    }
}

TEST(ClosedForm, HoldsOnTheShortestSegments)
{
    // The estimate of a quadrature's error must shrink with its interval, or short segments never converge.
    for (const double change : {1e-3, 1e-5, 1e-8}) {
        const Segment kinds[]{
            segment(Isothermal{}, EndKey::volumeRatio, 1.0 + change),
            segment(Polytropic{1.2}, EndKey::volumeRatio, 1.0 + change),
            segment(Isobaric{}, EndKey::volumeRatio, 1.0 + change),
            segment(Stepped{1, Spacing::ratio, Thermal::adiabatic}, EndKey::pressure, 1e5 / (1.0 + change))};
        for (const Segment &kind : kinds) {
            const auto r = PathOf{.segments = {kind}}.only();
            EXPECT_TRUE(r.audit.ok) << change << ' ' << facts(r.kind).words;
            EXPECT_LT(r.work, 0.0);
        }
    }
}

TEST(ClosedForm, IsobaricWorkAndHeat)
{
    const auto r = PathOf{.segments = {segment(Isobaric{}, EndKey::temperature, 450.0)}}.only();
    EXPECT_NEAR(r.work, -R * 150.0, 1e-12 * RT);
    EXPECT_NEAR(r.heat, gamma * cv * 150.0, 1e-12 * RT);
}

TEST(ClosedForm, IsochoricHeat)
{
    const auto r = PathOf{.segments = {segment(Isochoric{}, EndKey::pressure, 3e5)}}.only();
    EXPECT_EQ(r.work, 0.0);
    EXPECT_NEAR(r.heat, cv * 600.0, 1e-12 * cv * 600.0);
    EXPECT_NEAR(r.to.molar().temperature, 900.0, 1e-10);
}

TEST(ClosedForm, PolytropicWorkAndHeatForAnyExponentThroughOne)
{
    for (const double n : {-2.0, -0.5, 0.0, 0.3, 0.999999999999, 1.0, 1.000000000001, 1.0001, 1.2, 1.4, 1.9, 8.0}) {
        const auto r = PathOf{.segments = {segment(Polytropic{n}, EndKey::volume, RT / 1e5 / 3.0)}}.only();
        const double k = n - 1.0;
        const double growth = std::log(3.0);
        const double T2 = T1 * std::exp(k * growth);
        const double work = k == 0.0 ? RT * growth : RT * std::expm1(k * growth) / k;
        const double scale = RT + std::abs(work);
        EXPECT_NEAR(r.to.molar().temperature, T2, 1e-12 * T2) << n;
        EXPECT_NEAR(r.work, work, 1e-12 * scale) << n;
        EXPECT_NEAR(r.heat, cv * (T2 - T1) - work, 1e-12 * (scale + cv * T2)) << n;
        EXPECT_TRUE(r.audit.ok) << n;
        EXPECT_EQ(r.exponent, n);
    }
}

TEST(ClosedForm, IsentropicEndTemperature)
{
    for (const double ratio : {0.01, 0.5, 8.0, 1000.0}) {
        const auto r = PathOf{.segments = {segment(Isentropic{}, EndKey::pressureRatio, ratio)}}.only();
        const double T2 = T1 * std::pow(ratio, (gamma - 1.0) / gamma);
        EXPECT_NEAR(r.to.molar().temperature, T2, 1e-11 * T2) << ratio;
        EXPECT_NEAR(r.work, cv * (T2 - T1), 1e-11 * cv * T2) << ratio;
        EXPECT_EQ(r.heat, 0.0);
        EXPECT_TRUE(r.audit.ok);
    }
}

TEST(ClosedForm, LinearWorkIsTheTrapeziumAndTemperatureHasItsMaximumInside)
{
    // From (V, p) = (a, p₁) to (3a, p₁/4): on p = α − βV the maximum of p V is at V = α/2β.
    const double a = RT / 1e5;
    PathOf path{.segments = {{Linear{}, {.values = {{EndKey::pressure, 0.25e5}, {EndKey::volume, 3.0 * a}}}, ""}}};
    const auto r = path.only();
    EXPECT_NEAR(r.work, -0.5 * (1e5 + 0.25e5) * 2.0 * a, 1e-12 * RT);
    const double beta = 0.75e5 / (2.0 * a);
    const double alpha = 1e5 + beta * a;
    EXPECT_NEAR(r.extrema.temperature.highest, alpha * alpha / (4.0 * beta) / R, 1e-10 * T1);
    EXPECT_GT(r.extrema.temperature.highest, std::max(T1, r.to.molar().temperature) * 1.1);
    EXPECT_NEAR(r.extrema.temperature.lowest, r.to.molar().temperature, 1e-10);
}

TEST(ClosedForm, HeatTurnsRoundWhereALinearSegmentTouchesAnIsentrope)
{
    // On p = α − βV, δQ = (γ p + V dp/dV) dV/(γ − 1) changes sign at V = γα/((γ + 1)β).
    const double a = RT / 1e5;
    const auto r =
        PathOf{.segments = {{Linear{}, {.values = {{EndKey::pressure, 0.1e5}, {EndKey::volume, 3.0 * a}}}, ""}}}.only();
    const double beta = 0.9e5 / (2.0 * a);
    const double alpha = 1e5 + beta * a;
    const auto heatTo = [&](double V) {
        const double p = alpha - beta * V;
        return (p * V - RT) / (gamma - 1.0) + 0.5 * (1e5 + p) * (V - a);
    };
    const double turn = gamma * alpha / ((gamma + 1.0) * beta);
    ASSERT_GT(turn, a);
    ASSERT_LT(turn, 3.0 * a);
    EXPECT_NEAR(r.exchange.in, heatTo(turn), 1e-10 * RT);
    EXPECT_NEAR(r.exchange.out, heatTo(turn) - heatTo(3.0 * a), 1e-10 * RT);
}

TEST(ClosedForm, OneStepAgainstTheEndPressure)
{
    for (const double ratio : {0.2, 0.5, 3.0}) {
        const auto r = PathOf{.segments = {{ConstantExternalPressure{ratio * 1e5}, {.balance = true}, ""}}}.only();
        EXPECT_NEAR(r.work, -RT * (1.0 - ratio), 1e-12 * RT);
        EXPECT_NEAR(r.heat, -r.work, 1e-12 * RT);
        EXPECT_NEAR(*r.reversibleLimitWork, RT * std::log(ratio), 1e-12 * RT * 3);
        EXPECT_NEAR(*r.shortfall, r.work - *r.reversibleLimitWork, 1e-12 * RT);
        EXPECT_GE(r.entropyGenerated, 0.0);
        EXPECT_TRUE(r.audit.ok);
    }
}

TEST(ClosedForm, OneAdiabaticStepAgainstTheEndPressure)
{
    // T₂/T₁ = (1 + (γ − 1) p₂/p₁)/γ.
    const auto r =
        PathOf{.segments = {{ConstantExternalPressure{0.25e5, Thermal::adiabatic}, {.balance = true}, ""}}}.only();
    EXPECT_NEAR(r.to.molar().temperature / T1, (1.0 + 0.4 * 0.25) / 1.4, 1e-12);
    EXPECT_NEAR(r.to.pressure(), 0.25e5, 1e-7);
    EXPECT_NEAR(r.work, cv * (r.to.molar().temperature - T1), 1e-11 * RT);
}

TEST(ClosedForm, StepsOfEqualRatioTendToTheReversibleWorkLikeOneOverN)
{
    const double ratio = 0.125;
    double before = 0.0;
    for (const int N : {1, 2, 4, 64, 1000, 2000}) {
        const auto r = PathOf{.segments = {segment(Stepped{N}, EndKey::pressure, ratio * 1e5)}}.only();
        EXPECT_NEAR(r.work, -RT * N * (1.0 - std::pow(ratio, 1.0 / N)), 1e-11 * RT) << N;
        EXPECT_TRUE(r.audit.ok);
        if (N == 2000) {
            EXPECT_NEAR(*r.shortfall * 2.0 / before, 1.0, 1e-2); // ΔW ~ 1/N
        }
        before = *r.shortfall;
    }
}

TEST(ClosedForm, FreeExpansionDoesNoWorkAndKeepsTheTemperature)
{
    const auto r = PathOf{.segments = {segment(FreeExpansion{}, EndKey::volumeRatio, 4.0)}}.only();
    EXPECT_EQ(r.work, 0.0);
    EXPECT_EQ(r.heat, 0.0);
    EXPECT_NEAR(r.to.molar().temperature, T1, 1e-11);
    EXPECT_NEAR(r.entropyGenerated, R * std::log(4.0), 1e-12 * R);
    EXPECT_EQ(r.recovery, 0.0);
    EXPECT_FALSE(r.steadyFlowWork);
    EXPECT_FALSE(r.rodWork);
    EXPECT_FALSE(r.atmosphereWork);
    // Its limit is the isentrope to the same end pressure.
    EXPECT_NEAR(*r.reversibleLimitWork, cv * T1 * (std::pow(0.25, 0.4 / 1.4) - 1.0), 1e-11 * RT);
}

TEST(ClosedForm, StoredEnergyIsTheIsentropicReleaseInClosedForm)
{
    // p V/(γ − 1) · (1 − (p₀/p)^((γ−1)/γ)), the form ASME PCC-2 uses for pneumatic tests (from memory); for a perfect
    // gas the two routes, closed and by solving the isentrope, are one.
    PathOf path{.start = {.pressure = 200e5, .temperature = 293.15, .volume = 0.05}};
    const auto result = path.evaluated();
    const auto stored = result.states.at(0).storedEnergy;
    ASSERT_TRUE(stored);
    const double closed = 200e5 * 0.05 / 0.4 * (1.0 - std::pow(101325.0 / 200e5, 0.4 / 1.4));
    EXPECT_NEAR(stored->ideal, closed, 1e-9 * closed);
    EXPECT_NEAR(stored->real, closed, 1e-9 * closed);
}

TEST(ClosedForm, StoredEnergyIsAbsentBelowThePressureOfTheSurroundings)
{
    PathOf path{.start = {.pressure = 0.5e5, .temperature = 293.15, .volume = 0.05}};
    EXPECT_FALSE(path.evaluated().states.at(0).storedEnergy);
}

TEST(ClosedForm, AvailableWorkIsZeroInTheDeadStateAndPositiveAroundIt)
{
    for (const double p : {0.3e5, 101325.0, 9e5})
        for (const double T : {250.0, 298.15, 400.0}) {
            PathOf path{.start = {.pressure = p, .temperature = T, .amount = 1.0}};
            const double A = path.evaluated().states.at(0).availableWork.value_or(-1.0);
            if (p == 101325.0 && T == 298.15)
                EXPECT_NEAR(A, 0.0, 1e-9);
            else
                EXPECT_GT(A, 1.0);
        }
}

} // namespace
} // namespace quasistat::path
