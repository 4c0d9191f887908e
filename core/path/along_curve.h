#pragma once
// Roots and integrals along a quasi-static curve: what extrema, heat and work are found with.

#include "core/path/quasi_static_curve.h"

#include <functional>
#include <vector>

namespace quasistat::path
{

using Figures = std::function<double(const CurveState &)>;

/// Coordinates strictly between `a` and `b`, in path order, where `figure` changes sign. Found by bracketing between
/// nodes close enough for the gas (an ideal one bends once) and TOMS 748 within each bracket, never by picking a
/// sample.
[[nodiscard]] Outcome<std::vector<double>> signChanges(const QuasiStaticCurve &curve, double a, double b,
                                                       const Figures &figure);

/// ∫ integrand dx from `a` to `b`, split at `breaks` (in path order). Gauss–Kronrod 21 points, adaptive, to 1e-12 of
/// the integral of the absolute value. Fails where the curve leaves the model between, or with Reason::notConverged.
/// Source of the rule: R. Piessens et al., QUADPACK (1983); implementation Boost.Math.
[[nodiscard]] Outcome<double> integral(const QuasiStaticCurve &curve, double a, double b,
                                       const std::vector<double> &breaks, const Figures &integrand);

/// Coordinates in path order where integrands along the curve are not smooth: the temperature crosses a seam of the
/// gas. `turningPoints` of the temperature cut the curve into stretches on which it is monotone.
[[nodiscard]] Outcome<std::vector<double>> seamCrossings(const QuasiStaticCurve &curve,
                                                         const std::vector<double> &turningPoints);

} // namespace quasistat::path
