#pragma once
// A cubic spline through equally spaced values, for checking integrals by means that the program does not use.

#include <cassert>
#include <cmath>
#include <vector>

namespace quasistat::test
{

/// Not-a-knot spline over t = 0, 1, …, n − 1. Source: C. de Boor, A Practical Guide to Splines (1978), ch. IV.
class CubicSpline
{
public:
    explicit CubicSpline(std::vector<double> values) : m_values(std::move(values)), m_slopes(slopes(m_values)) {}

    [[nodiscard]] std::size_t intervals() const { return m_values.size() - 1; }
    /// Value and slope at `share` (0 to 1) of interval `i`.
    [[nodiscard]] double value(std::size_t i, double share) const
    {
        const auto [a, b, c, d] = cubic(i);
        return a + share * (b + share * (c + share * d));
    }
    [[nodiscard]] double slope(std::size_t i, double share) const
    {
        const auto [a, b, c, d] = cubic(i);
        return b + share * (2.0 * c + 3.0 * share * d);
    }

private:
    struct Cubic {
        double a, b, c, d;
    };
    [[nodiscard]] Cubic cubic(std::size_t i) const
    {
        const double rise = m_values[i + 1] - m_values[i];
        return {m_values[i], m_slopes[i], 3.0 * rise - 2.0 * m_slopes[i] - m_slopes[i + 1],
                m_slopes[i] + m_slopes[i + 1] - 2.0 * rise};
    }

    /// Solves s(i−1) + 4 s(i) + s(i+1) = 3 (y(i+1) − y(i−1)) with the not-a-knot rows at both ends, by elimination.
    static std::vector<double> slopes(const std::vector<double> &y)
    {
        const std::size_t n = y.size();
        assert(n >= 4);
        std::vector<double> lower(n, 1.0), diagonal(n, 4.0), upper(n, 1.0), right(n);
        for (std::size_t i = 1; i + 1 < n; ++i) right[i] = 3.0 * (y[i + 1] - y[i - 1]);
        diagonal.front() = 1.0;
        upper.front() = 2.0;
        right.front() = (5.0 * (y[1] - y[0]) + (y[2] - y[1])) / 2.0;
        diagonal.back() = 1.0;
        lower.back() = 2.0;
        right.back() = (5.0 * (y[n - 1] - y[n - 2]) + (y[n - 2] - y[n - 3])) / 2.0;
        for (std::size_t i = 1; i < n; ++i) {
            const double factor = lower[i] / diagonal[i - 1];
            diagonal[i] -= factor * upper[i - 1];
            right[i] -= factor * right[i - 1];
        }
        std::vector<double> s(n);
        s[n - 1] = right[n - 1] / diagonal[n - 1];
        for (std::size_t i = n - 1; i-- > 0;) s[i] = (right[i] - upper[i] * s[i + 1]) / diagonal[i];
        return s;
    }

    std::vector<double> m_values;
    std::vector<double> m_slopes;
};

/// ∫ f dg along the common parameter, exactly for the splines: Gauss–Legendre with three points per interval.
inline double integralOver(const CubicSpline &f, const CubicSpline &g)
{
    const double offset = std::sqrt(0.6) / 2.0;
    double sum = 0.0;
    for (std::size_t i = 0; i < f.intervals(); ++i)
        for (const auto &[share, weight] :
             {std::pair(0.5 - offset, 5.0 / 18.0), std::pair(0.5, 8.0 / 18.0), std::pair(0.5 + offset, 5.0 / 18.0)})
            sum += weight * f.value(i, share) * g.slope(i, share);
    return sum;
}

} // namespace quasistat::test
