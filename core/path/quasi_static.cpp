#include "core/path/quasi_static.h"

#include "core/path/along_curve.h"
#include "core/path/audit.h"
#include "core/path/phase_crossings.h"
#include "core/path/sample.h"

#include <algorithm>
#include <cmath>

namespace quasistat::path
{
namespace
{

/// Heat below this share of p V is the rounding of none, and enters or leaves at no temperature.
constexpr double noHeat = 1e-12;

double temperatureSlope(const CurveState &c)
{
    return c.dTdx;
}
double heatPerCoordinate(const CurveState &c)
{
    return c.Tdsdx;
}
double workPerCoordinate(const CurveState &c)
{
    return -c.state.pressure * c.dvdx;
}

/// An ideal gas keeps the direction of its temperature on every law but a straight line.
bool mayTurnTemperature(const QuasiStaticCurve &curve)
{
    const Law &law = curve.law();
    if (std::holds_alternative<StraightLine>(law)) return true;
    if (curve.gas().isIdeal()) return false;
    return !std::holds_alternative<ConstantTemperature>(law) && !std::holds_alternative<ConstantVolume>(law);
}

/// Heat can turn round where the law is tied to no property that makes it monotone.
bool mayTurnHeat(const QuasiStaticCurve &curve)
{
    return std::holds_alternative<StraightLine>(curve.law()) || std::holds_alternative<PowerLaw>(curve.law());
}

Interval widened(Interval interval, double value)
{
    return {std::min(interval.lowest, value), std::max(interval.highest, value)};
}

std::optional<Interval> joined(const std::optional<Interval> &a, const Interval &b)
{
    if (!a) return b;
    return Interval{std::min(a->lowest, b.lowest), std::max(a->highest, b.highest)};
}

/// Works out one segment; each step fills its part of the result.
class Evaluator
{
public:
    Evaluator(const gas::State &from, const ResolvedSegment &segment, Course course)
        : m_from(from), m_segment(segment), m_course(std::move(course)),
          m_curve(std::make_shared<QuasiStaticCurve>(from.sharedGas(), from.amount(), from.molar(), m_course.law,
                                                     m_course.endCoordinate))
    {
    }

    Outcome<SegmentResult> result()
    {
        SegmentResult r{.kind = kindOf(m_segment.process),
                        .label = m_segment.label,
                        .from = m_from,
                        .to = gas::State(m_from.sharedGas(), m_from.amount(), m_course.end)};
        r.exponent = m_course.exponent;
        r.warnings = m_course.remarks;
        r.curve = m_curve;
        const auto crossings = phaseCrossings(*m_curve, 0.0, end());
        if (!crossings.empty() && !computesTwoPhaseStates(m_from.gas()))
            return at("/end", condensesAt(crossings.front(), m_from.amount()));
        markCrossings(crossings, r);
        if (mayTurnTemperature(*m_curve)) {
            const auto turns = signChanges(*m_curve, 0.0, end(), temperatureSlope);
            if (!turns) return at("/end", turns.failure());
            m_temperatureTurns = *turns;
        }
        auto breaks = unevenPoints(*m_curve, m_temperatureTurns, crossings);
        if (!breaks) return at("/end", breaks.failure());
        m_breaks = std::move(*breaks);

        const auto work = workAlongCurve();
        if (!work) return at("/end", work.failure());
        r.work = *work;
        const auto exchange = heatAlongCurve();
        if (!exchange) return at("/end", exchange.failure());
        r.exchange = *exchange;
        r.heat = exchange->in - exchange->out;
        r.extrema = extrema();
        r.audit = quasiStaticAudit(r.from, r.to, r.work, r.heat);
        draw(r.drawing);
        return r;
    }

private:
    void markCrossings(const std::vector<CrossingPoint> &crossings, SegmentResult &r) const
    {
        for (const CrossingPoint &point : crossings) {
            r.phaseCrossings.push_back(
                {gas::State(m_from.sharedGas(), m_from.amount(), point.state), point.entersTwoPhase});
            r.warnings.push_back({point.entersTwoPhase
                                      ? "the gas enters the two-phase region at {0} and {1}: from there "
                                        "on liquid and vapour in equilibrium are computed"
                                      : "the gas leaves the two-phase region at {0} and {1}",
                                  {Figure{units::Quantity::pressure, point.state.pressure},
                                   Figure{units::Quantity::temperature, point.state.temperature}}});
        }
    }

    [[nodiscard]] double end() const { return m_course.endCoordinate; }

    [[nodiscard]] Outcome<double> workAlongCurve() const
    {
        if (std::holds_alternative<ConstantVolume>(m_course.law)) return 0.0;
        const auto work = integral(*m_curve, 0.0, end(), m_breaks, workPerCoordinate);
        if (!work) return work;
        return m_from.amount() * *work;
    }

    [[nodiscard]] Outcome<HeatExchange> heatAlongCurve() const
    {
        HeatExchange exchange;
        if (std::holds_alternative<ConstantEntropy>(m_course.law)) return exchange;
        std::vector<double> cuts{0.0};
        if (mayTurnHeat(*m_curve)) {
            const auto turns = signChanges(*m_curve, 0.0, end(), heatPerCoordinate);
            if (!turns) return turns.failure();
            cuts.insert(cuts.end(), turns->begin(), turns->end());
        }
        cuts.push_back(end());
        for (std::size_t i = 0; i + 1 < cuts.size(); ++i) {
            const auto part = integral(*m_curve, cuts[i], cuts[i + 1], m_breaks, heatPerCoordinate);
            if (!part) return part.failure();
            const double heat = m_from.amount() * *part;
            (heat > 0.0 ? exchange.in : exchange.out) += std::abs(heat);
            if (std::abs(heat) <= noHeat * m_from.pressure() * m_from.volume()) continue;
            auto &side = heat > 0.0 ? exchange.temperatureIn : exchange.temperatureOut;
            side = joined(side, temperaturesBetween(cuts[i], cuts[i + 1]));
        }
        return exchange;
    }

    [[nodiscard]] double temperatureAt(double x) const
    {
        const auto point = m_curve->at(x);
        return point ? point->state.temperature : m_from.molar().temperature;
    }

    [[nodiscard]] Interval temperaturesBetween(double a, double b) const
    {
        const double Ta = temperatureAt(a);
        Interval interval = widened({Ta, Ta}, temperatureAt(b));
        for (const double x : m_temperatureTurns)
            if ((x - a) * (x - b) < 0.0) interval = widened(interval, temperatureAt(x));
        return interval;
    }

    /// p and V run one way along every law; T turns where its derivative is zero.
    [[nodiscard]] Extrema extrema() const
    {
        const gas::State to(m_from.sharedGas(), m_from.amount(), m_course.end);
        Extrema e{.pressure = widened({m_from.pressure(), m_from.pressure()}, to.pressure()),
                  .volume = widened({m_from.volume(), m_from.volume()}, to.volume()),
                  .temperature =
                      widened({m_from.molar().temperature, m_from.molar().temperature}, m_course.end.temperature)};
        for (const double x : m_temperatureTurns) e.temperature = widened(e.temperature, temperatureAt(x));
        return e;
    }

    void draw(Drawing &drawing) const
    {
        drawing.curve = sampled(*m_curve);
        drawing.workLine = drawing.curve;
    }

    const gas::State &m_from;
    const ResolvedSegment &m_segment;
    Course m_course;
    std::shared_ptr<const QuasiStaticCurve> m_curve;
    std::vector<double> m_temperatureTurns;
    std::vector<double> m_breaks;
};

} // namespace

Outcome<SegmentResult> quasiStatic(const gas::State &from, const ResolvedSegment &segment)
{
    auto course = courseOf(from, segment);
    if (!course) return course.failure();
    return Evaluator(from, segment, std::move(*course)).result();
}

Outcome<double> workAlong(const gas::State &from, const Law &law, double endCoordinate)
{
    const QuasiStaticCurve curve(from.sharedGas(), from.amount(), from.molar(), law, endCoordinate);
    const auto breaks = unevenPoints(curve, {}, phaseCrossings(curve, 0.0, endCoordinate));
    if (!breaks) return breaks.failure();
    const auto work = integral(curve, 0.0, endCoordinate, *breaks, workPerCoordinate);
    if (!work) return work;
    return from.amount() * *work;
}

} // namespace quasistat::path
