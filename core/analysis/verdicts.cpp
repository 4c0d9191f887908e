#include "core/analysis/envelope.h"
#include "core/analysis/limit_figure.h"
#include "core/path/along_curve.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace quasistat::analysis
{
namespace
{

using path::CurveState;
using path::QuasiStaticCurve;
using path::SegmentResult;

/// A figure typed as the limit itself, reached by a solver, is not beyond it.
constexpr double rounding = 1e-9;

/// How far inside a limit a value is, relative to the limit; negative beyond it.
struct Margin {
    double value;
    double allowed;
};

Margin marginOf(const Limit &limit, const WatchedValue &watched)
{
    Margin nearest{std::numeric_limits<double>::infinity(), watched.value};
    const auto consider = [&](double allowed, double room) {
        const double scale = std::max(std::abs(allowed), std::numeric_limits<double>::min());
        if (room / scale < nearest.value) nearest = {room / scale, allowed};
    };
    if (watched.allowed) consider(*watched.allowed, *watched.allowed - watched.value);
    if (limit.max) consider(*limit.max, *limit.max - watched.value);
    if (limit.min) consider(*limit.min, watched.value - *limit.min);
    return nearest;
}

/// Judges one limit over a path and keeps the worst it has seen.
class Judge
{
public:
    Judge(const Limit &limit, std::size_t index, const path::PathResult &path, double surroundingsPressure)
        : m_limit(limit), m_path(path), m_surroundingsPressure(surroundingsPressure)
    {
        m_verdict.limit = index;
    }

    Verdict verdict()
    {
        if (isFigureOfState(m_limit.quantity))
            judgeStates();
        else if (m_limit.quantity == LimitQuantity::amount)
            judgeAmounts();
        else
            judgeSegments();
        m_verdict.ok = m_worstMargin >= -rounding;
        return std::move(m_verdict);
    }

private:
    bool consider(const WatchedValue &watched, int segment, int state)
    {
        const Margin margin = marginOf(m_limit, watched);
        if (margin.value < m_worstMargin) {
            m_worstMargin = margin.value;
            m_verdict.worst = watched.value;
            m_verdict.worstAllowed = margin.allowed;
            m_verdict.segment = segment;
            m_verdict.state = state;
        }
        return margin.value < -rounding;
    }

    void judgeAmounts()
    {
        for (std::size_t k = 0; k < m_path.states.size(); ++k) {
            const int segment = static_cast<int>(k);
            if (consider({m_path.states[k].state.amount(), std::nullopt}, segment, segment + 1) && k > 0)
                m_verdict.violations.push_back({segment, {}});
        }
    }

    void judgeSegments()
    {
        for (std::size_t k = 0; k < m_path.segments.size(); ++k)
            if (consider({figureOfSegment(m_path.segments[k]), std::nullopt}, static_cast<int>(k) + 1, 0))
                m_verdict.violations.push_back({static_cast<int>(k) + 1, {}});
    }

    [[nodiscard]] double figureOfSegment(const SegmentResult &segment) const
    {
        if (m_limit.quantity == LimitQuantity::work) return segment.work;
        if (m_limit.quantity == LimitQuantity::heat) return segment.heat;
        return segment.extrema.pressure.highest / segment.extrema.pressure.lowest;
    }

    void judgeStates()
    {
        if (m_path.states.empty() || m_path.states.front().state.isEvacuated()) return;
        if (m_path.segments.empty()) {
            const gas::State &start = m_path.states.front().state;
            if (const auto watched = figure(start).at(start.molar())) consider(*watched, 0, 1);
        }
        for (std::size_t k = 0; k < m_path.segments.size(); ++k) {
            const SegmentResult &segment = m_path.segments[k];
            const int number = static_cast<int>(k) + 1;
            if (segment.curve)
                judgeCurve(*segment.curve, number);
            else
                judgeEnds(segment, number);
        }
    }

    [[nodiscard]] LimitFigure figure(const gas::State &state) const
    {
        return {m_limit, state.amount(), state.gas(), m_surroundingsPressure};
    }

    /// Between the states of an irreversible segment the gas has no state; what is drawn between them is marked if an
    /// end is beyond.
    void judgeEnds(const SegmentResult &segment, int number)
    {
        bool beyond = false;
        if (const auto watched = figure(segment.from).at(segment.from.molar()))
            beyond = consider(*watched, number, number) || beyond;
        if (const auto watched = figure(segment.to).at(segment.to.molar()))
            beyond = consider(*watched, number, number + 1) || beyond;
        if (beyond) m_verdict.violations.push_back({number, segment.drawing.curve});
    }

    void judgeCurve(const QuasiStaticCurve &curve, int number)
    {
        const LimitFigure watch(m_limit, curve.amount(), curve.gas(), m_surroundingsPressure);
        const std::vector<double> cuts = monotoneStretches(curve, watch);
        for (std::size_t i = 0; i < cuts.size(); ++i) {
            const auto point = curve.at(cuts[i]);
            if (!point) continue;
            const int state = i == 0 ? number : i + 1 == cuts.size() ? number + 1 : 0;
            if (const auto watched = watch.at(point->state)) consider(*watched, number, state);
        }
        addViolations(curve, watch, cuts, number);
    }

    /// Ends of the curve and, between them, the roots of the figure's derivative and the breaks of a rating.
    [[nodiscard]] std::vector<double> monotoneStretches(const QuasiStaticCurve &curve, const LimitFigure &watch) const
    {
        const double end = curve.endCoordinate();
        std::vector<double> cuts{0.0};
        std::vector<double> breaks;
        for (const Rating &rating : m_limit.maxAt) {
            const auto crossing = path::signChanges(
                curve, 0.0, end, [&](const CurveState &c) { return c.state.temperature - rating.temperature; });
            if (crossing) breaks.insert(breaks.end(), crossing->begin(), crossing->end());
        }
        sortAlong(breaks, end);
        breaks.push_back(end);
        double from = 0.0;
        for (const double to : breaks) {
            const auto turns = path::signChanges(curve, from, to, [&](const CurveState &c) { return watch.slope(c); });
            if (turns) cuts.insert(cuts.end(), turns->begin(), turns->end());
            cuts.push_back(to);
            from = to;
        }
        return cuts;
    }

    static void sortAlong(std::vector<double> &coordinates, double end)
    {
        std::sort(coordinates.begin(), coordinates.end(),
                  [&](double a, double b) { return end > 0.0 ? a < b : a > b; });
    }

    void addViolations(const QuasiStaticCurve &curve, const LimitFigure &watch, const std::vector<double> &cuts,
                       int number)
    {
        const auto room = [&](const CurveState &c) {
            const auto watched = watch.at(c.state);
            return watched ? marginOf(m_limit, *watched).value + rounding : 1.0;
        };
        std::vector<double> edges{cuts.front()};
        for (std::size_t i = 0; i + 1 < cuts.size(); ++i) {
            const auto crossings = path::signChanges(curve, cuts[i], cuts[i + 1], room);
            if (crossings) edges.insert(edges.end(), crossings->begin(), crossings->end());
            edges.push_back(cuts[i + 1]);
        }
        for (std::size_t i = 0; i + 1 < edges.size();) {
            std::size_t last = i;
            while (last + 1 < edges.size() && isBeyond(curve, room, edges[last], edges[last + 1])) ++last;
            if (last > i) addStretch(curve, edges[i], edges[last], number);
            i = std::max(last, i + 1);
        }
    }

    /// Whether the curve is beyond the limit between two neighbouring edges, judged half-way, where it cannot be on it.
    template <class Room>
    static bool isBeyond(const QuasiStaticCurve &curve, const Room &room, double a, double b)
    {
        const auto middle = curve.at(0.5 * (a + b));
        return middle && room(*middle) < 0.0;
    }

    void addStretch(const QuasiStaticCurve &curve, double from, double to, int number)
    {
        constexpr int points = 32;
        path::Polyline stretch;
        for (int i = 0; i <= points; ++i) {
            const auto point = curve.at(from + (to - from) * i / points);
            if (!point) continue;
            const gas::MolarState &s = point->state;
            stretch.push_back({curve.amount() * s.molarVolume, s.pressure, s.temperature, curve.amount() * s.entropy});
        }
        m_verdict.violations.push_back({number, std::move(stretch)});
    }

    const Limit &m_limit;
    const path::PathResult &m_path;
    double m_surroundingsPressure;
    Verdict m_verdict{};
    double m_worstMargin = std::numeric_limits<double>::infinity();
};

} // namespace

std::vector<Verdict> verdicts(const std::vector<Limit> &limits, const path::PathResult &path,
                              double surroundingsPressure)
{
    std::vector<Verdict> result;
    for (std::size_t i = 0; i < limits.size(); ++i)
        result.push_back(Judge(limits[i], i, path, surroundingsPressure).verdict());
    return result;
}

} // namespace quasistat::analysis
