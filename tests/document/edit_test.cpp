#include "designs.h"

#include "core/document/edit.h"

#include <cmath>

using namespace quasistat;
using document::Design;
using document::Edited;
using document::Json;

namespace
{

/// Five segments that refer to one another.
Design chained()
{
    return tests::designOf(R"({
      "quasistat": 1,
      "gas": {"model": "perfect", "heat_capacity_ratio": 1.4, "molar_mass": "28.96 g/mol"},
      "surroundings": {"pressure": "1 bar", "temperature": "20 °C"},
      "start": {"pressure": "1 bar", "temperature": "300 K", "volume": "2 L"},
      "segments": [
        {"kind": "isothermal", "end": {"pressure": "4 bar"}},
        {"kind": "isobaric", "end": {"temperature": "400 K"}},
        {"kind": "isothermal", "end": {"volume": "@2"}},
        {"kind": "constant-external-pressure", "external_pressure": "@3"},
        {"kind": "linear", "end": {"state": 2}}
      ]})");
}

Json endOf(const Edited &edited, std::size_t index)
{
    return edited.design.json.at("segments").at(index).value("end", Json());
}

Json externalPressureOf(const Edited &edited, std::size_t index)
{
    return edited.design.json.at("segments").at(index).at("external_pressure");
}

} // namespace

TEST(Edit, ReferencesFollowTheirStateWhenASegmentIsInserted)
{
    const Design design = chained();
    const Edited edited = document::segmentInserted(
        design, 1, Json{{"kind", "isochoric"}, {"end", {{"temperature", "350 K"}}}}, tests::pathOf(design));
    EXPECT_TRUE(edited.remarks.empty());
    EXPECT_EQ(edited.design.json["segments"].size(), 6U);
    EXPECT_EQ(endOf(edited, 3)["volume"], "@2"); // before the new segment: unmoved
    EXPECT_EQ(externalPressureOf(edited, 4), "@4");
    EXPECT_EQ(endOf(edited, 5)["state"], 2);
    const Edited atStart = document::segmentInserted(design, 0, Json{{"kind", "isobaric"}}, tests::pathOf(design));
    EXPECT_EQ(endOf(atStart, 3)["volume"], "@3");
}

TEST(Edit, AReferenceToADeletedStateBecomesTheValueItHad)
{
    const Design design = chained();
    const Edited edited = document::segmentDeleted(design, 0, tests::pathOf(design));
    ASSERT_EQ(edited.design.json["segments"].size(), 4U);
    EXPECT_EQ(endOf(edited, 1)["volume"], "0.5 L"); // pV = const from 1 bar, 2 L to 4 bar
    EXPECT_EQ(externalPressureOf(edited, 2), "@2");
    const Json arrival = endOf(edited, 3);
    EXPECT_EQ(arrival["pressure"], "4 bar");
    EXPECT_EQ(arrival["volume"], "0.5 L");
    ASSERT_EQ(edited.remarks.size(), 2U);
    EXPECT_EQ(edited.remarks[0].pointer, "/segments/1/end/volume");
    EXPECT_EQ(edited.remarks[1].pointer, "/segments/3/end");
}

TEST(Edit, AReferenceThatWouldPointAheadBecomesTheValueItHad)
{
    const Design design = chained();
    // "isothermal to @2" before the segment that ends in state 2.
    const Edited edited = document::segmentMoved(design, 2, 0, tests::pathOf(design));
    EXPECT_EQ(endOf(edited, 0)["volume"], "0.5 L");
    EXPECT_EQ(externalPressureOf(edited, 3), "@4"); // the state after the isobaric, now segment 3
    EXPECT_EQ(endOf(edited, 4)["state"], 3);
    ASSERT_EQ(edited.remarks.size(), 1U);
    EXPECT_EQ(edited.remarks[0].pointer, "/segments/0/end/volume");
}

TEST(Edit, MovingThereAndBackRestoresReferences)
{
    const Design design = chained();
    const path::PathResult before = tests::pathOf(design);
    const Edited away = document::segmentMoved(design, 1, 2, before);
    const Edited back = document::segmentMoved(away.design, 2, 1, before);
    EXPECT_EQ(back.design.json["segments"][4], design.json["segments"][4]);
    EXPECT_EQ(back.design.json["segments"][2], design.json["segments"][2]);
}

TEST(Edit, ADuplicateFollowsItsOriginal)
{
    const Design design = chained();
    const Edited edited = document::segmentDuplicated(design, 2, tests::pathOf(design));
    EXPECT_EQ(edited.design.json["segments"].size(), 6U);
    EXPECT_EQ(edited.design.json["segments"][3], edited.design.json["segments"][2]);
    EXPECT_EQ(externalPressureOf(edited, 4), "@3");
}

TEST(Edit, WithoutAComputedValueTheReferenceStaysAndIsRemarkedOn)
{
    const Design design = chained();
    const Edited edited = document::segmentDeleted(design, 0, path::PathResult{});
    EXPECT_EQ(endOf(edited, 1)["volume"], "@2");
    ASSERT_FALSE(edited.remarks.empty());
}

TEST(Edit, RegeneratorsNameTheirPartnerWhereverItGoes)
{
    Design design = chained();
    design.json["segments"][0]["regenerator"] = 3;
    design.json["segments"][2]["regenerator"] = 1;
    const path::PathResult before;
    const Edited inserted = document::segmentInserted(design, 1, Json{{"kind", "isobaric"}}, before);
    EXPECT_EQ(inserted.design.json["segments"][0]["regenerator"], 4);
    const Edited deleted = document::segmentDeleted(design, 2, before);
    EXPECT_FALSE(deleted.design.json["segments"][0].contains("regenerator"));
}

TEST(Edit, UnknownKeysSurviveEveryEdit)
{
    Design design = chained();
    design.json["segments"][1]["remark"] = "keep";
    const path::PathResult before = tests::pathOf(design);
    EXPECT_EQ(document::segmentMoved(design, 1, 0, before).design.json["segments"][0]["remark"], "keep");
    EXPECT_EQ(document::kindChanged(design, 1, path::Kind::isochoric, before).design.json["segments"][1]["remark"],
              "keep");
}

TEST(Edit, OutOfRangeNothingHappens)
{
    const Design design = chained();
    const path::PathResult before;
    EXPECT_EQ(document::segmentDeleted(design, 9, before).design, design);
    EXPECT_EQ(document::segmentMoved(design, 0, 9, before).design, design);
    EXPECT_EQ(document::segmentDuplicated(design, 9, before).design, design);
    EXPECT_EQ(document::kindChanged(design, 9, path::Kind::isobaric, before).design, design);
}

TEST(Edit, AValueIsSetAtItsPointer)
{
    const Design design = chained();
    EXPECT_EQ(document::valueSet(design, "/segments/0/end/pressure", "9 bar")->json["segments"][0]["end"]["pressure"],
              "9 bar");
    EXPECT_EQ(document::valueSet(design, "/gas/heat_capacity_ratio", "1.3")->json["gas"]["heat_capacity_ratio"], 1.3);
    EXPECT_EQ(document::valueSet(design, "/view", R"({"sign": "by the gas"})")->json["view"]["sign"], "by the gas");
    EXPECT_EQ(document::valueSet(design, "/segments/-", R"({"kind": "isobaric"})")->json["segments"].size(), 6U);
    EXPECT_EQ(document::valueSet(design, "/no/parent", "1").failure().reason, Reason::missing);
    EXPECT_EQ(document::valueSet(design, "/segments/7", "1").failure().reason, Reason::missing);
    EXPECT_EQ(document::valueSet(design, "", "1").failure().reason, Reason::syntax);
    EXPECT_EQ(document::valueSet(design, "title", "1").failure().reason, Reason::syntax);
}
