#include "core/gas/phase/dew_boundary.h"

#include "core/gas/phase/boundary_trace.h"
#include "core/gas/phase/first_trace.h"

#include <algorithm>
#include <cassert>
#include <cmath>

namespace quasistat::gas
{
namespace
{

/// The hottest trace at this density, and its ln T; null where none reaches it.
struct Hottest {
    const BoundaryTrace *trace = nullptr;
    double lnTemperature = 0.0;
    [[nodiscard]] std::optional<double> known() const { return trace ? std::optional(lnTemperature) : std::nullopt; }
};
Hottest hottest(const std::vector<BoundaryTrace> &traces, double lnDensity)
{
    Hottest result;
    for (const BoundaryTrace &trace : traces) {
        const std::optional<double> lnTemperature = trace.lnTemperature(lnDensity);
        if (lnTemperature && (!result.trace || *lnTemperature > result.lnTemperature))
            result = {&trace, *lnTemperature};
    }
    return result;
}

/// ln T to the last digits by Newton's method from the interpolated state.
double exactLnTemperature(const BoundaryTrace &trace, IncipientPhase &phase, double lnDensity, double interpolated)
{
    if (trace.isCritical(lnDensity)) return interpolated;
    IncipientState state = trace.near(lnDensity);
    constexpr double wrong = 1e-3; // another solution: the table is never so far off
    if (!phase.solve(state, phase.density()) || std::abs(state[phase.temperature()] - interpolated) > wrong)
        return interpolated;
    return state[phase.temperature()];
}

} // namespace

struct DewBoundary::Table {
    std::vector<BoundaryTrace> traces;
    double highest = 0.0; ///< [K]
};

DewBoundary::DewBoundary(std::shared_ptr<const Fugacities> fugacities, std::vector<double> fractions,
                         double lowestTemperature)
    : m_fugacities(std::move(fugacities)), m_fractions(std::move(fractions)), m_lowestTemperature(lowestTemperature)
{
    assert(m_fugacities->components() == m_fractions.size());
}

DewBoundary::~DewBoundary() = default;

namespace
{

/// The maximum of ln T over ln ρ near the hottest node: a parabola through three exact points, closer each time.
double peak(const std::vector<BoundaryTrace> &traces, IncipientPhase &phase)
{
    const BoundaryTrace::Node *top = nullptr;
    const BoundaryTrace *topTrace = nullptr;
    for (const BoundaryTrace &trace : traces)
        for (const BoundaryTrace::Node &node : trace.nodes())
            if (!top || node.lnTemperature > top->lnTemperature) {
                top = &node;
                topTrace = &trace;
            }
    if (!top) return 0.0;
    const auto exact = [&](double lnDensity) {
        const std::optional<double> near = topTrace->lnTemperature(lnDensity);
        return near ? exactLnTemperature(*topTrace, phase, lnDensity, *near) : -INFINITY;
    };
    double highest = top->lnTemperature;
    double centre = top->lnDensity;
    constexpr double finest = 0.002;
    for (const double width : {0.05, 0.01, finest}) {
        // Climb first, so that the parabola holds the maximum between its ends.
        double left = exact(centre - width);
        double middle = exact(centre);
        double right = exact(centre + width);
        for (int k = 0; k < 40 && (left > middle || right > middle); ++k) {
            centre += left > right ? -width : width;
            if (left > right) {
                right = middle;
                middle = left;
                left = exact(centre - width);
            } else {
                left = middle;
                middle = right;
                right = exact(centre + width);
            }
        }
        highest = std::max(highest, middle);
        const double bend = left - 2.0 * middle + right;
        if (!(bend < 0.0) || !std::isfinite(bend)) break;
        if (width == finest) highest = std::max(highest, middle - (right - left) * (right - left) / (8.0 * bend));
        centre -= 0.5 * width * (right - left) / bend;
    }
    return std::exp(highest);
}

} // namespace

const DewBoundary::Table &DewBoundary::table() const
{
    std::call_once(m_isTraced, [this] {
        auto table = std::make_unique<Table>();
        IncipientPhase phase(*m_fugacities, m_fractions);
        const double packing = m_fugacities->closestPacking(m_fractions);
        const auto follow = [&](IncipientState start) {
            constexpr double same = 1e-4;
            constexpr int mostCusps = 3;
            for (int cusp = 0; cusp <= mostCusps; ++cusp) {
                const std::optional<double> known = hottest(table->traces, start[phase.density()]).known();
                if (known && std::abs(*known - start[phase.temperature()]) < same) return;
                BoundaryTrace trace(phase, start, packing, m_lowestTemperature);
                if (trace.nodes().size() < 2) return;
                table->traces.push_back(std::move(trace));
                // A branch that ends almost at close packing has nothing beyond it that a gas could reach.
                constexpr double dense = 0.8;
                const IncipientState &end = table->traces.back().nodes().back().state;
                if (table->traces.back().isComplete() || end[phase.density()] > std::log(dense * packing)) return;
                auto next = traceBeyond(*m_fugacities, phase, end);
                if (!next) return;
                start = std::move(*next);
            }
        };
        for (const IncipientState &start : firstTraces(*m_fugacities, phase)) follow(start);
        if (const std::optional<IncipientState> start = firstBubble(*m_fugacities, phase)) follow(*start);
        const double highest = peak(table->traces, phase);
        table->highest = highest > m_lowestTemperature ? highest : 0.0;
        m_table = std::move(table);
    });
    return *m_table;
}

double DewBoundary::temperatureNear(double molarVolume) const
{
    const Hottest found = hottest(table().traces, -std::log(molarVolume));
    const double temperature = found.trace ? std::exp(found.lnTemperature) : 0.0;
    return temperature >= m_lowestTemperature ? temperature : 0.0;
}

double DewBoundary::temperatureAt(double molarVolume) const
{
    const double lnDensity = -std::log(molarVolume);
    IncipientPhase phase(*m_fugacities, m_fractions);
    double highest = 0.0;
    for (const BoundaryTrace &trace : table().traces)
        if (const std::optional<double> near = trace.lnTemperature(lnDensity))
            highest = std::max(highest, std::exp(exactLnTemperature(trace, phase, lnDensity, *near)));
    return highest >= m_lowestTemperature ? highest : 0.0;
}

double DewBoundary::highestTemperature() const
{
    return table().highest;
}

DewBoundary::Volumes DewBoundary::knownVolumes() const
{
    Volumes volumes{0.0, 0.0};
    for (const BoundaryTrace &trace : table().traces) {
        const double greatest = std::exp(-trace.nodes().front().lnDensity);
        const double smallest = std::exp(-trace.nodes().back().lnDensity);
        volumes.greatest = std::max(volumes.greatest, greatest);
        volumes.smallest = volumes.smallest > 0.0 ? std::min(volumes.smallest, smallest) : smallest;
    }
    return volumes;
}

} // namespace quasistat::gas
