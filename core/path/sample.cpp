#include "core/path/sample.h"

#include <algorithm>
#include <array>
#include <cmath>

namespace quasistat::path
{
namespace
{

constexpr double chordTolerance = 1.0 / 4000.0;
constexpr int mostHalvings = 9;
constexpr int firstStretches = 4;

struct Sample {
    double x;
    CurvePoint point;
    gas::MolarState molar;
};

/// One of the planes a curve is drawn in, scaled to the curve's own extent.
struct Plane {
    double (*abscissa)(const CurvePoint &);
    double (*ordinate)(const CurvePoint &);
    double width = 1.0;
    double height = 1.0;
};

double volumeOf(const CurvePoint &p)
{
    return p.volume;
}
double pressureOf(const CurvePoint &p)
{
    return p.pressure;
}
double logVolumeOf(const CurvePoint &p)
{
    return std::log(p.volume);
}
double logPressureOf(const CurvePoint &p)
{
    return std::log(p.pressure);
}
double entropyOf(const CurvePoint &p)
{
    return p.entropy;
}
double temperatureOf(const CurvePoint &p)
{
    return p.temperature;
}

class Sampler
{
public:
    explicit Sampler(const QuasiStaticCurve &curve) : m_curve(curve) {}

    Polyline points()
    {
        std::array<std::optional<Sample>, firstStretches + 1> first;
        for (int i = 0; i <= firstStretches; ++i)
            first[static_cast<std::size_t>(i)] = sampleAt(m_curve.endCoordinate() * i / firstStretches);
        if (!first.front()) return {};
        m_points.push_back(first.front()->point);
        measurePlanes(first);
        for (std::size_t i = 0; i + 1 < first.size() && first[i + 1]; ++i) refine(*first[i], *first[i + 1], 0);
        return std::move(m_points);
    }

private:
    std::optional<Sample> sampleAt(double x, const gas::MolarState *guess = nullptr) const
    {
        const auto state = m_curve.at(x, guess);
        if (!state) return std::nullopt;
        const double n = m_curve.amount();
        const gas::MolarState &s = state->state;
        return Sample{x, {n * s.molarVolume, s.pressure, s.temperature, n * s.entropy}, s};
    }

    template <std::size_t N>
    void measurePlanes(const std::array<std::optional<Sample>, N> &samples)
    {
        for (Plane &plane : m_planes) {
            const auto extent = [&](double (*of)(const CurvePoint &)) {
                double lowest = of(samples.front()->point);
                double highest = lowest;
                for (const auto &sample : samples) {
                    if (!sample) break;
                    lowest = std::min(lowest, of(sample->point));
                    highest = std::max(highest, of(sample->point));
                }
                // What the law keeps constant varies by rounding only, and rounding is not to be drawn.
                const double constant = std::max({std::abs(lowest), std::abs(highest), m_curve.amount()});
                return highest - lowest > 1e-9 * constant ? highest - lowest : constant;
            };
            plane.width = extent(plane.abscissa);
            plane.height = extent(plane.ordinate);
        }
    }

    /// Distance of `p` from the chord a–b, in units of the plane's extent; the largest of the planes.
    [[nodiscard]] double bend(const CurvePoint &a, const CurvePoint &p, const CurvePoint &b) const
    {
        double largest = 0.0;
        for (const Plane &plane : m_planes) {
            const double dx = (plane.abscissa(b) - plane.abscissa(a)) / plane.width;
            const double dy = (plane.ordinate(b) - plane.ordinate(a)) / plane.height;
            const double px = (plane.abscissa(p) - plane.abscissa(a)) / plane.width;
            const double py = (plane.ordinate(p) - plane.ordinate(a)) / plane.height;
            const double length = std::hypot(dx, dy);
            largest = std::max(largest, length > 0.0 ? std::abs(dx * py - dy * px) / length : std::hypot(px, py));
        }
        return largest;
    }

    void refine(const Sample &a, const Sample &b, int depth)
    {
        const auto middle = depth < mostHalvings ? sampleAt(0.5 * (a.x + b.x), &a.molar) : std::nullopt;
        if (middle && bend(a.point, middle->point, b.point) > chordTolerance) {
            refine(a, *middle, depth + 1);
            refine(*middle, b, depth + 1);
            return;
        }
        m_points.push_back(b.point);
    }

    const QuasiStaticCurve &m_curve;
    std::array<Plane, 3> m_planes{{{volumeOf, pressureOf}, {logVolumeOf, logPressureOf}, {entropyOf, temperatureOf}}};
    Polyline m_points;
};

} // namespace

CurvePoint curvePoint(const gas::State &state)
{
    return {state.volume(), state.pressure(), state.temperature().value_or(0.0), state.entropy()};
}

Polyline sampled(const QuasiStaticCurve &curve)
{
    return Sampler(curve).points();
}

Outcome<Polyline> evenSamples(const QuasiStaticCurve &curve, int count)
{
    // At constant volume the coordinate is ln T; even steps in p are found from p(T) of the surface by the same law's
    // own points.
    Polyline points;
    const double n = curve.amount();
    const bool isochoric = std::holds_alternative<ConstantVolume>(curve.law());
    const auto last = curve.at(curve.endCoordinate());
    if (!last) return last.failure();
    for (int i = 0; i < count; ++i) {
        const double share = static_cast<double>(i) / (count - 1);
        double x = share * curve.endCoordinate();
        if (isochoric) {
            const double p = curve.start().pressure + share * (last->state.pressure - curve.start().pressure);
            // Newton in ln T: dp/dx is known, p is monotone along the law.
            for (int k = 0; k < 50; ++k) {
                const auto here = curve.at(x);
                if (!here) return here.failure();
                const double step = (p - here->state.pressure) / here->dpdx;
                x += step;
                if (std::abs(step) < 1e-14) break;
            }
        }
        const auto here = curve.at(x);
        if (!here) return here.failure();
        const gas::MolarState &s = here->state;
        points.push_back({n * s.molarVolume, s.pressure, s.temperature, n * s.entropy});
    }
    return points;
}

} // namespace quasistat::path
