#include "core/path/along_curve.h"

#include <boost/math/quadrature/gauss_kronrod.hpp>
#include <boost/math/tools/toms748_solve.hpp>

#include <algorithm>
#include <cmath>

namespace quasistat::path
{
namespace
{

/// Stretches searched for one sign change each. On an ideal gas every law bends at most once; a real gas may bend more
/// often.
constexpr int stretchesOfIdealGas = 4;
constexpr int stretchesOfRealGas = 32;

constexpr double quadratureTolerance = 1e-12;
constexpr unsigned quadratureDepth = 14;
/// Worse than this relative to ∫|f| is reported, never passed on: the audit works at 1e-9.
constexpr double quadratureRefusal = 1e-10;

double rootBetween(const QuasiStaticCurve &curve, const Figures &figure, double a, double b, double fa, double fb)
{
    const auto value = [&](double x) {
        const auto point = curve.at(x);
        return point ? figure(*point) : 0.0; // cannot leave the model between two points that are in it and neighbours
    };
    std::uintmax_t steps = 100;
    if (a > b) {
        std::swap(a, b);
        std::swap(fa, fb);
    }
    const auto bracket =
        boost::math::tools::toms748_solve(value, a, b, fa, fb, boost::math::tools::eps_tolerance<double>(50), steps);
    return 0.5 * (bracket.first + bracket.second);
}

} // namespace

Outcome<std::vector<double>> signChanges(const QuasiStaticCurve &curve, double a, double b, const Figures &figure)
{
    std::vector<double> roots;
    if (a == b) return roots;
    const int stretches = curve.gas().isIdeal() ? stretchesOfIdealGas : stretchesOfRealGas;
    double x = a;
    auto here = curve.at(x);
    if (!here) return here.failure();
    double value = figure(*here);
    for (int i = 1; i <= stretches; ++i) {
        const double next = i == stretches ? b : a + (b - a) * i / stretches;
        const auto there = curve.at(next, &here->state);
        if (!there) return there.failure();
        const double nextValue = figure(*there);
        if (value * nextValue < 0.0)
            roots.push_back(rootBetween(curve, figure, x, next, value, nextValue));
        else if (nextValue == 0.0 && value != 0.0 && i < stretches)
            roots.push_back(next);
        x = next;
        value = nextValue;
        here = there;
    }
    return roots;
}

Outcome<double> integral(const QuasiStaticCurve &curve, double a, double b, const std::vector<double> &breaks,
                         const Figures &integrand)
{
    std::optional<Failure> left;
    gas::MolarState neighbour = curve.start();
    const auto value = [&](double x) {
        const auto point = curve.at(x, &neighbour);
        if (!point) {
            if (!left) left = point.failure();
            return 0.0;
        }
        neighbour = point->state;
        return integrand(*point);
    };
    double sum = 0.0;
    double error = 0.0;
    double magnitude = 0.0;
    const auto addSmooth = [&](double from, double to) {
        if (from == to) return;
        double estimate = 0.0;
        double absolute = 0.0;
        sum += boost::math::quadrature::gauss_kronrod<double, 21>::integrate(value, from, to, quadratureDepth,
                                                                             quadratureTolerance, &estimate, &absolute);
        error += estimate;
        magnitude += std::abs(absolute);
    };
    double from = a;
    for (const double at : breaks) {
        if ((at - from) * (b - from) <= 0.0 || (at - b) * (b - a) >= 0.0) continue; // not strictly between
        addSmooth(from, at);
        from = at;
    }
    addSmooth(from, b);
    if (left) return *left;
    if (!std::isfinite(sum) || error > quadratureRefusal * magnitude)
        return Failure{Reason::notConverged, "", {"an integral along this segment did not converge", {}}};
    return sum;
}

Outcome<std::vector<double>> seamCrossings(const QuasiStaticCurve &curve, const std::vector<double> &turningPoints)
{
    std::vector<double> crossings;
    const auto seams = curve.gas().seams();
    if (seams.empty()) return crossings;
    std::vector<double> cuts{0.0};
    cuts.insert(cuts.end(), turningPoints.begin(), turningPoints.end());
    cuts.push_back(curve.endCoordinate());
    for (std::size_t i = 0; i + 1 < cuts.size(); ++i) {
        const auto from = curve.at(cuts[i]);
        const auto to = curve.at(cuts[i + 1]);
        if (!from) return from.failure();
        if (!to) return to.failure();
        for (const double seam : seams) {
            const double before = from->state.temperature - seam;
            const double after = to->state.temperature - seam;
            if (before * after < 0.0)
                crossings.push_back(rootBetween(
                    curve, [seam](const CurveState &c) { return c.state.temperature - seam; }, cuts[i], cuts[i + 1],
                    before, after));
        }
    }
    const bool ascending = curve.endCoordinate() > 0.0;
    std::sort(crossings.begin(), crossings.end(), [&](double x, double y) { return ascending ? x < y : x > y; });
    return crossings;
}

} // namespace quasistat::path
