#include "core/units/measure.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

#include <cmath>

using namespace quasistat;
using units::Quantity;

namespace
{

std::string typed(double value, Quantity quantity, const char *unit, int digits)
{
    const auto text = units::typedIn(value, quantity, unit, 101325.0, digits);
    return text ? *text : "failed";
}

} // namespace

TEST(TypedText, HasAsFewDigitsAsGiveTheValueBack)
{
    EXPECT_EQ(typed(8e5, Quantity::pressure, "bar", 5), "8 bar");
    EXPECT_EQ(typed(837214.6, Quantity::pressure, "bar", 4), "8.372 bar");
    EXPECT_EQ(typed(101325.0, Quantity::pressure, "Pa", 17), "101325 Pa");
    EXPECT_EQ(typed(1e-4, Quantity::volume, "m3", 17), "0.0001 m3");
    EXPECT_EQ(typed(-1500.0, Quantity::energy, "kJ", 4), "-1.5 kJ");
    EXPECT_EQ(typed(0.0, Quantity::energy, "kJ", 4), "0 kJ");
    EXPECT_EQ(typed(1.2345e20, Quantity::energy, "J", 4), "1.234e20 J");
    EXPECT_EQ(typed(2e-12, Quantity::volume, "m3", 4), "2e-12 m3");
    EXPECT_EQ(typed(1.3, Quantity::number, "", 6), "1.3");
}

TEST(TypedText, CountsDigitsFromTheQuantityNotFromTheZeroOfItsScale)
{
    EXPECT_EQ(typed(300.0, Quantity::temperature, "°C", 5), "26.85 °C");
    EXPECT_EQ(typed(298.1501, Quantity::temperature, "°C", 5), "25 °C");
    EXPECT_EQ(typed(273.15, Quantity::temperature, "°C", 5), "0 °C");
    EXPECT_EQ(typed(101325.0, Quantity::pressure, "bar(g)", 5), "0 bar(g)");
    EXPECT_EQ(typed(221325.0, Quantity::pressure, "barg", 5), "1.2 barg");
}

TEST(TypedText, RefusesAUnitOfAnotherQuantity)
{
    EXPECT_FALSE(units::typedIn(1.0, Quantity::pressure, "L", 101325.0, 4).ok());
    EXPECT_FALSE(units::inUnit(1.0, Quantity::volume, "bar", 101325.0).ok());
    EXPECT_FALSE(units::inUnit(1.0, Quantity::amount, "g", 101325.0).ok()); // a mass needs the gas
}

RC_GTEST_PROP(TypedText, ComesBackWithinTheDigitsAskedFor, ())
{
    struct Case {
        Quantity quantity;
        const char *unit;
    };
    const Case chosen = *rc::gen::elementOf(std::vector<Case>{{Quantity::pressure, "psi"},
                                                              {Quantity::pressure, "bar(g)"},
                                                              {Quantity::temperature, "°F"},
                                                              {Quantity::temperature, "degC"},
                                                              {Quantity::volume, "in3"},
                                                              {Quantity::energy, "Btu"},
                                                              {Quantity::amount, "scf"}});
    const int digits = *rc::gen::inRange(2, 15);
    const double value = std::exp(*rc::gen::inRange(-700, 1200) / 100.0);
    const auto text = units::typedIn(value, chosen.quantity, chosen.unit, 101325.0, digits);
    RC_ASSERT(text.ok());
    const auto measure = units::measured(*text, chosen.quantity);
    if (!measure) { // rounded to absolute zero at these few digits
        RC_ASSERT(measure.failure().reason == Reason::outOfRange);
        return;
    }
    const auto back = units::siValue(*measure, {.surroundingsPressure = 101325.0, .molarMass = 1.0});
    if (!back) return;
    // Digits of a psi are not digits of a pascal: up to one decade coarser; plus rounding of the offset.
    const double tolerance = 0.5 * std::pow(10.0, 1 - digits) * value + 1e-14 * 101325.0;
    RC_ASSERT(std::abs(*back - value) <= tolerance * (1.0 + 1e-9));
}

RC_GTEST_PROP(TypedText, SeventeenDigitsGiveTheTypedNumberBackExactly, ())
{
    const double value =
        std::exp(*rc::gen::inRange(-2000, 2000) / 100.0) * (1.0 + *rc::gen::inRange(0, 1000000) * 1e-7);
    const auto text = units::typedIn(value, Quantity::volume, "m3", 101325.0, 17);
    RC_ASSERT(text.ok());
    RC_ASSERT(units::measured(*text, Quantity::volume)->value == value);
}
