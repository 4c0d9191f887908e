#pragma once
// A segment in the user's own words, as its card says it.

#include "core/path/result.h"
#include "ui/look/rich_text.h"
#include "ui/session/design_reading.h"

namespace quasistat::ui
{

/// The label, else the kind; "segment" for one that names neither.
[[nodiscard]] QString segmentTitle(const document::Json &segment);

/// Kind and what is particular: "polytropic, n 1.300", "stepped, 5 steps". `result`: for an exponent found from two
/// ends.
[[nodiscard]] RichText kindWords(const document::Json &segment, const path::SegmentResult *result);

/// "to 10 bar", "to T₁", "to balance at 1 bar", "to state 1".
[[nodiscard]] RichText endWords(const document::Json &segment);
/// Without its first word: "balance at 1 bar".
[[nodiscard]] RichText endWordsInShort(const document::Json &segment);

} // namespace quasistat::ui
