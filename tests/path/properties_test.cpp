// What holds on every path, looked for where nobody thought of looking.

#include "core/path/sample.h"
#include "tests/support/paths.h"

#include <rapidcheck/gtest.h>

#include <cmath>

namespace quasistat::path
{
namespace
{

using test::PathOf;
using test::segment;

double between(double a, double b)
{
    return a + (b - a) * *rc::gen::inRange(0, 100001) / 1e5;
}

Process anyLaw()
{
    switch (*rc::gen::inRange(0, 4)) {
    case 0: return Isothermal{};
    case 1: return Isobaric{};
    case 2: return Isentropic{};
    default: return Polytropic{between(-1.0, 3.0)};
    }
}

/// Water is left out: below 4 °C its liquid has two temperatures at one pressure and volume.
gas::GasPtr anyGas()
{
    auto gases = test::everyGas();
    std::erase_if(gases, [](const test::NamedGas &gas) { return gas.gas->name() == "water"; });
    return gases[*rc::gen::inRange<std::size_t>(0, gases.size())].gas;
}

Start anyStart()
{
    return {.pressure = std::pow(10.0, between(3.0, 8.0)),
            .temperature = between(250.0, 900.0),
            .amount = between(0.01, 50.0)};
}

RC_GTEST_PROP(EveryPath, ClosesTheFirstLawOnEverySegment, ())
{
    const PathOf path{
        .gas = anyGas(), .start = anyStart(), .segments = {segment(anyLaw(), EndKey::volumeRatio, between(0.4, 2.5))}};
    const auto result = path.evaluated();
    RC_PRE(result.complete()); // may leave the range of the polynomials
    const SegmentResult &r = result.segments[0];
    RC_ASSERT(r.audit.ok);
    // A liquid hardly changes, and its energy counts from the ideal gas: rounding.
    const double rounding = 1e-13 * std::abs(r.from.internalEnergy());
    RC_ASSERT(std::abs(r.deltaInternalEnergy - r.work - r.heat) <= 1e-9 * r.audit.scale + rounding);
    RC_ASSERT(std::abs(r.deltaEnthalpy - r.heat - *r.steadyFlowWork) <=
              1e-12 * (std::abs(r.deltaEnthalpy) + r.audit.scale));
}

RC_GTEST_PROP(EveryPath, ReturnsThereAndBackWithNothingLeftOver, ())
{
    const Process law = anyLaw();
    const PathOf path{.gas = anyGas(),
                      .start = anyStart(),
                      .segments = {segment(law, EndKey::volumeRatio, between(0.4, 2.5)),
                                   {law, {.values = {{EndKey::volume, SameAs{1}}}}, ""}}};
    const auto result = path.evaluated();
    RC_PRE(result.complete());
    RC_ASSERT(result.totals.closed);
    const double scale = result.segments[0].audit.scale;
    RC_ASSERT(std::abs(result.totals.work) <= 1e-9 * scale);
    RC_ASSERT(std::abs(result.totals.heat) <= 1e-9 * scale);
}

RC_GTEST_PROP(EveryPath, AddsUpWhenASegmentIsSplit, ())
{
    const Process law = anyLaw();
    const double ratio = between(0.4, 2.5);
    const double share = between(0.05, 0.95);
    PathOf path{.gas = anyGas(), .start = anyStart(), .segments = {segment(law, EndKey::volumeRatio, ratio)}};
    const auto whole = path.evaluated();
    path.segments = {segment(law, EndKey::volumeRatio, std::pow(ratio, share)),
                     segment(law, EndKey::volumeRatio, std::pow(ratio, 1.0 - share))};
    const auto split = path.evaluated();
    RC_PRE(whole.complete() && split.complete());
    const double scale = whole.segments[0].audit.scale;
    RC_ASSERT(std::abs(whole.totals.work - split.totals.work) <= 1e-9 * scale);
    RC_ASSERT(std::abs(whole.totals.heat - split.totals.heat) <= 1e-9 * scale);
}

RC_GTEST_PROP(EveryPath, DoublesWithTheAmount, ())
{
    PathOf path{
        .gas = anyGas(), .start = anyStart(), .segments = {segment(anyLaw(), EndKey::volumeRatio, between(0.4, 2.5))}};
    const auto once = path.evaluated();
    path.start.amount = 2.0 * *path.start.amount;
    const auto twice = path.evaluated();
    RC_PRE(once.complete());
    const double scale = twice.segments[0].audit.scale;
    RC_ASSERT(std::abs(2.0 * once.totals.work - twice.totals.work) <= 1e-12 * scale);
    RC_ASSERT(std::abs(2.0 * once.totals.heat - twice.totals.heat) <= 1e-12 * scale);
}

RC_GTEST_PROP(EveryPath, NeverDestroysEntropy, ())
{
    const double p = *anyStart().pressure;
    const Thermal thermal = *rc::gen::arbitrary<bool>() ? Thermal::isothermal : Thermal::adiabatic;
    const double target = p * between(0.2, 4.0);
    const Segment s =
        *rc::gen::arbitrary<bool>()
            ? Segment{ConstantExternalPressure{target, thermal}, {.balance = true}, ""}
            : segment(Stepped{*rc::gen::inRange(1, 12), Spacing::pressure, thermal}, EndKey::pressure, target);
    const auto result = PathOf{
        .gas = anyGas(),
        .start = {.pressure = p, .temperature = between(250.0, 600.0), .amount = 1.0},
        .segments = {s}}.evaluated();
    RC_PRE(result.complete());
    const SegmentResult &r = result.segments[0];
    // Below the last term is rounding: a liquid, whose entropy hardly changes and counts from the ideal gas.
    RC_ASSERT(r.entropyGenerated >= -1e-9 * std::max({std::abs(r.deltaEntropy), std::abs(r.heat) / 300.0, 1e-6 * 8.3}) -
                                        1e-13 * std::abs(r.from.entropy()));
    RC_ASSERT(r.audit.ok);
    if (r.recovery) RC_ASSERT(*r.recovery <= 1.0 + 1e-9);
}

RC_GTEST_PROP(EveryCurve, StaysWithinItsChordsWhenDrawn, ())
{
    const PathOf path{.gas = anyGas(),
                      .start = anyStart(),
                      .segments = {segment(anyLaw(), EndKey::volumeRatio, between(0.05, 20.0))}};
    const auto result = path.evaluated();
    RC_PRE(result.complete());
    const SegmentResult &r = result.segments[0];
    const Polyline &drawn = r.drawing.curve;
    RC_ASSERT(drawn.size() >= 2u);
    RC_ASSERT(drawn.size() < 400u);
    const auto check = evenSamples(*r.curve, 97);
    RC_ASSERT(check.ok());
    const Interval &V = r.extrema.volume;
    const double height =
        std::max(r.extrema.pressure.highest - r.extrema.pressure.lowest, 1e-9 * r.extrema.pressure.highest);
    for (const CurvePoint &p : *check) {
        double nearest = 1.0;
        for (std::size_t i = 0; i + 1 < drawn.size(); ++i) {
            const double ax = (drawn[i].volume - V.lowest) / (V.highest - V.lowest);
            const double bx = (drawn[i + 1].volume - V.lowest) / (V.highest - V.lowest);
            const double px = (p.volume - V.lowest) / (V.highest - V.lowest);
            const double ay = drawn[i].pressure / height;
            const double by = drawn[i + 1].pressure / height;
            const double length2 = (bx - ax) * (bx - ax) + (by - ay) * (by - ay);
            const double py = p.pressure / height;
            const double t = std::clamp(((px - ax) * (bx - ax) + (py - ay) * (by - ay)) / length2, 0.0, 1.0);
            nearest = std::min(nearest, std::hypot(px - ax - t * (bx - ax), py - ay - t * (by - ay)));
        }
        RC_ASSERT(nearest < 1.0 / 1000.0);
    }
}

} // namespace
} // namespace quasistat::path
