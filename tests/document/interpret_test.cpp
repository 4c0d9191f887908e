#include "designs.h"

#include <gmock/gmock.h>

using namespace quasistat;
using document::Design;
using document::Json;

namespace
{

const gas::Library &library()
{
    static const gas::Library data;
    return data;
}

document::Interpretation interpreted(const Design &design)
{
    auto result = document::interpret(design, library());
    EXPECT_TRUE(result.ok()) << (result ? "" : result.failure().pointer + ": " + result.failure().message.text);
    return std::move(*result);
}

path::Segment onlySegment(std::string_view segment)
{
    Design design = tests::plainDesign();
    design.json["segments"] = Json::array({Json::parse(segment)});
    const auto interpretation = interpreted(design);
    const auto &outcome = interpretation.input.segments.front();
    EXPECT_TRUE(outcome.ok()) << (outcome ? "" : outcome.failure().pointer + ": " + outcome.failure().message.text);
    return outcome ? *outcome : path::Segment{};
}

Design withGas(std::string_view gas)
{
    Design design = tests::plainDesign();
    design.json["gas"] = Json::parse(gas);
    return design;
}

std::vector<std::string> warnedPlaces(const document::Interpretation &interpretation)
{
    std::vector<std::string> places;
    for (const Warning &warning : interpretation.warnings) places.push_back(warning.pointer);
    return places;
}

} // namespace

TEST(Interpret, ReadsAWholeDesignIntoSi)
{
    const auto interpretation = interpreted(tests::plainDesign());
    const path::PathInput &input = interpretation.input;
    EXPECT_DOUBLE_EQ(input.gas->molarMass(), 0.02896);
    EXPECT_DOUBLE_EQ(*input.start.pressure, 1e5);
    EXPECT_DOUBLE_EQ(*input.start.volume, 2e-3);
    EXPECT_FALSE(input.start.amount.has_value());
    EXPECT_TRUE(input.surroundings.pressureStated);
    EXPECT_DOUBLE_EQ(input.surroundings.temperature, 293.15);
    EXPECT_DOUBLE_EQ(*input.rate, 10.0);
    ASSERT_EQ(input.segments.size(), 3U);
    EXPECT_EQ(input.segments[0]->label, "compress");
    EXPECT_DOUBLE_EQ(*std::get<path::Polytropic>(input.segments[0]->process).exponent, 1.3);
    EXPECT_EQ(std::get<path::SameAs>(input.segments[1]->end.values.front().value).state, 1);
    ASSERT_EQ(interpretation.limits.size(), 1U);
    EXPECT_DOUBLE_EQ(*interpretation.limits.front().max, 423.15);
    EXPECT_TRUE(interpretation.warnings.empty());
}

TEST(Interpret, DefaultsOfTheSurroundingsAreMarkedAsSuch)
{
    Design design = tests::plainDesign();
    design.json.erase("surroundings");
    const auto surroundings = interpreted(design).input.surroundings;
    EXPECT_DOUBLE_EQ(surroundings.pressure, 101325.0);
    EXPECT_DOUBLE_EQ(surroundings.temperature, 298.15);
    EXPECT_FALSE(surroundings.pressureStated);
    EXPECT_FALSE(surroundings.temperatureStated);
}

TEST(Interpret, GaugePressuresCountFromTheSurroundingsEverywhere)
{
    Design design = tests::plainDesign();
    design.json["start"]["pressure"] = "0 bar(g)";
    design.json["segments"][0]["end"]["pressure"] = "7 bar(g)";
    design.json["limits"] = Json::parse(R"json([{"quantity": "pressure", "max": "10 bar(g)"},
        {"quantity": "pressure", "max_at": [["150 °C", "9 bar(g)"], ["20 °C", "11 bar(g)"]]}])json");
    const auto interpretation = interpreted(design);
    EXPECT_DOUBLE_EQ(*interpretation.input.start.pressure, 1e5);
    EXPECT_DOUBLE_EQ(std::get<double>(interpretation.input.segments[0]->end.values.front().value), 8e5);
    EXPECT_DOUBLE_EQ(*interpretation.limits[0].max, 11e5);
    ASSERT_EQ(interpretation.limits[1].maxAt.size(), 2U);
    EXPECT_DOUBLE_EQ(interpretation.limits[1].maxAt[0].temperature, 293.15); // ascending
    EXPECT_DOUBLE_EQ(interpretation.limits[1].maxAt[0].pressure, 12e5);
}

TEST(Interpret, AnAmountMayBeAMassOrAStandardVolume)
{
    Design design = tests::plainDesign();
    design.json["start"] = {{"pressure", "1 bar"}, {"temperature", "300 K"}, {"amount", "28.96 g"}};
    EXPECT_DOUBLE_EQ(*interpreted(design).input.start.amount, 1.0);
    design.json["start"]["amount"] = "1 Nm3";
    EXPECT_NEAR(*interpreted(design).input.start.amount, 44.615, 1e-3); // 1/(22.414 L/mol), CODATA 2018
}

TEST(Interpret, UncertaintiesDoNotMoveValues)
{
    Design design = tests::plainDesign();
    design.json["start"]["pressure"] = "1 bar ± 0.5 % FS 25 bar";
    design.json["segments"][0]["exponent"] = "1.30 ± 0.02";
    const auto input = interpreted(design).input;
    EXPECT_DOUBLE_EQ(*input.start.pressure, 1e5);
    EXPECT_DOUBLE_EQ(*std::get<path::Polytropic>(input.segments[0]->process).exponent, 1.3);
}

TEST(Interpret, EveryKindReadsItsOwnKeys)
{
    const auto stepped = onlySegment(
        R"({"kind": "stepped", "steps": 4, "spacing": "pressure", "thermal": "adiabatic", "end": {"pressure": "3 bar"}})");
    EXPECT_EQ(std::get<path::Stepped>(stepped.process).steps, 4);
    EXPECT_EQ(std::get<path::Stepped>(stepped.process).spacing, path::Spacing::pressure);
    EXPECT_EQ(std::get<path::Stepped>(stepped.process).thermal, path::Thermal::adiabatic);

    const auto piston = onlySegment(R"({"kind": "constant-external-pressure", "external_pressure": "3 bar"})");
    EXPECT_TRUE(piston.end.balance);
    EXPECT_EQ(std::get<path::ConstantExternalPressure>(piston.process).thermal, path::Thermal::isothermal);
    EXPECT_TRUE(onlySegment(R"({"kind": "constant-external-pressure", "external_pressure": "3 bar", "end": "balance"})")
                    .end.balance);
    const auto stop =
        onlySegment(R"({"kind": "constant-external-pressure", "external_pressure": "@1", "end": {"volume": "1.5 L"}})");
    EXPECT_FALSE(stop.end.balance);
    EXPECT_EQ(std::get<path::SameAs>(std::get<path::ConstantExternalPressure>(stop.process).externalPressure).state, 1);

    const auto free = onlySegment(R"({"kind": "free-expansion", "end": {"volume_ratio": 2}})");
    EXPECT_EQ(std::get<path::FreeExpansion>(free.process).thermal, path::Thermal::adiabatic);

    const auto spring = onlySegment(R"({"kind": "linear", "stiffness": "2e8 Pa/m3", "end": {"volume": "1.5 L"}})");
    EXPECT_DOUBLE_EQ(*std::get<path::Linear>(spring.process).stiffness, 2e8);

    const auto twoPoint =
        onlySegment(R"({"kind": "polytropic", "end": {"pressure": "3 bar", "temperature": "350 K"}})");
    EXPECT_FALSE(std::get<path::Polytropic>(twoPoint.process).exponent.has_value());
    EXPECT_EQ(twoPoint.end.values.size(), 2U);

    const auto arrival = onlySegment(R"({"kind": "linear", "end": {"state": 1}})");
    EXPECT_EQ(arrival.end.state, 1);

    const auto directed = onlySegment(R"({"kind": "isothermal", "end": {"work": "-50 J", "direction": "expand"}})");
    EXPECT_EQ(directed.end.direction, path::Direction::expand);
    EXPECT_DOUBLE_EQ(std::get<double>(directed.end.values.front().value), -50.0);
}

TEST(Interpret, AirIsItsThreeGasesUnderItsOwnName)
{
    for (const char *gas : {R"({"model": "ideal", "composition": {"air": 1}})",
                            R"({"model": "ideal", "composition": {"N2": 0.7812, "O2": 0.2096, "Ar": 0.0092}})",
                            R"({"model": "ideal", "composition_by_mass": {"air": 1.0}})"}) {
        const auto input = interpreted(withGas(gas)).input;
        EXPECT_EQ(input.gas->name(), "air") << gas;
        ASSERT_EQ(input.gas->composition().size(), 3U);
        EXPECT_NEAR(input.gas->molarMass(), 0.0289586, 1e-6); // air model of Lemmon et al. (2000)
    }
}

TEST(Interpret, GasesHaveReadableNames)
{
    EXPECT_EQ(interpreted(withGas(R"({"model": "ideal", "composition": {"N2": 1}})")).input.gas->name(), "nitrogen");
    EXPECT_EQ(interpreted(withGas(R"({"model": "ideal", "composition": {"oxygen": 0.3, "nitrogen": 0.7}})"))
                  .input.gas->name(),
              "nitrogen 0.70, oxygen 0.30");
    EXPECT_EQ(
        interpreted(withGas(R"({"model": "ideal", "composition": {"helium": 0.125, "nitrogen": 0.875, "argon": 0}})"))
            .input.gas->name(),
        "nitrogen 0.875, helium 0.125");
}

TEST(Interpret, MassFractionsBecomeMoleFractions)
{
    const auto input =
        interpreted(withGas(R"({"model": "ideal", "composition_by_mass": {"helium": 0.5, "nitrogen": 0.5}})")).input;
    // x_He = (0.5/4.002602)/(0.5/4.002602 + 0.5/28.014), molar masses of the polynomials' data.
    const double helium = 0.5 / 4.002602;
    const double nitrogen = 0.5 / 28.014;
    EXPECT_NEAR(input.gas->composition()[0].moleFraction, helium / (helium + nitrogen), 1e-12);
}

TEST(Interpret, FractionsNearOneAreNormalisedWithAWord)
{
    const auto interpretation =
        interpreted(withGas(R"({"model": "ideal", "composition": {"oxygen": 0.21, "nitrogen": 0.79005}})"));
    EXPECT_THAT(warnedPlaces(interpretation), testing::ElementsAre("/gas/composition"));
    double sum = 0.0;
    for (const gas::Share &share : interpretation.input.gas->composition()) sum += share.moleFraction;
    EXPECT_NEAR(sum, 1.0, 1e-15);
    EXPECT_TRUE(interpreted(withGas(R"({"model": "ideal", "composition": {"O2": 0.1, "N2": 0.2, "Ar": 0.7}})"))
                    .warnings.empty());
}

TEST(Interpret, UnknownKeysAreWarnedAboutWhereTheyStand)
{
    Design design = tests::plainDesign();
    design.json["colour"] = "blue";
    design.json["gas"]["grade"] = 5;
    design.json["segments"][1]["exponent"] = 1.3;
    design.json["segments"][1]["remark"] = "x";
    design.json["limits"][0]["severity"] = 2;
    design.json["start"]["humidity"] = 0.4;
    EXPECT_THAT(warnedPlaces(interpreted(design)),
                testing::UnorderedElementsAre("/colour", "/gas/grade", "/segments/1/exponent", "/segments/1/remark",
                                              "/limits/0/severity", "/start/humidity"));
}

TEST(Interpret, PartsThatDoNotChangeThePathAreKeptWithoutAWord)
{
    Design design = tests::plainDesign();
    for (const char *key : {"alternatives", "traces", "targets", "annotations", "correlations"})
        design.json[key] = Json::array({Json::object()});
    design.json["view"] = {{"zoom", 2}};
    design.json["steady_cycle"] = false;
    EXPECT_TRUE(interpreted(design).warnings.empty());
}

TEST(Interpret, AFaultInASegmentLeavesTheOthersStanding)
{
    Design design = tests::plainDesign();
    design.json["segments"][1]["end"] = {{"temperature", "warm"}};
    const auto interpretation = interpreted(design);
    EXPECT_TRUE(interpretation.input.segments[0].ok());
    ASSERT_FALSE(interpretation.input.segments[1].ok());
    EXPECT_EQ(interpretation.input.segments[1].failure().pointer, "/segments/1/end/temperature");
    EXPECT_TRUE(interpretation.input.segments[2].ok());
    const auto evaluation = document::evaluate(design, library());
    ASSERT_TRUE(evaluation.ok());
    EXPECT_EQ(evaluation->path.segments.size(), 1U);
    EXPECT_EQ(document::firstFailure(*evaluation)->pointer, "/segments/1/end/temperature");
}

TEST(Interpret, WarningsOfTheDocumentComeBeforeThoseOfThePath)
{
    Design design = tests::plainDesign();
    design.json["colour"] = "blue";
    design.json.erase("surroundings");
    const auto evaluation = document::evaluate(design, library());
    ASSERT_TRUE(evaluation.ok());
    ASSERT_GE(evaluation->path.warnings.size(), 2U);
    EXPECT_EQ(evaluation->path.warnings.front().pointer, "/colour");
    EXPECT_EQ(evaluation->path.warnings[1].pointer, "/surroundings");
}
