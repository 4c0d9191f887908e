#include "core/path/phase_crossings.h"

#include "core/gas/equation/equation.h"
#include "core/path/along_curve.h"

#include <boost/math/tools/minima.hpp>
#include <boost/math/tools/toms748_solve.hpp>

#include <algorithm>
#include <cmath>
#include <optional>

namespace quasistat::path
{
namespace
{

using units::Quantity;

/// Nodes per unit of ln v (or ln T): a dome is wider than this but for its very top.
constexpr double nodesPerUnit = 12.0;
constexpr int fewestNodes = 16;
constexpr int mostNodes = 400;
/// A curve that comes this near the boundary (relative to T) between two nodes may touch it there.
constexpr double nearBoundary = 0.05;
/// Closer than this the interpolated boundary does not tell the side.
constexpr double interpolation = 6e-4;
/// Stands for the distance of a state under the boundary that the gas does not compute.
constexpr double condensed = -1e-3;

class Crossings
{
public:
    Crossings(const QuasiStaticCurve &curve, const gas::PhaseBoundary &boundary) : m_curve(curve), m_boundary(boundary)
    {
    }

    std::vector<CrossingPoint> between(double from, double to)
    {
        const double length = std::abs(to - from);
        const int nodes =
            std::min(mostNodes, std::max(fewestNodes, static_cast<int>(std::ceil(length * nodesPerUnit))));
        Node before;
        Node last{from, distance(from)};
        for (int i = 1; i <= nodes; ++i) {
            const double x = i == nodes ? to : from + (to - from) * i / nodes;
            const Node here{x, distance(x)};
            if (!here.distance) break; // the curve leaves the model
            if (last.distance) {
                if (i > 1 && before.distance) lookForTouch(before, last, here);
                if (*last.distance * *here.distance < 0.0) addCrossing(last, here);
            }
            before = last;
            last = here;
        }
        return std::move(m_points);
    }

private:
    struct Node {
        double x = 0.0;
        std::optional<double> distance;
    };

    /// ln T above the boundary: positive where the fluid is homogeneous. `exact`: the boundary without interpolation.
    std::optional<double> distance(double x, bool exact = false) const
    {
        const auto point = m_curve.at(x);
        if (!point && point.failure().reason == Reason::condenses) return condensed;
        if (!point) return std::nullopt;
        const double T = point->state.temperature;
        const double v = point->state.molarVolume;
        double boundary = m_boundary.temperatureNear(v);
        if (!(boundary > 0.0)) return 1.0; // the isochore meets none
        if (exact || std::abs(T / boundary - 1.0) < interpolation) boundary = m_boundary.temperatureAt(v);
        return std::log(T / boundary);
    }

    /// Two crossings between three nodes that are all on one side.
    void lookForTouch(const Node &a, const Node &b, const Node &c)
    {
        const bool isNearest =
            std::abs(*b.distance) < std::abs(*a.distance) && std::abs(*b.distance) < std::abs(*c.distance);
        const bool oneSide = *a.distance > 0.0 && *b.distance > 0.0 && *c.distance > 0.0;
        if (!isNearest || !oneSide || *b.distance > nearBoundary) return;
        constexpr int bits = 20;
        const auto [x, closest] = boost::math::tools::brent_find_minima(
            [&](double at) { return distance(at).value_or(1.0); }, std::min(a.x, c.x), std::max(a.x, c.x), bits);
        if (closest >= 0.0) return;
        const Node inside{x, closest};
        addCrossing(a, inside);
        addCrossing(inside, c);
    }

    void addCrossing(const Node &a, const Node &b)
    {
        const double sign = b.x > a.x ? 1.0 : -1.0;
        const auto exact = [&](double u) { return distance(sign * u, true).value_or(0.0); };
        const double low = sign * a.x;
        const double high = sign * b.x;
        const double atLow = exact(low);
        const double atHigh = exact(high);
        const bool enters = *b.distance < 0.0;
        // The homogeneous side of the bracket: there every gas has a state. Where the crossing lies within the
        // interpolation's error of a node there is nothing to narrow down.
        double at = enters ? low : high;
        if (atLow * atHigh < 0.0) {
            std::uintmax_t steps = 100;
            const auto bracket = boost::math::tools::toms748_solve(
                exact, low, high, atLow, atHigh, boost::math::tools::eps_tolerance<double>(50), steps);
            at = enters ? bracket.first : bracket.second;
        }
        const auto point = m_curve.at(sign * at);
        if (point) m_points.push_back({sign * at, point->state, enters});
    }

    const QuasiStaticCurve &m_curve;
    const gas::PhaseBoundary &m_boundary;
    std::vector<CrossingPoint> m_points;
};

} // namespace

std::vector<CrossingPoint> phaseCrossings(const QuasiStaticCurve &curve, double from, double to)
{
    const gas::Equation *equation = curve.gas().equation();
    if (!equation || !equation->boundary || from == to) return {};
    return Crossings(curve, *equation->boundary).between(from, to);
}

std::optional<CrossingPoint> firstCondensation(const gas::State &from, const Law &law)
{
    constexpr double farthest = 12.0; // five decades of volume
    const QuasiStaticCurve curve(from.sharedGas(), from.amount(), from.molar(), law, 0.0);
    std::optional<CrossingPoint> nearest;
    for (const double end : {-farthest, farthest})
        for (const CrossingPoint &point : phaseCrossings(curve, 0.0, end)) {
            if (!point.entersTwoPhase) continue;
            if (!nearest || std::abs(point.coordinate) < std::abs(nearest->coordinate)) nearest = point;
            break;
        }
    return nearest;
}

Outcome<std::vector<double>> unevenPoints(const QuasiStaticCurve &curve, const std::vector<double> &temperatureTurns,
                                          const std::vector<CrossingPoint> &crossings)
{
    auto points = seamCrossings(curve, temperatureTurns);
    if (!points) return points;
    for (const CrossingPoint &crossing : crossings) points->push_back(crossing.coordinate);
    std::ranges::sort(*points, [&](double a, double b) { return curve.endCoordinate() > 0.0 ? a < b : a > b; });
    return points;
}

bool computesTwoPhaseStates(const gas::Gas &gas)
{
    return !gas.equation() || !gas.equation()->boundary || gas.equation()->saturation;
}

Failure condensesAt(const CrossingPoint &point, double amount)
{
    return {
        Reason::condenses,
        "",
        {"the gas begins to condense at {0}, {1} and {2} on this segment, and its model stops there: end the segment "
         "before this dew point, or take a reference equation of a single gas, which goes on",
         {Figure{Quantity::pressure, point.state.pressure}, Figure{Quantity::temperature, point.state.temperature},
          Figure{Quantity::volume, amount * point.state.molarVolume}}}};
}

} // namespace quasistat::path
