#include "core/path/totals.h"

#include <algorithm>
#include <cmath>

namespace quasistat::path
{
namespace
{

/// Last state and state 1 count as one within this, relative, in p, V, T and amount.
constexpr double closureTolerance = 1e-6;

class CompensatedSum
{
public:
    void add(double value)
    {
        const double corrected = value - m_compensation;
        const double next = m_sum + corrected;
        m_compensation = (next - m_sum) - corrected;
        m_sum = next;
    }
    [[nodiscard]] double value() const { return m_sum; }

private:
    double m_sum = 0.0;
    double m_compensation = 0.0;
};

template <class Figure>
double sum(const std::vector<SegmentResult> &segments, Figure figure)
{
    CompensatedSum total;
    for (const SegmentResult &segment : segments) total.add(figure(segment));
    return total.value();
}

bool agree(double a, double b)
{
    return std::abs(a - b) <= closureTolerance * std::max(std::abs(a), std::abs(b));
}

bool isClosed(const std::vector<StateResult> &states)
{
    if (states.size() < 2) return false;
    const gas::State &first = states.front().state;
    const gas::State &last = states.back().state;
    if (first.isEvacuated() || last.isEvacuated()) return false;
    return agree(first.pressure(), last.pressure()) && agree(first.volume(), last.volume()) &&
           agree(first.molar().temperature, last.molar().temperature) && agree(first.amount(), last.amount()) &&
           first.gas().composition() == last.gas().composition();
}

bool matterMoves(const std::vector<SegmentResult> &segments)
{
    return std::any_of(segments.begin(), segments.end(), [](const SegmentResult &s) { return s.amountIn != 0.0; });
}

std::optional<double> totalSteadyFlowWork(const std::vector<SegmentResult> &segments)
{
    CompensatedSum total;
    for (const SegmentResult &segment : segments) {
        if (!segment.steadyFlowWork) return std::nullopt;
        total.add(*segment.steadyFlowWork);
    }
    return total.value();
}

/// Extremes of the temperatures at which heat crosses the boundary.
struct HeatTemperatures {
    std::optional<Interval> in;
    std::optional<Interval> out;
};

void include(std::optional<Interval> &all, const std::optional<Interval> &one)
{
    if (!one) return;
    if (!all) all = one;
    all->lowest = std::min(all->lowest, one->lowest);
    all->highest = std::max(all->highest, one->highest);
}

HeatTemperatures heatTemperatures(const std::vector<SegmentResult> &segments)
{
    HeatTemperatures t;
    for (const SegmentResult &segment : segments) {
        include(t.in, segment.exchange.temperatureIn);
        include(t.out, segment.exchange.temperatureOut);
    }
    return t;
}

void addEngineFigures(Totals &totals, const HeatTemperatures &t)
{
    if (!(totals.heatIn > 0.0)) return;
    totals.thermalEfficiency = totals.netWorkOut / totals.heatIn;
    if (!t.in || !t.out) return;
    const double carnot = 1.0 - t.out->lowest / t.in->highest;
    if (carnot > 0.0) totals.carnotRatio = *totals.thermalEfficiency / carnot;
}

/// Only a loop that takes heat where it is cold and gives it where it is warm is a heat pump.
void addHeatPumpFigures(Totals &totals, const HeatTemperatures &t)
{
    if (!t.in || !t.out) return;
    const double cold = t.in->highest;
    const double warm = t.out->lowest;
    if (warm <= cold) return;
    const double work = -totals.netWorkOut;
    totals.copHeating = totals.heatOut / work;
    totals.copCooling = totals.heatIn / work;
    totals.carnotRatio = *totals.copHeating / (warm / (warm - cold));
}

Interval volumes(const std::vector<SegmentResult> &segments)
{
    Interval all = segments.front().extrema.volume;
    for (const SegmentResult &segment : segments) {
        all.lowest = std::min(all.lowest, segment.extrema.volume.lowest);
        all.highest = std::max(all.highest, segment.extrema.volume.highest);
    }
    return all;
}

/// Work below this share of what was exchanged is the rounding of a loop that encloses nothing.
constexpr double noWork = 1e-12;

} // namespace

Totals totalsOf(const std::vector<StateResult> &states, const std::vector<SegmentResult> &segments,
                const std::optional<double> &rate)
{
    Totals totals{.work = sum(segments, [](const SegmentResult &s) { return s.work; }),
                  .heat = sum(segments, [](const SegmentResult &s) { return s.heat; }),
                  .heatIn = sum(segments, [](const SegmentResult &s) { return s.exchange.in; }),
                  .heatOut = sum(segments, [](const SegmentResult &s) { return s.exchange.out; }),
                  .deltaInternalEnergy = sum(segments, [](const SegmentResult &s) { return s.deltaInternalEnergy; }),
                  .steadyFlowWork = totalSteadyFlowWork(segments),
                  .entropyGenerated = sum(segments, [](const SegmentResult &s) { return s.entropyGenerated; }),
                  .lostWork = sum(segments, [](const SegmentResult &s) { return s.lostWork; }),
                  .closed = isClosed(states)};
    totals.netWorkOut = -totals.work;
    if (rate) totals.power = totals.netWorkOut * *rate;
    if (!totals.closed) return totals;

    const Interval swept = volumes(segments);
    if (swept.highest > swept.lowest)
        totals.meanEffectivePressure = std::abs(totals.netWorkOut) / (swept.highest - swept.lowest);
    if (matterMoves(segments)) return totals;
    const double exchanged = sum(segments, [](const SegmentResult &s) { return std::abs(s.work) + std::abs(s.heat); });
    if (std::abs(totals.netWorkOut) <= noWork * exchanged) return totals;
    const HeatTemperatures temperatures = heatTemperatures(segments);
    if (totals.netWorkOut > 0.0)
        addEngineFigures(totals, temperatures);
    else
        addHeatPumpFigures(totals, temperatures);
    return totals;
}

} // namespace quasistat::path
