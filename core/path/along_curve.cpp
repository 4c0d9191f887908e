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
/// Below this share of RT per coordinate an integrand is the rounding of zero (heat at n = γ): halving it again finds
/// nothing.
constexpr double roundingOfZero = 1e-14;
/// An error below this share of the largest stretch met is below the rounding of the whole. It is what ends the halving
/// about a jump whose place is known to all digits but the last.
constexpr double negligible = 1e-13;
constexpr int mostHalvings = 40;

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

namespace
{

/// Adaptive quadrature of one smooth stretch: halved until the estimate of its error is within tolerance.
class Quadrature
{
public:
    Quadrature(const QuasiStaticCurve &curve, const Figures &integrand)
        : m_curve(curve), m_integrand(integrand), m_neighbour(curve.start()),
          m_floor(roundingOfZero * curve.gas().gasConstant() * curve.start().temperature)
    {
    }

    void add(double from, double to) { add(from, to, 0); }

    [[nodiscard]] Outcome<double> sum() const
    {
        if (m_left) return *m_left;
        if (!m_converged || !std::isfinite(m_sum))
            return Failure{Reason::notConverged, "", {"an integral along this segment did not converge", {}}};
        return m_sum;
    }

private:
    double value(double x)
    {
        const auto point = m_curve.at(x, &m_neighbour);
        if (!point) {
            if (!m_left) m_left = point.failure();
            return 0.0;
        }
        m_neighbour = point->state;
        return m_integrand(*point);
    }

    void add(double from, double to, int halvings)
    {
        if (from == to || m_left) return;
        // On −1…1, where the library's estimate of the error is that of the integral; on another interval it is not
        // scaled.
        const double middle = 0.5 * (from + to);
        const double half = 0.5 * (to - from);
        double error = 0.0;
        double magnitude = 0.0;
        const double part =
            half * boost::math::quadrature::gauss_kronrod<double, 21>::integrate(
                       [&](double t) { return value(middle + half * t); }, -1.0, 1.0, 0, 0.0, &error, &magnitude);
        error *= std::abs(half);
        m_largest = std::max(m_largest, std::abs(half * magnitude));
        const double tolerance = std::max(
            {quadratureTolerance * std::abs(half * magnitude), m_floor * std::abs(to - from), negligible * m_largest});
        if (error <= tolerance || m_left) {
            m_sum += part;
            return;
        }
        if (halvings == mostHalvings) {
            m_converged = false;
            return;
        }
        add(from, middle, halvings + 1);
        add(middle, to, halvings + 1);
    }

    const QuasiStaticCurve &m_curve;
    const Figures &m_integrand;
    gas::MolarState m_neighbour;
    double m_floor;
    double m_largest = 0.0;
    double m_sum = 0.0;
    bool m_converged = true;
    std::optional<Failure> m_left; ///< the curve left the model
};

} // namespace

Outcome<double> integral(const QuasiStaticCurve &curve, double a, double b, const std::vector<double> &breaks,
                         const Figures &integrand)
{
    Quadrature quadrature(curve, integrand);
    double from = a;
    for (const double at : breaks) {
        const bool strictlyBetween = (at - from) * (b - a) > 0.0 && (b - at) * (b - a) > 0.0;
        if (!strictlyBetween) continue;
        quadrature.add(from, at);
        from = at;
    }
    quadrature.add(from, b);
    return quadrature.sum();
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
