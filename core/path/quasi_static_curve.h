#pragma once
// The law that a quasi-static segment follows, as a curve through states: from its start in either direction.

#include "core/gas/state.h"

#include <variant>

namespace quasistat::path
{

/// Laws, each through the start state of the curve.
struct ConstantTemperature {
};
struct ConstantPressure {
};
struct ConstantVolume {
};
struct ConstantEntropy {
};
struct PowerLaw {
    double exponent; ///< p Vⁿ = constant
};
struct StraightLine {
    double stiffness; ///< dp/dv [Pa mol/m³], molar
};
using Law =
    std::variant<ConstantTemperature, ConstantPressure, ConstantVolume, ConstantEntropy, PowerLaw, StraightLine>;

/// A state on a curve with the slopes there.
struct CurveState {
    gas::MolarState state;
    double dTdx;  ///< dT/dx [K]
    double dpdx;  ///< dp/dx [Pa]
    double dvdx;  ///< dv/dx [m³/mol]
    double Tdsdx; ///< T ds/dx [J/mol]: heat per coordinate, from c_v and (∂p/∂T)_v, not from entropy differences
};

/// The coordinate x is ln(v/v₁) on every law but ConstantVolume, where it is ln(T/T₁); x = 0 at the start.
/// Positive x expands (or heats at constant volume). Immutable; shared between threads.
class QuasiStaticCurve
{
public:
    QuasiStaticCurve(gas::GasPtr gas, double amount, const gas::MolarState &start, Law law, double endCoordinate);

    /// State at x. `guess`: state of a neighbouring point or null. Fails where the law leaves the model.
    [[nodiscard]] Outcome<CurveState> at(double x, const gas::MolarState *guess = nullptr) const;

    [[nodiscard]] double endCoordinate() const { return m_end; }
    [[nodiscard]] double amount() const { return m_amount; }
    [[nodiscard]] const gas::MolarState &start() const { return m_start; }
    [[nodiscard]] const Law &law() const { return m_law; }
    [[nodiscard]] const gas::Gas &gas() const { return *m_gas; }

private:
    gas::GasPtr m_gas;
    double m_amount;
    gas::MolarState m_start;
    Law m_law;
    double m_end;
};

} // namespace quasistat::path
