#pragma once
// What a computed path holds: one object that screen, report and JSON read.

#include "core/gas/state.h"
#include "core/path/kind.h"
#include "core/path/quasi_static_curve.h"

#include <cstddef>
#include <memory>
#include <optional>
#include <vector>

namespace quasistat::path
{

/// A point for drawing: whole charge, SI.
struct CurvePoint {
    double volume;
    double pressure;
    double temperature;
    double entropy;
};
using Polyline = std::vector<CurvePoint>;

struct Interval {
    double lowest;
    double highest;
};

struct Extrema {
    Interval pressure;
    Interval volume;
    Interval temperature;
};

/// The figures that two independent routes must agree on (format of results, "Audit").
struct Audit {
    double firstLawResidual = 0.0;       ///< ΔU − W − Q, Q by its own route [J]
    std::optional<double> heatByEntropy; ///< ∫T dS [J]; none for an irreversible segment
    double scale = 0.0;                  ///< max(|W|, |Q|, |ΔU|, 1e-6 nRT) [J]
    double lostWorkResidual = 0.0;       ///< irreversible: T₀ S_gen against the availability balance [J]
    bool ok = false;                     ///< both residuals within 1e-9 of the scale
};

/// Heat that enters and leaves along a segment, each positive [J], and the gas (or bath) temperatures where it does
/// [K].
struct HeatExchange {
    double in = 0.0;
    double out = 0.0;
    std::optional<Interval> temperatureIn;
    std::optional<Interval> temperatureOut;
};

struct IdealGasFigures {
    double work;           ///< [J]
    double heat;           ///< [J]
    double endTemperature; ///< [K]
};

/// Everything drawn for one segment on the p–V plane.
struct Drawing {
    Polyline curve;              ///< the states passed through; for irreversible kinds the line that is drawn
    Polyline reversibleLimit;    ///< ghost; empty for quasi-static kinds
    bool hatchShortfall = false; ///< isothermal contact: the area between work line and limit is the shortfall
    bool areaIsWork = true;      ///< the area under `workLine` is the work
    Polyline workLine;           ///< outline whose area is the work: the curve, staircase or level line
    bool dashedOutline = false;  ///< the drawn curve's own area is not the work
};

/// Where a segment meets the phase boundary.
struct PhaseCrossing {
    gas::State state;    ///< on the boundary
    bool entersTwoPhase; ///< false: leaves it
};

struct SegmentResult {
    Kind kind;
    std::string label;
    gas::State from;
    gas::State to;
    std::optional<double> exponent;

    double work = 0.0;                         ///< boundary work on the gas [J]
    double heat = 0.0;                         ///< into the gas [J]
    std::optional<double> steadyFlowWork;      ///< ΔH − Q [J]
    std::optional<double> rodWork;             ///< W + p₀ ΔV [J]
    std::optional<double> atmosphereWork;      ///< p₀ ΔV [J], on the surroundings
    double deltaInternalEnergy = 0.0;          ///< [J]
    double deltaEnthalpy = 0.0;                ///< [J]
    double deltaEntropy = 0.0;                 ///< [J/K]
    double entropyGenerated = 0.0;             ///< [J/K]
    double lostWork = 0.0;                     ///< T₀ S_gen [J]
    std::optional<double> reversibleLimitWork; ///< [J]
    std::optional<double> reversibleLimitSteadyFlowWork;
    std::optional<double> shortfall;        ///< W − W_rev [J]
    std::optional<double> recovery;         ///< W/W_rev expanding, W_rev/W compressing
    double energyWithMatter = 0.0;          ///< [J]
    double amountIn = 0.0;                  ///< [mol]
    std::optional<double> availableWorkOut; ///< [J]
    std::optional<IdealGasFigures> idealGas;
    std::optional<double> duration;            ///< [s]
    std::vector<PhaseCrossing> phaseCrossings; ///< in the order of the path

    Extrema extrema{};
    HeatExchange exchange;
    Audit audit;
    Drawing drawing;
    /// The law followed, for reading states off it; null for irreversible kinds.
    std::shared_ptr<const QuasiStaticCurve> curve;
    std::vector<Message> warnings;
};

struct StoredEnergy {
    double ideal; ///< [J]
    double real;  ///< [J]
};

/// A state with the figures that need the surroundings.
struct StateResult {
    gas::State state;
    std::optional<double> availableWork;      ///< [J]
    std::optional<StoredEnergy> storedEnergy; ///< none below p₀ or outside the model
};

struct Totals {
    double work = 0.0;
    double heat = 0.0;
    double heatIn = 0.0;
    double heatOut = 0.0;
    double deltaInternalEnergy = 0.0;
    std::optional<double> steadyFlowWork;
    double entropyGenerated = 0.0;
    double lostWork = 0.0;
    bool closed = false;
    double netWorkOut = 0.0;
    std::optional<double> thermalEfficiency;
    std::optional<double> copHeating;
    std::optional<double> copCooling;
    std::optional<double> carnotRatio;
    std::optional<double> meanEffectivePressure; ///< [Pa]
    std::optional<double> power;                 ///< [W]
};

/// A path as far as it can be computed. `segments[k]` joins `states[k]` and `states[k + 1]`; after a failed segment
/// there is none, and every later one fails with Reason::notReached.
struct PathResult {
    gas::GasPtr gas;
    std::vector<StateResult> states;
    std::vector<SegmentResult> segments;
    std::vector<std::optional<Failure>> failures; ///< one entry per segment of the input; pointer "/segments/k…"
    std::optional<Failure> startFailure;
    Totals totals;
    std::vector<Warning> warnings;

    [[nodiscard]] bool complete() const; ///< start and every segment computed
};

} // namespace quasistat::path
