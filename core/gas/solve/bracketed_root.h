#pragma once
// The root of a rising function between two bounds by Newton's method that never leaves them.

#include <cmath>
#include <optional>

namespace quasistat::gas
{

struct ValueAndSlope {
    double value;
    double slope;
};

/// x in [low, high] where `f` (ValueAndSlope of x, rising from low to high) is zero, to the last bits. Every value says
/// on which side of x the root lies, so the bounds themselves are only looked at if the search ends there. A step out
/// of the bracket goes half the way to its end instead, and one that gains too little halves the bracket: at most 200
/// calls. None if there is no root between the bounds, or `f` is not a number on the way.
template <class Function>
[[nodiscard]] std::optional<double> risingRoot(const Function &f, double low, double high, double start)
{
    constexpr double rounding = 4e-16;
    const double lowest = low;
    const double highest = high;
    double x = start > low && start < high ? start : 0.5 * (low + high);
    double lastStep = high - low;
    for (int i = 0; i < 200; ++i) {
        const auto [value, slope] = f(x);
        if (value == 0.0) return x;
        if (std::isnan(value)) return std::nullopt;
        (value < 0.0 ? low : high) = x;
        double next = x - value / slope;
        if (std::abs(next - x) <= rounding * std::abs(x)) return x;
        if (!(next > low && next < high)) // also where the slope is zero or not a number
            next = 0.5 * (low + high);
        else if (std::abs(next - x) > 0.5 * lastStep && i > 8) // Newton runs in circles
            next = 0.5 * (low + high);
        lastStep = std::abs(next - x);
        x = next;
        if (lastStep <= rounding * std::abs(x)) {
            const bool atLow = low == lowest && f(lowest).value > 0.0;
            const bool atHigh = high == highest && f(highest).value < 0.0;
            if (atLow || atHigh) return std::nullopt;
            return x;
        }
    }
    return x;
}

} // namespace quasistat::gas
