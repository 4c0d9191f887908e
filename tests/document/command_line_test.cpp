// The built program as a script calls it, without a display.

#include "core/document/design.h"
#include "core/document/file.h"

#include <gmock/gmock.h>
#include <gtest/gtest.h>

#include <sys/wait.h>

#include <algorithm>
#include <cmath>
#include <cstdio>
#include <cstdlib>
#include <filesystem>
#include <string>

using quasistat::document::Json;
using testing::HasSubstr;
using testing::StartsWith;

namespace
{

struct Call {
    int status;
    std::string output;
    std::string errors;
};

class CommandLine : public testing::Test
{
protected:
    CommandLine()
    {
        std::string name = (std::filesystem::temp_directory_path() / "quasistat-cli-XXXXXX").string();
        m_folder = ::mkdtemp(name.data());
    }
    ~CommandLine() override { std::filesystem::remove_all(m_folder); }

    /// Runs the program with `arguments` as a shell reads them; no display is offered.
    [[nodiscard]] Call run(const std::string &arguments) const
    {
        const std::string errorFile = m_folder / "errors";
        const std::string command = "cd '" + m_folder.string() +
                                    "' && env -u DISPLAY -u WAYLAND_DISPLAY '" QUASISTAT_PROGRAM "' " + arguments +
                                    " 2>'" + errorFile + "'";
        std::string output;
        FILE *pipe = ::popen(command.c_str(), "r");
        char buffer[4096];
        for (std::size_t count = 0; (count = std::fread(buffer, 1, sizeof buffer, pipe)) > 0;)
            output.append(buffer, count);
        const int status = ::pclose(pipe);
        const auto errors = quasistat::document::fileText(errorFile);
        return {WIFEXITED(status) ? WEXITSTATUS(status) : -1, output, errors ? *errors : std::string()};
    }

    [[nodiscard]] std::string file(const std::string &name, const std::string &text) const
    {
        EXPECT_TRUE(quasistat::document::writeWhole((m_folder / name).string(), text).ok());
        return name;
    }

    std::filesystem::path m_folder;
};

constexpr auto design = R"({
  "quasistat": 1,
  "title": "Up",
  "gas": {"model": "perfect", "heat_capacity_ratio": 1.4, "molar_mass": "28.96 g/mol"},
  "surroundings": {"pressure": "1 bar", "temperature": "20 °C"},
  "start": {"pressure": "1 bar", "temperature": "300 K", "volume": "2 L"},
  "segments": [
    {"kind": "isothermal", "end": {"pressure": "8 bar"}, "label": "squeeze"}
  ],
  "limits": [{"quantity": "pressure", "max": "10 bar", "label": "vessel"}]
}
)";

const std::string example = std::string(TEST_DATA_DIR) + "/examples/";

} // namespace

TEST_F(CommandLine, ComputePrintsAReadableAccount)
{
    const Call result = run("compute " + file("up.qpath", design));
    EXPECT_EQ(result.status, 0) << result.errors;
    EXPECT_TRUE(result.errors.empty()) << result.errors;
    // W = n R T ln 8 = p V ln 8 = 415.89 J.
    EXPECT_THAT(result.output, HasSubstr("squeeze"));
    EXPECT_THAT(result.output, HasSubstr("415.89"));
    EXPECT_THAT(result.output, HasSubstr("8.0000"));
    EXPECT_THAT(result.output, HasSubstr("vessel: pressure ≤ 10.00\u202Fbar"));
}

TEST_F(CommandLine, ComputeWritesJsonWithCurves)
{
    const Call result = run("compute --json --curves 11 " + file("up.qpath", design));
    ASSERT_EQ(result.status, 0) << result.errors;
    const Json json = Json::parse(result.output, nullptr, false);
    ASSERT_TRUE(json.is_object());
    EXPECT_NEAR(json["segments"][0]["work"].get<double>(), 1e5 * 2e-3 * std::log(8.0), 1e-9);
    EXPECT_EQ(json["segments"][0]["curve"]["pressure"].size(), 11U);
}

TEST_F(CommandLine, SetChangesValuesInOrder)
{
    const Call result =
        run("compute --json --set /segments/0/end/pressure='9 bar' --set /segments/0/end/pressure='4 bar' "
            "--set=/gas/heat_capacity_ratio=1.3 " +
            file("up.qpath", design));
    ASSERT_EQ(result.status, 0) << result.errors;
    const Json json = Json::parse(result.output, nullptr, false);
    EXPECT_DOUBLE_EQ(json["states"][1]["pressure"].get<double>(), 4e5);
    EXPECT_EQ(json["gas"]["heat_capacity_ratio"], 1.3);
}

TEST_F(CommandLine, ADashReadsStandardInput)
{
    const Call result = run("compute --json - <" + file("up.qpath", design));
    EXPECT_EQ(result.status, 0) << result.errors;
}

TEST_F(CommandLine, FaultsCarryFileLineColumnAndPointer)
{
    std::string text = design;
    text.replace(text.find("8 bar"), 5, "8 barn");
    const Call result = run("compute " + file("up.qpath", text));
    EXPECT_EQ(result.status, 65);
    EXPECT_TRUE(result.output.empty());
    EXPECT_THAT(result.errors, StartsWith("up.qpath:8:48: /segments/0/end/pressure: "));
    const Call syntax = run("compute " + file("broken.qpath", "{\n  \"quasistat\" 1}"));
    EXPECT_EQ(syntax.status, 65);
    EXPECT_THAT(syntax.errors, StartsWith("broken.qpath:2:15: : "));
}

TEST_F(CommandLine, AnUnreachableEndIs65WithNothingOnStandardOutput)
{
    for (const char *call : {"compute ", "compute --json "}) {
        const Call result = run(
            call + std::string("--set /segments/0='{\"kind\": \"free-expansion\", \"end\": {\"volume\": \"1 L\"}}' ") +
            file("up.qpath", design));
        EXPECT_EQ(result.status, 65);
        EXPECT_TRUE(result.output.empty());
        EXPECT_THAT(result.errors, HasSubstr("/segments/0"));
    }
}

TEST_F(CommandLine, PartsNotComputedAreRefusedByName)
{
    const struct {
        const char *name;
        const char *pointer;
    } rows[] = {{"nitrogen-reference", ": /segments/2/kind: "},
                {"machines-and-throttle", ": /segments/0/kind: "},
                {"matter", ": /segments/0/kind: "}};
    for (const auto &row : rows) {
        const Call result = run("compute '" + example + row.name + ".qpath'");
        EXPECT_EQ(result.status, 65) << row.name;
        EXPECT_THAT(result.errors, HasSubstr(row.pointer));
        EXPECT_THAT(result.errors, HasSubstr("not computed by this version"));
        EXPECT_TRUE(result.output.empty());
    }
}

TEST_F(CommandLine, CheckSaysOneFindingALine)
{
    const Call good = run("check " + file("up.qpath", design));
    EXPECT_EQ(good.status, 0) << good.errors;
    EXPECT_EQ(std::count(good.output.begin(), good.output.end(), '\n'), 2);
    const Call bad = run("check --set /limits/0/max='5 bar' up.qpath");
    EXPECT_EQ(bad.status, 1);
    EXPECT_THAT(bad.output, HasSubstr("limit EXCEEDED: vessel: pressure ≤ 5.000\u202Fbar; worst 8.000\u202Fbar"));
    const Call json = run("check --json --set /limits/0/max='5 bar' up.qpath");
    EXPECT_EQ(json.status, 1);
    EXPECT_EQ(Json::parse(json.output, nullptr, false)["limits"][0]["ok"], false);
    EXPECT_EQ(run("check --set /start/pressure='x' up.qpath").status, 65);
}

TEST_F(CommandLine, GasesListsModelsAndSources)
{
    const Call result = run("gases");
    EXPECT_EQ(result.status, 0);
    EXPECT_THAT(result.output, HasSubstr("nitrogen"));
    EXPECT_THAT(result.output, HasSubstr("NASA"));
    const Json json = Json::parse(run("gases --json").output, nullptr, false);
    EXPECT_GT(json["models"][1]["gases"].size(), 40U);
    for (const Json &model : json["models"]) {
        if (!model.contains("gases")) continue;
        for (const Json &gas : model["gases"]) {
            EXPECT_EQ(gas["temperature"].size(), 2U) << gas;
            EXPECT_FALSE(gas["source"].empty()) << gas;
        }
    }
    EXPECT_EQ(json["models"].size(), 6U);
    EXPECT_THAT(result.output, HasSubstr("0.02 % in density"));
}

TEST_F(CommandLine, WrongUsageIs64AndSaysWhatIsRight)
{
    const std::string name = file("up.qpath", design);
    for (const std::string &arguments :
         {std::string("compute"), "compute " + name + " " + name, "compute --colour " + name,
          "compute --curves 1 --json " + name, "compute --curves ten --json " + name, "compute --curves 5 " + name,
          "compute " + name + " --set", "compute --set title " + name, "compute --set /no/such=1 " + name,
          "compute --json=5 " + name, std::string("gases x"), "compute --csv " + name,
          "compute --xlsx out.xlsx " + name, "sweep " + name, "solve " + name, "uncertainty " + name,
          std::string("fit trace.csv")}) {
        const Call result = run(arguments);
        EXPECT_EQ(result.status, 64) << arguments;
        EXPECT_TRUE(result.output.empty()) << arguments;
        EXPECT_THAT(result.errors, HasSubstr("--help")) << arguments;
    }
    EXPECT_THAT(run("compute --csv " + name).errors, HasSubstr("not in this version"));
    EXPECT_THAT(run("sweep " + name).errors, HasSubstr("not in this version"));
    EXPECT_THAT(run("compute --jsn " + name).errors, HasSubstr("did you mean --json?"));
}

TEST_F(CommandLine, HelpAndVersionAreThere)
{
    for (const char *arguments : {"--help", "compute --help", "check --help", "gases --help", "--version"}) {
        const Call result = run(arguments);
        EXPECT_EQ(result.status, 0) << arguments;
        EXPECT_THAT(result.output, HasSubstr("quasistat")) << arguments;
    }
}

TEST_F(CommandLine, UnreadableInputIs66AndAFullDiskIs73)
{
    EXPECT_EQ(run("compute absent.qpath").status, 66);
    EXPECT_EQ(run("compute .").status, 66);
    const std::string name = file("up.qpath", design);
    EXPECT_EQ(run("compute " + name + " >/dev/full").status, 73);
    EXPECT_EQ(run("compute --json " + name + " >/dev/full").status, 73);
    EXPECT_EQ(run("check " + name + " >/dev/full").status, 73);
    EXPECT_EQ(run("gases >/dev/full").status, 73);
}
