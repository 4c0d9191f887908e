// Every sample, through the program itself: audits, and work and heat recomputed from its curves by other means.

#include "tests/app/cubic_spline.h"

#include <gtest/gtest.h>
#include <nlohmann/json.hpp>

#include <array>
#include <cmath>
#include <cstdio>
#include <filesystem>
#include <string>
#include <vector>

namespace quasistat::test
{
namespace
{

using Json = nlohmann::json;

struct Output {
    std::string text;
    int status;
};

Output run(const std::string &words)
{
    const std::string command = std::string("'") + QUASISTAT_PROGRAM + "' " + words + " 2>&1";
    Output result{{}, -1};
    FILE *pipe = popen(command.c_str(), "r");
    if (!pipe) return result;
    std::array<char, 4096> buffer{};
    while (const std::size_t count = fread(buffer.data(), 1, buffer.size(), pipe))
        result.text.append(buffer.data(), count);
    result.status = WEXITSTATUS(pclose(pipe));
    return result;
}

std::vector<std::string> samples()
{
    std::vector<std::string> files;
    for (const auto &entry : std::filesystem::directory_iterator(SAMPLES_DIR))
        if (entry.path().extension() == ".qpath") files.push_back(entry.path().string());
    std::sort(files.begin(), files.end());
    return files;
}

class Sample : public testing::TestWithParam<std::string>
{
};

TEST_P(Sample, HasEveryAuditGood)
{
    const Output check = run("check '" + GetParam() + "'");
    EXPECT_TRUE(check.status == 0 || check.status == 1)
        << check.text; // 1: a limit is exceeded, as some samples mean to show
    EXPECT_NE(check.text.find("audit agrees: segment 1"), std::string::npos) << check.text;
    EXPECT_EQ(check.text.find("audit FAILED"), std::string::npos) << check.text;
}

TEST_P(Sample, WorkAndHeatFollowFromItsCurvesByCubicSplines)
{
    const Output compute = run("compute '" + GetParam() + "' --json --curves 401");
    ASSERT_EQ(compute.status, 0) << compute.text;
    const Json result = Json::parse(compute.text);
    for (const Json &segment : result.at("segments")) {
        if (!segment.contains("curve")) continue;
        const Json &curve = segment.at("curve");
        const auto column = [&](const char *key) { return curve.at(key).get<std::vector<double>>(); };
        const CubicSpline V(column("volume"));
        const CubicSpline p(column("pressure"));
        const CubicSpline T(column("temperature"));
        const CubicSpline S(column("entropy"));
        const double work = segment.at("work").get<double>();
        const double heat = segment.at("heat").get<double>();
        const double scale = std::max({std::abs(work), std::abs(heat), 1e-6});
        EXPECT_NEAR(-integralOver(p, V), work, 1e-6 * scale) << segment.at("label");
        EXPECT_NEAR(integralOver(T, S), heat, 1e-6 * scale) << segment.at("label");
    }
}

TEST_P(Sample, WritesItsReportAndItsDiagram)
{
    const std::string out = testing::TempDir() + std::filesystem::path(GetParam()).stem().string();
    EXPECT_EQ(run("report '" + GetParam() + "' -o '" + out + ".pdf'").status, 0);
    EXPECT_EQ(run("draw '" + GetParam() + "' -o '" + out + ".svg'").status, 0);
    EXPECT_GT(std::filesystem::file_size(out + ".pdf"), 10000u);
    EXPECT_GT(std::filesystem::file_size(out + ".svg"), 5000u);
}

INSTANTIATE_TEST_SUITE_P(All, Sample, testing::ValuesIn(samples()), [](const auto &file) {
    std::string name = std::filesystem::path(file.param).stem().string();
    for (char &c : name)
        if (!std::isalnum(static_cast<unsigned char>(c))) c = '_';
    return name;
});

} // namespace
} // namespace quasistat::test
