#include "core/path/search_on_law.h"

#include <boost/math/tools/toms748_solve.hpp>

#include <algorithm>
#include <cmath>
#include <limits>

namespace quasistat::path
{
namespace
{

constexpr double firstStep = 0.05;
constexpr double growth = 1.3;

struct Met {
    double lowest = std::numeric_limits<double>::infinity();
    double highest = -std::numeric_limits<double>::infinity();
    void add(double value)
    {
        lowest = std::min(lowest, value);
        highest = std::max(highest, value);
    }
};

class March
{
public:
    March(const QuasiStaticCurve &curve, const AlongCurve &figure, double target, Met &met)
        : m_curve(curve), m_figure(figure), m_target(target), m_met(met)
    {
    }

    /// Coordinate of the first crossing in the direction of `sign`; none if the march ends before.
    std::optional<double> firstCrossing(double sign)
    {
        double x = 0.0;
        auto offset = offsetAt(0.0);
        double step = firstStep * sign;
        while (offset && std::abs(x) < farthestCoordinate) {
            const double next = x + step;
            const auto nextOffset = offsetAt(next);
            if (!nextOffset) {
                // The model ends between here and there: come closer, the target may lie in the gap.
                step *= 0.5;
                if (std::abs(step) < 1e-6) return std::nullopt;
                continue;
            }
            if (*nextOffset == 0.0) return next;
            if (*offset * *nextOffset < 0.0) return crossing(x, next, *offset, *nextOffset);
            x = next;
            offset = nextOffset;
            step *= growth;
        }
        return std::nullopt;
    }

private:
    std::optional<double> offsetAt(double x)
    {
        const auto point = m_curve.at(x);
        if (!point) return std::nullopt;
        const double value = m_figure(*point);
        m_met.add(value);
        return value - m_target;
    }

    double crossing(double a, double b, double fa, double fb)
    {
        const auto offset = [&](double x) { return offsetAt(x).value_or(0.0); };
        std::uintmax_t steps = 100;
        const auto bracket = a < b ? boost::math::tools::toms748_solve(
                                         offset, a, b, fa, fb, boost::math::tools::eps_tolerance<double>(52), steps)
                                   : boost::math::tools::toms748_solve(
                                         offset, b, a, fb, fa, boost::math::tools::eps_tolerance<double>(52), steps);
        return 0.5 * (bracket.first + bracket.second);
    }

    const QuasiStaticCurve &m_curve;
    const AlongCurve &m_figure;
    double m_target;
    Met &m_met;
};

Message rangeMet(EndKey key, const Met &met)
{
    const units::Quantity quantity = quantityOf(key);
    return {"it can reach from {0} to {1}", {Figure{quantity, met.lowest}, Figure{quantity, met.highest}}};
}

} // namespace

Outcome<EndPoint> searchOnLaw(const gas::State &from, const Law &law, EndKey key, double value,
                              const AlongCurve &figure, std::optional<Direction> direction)
{
    const QuasiStaticCurve curve(from.sharedGas(), from.amount(), from.molar(), law, 0.0);
    const auto here = curve.at(0.0);
    if (!here) return here.failure();
    if (figure(*here) == value) return EndPoint{0.0, from.molar(), {}};

    Met met;
    March march(curve, figure, value, met);
    std::optional<double> compressing;
    std::optional<double> expanding;
    if (direction != Direction::expand) compressing = march.firstCrossing(-1.0);
    if (direction != Direction::compress) expanding = march.firstCrossing(1.0);
    if (compressing && expanding)
        return Failure{Reason::ambiguous,
                       "/end/direction",
                       {"both directions reach {0}: “direction” must be “compress” or “expand”",
                        {Figure{quantityOf(key), value}}}};
    if (!compressing && !expanding) return unreachable(key, value, rangeMet(key, met));
    const double x = compressing ? *compressing : *expanding;
    const auto state = curve.at(x);
    if (!state) return state.failure();
    return EndPoint{x, state->state, {}};
}

} // namespace quasistat::path
