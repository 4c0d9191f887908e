#include "designs.h"

#include "core/document/result_json.h"

#include <cmath>

using namespace quasistat;
using document::Design;
using document::Json;

namespace
{

Json resultOf(const Design &design, int curvePoints = 0)
{
    static const gas::Library library;
    const auto evaluation = document::evaluate(design, library);
    EXPECT_TRUE(evaluation.ok());
    return document::resultJson(design, *evaluation, curvePoints, "1.2.3");
}

std::vector<std::string> keysOf(const Json &object)
{
    std::vector<std::string> keys;
    for (const auto &item : object.items()) keys.push_back(item.key());
    return keys;
}

} // namespace

TEST(ResultJson, HasTheKeysOfTheFormatInItsOrder)
{
    const Json result = resultOf(tests::plainDesign());
    EXPECT_EQ(keysOf(result),
              (std::vector<std::string>{"quasistat_result", "program_version", "title", "gas", "states", "segments",
                                        "totals", "alternatives", "targets", "limits", "warnings"}));
    EXPECT_EQ(keysOf(result["states"][0]),
              (std::vector<std::string>{"state", "pressure", "volume", "temperature", "amount", "mass",
                                        "internal_energy", "enthalpy", "entropy", "compressibility", "vapour_fraction",
                                        "composition", "available_work", "stored_energy"}));
    EXPECT_EQ(keysOf(result["segments"][0]), (std::vector<std::string>{"segment",
                                                                       "kind",
                                                                       "label",
                                                                       "exponent",
                                                                       "work",
                                                                       "heat",
                                                                       "steady_flow_work",
                                                                       "rod_work",
                                                                       "atmosphere_work",
                                                                       "delta_internal_energy",
                                                                       "delta_enthalpy",
                                                                       "delta_entropy",
                                                                       "entropy_generated",
                                                                       "lost_work",
                                                                       "reversible_limit_work",
                                                                       "reversible_limit_steady_flow_work",
                                                                       "shortfall",
                                                                       "recovery",
                                                                       "energy_with_matter",
                                                                       "amount_in",
                                                                       "available_work_out",
                                                                       "ideal_gas_work",
                                                                       "ideal_gas_heat",
                                                                       "ideal_gas_end_temperature",
                                                                       "duration",
                                                                       "extrema",
                                                                       "audit"}));
    EXPECT_EQ(keysOf(result["totals"]),
              (std::vector<std::string>{"work", "heat", "heat_in", "heat_out", "steady_flow_work", "entropy_generated",
                                        "lost_work", "closed", "net_work_out", "thermal_efficiency", "cop_heating",
                                        "cop_cooling", "carnot_ratio", "mean_effective_pressure", "power"}));
    EXPECT_EQ(result["program_version"], "1.2.3");
    EXPECT_EQ(result["gas"], tests::plainDesign().json["gas"]);
    EXPECT_EQ(result["segments"][0]["exponent"], 1.3);
    EXPECT_TRUE(result["segments"][1]["exponent"].is_null());
    EXPECT_TRUE(result["segments"][0]["reversible_limit_work"].is_null());
    EXPECT_TRUE(result["states"][0]["vapour_fraction"].is_null());
}

TEST(ResultJson, LimitsCarryTheirVerdict)
{
    Design design = tests::plainDesign();
    design.json["limits"].push_back(Json{{"quantity", "pressure"}, {"max", "10 bar"}});
    const Json limits = resultOf(design)["limits"];
    ASSERT_EQ(limits.size(), 2U);
    // Polytropic, n = 1.3, ratio 8: T₂ = 300 K · 8^(0.3/1.3).
    EXPECT_EQ(limits[0]["quantity"], "temperature");
    EXPECT_DOUBLE_EQ(limits[0]["max"].get<double>(), 423.15);
    EXPECT_NEAR(limits[0]["worst"].get<double>(), 300.0 * std::pow(8.0, 0.3 / 1.3), 1e-9);
    EXPECT_EQ(limits[0]["segment"], 1);
    EXPECT_EQ(limits[0]["ok"], false);
    EXPECT_EQ(limits[1]["ok"], true);
    EXPECT_FALSE(limits[1].contains("min"));
}

TEST(ResultJson, CurvesAreEvenInLnVAndOnAnIsochoreInP)
{
    Design design = tests::plainDesign();
    design.json["segments"].push_back(Json{{"kind", "isochoric"}, {"end", {{"pressure", "3 bar"}}}});
    design.json["segments"].push_back(Json{{"kind", "free-expansion"}, {"end", {{"volume_ratio", 2}}}});
    const Json segments = resultOf(design, 9)["segments"];
    for (std::size_t k : {0, 1, 2}) {
        const Json &curve = segments[k]["curve"];
        ASSERT_EQ(curve["volume"].size(), 9U);
        const auto v = curve["volume"].get<std::vector<double>>();
        for (std::size_t i = 2; i < v.size(); ++i) EXPECT_NEAR(std::log(v[i] / v[i - 1]), std::log(v[1] / v[0]), 1e-12);
    }
    const auto p = segments[3]["curve"]["pressure"].get<std::vector<double>>();
    for (std::size_t i = 2; i < p.size(); ++i) EXPECT_NEAR(p[i] - p[i - 1], p[1] - p[0], 1e-8 * p[0]);
    EXPECT_NEAR(p.back(), 3e5, 1e-8);
    EXPECT_FALSE(segments[4].contains("curve"));
    EXPECT_FALSE(resultOf(design)["segments"][0].contains("curve"));
}

TEST(ResultJson, AnEvacuatedStartHasZerosAndNulls)
{
    Design design = tests::plainDesign();
    design.json["start"] = {{"volume", "2 L"}, {"evacuated", true}};
    design.json["segments"] = Json::array();
    const Json state = resultOf(design)["states"][0];
    for (const char *key : {"amount", "mass", "pressure", "internal_energy", "enthalpy", "entropy"})
        EXPECT_EQ(state[key], 0.0) << key;
    EXPECT_DOUBLE_EQ(state["volume"].get<double>(), 2e-3);
    EXPECT_NEAR(state["available_work"].get<double>(), 1e5 * 2e-3, 1e-9); // p₀ V
    for (const char *key : {"temperature", "compressibility", "vapour_fraction", "composition", "stored_energy"})
        EXPECT_TRUE(state[key].is_null()) << key;
}

TEST(ResultJson, CompositionIsThatOfTheGas)
{
    Design design = tests::plainDesign();
    design.json["gas"] = Json::parse(R"({"model": "ideal", "composition": {"N2": 0.7, "O2": 0.3}})");
    const Json composition = resultOf(design)["states"][0]["composition"];
    EXPECT_DOUBLE_EQ(composition["nitrogen"].get<double>(), 0.7);
    EXPECT_DOUBLE_EQ(composition["oxygen"].get<double>(), 0.3);
}
