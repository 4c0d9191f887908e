#include "core/path/irreversible.h"

#include "core/gas/solve/solve.h"
#include "core/path/arrival.h"
#include "core/path/audit.h"
#include "core/path/end_on_law.h"
#include "core/path/reversible_limit.h"
#include "core/path/sample.h"

#include <algorithm>
#include <cmath>
#include <type_traits>

namespace quasistat::path
{
namespace
{

using gas::MolarState;
using gas::Property;
using gas::State;
using units::Quantity;

/// More steps than this are a reversible path for every purpose, and a typing error.
constexpr int mostSteps = 100000;

State stateOf(const State &from, const MolarState &molar)
{
    return {from.sharedGas(), from.amount(), molar};
}

/// The states a segment goes through and the work of each move.
struct Moves {
    std::vector<MolarState> balances; ///< after each move
    double work = 0.0;                ///< [J]
    Thermal thermal;
};

struct Outline {
    Polyline curve;
    Polyline workLine;
    bool areaIsWork;
};

CurvePoint cornerAt(const CurvePoint &like, double volume, double pressure)
{
    return {volume, pressure, like.temperature, like.entropy};
}

/// One move against a constant pressure: u₂ − u₁ = −p_ext (v₂ − v₁) when adiabatic, T₂ = T₁ when isothermal.
Outcome<MolarState> balanceAgainst(const State &from, const MolarState &start, double pressure, Thermal thermal)
{
    const gas::Given p{Property::pressure, pressure};
    if (thermal == Thermal::isothermal)
        return gas::stateFrom(from.gas(), {Property::temperature, start.temperature}, p, &start);
    // At balance p₂ = p_ext, so the energy balance reads h₂ = u₁ + p_ext v₁.
    return gas::stateFrom(from.gas(), {Property::enthalpy, start.internalEnergy + pressure * start.molarVolume}, p,
                          &start);
}

Outcome<MolarState> stoppedAt(const State &from, double molarVolume, double pressure, Thermal thermal)
{
    const MolarState &start = from.molar();
    const gas::Given v{Property::molarVolume, molarVolume};
    if (thermal == Thermal::isothermal)
        return gas::stateFrom(from.gas(), {Property::temperature, start.temperature}, v, &start);
    const double u = start.internalEnergy - pressure * (molarVolume - start.molarVolume);
    return gas::stateFrom(from.gas(), {Property::internalEnergy, u}, v, &start);
}

/// A stop is a volume between the start's and that at balance.
Outcome<MolarState> stopBeforeBalance(const State &from, const MolarState &balance, double volume, double pressure,
                                      Thermal thermal, const std::string &pointer)
{
    const double n = from.amount();
    const double lowest = std::min(from.volume(), n * balance.molarVolume);
    const double highest = std::max(from.volume(), n * balance.molarVolume);
    constexpr double rounding = 1e-12;
    if (volume < lowest * (1.0 - rounding) || volume > highest * (1.0 + rounding)) {
        const char *why =
            from.pressure() > pressure
                ? "at {0} against {1} the gas only expands, and balance is reached at {2}; a stop lies between {3} "
                  "and {2}"
                : "at {0} against {1} the gas is only pressed together, and balance is reached at {2}; a stop lies "
                  "between {2} and {3}";
        return Failure{
            Reason::unreachable, pointer,
            because({"the gas cannot reach {0} on this segment", {Figure{Quantity::volume, volume}}},
                    {why,
                     {Figure{Quantity::pressure, from.pressure()}, Figure{Quantity::pressure, pressure},
                      Figure{Quantity::volume, n * balance.molarVolume}, Figure{Quantity::volume, from.volume()}}})};
    }
    return stoppedAt(from, volume / n, pressure, thermal);
}

Outcome<Moves> movesOf(const State &from, const ConstantExternalPressure &piston, const ResolvedSegment &segment)
{
    const double pressure = std::get<double>(piston.externalPressure);
    auto end = balanceAgainst(from, from.molar(), pressure, piston.thermal);
    if (!end) return at("/external_pressure", end.failure());
    if (segment.arrival)
        end = stopBeforeBalance(from, *end, segment.arrival->volume(), pressure, piston.thermal, "/end/state");
    else if (!segment.ends.empty())
        end = stopBeforeBalance(from, *end, segment.ends.front().second, pressure, piston.thermal, "/end/volume");
    if (!end) return end.failure();
    const double work = -pressure * from.amount() * (end->molarVolume - from.molar().molarVolume);
    return Moves{{*end}, work, piston.thermal};
}

double stepPressure(double from, double to, const Stepped &stepped, int step)
{
    if (step == stepped.steps) return to; // exactly as asked for
    const double share = static_cast<double>(step) / stepped.steps;
    return stepped.spacing == Spacing::ratio ? from * std::pow(to / from, share) : from + (to - from) * share;
}

Outcome<Moves> movesOf(const State &from, const Stepped &stepped, const ResolvedSegment &segment)
{
    if (stepped.steps < 1 || stepped.steps > mostSteps)
        return Failure{Reason::outOfRange, "/steps", {"the number of steps must be from 1 to 100000", {}}};
    const double last = segment.arrival ? segment.arrival->pressure() : segment.ends.front().second;
    Moves moves{.thermal = stepped.thermal};
    MolarState here = from.molar();
    for (int i = 1; i <= stepped.steps; ++i) {
        const double pressure = stepPressure(from.pressure(), last, stepped, i);
        const auto next = balanceAgainst(from, here, pressure, stepped.thermal);
        if (!next) return at("/end", next.failure());
        moves.work -= pressure * from.amount() * (next->molarVolume - here.molarVolume);
        moves.balances.push_back(*next);
        here = *next;
    }
    return moves;
}

Outcome<Moves> movesOf(const State &from, const FreeExpansion &expansion, const ResolvedSegment &segment)
{
    double volume = segment.arrival ? segment.arrival->volume() : segment.ends.front().second;
    const EndKey key = segment.arrival ? EndKey::volume : segment.ends.front().first;
    if (key == EndKey::volumeRatio) volume *= from.volume();
    if (volume < from.volume())
        return unreachable(
            key, segment.arrival ? volume : segment.ends.front().second,
            {"gas left to itself only spreads out, and starts with {0}", {Figure{Quantity::volume, from.volume()}}});
    const auto end = stoppedAt(from, volume / from.amount(), 0.0, expansion.thermal);
    if (!end) return at("/end", end.failure());
    return Moves{{*end}, 0.0, expansion.thermal};
}

/// Down or up to the outside pressure, then level; a last drop where the gas is stopped before balance.
Outline outline(const State &from, const ConstantExternalPressure &piston, const Moves &moves)
{
    const double pressure = std::get<double>(piston.externalPressure);
    const CurvePoint first = curvePoint(from);
    const CurvePoint last = curvePoint(stateOf(from, moves.balances.back()));
    const Polyline level{cornerAt(first, first.volume, pressure), cornerAt(last, last.volume, pressure)};
    Polyline curve{first};
    curve.insert(curve.end(), level.begin(), level.end());
    if (std::abs(last.pressure - pressure) > 1e-9 * pressure) curve.push_back(last);
    return {std::move(curve), level, true};
}

/// A staircase; with very many steps every so many are drawn as one, which no eye can tell.
Outline outline(const State &from, const Stepped &, const Moves &moves)
{
    constexpr std::size_t mostDrawn = 400;
    const std::size_t stride = std::max<std::size_t>(1, moves.balances.size() / mostDrawn);
    Polyline stairs;
    CurvePoint here = curvePoint(from);
    Polyline curve{here};
    for (std::size_t i = stride - 1; i < moves.balances.size(); i += stride) {
        const bool lastOne = i + stride >= moves.balances.size();
        const CurvePoint next = curvePoint(stateOf(from, lastOne ? moves.balances.back() : moves.balances[i]));
        stairs.push_back(cornerAt(here, here.volume, next.pressure));
        stairs.push_back(next);
        here = next;
    }
    curve.insert(curve.end(), stairs.begin(), stairs.end());
    return {std::move(curve), std::move(stairs), true};
}

/// The states the gas would pass if it were let out in ever smaller portions: a guide for the eye, whose area is no
/// work.
Outline outline(const State &from, const FreeExpansion &expansion, const Moves &moves)
{
    constexpr int points = 48;
    Polyline curve;
    const double x = std::log(moves.balances.back().molarVolume / from.molar().molarVolume);
    for (int i = 0; i <= points; ++i) {
        const auto state = stoppedAt(from, from.molar().molarVolume * std::exp(x * i / points), 0.0, expansion.thermal);
        if (state) curve.push_back(curvePoint(stateOf(from, *state)));
    }
    const CurvePoint last = curvePoint(stateOf(from, moves.balances.back()));
    return {std::move(curve), {cornerAt(last, from.volume(), 0.0), cornerAt(last, last.volume, 0.0)}, false};
}

Interval between(double a, double b)
{
    return {std::min(a, b), std::max(a, b)};
}

/// p, V and T at the balances run one way, so the ends are the extremes; intermediate balances are looked at all the
/// same.
Extrema extremaOf(const State &from, const Moves &moves)
{
    const double n = from.amount();
    const MolarState &start = from.molar();
    Extrema e{between(start.pressure, start.pressure), between(from.volume(), from.volume()),
              between(start.temperature, start.temperature)};
    for (const MolarState &s : moves.balances) {
        e.pressure = {std::min(e.pressure.lowest, s.pressure), std::max(e.pressure.highest, s.pressure)};
        e.volume = {std::min(e.volume.lowest, n * s.molarVolume), std::max(e.volume.highest, n * s.molarVolume)};
        e.temperature = {std::min(e.temperature.lowest, s.temperature), std::max(e.temperature.highest, s.temperature)};
    }
    return e;
}

template <class Kind>
Outcome<SegmentResult> computed(const State &from, const Kind &kind, const ResolvedSegment &segment,
                                const Surroundings &surroundings)
{
    if (segment.ends.empty() && !segment.arrival && !std::is_same_v<Kind, ConstantExternalPressure>)
        return Failure{Reason::missing, "/end", {"this segment needs an end", {}}};
    auto moves = movesOf(from, kind, segment);
    if (!moves) return moves.failure();
    const MolarState &end = moves->balances.back();
    if (segment.arrival) {
        const auto check = arrived(end, from, *segment.arrival, segment.arrivalNumber);
        if (!check) return check.failure();
    }

    const bool isothermal = moves->thermal == Thermal::isothermal;
    SegmentResult r{.kind = kindOf(segment.process), .label = segment.label, .from = from, .to = stateOf(from, end)};
    const double n = from.amount();
    const double deltaU = n * (end.internalEnergy - from.molar().internalEnergy);
    const double deltaS = n * (end.entropy - from.molar().entropy);
    r.work = moves->work;
    r.heat = isothermal ? deltaU - r.work : 0.0;
    const double bath = from.molar().temperature;
    r.entropyGenerated = deltaS - r.heat / bath;
    r.exchange = {.in = std::max(r.heat, 0.0), .out = std::max(-r.heat, 0.0)};
    if (r.heat > 0.0) r.exchange.temperatureIn = between(bath, bath);
    if (r.heat < 0.0) r.exchange.temperatureOut = between(bath, bath);
    r.extrema = extremaOf(from, *moves);

    Outline drawn = outline(from, kind, *moves);
    r.drawing.curve = std::move(drawn.curve);
    r.drawing.workLine = std::move(drawn.workLine);
    r.drawing.areaIsWork = drawn.areaIsWork;
    r.drawing.dashedOutline = !drawn.areaIsWork;
    r.drawing.hatchShortfall = isothermal;
    compareWithLimit(r, isothermal ? isothermalLimit(from, r.to) : adiabaticLimit(from, r.to));
    r.audit = irreversibleAudit(from, r.to,
                                {.work = r.work,
                                 .heat = r.heat,
                                 .lostWork = surroundings.temperature * r.entropyGenerated,
                                 .bathTemperature = isothermal ? std::optional(bath) : std::nullopt,
                                 .surroundingsTemperature = surroundings.temperature});
    return r;
}

} // namespace

Outcome<SegmentResult> irreversible(const State &from, const ResolvedSegment &segment, const Surroundings &surroundings)
{
    if (const auto *piston = std::get_if<ConstantExternalPressure>(&segment.process))
        return computed(from, *piston, segment, surroundings);
    if (const auto *stepped = std::get_if<Stepped>(&segment.process))
        return computed(from, *stepped, segment, surroundings);
    return computed(from, std::get<FreeExpansion>(segment.process), segment, surroundings);
}

} // namespace quasistat::path
