#include "ui/report/block.h"

namespace quasistat::ui
{
namespace
{

/// Height of the run of blocks from `first` on that must stay together, the next one's first piece included.
double heightKept(const std::vector<Block> &blocks, std::size_t first)
{
    double height = 0.0;
    for (std::size_t i = first; i < blocks.size(); ++i) {
        height += blocks[i].height;
        if (!blocks[i].keepWithNext) break;
    }
    return height;
}

} // namespace

std::vector<PagePlan> paginated(const std::vector<Block> &blocks, const QRectF &area)
{
    std::vector<PagePlan> pages(1);
    double y = area.top();
    for (std::size_t i = 0; i < blocks.size(); ++i) {
        const Block &block = blocks[i];
        const bool atTop = pages.back().empty();
        const bool followsKept = i > 0 && blocks[i - 1].keepWithNext;
        const double needed = followsKept ? block.height : heightKept(blocks, i);
        if (!atTop && y + needed > area.bottom()) {
            pages.emplace_back();
            y = area.top();
            if (block.runningHead) {
                pages.back().push_back({block.runningHead.get(), {area.left(), y}});
                y += block.runningHead->height;
            }
        }
        if (!block.paint && pages.back().empty()) continue; // a space at the top of a page
        pages.back().push_back({&block, {area.left(), y}});
        y += block.height;
    }
    return pages;
}

Block space(double pixels)
{
    return {.height = pixels * pageUnitsPerPixel};
}

} // namespace quasistat::ui
