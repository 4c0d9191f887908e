#include "core/units/measure.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <chrono>
#include <cstdlib>
#include <thread>
#include <vector>

using namespace quasistat;
using units::Quantity;

TEST(Measure, NumberAndUnitSurviveAsTyped)
{
    const auto measure = units::measured("  14.50 psi  ", Quantity::pressure);
    ASSERT_TRUE(measure.ok());
    EXPECT_EQ(measure->text, "14.50 psi");
    EXPECT_EQ(measure->number, "14.50");
    EXPECT_EQ(measure->unit, "psi");
}

TEST(Measure, BlankBetweenNumberAndUnitMayBeAbsentOrTypographic)
{
    for (const char *text : {"8bar", "8 bar", "8\u202Fbar", "8\u00A0bar", "8  bar", "8.0bar", "+8 bar", "0.8e1 bar"}) {
        const auto measure = units::measured(text, Quantity::pressure);
        ASSERT_TRUE(measure.ok()) << text;
        EXPECT_DOUBLE_EQ(measure->value, 8e5) << text;
    }
}

TEST(Measure, ALitreAtmosphereIsNotReadAsADecimalPoint)
{
    const auto measure = units::measured("2L.atm", Quantity::energy);
    ASSERT_TRUE(measure.ok());
    EXPECT_EQ(measure->unit, "L.atm");
}

TEST(Measure, PlainNumbersCarryNoUnit)
{
    const auto number = units::plainNumber("1.30 ± 0.02");
    ASSERT_TRUE(number.ok());
    EXPECT_DOUBLE_EQ(number->value, 1.3);
    ASSERT_TRUE(number->uncertainty.has_value());
    EXPECT_DOUBLE_EQ(number->uncertainty->standard, 0.02);
    EXPECT_EQ(units::plainNumber("1.3 bar").failure().reason, Reason::syntax);
}

TEST(Measure, GaugeVacuumIsFineDownToTheSurroundings)
{
    const auto measure = units::measured("-0.5 bar(g)", Quantity::pressure);
    ASSERT_TRUE(measure.ok());
    EXPECT_DOUBLE_EQ(*units::siValue(*measure, {.surroundingsPressure = 1e5, .molarMass = 1.0}), 5e4);
    const auto below = units::siValue(*measure, {.surroundingsPressure = 4e4, .molarMass = 1.0});
    ASSERT_FALSE(below.ok());
    EXPECT_EQ(below.failure().reason, Reason::outOfRange);
}

TEST(Measure, ManyThreadsMayReadAtOnce)
{
    std::vector<std::thread> threads;
    std::array<double, 8> sums{};
    for (std::size_t t = 0; t < sums.size(); ++t)
        threads.emplace_back([&sums, t] {
            for (int i = 0; i < 200; ++i)
                for (const char *text : {"8 bar", "3 kgf/cm2", "5 L·atm", "30 N/mm2"})
                    if (const auto measure =
                            units::measured(text, text[2] == 'L' ? Quantity::energy : Quantity::pressure))
                        sums[t] += measure->value;
        });
    for (std::thread &thread : threads) thread.join();
    EXPECT_GT(sums.front(), 0.0);
    for (const double sum : sums) EXPECT_EQ(sum, sums.front());
}

TEST(Measure, AUnitSeenBeforeCostsMicroseconds)
{
    ASSERT_TRUE(units::measured("8 bar", Quantity::pressure).ok());
    const auto start = std::chrono::steady_clock::now();
    for (int i = 0; i < 1000; ++i) ASSERT_TRUE(units::measured("8 bar", Quantity::pressure).ok());
    const std::chrono::duration<double, std::micro> each = (std::chrono::steady_clock::now() - start) / 1000;
    EXPECT_LT(each.count(), 50.0);
}

RC_GTEST_PROP(Measure, TextSurvivesReadingWhateverTheNumber, (int whole, unsigned short fraction, bool zeros))
{
    const std::string number = std::to_string(whole) + "." + std::to_string(fraction) + (zeros ? "00" : "");
    const auto measure = units::measured(number + " °C", Quantity::temperatureDifference);
    RC_ASSERT(measure.ok());
    RC_ASSERT(measure->text == number + " °C");
    RC_ASSERT(measure->number == number);
    RC_ASSERT(measure->value == std::strtod(number.c_str(), nullptr));
}

RC_GTEST_PROP(Measure, NoTextCrashesTheReader, (std::string text))
{
    for (const units::QuantityFacts &row : units::quantityTable) {
        const auto measure = units::measured(text, row.quantity);
        if (!measure) RC_ASSERT(!measure.failure().message.text.empty());
    }
}

RC_GTEST_PROP(Measure, NoUnitTextCrashesTheReader, ())
{
    const auto pieces = *rc::gen::container<std::vector<std::string>>(rc::gen::elementOf(
        std::vector<std::string>{"bar", "m",  "3", "/", "(", ")",     ".",     "·", "^", "-",  " ", "g",  "°C", "1",
                                 "kg",  "**", "²", "⁻", "@", "since", "lg(re", "µ", "%", "FS", "±", "k=", "cal"}));
    std::string text = "5 ";
    for (const std::string &piece : pieces) text += piece;
    for (const Quantity quantity : {Quantity::pressure, Quantity::energy, Quantity::volume}) {
        const auto measure = units::measured(text, quantity);
        if (!measure) RC_ASSERT(!measure.failure().message.text.empty());
    }
}
