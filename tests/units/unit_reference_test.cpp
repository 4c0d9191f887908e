// Units against published values. The tolerance of a row is half a unit of the last printed digit of its source; exact
// definitions allow for rounding of a double only.

#include "core/units/measure.h"

#include <gtest/gtest.h>

#include <cmath>
#include <ostream>

using namespace quasistat;
using units::Basis;
using units::Quantity;

namespace
{

constexpr double exact = 4e-16; // relative: two roundings of a double

struct Row {
    const char *text;
    Quantity quantity;
    double value;     // SI
    double tolerance; // absolute if > 0, else relative `exact`
    const char *source;
};
std::ostream &operator<<(std::ostream &out, const Row &row)
{
    return out << row.text << " (" << row.source << ")";
}

constexpr auto sp811 = "NIST SP 811 (2008), appendix B.8";
constexpr auto si = "SI Brochure, 9th ed. (2019)";
constexpr auto definition = "from the definitions";

const Row rows[] = {
    {"1 atm", Quantity::pressure, 101325.0, 0.0, sp811},
    {"1 bar", Quantity::pressure, 1e5, 0.0, sp811},
    {"1 torr", Quantity::pressure, 101325.0 / 760.0, 0.0, sp811},
    {"1 psi", Quantity::pressure, 6894.757293, 5e-7, sp811},
    {"1 ksi", Quantity::pressure, 6894757.293, 5e-4, "NIST SP 811 (2008), appendix B.8: psi"},
    {"1 lbf/ft2", Quantity::pressure, 47.88026, 5e-6, sp811},
    {"1 psf", Quantity::pressure, 47.88026, 5e-6, sp811},
    {"1 at", Quantity::pressure, 98066.5, 0.0, sp811},
    {"1 kgf/cm2", Quantity::pressure, 98066.5, 0.0, sp811},
    {"1 kgf/cm²", Quantity::pressure, 98066.5, 0.0, sp811},
    {"1 mmHg", Quantity::pressure, 133.3224, 5e-5, "NIST SP 811 (2008), appendix B.8: conventional"},
    {"1 inHg", Quantity::pressure, 3386.389, 5e-4, "NIST SP 811 (2008), appendix B.8: conventional"},
    {"1 inH2O", Quantity::pressure, 249.0889, 5e-5, "NIST SP 811 (2008), appendix B.8: conventional"},
    {"1 mmH2O", Quantity::pressure, 9.80665, 0.0, "NIST SP 811 (2008), appendix B.8: conventional"},
    {"1 ftH2O", Quantity::pressure, 2989.067, 5e-4, "NIST SP 811 (2008), appendix B.8: conventional"},
    {"1 MPa", Quantity::pressure, 1e6, 0.0, si},
    {"1 N/mm2", Quantity::pressure, 1e6, 0.0, si},
    {"1 N/mm^2", Quantity::pressure, 1e6, 0.0, si},
    {"1 mbar", Quantity::pressure, 100.0, 0.0, sp811},
    {"1 µbar", Quantity::pressure, 0.1, 0.0, sp811},
    {"1 μbar", Quantity::pressure, 0.1, 0.0, "the Greek letter for the micro sign"},
    {"1 bara", Quantity::pressure, 1e5, 0.0, definition},
    {"1 bar(a)", Quantity::pressure, 1e5, 0.0, definition},
    {"1 psia", Quantity::pressure, 6894.757293, 5e-7, sp811},

    {"0 °C", Quantity::temperature, 273.15, 0.0, si},
    {"35 °C", Quantity::temperature, 308.15, 0.0, si},
    {"35 degC", Quantity::temperature, 308.15, 0.0, si},
    {"32 °F", Quantity::temperature, 273.15, 1e-13, sp811},
    {"212 degF", Quantity::temperature, 373.15, 1e-13, sp811},
    {"491.67 °R", Quantity::temperature, 273.15, 1e-13, sp811},
    {"300 K", Quantity::temperature, 300.0, 0.0, si},
    {"\u221240 °C", Quantity::temperature, 233.15, 1e-13, si},
    {"-40 °F", Quantity::temperature, 233.15, 1e-13, sp811},
    {"10 °C", Quantity::temperatureDifference, 10.0, 0.0, si},
    {"18 °F", Quantity::temperatureDifference, 10.0, 1e-14, sp811},

    {"2.5 L", Quantity::volume, 2.5e-3, 0.0, si},
    {"2.5 l", Quantity::volume, 2.5e-3, 0.0, si},
    {"1 m³", Quantity::volume, 1.0, 0.0, si},
    {"1 cm³", Quantity::volume, 1e-6, 0.0, si},
    {"1 cm3", Quantity::volume, 1e-6, 0.0, si},
    {"1 mL", Quantity::volume, 1e-6, 0.0, si},
    {"1 µL", Quantity::volume, 1e-9, 0.0, si},
    {"1 ft3", Quantity::volume, 0.02831685, 5e-9, sp811},
    {"1 in3", Quantity::volume, 1.638706e-5, 5e-12, sp811},
    {"1 gal", Quantity::volume, 3.785412e-3, 5e-10, "NIST SP 811 (2008), appendix B.8: US gallon"},

    {"1 mol", Quantity::amount, 1.0, 0.0, si},
    {"1 lbmol", Quantity::amount, 453.59237, 0.0, definition},
    {"0.02241396954 Nm3", Quantity::amount, 1.0, 5e-10, "CODATA 2018: molar volume at 273.15 K, 101.325 kPa"},
    {"22.41396954 NL", Quantity::amount, 1.0, 5e-10, "CODATA 2018: molar volume at 273.15 K, 101.325 kPa"},
    {"1 scf", Quantity::amount, 1.1953, 5e-5, "from the definitions: 60 °F, 14.696 psi"},
    {"1 Sm3", Quantity::amount, 101325.0 / (8.31446261815324 * 288.15), 1e-13, definition},

    {"28.96 g/mol", Quantity::molarMass, 0.02896, 0.0, si},
    {"28.96 lb/lbmol", Quantity::molarMass, 0.02896, 1e-16, definition},
    {"120 g", Quantity::mass, 0.12, 0.0, si},
    {"1 lb", Quantity::mass, 0.45359237, 0.0, sp811},

    {"300 cal", Quantity::energy, 300 * 4.184, 0.0, "NIST SP 811 (2008), appendix B.8: thermochemical"},
    {"1 kcal", Quantity::energy, 4184.0, 0.0, "NIST SP 811 (2008), appendix B.8: thermochemical"},
    {"1 cal_IT", Quantity::energy, 4.1868, 0.0, sp811},
    {"1 Btu", Quantity::energy, 1055.05585262, 0.0, "NIST SP 811 (2008), appendix B.8: IT"},
    {"1 kWh", Quantity::energy, 3.6e6, 0.0, sp811},
    {"2 L.atm", Quantity::energy, 202.65, 0.0, "NIST SP 811 (2008): litre-atmosphere 101.325 J"},
    {"2 L·atm", Quantity::energy, 202.65, 0.0, "NIST SP 811 (2008): litre-atmosphere 101.325 J"},
    {"1 ft lbf", Quantity::energy, 1.355818, 5e-7, sp811},
    {"1.8 kJ", Quantity::energy, 1800.0, 0.0, si},
    {"1 N m", Quantity::energy, 1.0, 0.0, si},

    {"600 1/min", Quantity::frequency, 10.0, 0.0, definition},
    {"600 min-1", Quantity::frequency, 10.0, 0.0, definition},
    {"600 min⁻¹", Quantity::frequency, 10.0, 0.0, definition},
    {"600 /min", Quantity::frequency, 10.0, 0.0, definition},
    {"600 rpm", Quantity::frequency, 10.0, 0.0, definition},
    {"600 rev/min", Quantity::frequency, 10.0, 0.0, definition},
    {"10 Hz", Quantity::frequency, 10.0, 0.0, si},
    {"2e8 Pa/m3", Quantity::stiffness, 2e8, 0.0, si},
    {"1 bar/L", Quantity::stiffness, 1e8, 0.0, si},
    {"50 mm", Quantity::length, 0.05, 0.0, si},
    {"2 in", Quantity::length, 0.0508, 0.0, sp811},
    {"1 J/°C", Quantity::entropy, 1.0, 0.0, "a degree in a product is a difference"},
    {"29.1 J/(mol K)", Quantity::molarEntropy, 29.1, 0.0, si},
    {"1 kcal/(kg K)", Quantity::specificEntropy, 4184.0, 0.0, sp811},
};

class Published : public testing::TestWithParam<Row>
{
};

} // namespace

TEST_P(Published, UnitConvertsAsItsSourcePrints)
{
    const Row &row = GetParam();
    const auto measure = units::measured(row.text, row.quantity);
    ASSERT_TRUE(measure.ok()) << measure.failure().message.text;
    EXPECT_EQ(measure->basis, Basis::absolute);
    EXPECT_NEAR(measure->value, row.value, row.tolerance > 0.0 ? row.tolerance : std::abs(row.value) * exact);
}
INSTANTIATE_TEST_SUITE_P(Units, Published, testing::ValuesIn(rows));

TEST(Units, TheMolarVolumeAt100kPaIsThatOfCodata)
{
    // CODATA 2018: 22.710 954 64 L/mol at 273.15 K and 100 kPa.
    const auto amount = units::measured("22.71095464 NL", Quantity::amount);
    ASSERT_TRUE(amount.ok());
    EXPECT_NEAR(amount->value * 100.0 / 101.325, 1.0, 5e-10);
}

TEST(Units, GaugePressureNeedsTheSurroundings)
{
    for (const char *text : {"1.2 bar(g)", "1.2 barg", "1.2 bar gauge", "120 kPa(g)", "120 kPag", "120 kPa (g)"}) {
        const auto measure = units::measured(text, Quantity::pressure);
        ASSERT_TRUE(measure.ok()) << text;
        EXPECT_EQ(measure->basis, Basis::gauge) << text;
        const auto absolute = units::siValue(*measure, {.surroundingsPressure = 101300.0, .molarMass = 1.0});
        ASSERT_TRUE(absolute.ok()) << text;
        EXPECT_DOUBLE_EQ(*absolute, 221300.0) << text;
    }
    const auto psi = units::measured("0 psig", Quantity::pressure);
    ASSERT_TRUE(psi.ok());
    EXPECT_DOUBLE_EQ(*units::siValue(*psi, {.surroundingsPressure = 98000.0, .molarMass = 1.0}), 98000.0);
}

TEST(Units, AMassStandsForAnAmount)
{
    const auto measure = units::measured("120 g", Quantity::amount);
    ASSERT_TRUE(measure.ok());
    EXPECT_EQ(measure->basis, Basis::byMass);
    EXPECT_DOUBLE_EQ(*units::siValue(*measure, {.surroundingsPressure = 1e5, .molarMass = 0.03}), 4.0);
}
