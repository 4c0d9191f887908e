#include "core/document/result_curve.h"

#include "core/gas/solve/solve.h"

namespace quasistat::document
{

namespace
{

/// The state at `share` (0–1) of the way. On an isochore the coordinate of the curve is ln T, but the table is even in
/// p.
Outcome<gas::MolarState> stateAt(const path::QuasiStaticCurve &curve, double share, const gas::MolarState &end)
{
    if (share == 0.0) return curve.start();
    if (share == 1.0) return end;
    if (std::holds_alternative<path::ConstantVolume>(curve.law())) {
        const double pressure = curve.start().pressure + share * (end.pressure - curve.start().pressure);
        return gas::stateFrom(curve.gas(), {gas::Property::molarVolume, curve.start().molarVolume},
                              {gas::Property::pressure, pressure});
    }
    const Outcome<path::CurveState> point = curve.at(share * curve.endCoordinate());
    if (!point) return point.failure();
    return point->state;
}

} // namespace

Json curveJson(const path::QuasiStaticCurve &curve, int points)
{
    const Outcome<path::CurveState> end = curve.at(curve.endCoordinate());
    if (!end) return nullptr;
    Json volume = Json::array();
    Json pressure = Json::array();
    Json temperature = Json::array();
    Json entropy = Json::array();
    for (int i = 0; i < points; ++i) {
        const Outcome<gas::MolarState> state = stateAt(curve, static_cast<double>(i) / (points - 1), end->state);
        if (!state) return nullptr;
        volume.push_back(state->molarVolume * curve.amount());
        pressure.push_back(state->pressure);
        temperature.push_back(state->temperature);
        entropy.push_back(state->entropy * curve.amount());
    }
    return {{"volume", volume}, {"pressure", pressure}, {"temperature", temperature}, {"entropy", entropy}};
}

} // namespace quasistat::document
