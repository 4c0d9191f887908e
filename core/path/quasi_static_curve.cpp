#include "core/path/quasi_static_curve.h"

#include "core/gas/solve/solve.h"

#include <cmath>

namespace quasistat::path
{
namespace
{

using gas::Given;
using gas::MolarState;
using gas::Property;

/// Slopes that follow from dT/dx and dv/dx: dp from the surface p(T, v), T ds = c_v dT + T (∂p/∂T)_v dv.
CurveState withSlopes(const MolarState &s, double dTdx, double dvdx)
{
    return {.state = s,
            .dTdx = dTdx,
            .dpdx = s.dpdT * dTdx + s.dpdv * dvdx,
            .dvdx = dvdx,
            .Tdsdx = s.isochoricHeatCapacity * dTdx + s.temperature * s.dpdT * dvdx};
}

/// The same where the law prescribes p(v): dT/dx from the surface.
CurveState onPressureLaw(const MolarState &s, double dpdx, double dvdx)
{
    CurveState result = withSlopes(s, (dpdx - s.dpdv * dvdx) / s.dpdT, dvdx);
    result.dpdx = dpdx;
    return result;
}

struct StateOnLaw {
    const gas::Gas &gas;
    const MolarState &start;
    double x;
    const MolarState *guess;

    Outcome<CurveState> operator()(const ConstantTemperature &) const
    {
        const double v = start.molarVolume * std::exp(x);
        const auto state = gas::stateAt(gas, start.temperature, v);
        if (!state) return state.failure();
        return withSlopes(*state, 0.0, v);
    }
    Outcome<CurveState> operator()(const ConstantPressure &) const { return atPressure(start.pressure, 0.0); }
    Outcome<CurveState> operator()(const ConstantVolume &) const
    {
        const double T = start.temperature * std::exp(x);
        const auto state = gas::stateAt(gas, T, start.molarVolume);
        if (!state) return state.failure();
        return withSlopes(*state, T, 0.0);
    }
    Outcome<CurveState> operator()(const ConstantEntropy &) const
    {
        const double v = start.molarVolume * std::exp(x);
        const auto state = gas::stateFrom(gas, {Property::molarVolume, v}, {Property::entropy, start.entropy}, guess);
        if (!state) return state.failure();
        CurveState result = withSlopes(*state, -state->temperature * state->dpdT * v / state->isochoricHeatCapacity, v);
        result.Tdsdx = 0.0; // by the law; the two terms above only cancel to rounding
        return result;
    }
    Outcome<CurveState> operator()(const PowerLaw &law) const
    {
        const double p = start.pressure * std::exp(-law.exponent * x);
        return atPressure(p, -law.exponent * p);
    }
    Outcome<CurveState> operator()(const StraightLine &law) const
    {
        // expm1: close to the start the difference of two volumes would lose the digits that the slope multiplies.
        const double p = start.pressure + law.stiffness * start.molarVolume * std::expm1(x);
        if (!(p > 0.0))
            return Failure{Reason::unreachable, "", {"the pressure would fall to zero on this straight line", {}}};
        return atPressure(p, law.stiffness * start.molarVolume * std::exp(x));
    }

private:
    [[nodiscard]] Outcome<CurveState> atPressure(double p, double dpdx) const
    {
        const double v = start.molarVolume * std::exp(x);
        const auto state = gas::stateFrom(gas, {Property::molarVolume, v}, {Property::pressure, p}, guess);
        if (!state) return state.failure();
        return onPressureLaw(*state, dpdx, v);
    }
};

} // namespace

QuasiStaticCurve::QuasiStaticCurve(gas::GasPtr gas, double amount, const MolarState &start, Law law,
                                   double endCoordinate)
    : m_gas(std::move(gas)), m_amount(amount), m_start(start), m_law(law), m_end(endCoordinate)
{
}

Outcome<CurveState> QuasiStaticCurve::at(double x, const MolarState *guess) const
{
    const auto result = std::visit(StateOnLaw{*m_gas, m_start, x, guess ? guess : &m_start}, m_law);
    if (!result) return result;
    const gas::Range &hard = m_gas->validity().hard;
    const MolarState &s = result->state;
    if (!(s.temperature > hard.lowestTemperature && s.temperature < hard.highestTemperature &&
          s.pressure <= hard.highestPressure && s.pressure > 0.0))
        return Failure{
            Reason::outsideModel,
            "",
            {"the gas would pass {0}, {1}, but its model ends at {2} and {3}",
             {Figure{units::Quantity::temperature, s.temperature}, Figure{units::Quantity::pressure, s.pressure},
              Figure{units::Quantity::temperature, hard.lowestTemperature},
              Figure{units::Quantity::temperature, hard.highestTemperature}}}};
    return result;
}

} // namespace quasistat::path
