// Every text that is refused says what is wrong and what would be right.

#include "core/units/display.h"
#include "core/units/measure.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <ostream>

using namespace quasistat;
using testing::HasSubstr;
using units::Quantity;

namespace
{

struct Refused {
    const char *text;
    Quantity quantity;
    Reason reason;
    const char *says;
};
std::ostream &operator<<(std::ostream &out, const Refused &row)
{
    return out << row.text;
}

const Refused rows[] = {
    {"", Quantity::pressure, Reason::syntax, "begin with a number"},
    {"bar", Quantity::pressure, Reason::syntax, "begin with a number"},
    {"12", Quantity::pressure, Reason::syntax, "has no unit; write for instance “8 bar”"},
    {"12 bar 3", Quantity::pressure, Reason::syntax, "“bar 3” is not a unit"},
    {"1 000 bar", Quantity::pressure, Reason::syntax, "is not a unit"},
    {"1,2 bar", Quantity::pressure, Reason::syntax, "“1.2 bar”"},
    {"nan bar", Quantity::pressure, Reason::syntax, "begin with a number"},
    {"inf bar", Quantity::pressure, Reason::syntax, "begin with a number"},
    {"-inf bar", Quantity::pressure, Reason::syntax, "begin with a number"},
    {"0x10 bar", Quantity::pressure, Reason::unknownName, "“x” is not a unit"},
    {"1e999 bar", Quantity::pressure, Reason::outOfRange, "too large"},
    {"1e308 Mbar", Quantity::pressure, Reason::outOfRange, "too large"},
    {"5 furlong3", Quantity::pressure, Reason::wrongType, "no unit of pressure"},
    {"5 wibble", Quantity::pressure, Reason::unknownName,
     "“wibble” is not a unit known here; write for instance “8 bar”"},
    {"5 L", Quantity::pressure, Reason::wrongType, "“L” is no unit of pressure; write for instance “8 bar”"},
    {"5 bar", Quantity::volume, Reason::wrongType, "no unit of volume"},
    {"5 Nm3", Quantity::volume, Reason::wrongType, "no unit of volume"},
    {"25 C", Quantity::temperature, Reason::wrongType, "write “°C” or “degC”"},
    {"70 F", Quantity::temperature, Reason::wrongType, "write “°F” or “degF”"},
    {"0 bar", Quantity::pressure, Reason::outOfRange, "absolute zero"},
    {"-1 bar", Quantity::pressure, Reason::outOfRange, "absolute zero"},
    {"-1 bar(a)", Quantity::pressure, Reason::outOfRange, "absolute zero"},
    {"0 K", Quantity::temperature, Reason::outOfRange, "absolute zero"},
    {"-300 °C", Quantity::temperature, Reason::outOfRange, "absolute zero"},
    {"5 s", Quantity::frequency, Reason::wrongType, "no unit of rate"},
    {"5 rad/s", Quantity::frequency, Reason::unknownName, "“rad” is not a unit"},
    {"5 K(g)", Quantity::temperature, Reason::unknownName, "not a unit"},
    {"5 Gal", Quantity::volume, Reason::unknownName, "not a unit"},
    {"5 mcal", Quantity::energy, Reason::unknownName, "not a unit"},
    {"5 bar since 2000", Quantity::pressure, Reason::unknownName, "“since” is not a unit"},
    {"5 lg(re 1 mW)", Quantity::power, Reason::unknownName, "not a unit"},
    {"5 bar^", Quantity::pressure, Reason::syntax, "not a unit"},
    {"5 bar/", Quantity::pressure, Reason::syntax, "not a unit"},
    {"5 (bar", Quantity::pressure, Reason::syntax, "not a unit"},
    {"5 bar)", Quantity::pressure, Reason::syntax, "not a unit"},
    {"1.2.3 bar", Quantity::pressure, Reason::syntax, "not a unit"},
    {"15 bar ± ", Quantity::pressure, Reason::syntax, "not an uncertainty"},
    {"15 bar ± 0.1", Quantity::pressure, Reason::syntax, "has no unit"},
    {"15 bar ± 0.1 K", Quantity::pressure, Reason::wrongType, "another dimension"},
    {"15 bar ± -0.1 bar", Quantity::pressure, Reason::outOfRange, "zero or above"},
    {"15 bar ± 0.1 bar (k=0)", Quantity::pressure, Reason::outOfRange, "above zero"},
    {"15 bar ± 0.1 bar (normal)", Quantity::pressure, Reason::unknownName, "(k=2)"},
    {"15 bar ± 1 % XX 3 bar", Quantity::pressure, Reason::syntax, "not an uncertainty"},
};

class RefusedText : public testing::TestWithParam<Refused>
{
};

} // namespace

TEST_P(RefusedText, SaysWhatIsWrong)
{
    const Refused &row = GetParam();
    const auto measure = units::measured(row.text, row.quantity);
    ASSERT_FALSE(measure.ok());
    const std::string words = units::sentence(measure.failure().message, {});
    EXPECT_EQ(measure.failure().reason, row.reason) << words;
    EXPECT_THAT(words, HasSubstr(row.says));
}
INSTANTIATE_TEST_SUITE_P(Units, RefusedText, testing::ValuesIn(rows));
