#include "core/path/audit.h"

#include "core/path/along_curve.h"
#include "core/path/phase_crossings.h"

#include <algorithm>
#include <cmath>
#include <limits>

namespace quasistat::path
{
namespace
{

struct Changes {
    double internalEnergy; ///< [J]
    double entropy;        ///< [J/K]
    double magnitude;      ///< of the parts that may cancel in the internal energy [J]
};

/// ∫ of what T and v change along one stretch, each integral split where the integrand bends or jumps.
Outcome<Changes> changesAlong(const QuasiStaticCurve &curve)
{
    const double end = curve.endCoordinate();
    const auto breaks = unevenPoints(curve, {}, phaseCrossings(curve, 0.0, end));
    if (!breaks) return breaks.failure();
    const auto energy = integral(curve, 0.0, end, *breaks, [](const CurveState &c) {
        return c.state.isochoricHeatCapacity * c.dTdx +
               (c.state.temperature * c.state.dpdT - c.state.pressure) * c.dvdx;
    });
    const auto entropy = integral(curve, 0.0, end, *breaks, [](const CurveState &c) {
        return c.state.isochoricHeatCapacity / c.state.temperature * c.dTdx + c.state.dpdT * c.dvdx;
    });
    if (!energy) return energy.failure();
    if (!entropy) return entropy.failure();
    return Changes{curve.amount() * *energy, curve.amount() * *entropy, curve.amount() * std::abs(*energy)};
}

/// Along `first` from the start, then along the other of isotherm and isochore to the end.
Outcome<Changes> changesByWayOf(const Law &first, const gas::State &from, const gas::State &to)
{
    const double lnV = std::log(to.molar().molarVolume / from.molar().molarVolume);
    const double lnT = std::log(to.molar().temperature / from.molar().temperature);
    const bool isothermFirst = std::holds_alternative<ConstantTemperature>(first);
    const QuasiStaticCurve one(from.sharedGas(), from.amount(), from.molar(), first, isothermFirst ? lnV : lnT);
    const auto corner = one.at(one.endCoordinate());
    if (!corner) return corner.failure();
    const Law second = isothermFirst ? Law(ConstantVolume{}) : Law(ConstantTemperature{});
    const QuasiStaticCurve two(from.sharedGas(), from.amount(), corner->state, second, isothermFirst ? lnT : lnV);
    const auto a = changesAlong(one);
    if (!a) return a;
    const auto b = changesAlong(two);
    if (!b) return b;
    return Changes{a->internalEnergy + b->internalEnergy, a->entropy + b->entropy, a->magnitude + b->magnitude};
}

/// du = c_v dT + (T (∂p/∂T)_v − p) dv and ds = c_v/T dT + (∂p/∂T)_v dv, integrated from one state to the other. A
/// corner beyond the model is gone round by the other.
Outcome<Changes> changesByQuadrature(const gas::State &from, const gas::State &to)
{
    const auto changes = changesByWayOf(ConstantTemperature{}, from, to);
    if (changes) return changes;
    return changesByWayOf(ConstantVolume{}, from, to);
}

/// What double precision leaves of ΔU as the difference of two energies, and of T ΔS: a liquid pressed together changes
/// by less than a millionth of nRT, and its energy counts from the ideal gas at 298.15 K [J].
double roundingOf(const gas::State &from, const gas::State &to)
{
    constexpr double digitsLost = 100.0 * std::numeric_limits<double>::epsilon();
    return digitsLost * (std::abs(from.internalEnergy()) + std::abs(to.internalEnergy()) +
                         from.molar().temperature * (std::abs(from.entropy()) + std::abs(to.entropy())));
}

} // namespace

double auditScale(const gas::State &from, double work, double heat, double deltaInternalEnergy)
{
    const double nRT = from.amount() * from.gas().gasConstant() * from.molar().temperature;
    return std::max({std::abs(work), std::abs(heat), std::abs(deltaInternalEnergy), 1e-6 * nRT});
}

Audit quasiStaticAudit(const gas::State &from, const gas::State &to, double work, double heatByEntropy)
{
    const double deltaU = from.amount() * (to.molar().internalEnergy - from.molar().internalEnergy);
    Audit audit{.firstLawResidual = deltaU - work - heatByEntropy,
                .heatByEntropy = heatByEntropy,
                .scale = auditScale(from, work, heatByEntropy, deltaU)};
    audit.ok = std::abs(audit.firstLawResidual) <= auditTolerance * audit.scale + roundingOf(from, to);
    return audit;
}

Audit irreversibleAudit(const gas::State &from, const gas::State &to, const IrreversibleAccount &account)
{
    const double deltaU = from.amount() * (to.molar().internalEnergy - from.molar().internalEnergy);
    Audit audit{.scale = auditScale(from, account.work, account.heat, deltaU)};
    const auto changes = changesByQuadrature(from, to);
    if (!changes) return audit; // not ok: what cannot be checked is not shown as good
    // A gas that expands freely keeps its energy as the small difference of two that the integrals do not know to
    // cancel.
    audit.scale = std::max(audit.scale, changes->magnitude);
    const double T0 = account.surroundingsTemperature;
    const double availableHeat = account.bathTemperature ? account.heat * (1.0 - T0 / *account.bathTemperature) : 0.0;
    audit.firstLawResidual = changes->internalEnergy - account.work - account.heat;
    audit.lostWorkResidual =
        account.lostWork - (account.work + availableHeat - changes->internalEnergy + T0 * changes->entropy);
    const double lostWorkScale = audit.scale + T0 * std::abs(changes->entropy);
    const double rounding = roundingOf(from, to);
    audit.ok = std::abs(audit.firstLawResidual) <= auditTolerance * audit.scale + rounding &&
               std::abs(audit.lostWorkResidual) <= auditTolerance * lostWorkScale + rounding;
    return audit;
}

} // namespace quasistat::path
