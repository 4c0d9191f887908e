#pragma once
// What a report is made of: pieces that are never cut, in reading order, and the pages they come to lie on.

#include "ui/report/page.h"

#include <QPainter>

#include <functional>
#include <memory>
#include <vector>

namespace quasistat::ui
{

/// A piece of the report as wide as the text area.
struct Block {
    double height = 0.0; ///< [page units]
    /// Draws it with its upper left corner at the point; the painter's units are page units.
    std::function<void(QPainter &, QPointF)> paint;
    /// Stays on the page of the block after it: a heading with its text, a table's last rows together.
    bool keepWithNext = false;
    /// What is drawn again above this block where it begins a page: the head of its table.
    std::shared_ptr<const Block> runningHead;
};

struct PlacedBlock {
    const Block *block;
    QPointF at;
};
using PagePlan = std::vector<PlacedBlock>;

/// Distributes `blocks` over pages of `area`. A block higher than a page gets one of its own.
[[nodiscard]] std::vector<PagePlan> paginated(const std::vector<Block> &blocks, const QRectF &area);

/// An empty height between two blocks; vanishes at the top of a page.
[[nodiscard]] Block space(double pixels);

} // namespace quasistat::ui
