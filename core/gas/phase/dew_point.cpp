#include "core/gas/phase/dew_point.h"

#include "core/gas/equation/equation.h"

#include <cassert>
#include <cmath>

namespace quasistat::gas
{

using units::Quantity;

std::optional<MolarState> dewPointNear(const Gas &gas, double temperature)
{
    const Equation &equation = *gas.equation();
    assert(equation.boundary);
    const auto isUnder = [&](double lnV) { return equation.boundary->temperatureNear(std::exp(lnV)) > temperature; };
    // From the thin side: the first volume at which the boundary is hotter than the gas.
    const double densest = -std::log(equation.highestDensity);
    constexpr double thinnest = 20.0;
    constexpr double step = 0.05;
    for (double x = thinnest; x > densest; x -= step) {
        if (!isUnder(x)) continue;
        double under = x;
        double outside = x + step;
        for (int i = 0; i < 40; ++i) {
            const double middle = 0.5 * (under + outside);
            (isUnder(middle) ? under : outside) = middle;
        }
        return homogeneousState(equation, temperature, std::exp(outside));
    }
    return std::nullopt;
}

Failure condenses(const Gas &gas, const MolarState &state)
{
    const Figure temperature{Quantity::temperature, state.temperature};
    if (const auto dew = dewPointNear(gas, state.temperature))
        return {Reason::condenses,
                "",
                {"the gas condenses: at {0} its dew point is about {1}, where this model stops",
                 {temperature, Figure{Quantity::pressure, dew->pressure}}}};
    return {
        Reason::condenses,
        "",
        {"at {0} and this volume the gas would be in two phases, which this model does not compute", {temperature}}};
}

} // namespace quasistat::gas
