#include "ui/canvas/fitted_view.h"

#include <algorithm>
#include <optional>

namespace quasistat::ui
{
namespace
{

using analysis::LimitQuantity;

// Pixels kept free for labels beyond the outermost point.
constexpr double roomRight = 84.0;
constexpr double roomTop = 60.0;
constexpr double roomNear = 56.0; // on the side of zero, where the view does not begin at zero

class Bounds
{
public:
    void add(double value)
    {
        m_lowest = m_lowest ? std::min(*m_lowest, value) : value;
        m_highest = m_highest ? std::max(*m_highest, value) : value;
    }
    [[nodiscard]] double lowest() const { return m_lowest.value_or(0.0); }
    [[nodiscard]] double highest() const { return m_highest.value_or(0.0); }

private:
    std::optional<double> m_lowest;
    std::optional<double> m_highest;
};

struct PathBounds {
    Bounds volume;
    Bounds pressure;
    void add(const path::Polyline &line)
    {
        for (const auto &point : line) {
            volume.add(point.volume);
            pressure.add(point.pressure);
        }
    }
};

PathBounds pathBounds(const path::PathResult &path)
{
    PathBounds bounds;
    for (const auto &state : path.states) {
        bounds.volume.add(state.state.volume());
        bounds.pressure.add(state.state.pressure());
    }
    for (const auto &segment : path.segments) {
        bounds.add(segment.drawing.curve);
        bounds.add(segment.drawing.workLine);
        bounds.add(segment.drawing.reversibleLimit);
    }
    return bounds;
}

// The highest value to be shown, raised to a limit that stands close above it.
double withNearLimit(double highest, const std::vector<analysis::Limit> &limits, LimitQuantity quantity)
{
    double raised = highest;
    for (const auto &limit : limits)
        if (limit.quantity == quantity && limit.max && *limit.max > highest && *limit.max < 1.35 * highest)
            raised = std::max(raised, *limit.max);
    return raised;
}

struct Fit {
    double pixels;  ///< of the axis
    double room;    ///< pixels kept free beyond the highest value
    double nearest; ///< share of the highest value that the values must span for the axis to begin at zero
};

// An interval that begins at zero unless the values lie in its outer part only.
path::Interval fitted(double lowest, double highest, const Fit &fit)
{
    if (highest <= 0.0) return {0.0, 1.0};
    const double span = highest - lowest;
    const bool isOneValue = span < 1e-9 * highest;
    if (isOneValue || span > fit.nearest * highest)
        return {0.0, highest * (isOneValue ? 1.6 : fit.pixels / std::max(fit.pixels - fit.room, 0.5 * fit.pixels))};
    const double perPixel = span / std::max(fit.pixels - fit.room - roomNear, 0.4 * fit.pixels);
    return {std::max(0.0, lowest - roomNear * perPixel), highest + fit.room * perPixel};
}

} // namespace

View fittedView(const analysis::Evaluation &evaluation, QSizeF plot)
{
    const PathBounds bounds = pathBounds(evaluation.path);
    const double pressure = withNearLimit(bounds.pressure.highest(), evaluation.limits, LimitQuantity::pressure);
    const double volume = withNearLimit(bounds.volume.highest(), evaluation.limits, LimitQuantity::volume);
    const bool hasAreas = bounds.volume.highest() - bounds.volume.lowest() > 1e-6 * bounds.volume.highest();
    return {fitted(bounds.volume.lowest(), volume, {plot.width(), roomRight, 0.25}),
            fitted(bounds.pressure.lowest(), pressure, {plot.height(), roomTop, hasAreas ? 0.1 : 0.25})};
}

} // namespace quasistat::ui
