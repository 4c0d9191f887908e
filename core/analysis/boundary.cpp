#include "core/analysis/envelope.h"
#include "core/analysis/rating.h"

#include <boost/math/tools/toms748_solve.hpp>

#include <algorithm>
#include <cmath>
#include <functional>
#include <limits>

namespace quasistat::analysis
{
namespace
{

/// The pressure at which one limit bites at a volume; none where it does not bite there.
using PressureAt = std::function<std::optional<double>(double volume)>;

struct Edge {
    std::size_t limit;
    PressureAt pressureAt;
};

PressureAt isotherm(const gas::State &charge, double temperature)
{
    const gas::Range hard = charge.gas().validity().hard;
    return [&charge, temperature, hard](double volume) -> std::optional<double> {
        if (!(temperature > hard.lowestTemperature && temperature < hard.highestTemperature)) return std::nullopt;
        return charge.gas().at(temperature, volume / charge.amount()).pressure;
    };
}

/// Where p(T, v) meets the falling rating; both are monotone in T, so there is one crossing.
PressureAt ratingCurve(const gas::State &charge, const std::vector<Rating> &ratings)
{
    const gas::Range hard = charge.gas().validity().hard;
    const double coldest = std::max(hard.lowestTemperature, 1.0);
    const double hottest = std::min(hard.highestTemperature, 10000.0);
    return [&charge, &ratings, coldest, hottest](double volume) -> std::optional<double> {
        const double v = volume / charge.amount();
        const auto excess = [&](double T) { return charge.gas().at(T, v).pressure - allowedPressure(ratings, T); };
        const double low = excess(coldest);
        const double high = excess(hottest);
        if (low * high > 0.0) return std::nullopt;
        std::uintmax_t steps = 100;
        const auto bracket = boost::math::tools::toms748_solve(excess, coldest, hottest, low, high,
                                                               boost::math::tools::eps_tolerance<double>(40), steps);
        return charge.gas().at(0.5 * (bracket.first + bracket.second), v).pressure;
    };
}

std::vector<Edge> upperEdges(const std::vector<Limit> &limits, const gas::State &charge)
{
    std::vector<Edge> edges;
    for (std::size_t i = 0; i < limits.size(); ++i) {
        const Limit &limit = limits[i];
        if (limit.quantity == LimitQuantity::pressure && limit.max)
            edges.push_back({i, [p = *limit.max](double) { return std::optional(p); }});
        if (limit.quantity == LimitQuantity::pressure && !limit.maxAt.empty())
            edges.push_back({i, ratingCurve(charge, limit.maxAt)});
        if (limit.quantity == LimitQuantity::temperature && limit.max)
            edges.push_back({i, isotherm(charge, *limit.max)});
    }
    return edges;
}

std::vector<Edge> lowerEdges(const std::vector<Limit> &limits, const gas::State &charge)
{
    std::vector<Edge> edges;
    for (std::size_t i = 0; i < limits.size(); ++i) {
        const Limit &limit = limits[i];
        if (limit.quantity == LimitQuantity::pressure && limit.min)
            edges.push_back({i, [p = *limit.min](double) { return std::optional(p); }});
        if (limit.quantity == LimitQuantity::temperature && limit.min)
            edges.push_back({i, isotherm(charge, *limit.min)});
    }
    return edges;
}

/// The binding one of several edges at a volume: the lowest of the upper, the highest of the lower.
struct Binding {
    std::size_t edge;
    double pressure;
};

std::optional<Binding> bindingAt(const std::vector<Edge> &edges, double volume, bool upper)
{
    std::optional<Binding> binding;
    for (std::size_t i = 0; i < edges.size(); ++i) {
        const auto p = edges[i].pressureAt(volume);
        if (!p) continue;
        if (!binding || (upper ? *p < binding->pressure : *p > binding->pressure)) binding = Binding{i, *p};
    }
    return binding;
}

/// Even in V and in ln V together, so that a steep isotherm is smooth on either axis.
std::vector<double> volumeGrid(double from, double to)
{
    constexpr int perScale = 96;
    std::vector<double> grid;
    for (int i = 0; i <= perScale; ++i) {
        const double share = static_cast<double>(i) / perScale;
        grid.push_back(from + (to - from) * share);
        grid.push_back(from * std::pow(to / from, share));
    }
    grid.front() = from;
    std::sort(grid.begin(), grid.end());
    grid.back() = to;
    return grid;
}

double volumeOfChange(const std::vector<Edge> &edges, double a, double b, std::size_t edgeAtA, bool upper)
{
    for (int i = 0; i < 60; ++i) {
        const double middle = 0.5 * (a + b);
        const auto binding = bindingAt(edges, middle, upper);
        (binding && binding->edge == edgeAtA ? a : b) = middle;
    }
    return 0.5 * (a + b);
}

void addStretches(std::vector<BoundaryStretch> &all, const std::vector<Edge> &edges, const std::vector<double> &grid,
                  bool upper)
{
    std::optional<Binding> last;
    double lastVolume = grid.front();
    for (const double volume : grid) {
        const auto binding = bindingAt(edges, volume, upper);
        if (binding && last && binding->edge != last->edge) {
            const double corner = volumeOfChange(edges, lastVolume, volume, last->edge, upper);
            const double pressure = edges[binding->edge].pressureAt(corner).value_or(binding->pressure);
            all.back().points.emplace_back(corner, pressure);
            all.push_back({edges[binding->edge].limit, upper, {{corner, pressure}}});
        } else if (binding && !last) {
            all.push_back({edges[binding->edge].limit, upper, {}});
        }
        if (binding) all.back().points.emplace_back(volume, binding->pressure);
        last = binding;
        lastVolume = volume;
    }
}

} // namespace

std::vector<BoundaryStretch> boundary(const std::vector<Limit> &limits, const gas::State &charge, const Window &window)
{
    std::vector<BoundaryStretch> stretches;
    if (charge.isEvacuated()) return stretches;

    struct VolumeLimit {
        std::size_t limit;
        double volume;
    };
    std::optional<VolumeLimit> smallest;
    std::optional<VolumeLimit> largest;
    for (std::size_t i = 0; i < limits.size(); ++i) {
        if (limits[i].quantity != LimitQuantity::volume) continue;
        if (limits[i].min && (!smallest || *limits[i].min > smallest->volume)) smallest = {i, *limits[i].min};
        if (limits[i].max && (!largest || *limits[i].max < largest->volume)) largest = {i, *limits[i].max};
    }
    // A linear axis may begin at zero, where no gas has a state.
    const double tiniest = 1e-4 * window.volume.highest;
    const double from = std::max({window.volume.lowest, tiniest, smallest ? smallest->volume : 0.0});
    const double to = std::min(window.volume.highest, largest ? largest->volume : window.volume.highest);
    if (!(from < to)) return stretches;

    const auto grid = volumeGrid(from, to);
    const auto upper = upperEdges(limits, charge);
    const auto lower = lowerEdges(limits, charge);
    addStretches(stretches, upper, grid, true);
    addStretches(stretches, lower, grid, false);
    const auto addVertical = [&](const VolumeLimit &at, bool forbiddenAbove) {
        if (at.volume < window.volume.lowest || at.volume > window.volume.highest) return;
        const auto top = bindingAt(upper, at.volume, true);
        const auto bottom = bindingAt(lower, at.volume, false);
        stretches.push_back({at.limit,
                             forbiddenAbove,
                             {{at.volume, bottom ? bottom->pressure : window.pressure.lowest},
                              {at.volume, top ? top->pressure : window.pressure.highest}}});
    };
    if (smallest) addVertical(*smallest, false);
    if (largest) addVertical(*largest, true);
    return stretches;
}

} // namespace quasistat::analysis
