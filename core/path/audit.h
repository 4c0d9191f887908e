#pragma once
// The account of a segment, checked by a second route.

#include "core/path/result.h"

namespace quasistat::path
{

/// Agreement asked for between two routes, relative to the scale of the segment (format of results, "Audit").
inline constexpr double auditTolerance = 1e-9;

/// max(|W|, |Q|, |ΔU|, 1e-6 n R T₁) [J].
[[nodiscard]] double auditScale(const gas::State &from, double work, double heat, double deltaInternalEnergy);

/// Quasi-static: work from ∫p dV and heat from ∫T dS, each by its own quadrature, against the state function U.
[[nodiscard]] Audit quasiStaticAudit(const gas::State &from, const gas::State &to, double work, double heatByEntropy);

/// What an irreversible segment claims.
struct IrreversibleAccount {
    double work;                           ///< [J]
    double heat;                           ///< [J]
    double lostWork;                       ///< [J]
    std::optional<double> bathTemperature; ///< [K]; none if adiabatic
    double surroundingsTemperature;        ///< T₀ [K]
};

/// Second route: ΔU and ΔS from the heat capacity and p(T, v) along an isotherm and an isochore between the two states,
/// by quadrature; then the first law, and the availability balance W + Q (1 − T₀/T_b) − ΔU + T₀ ΔS for the lost work.
[[nodiscard]] Audit irreversibleAudit(const gas::State &from, const gas::State &to, const IrreversibleAccount &account);

} // namespace quasistat::path
