#include "core/analysis/evaluation.h"
#include "tests/support/paths.h"

#include <cmath>

namespace quasistat::analysis
{
namespace
{

using path::EndKey;
using path::SameAs;
using test::PathOf;
using test::segment;

Verdict only(const PathOf &path, const Limit &limit)
{
    return evaluate(path.input(), {limit}).verdicts.at(0);
}

/// Air at 1 bar, 20 °C and 5 L pressed isentropically to 10 bar: p^(1−1/γ) falls on T, in closed form.
PathOf compression()
{
    return {.start = {.pressure = 1e5, .temperature = 293.15, .volume = 0.005},
            .segments = {segment(path::Isentropic{}, EndKey::pressure, 10e5)}};
}

TEST(Envelope, FindsTheHaloFromWhereTheLimitIsPassed)
{
    const Verdict v = only(compression(), {LimitQuantity::temperature, "discharge", std::nullopt, 423.15, {}});
    EXPECT_FALSE(v.ok);
    EXPECT_NEAR(*v.worst, 293.15 * std::pow(10.0, 0.4 / 1.4), 1e-9);
    EXPECT_EQ(v.segment, 1);
    EXPECT_EQ(v.state, 2);
    ASSERT_EQ(v.violations.size(), 1u);
    const auto &stretch = v.violations[0].stretch;
    ASSERT_GE(stretch.size(), 2u);
    EXPECT_NEAR(stretch.front().pressure, 1e5 * std::pow(423.15 / 293.15, 1.4 / 0.4), 1e-6 * 1e5);
    EXPECT_NEAR(stretch.back().pressure, 10e5, 1e-6 * 1e5);
}

TEST(Envelope, SeesTheMaximumInsideASegmentWhoseEndsAreBothWithin)
{
    // A straight line over a temperature hump: T = (α − βV)V/(nR) is highest at V = α/2β.
    const double a = 8.31446261815324 * 300.0 / 1e5;
    const PathOf hump{.segments = {{path::Linear{}, {}, ""}}};
    PathOf path = hump;
    path.segments[0].end.values = {{EndKey::pressure, 0.25e5}, {EndKey::volume, 3.0 * a}};
    const double beta = 0.75e5 / (2.0 * a);
    const double alpha = 1e5 + beta * a;
    const double highest = alpha * alpha / (4.0 * beta) / 8.31446261815324;
    const Verdict beyond = only(path, {LimitQuantity::temperature, "", std::nullopt, highest - 0.01, {}});
    EXPECT_FALSE(beyond.ok);
    EXPECT_NEAR(*beyond.worst, highest, 1e-8);
    EXPECT_EQ(beyond.state, 0);
    EXPECT_EQ(beyond.violations.size(), 1u);
    EXPECT_TRUE(only(path, {LimitQuantity::temperature, "", std::nullopt, highest + 0.01, {}}).ok);
}

TEST(Envelope, AnEndOnTheLimitItselfIsWithin)
{
    EXPECT_TRUE(only(compression(), {LimitQuantity::pressure, "receiver", std::nullopt, 10e5, {}}).ok);
    EXPECT_FALSE(only(compression(), {LimitQuantity::pressure, "receiver", std::nullopt, 9.999e5, {}}).ok);
    EXPECT_TRUE(only(compression(), {LimitQuantity::pressure, "", 1e5, std::nullopt, {}}).ok);
    EXPECT_FALSE(only(compression(), {LimitQuantity::pressure, "", 1.001e5, std::nullopt, {}}).ok);
}

TEST(Envelope, ARatingThatFallsWithTemperatureIsJudgedAtEachTemperature)
{
    // 12 bar up to 100 °C, falling to 9 bar at 400 °C. On the isentrope the rating is met where
    // T(p) = 293.15 (p/1 bar)^(2/7) and p = 12 − 3 (T − 373.15)/300 [bar].
    const Limit rating{LimitQuantity::pressure, "flange", std::nullopt, std::nullopt, {{373.15, 12e5}, {673.15, 9e5}}};
    PathOf path = compression();
    EXPECT_TRUE(only(path, rating).ok);
    path.segments = {segment(path::Isentropic{}, EndKey::pressure, 11e5)};
    const Verdict v = only(path, rating);
    EXPECT_FALSE(v.ok);
    EXPECT_NEAR(*v.worst, 11e5, 1e-3);
    const double T2 = 293.15 * std::pow(11.0, 0.4 / 1.4);
    EXPECT_NEAR(*v.worstAllowed, 12e5 - 3e5 * (T2 - 373.15) / 300.0, 1.0);
    ASSERT_EQ(v.violations.size(), 1u);
    const double p = v.violations[0].stretch.front().pressure / 1e5;
    EXPECT_NEAR(p, 12.0 - 3.0 * (293.15 * std::pow(p, 0.4 / 1.4) - 373.15) / 300.0, 1e-5);
}

TEST(Envelope, ARatingIsWorstInsideASegmentWhereTheDerivativeSaysSo)
{
    // Along an isochore p rises with T while the rating falls: worst at the end. Along a line through the break,
    // compare with a fine scan.
    const Limit rating{
        LimitQuantity::pressure, "", std::nullopt, std::nullopt, {{300.0, 2.2e5}, {420.0, 1.0e5}, {600.0, 0.9e5}}};
    PathOf path{.segments = {{path::Linear{}, {}, ""}}};
    const double a = 8.31446261815324 * 300.0 / 1e5;
    path.segments[0].end.values = {{EndKey::pressure, 0.2e5}, {EndKey::volume, 4.0 * a}};
    const Verdict v = only(path, rating);
    double worst = 0.0;
    for (int i = 0; i <= 200000; ++i) {
        const double V = a * (1.0 + 3.0 * i / 200000);
        const double p = 1e5 - 0.8e5 * (V - a) / (3.0 * a);
        const double T = p * V / 8.31446261815324;
        const double allowed = T < 420.0 ? std::min(2.2e5, 2.2e5 - 1.2e5 * (T - 300.0) / 120.0)
                                         : std::max(0.9e5, 1e5 - 0.1e5 * (T - 420.0) / 180.0);
        worst = std::max(worst, p / allowed);
    }
    EXPECT_NEAR(*v.worst / *v.worstAllowed, worst, 1e-8);
}

TEST(Envelope, WorkHeatAndPressureRatioBelongToASegment)
{
    PathOf path = compression();
    path.segments.push_back({path::Isobaric{}, {}, ""});
    path.segments[1].end.values = {{EndKey::temperature, SameAs{1}}};
    const auto result = path.evaluated();
    EXPECT_NEAR(*only(path, {LimitQuantity::work, "", std::nullopt, 100.0, {}}).worst, result.segments[0].work, 1e-9);
    const Verdict heat = only(path, {LimitQuantity::heat, "cooler", -500.0, std::nullopt, {}});
    EXPECT_FALSE(heat.ok);
    EXPECT_EQ(heat.segment, 2);
    EXPECT_NEAR(*heat.worst, result.segments[1].heat, 1e-9);
    const Verdict ratio = only(path, {LimitQuantity::pressureRatio, "", std::nullopt, 4.0, {}});
    EXPECT_NEAR(*ratio.worst, 10.0, 1e-9);
    EXPECT_TRUE(ratio.violations.at(0).stretch.empty());
}

TEST(Envelope, StoredEnergyIsJudgedAlongTheSegment)
{
    const auto result = compression().evaluated();
    const Verdict v = only(compression(), {LimitQuantity::storedEnergy, "", std::nullopt, 200.0, {}});
    EXPECT_FALSE(v.ok);
    EXPECT_NEAR(*v.worst, result.states[1].storedEnergy->real, 1e-8);
    EXPECT_EQ(v.state, 2);
}

TEST(Envelope, IrreversibleSegmentsAreJudgedAtTheirStates)
{
    PathOf path{.start = {.pressure = 10e5, .temperature = 293.15, .volume = 0.001},
                .segments = {{path::ConstantExternalPressure{1e5, path::Thermal::adiabatic}, {.balance = true}, ""}}};
    const Verdict v = only(path, {LimitQuantity::temperature, "seal", 250.0, std::nullopt, {}});
    EXPECT_FALSE(v.ok);
    EXPECT_NEAR(*v.worst, 293.15 * (1.0 + 0.4 * 0.1) / 1.4, 1e-9);
    EXPECT_EQ(v.violations.at(0).segment, 1);
}

TEST(Envelope, APathOfNoSegmentsIsJudgedAtItsStart)
{
    PathOf path{.start = {.pressure = 10e5, .temperature = 293.15, .volume = 0.001}};
    EXPECT_FALSE(only(path, {LimitQuantity::pressure, "", std::nullopt, 8e5, {}}).ok);
    EXPECT_FALSE(only(path, {LimitQuantity::amount, "", std::nullopt, 0.1, {}}).ok);
    EXPECT_FALSE(only(path, {LimitQuantity::work, "", std::nullopt, 0.1, {}}).worst);
}

TEST(Boundary, IsTheUnionOfAllLimitsAndChangesWhereTheyMeet)
{
    const PathOf path = compression();
    const auto charge = path.evaluated().states[0].state;
    const std::vector<Limit> limits{{LimitQuantity::temperature, "discharge", std::nullopt, 413.15, {}},
                                    {LimitQuantity::pressure, "receiver", std::nullopt, 11e5, {}}};
    const auto stretches = boundary(limits, charge, {{0.0, 0.0054}, {0.0, 12e5}, false});
    ASSERT_EQ(stretches.size(), 2u);
    EXPECT_EQ(stretches[0].limit, 1u);
    EXPECT_EQ(stretches[1].limit, 0u);
    // They meet where n R T/V = p.
    const double corner = charge.amount() * 8.31446261815324 * 413.15 / 11e5;
    EXPECT_NEAR(stretches[0].points.back().first, corner, 1e-9 * corner);
    EXPECT_NEAR(stretches[1].points.front().second, 11e5, 1.0);
    for (const auto &[V, p] : stretches[1].points)
        EXPECT_NEAR(p * V, charge.amount() * 8.31446261815324 * 413.15, 1e-9 * p * V);
}

TEST(Boundary, VolumeLimitsStandUprightBetweenTheOthers)
{
    const auto charge = compression().evaluated().states[0].state;
    const auto stretches =
        boundary({{LimitQuantity::volume, "stroke", 0.001, 0.005, {}}}, charge, {{0.0, 0.0054}, {0.0, 12e5}, false});
    ASSERT_EQ(stretches.size(), 2u);
    EXPECT_FALSE(stretches[0].forbiddenAbove);
    EXPECT_EQ(stretches[0].points[0].first, 0.001);
    EXPECT_TRUE(stretches[1].forbiddenAbove);
    EXPECT_EQ(stretches[1].points[1].second, 12e5);
}

} // namespace
} // namespace quasistat::analysis
