#include "core/gas/phase/boundary_trace.h"

#include <algorithm>
#include <array>
#include <cmath>

namespace quasistat::gas
{
namespace
{

// Distance at which the critical point is leapt over. Both phases' equations differ there by its third power: nearer,
// rounding would be felt in T (0.04³ leaves 1e-10), and farther, the leap would be wide.
constexpr double nearestToCritical = 0.04;
constexpr double longestStep = 1.5; // of any logarithm between nodes
constexpr double shortestStep = 1e-4;
constexpr double predictedWithin = 1e-3; // ln T of a node by its neighbour's tangent: keeps nodes close where it bends
constexpr std::size_t mostNodes = 600;

struct Cubic {
    double h00, h10, h01, h11;
};
Cubic hermite(double s)
{
    const double r = 1.0 - s;
    return {(1.0 + 2.0 * s) * r * r, s * r * r, s * s * (3.0 - 2.0 * s), -s * s * r};
}

double between(const Cubic &cubic, double width, double a, double slopeA, double b, double slopeB)
{
    return cubic.h00 * a + cubic.h01 * b + width * (cubic.h10 * slopeA + cubic.h11 * slopeB);
}

/// ln T from values and slopes of four nodes: Newton's divided differences with every node taken twice.
double throughFour(const BoundaryTrace::Node *nodes, double lnDensity)
{
    constexpr std::size_t count = 8;
    std::array<double, count> x;
    std::array<double, count> difference;
    for (std::size_t i = 0; i < count; ++i) {
        x[i] = nodes[i / 2].lnDensity;
        difference[i] = nodes[i / 2].lnTemperature;
    }
    for (std::size_t order = 1; order < count; ++order)
        for (std::size_t i = count - 1; i >= order; --i) {
            const bool isTwice = order == 1 && i % 2 == 1;
            difference[i] = isTwice ? nodes[i / 2].slope : (difference[i] - difference[i - 1]) / (x[i] - x[i - order]);
        }
    double value = difference[count - 1];
    for (std::size_t i = count - 1; i-- > 0;) value = difference[i] + (lnDensity - x[i]) * value;
    return value;
}

BoundaryTrace::Node node(const IncipientPhase &phase, const IncipientState &state, const IncipientState &slopes)
{
    return {.lnDensity = state[phase.density()],
            .lnTemperature = state[phase.temperature()],
            .slope = slopes[phase.temperature()],
            .distance = phase.distance(state),
            .state = state,
            .slopes = slopes};
}

/// One walk along the solutions.
class Walk
{
public:
    Walk(IncipientPhase &phase, IncipientState state, double direction)
        : m_phase(phase), m_state(std::move(state)), m_direction(direction)
    {
    }

    /// d(state)/d ln ρ here; none where the branch turns back.
    [[nodiscard]] std::optional<IncipientState> slopes()
    {
        // The unknown that moves most is the best one to be given: near the critical point ln ρ decides nothing.
        std::optional<IncipientState> tangent = m_phase.tangent(m_state, m_given);
        if (!tangent) return std::nullopt;
        const double byDensity = (*tangent)[m_phase.density()];
        if (std::abs(byDensity) < 1e-9) return std::nullopt;
        for (double &value : *tangent) value /= byDensity;
        return tangent;
    }

    [[nodiscard]] bool advance(const IncipientState &slopes)
    {
        choose(slopes);
        for (double step = m_step; step > shortestStep; step *= 0.4) {
            IncipientState next = m_state;
            const double by = leap(slopes, step);
            for (std::size_t k = 0; k < next.size(); ++k) next[k] += by * slopes[k];
            const double predicted = next[m_phase.temperature()];
            const double distance = m_phase.distance(next);
            if (!m_phase.solve(next, m_given) || !isNext(next, distance)) continue;
            const double miss = std::abs(next[m_phase.temperature()] - predicted);
            if (miss > 4.0 * predictedWithin) continue;
            m_step = std::clamp(step * std::sqrt(predictedWithin / std::max(miss, predictedWithin / 4.0)),
                                2.0 * shortestStep, longestStep);
            if (m_phase.steps() > 6) m_step = std::max(0.5 * step, 2.0 * shortestStep);
            m_state = std::move(next);
            return true;
        }
        return false;
    }

    [[nodiscard]] const IncipientState &state() const { return m_state; }

private:
    void choose(const IncipientState &slopes)
    {
        m_given = 0;
        for (std::size_t k = 1; k < slopes.size(); ++k)
            if (std::abs(slopes[k]) > std::abs(slopes[m_given])) m_given = k;
    }

    /// The change of ln ρ that moves the given unknown by `step`, and no further than suits the critical point.
    [[nodiscard]] double leap(const IncipientState &slopes, double step)
    {
        const double rate = std::abs(slopes[m_given]);
        const std::size_t farthest = greatest();
        const double distance = std::abs(m_state[farthest]);
        const double approach = -m_direction * slopes[farthest] * (m_state[farthest] > 0.0 ? 1.0 : -1.0);
        if (distance > 1.0) return m_direction * step / rate;
        if (approach <= 0.0) return m_direction * std::min(step / rate, 1.5 * distance / std::abs(approach));
        m_given = farthest;
        if (distance <= 1.1 * nearestToCritical) return m_direction * 2.0 * distance / approach;
        const double left = distance < 4.0 * nearestToCritical ? nearestToCritical : 0.4 * distance;
        return m_direction * std::min(step / rate, (distance - left) / approach);
    }

    [[nodiscard]] std::size_t greatest() const
    {
        std::size_t index = 0;
        for (std::size_t k = 1; k <= m_phase.densityRatio(); ++k)
            if (std::abs(m_state[k]) > std::abs(m_state[index])) index = k;
        return index;
    }

    [[nodiscard]] bool isNext(const IncipientState &next, double predictedDistance) const
    {
        // Less than that is a cusp, where the trace itself is about to become unstable: another branch goes on there.
        constexpr double least = 1e-5;
        const bool goesOn = m_direction * (next[m_phase.density()] - m_state[m_phase.density()]) > least;
        return goesOn && m_phase.distance(next) > 0.3 * std::min(predictedDistance, 1.0);
    }

    IncipientPhase &m_phase;
    IncipientState m_state;
    double m_direction;
    std::size_t m_given = m_phase.temperature();
    double m_step = 0.3;
};

} // namespace

BoundaryTrace::BoundaryTrace(IncipientPhase &phase, const IncipientState &start, double closestPacking,
                             double lowestTemperature)
{
    const double lnPacking = std::log(closestPacking);
    const double lnLowest = std::log(lowestTemperature);
    follow(phase, start, -1.0, lnPacking + std::log(1e-14), lnLowest);
    std::ranges::reverse(m_nodes);
    if (!m_nodes.empty()) m_nodes.pop_back(); // the start, which the other way begins with again
    follow(phase, start, 1.0, lnPacking + std::log(0.97), lnLowest);
    refine(phase);
}

void BoundaryTrace::follow(IncipientPhase &phase, const IncipientState &start, double direction, double lnLimit,
                           double lnLowestTemperature)
{
    Walk walk(phase, start, direction);
    for (std::size_t count = 0; count < mostNodes; ++count) {
        const std::optional<IncipientState> slopes = walk.slopes();
        if (!slopes) return;
        const IncipientState &state = walk.state();
        m_nodes.push_back(node(phase, state, *slopes));
        const Node &last = m_nodes.back();
        m_isComplete = (last.lnTemperature < lnLowestTemperature && direction * last.slope < 0.0) ||
                       direction * (last.lnDensity - lnLimit) > 0.0;
        if (m_isComplete) return;
        if (!walk.advance(*slopes)) return;
    }
}

/// Of ln T: h⁴/384 of the fourth derivative, which the third derivatives of this cubic and its neighbours tell.
double BoundaryTrace::interpolationError(std::size_t interval) const
{
    const auto third = [this](std::size_t k) {
        const Node &a = m_nodes[k];
        const Node &b = m_nodes[k + 1];
        const double h = b.lnDensity - a.lnDensity;
        return (12.0 * (a.lnTemperature - b.lnTemperature) / h + 6.0 * (a.slope + b.slope)) / (h * h);
    };
    const auto width = [this](std::size_t k) { return m_nodes[k + 1].lnDensity - m_nodes[k].lnDensity; };
    const double h = width(interval);
    double fourth = 0.0;
    for (const std::size_t lower : {interval - 1, interval})
        if (lower < m_nodes.size() && lower + 2 < m_nodes.size())
            fourth =
                std::max(fourth, std::abs(third(lower + 1) - third(lower)) / (0.5 * (width(lower) + width(lower + 1))));
    return fourth * h * h * h * h / 384.0;
}

void BoundaryTrace::refine(IncipientPhase &phase)
{
    constexpr double tolerated = 3e-5;
    constexpr int passes = 3;
    for (int pass = 0; pass < passes; ++pass) {
        std::vector<Node> added;
        for (std::size_t k = 0; k + 1 < m_nodes.size(); ++k) {
            if (interpolationError(k) < tolerated || leapsCriticalPoint(k)) continue;
            const double middle = 0.5 * (m_nodes[k].lnDensity + m_nodes[k + 1].lnDensity);
            IncipientState state = near(middle);
            const double expected = state[phase.temperature()];
            constexpr double wrong = 0.01; // another branch
            if (!phase.solve(state, phase.density()) || std::abs(state[phase.temperature()] - expected) > wrong)
                continue;
            const std::optional<IncipientState> slopes = phase.tangent(state, phase.density());
            if (slopes) added.push_back(node(phase, state, *slopes));
        }
        if (added.empty()) return;
        m_nodes.insert(m_nodes.end(), added.begin(), added.end());
        std::ranges::sort(m_nodes, {}, &Node::lnDensity);
    }
}

std::size_t BoundaryTrace::interval(double lnDensity) const
{
    const auto above = std::ranges::upper_bound(m_nodes, lnDensity, {}, &Node::lnDensity);
    const auto index = static_cast<std::size_t>(above - m_nodes.begin());
    return std::clamp<std::size_t>(index, 1, m_nodes.size() - 1) - 1;
}

std::optional<double> BoundaryTrace::lnTemperature(double lnDensity) const
{
    if (m_nodes.size() < 2 || lnDensity < m_nodes.front().lnDensity || lnDensity > m_nodes.back().lnDensity)
        return std::nullopt;
    const std::size_t k = interval(lnDensity);
    const Node &a = m_nodes[k];
    const Node &b = m_nodes[k + 1];
    if (leapsCriticalPoint(k) && k > 0 && k + 2 < m_nodes.size()) return throughFour(&m_nodes[k - 1], lnDensity);
    const double width = b.lnDensity - a.lnDensity;
    return between(hermite((lnDensity - a.lnDensity) / width), width, a.lnTemperature, a.slope, b.lnTemperature,
                   b.slope);
}

IncipientState BoundaryTrace::near(double lnDensity) const
{
    const std::size_t k = interval(lnDensity);
    const Node &a = m_nodes[k];
    const Node &b = m_nodes[k + 1];
    const double width = b.lnDensity - a.lnDensity;
    const Cubic cubic = hermite((lnDensity - a.lnDensity) / width);
    IncipientState state(a.state.size());
    for (std::size_t i = 0; i < state.size(); ++i)
        state[i] = between(cubic, width, a.state[i], a.slopes[i], b.state[i], b.slopes[i]);
    state.back() = lnDensity;
    return state;
}

bool BoundaryTrace::leapsCriticalPoint(std::size_t interval) const
{
    return std::max(m_nodes[interval].distance, m_nodes[interval + 1].distance) < 1.5 * nearestToCritical;
}

bool BoundaryTrace::isCritical(double lnDensity) const
{
    return leapsCriticalPoint(interval(lnDensity));
}

} // namespace quasistat::gas
