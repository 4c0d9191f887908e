// Every fault of a document has its pointer, its reason, and words that say what would be right.

#include "designs.h"

#include "core/document/edit.h"

#include <gmock/gmock.h>

#include <optional>
#include <ostream>

using namespace quasistat;
using document::Design;
using document::Json;

namespace
{

struct Row {
    const char *place; // where `value` is put into the plain design; a null value removes
    const char *value;
    const char *pointer;
    Reason reason;
    const char *says;
};
std::ostream &operator<<(std::ostream &out, const Row &row)
{
    return out << row.place << " = " << (row.value ? row.value : "(removed)");
}

const Row rows[] = {
    {"/quasistat", nullptr, "", Reason::missing, "“quasistat” is missing"},
    {"/quasistat", "2", "/quasistat", Reason::outOfRange, "\"quasistat\": 1"},
    {"/quasistat", "\"1\"", "/quasistat", Reason::outOfRange, "\"quasistat\": 1"},
    {"/title", "5", "/title", Reason::wrongType, "here stands a number"},
    {"/document", "{\"number\": 5}", "/document/number", Reason::wrongType, "here stands a number"},
    {"/document", "[]", "/document", Reason::wrongType, "a list"},
    {"/steady_cycle", "true", "/steady_cycle", Reason::notComputed, "not computed by this version"},
    {"/steady_cycle", "1", "/steady_cycle", Reason::wrongType, "true or false"},
    {"/rate", "\"600 s\"", "/rate", Reason::wrongType, "600 1/min"},
    {"/rate", "\"-600 1/min\"", "/rate", Reason::outOfRange, "above zero"},

    {"/gas", nullptr, "", Reason::missing, "“gas” is missing"},
    {"/gas", "\"air\"", "/gas", Reason::wrongType, "a text"},
    {"/gas/model", nullptr, "/gas", Reason::missing, "“model” is missing"},
    {"/gas/model", "\"perfct\"", "/gas/model", Reason::unknownName, "did you mean perfect?"},
    {"/gas/model", "\"peng-robinson\"", "/gas", Reason::missing, "“composition” is missing"},
    {"/gas/model", "\"soave-redlich-kwong\"", "/gas", Reason::missing, "“composition” is missing"},
    {"/gas/model", "\"gerg-2008\"", "/gas", Reason::missing, "“composition” is missing"},
    {"/gas/model", "\"reference\"", "/gas", Reason::missing, "“fluid” is missing"},
    {"/gas", R"({"model": "gerg-2008", "composition": {"Xe": 1}})", "/gas/composition/Xe", Reason::unknownName,
     "gerg-2008 does not have xenon; these do: ideal, peng-robinson, soave-redlich-kwong, reference"},
    {"/gas", R"({"model": "gerg-2008", "composition": {"methan": 1}})", "/gas/composition/methan", Reason::unknownName,
     "near it are: ethane, methane"},
    {"/gas", R"({"model": "reference", "fluid": 5})", "/gas/fluid", Reason::wrongType, "a number"},
    {"/gas", R"({"model": "reference", "fluid": "benzene"})", "/gas/fluid", Reason::unknownName, "these do: ideal"},
    {"/gas", R"({"model": "reference", "fluid": "phlogiston"})", "/gas/fluid", Reason::unknownName, "no gas named"},
    {"/gas/heat_capacity_ratio", "1", "/gas/heat_capacity_ratio", Reason::outOfRange, "greater than 1"},
    {"/gas/heat_capacity_ratio", "\"1,4\"", "/gas/heat_capacity_ratio", Reason::syntax, "1.4"},
    {"/gas/heat_capacity_ratio", nullptr, "/gas", Reason::missing, "heat_capacity_ratio"},
    {"/gas/molar_mass", "28.96", "/gas/molar_mass", Reason::wrongType, "28.96 g/mol"},
    {"/gas/molar_mass", "\"0 g/mol\"", "/gas/molar_mass", Reason::outOfRange, "above zero"},
    {"/gas/molar_mass", "\"29 g\"", "/gas/molar_mass", Reason::wrongType, "molar mass"},
    {"/gas/name", "7", "/gas/name", Reason::wrongType, "a number"},
    {"/gas", R"({"model": "ideal"})", "/gas", Reason::missing, "“composition” is missing"},
    {"/gas", R"({"model": "ideal", "composition": []})", "/gas/composition", Reason::wrongType, "a list"},
    {"/gas", R"({"model": "ideal", "composition": {}})", "/gas/composition", Reason::contradiction, "sum to 0"},
    {"/gas", R"({"model": "ideal", "composition": {"nitrogen": 0.9}})", "/gas/composition", Reason::contradiction,
     "sum to 0.9"},
    {"/gas", R"({"model": "ideal", "composition": {"nitrogen": 1.2, "oxygen": -0.2}})", "/gas/composition/nitrogen",
     Reason::outOfRange, "between 0 and 1"},
    {"/gas", R"({"model": "ideal", "composition": {"nitrogne": 1}})", "/gas/composition/nitrogne", Reason::unknownName,
     "nitrogen"},
    {"/gas", R"({"model": "ideal", "composition": {"nitrogen": 0.5, "N2": 0.5}})", "/gas/composition/N2",
     Reason::contradiction, "twice"},
    {"/gas", R"({"model": "ideal", "composition": {"N2": 1}, "composition_by_mass": {"N2": 1}})",
     "/gas/composition_by_mass", Reason::contradiction, "remove one"},

    {"/surroundings", "3", "/surroundings", Reason::wrongType, "a number"},
    {"/surroundings/pressure", "\"1 bar(g)\"", "/surroundings/pressure", Reason::contradiction, "absolute"},
    {"/surroundings/pressure", "\"-1 bar\"", "/surroundings/pressure", Reason::outOfRange, "absolute zero"},
    {"/surroundings/temperature", "\"20 C\"", "/surroundings/temperature", Reason::wrongType, "°C"},

    {"/start", nullptr, "", Reason::missing, "“start” is missing"},
    {"/start/volume", nullptr, "/start", Reason::missing, "it has 2"},
    {"/start/amount", "\"1 mol\"", "/start", Reason::contradiction, "remove one"},
    {"/start/volume", "\"0 L\"", "/start/volume", Reason::notComputed, "not computed by this version"},
    {"/start/volume", "\"-2 L\"", "/start/volume", Reason::outOfRange, "above zero"},
    {"/start/temperature", "\"-300 °C\"", "/start/temperature", Reason::outOfRange, "absolute zero"},
    {"/start/pressure", "\"-2 bar(g)\"", "/start/pressure", Reason::outOfRange, "absolute zero"},
    {"/start/pressure", "\"1,2 bar\"", "/start/pressure", Reason::syntax, "“1.2 bar”"},
    {"/start/pressure", "\"@1\"", "/start/pressure", Reason::syntax, "number"},
    {"/start/evacuated", "\"yes\"", "/start/evacuated", Reason::wrongType, "true or false"},
    {"/start/evacuated", "true", "/start/pressure", Reason::contradiction, "no pressure"},
    {"/start", R"({"volume": "2 L", "evacuated": true})", "/segments/0/kind", Reason::contradiction, "evacuated start"},

    {"/segments", nullptr, "", Reason::missing, "“segments” is missing"},
    {"/segments", "{}", "/segments", Reason::wrongType, "a list of segments"},
    {"/segments/0", "\"isobaric\"", "/segments/0", Reason::wrongType, "a text"},
    {"/segments/0/kind", nullptr, "/segments/0", Reason::missing, "“kind” is missing"},
    {"/segments/0/kind", "\"isotherm\"", "/segments/0/kind", Reason::unknownName, "isothermal"},
    {"/segments/0/kind", "\"adiabatic\"", "/segments/0/kind", Reason::notComputed, "not computed by this version"},
    {"/segments/0/kind", "\"throttle\"", "/segments/0/kind", Reason::notComputed, "not computed by this version"},
    {"/segments/0/kind", "\"trace\"", "/segments/0/kind", Reason::notComputed, "not computed by this version"},
    {"/segments/0/kind", "\"intake\"", "/segments/0/kind", Reason::notComputed, "not computed by this version"},
    {"/segments/0/kind", "\"discharge\"", "/segments/0/kind", Reason::notComputed, "not computed by this version"},
    {"/segments/0/kind", "\"fill\"", "/segments/0/kind", Reason::notComputed, "not computed by this version"},
    {"/segments/0/kind", "\"vent\"", "/segments/0/kind", Reason::notComputed, "not computed by this version"},
    {"/segments/0/kind", "\"connect\"", "/segments/0/kind", Reason::notComputed, "not computed by this version"},
    {"/segments/0/kind", "\"isolate\"", "/segments/0/kind", Reason::notComputed, "not computed by this version"},
    {"/segments/0/label", "1", "/segments/0/label", Reason::wrongType, "a number"},
    {"/segments/0/exponent", "\"high\"", "/segments/0/exponent", Reason::syntax, "number"},
    {"/segments/0/exponent", "null", "/segments/0/exponent", Reason::wrongType, "null"},
    {"/segments/0/exponent", nullptr, "/segments/0/end", Reason::missing, "needs an exponent, or two"},
    {"/segments/0/reservoir_temperature", "\"300 K\"", "/segments/0/reservoir_temperature", Reason::notComputed,
     "not computed"},
    {"/segments/0/regenerator", "3", "/segments/0/regenerator", Reason::notComputed, "not computed"},
    {"/segments/2/dissipated_work", "\"5 J\"", "/segments/2/dissipated_work", Reason::notComputed, "not computed"},
    {"/segments/0/end", nullptr, "/segments/0", Reason::missing, "the end of this segment is missing"},
    {"/segments/0/end", "{}", "/segments/0/end", Reason::missing, "the end of this segment is missing"},
    {"/segments/0/end", "5", "/segments/0/end", Reason::wrongType, "a number"},
    {"/segments/0/end", "\"balance\"", "/segments/0/end", Reason::contradiction, "ends by pressure"},
    {"/segments/0/end/volume", "\"1 L\"", "/segments/0/end", Reason::contradiction, "remove the others"},
    {"/segments/0/end/pressure", "8", "/segments/0/end/pressure", Reason::wrongType, "“8” has no unit"},
    {"/segments/0/end/pressure", "\"8 L\"", "/segments/0/end/pressure", Reason::wrongType, "no unit of pressure"},
    {"/segments/0/end/pressure", "\"@2\"", "/segments/0/end/pressure", Reason::outOfRange, "states 1 to 1"},
    {"/segments/0/end/pressure", "\"@0\"", "/segments/0/end/pressure", Reason::outOfRange, "states 1 to 1"},
    {"/segments/0/end/pressure", "\"@x\"", "/segments/0/end/pressure", Reason::syntax, "“@1”"},
    {"/segments/0/end/pressure", "\"@99999999999999\"", "/segments/0/end/pressure", Reason::syntax, "“@1”"},
    {"/segments/0/end", R"({"pressure_ratio": -2})", "/segments/0/end/pressure_ratio", Reason::outOfRange,
     "above zero"},
    {"/segments/0/end", R"({"pressure_ratio": "@1"})", "/segments/0/end/pressure_ratio", Reason::wrongType,
     "none of them"},
    {"/segments/0/end", R"({"volume": "0 L"})", "/segments/0/end/volume", Reason::outOfRange, "above zero"},
    {"/segments/0/end", R"({"presure": "8 bar"})", "/segments/0/end/presure", Reason::unknownName, "pressure"},
    {"/segments/0/end", R"({"amount": "1 mol"})", "/segments/0/end/amount", Reason::contradiction,
     "does not end by amount"},
    {"/segments/1/end", R"({"pressure": "8 bar"})", "/segments/1/end/pressure", Reason::contradiction,
     "does not end by pressure, but by volume"},
    {"/segments/0/end", R"({"state": 2})", "/segments/0/end/state", Reason::outOfRange, "states 1 to 1"},
    {"/segments/0/end", R"({"state": "1"})", "/segments/0/end/state", Reason::wrongType, "a text"},
    {"/segments/0/end", R"({"state": 1, "pressure": "8 bar"})", "/segments/0/end", Reason::contradiction,
     "no other value"},
    {"/segments/0/end/direction", "\"up\"", "/segments/0/end/direction", Reason::unknownName, "compress"},
    {"/segments/0", R"({"kind": "linear", "end": {"pressure": "8 bar"}})", "/segments/0/end", Reason::missing,
     "stiffness"},
    {"/segments/0", R"({"kind": "linear", "stiffness": "5 bar", "end": {"pressure": "8 bar"}})",
     "/segments/0/stiffness", Reason::wrongType, "Pa/m3"},
    {"/segments/0", R"({"kind": "constant-external-pressure"})", "/segments/0", Reason::missing, "external_pressure"},
    {"/segments/0", R"({"kind": "constant-external-pressure", "load": {"mass": "5 kg", "bore": "50 mm"}})",
     "/segments/0/load", Reason::notComputed, "not computed"},
    {"/segments/0", R"({"kind": "constant-external-pressure", "external_pressure": "@2"})",
     "/segments/0/external_pressure", Reason::outOfRange, "states 1 to 1"},
    {"/segments/0", R"({"kind": "stepped", "end": {"pressure": "8 bar"}})", "/segments/0", Reason::missing, "“steps”"},
    {"/segments/0", R"({"kind": "stepped", "steps": 0, "end": {"pressure": "8 bar"}})", "/segments/0/steps",
     Reason::outOfRange, "from 1"},
    {"/segments/0", R"({"kind": "stepped", "steps": -1, "end": {"pressure": "8 bar"}})", "/segments/0/steps",
     Reason::outOfRange, "from 1"},
    {"/segments/0", R"({"kind": "stepped", "steps": 18446744073709551615, "end": {"pressure": "8 bar"}})",
     "/segments/0/steps", Reason::outOfRange, "from 1"},
    {"/segments/0", R"({"kind": "stepped", "steps": 2.5, "end": {"pressure": "8 bar"}})", "/segments/0/steps",
     Reason::wrongType, "whole number"},
    {"/segments/0", R"({"kind": "stepped", "steps": 3, "spacing": "even", "end": {"pressure": "8 bar"}})",
     "/segments/0/spacing", Reason::unknownName, "ratio"},
    {"/segments/0", R"({"kind": "free-expansion", "thermal": "cold", "end": {"volume": "8 L"}})", "/segments/0/thermal",
     Reason::unknownName, "adiabatic"},

    {"/limits", "{}", "/limits", Reason::wrongType, "a list of limits"},
    {"/limits/0/quantity", nullptr, "/limits/0", Reason::missing, "“quantity” is missing"},
    {"/limits/0/quantity", "\"temprature\"", "/limits/0/quantity", Reason::unknownName, "temperature"},
    {"/limits/0/quantity", "\"rod_load\"", "/limits/0/quantity", Reason::notComputed, "not computed"},
    {"/limits/0/max", nullptr, "/limits/0", Reason::missing, "“min”, “max” or “max_at”"},
    {"/limits/0/max", "\"150 bar\"", "/limits/0/max", Reason::wrongType, "temperature"},
    {"/limits/0/min", "\"200 °C\"", "/limits/0/min", Reason::contradiction, "above the greatest"},
    {"/limits/0/max_at", R"([["20 °C", "10 bar"]])", "/limits/0/max_at", Reason::contradiction, "limits a pressure"},
    {"/limits/0", R"({"quantity": "pressure", "max_at": []})", "/limits/0/max_at", Reason::wrongType, "pairs"},
    {"/limits/0", R"({"quantity": "pressure", "max_at": [["20 °C"]]})", "/limits/0/max_at/0", Reason::wrongType,
     "pair"},
    {"/limits/0", R"({"quantity": "pressure", "max_at": [["20 °C", "10 bar"], ["20 °C", "9 bar"]]})",
     "/limits/0/max_at", Reason::contradiction, "two ratings"},
    {"/limits/0", R"({"quantity": "pressure", "max": "12 bar", "max_at": [["20 °C", "10 bar"]]})", "/limits/0/max_at",
     Reason::contradiction, "remove one"},
    {"/limits/0", R"({"quantity": "pressure_ratio", "max": "4 bar"})", "/limits/0/max", Reason::syntax, "plain number"},
};

Design changed(const Row &row)
{
    Design design = tests::plainDesign();
    if (!row.value) {
        const std::string place = row.place;
        const std::size_t slash = place.rfind('/');
        design.json.at(Json::json_pointer(place.substr(0, slash))).erase(place.substr(slash + 1));
        return design;
    }
    const auto next = document::valueSet(design, row.place, row.value);
    EXPECT_TRUE(next.ok());
    return next ? *next : design;
}

/// The first failure, of the document or of a segment.
std::optional<Failure> failureOf(const Design &design)
{
    static const gas::Library library;
    const auto evaluation = document::evaluate(design, library);
    if (!evaluation) return evaluation.failure();
    return document::firstFailure(*evaluation);
}

class RefusedDocument : public testing::TestWithParam<Row>
{
};

} // namespace

TEST_P(RefusedDocument, SaysWhereAndWhat)
{
    const Row &row = GetParam();
    const Design design = changed(row);
    const std::optional<Failure> failure = failureOf(design);
    ASSERT_TRUE(failure.has_value());
    const std::string words = units::sentence(failure->message, {});
    EXPECT_EQ(failure->pointer, row.pointer) << words;
    EXPECT_EQ(failure->reason, row.reason) << words;
    EXPECT_THAT(words, testing::HasSubstr(row.says));
    // The place in the text is that of the value, or of the object that lacks one.
    const std::string text = document::written(design);
    const document::Position position = document::positionOf(text, failure->pointer);
    EXPECT_GE(position.line, 1);
    EXPECT_TRUE(failure->pointer.empty() || position.line > 1 || position.column > 1);
}
INSTANTIATE_TEST_SUITE_P(Document, RefusedDocument, testing::ValuesIn(rows));
