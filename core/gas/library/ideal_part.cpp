#include "core/gas/library/ideal_part.h"

namespace quasistat::gas
{
namespace
{

double heatCapacityAt(const std::vector<double> &a, double t)
{
    double value = 0.0;
    for (std::size_t k = a.size(); k-- > 0;) value = value * t + a[k];
    return value;
}

} // namespace

HeatCapacity heatCapacityOf(const IdealGasData &data)
{
    std::vector<HeatCapacityPiece> pieces;
    const double coldest = data.limits.front();
    const double hottest = data.limits.back();
    if (coldest > coldestIdealPart)
        pieces.push_back({.from = coldestIdealPart, .to = coldest, .a = {heatCapacityAt(data.rows.front(), coldest)}});
    for (std::size_t i = 0; i < data.rows.size(); ++i)
        pieces.push_back({.from = data.limits[i], .to = data.limits[i + 1], .a = data.rows[i]});
    if (hottest < hottestIdealPart)
        pieces.push_back({.from = hottest, .to = hottestIdealPart, .a = {heatCapacityAt(data.rows.back(), hottest)}});
    return HeatCapacity(std::move(pieces));
}

} // namespace quasistat::gas
