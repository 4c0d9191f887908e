// Every end of every quasi-static kind comes to the state that a volume end comes to, and says why where it cannot.

#include "tests/support/paths.h"

#include <cmath>

namespace quasistat::path
{
namespace
{

using test::PathOf;
using test::segment;

struct Case {
    const char *name;
    Process process;
};

class EndsOfEveryLaw : public testing::TestWithParam<Case>
{
};

TEST_P(EndsOfEveryLaw, AgreeWithEachOther)
{
    for (const auto &[name, gas] : test::everyGas())
        for (const double change : {0.6, 1.7}) {
            const Process &process = GetParam().process;
            const bool isochoric = std::holds_alternative<Isochoric>(process);
            const PathOf first{
                .gas = gas,
                .start = {.pressure = gas->isIdeal() ? 1e5 : 1e6,
                          .temperature = gas->isIdeal() ? 300.0 : 400.0,
                          .amount = 1.0},
                .segments = {segment(process, isochoric ? EndKey::pressureRatio : EndKey::volumeRatio, change)}};
            // Not every real gas goes as far on every law: some reach their range, some condense.
            // Under the dome p and T are tied, and heat and work of a law may meet a value twice.
            if (!gas->isIdeal()) {
                const auto result = first.evaluated();
                if (!result.complete() || !result.segments[0].phaseCrossings.empty() ||
                    result.states[0].state.compressibility() < 0.5)
                    continue;
            }
            const auto r = first.only();
            for (const EndKey key : endChoice(process).keys) {
                double value = 0.0;
                switch (key) {
                case EndKey::pressure: value = r.to.pressure(); break;
                case EndKey::volume: value = r.to.volume(); break;
                case EndKey::temperature: value = r.to.molar().temperature; break;
                case EndKey::pressureRatio: value = r.to.pressure() / r.from.pressure(); break;
                case EndKey::volumeRatio: value = r.to.volume() / r.from.volume(); break;
                case EndKey::work: value = r.work; break;
                case EndKey::heat: value = r.heat; break;
                }
                SCOPED_TRACE(testing::Message()
                             << name << ' ' << GetParam().name << " by " << keyOf(key) << ' ' << value);
                // A polytropic of a gas whose γ crosses n has the same heat both ways; the direction decides.
                Segment other = segment(process, key, value);
                other.end.direction = change < 1.0 ? Direction::compress : Direction::expand;
                const auto again = PathOf{.gas = gas, .start = first.start, .segments = {other}}.only();
                EXPECT_NEAR(again.to.pressure() / r.to.pressure(), 1.0, 1e-10);
                EXPECT_NEAR(again.to.volume() / r.to.volume(), 1.0, 1e-10);
                EXPECT_NEAR(again.work, r.work, 1e-9 * 2500);
            }
        }
}

INSTANTIATE_TEST_SUITE_P(Laws, EndsOfEveryLaw,
                         testing::Values(Case{"isothermal", Isothermal{}}, Case{"isobaric", Isobaric{}},
                                         Case{"isochoric", Isochoric{}}, Case{"polytropic 1.2", Polytropic{1.2}},
                                         Case{"polytropic 0.5", Polytropic{0.5}},
                                         Case{"polytropic −1", Polytropic{-1.0}}, Case{"polytropic 3", Polytropic{3.0}},
                                         Case{"isentropic", Isentropic{}}),
                         [](const auto &law) { return "Law" + std::to_string(law.index); });

struct Impossible {
    const char *name;
    Segment segment;
    Reason reason;
    const char *pointer;
};

class ImpossibleEnd : public testing::TestWithParam<Impossible>
{
};

TEST_P(ImpossibleEnd, IsRefusedWithItsReasonAtItsPlace)
{
    const Failure failure = PathOf{.segments = {GetParam().segment}}.failure();
    EXPECT_EQ(failure.reason, GetParam().reason) << failure.message.text;
    EXPECT_EQ(failure.pointer, "/segments/0" + std::string(GetParam().pointer));
    EXPECT_FALSE(failure.message.text.empty());
}

INSTANTIATE_TEST_SUITE_P(
    Ends, ImpossibleEnd,
    testing::Values(
        Impossible{"more work than pressing the gas to nothing", segment(Isobaric{}, EndKey::work, 3000.0),
                   Reason::unreachable, "/end/work"},
        Impossible{"more work than an expansion to infinity gives", segment(Polytropic{1.3}, EndKey::work, -9000.0),
                   Reason::unreachable, "/end/work"},
        Impossible{"colder than absolute zero", segment(Isochoric{}, EndKey::heat, -9000.0), Reason::unreachable,
                   "/end/heat"},
        Impossible{"more isentropic work than the gas holds", segment(Isentropic{}, EndKey::work, -9000.0),
                   Reason::unreachable, "/end/work"},
        Impossible{"heat on a polytropic segment beyond its limit", segment(Polytropic{1.2}, EndKey::heat, 90000.0),
                   Reason::unreachable, "/end/heat"},
        Impossible{"temperature at exponent 1", segment(Polytropic{1.0}, EndKey::temperature, 350.0),
                   Reason::undetermined, "/end/temperature"},
        Impossible{"pressure at exponent 0", segment(Polytropic{0.0}, EndKey::pressure, 2e5), Reason::undetermined,
                   "/end/pressure"},
        Impossible{"pressure at stiffness 0", segment(Linear{0.0}, EndKey::pressure, 2e5), Reason::undetermined,
                   "/end/pressure"},
        Impossible{"a spring pulled past no pressure", segment(Linear{-1e7}, EndKey::volume, 0.05), Reason::unreachable,
                   "/end/volume"},
        Impossible{"a spring that would need negative volume", segment(Linear{1e6}, EndKey::pressure, 0.5e5),
                   Reason::unreachable, "/end/pressure"},
        Impossible{"free expansion into less room", segment(FreeExpansion{}, EndKey::volumeRatio, 0.5),
                   Reason::unreachable, "/end/volume_ratio"},
        Impossible{"a stop beyond balance", segment(ConstantExternalPressure{0.5e5}, EndKey::volume, 0.1),
                   Reason::unreachable, "/end/volume"},
        Impossible{"a reference to a state not reached",
                   {Isobaric{}, {.values = {{EndKey::temperature, SameAs{2}}}}, ""},
                   Reason::outOfRange,
                   "/end/temperature"},
        Impossible{"arriving off the curve", {Isothermal{}, {.state = 7}, ""}, Reason::outOfRange, "/end/state"},
        Impossible{"no step at all", segment(Stepped{0}, EndKey::pressure, 2e5), Reason::outOfRange, "/steps"}),
    [](const auto &end) { return "Case" + std::to_string(end.index); });

TEST(Ends, HeatThatBothDirectionsReachAsksForOne)
{
    // γ of carbon dioxide falls through 1.2 as it warms: a polytropic of that exponent takes up heat either way.
    PathOf path{.gas = test::ideal({{"carbon dioxide", 1.0}}),
                .segments = {segment(Polytropic{1.2}, EndKey::heat, 100.0)}};
    const Failure failure = path.failure();
    EXPECT_EQ(failure.reason, Reason::ambiguous);
    EXPECT_EQ(failure.pointer, "/segments/0/end/direction");
    path.segments[0].end.direction = Direction::expand;
    EXPECT_GT(path.only().to.volume(), path.only().from.volume());
    path.segments[0].end.direction = Direction::compress;
    EXPECT_LT(path.only().to.volume(), path.only().from.volume());
}

TEST(Ends, ArrivingAtAStateIsExact)
{
    const PathOf path{.segments = {segment(Isothermal{}, EndKey::volumeRatio, 2.0),
                                   segment(Isobaric{}, EndKey::temperature, 420.0),
                                   {Polytropic{}, {.state = 1}, ""}}};
    const auto result = path.evaluated();
    ASSERT_TRUE(result.complete());
    EXPECT_EQ(result.states[3].state.pressure(), result.states[0].state.pressure());
    EXPECT_EQ(result.states[3].state.molar().temperature, result.states[0].state.molar().temperature);
    EXPECT_TRUE(result.totals.closed);
    const auto line =
        PathOf{.segments = {path.segments[0], path.segments[1], {Linear{}, {.state = 1}, ""}}}.evaluated();
    EXPECT_TRUE(line.totals.closed);
}

TEST(Ends, ArrivingIsRefusedWhereTheCurvePassesBy)
{
    const PathOf path{.segments = {segment(Isobaric{}, EndKey::temperature, 420.0),
                                   segment(Isothermal{}, EndKey::volumeRatio, 3.0),
                                   {Isentropic{}, {.state = 1}, ""}}};
    const auto result = path.evaluated();
    ASSERT_TRUE(result.failures[2]);
    EXPECT_EQ(result.failures[2]->reason, Reason::unreachable);
    EXPECT_EQ(result.failures[2]->pointer, "/segments/2/end/state");
}

TEST(Ends, TwoPointPolytropicFindsItsExponentOrNoneAtConstantVolume)
{
    const auto found =
        PathOf{.segments = {{Polytropic{}, {.values = {{EndKey::pressure, 8e5}, {EndKey::temperature, 480.0}}}, ""}}}
            .only();
    // n = ln(p₂/p₁)/ln(V₁/V₂) with V₁/V₂ = (p₂/p₁)(T₁/T₂).
    EXPECT_NEAR(*found.exponent, std::log(8.0) / std::log(8.0 * 300.0 / 480.0), 1e-12);
    const auto none =
        PathOf{.segments = {{Polytropic{}, {.values = {{EndKey::pressure, 2e5}, {EndKey::temperature, 600.0}}}, ""}}}
            .only();
    EXPECT_FALSE(none.exponent);
    EXPECT_NEAR(none.work, 0.0, 1e-9);
    EXPECT_TRUE(none.audit.ok);
}

TEST(Ends, AFailedSegmentLeavesThePathBeforeItAndNamesWhatWaits)
{
    const PathOf path{.segments = {segment(Isothermal{}, EndKey::volumeRatio, 2.0),
                                   segment(Isobaric{}, EndKey::work, 1e9),
                                   segment(Isothermal{}, EndKey::volumeRatio, 0.5)}};
    const auto result = path.evaluated();
    EXPECT_FALSE(result.complete());
    EXPECT_EQ(result.segments.size(), 1u);
    EXPECT_EQ(result.states.size(), 2u);
    EXPECT_FALSE(result.failures[0]);
    EXPECT_EQ(result.failures[1]->reason, Reason::unreachable);
    EXPECT_EQ(result.failures[2]->reason, Reason::notReached);
}

TEST(Ends, AnIdealGasEndsWhereItsPolynomialsEnd)
{
    const auto result =
        PathOf{.gas = test::idealAir(), .segments = {segment(Isentropic{}, EndKey::pressureRatio, 1e9)}}.evaluated();
    ASSERT_TRUE(result.failures[0]);
    EXPECT_EQ(result.failures[0]->pointer, "/segments/0/end/pressure_ratio");
}

TEST(Ends, BelowThePublishedRangeThereIsAWarning)
{
    const auto result =
        PathOf{.gas = test::idealAir(), .segments = {segment(Isobaric{}, EndKey::temperature, 120.0)}}.evaluated();
    ASSERT_TRUE(result.complete());
    ASSERT_EQ(result.warnings.size(), 1u);
    EXPECT_EQ(result.warnings[0].pointer, "/segments/0");
}

TEST(Ends, NothingFollowsAnEvacuatedStartButMatter)
{
    const Failure failure = PathOf{.start = {.volume = 0.002, .evacuated = true},
                                   .segments = {segment(Isothermal{}, EndKey::volumeRatio, 2.0)}}
                                .failure();
    EXPECT_EQ(failure.reason, Reason::contradiction);
}

} // namespace
} // namespace quasistat::path
