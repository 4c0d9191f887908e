#include "core/units/display.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <array>
#include <cmath>
#include <limits>
#include <vector>

using namespace quasistat;
using units::DisplayUnits;
using units::Quantity;
using units::shown;

namespace
{

units::Scale scaleOf(Quantity quantity, std::vector<double> values, const DisplayUnits &units = {})
{
    return units::scaleFor(quantity, values, units);
}

} // namespace

TEST(Display, SingleFiguresHaveFourDigitsAndANarrowBlank)
{
    EXPECT_EQ(shown(837214.6, Quantity::pressure, {}), "8.372\u202Fbar");
    EXPECT_EQ(shown(7.414e-4, Quantity::volume, {}), "0.7414\u202FL");
    EXPECT_EQ(shown(-930.47, Quantity::energy, {}), "\u2212930.5\u202FJ");
    EXPECT_EQ(shown(434.67, Quantity::temperature, {}), "161.52\u202F°C");
    EXPECT_EQ(shown(273.15, Quantity::temperature, {}), "0.00\u202F°C");
    EXPECT_EQ(shown(1.3, Quantity::number, {}), "1.300");
    EXPECT_EQ(shown(10.0, Quantity::frequency, {}), "600.0\u202F1/min");
}

TEST(Display, PrefixFollowsTheMagnitude)
{
    EXPECT_EQ(shown(2.5e-4, Quantity::energy, {}), "250.0\u202FµJ");
    EXPECT_EQ(shown(12345.0, Quantity::energy, {}), "12.35\u202FkJ"); // 12.345 is not exact in binary, above it
    EXPECT_EQ(shown(3.2e6, Quantity::energy, {}), "3.200\u202FMJ");
    EXPECT_EQ(shown(0.02, Quantity::amount, {}), "20.00\u202Fmmol");
    DisplayUnits free;
    free.pressure.clear();
    free.volume.clear();
    EXPECT_EQ(shown(50.0, Quantity::pressure, free), "500.0\u202Fµbar");
    EXPECT_EQ(shown(3e-7, Quantity::volume, free), "300.0\u202FµL");
    EXPECT_EQ(shown(12.5, Quantity::volume, free), "12.50\u202Fm³");
}

TEST(Display, ColumnsHaveOneUnitAndFiveDigitsOfTheLargest)
{
    const units::Scale work = scaleOf(Quantity::energy, {480.93, 118.7, 539.47, -450.0});
    EXPECT_EQ(work.unit, "J");
    EXPECT_EQ(work.decimals, 2);
    EXPECT_EQ(units::digits(-450.0, work), "\u2212450.00");
    const units::Scale pressure = scaleOf(Quantity::pressure, {1e5, 3e5, 1e6});
    EXPECT_EQ(pressure.unit, "bar");
    EXPECT_EQ(units::digits(3e5, pressure), "3.000");
    EXPECT_EQ(units::digits(1e6, pressure), "10.000");
    EXPECT_EQ(scaleOf(Quantity::energy, {15000.0}).unit, "kJ");
}

TEST(Display, RoundingUpToTheNextPlaceAddsNoDigit)
{
    EXPECT_EQ(shown(999960.0, Quantity::pressure, {}), "10.00\u202Fbar");
    const units::Scale scale = scaleOf(Quantity::pressure, {999999.9});
    EXPECT_EQ(units::digits(999999.9, scale), "10.000");
}

TEST(Display, MinusZeroIsZero)
{
    const units::Scale scale = scaleOf(Quantity::energy, {100.0});
    EXPECT_EQ(units::digits(-0.0, scale), "0.00");
    EXPECT_EQ(units::digits(-0.001, scale), "0.00");
    EXPECT_EQ(units::digits(-0.01, scale), "\u22120.01");
}

TEST(Display, StatedUnitsWin)
{
    DisplayUnits units;
    units.pressure = "psi";
    units.volume = "cm3";
    units.temperature = "degF";
    units.energy = "Btu";
    EXPECT_EQ(shown(1e5, Quantity::pressure, units), "14.50\u202Fpsi");
    EXPECT_EQ(shown(1e-3, Quantity::volume, units), "1000\u202Fcm³");
    EXPECT_EQ(shown(273.15, Quantity::temperature, units), "32.00\u202F°F");
    EXPECT_EQ(shown(1055.05585262, Quantity::energy, units), "1.000\u202FBtu");
}

TEST(Display, GaugeUnitsCountFromTheSurroundings)
{
    DisplayUnits units;
    units.pressure = "bar(g)";
    units.surroundingsPressure = 1e5;
    EXPECT_EQ(shown(3.5e5, Quantity::pressure, units), "2.500\u202Fbar(g)");
    EXPECT_EQ(shown(1e4, Quantity::pressureDifference, units), "0.1000\u202Fbar");
}

TEST(Display, DifferencesOfTemperatureHaveNoOffset)
{
    EXPECT_EQ(shown(5.0, Quantity::temperatureDifference, {}), "5.000\u202FK");
}

TEST(Display, FiguresBeyondThePrefixesTakeAPowerOfTen)
{
    EXPECT_EQ(shown(2.5e-20, Quantity::energy, {}), "25.00\u202F×10⁻⁹\u202FpJ");
    EXPECT_EQ(shown(2.5e25, Quantity::energy, {}), "25.00\u202F×10⁹\u202FPJ");
    EXPECT_EQ(shown(1.5e-9, Quantity::number, {}), "1.500\u202F×10⁻⁹");
    DisplayUnits psi;
    psi.pressure = "psi";
    // A stated unit that no longer reads gives way to one that does.
    EXPECT_EQ(shown(0.6894757293168361, Quantity::pressure, psi), "6.895\u202Fµbar");
}

TEST(Display, SentencesPutFiguresIntoTheReadersUnits)
{
    const Message message{
        .text = "{0} is above {1} at {2} {3}",
        .arguments = {std::string("it"), Figure{Quantity::pressure, 8e5}, Figure{Quantity::temperature, 300.0}}};
    EXPECT_EQ(units::sentence(message, {}), "it is above 8.000\u202Fbar at 26.85\u202F°C {3}");
}

RC_GTEST_PROP(Display, NeverShowsMinusZeroNanOrAnEndlessNumber, ())
{
    const auto quantity = units::quantityTable[*rc::gen::inRange<std::size_t>(0, units::quantityTable.size())].quantity;
    const double sign = *rc::gen::elementOf(std::vector<double>{-1.0, 1.0});
    const double value =
        sign * std::pow(10.0, *rc::gen::inRange(-290, 290)) * (1.0 + *rc::gen::inRange(0, 8999) / 1000.0);
    const std::string text = shown(value, quantity, {});
    RC_ASSERT(text.find("nan") == std::string::npos);
    RC_ASSERT(text.find("inf") == std::string::npos);
    RC_ASSERT(text.size() < 48);
    const std::string minus = "\u2212";
    const std::string number = text.substr(text.starts_with(minus) ? minus.size() : 0);
    const bool offset = quantity == Quantity::temperature;
    if (!offset) RC_ASSERT(number.substr(0, number.find("\u202F")).find_first_of("123456789") != std::string::npos);
}

TEST(Display, WhatIsNoNumberIsADash)
{
    EXPECT_EQ(units::digits(std::numeric_limits<double>::quiet_NaN(), scaleOf(Quantity::energy, {1.0})), "–");
    EXPECT_EQ(scaleOf(Quantity::energy, {}).unit, "J");
    EXPECT_EQ(scaleOf(Quantity::energy, {std::numeric_limits<double>::infinity()}).unit, "J");
}
