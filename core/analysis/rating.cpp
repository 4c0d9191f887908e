#include "core/analysis/rating.h"

#include <cassert>

namespace quasistat::analysis
{
namespace
{

/// Index of the break at or below `temperature`, or none.
std::size_t breaksBelow(const std::vector<Rating> &ratings, double temperature)
{
    std::size_t count = 0;
    while (count < ratings.size() && ratings[count].temperature <= temperature) ++count;
    return count;
}

} // namespace

double allowedPressure(const std::vector<Rating> &ratings, double temperature)
{
    assert(!ratings.empty());
    const std::size_t below = breaksBelow(ratings, temperature);
    if (below == 0) return ratings.front().pressure;
    if (below == ratings.size()) return ratings.back().pressure;
    const Rating &a = ratings[below - 1];
    return a.pressure + (temperature - a.temperature) * allowedPressureSlope(ratings, temperature);
}

double allowedPressureSlope(const std::vector<Rating> &ratings, double temperature)
{
    const std::size_t below = breaksBelow(ratings, temperature);
    if (below == 0 || below == ratings.size()) return 0.0;
    const Rating &a = ratings[below - 1];
    const Rating &b = ratings[below];
    return (b.pressure - a.pressure) / (b.temperature - a.temperature);
}

} // namespace quasistat::analysis
