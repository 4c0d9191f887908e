#include "core/path/slide.h"
#include "tests/support/paths.h"

#include <cmath>

namespace quasistat::path
{
namespace
{

using test::PathOf;
using test::segment;

/// A canvas of 1000 × 500 pixels over 0…50 L and 0…10 bar.
constexpr PlaneMetric metric{.volumeScale = 1000.0 / 0.05, .pressureScale = 500.0 / 10e5};

TEST(NearestEnd, LiesOnTheCurveAndIsTheNearestOfIt)
{
    const PathOf path{.segments = {segment(Isentropic{}, EndKey::pressure, 4e5)}};
    const auto result = path.evaluated();
    const std::span<const StateResult> start(result.states.data(), 1);
    for (const Place place : {Place{0.012, 5e5}, Place{0.02, 1.1e5}, Place{0.004, 2e5}, Place{0.03, 9e5}}) {
        const auto end = nearestEnd(start, path.segments[0], place, metric);
        ASSERT_TRUE(end);
        EXPECT_NEAR(end->pressure * std::pow(end->volume, 1.4), 1e5 * std::pow(result.states[0].state.volume(), 1.4),
                    1e-9 * end->pressure);
        const auto distance = [&](double V) {
            const double p = 1e5 * std::pow(result.states[0].state.volume() / V, 1.4);
            return std::hypot((V - place.volume) * metric.volumeScale, (p - place.pressure) * metric.pressureScale);
        };
        const double here = distance(end->volume);
        for (double V = 0.001; V < 0.05; V *= 1.01) EXPECT_GE(distance(V), here - 0.01) << V;
    }
}

TEST(NearestEnd, KeepsEachKindOnItsOwnLine)
{
    const PathOf path;
    const auto result = path.evaluated();
    const Place place{0.015, 3e5};
    const auto end = [&](const Segment &s) { return *nearestEnd(result.states, s, place, metric); };
    EXPECT_NEAR(end(segment(Isobaric{}, EndKey::volume, 1.0)).pressure, 1e5, 1e-6);
    EXPECT_NEAR(end(segment(Isobaric{}, EndKey::volume, 1.0)).volume, 0.015, 1e-12);
    EXPECT_NEAR(end(segment(Isochoric{}, EndKey::pressure, 1.0)).volume, result.states[0].state.volume(), 1e-12);
    EXPECT_NEAR(end(segment(Isochoric{}, EndKey::pressure, 1.0)).pressure, 3e5, 1e-4);
    EXPECT_NEAR(end(segment(Isothermal{}, EndKey::pressure, 1.0)).temperature, 300.0, 1e-9);
    EXPECT_NEAR(end({Polytropic{}, {}, ""}).pressure, 3e5, 1e-4);
    EXPECT_NEAR(end({Linear{}, {}, ""}).volume, 0.015, 1e-12);
    EXPECT_NEAR(end(segment(Stepped{3}, EndKey::pressure, 1.0)).pressure, 3e5, 1e-4);
    // Gas left to itself only spreads out.
    EXPECT_GE(end(segment(FreeExpansion{}, EndKey::volume, 1.0)).volume, result.states[0].state.volume() * (1 - 1e-12));
}

TEST(NearestEnd, AgainstAConstantPressureStopsAtBalance)
{
    const PathOf path;
    const auto result = path.evaluated();
    const Segment piston{ConstantExternalPressure{0.5e5}, {.balance = true}, ""};
    const double balance = 2.0 * result.states[0].state.volume();
    EXPECT_NEAR(nearestEnd(result.states, piston, {1.0, 0.5e5}, metric)->volume, balance, 1e-9);
    EXPECT_NEAR(nearestEnd(result.states, piston, {0.03, 0.5e5}, metric)->volume, 0.03, 1e-9);
}

TEST(EndValueAt, ReadsTheFigureOfEachKey)
{
    const auto result = PathOf{}.evaluated();
    const gas::State &from = result.states[0].state;
    const SlidePoint point{2.0 * from.volume(), 3e5, 400.0, 1.0};
    EXPECT_EQ(endValueAt(from, point, EndKey::pressure), 3e5);
    EXPECT_NEAR(*endValueAt(from, point, EndKey::pressureRatio), 3.0, 1e-12);
    EXPECT_NEAR(*endValueAt(from, point, EndKey::volumeRatio), 2.0, 1e-12);
    EXPECT_FALSE(endValueAt(from, point, EndKey::heat));
}

} // namespace
} // namespace quasistat::path
