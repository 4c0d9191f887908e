// Gases of cubic equations as a document states them: a user's own, interactions, and every way to get them wrong.

#include "designs.h"

#include "core/document/file.h"
#include "core/document/format_keys.h"
#include "core/gas/equation/equation.h"

#include <gmock/gmock.h>

#include <cmath>
#include <ostream>

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

Outcome<document::Interpretation> interpretation(std::string_view gas)
{
    Design design = tests::plainDesign();
    design.json["gas"] = Json::parse(gas);
    return document::interpret(design, library());
}

document::Interpretation interpreted(std::string_view gas)
{
    auto result = interpretation(gas);
    EXPECT_TRUE(result.ok()) << gas << (result ? "" : result.failure().pointer + ": " + result.failure().message.text);
    return result ? std::move(*result) : document::Interpretation{};
}

std::vector<std::string> warnedPlaces(const document::Interpretation &interpretation)
{
    std::vector<std::string> places;
    for (const Warning &warning : interpretation.warnings) places.push_back(warning.pointer);
    return places;
}

/// A purge gas of the workshop's own, with a heat capacity that rises.
constexpr std::string_view ownGas = R"({"model": "peng-robinson", "composition": {"ridge gas": 1},
  "components": {"ridge gas": {"critical_temperature": "77 °C", "critical_pressure": "40 bar", "acentric_factor": 0.15,
    "molar_mass": "44 g/mol", "heat_capacity": {"cp_over_R": [3.5, 0.01], "from": "250 K", "to": "500 K"}}}})";

double pressureOf(const gas::Gas &gas)
{
    return gas.at(350.0, 5e-4).pressure;
}

TEST(CubicGasDocument, ReadsAUsersOwnGas)
{
    const auto own = interpreted(ownGas);
    const gas::Gas &gas = *own.input.gas;
    EXPECT_EQ(gas.model(), "peng-robinson");
    EXPECT_EQ(gas.name(), "ridge gas");
    EXPECT_DOUBLE_EQ(gas.molarMass(), 0.044);
    EXPECT_TRUE(own.warnings.empty());
    const double R = gas.gasConstant();
    EXPECT_NEAR(gas.idealPart().at(400.0, 1.0).isochoricHeatCapacity, R * (3.5 + 0.01 * 400.0 - 1.0), 1e-9);
    // Constant beyond its range.
    EXPECT_NEAR(gas.idealPart().at(900.0, 1.0).isochoricHeatCapacity, R * (3.5 + 0.01 * 500.0 - 1.0), 1e-9);
    EXPECT_EQ(gas.validity().valid.lowestTemperature, 250.0);
    EXPECT_EQ(gas.validity().valid.highestTemperature, 500.0);
    ASSERT_NE(gas.equation(), nullptr);
    EXPECT_NEAR(gas.equation()->boundary->highestTemperature(), 350.15, 1e-5);
}

TEST(CubicGasDocument, MixesOwnAndPublishedGasesByMass)
{
    Json gas = Json::parse(ownGas);
    gas.erase("composition");
    gas["composition_by_mass"] = {{"ridge gas", 0.5}, {"He", 0.5}};
    const auto mixed = interpreted(gas.dump());
    const gas::Composition &composition = mixed.input.gas->composition();
    ASSERT_EQ(composition.size(), 2U);
    EXPECT_EQ(composition[0].component, "helium");
    const double helium = 0.5 / 0.004002602;
    EXPECT_NEAR(composition[0].moleFraction, helium / (helium + 0.5 / 0.044), 1e-6);
    EXPECT_THAT(warnedPlaces(mixed), testing::ElementsAre("/gas")); // no binary interaction
}

TEST(CubicGasDocument, LetsAUsersValuesWinOverTheLibrarysAndSaysSo)
{
    const auto changed = interpreted(R"({"model": "soave-redlich-kwong", "composition": {"nitrogen": 1},
        "components": {"N2": {"acentric_factor": 0.3}}})");
    EXPECT_THAT(warnedPlaces(changed), testing::ElementsAre("/gas/components/N2"));
    const auto plain = interpreted(R"({"model": "soave-redlich-kwong", "composition": {"N2": 1}})");
    EXPECT_TRUE(plain.warnings.empty());
    EXPECT_NE(pressureOf(*changed.input.gas), pressureOf(*plain.input.gas));
    EXPECT_EQ(changed.input.gas->molarMass(), plain.input.gas->molarMass());
    EXPECT_NE(changed.input.gas->source().find("as stated for nitrogen"), std::string_view::npos);
}

TEST(CubicGasDocument, LetsAUserGiveAHeatCapacityThatTheLibraryLacks)
{
    constexpr std::string_view hexane = R"({"model": "peng-robinson", "composition": {"n-hexane": 1}})";
    const auto lacking = interpretation(hexane);
    ASSERT_FALSE(lacking.ok());
    EXPECT_EQ(lacking.failure().pointer, "/gas/composition/n-hexane");
    EXPECT_NE(lacking.failure().message.text.find("heat_capacity"), std::string::npos);
    Json gas = Json::parse(hexane);
    gas["components"] =
        Json::parse(R"({"n-hexane": {"heat_capacity": {"cp_over_R": [2.0, 0.05], "from": "250 K", "to": "600 K"}}})");
    EXPECT_EQ(interpreted(gas.dump()).input.gas->name(), "n-hexane");
}

TEST(CubicGasDocument, AnOwnGasMayBeCalledAir)
{
    Json gas = Json::parse(ownGas);
    gas["components"]["air"] = gas["components"]["ridge gas"];
    gas["components"].erase("ridge gas");
    gas["composition"] = {{"air", 1}};
    EXPECT_EQ(interpreted(gas.dump()).input.gas->composition().size(), 1U);
    EXPECT_EQ(interpreted(R"({"model": "peng-robinson", "composition": {"air": 1}})").input.gas->composition().size(),
              3U);
}

TEST(CubicGasDocument, ReadsInteractionsInEitherOrderByNameOrFormula)
{
    const auto with = [](std::string_view pair) {
        return interpreted(R"({"model": "peng-robinson", "composition": {"methane": 0.5, "carbon dioxide": 0.5},
            "binary_interaction": {")" +
                           std::string(pair) + R"(": 0.1}})");
    };
    const double stated = pressureOf(*with("methane/carbon dioxide").input.gas);
    EXPECT_EQ(pressureOf(*with("CO2/CH4").input.gas), stated);
    EXPECT_EQ(pressureOf(*with("carbon dioxide/methane").input.gas), stated);
    EXPECT_TRUE(with("CO2/methane").warnings.empty());
    const auto without =
        interpreted(R"({"model": "peng-robinson", "composition": {"methane": 0.5, "carbon dioxide": 0.5}})");
    EXPECT_GT(stated, pressureOf(*without.input.gas)); // less attraction
}

TEST(CubicGasDocument, SaysOnceWhichInteractionsAreZero)
{
    const auto none = interpreted(R"({"model": "peng-robinson", "composition": {"air": 1}})");
    ASSERT_EQ(none.warnings.size(), 1U);
    EXPECT_EQ(none.warnings.front().pointer, "/gas");
    EXPECT_EQ(std::get<std::string>(none.warnings.front().message.arguments.front()),
              "argon/nitrogen, argon/oxygen, nitrogen/oxygen");
    const auto one = interpreted(R"({"model": "peng-robinson", "composition": {"air": 1},
        "binary_interaction": {"N2/O2": -0.012}})");
    ASSERT_EQ(one.warnings.size(), 1U);
    EXPECT_EQ(one.warnings.front().pointer, "/gas/binary_interaction");
    const auto many = interpreted(R"({"model": "peng-robinson", "composition": {"air": 0.9, "helium": 0.05,
        "hydrogen": 0.05}})");
    ASSERT_EQ(many.warnings.size(), 1U);
    EXPECT_EQ(std::get<std::string>(many.warnings.front().message.arguments.back()), "4"); // of 10 pairs 6 are named
    EXPECT_TRUE(interpreted(R"({"model": "peng-robinson", "composition": {"argon": 1}})").warnings.empty());
}

TEST(CubicGasDocument, WarnsOfWhatIsNotUsed)
{
    Json gas = Json::parse(ownGas);
    gas["composition"] = {{"argon", 1}};
    gas["components"]["ridge gas"]["colour"] = "blue";
    gas["components"]["ridge gas"]["heat_capacity"]["unit"] = "K";
    gas["remark"] = 1;
    EXPECT_THAT(warnedPlaces(interpreted(gas.dump())),
                testing::UnorderedElementsAre("/gas/remark", "/gas/components/ridge gas",
                                              "/gas/components/ridge gas/colour",
                                              "/gas/components/ridge gas/heat_capacity/unit"));
}

struct Row {
    const char *place; // in the own gas above
    const char *value; // null removes
    const char *pointer;
    Reason reason;
    const char *says;
};
std::ostream &operator<<(std::ostream &out, const Row &row)
{
    return out << row.place << " = " << (row.value ? row.value : "(removed)");
}

const Row rows[] = {
    {"/components/ridge gas/critical_temperature", nullptr, "/components/ridge gas", Reason::missing,
     "critical_temperature"},
    {"/components/ridge gas/critical_pressure", nullptr, "/components/ridge gas", Reason::missing, "critical_pressure"},
    {"/components/ridge gas/acentric_factor", nullptr, "/components/ridge gas", Reason::missing, "acentric_factor"},
    {"/components/ridge gas/molar_mass", nullptr, "/components/ridge gas", Reason::missing, "molar_mass"},
    {"/components/ridge gas/heat_capacity", nullptr, "/components/ridge gas", Reason::missing, "heat_capacity"},
    {"/components/ridge gas", "7", "/components/ridge gas", Reason::wrongType, "a number"},
    {"/components", "[]", "/components", Reason::wrongType, "a list"},
    {"/components/a~1b", "{}", "/components/a~1b", Reason::syntax, "“/”"},
    {"/components/ridge gas/critical_temperature", "350", "/components/ridge gas/critical_temperature",
     Reason::wrongType, "350 "},
    {"/components/ridge gas/critical_temperature", "\"-300 °C\"", "/components/ridge gas/critical_temperature",
     Reason::outOfRange, "absolute zero"},
    {"/components/ridge gas/critical_pressure", "\"40 bar(g)\"", "/components/ridge gas/critical_pressure",
     Reason::wrongType, "absolute"},
    {"/components/ridge gas/critical_pressure", "\"0 bar\"", "/components/ridge gas/critical_pressure",
     Reason::outOfRange, "zero"},
    {"/components/ridge gas/acentric_factor", "\"0,15\"", "/components/ridge gas/acentric_factor", Reason::syntax,
     "0.15"},
    {"/components/ridge gas/acentric_factor", "-1", "/components/ridge gas/acentric_factor", Reason::outOfRange,
     "between"},
    {"/components/ridge gas/acentric_factor", "2", "/components/ridge gas/acentric_factor", Reason::outOfRange,
     "between"},
    {"/components/ridge gas/molar_mass", "\"44 g\"", "/components/ridge gas/molar_mass", Reason::wrongType,
     "molar mass"},
    {"/components/ridge gas/heat_capacity/cp_over_R", nullptr, "/components/ridge gas/heat_capacity", Reason::missing,
     "cp_over_R"},
    {"/components/ridge gas/heat_capacity/cp_over_R", "3.5", "/components/ridge gas/heat_capacity/cp_over_R",
     Reason::wrongType, "list"},
    {"/components/ridge gas/heat_capacity/cp_over_R", "[]", "/components/ridge gas/heat_capacity/cp_over_R",
     Reason::missing, "at least one"},
    {"/components/ridge gas/heat_capacity/cp_over_R", "[3.5, true]", "/components/ridge gas/heat_capacity/cp_over_R/1",
     Reason::wrongType, "true or false"},
    {"/components/ridge gas/heat_capacity/cp_over_R", "[0.5]", "/components/ridge gas/heat_capacity/cp_over_R",
     Reason::outOfRange, "greater than R"},
    {"/components/ridge gas/heat_capacity/from", nullptr, "/components/ridge gas/heat_capacity", Reason::missing,
     "from"},
    {"/components/ridge gas/heat_capacity/to", "\"200 K\"", "/components/ridge gas/heat_capacity/to",
     Reason::outOfRange, "begins"},
    {"/composition", R"({"ridge gas": 0.5, "ridge gsa": 0.5})", "/composition/ridge gsa", Reason::unknownName,
     "no gas named"},
    {"/composition", R"({"ridge gas": 0.5, "N2": 0.6})", "/composition", Reason::contradiction, "fractions sum to"},
    {"/composition_by_mass", R"({"ridge gas": 1})", "/composition_by_mass", Reason::contradiction, "remove one"},
    {"/binary_interaction", "0.1", "/binary_interaction", Reason::wrongType, "a number"},
    {"/binary_interaction", R"({"ridge gas": 0.1})", "/binary_interaction/ridge gas", Reason::syntax, "between them"},
    {"/binary_interaction", R"({"a/b/c": 0.1})", "/binary_interaction/a~1b~1c", Reason::syntax, "between them"},
    {"/binary_interaction", R"({"ridge gas/ridge gas": 0.1})", "/binary_interaction/ridge gas~1ridge gas",
     Reason::contradiction, "different"},
    {"/binary_interaction", R"({"ridge gas/argon": 0.1})", "/binary_interaction/ridge gas~1argon",
     Reason::contradiction, "not in this gas's composition"},
    {"/binary_interaction", R"({"ridge gas/argno": 0.1})", "/binary_interaction/ridge gas~1argno", Reason::unknownName,
     "no gas named"},
};

class WrongCubicGas : public testing::TestWithParam<Row>
{
};

TEST_P(WrongCubicGas, IsNamedWhereItStands)
{
    const Row &row = GetParam();
    Json gas = Json::parse(ownGas);
    const Json::json_pointer place{std::string(row.place)};
    if (row.value)
        gas[place] = Json::parse(row.value);
    else
        gas[place.parent_pointer()].erase(place.back());
    const auto result = interpretation(gas.dump());
    ASSERT_FALSE(result.ok());
    EXPECT_EQ(result.failure().pointer, std::string("/gas") + row.pointer);
    EXPECT_EQ(result.failure().reason, row.reason);
    std::string words = result.failure().message.text;
    for (const auto &argument : result.failure().message.arguments)
        if (const auto *text = std::get_if<std::string>(&argument)) words += " " + *text;
    EXPECT_THAT(words, testing::HasSubstr(row.says));
}
INSTANTIATE_TEST_SUITE_P(EveryFault, WrongCubicGas, testing::ValuesIn(rows));

TEST(CubicGasDocument, RefusesAnInteractionStatedTwiceOrTooLarge)
{
    const auto refused = [](std::string_view interaction) {
        return interpretation(R"({"model": "peng-robinson", "composition": {"N2": 0.5, "CO2": 0.5},
            "binary_interaction": )" +
                              std::string(interaction) + "}");
    };
    const auto twice = refused(R"({"CO2/N2": 0.1, "nitrogen/carbon dioxide": 0.1})");
    ASSERT_FALSE(twice.ok());
    EXPECT_EQ(twice.failure().pointer, "/gas/binary_interaction/nitrogen~1carbon dioxide");
    EXPECT_EQ(twice.failure().reason, Reason::contradiction);
    for (const char *k : {"1", "-1", "5"}) {
        const auto large = refused(std::string(R"({"CO2/N2": )") + k + "}");
        ASSERT_FALSE(large.ok());
        EXPECT_EQ(large.failure().pointer, "/gas/binary_interaction/CO2~1N2");
        EXPECT_EQ(large.failure().reason, Reason::outOfRange);
    }
}

TEST(CubicGasDocument, StandsInTheSchemaAsItIsRead)
{
    const auto text = document::fileText(std::string(RESOURCES_DIR) + "/quasistat.schema.json");
    ASSERT_TRUE(text.ok());
    const Json schema = Json::parse(*text);
    const auto keysOf = [](const Json &object) {
        std::vector<std::string> keys;
        for (const auto &item : object.items()) keys.push_back(item.key());
        return keys;
    };
    const auto isCubic = [](const Json &branch) {
        return branch["properties"]["model"].dump().find("peng-robinson") != std::string::npos;
    };
    const Json &branches = schema["$defs"]["gas"]["oneOf"];
    const auto cubic = std::ranges::find_if(branches, isCubic);
    ASSERT_NE(cubic, branches.end());
    std::vector<std::string> known(document::keys::mixture.begin(), document::keys::mixture.end());
    known.insert(known.end(), document::keys::cubicGas.begin(), document::keys::cubicGas.end());
    EXPECT_THAT(keysOf((*cubic)["properties"]), testing::UnorderedElementsAreArray(known));
    const Json &own = (*cubic)["properties"]["components"]["additionalProperties"]["properties"];
    EXPECT_THAT(keysOf(own), testing::UnorderedElementsAreArray(document::keys::ownGas));
    EXPECT_THAT(keysOf(own["heat_capacity"]["properties"]),
                testing::UnorderedElementsAreArray(document::keys::heatCapacity));
}

} // namespace
