#include "designs.h"

using namespace quasistat;
using document::Design;

TEST(DesignUnits, AreThoseOfTheStart)
{
    Design design = tests::plainDesign();
    design.json["start"] = {{"pressure", "14.5 psi"}, {"temperature", "80 degF"}, {"volume", "100 in3"}};
    const auto units = document::displayUnits(design);
    EXPECT_EQ(units.pressure, "psi");
    EXPECT_EQ(units.temperature, "degF");
    EXPECT_EQ(units.volume, "in3");
    EXPECT_TRUE(units.energy.empty());
    EXPECT_DOUBLE_EQ(units.surroundingsPressure, 1e5);
}

TEST(DesignUnits, ComeFromTheEndsWhereTheStartHasNone)
{
    Design design = tests::plainDesign();
    design.json["start"] = {{"amount", "1 mol"}, {"temperature", "300 K"}, {"volume", "2 L"}};
    design.json["segments"][0]["end"]["pressure"] = "8 MPa";
    EXPECT_EQ(document::displayUnits(design).pressure, "MPa");
}

TEST(DesignUnits, GaugeAndBarePascalsAreReadable)
{
    Design design = tests::plainDesign();
    design.json["start"]["pressure"] = "5 bar(g)";
    EXPECT_EQ(document::displayUnits(design).pressure, "bar");
    design.json["start"]["pressure"] = "5 psig";
    EXPECT_EQ(document::displayUnits(design).pressure, "psi");
    design.json["start"]["pressure"] = "200000 Pa";
    EXPECT_EQ(document::displayUnits(design).pressure, "kPa");
    design.json["start"]["volume"] = "0.002 m3";
    EXPECT_EQ(document::displayUnits(design).volume, "L");
}

TEST(DesignUnits, TheViewWins)
{
    Design design = tests::plainDesign();
    design.json["view"] = {{"units", {{"pressure", "bar(g)"}, {"energy", "kJ"}, {"volume", "furlong"}}},
                           {"sign", "by the gas"}};
    const auto units = document::displayUnits(design);
    EXPECT_EQ(units.pressure, "bar(g)");
    EXPECT_EQ(units.energy, "kJ");
    EXPECT_EQ(units.volume, "L");
    EXPECT_TRUE(units.workByGas);
    const gas::Library library;
    const auto interpretation = document::interpret(design, library);
    ASSERT_TRUE(interpretation.ok());
    ASSERT_EQ(interpretation->warnings.size(), 1U);
    EXPECT_EQ(interpretation->warnings.front().pointer, "/view/units/volume");
}
