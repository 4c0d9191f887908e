#include "core/units/measure.h"

#include <gtest/gtest.h>

#include <cmath>
#include <ostream>

using namespace quasistat;
using units::Distribution;
using units::Quantity;

namespace
{

struct Row {
    const char *text;
    Quantity quantity;
    double standard;
    Distribution distribution = Distribution::normal;
};
std::ostream &operator<<(std::ostream &out, const Row &row)
{
    return out << row.text;
}

// Divisors: JCGM 100:2008, 4.3.3 (coverage factor), 4.3.7 (rectangular), 4.3.9 (triangular).
const Row rows[] = {
    {"15 bar ± 0.1 bar", Quantity::pressure, 1e4},
    {"15 bar ± 1 %", Quantity::pressure, 1.5e4},
    {"15 bar ± 1%", Quantity::pressure, 1.5e4},
    {"15 bar +/- 0.1 bar", Quantity::pressure, 1e4},
    {"15 bar ± 0.5 % FS 250 bar", Quantity::pressure, 1.25e5},
    {"15 bar ± 0.1 bar (k=2)", Quantity::pressure, 5e3},
    {"15 bar ± 0.1 bar (k = 2)", Quantity::pressure, 5e3},
    {"15 bar ± 0.1 bar (uniform)", Quantity::pressure, 1e4 / std::sqrt(3.0), Distribution::uniform},
    {"15 bar ± 0.5 % FS 250 bar (triangular)", Quantity::pressure, 1.25e5 / std::sqrt(6.0), Distribution::triangular},
    {"15 bar(g) ± 0.1 bar(g)", Quantity::pressure, 1e4},
    {"15 bar(g) ± 10 kPa", Quantity::pressure, 1e4},
    {"35 °C ± 0.5 °C", Quantity::temperature, 0.5},
    {"35 °C ± 0.9 °F", Quantity::temperature, 0.5},
    {"35 °C ± 0.5 K", Quantity::temperature, 0.5},
    {"120 g ± 1 g", Quantity::amount, 1e-3},
    {"2.5 L ± 0 L", Quantity::volume, 0.0},
};

class Stated : public testing::TestWithParam<Row>
{
};

} // namespace

TEST_P(Stated, UncertaintyBecomesAStandardOne)
{
    const Row &row = GetParam();
    const auto measure = units::measured(row.text, row.quantity);
    ASSERT_TRUE(measure.ok()) << measure.failure().message.text;
    ASSERT_TRUE(measure->uncertainty.has_value());
    EXPECT_NEAR(measure->uncertainty->standard, row.standard, 1e-14 * std::abs(row.standard));
    EXPECT_EQ(measure->uncertainty->distribution, row.distribution);
    EXPECT_EQ(measure->text, row.text);
}
INSTANTIATE_TEST_SUITE_P(Units, Stated, testing::ValuesIn(rows));

TEST(Stated, UncertaintyDoesNotMoveTheValue)
{
    EXPECT_EQ(units::measured("35 °C ± 0.5 °C", Quantity::temperature)->value,
              units::measured("35 °C", Quantity::temperature)->value);
}
