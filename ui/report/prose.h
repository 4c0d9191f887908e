#pragma once
// Headings, paragraphs and the framed caution of the report.

#include "ui/look/mark.h"
#include "ui/report/block.h"
#include "ui/report/print_type.h"

#include <optional>

namespace quasistat::ui
{

/// A section's heading; `remark` stands at its right, in the second rank.
[[nodiscard]] Block heading(const QString &text, double width, const RichText &remark = {});

/// A paragraph as one block; `mark` stands before its first line.
[[nodiscard]] Block paragraph(const RichText &text, double width, std::optional<StateMark> mark = std::nullopt);

/// A framed caution, never cut.
[[nodiscard]] Block caution(const std::vector<RichText> &paragraphs, double width);

} // namespace quasistat::ui
