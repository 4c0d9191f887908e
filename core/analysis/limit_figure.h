#pragma once
// The figure that a limit watches, at one state of a curve, and its slope along the curve.

#include "core/analysis/envelope.h"
#include "core/path/quasi_static_curve.h"

namespace quasistat::analysis
{

/// Where a limit can be judged from: a state of the charge.
struct WatchedValue {
    double value;                  ///< the figure itself [SI]
    std::optional<double> allowed; ///< a rating at this state's temperature; else the limit's own min or max holds
};

/// Watches pressure, volume, temperature, a rating, or stored energy; those are the figures of a single state.
class LimitFigure
{
public:
    LimitFigure(const Limit &limit, double amount, const gas::Gas &gas, double surroundingsPressure);

    /// The figure in a state; none where it does not exist (stored energy below p₀).
    [[nodiscard]] std::optional<WatchedValue> at(const gas::MolarState &state) const;
    /// Proportional to d(figure)/dx for an ordinary limit, to d(p/p_allowed)/dx for a rating; 0 where there is no
    /// figure.
    [[nodiscard]] double slope(const path::CurveState &point) const;

private:
    [[nodiscard]] std::optional<gas::MolarState> released(const gas::MolarState &state) const;

    const Limit &m_limit;
    double m_amount;
    const gas::Gas &m_gas;
    double m_surroundingsPressure;
};

/// True for the quantities that LimitFigure watches; the others belong to a whole segment or to the charge.
[[nodiscard]] bool isFigureOfState(LimitQuantity quantity);

} // namespace quasistat::analysis
