#include "core/gas/phase/saturation_table.h"

#include <algorithm>
#include <cassert>
#include <cmath>
#include <span>

namespace quasistat::gas
{
namespace
{

/// The cubic through the four points about `x`, kept between its two neighbours' values; `xs` runs one way.
double cubicThrough(std::span<const double> xs, std::span<const double> ys, double x)
{
    const bool ascending = xs.back() > xs.front();
    const auto it = ascending ? std::lower_bound(xs.begin(), xs.end(), x)
                              : std::lower_bound(xs.begin(), xs.end(), x, std::greater<>());
    const auto index = it - xs.begin();
    const auto last = static_cast<std::ptrdiff_t>(xs.size()) - 4;
    const auto first = static_cast<std::size_t>(std::clamp<std::ptrdiff_t>(index - 2, 0, last));
    double sum = 0.0;
    for (std::size_t i = first; i < first + 4; ++i) {
        double weight = ys[i];
        for (std::size_t j = first; j < first + 4; ++j)
            if (j != i) weight *= (x - xs[j]) / (xs[i] - xs[j]);
        sum += weight;
    }
    const auto right = static_cast<std::size_t>(std::clamp<std::ptrdiff_t>(index, 1, last + 3));
    return std::clamp(sum, std::min(ys[right - 1], ys[right]), std::max(ys[right - 1], ys[right]));
}

} // namespace

SaturationTable::SaturationTable(const CriticalPoint &critical, std::vector<Node> nodes)
    : m_critical(critical), m_nodes(std::move(nodes))
{
    assert(m_nodes.size() >= 4 && m_nodes.front().w > 0.0);
    m_nodes.insert(m_nodes.begin(), {0.0, critical.density, critical.density, critical.pressure});
    for (const Node &node : m_nodes) {
        m_w.push_back(node.w);
        m_vapour.push_back(std::log(node.vapourDensity));
        m_liquid.push_back(std::log(node.liquidDensity));
        m_pressure.push_back(std::log(node.pressure));
    }
    m_liquidEnd = static_cast<std::size_t>(std::max_element(m_liquid.begin(), m_liquid.end()) - m_liquid.begin()) + 1;
}

double SaturationTable::coordinateOf(double temperature) const
{
    return std::cbrt(std::max(0.0, 1.0 - temperature / m_critical.temperature));
}

SaturatedDensities SaturationTable::densities(double temperature) const
{
    const double w = coordinateOf(temperature);
    return {std::exp(cubicThrough(m_w, m_liquid, w)), std::exp(cubicThrough(m_w, m_vapour, w))};
}

double SaturationTable::temperatureAtDensity(double density) const
{
    const double x = std::log(density);
    if (density <= m_critical.density) return x < m_vapour.back() ? 0.0 : temperatureOf(cubicThrough(m_vapour, m_w, x));
    if (x > m_liquid[m_liquidEnd - 1]) return 0.0;
    return temperatureOf(cubicThrough(std::span(m_liquid).first(m_liquidEnd), m_w, x));
}

double SaturationTable::temperatureAtPressure(double pressure) const
{
    return temperatureOf(cubicThrough(m_pressure, m_w, std::log(pressure)));
}

} // namespace quasistat::gas
