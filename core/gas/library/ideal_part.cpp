#include "core/gas/library/ideal_part.h"

#include <algorithm>

namespace quasistat::gas
{
namespace
{

double heatCapacityAt(const std::array<double, 5> &a, double t)
{
    return a[0] + t * (a[1] + t * (a[2] + t * (a[3] + t * a[4])));
}

std::array<double, 5> coefficientsOf(const std::vector<double> &row)
{
    std::array<double, 5> a{};
    std::copy_n(row.begin(), std::min(row.size(), a.size()), a.begin());
    return a;
}

} // namespace

HeatCapacity heatCapacityOf(const IdealGasData &data)
{
    std::vector<HeatCapacityPiece> pieces;
    const double coldest = data.limits.front();
    const double hottest = data.limits.back();
    if (coldest > coldestIdealPart)
        pieces.push_back({.from = coldestIdealPart,
                          .to = coldest,
                          .a = {heatCapacityAt(coefficientsOf(data.rows.front()), coldest)}});
    for (std::size_t i = 0; i < data.rows.size(); ++i)
        pieces.push_back({.from = data.limits[i], .to = data.limits[i + 1], .a = coefficientsOf(data.rows[i])});
    if (hottest < hottestIdealPart)
        pieces.push_back({.from = hottest,
                          .to = hottestIdealPart,
                          .a = {heatCapacityAt(coefficientsOf(data.rows.back()), hottest)}});
    return HeatCapacity(std::move(pieces));
}

} // namespace quasistat::gas
