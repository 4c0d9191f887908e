#include "designs.h"

#include "core/document/pointer.h"

#include <gtest/gtest.h>
#include <rapidcheck/gtest.h>

using namespace quasistat;
using document::Design;
using document::Json;
using document::Position;

namespace
{

struct Refusal {
    Reason reason;
    int line;
    int column;
};
Refusal refusalOf(std::string_view text)
{
    Position position;
    const auto design = document::read(text, position);
    if (design) return {Reason::notReached, 0, 0};
    return {design.failure().reason, position.line, position.column};
}

} // namespace

TEST(DocumentText, ComesBackAsItWasWritten)
{
    const Design design = tests::plainDesign();
    const std::string text = document::written(design);
    EXPECT_EQ(tests::designOf(text), design);
    EXPECT_EQ(document::written(tests::designOf(text)), text);
    // A segment to a line, as people read a path.
    EXPECT_NE(text.find("\n    {\"kind\": \"isobaric\", \"end\": {\"temperature\": \"@1\"}},\n"), std::string::npos);
    EXPECT_TRUE(text.ends_with("}\n"));
}

TEST(DocumentText, KeepsUnknownKeysTheirOrderAndNumbers)
{
    const std::string text =
        R"({"zeta": 1, "alpha": [1.50, 1e-300, 123456789012345678, -0.1], "größe": "5 µL", "e": {}, "f": []})";
    const Design design = tests::designOf(text);
    const Design back = tests::designOf(document::written(design));
    EXPECT_EQ(back.json.dump(), design.json.dump());
    EXPECT_EQ(back.json.begin().key(), "zeta");
}

TEST(DocumentText, SyntaxErrorsHaveLineAndColumn)
{
    const Refusal missingColon = refusalOf("{\n  \"quasistat\" 1\n}");
    EXPECT_EQ(missingColon.reason, Reason::syntax);
    EXPECT_EQ(missingColon.line, 2);
    EXPECT_EQ(missingColon.column, 15);
    const Refusal end = refusalOf("{\"a\": [1, 2");
    EXPECT_EQ(end.reason, Reason::syntax);
    EXPECT_EQ(end.line, 1);
    EXPECT_EQ(refusalOf("").reason, Reason::syntax);
    EXPECT_EQ(refusalOf("{\"a\": 1e999}").reason, Reason::syntax);
    EXPECT_EQ(refusalOf("{\"a\": NaN}").reason, Reason::syntax);
    EXPECT_EQ(refusalOf("{\"a\": \"\xFF\"}").reason, Reason::syntax);
    EXPECT_EQ(refusalOf(std::string(5000, '[')).reason, Reason::syntax);
}

TEST(DocumentText, ARepeatedKeyIsRefusedAtItsSecondPlace)
{
    const Refusal repeated = refusalOf("{\"gas\": {\"model\": \"perfect\",\n \"m\\u006fdel\": \"ideal\"}}");
    EXPECT_EQ(repeated.reason, Reason::syntax);
    EXPECT_EQ(repeated.line, 2);
    EXPECT_EQ(repeated.column, 2);
    EXPECT_EQ(refusalOf("{\"a\": {\"b\": 1}, \"c\": {\"b\": 1}}").reason, Reason::notReached); // not repeated: read
}

TEST(DocumentText, ADesignIsAnObject)
{
    EXPECT_EQ(refusalOf("[1]").reason, Reason::wrongType);
    EXPECT_EQ(refusalOf("3").reason, Reason::wrongType);
}

TEST(DocumentText, EveryPointerHasItsPlace)
{
    const std::string_view text = "{\n  \"a\": [10, {\"b/c\": \"ü\", \"d\": 5}],\n  \"e\": 7\n}";
    const auto at = [&](std::string_view pointer) {
        const Position position = document::positionOf(text, pointer);
        return std::pair(position.line, position.column);
    };
    EXPECT_EQ(at(""), std::pair(1, 1));
    EXPECT_EQ(at("/a"), std::pair(2, 8));
    EXPECT_EQ(at("/a/0"), std::pair(2, 9));
    EXPECT_EQ(at("/a/1/b~1c"), std::pair(2, 21));
    EXPECT_EQ(at("/a/1/d"), std::pair(2, 31)); // columns count characters, not bytes
    EXPECT_EQ(at("/e"), std::pair(3, 8));
    // What does not exist is at its nearest parent.
    EXPECT_EQ(at("/a/1/x/y"), std::pair(2, 13));
    EXPECT_EQ(at("/ab"), std::pair(1, 1));
}

TEST(DocumentText, TheFingerprintFollowsTheContent)
{
    const Design design = tests::plainDesign();
    const std::string print = document::fingerprint(design);
    EXPECT_EQ(print.size(), 14U);
    EXPECT_EQ(print[4], ' ');
    EXPECT_EQ(print[9], ' ');
    EXPECT_EQ(print, document::fingerprint(tests::designOf(document::written(design))));
    Design other = design;
    other.json["title"] = "There and not back";
    EXPECT_NE(print, document::fingerprint(other));
}

RC_GTEST_PROP(DocumentText, NoTextCrashesTheReader, (std::string text))
{
    Position position;
    const auto design = document::read(text, position);
    if (!design) RC_ASSERT(!design.failure().message.text.empty());
}

RC_GTEST_PROP(DocumentText, PointersEscapeAndUnescape, (std::string key))
{
    const auto tokens = document::pointerTokens(document::pointerTo("/a", key));
    RC_ASSERT(tokens.has_value());
    RC_ASSERT(tokens->size() == 2U);
    RC_ASSERT(tokens->back() == key);
}
