#include "designs.h"

#include "core/document/edit.h"

#include <gtest/gtest.h>

using namespace quasistat;
using document::Design;
using document::Json;
using path::Kind;

namespace
{

Json changedTo(Kind kind, std::string_view segment)
{
    Design design = tests::plainDesign();
    design.json["segments"] = Json::array({Json::parse(segment)});
    const auto edited = document::kindChanged(design, 0, kind, tests::pathOf(design));
    return edited.design.json["segments"][0];
}

constexpr std::string_view polytropic =
    R"({"kind": "polytropic", "exponent": 1.3, "end": {"pressure": "8 bar"}, "label": "up"})";

} // namespace

TEST(KindChange, KeepsAnEndThatTheNewKindTakes)
{
    const Json isothermal = changedTo(Kind::isothermal, polytropic);
    EXPECT_EQ(isothermal.dump(), R"({"kind":"isothermal","end":{"pressure":"8 bar"},"label":"up"})");
    EXPECT_EQ(changedTo(Kind::isentropic, polytropic)["end"].dump(), R"({"pressure":"8 bar"})");
}

TEST(KindChange, GivesAnotherEndTheStateThatWasReached)
{
    // Polytropic to 8 bar: V₂ = V₁ (1/8)^(1/1.3) = 0.40395 L.
    const Json isobaric = changedTo(Kind::isobaric, polytropic);
    EXPECT_EQ(isobaric["end"].size(), 1U);
    EXPECT_TRUE(isobaric["end"]["volume"].get<std::string>().starts_with("0.4039"));
    // An isobaric segment leaves its pressure, so its end as an isochoric is given by temperature.
    const Json isochoric = changedTo(Kind::isochoric, R"({"kind": "isobaric", "end": {"volume": "3 L"}})");
    EXPECT_EQ(isochoric["end"].dump(), R"({"temperature":"450 K"})");
}

TEST(KindChange, AddsWhatTheNewKindNeeds)
{
    const Json fromIsothermal = changedTo(Kind::polytropic, R"({"kind": "isothermal", "end": {"pressure": "8 bar"}})");
    EXPECT_NEAR(fromIsothermal["exponent"].get<double>(), 1.0, 1e-9);
    EXPECT_EQ(fromIsothermal["end"].dump(), R"({"pressure":"8 bar"})");
    const Json stepped = changedTo(Kind::stepped, polytropic);
    EXPECT_EQ(stepped["steps"], 5);
    EXPECT_EQ(stepped["end"].dump(), R"({"pressure":"8 bar"})");
    const Json piston = changedTo(Kind::constantExternalPressure, polytropic);
    EXPECT_EQ(piston["external_pressure"], "8 bar");
    EXPECT_FALSE(piston.contains("end"));
    const Json linear = changedTo(Kind::linear, polytropic);
    EXPECT_EQ(linear["end"].size(), 2U);
}

TEST(KindChange, DropsKeysOfTheOldKindAlone)
{
    const Json back = changedTo(
        Kind::isothermal,
        R"({"kind": "stepped", "steps": 4, "spacing": "ratio", "thermal": "adiabatic", "end": {"pressure": "3 bar"}, "note": 1})");
    EXPECT_EQ(back.dump(), R"({"kind":"isothermal","end":{"pressure":"3 bar"},"note":1})");
    const Json kept =
        changedTo(Kind::constantExternalPressure,
                  R"({"kind": "stepped", "steps": 4, "thermal": "adiabatic", "end": {"pressure": "3 bar"}})");
    EXPECT_EQ(kept["thermal"], "adiabatic");
}

TEST(KindChange, EveryKindCanBecomeEveryOtherAndStillBeComputed)
{
    const std::string_view segments[] = {
        polytropic,
        R"({"kind": "isothermal", "end": {"volume_ratio": 2}})",
        R"({"kind": "isobaric", "end": {"heat": "50 J"}})",
        R"({"kind": "isochoric", "end": {"temperature": "350 K"}})",
        R"({"kind": "isentropic", "end": {"work": "100 J"}})",
        R"({"kind": "linear", "end": {"pressure": "2 bar", "volume": "1.5 L"}})",
        R"({"kind": "constant-external-pressure", "external_pressure": "3 bar"})",
        R"({"kind": "stepped", "steps": 3, "end": {"pressure": "3 bar"}})",
        R"({"kind": "free-expansion", "end": {"volume": "3 L"}})",
    };
    for (const std::string_view segment : segments)
        for (const path::KindFacts &row : path::kindTable) {
            Design design = tests::plainDesign();
            design.json["segments"] = Json::array({Json::parse(segment)});
            design = document::kindChanged(design, 0, row.kind, tests::pathOf(design)).design;
            const path::PathResult result = tests::pathOf(design);
            // A free expansion only grows; a state at smaller volume is out of its reach and is said to be.
            const bool reachable = row.kind != Kind::freeExpansion || !result.failures[0] ||
                                   result.failures[0]->reason == Reason::unreachable;
            if (row.kind == Kind::freeExpansion)
                EXPECT_TRUE(reachable) << segment;
            else
                EXPECT_FALSE(result.failures[0].has_value())
                    << segment << " as " << row.key << ": " << design.json["segments"][0].dump() << ": "
                    << (result.failures[0] ? result.failures[0]->pointer + " " + result.failures[0]->message.text : "");
        }
}
