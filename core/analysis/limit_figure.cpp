#include "core/analysis/limit_figure.h"

#include "core/analysis/rating.h"
#include "core/gas/solve/solve.h"

namespace quasistat::analysis
{

using gas::MolarState;
using gas::Property;

bool isFigureOfState(LimitQuantity quantity)
{
    switch (quantity) {
    case LimitQuantity::pressure:
    case LimitQuantity::volume:
    case LimitQuantity::temperature:
    case LimitQuantity::storedEnergy: return true;
    case LimitQuantity::pressureRatio:
    case LimitQuantity::work:
    case LimitQuantity::heat:
    case LimitQuantity::amount: return false;
    }
    return false;
}

LimitFigure::LimitFigure(const Limit &limit, double amount, const gas::Gas &gas, double surroundingsPressure)
    : m_limit(limit), m_amount(amount), m_gas(gas), m_surroundingsPressure(surroundingsPressure)
{
}

std::optional<MolarState> LimitFigure::released(const MolarState &state) const
{
    if (state.pressure < m_surroundingsPressure) return std::nullopt;
    const auto end =
        gas::stateFrom(m_gas, {Property::entropy, state.entropy}, {Property::pressure, m_surroundingsPressure}, &state);
    if (!end) return std::nullopt;
    return *end;
}

std::optional<WatchedValue> LimitFigure::at(const MolarState &state) const
{
    switch (m_limit.quantity) {
    case LimitQuantity::pressure:
        if (m_limit.maxAt.empty()) return WatchedValue{state.pressure, std::nullopt};
        return WatchedValue{state.pressure, allowedPressure(m_limit.maxAt, state.temperature)};
    case LimitQuantity::volume: return WatchedValue{m_amount * state.molarVolume, std::nullopt};
    case LimitQuantity::temperature: return WatchedValue{state.temperature, std::nullopt};
    case LimitQuantity::storedEnergy:
        if (const auto end = released(state))
            return WatchedValue{m_amount * (state.internalEnergy - end->internalEnergy), std::nullopt};
        return std::nullopt;
    case LimitQuantity::pressureRatio:
    case LimitQuantity::work:
    case LimitQuantity::heat:
    case LimitQuantity::amount: break;
    }
    return std::nullopt;
}

double LimitFigure::slope(const path::CurveState &point) const
{
    const MolarState &s = point.state;
    switch (m_limit.quantity) {
    case LimitQuantity::pressure:
        if (m_limit.maxAt.empty()) return point.dpdx;
        return point.dpdx * allowedPressure(m_limit.maxAt, s.temperature) -
               s.pressure * allowedPressureSlope(m_limit.maxAt, s.temperature) * point.dTdx;
    case LimitQuantity::volume: return point.dvdx;
    case LimitQuantity::temperature: return point.dTdx;
    case LimitQuantity::storedEnergy:
        // dU − dU(s, p₀) = T ds − p dv − T_r ds, T_r being the temperature after the release.
        if (const auto end = released(s))
            return (1.0 - end->temperature / s.temperature) * point.Tdsdx - s.pressure * point.dvdx;
        return 0.0;
    case LimitQuantity::pressureRatio:
    case LimitQuantity::work:
    case LimitQuantity::heat:
    case LimitQuantity::amount: break;
    }
    return 0.0;
}

} // namespace quasistat::analysis
