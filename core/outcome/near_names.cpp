#include "core/outcome/near_names.h"

#include <algorithm>
#include <iterator>
#include <numeric>

namespace quasistat
{

namespace
{

/// Levenshtein distance: insertions, deletions and exchanges that turn one name into the other.
std::size_t editDistance(std::string_view left, std::string_view right)
{
    std::vector<std::size_t> above(right.size() + 1);
    std::iota(above.begin(), above.end(), std::size_t{0});
    for (std::size_t i = 0; i < left.size(); ++i) {
        std::vector<std::size_t> row{i + 1};
        for (std::size_t j = 0; j < right.size(); ++j) {
            const std::size_t exchanged = above[j] + (left[i] == right[j] ? 0 : 1);
            row.push_back(std::min({exchanged, row[j] + 1, above[j + 1] + 1}));
        }
        above = std::move(row);
    }
    return above.empty() ? 0 : above.back();
}

} // namespace

std::vector<std::string_view> namesNear(std::string_view name, std::span<const std::string_view> names)
{
    constexpr std::size_t longestName = 60; // a whole paragraph pasted as a name is near nothing
    std::vector<std::string_view> near;
    if (name.size() > longestName) return near;
    const std::size_t tolerated = std::max<std::size_t>(2, name.size() / 3);
    std::ranges::copy_if(names, std::back_inserter(near), [&](std::string_view known) {
        return editDistance(name, known) <= tolerated ||
               (name.size() > 2 && known.find(name) != std::string_view::npos);
    });
    return near;
}

} // namespace quasistat
