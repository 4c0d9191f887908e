#include "core/path/reversible_limit.h"

#include "core/gas/solve/solve.h"
#include "core/path/quasi_static.h"
#include "core/path/sample.h"

#include <cmath>

namespace quasistat::path
{
namespace
{

using gas::Property;

Outcome<ReversibleLimit> alongLaw(const gas::State &from, const Law &law, const gas::MolarState &end)
{
    const double x = std::log(end.molarVolume / from.molar().molarVolume);
    const auto work = workAlong(from, law, x);
    if (!work) return work.failure();
    return ReversibleLimit{*work, sampled(QuasiStaticCurve(from.sharedGas(), from.amount(), from.molar(), law, x))};
}

} // namespace

Outcome<ReversibleLimit> isothermalLimit(const gas::State &from, const gas::State &to)
{
    return alongLaw(from, ConstantTemperature{}, to.molar());
}

Outcome<ReversibleLimit> adiabaticLimit(const gas::State &from, const gas::State &to)
{
    const auto end = gas::stateFrom(from.gas(), {Property::entropy, from.molar().entropy},
                                    {Property::pressure, to.pressure()}, &from.molar());
    if (!end) return end.failure();
    return alongLaw(from, ConstantEntropy{}, *end);
}

void compareWithLimit(SegmentResult &result, const Outcome<ReversibleLimit> &limit)
{
    if (!limit) {
        result.warnings.push_back(
            because({"no reversible limit is given: its own path leaves the gas model", {}}, limit.failure().message));
        return;
    }
    result.reversibleLimitWork = limit->work;
    result.drawing.reversibleLimit = limit->ghost;
    result.shortfall = result.work - limit->work;
    const bool expands = result.to.volume() > result.from.volume();
    const double gained = expands ? result.work : limit->work;
    const double most = expands ? limit->work : result.work;
    if (most != 0.0) result.recovery = gained / most;
}

} // namespace quasistat::path
