// The example designs against figures that an independent program found (tests/document/examples/README.md).

#include "designs.h"

#include "core/document/file.h"
#include "core/document/result_json.h"

#include <cmath>
#include <filesystem>
#include <set>

using namespace quasistat;
using document::Design;
using document::Json;

namespace
{

std::string exampleFile(const std::string &name)
{
    return std::string(TEST_DATA_DIR) + "/examples/" + name;
}

Design example(const std::string &name)
{
    const auto text = document::fileText(exampleFile(name + ".qpath"));
    EXPECT_TRUE(text.ok()) << name;
    return tests::designOf(*text);
}

/// What a tenth of nRT is, where the scale of energies comes from [J].
double energyScale(const Json &state)
{
    return 0.1 * state.at("amount").get<double>() * 8.31446261815324 * state.at("temperature").get<double>();
}

/// Compares every key that is expected, relative to the larger of the value and, for an energy, `energyScale`;
/// entropies take the same scale divided by the temperature.
struct Comparison {
    double tolerance;
    double energy;
    double entropy;

    void operator()(const Json &expected, const Json &found, const std::string &place) const
    {
        if (expected.is_null()) {
            EXPECT_TRUE(found.is_null()) << place;
        } else if (expected.is_number()) {
            ASSERT_TRUE(found.is_number()) << place << ": " << found.dump();
            const double value = expected.get<double>();
            EXPECT_NEAR(found.get<double>(), value, tolerance * std::max(std::abs(value), scaleOf(place))) << place;
        } else {
            EXPECT_EQ(expected, found) << place;
        }
    }

    [[nodiscard]] double scaleOf(const std::string &place) const
    {
        static const std::set<std::string> energies{"work",
                                                    "heat",
                                                    "delta_internal_energy",
                                                    "delta_enthalpy",
                                                    "lost_work",
                                                    "atmosphere_work",
                                                    "rod_work",
                                                    "steady_flow_work",
                                                    "reversible_limit_work",
                                                    "shortfall",
                                                    "available_work",
                                                    "heat_in",
                                                    "heat_out",
                                                    "net_work_out"};
        const std::string key = place.substr(place.rfind('/') + 1);
        if (energies.contains(key)) return energy;
        return key == "delta_entropy" || key == "entropy_generated" ? entropy : 0.0;
    }
};

void compare(const Json &expected, const Json &found, const std::string &place, const Comparison &comparison)
{
    for (const auto &item : expected.items()) {
        ASSERT_TRUE(found.contains(item.key())) << place << "/" << item.key();
        comparison(item.value(), found.at(item.key()), place + "/" + item.key());
    }
}

/// States and segments of `result`, which may be fewer than those expected.
void compareSegments(const Json &expected, const Json &result)
{
    const double tolerance = expected.at("tolerance").get<double>();
    for (std::size_t i = 0; i < result["states"].size(); ++i) {
        const double scale = energyScale(expected["states"][i]);
        compare(expected["states"][i], result["states"][i], "/states/" + std::to_string(i),
                {tolerance, scale, scale / expected["states"][i]["temperature"].get<double>()});
    }
    for (std::size_t i = 0; i < result["segments"].size(); ++i) {
        const double scale = energyScale(expected["states"][i]);
        compare(expected["segments"][i], result["segments"][i], "/segments/" + std::to_string(i),
                {tolerance, scale, scale / expected["states"][i]["temperature"].get<double>()});
    }
}

class ComputedExample : public testing::TestWithParam<const char *>
{
};

} // namespace

TEST_P(ComputedExample, AgreesWithItsExpectedFigures)
{
    const std::string name = GetParam();
    const Design design = example(name);
    const gas::Library library;
    const auto evaluation = document::evaluate(design, library);
    ASSERT_TRUE(evaluation.ok());
    ASSERT_FALSE(document::firstFailure(*evaluation).has_value());
    EXPECT_TRUE(evaluation->auditsAgree());
    const Json result = document::resultJson(design, *evaluation, 0, "test");
    const auto text = document::fileText(exampleFile(name + ".expect.json"));
    ASSERT_TRUE(text.ok());
    const Json expected = Json::parse(*text);
    const double tolerance = expected.at("tolerance").get<double>();

    ASSERT_EQ(result["states"].size(), expected["states"].size());
    ASSERT_EQ(result["segments"].size(), expected["segments"].size());
    compareSegments(expected, result);
    if (expected.contains("totals"))
        compare(expected["totals"], result["totals"], "/totals", {tolerance, energyScale(expected["states"][0]), 0.0});
}
INSTANTIATE_TEST_SUITE_P(Examples, ComputedExample,
                         testing::Values("quasi-static", "irreversible", "closed-cycle", "gas-gerg"),
                         [](const auto &row) {
                             std::string name = row.param;
                             std::erase(name, '-');
                             return name;
                         });

TEST(Examples, NitrogenByItsReferenceEquationAgreesUpToTheThrottle)
{
    Design design = example("nitrogen-reference");
    design.json["segments"].erase(2); // throttle: not computed by this version
    design.json["segments"].erase(2);
    const gas::Library library;
    const auto evaluation = document::evaluate(design, library);
    ASSERT_TRUE(evaluation.ok());
    ASSERT_FALSE(document::firstFailure(*evaluation).has_value());
    const Json result = document::resultJson(design, *evaluation, 0, "test");
    ASSERT_EQ(result["segments"].size(), 2u);
    const auto text = document::fileText(exampleFile("nitrogen-reference.expect.json"));
    ASSERT_TRUE(text.ok());
    compareSegments(Json::parse(*text), result);
}

TEST(Examples, AreReadAndWrittenUnchanged)
{
    int count = 0;
    for (const auto &entry : std::filesystem::directory_iterator(std::string(TEST_DATA_DIR) + "/examples")) {
        if (entry.path().extension() != ".qpath") continue;
        ++count;
        const auto text = document::fileText(entry.path().string());
        ASSERT_TRUE(text.ok());
        const Design design = tests::designOf(*text);
        const Design back = tests::designOf(document::written(design));
        EXPECT_EQ(back.json.dump(), design.json.dump()) << entry.path();
        EXPECT_EQ(back.json, Json::parse(*text)) << entry.path();
    }
    EXPECT_EQ(count, 7);
}

TEST(Examples, WhatIsNotComputedIsRefusedAtItsPointer)
{
    struct Row {
        const char *name;
        std::vector<std::string> pointers;
    };
    const gas::Library library;
    for (const Row &row :
         {Row{"nitrogen-reference", {"/segments/2/kind"}},
          Row{"machines-and-throttle", {"/segments/0/kind", "/segments/2/kind", "/segments/3/kind"}},
          Row{"matter", {"/segments/0/kind", "/segments/2/kind", "/segments/3/kind", "/segments/4/kind"}}}) {
        std::vector<std::string> pointers;
        const auto evaluation = document::evaluate(example(row.name), library);
        if (!evaluation) {
            EXPECT_EQ(evaluation.failure().reason, Reason::notComputed);
            pointers.push_back(evaluation.failure().pointer);
        } else {
            for (const auto &failure : evaluation->path.failures)
                if (failure && failure->reason == Reason::notComputed) pointers.push_back(failure->pointer);
        }
        EXPECT_EQ(pointers, row.pointers) << row.name;
    }
}
