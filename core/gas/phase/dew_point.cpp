#include "core/gas/phase/dew_point.h"

#include "core/gas/equation/equation.h"

#include <boost/math/tools/toms748_solve.hpp>

#include <cassert>
#include <cmath>

namespace quasistat::gas
{

using units::Quantity;

std::optional<MolarState> dewPoint(const Gas &gas, double temperature)
{
    const Equation &equation = *gas.equation();
    assert(equation.boundary);
    // From the thin side: the first volume at which the boundary is hotter than the gas.
    const double densest = -std::log(equation.highestDensity);
    constexpr double thinnest = 20.0;
    constexpr double step = 0.05;
    for (double x = thinnest; x > densest; x -= step) {
        if (!(equation.boundary->temperatureNear(std::exp(x)) > temperature)) continue;
        const auto excess = [&](double lnV) { return equation.boundary->temperatureAt(std::exp(lnV)) - temperature; };
        const double inside = excess(x);
        const double outside = excess(x + step);
        if (!(inside > 0.0 && outside < 0.0)) continue;
        std::uintmax_t steps = 60;
        const auto bracket = boost::math::tools::toms748_solve(excess, x, x + step, inside, outside,
                                                               boost::math::tools::eps_tolerance<double>(45), steps);
        return homogeneousState(equation, temperature, std::exp(0.5 * (bracket.first + bracket.second)));
    }
    return std::nullopt;
}

Failure condenses(const Gas &gas, const MolarState &state)
{
    const Figure temperature{Quantity::temperature, state.temperature};
    if (const auto dew = dewPoint(gas, state.temperature))
        return {Reason::condenses,
                "",
                {"the gas condenses: at {0} its dew point is {1}, where this model stops",
                 {temperature, Figure{Quantity::pressure, dew->pressure}}}};
    return {
        Reason::condenses,
        "",
        {"at {0} and this volume the gas would be in two phases, which this model does not compute", {temperature}}};
}

} // namespace quasistat::gas
