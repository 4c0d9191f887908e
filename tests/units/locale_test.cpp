// Typed quantities mean the same on a desktop whose language writes a decimal comma.

#include "core/units/display.h"
#include "core/units/measure.h"

#include <gtest/gtest.h>

#include <clocale>
#include <cstdlib>
#include <filesystem>
#include <string>

using namespace quasistat;
using units::Quantity;

namespace
{

bool hasComma()
{
    return std::string(std::localeconv()->decimal_point) == ",";
}

/// Sets a language with a decimal comma, built for this test where none is installed; false if that cannot be done.
bool commaLanguage(const std::filesystem::path &folder)
{
    for (const char *name : {"de_DE.UTF-8", "fr_FR.UTF-8", "nl_NL.UTF-8", "sv_SE.UTF-8"})
        if (std::setlocale(LC_ALL, name) && hasComma()) return true;
    const std::string target = (folder / "de_DE.UTF-8").string();
    if (std::system(("localedef -i de_DE -f UTF-8 '" + target + "' >/dev/null 2>&1").c_str()) != 0) return false;
    ::setenv("LOCPATH", folder.c_str(), 1);
    return std::setlocale(LC_ALL, "de_DE.UTF-8") && hasComma();
}

class Language : public testing::Test
{
protected:
    Language()
    {
        std::string name = (std::filesystem::temp_directory_path() / "quasistat-locale-XXXXXX").string();
        m_folder = ::mkdtemp(name.data());
        m_found = commaLanguage(m_folder);
    }
    ~Language() override
    {
        std::setlocale(LC_ALL, "C");
        ::unsetenv("LOCPATH");
        std::filesystem::remove_all(m_folder);
    }
    std::filesystem::path m_folder;
    bool m_found = false;
};

} // namespace

TEST_F(Language, DoesNotChangeWhatUnitsMean)
{
    if (!m_found) GTEST_SKIP() << "no language with a decimal comma is installed and none can be built";
    const auto feet = units::measured("2.5 ft3", Quantity::volume);
    ASSERT_TRUE(feet.ok());
    EXPECT_DOUBLE_EQ(feet->value, 2.5 * 0.3048 * 0.3048 * 0.3048); // NIST SP 811 (2008), appendix B.8
    EXPECT_DOUBLE_EQ(units::measured("1 lbf/in2", Quantity::pressure)->value,
                     units::measured("1 psi", Quantity::pressure)->value);
    EXPECT_EQ(*units::typedIn(837214.6, Quantity::pressure, "bar", 101325.0, 4), "8.372 bar");
    EXPECT_EQ(units::shown(837214.6, Quantity::pressure, {}), "8.372\u202Fbar");
}
