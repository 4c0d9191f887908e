#include "core/path/slide.h"

#include "core/gas/solve/solve.h"
#include "core/path/end_on_law.h"
#include "core/path/irreversible.h"
#include "core/path/resolved_segment.h"

#include <boost/math/tools/minima.hpp>

#include <algorithm>
#include <cmath>
#include <optional>

namespace quasistat::path
{
namespace
{

using gas::Property;
using gas::State;

SlidePoint slidePoint(const State &state)
{
    return {state.volume(), state.pressure(), state.molar().temperature, state.entropy()};
}

Outcome<SlidePoint> slidePoint(const State &from, const Outcome<gas::MolarState> &molar)
{
    if (!molar) return molar.failure();
    return slidePoint(State(from.sharedGas(), from.amount(), *molar));
}

/// The law of a segment whose curve is known before its end is; none for those that go anywhere or in jumps.
std::optional<Law> lawOf(const Process &process, const State &from)
{
    if (std::holds_alternative<Isothermal>(process)) return ConstantTemperature{};
    if (std::holds_alternative<Isobaric>(process)) return ConstantPressure{};
    if (std::holds_alternative<Isochoric>(process)) return ConstantVolume{};
    if (std::holds_alternative<Isentropic>(process)) return ConstantEntropy{};
    if (const auto *p = std::get_if<Polytropic>(&process); p && p->exponent) return PowerLaw{*p->exponent};
    if (const auto *l = std::get_if<Linear>(&process); l && l->stiffness)
        return StraightLine{*l->stiffness * from.amount()};
    return std::nullopt;
}

double pixels(double value, double target, double scale, bool logarithmic)
{
    return scale * (logarithmic ? std::log(value / target) : value - target);
}

/// On a curve that runs one way in p and V, the nearest point lies between the one at the pointer's volume and the one
/// at its pressure.
class Nearest
{
public:
    Nearest(const State &from, const Law &law, const Place &place, const PlaneMetric &metric)
        : m_from(from), m_law(law), m_place(place), m_metric(metric),
          m_curve(from.sharedGas(), from.amount(), from.molar(), law, 0.0)
    {
    }

    Outcome<SlidePoint> point() const
    {
        const auto atVolume = coordinate(EndKey::volume, m_place.volume);
        const auto atPressure = coordinate(EndKey::pressure, m_place.pressure);
        if (!atVolume && !atPressure)
            return Failure{Reason::unreachable, "", {"the segment does not come near this place", {}}};
        const double a = atVolume.value_or(*(atPressure ? atPressure : atVolume));
        const double b = atPressure.value_or(a);
        const double x = a == b ? a : nearestBetween(std::min(a, b), std::max(a, b));
        const auto state = m_curve.at(x);
        if (!state) return state.failure();
        return slidePoint(State(m_from.sharedGas(), m_from.amount(), state->state));
    }

private:
    std::optional<double> coordinate(EndKey key, double value) const
    {
        const bool isochoric = std::holds_alternative<ConstantVolume>(m_law);
        const bool isobaric = std::holds_alternative<ConstantPressure>(m_law);
        if ((key == EndKey::volume && isochoric) || (key == EndKey::pressure && isobaric)) return std::nullopt;
        const auto end = endOnLaw(m_from, m_law, key, value, std::nullopt);
        if (!end) return std::nullopt;
        return end->coordinate;
    }

    double nearestBetween(double a, double b) const
    {
        const auto distance = [&](double x) {
            const auto point = m_curve.at(x);
            if (!point) return 1e300;
            const double V = m_from.amount() * point->state.molarVolume;
            return std::hypot(
                pixels(V, m_place.volume, m_metric.volumeScale, m_metric.logVolume),
                pixels(point->state.pressure, m_place.pressure, m_metric.pressureScale, m_metric.logPressure));
        };
        // A coarse look first: a curve bent towards the pointer has two near ends and a far middle.
        constexpr int looks = 16;
        const double width = (b - a) / looks;
        double best = a;
        for (int i = 1; i <= looks; ++i)
            if (distance(a + i * width) < distance(best)) best = a + i * width;
        constexpr int bits = 20; // a thousandth of a pixel on any screen
        return boost::math::tools::brent_find_minima(distance, std::max(a, best - width), std::min(b, best + width),
                                                     bits)
            .first;
    }

    const State &m_from;
    const Law &m_law;
    const Place &m_place;
    const PlaneMetric &m_metric;
    QuasiStaticCurve m_curve;
};

/// Irreversible kinds take the pointer's volume or pressure as their end.
Outcome<SlidePoint> irreversibleEnd(const State &from, ResolvedSegment segment, const Place &place)
{
    segment.arrival.reset();
    const Surroundings anywhere; // p, V and T of the end do not depend on the surroundings
    if (std::holds_alternative<Stepped>(segment.process)) {
        segment.ends = {{EndKey::pressure, place.pressure}};
    } else if (std::holds_alternative<FreeExpansion>(segment.process)) {
        segment.ends = {{EndKey::volume, std::max(place.volume, from.volume())}};
    } else {
        segment.ends.clear();
        const auto balance = irreversible(from, segment, anywhere);
        if (!balance) return balance.failure();
        const double other = balance->to.volume();
        segment.ends = {
            {EndKey::volume, std::clamp(place.volume, std::min(from.volume(), other), std::max(from.volume(), other))}};
    }
    const auto result = irreversible(from, segment, anywhere);
    if (!result) return result.failure();
    return slidePoint(result->to);
}

} // namespace

Outcome<SlidePoint> nearestEnd(std::span<const StateResult> states, const Segment &segment, const Place &place,
                               const PlaneMetric &metric)
{
    if (states.empty() || states.back().state.isEvacuated())
        return Failure{Reason::notReached, "", {"the segment has no start", {}}};
    if (!(place.volume > 0.0 && place.pressure > 0.0))
        return Failure{Reason::outOfRange, "", {"pressure and volume must stay above zero", {}}};
    const State &from = states.back().state;
    if (const auto law = lawOf(segment.process, from)) return Nearest(from, *law, place, metric).point();
    if (facts(kindOf(segment.process)).quasiStatic)
        return slidePoint(from, gas::stateFrom(from.gas(), {Property::molarVolume, place.volume / from.amount()},
                                               {Property::pressure, place.pressure}, &from.molar()));
    Segment openEnded = segment;
    openEnded.end = {};
    auto known = resolved(openEnded, states);
    if (!known) return known.failure();
    return irreversibleEnd(from, std::move(*known), place);
}

std::optional<double> endValueAt(const State &from, const SlidePoint &point, EndKey key)
{
    switch (key) {
    case EndKey::pressure: return point.pressure;
    case EndKey::volume: return point.volume;
    case EndKey::temperature: return point.temperature;
    case EndKey::pressureRatio: return point.pressure / from.pressure();
    case EndKey::volumeRatio: return point.volume / from.volume();
    case EndKey::work:
    case EndKey::heat: break;
    }
    return std::nullopt;
}

} // namespace quasistat::path
