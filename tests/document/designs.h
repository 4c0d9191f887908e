#pragma once
// Small documents that tests start from.

#include "core/document/design.h"
#include "core/document/interpret.h"

#include <gtest/gtest.h>

#include <string>
#include <string_view>

namespace quasistat::tests
{

/// Up and back: isothermal, isobaric to the first temperature of another kind, polytropic, and home.
inline constexpr std::string_view plainText = R"({
  "quasistat": 1,
  "title": "There and back",
  "gas": {"model": "perfect", "heat_capacity_ratio": 1.4, "molar_mass": "28.96 g/mol"},
  "surroundings": {"pressure": "1 bar", "temperature": "20 °C"},
  "start": {"pressure": "1 bar", "temperature": "300 K", "volume": "2 L"},
  "segments": [
    {"kind": "polytropic", "exponent": 1.3, "end": {"pressure": "8 bar"}, "label": "compress"},
    {"kind": "isobaric", "end": {"temperature": "@1"}},
    {"kind": "isothermal", "end": {"volume": "@1"}}
  ],
  "limits": [{"quantity": "temperature", "max": "150 °C", "label": "discharge"}],
  "rate": "600 1/min"
}
)";

inline document::Design designOf(std::string_view text)
{
    document::Position position;
    auto design = document::read(text, position);
    EXPECT_TRUE(design.ok()) << text;
    return design ? *design : document::Design{};
}

inline document::Design plainDesign()
{
    return designOf(plainText);
}

/// The path of a design that can be computed as a whole.
inline path::PathResult pathOf(const document::Design &design)
{
    static const gas::Library library;
    auto evaluation = document::evaluate(design, library);
    EXPECT_TRUE(evaluation.ok()) << (evaluation ? "" : evaluation.failure().message.text);
    return evaluation ? evaluation->path : path::PathResult{};
}

} // namespace quasistat::tests
