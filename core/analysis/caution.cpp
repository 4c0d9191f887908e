#include "core/analysis/caution.h"

#include <fmt/format.h>

namespace quasistat::analysis
{

std::vector<Warning> cautions(const path::PathResult &path)
{
    std::vector<Warning> result;
    for (std::size_t k = 0; k < path.segments.size(); ++k) {
        const double coldest = path.segments[k].extrema.temperature.lowest;
        if (coldest < carbonSteelLimit)
            result.push_back(
                {fmt::format("/segments/{}", k),
                 {fmt::format("Segment {} comes down to {{0}}. Below {{1}} carbon steel can turn brittle: check the "
                              "material (common practice).",
                              k + 1),
                  {Figure{units::Quantity::temperature, coldest},
                   Figure{units::Quantity::temperature, carbonSteelLimit}}}});
    }
    return result;
}

} // namespace quasistat::analysis
