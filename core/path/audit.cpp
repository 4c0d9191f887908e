#include "core/path/audit.h"

#include "core/path/along_curve.h"

#include <algorithm>
#include <cmath>

namespace quasistat::path
{
namespace
{

struct Changes {
    double internalEnergy; ///< [J]
    double entropy;        ///< [J/K]
};

/// ∫(T (∂p/∂T)_v − p) dv and ∫(∂p/∂T)_v dv at T₁, then ∫c_v dT and ∫c_v/T dT at v₂.
Outcome<Changes> changesByQuadrature(const gas::State &from, const gas::State &to)
{
    const gas::MolarState &a = from.molar();
    const gas::MolarState &b = to.molar();
    const double n = from.amount();
    const QuasiStaticCurve isotherm(from.sharedGas(), n, a, ConstantTemperature{},
                                    std::log(b.molarVolume / a.molarVolume));
    const auto corner = isotherm.at(isotherm.endCoordinate());
    if (!corner) return corner.failure();
    const QuasiStaticCurve isochore(from.sharedGas(), n, corner->state, ConstantVolume{},
                                    std::log(b.temperature / a.temperature));
    const auto seams = seamCrossings(isochore, {});
    if (!seams) return seams.failure();

    const auto energyAtT = integral(isotherm, 0.0, isotherm.endCoordinate(), {}, [](const CurveState &c) {
        return (c.state.temperature * c.state.dpdT - c.state.pressure) * c.dvdx;
    });
    const auto entropyAtT = integral(isotherm, 0.0, isotherm.endCoordinate(), {},
                                     [](const CurveState &c) { return c.state.dpdT * c.dvdx; });
    const auto energyAtV = integral(isochore, 0.0, isochore.endCoordinate(), *seams,
                                    [](const CurveState &c) { return c.state.isochoricHeatCapacity * c.dTdx; });
    const auto entropyAtV = integral(isochore, 0.0, isochore.endCoordinate(), *seams, [](const CurveState &c) {
        return c.state.isochoricHeatCapacity / c.state.temperature * c.dTdx;
    });
    for (const auto *part : {&energyAtT, &entropyAtT, &energyAtV, &entropyAtV})
        if (!*part) return part->failure();
    return Changes{n * (*energyAtT + *energyAtV), n * (*entropyAtT + *entropyAtV)};
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
    audit.ok = std::abs(audit.firstLawResidual) <= auditTolerance * audit.scale;
    return audit;
}

Audit irreversibleAudit(const gas::State &from, const gas::State &to, const IrreversibleAccount &account)
{
    const double deltaU = from.amount() * (to.molar().internalEnergy - from.molar().internalEnergy);
    Audit audit{.scale = auditScale(from, account.work, account.heat, deltaU)};
    const auto changes = changesByQuadrature(from, to);
    if (!changes) return audit; // not ok: what cannot be checked is not shown as good
    const double T0 = account.surroundingsTemperature;
    const double availableHeat = account.bathTemperature ? account.heat * (1.0 - T0 / *account.bathTemperature) : 0.0;
    audit.firstLawResidual = changes->internalEnergy - account.work - account.heat;
    audit.lostWorkResidual =
        account.lostWork - (account.work + availableHeat - changes->internalEnergy + T0 * changes->entropy);
    const double lostWorkScale = audit.scale + T0 * std::abs(changes->entropy);
    audit.ok = std::abs(audit.firstLawResidual) <= auditTolerance * audit.scale &&
               std::abs(audit.lostWorkResidual) <= auditTolerance * lostWorkScale;
    return audit;
}

} // namespace quasistat::path
