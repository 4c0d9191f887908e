// The JSON Schema in resources/ names what the reader knows, and nothing that it would refuse as unknown.

#include "designs.h"

#include "core/document/file.h"
#include "core/document/format_keys.h"

#include <gmock/gmock.h>

#include <filesystem>

using namespace quasistat;
using document::Json;

namespace
{

Json schema()
{
    const auto text = document::fileText(std::string(RESOURCES_DIR) + "/quasistat.schema.json");
    EXPECT_TRUE(text.ok());
    return Json::parse(*text, nullptr, false);
}

std::vector<std::string> keysOf(const Json &object)
{
    std::vector<std::string> keys;
    for (const auto &item : object.items()) keys.push_back(item.key());
    return keys;
}

Json branchOf(const Json &schema, std::string_view kind)
{
    for (const Json &branch : schema.at("$defs").at("segment").at("oneOf"))
        if (branch.at("properties").at("kind").at("const") == kind) return branch;
    ADD_FAILURE() << "no branch for " << kind;
    return Json::object();
}

/// Keys of the `end` of a branch, wherever they stand in it.
void endKeys(const Json &value, std::vector<std::string> &keys)
{
    if (!value.is_structured()) return;
    if (value.is_object() && value.contains("end") && value["end"].is_object() && value["end"].contains("anyOf"))
        for (const Json &option : value["end"]["anyOf"])
            if (option.contains("properties"))
                for (const auto &key : keysOf(option["properties"])) keys.push_back(key);
    for (const auto &item : value.items()) endKeys(item.value(), keys);
}

} // namespace

TEST(Schema, IsJsonAndNamesEveryTopLevelKey)
{
    const Json json = schema();
    ASSERT_TRUE(json.is_object());
    EXPECT_EQ(json["$schema"], "https://json-schema.org/draft/2020-12/schema");
    std::vector<std::string> known;
    for (const auto list : {document::Keys(document::keys::design), document::Keys(document::keys::designElsewhere)})
        known.insert(known.end(), list.begin(), list.end());
    EXPECT_THAT(keysOf(json["properties"]), testing::UnorderedElementsAreArray(known));
    EXPECT_EQ(json["required"], Json::array({"quasistat", "gas", "start", "segments"}));
}

TEST(Schema, NamesEveryKindModelAndLimit)
{
    const Json json = schema();
    std::vector<std::string> kinds;
    for (const path::KindFacts &row : path::kindTable) kinds.emplace_back(row.key);
    for (const std::string_view key : path::kindsNotComputed()) kinds.emplace_back(key);
    EXPECT_THAT(json["$defs"]["segment"]["properties"]["kind"]["enum"].get<std::vector<std::string>>(),
                testing::UnorderedElementsAreArray(kinds));
    EXPECT_EQ(json["$defs"]["segment"]["oneOf"].size(), kinds.size());
    EXPECT_THAT(json["$defs"]["gas"]["properties"]["model"]["enum"].get<std::vector<std::string>>(),
                testing::ElementsAreArray(document::keys::models.begin(), document::keys::models.end()));
    EXPECT_THAT(keysOf(json["$defs"]["limit"]["properties"]),
                testing::UnorderedElementsAreArray(document::keys::limit.begin(), document::keys::limit.end()));
    EXPECT_THAT(keysOf(json["$defs"]["start"]["properties"]),
                testing::UnorderedElementsAreArray(document::keys::start.begin(), document::keys::start.end()));
}

TEST(Schema, NamesEveryKeyAndEndThatAKindTakes)
{
    const Json json = schema();
    const path::Process processes[] = {path::Isothermal{},
                                       path::Isobaric{},
                                       path::Isochoric{},
                                       path::Polytropic{1.3},
                                       path::Isentropic{},
                                       path::Linear{},
                                       path::ConstantExternalPressure{},
                                       path::Stepped{},
                                       path::FreeExpansion{}};
    for (const path::Process &process : processes) {
        const path::KindFacts &facts = path::facts(path::kindOf(process));
        const Json branch = branchOf(json, facts.key);
        const document::KindKeys own = document::ownKeys(facts.kind);
        std::vector<std::string> keys{"kind", "end"};
        keys.insert(keys.end(), own.own.begin(), own.own.end());
        keys.insert(keys.end(), own.notComputed.begin(), own.notComputed.end());
        for (const std::string &key : keysOf(branch["properties"]))
            EXPECT_THAT(keys, testing::Contains(key)) << facts.key;
        for (const std::string &key : keys) {
            if (key == "end") continue; // of an open law it stands in the branches of a condition
            EXPECT_TRUE(branch["properties"].contains(key)) << facts.key << ": " << key;
        }
        std::vector<std::string> ends;
        endKeys(branch, ends);
        for (const path::EndKey key : path::endChoice(process).keys)
            EXPECT_THAT(ends, testing::Contains(std::string(path::keyOf(key)))) << facts.key;
    }
}

TEST(Schema, EveryKeyOfTheExamplesAndSamplesIsKnown)
{
    const gas::Library library;
    for (const std::string &folder : {std::string(TEST_DATA_DIR) + "/examples", std::string(SAMPLES_DIR)})
        for (const auto &entry : std::filesystem::directory_iterator(folder)) {
            if (entry.path().extension() != ".qpath") continue;
            const auto text = document::fileText(entry.path().string());
            ASSERT_TRUE(text.ok());
            const auto interpretation = document::interpret(tests::designOf(*text), library);
            if (!interpretation) { // refused as a whole for its model, which the schema names all the same
                EXPECT_EQ(interpretation.failure().reason, Reason::notComputed) << entry.path();
                continue;
            }
            for (const Warning &warning : interpretation->warnings)
                ADD_FAILURE() << entry.path() << ": " << warning.pointer << ": " << warning.message.text;
            for (const auto &segment : interpretation->input.segments)
                EXPECT_TRUE(segment.ok() || segment.failure().reason == Reason::notComputed) << entry.path();
        }
}
