#include "core/path/evaluate.h"

#include "core/gas/solve/solve.h"
#include "core/path/dead_state.h"
#include "core/path/irreversible.h"
#include "core/path/quasi_static.h"
#include "core/path/resolved_segment.h"
#include "core/path/start.h"
#include "core/path/totals.h"

#include <fmt/format.h>

namespace quasistat::path
{
namespace
{

using units::Quantity;

std::string pointerTo(std::size_t segment)
{
    return fmt::format("/segments/{}", segment);
}

Outcome<SegmentResult> byKind(const gas::State &from, const ResolvedSegment &segment, const Surroundings &surroundings)
{
    if (from.isEvacuated())
        return Failure{
            Reason::contradiction,
            "/kind",
            {"nothing is in the volume yet: only fill, intake or connect may follow an evacuated start", {}}};
    if (facts(kindOf(segment.process)).quasiStatic) return quasiStatic(from, segment);
    return irreversible(from, segment, surroundings);
}

/// The same segment with the ideal part of the same equation, from the same p, T and amount.
std::optional<IdealGasFigures> idealGasFigures(const SegmentResult &real, const ResolvedSegment &segment,
                                               const Surroundings &surroundings)
{
    if (real.from.gas().isIdeal()) return IdealGasFigures{real.work, real.heat, real.to.molar().temperature};
    // The ideal part lives inside its equation, which the charge keeps alive.
    const gas::GasPtr ideal(real.from.sharedGas(), &real.from.gas().idealPart());
    const auto start = gas::stateFrom(*ideal, {gas::Property::pressure, real.from.pressure()},
                                      {gas::Property::temperature, real.from.molar().temperature});
    if (!start) return std::nullopt;
    ResolvedSegment same = segment;
    if (segment.arrival) { // its end as written: the pressure and the volume of that state
        const auto end = gas::stateFrom(*ideal, {gas::Property::pressure, segment.arrival->pressure()},
                                        {gas::Property::molarVolume, segment.arrival->molar().molarVolume});
        if (!end) return std::nullopt;
        same.arrival = gas::State(ideal, segment.arrival->amount(), *end);
    }
    const auto result = byKind(gas::State(ideal, real.from.amount(), *start), same, surroundings);
    if (!result) return std::nullopt;
    return IdealGasFigures{result->work, result->heat, result->to.molar().temperature};
}

void addDerivedFigures(SegmentResult &r, const ResolvedSegment &segment, const Surroundings &surroundings)
{
    r.deltaInternalEnergy = r.to.internalEnergy() - r.from.internalEnergy();
    r.deltaEnthalpy = r.to.enthalpy() - r.from.enthalpy();
    r.deltaEntropy = r.to.entropy() - r.from.entropy();
    r.lostWork = surroundings.temperature * r.entropyGenerated;
    if (r.kind != Kind::freeExpansion) {
        r.steadyFlowWork = r.deltaEnthalpy - r.heat;
        r.atmosphereWork = surroundings.pressure * (r.to.volume() - r.from.volume());
        r.rodWork = r.work + *r.atmosphereWork;
    }
    r.idealGas = idealGasFigures(r, segment, surroundings);
}

/// The warning with what is published of the uncertainty, if anything is.
Message withUncertainty(Message message, const gas::Gas &gas)
{
    const std::string &uncertainty = gas.validity().uncertainty;
    if (uncertainty.empty()) return message;
    return because(std::move(message), {"published uncertainty: {0}", {uncertainty}});
}

void warnOutsideRange(SegmentResult &r)
{
    const gas::Gas &gas = r.from.gas();
    const gas::Range &valid = gas.validity().valid;
    const Interval &T = r.extrema.temperature;
    const bool isBeyondTemperature = T.lowest < valid.lowestTemperature || T.highest > valid.highestTemperature;
    if (isBeyondTemperature && gas.isIdeal())
        r.warnings.push_back(
            {"the gas is between {0} and {1}, beyond the published range of its heat capacity from {2} to {3}; "
             "the heat capacity at the end of the range is used there",
             {Figure{Quantity::temperature, T.lowest}, Figure{Quantity::temperature, T.highest},
              Figure{Quantity::temperature, valid.lowestTemperature},
              Figure{Quantity::temperature, valid.highestTemperature}}});
    if (isBeyondTemperature && !gas.isIdeal())
        r.warnings.push_back(
            withUncertainty({"the gas is between {0} and {1}, beyond the range of its equation from {2} to {3}",
                             {Figure{Quantity::temperature, T.lowest}, Figure{Quantity::temperature, T.highest},
                              Figure{Quantity::temperature, valid.lowestTemperature},
                              Figure{Quantity::temperature, valid.highestTemperature}}},
                            gas));
    if (r.extrema.pressure.highest > valid.highestPressure)
        r.warnings.push_back(withUncertainty({"the gas reaches {0}, beyond the range of its equation up to {1}",
                                              {Figure{Quantity::pressure, r.extrema.pressure.highest},
                                               Figure{Quantity::pressure, valid.highestPressure}}},
                                             gas));
}

Outcome<SegmentResult> computedSegment(const Segment &said, std::span<const StateResult> states,
                                       const Surroundings &surroundings)
{
    const auto segment = resolved(said, states);
    if (!segment) return segment.failure();
    auto result = byKind(states.back().state, *segment, surroundings);
    if (!result) return result;
    addDerivedFigures(*result, *segment, surroundings);
    warnOutsideRange(*result);
    return result;
}

StateResult withSurroundings(const gas::State &state, const Outcome<gas::MolarState> &dead,
                             const Surroundings &surroundings)
{
    StateResult result{.state = state};
    if (dead) result.availableWork = availableWork(state, *dead, surroundings);
    result.storedEnergy = storedEnergy(state, surroundings.pressure);
    return result;
}

void warnOfDefaults(PathResult &result, const Surroundings &surroundings)
{
    if (!surroundings.pressureStated)
        result.warnings.push_back(
            {"/surroundings",
             {"the surroundings' pressure is not given: {0} is used for rod work, available work and "
              "stored energy",
              {Figure{Quantity::pressure, surroundings.pressure}}}});
    if (!surroundings.temperatureStated)
        result.warnings.push_back(
            {"/surroundings",
             {"the surroundings' temperature is not given: {0} is used for lost work and available work",
              {Figure{Quantity::temperature, surroundings.temperature}}}});
}

Failure waitsFor(std::size_t segment, std::size_t failed)
{
    return {Reason::notReached,
            pointerTo(segment),
            {fmt::format("not computed: segment {} before it has no end", failed + 1), {}}};
}

class PathEvaluation
{
public:
    explicit PathEvaluation(const PathInput &input) : m_input(input) { m_result.gas = input.gas; }

    PathResult result()
    {
        warnOfDefaults(m_result, m_input.surroundings);
        m_dead = deadState(*m_input.gas, m_input.surroundings);
        if (!m_dead)
            m_result.warnings.push_back(
                {"/surroundings", because({"no available work is given", {}}, m_dead.failure().message)});
        const auto start = startState(m_input.gas, m_input.start);
        if (!start) {
            m_result.startFailure = at("/start", start.failure());
            return std::move(m_result);
        }
        reach(*start);
        for (std::size_t k = 0; k < m_input.segments.size(); ++k) m_result.failures.push_back(advance(k));
        m_result.totals = totalsOf(m_result.states, m_result.segments, m_input.rate);
        return std::move(m_result);
    }

private:
    void reach(const gas::State &state)
    {
        m_result.states.push_back(withSurroundings(state, m_dead, m_input.surroundings));
    }

    /// Computes segment k; what keeps it from being computed, or none.
    std::optional<Failure> advance(std::size_t k)
    {
        const Outcome<Segment> &said = m_input.segments[k];
        if (!said) { // what is wrong with the words themselves is said even where the path does not get there
            if (!m_failed) m_failed = k;
            return said.failure();
        }
        if (m_failed) return waitsFor(k, *m_failed);
        auto result = computedSegment(*said, m_result.states, m_input.surroundings);
        if (!result) {
            m_failed = k;
            return at(pointerTo(k), result.failure());
        }
        for (const Message &message : result->warnings) m_result.warnings.push_back({pointerTo(k), message});
        reach(result->to);
        m_result.segments.push_back(std::move(*result));
        return std::nullopt;
    }

    const PathInput &m_input;
    PathResult m_result;
    std::optional<std::size_t> m_failed;
    Outcome<gas::MolarState> m_dead = Failure{};
};

} // namespace

bool PathResult::complete() const
{
    if (startFailure) return false;
    for (const auto &failure : failures)
        if (failure) return false;
    return true;
}

PathResult evaluate(const PathInput &input)
{
    return PathEvaluation(input).result();
}

} // namespace quasistat::path
