#pragma once
// What a gas and its model are called in the window and on paper.

#include "ui/look/rich_text.h"
#include "ui/session/session.h"

#include <QString>

#include <array>
#include <string>
#include <string_view>

namespace quasistat::ui
{

/// The models of the document in the order they are offered.
inline constexpr std::array<std::string_view, 6> gasModels{
    "perfect", "ideal", "peng-robinson", "soave-redlich-kwong", "gerg-2008", "reference"};

/// As part of a sentence: "reference equation", "Peng–Robinson", "perfect gas"; an unknown key as it stands.
[[nodiscard]] QString modelName(std::string_view model);
/// As a choice among the models: what it is good for.
[[nodiscard]] QString modelChoiceWords(std::string_view model);

/// "nitrogen, reference equation"; of a perfect gas with its γ; "methane 0.91 and 6 more, GERG-2008".
[[nodiscard]] RichText gasWords(const document::Design &design);
/// The gas alone: "nitrogen 0.78, oxygen 0.22"; empty where the document names none.
[[nodiscard]] QString gasName(const document::Design &design);

/// "63.15 K to 1000 K, up to 2200 MPa".
[[nodiscard]] QString rangeWords(const gas::Range &range, const units::DisplayUnits &units);
/// Published range and uncertainty as sentences; empty where neither is known.
[[nodiscard]] QString validityWords(const gas::Validity &validity, const units::DisplayUnits &units);

/// "nitrogen 0.78, oxygen 0.22", as the composition of a document is written in one line; and back.
[[nodiscard]] QString compositionText(const document::Json &composition);
[[nodiscard]] std::optional<document::Json> compositionFrom(const QString &text);

} // namespace quasistat::ui
