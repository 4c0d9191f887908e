#pragma once
// Tables of the report: rules, figures aligned at the decimal sign, the head repeated on every page.

#include "ui/look/mark.h"
#include "ui/report/block.h"
#include "ui/report/print_type.h"

#include <optional>

namespace quasistat::ui
{

struct TableColumn {
    RichText head;
    double share; ///< of the table's width
    Align align = Align::left;
};

struct TableCell {
    RichText text;
    std::optional<StateMark> mark; ///< drawn at the cell's right edge, in the colour of what it says
};

struct TableRow {
    std::vector<TableCell> cells;
    bool strong = false; ///< a total: bold, a rule above
};

/// Figures of one column have the same decimals, so right alignment is alignment at the decimal sign. Long texts run
/// over several lines of their cell. A short table stays on one page; of a long one the last two rows stay together.
[[nodiscard]] std::vector<Block> table(const std::vector<TableColumn> &columns, const std::vector<TableRow> &rows,
                                       double width);

} // namespace quasistat::ui
