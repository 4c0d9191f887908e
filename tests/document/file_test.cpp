#include "core/document/file.h"

#include <gtest/gtest.h>

#include <sys/stat.h>
#include <unistd.h>

#include <filesystem>
#include <string>

using namespace quasistat;
namespace fs = std::filesystem;

namespace
{

class Files : public testing::Test
{
protected:
    Files()
    {
        std::string name = (fs::temp_directory_path() / "quasistat-files-XXXXXX").string();
        m_folder = ::mkdtemp(name.data());
    }
    ~Files() override { fs::remove_all(m_folder); }
    [[nodiscard]] std::string at(const char *name) const { return (m_folder / name).string(); }
    [[nodiscard]] std::size_t entries() const
    {
        return static_cast<std::size_t>(std::distance(fs::directory_iterator(m_folder), fs::directory_iterator()));
    }
    fs::path m_folder;
};

} // namespace

TEST_F(Files, AreWrittenWholeAndReadBack)
{
    const std::string bytes("a\0b\n", 4);
    ASSERT_TRUE(document::writeWhole(at("new.qpath"), bytes).ok());
    EXPECT_EQ(*document::fileText(at("new.qpath")), bytes);
    EXPECT_EQ(entries(), 1U);
}

TEST_F(Files, KeepTheirPermissionsWhenReplaced)
{
    ASSERT_TRUE(document::writeWhole(at("kept.qpath"), "one").ok());
    ASSERT_EQ(::chmod(at("kept.qpath").c_str(), 0640), 0);
    ASSERT_TRUE(document::writeWhole(at("kept.qpath"), "two").ok());
    struct stat status {
    };
    ASSERT_EQ(::stat(at("kept.qpath").c_str(), &status), 0);
    EXPECT_EQ(status.st_mode & 0777U, 0640U);
    EXPECT_EQ(*document::fileText(at("kept.qpath")), "two");
}

TEST_F(Files, AreWrittenThroughASymbolicLink)
{
    fs::create_directory(m_folder / "real");
    ASSERT_TRUE(document::writeWhole(at("real/design.qpath"), "one").ok());
    fs::create_symlink("real/design.qpath", m_folder / "link.qpath");
    ASSERT_TRUE(document::writeWhole(at("link.qpath"), "two").ok());
    EXPECT_TRUE(fs::is_symlink(m_folder / "link.qpath"));
    EXPECT_EQ(*document::fileText(at("real/design.qpath")), "two");
}

TEST_F(Files, LeaveNothingBehindWhereWritingFails)
{
    EXPECT_EQ(document::writeWhole(at("no/such/folder.qpath"), "x").failure().reason, Reason::unwritable);
    EXPECT_EQ(document::writeWhole(m_folder.string(), "x").failure().reason, Reason::unwritable);
    EXPECT_EQ(document::writeWhole("", "x").failure().reason, Reason::unwritable);
    EXPECT_EQ(entries(), 0U);
}

TEST_F(Files, AFullDeviceIsNoticed)
{
    const auto written = document::writeWhole("/dev/full", "x");
    ASSERT_FALSE(written.ok());
    EXPECT_EQ(written.failure().reason, Reason::unwritable);
    EXPECT_FALSE(fs::is_regular_file("/dev/full"));
}

TEST_F(Files, ThatCannotBeReadSaySo)
{
    EXPECT_EQ(document::fileText(at("absent.qpath")).failure().reason, Reason::unreadable);
    EXPECT_EQ(document::fileText(m_folder.string()).failure().reason, Reason::unreadable);
}
