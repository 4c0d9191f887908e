#include "core/path/start.h"

#include "core/gas/solve/solve.h"

namespace quasistat::path
{

Outcome<gas::State> startState(const gas::GasPtr &gas, const Start &start)
{
    using gas::Property;
    if (start.evacuated) return gas::State::evacuated(gas, start.volume.value_or(0.0));

    const int count = start.pressure.has_value() + start.temperature.has_value() + start.volume.has_value() +
                      start.amount.has_value();
    if (count != 3)
        return Failure{
            Reason::contradiction, "", {"the start needs three of pressure, temperature, volume and amount", {}}};
    std::vector<gas::Given> given;
    if (start.pressure) given.push_back({Property::pressure, *start.pressure});
    if (start.temperature) given.push_back({Property::temperature, *start.temperature});
    if (start.volume && start.amount) given.push_back({Property::molarVolume, *start.volume / *start.amount});
    const auto molar = gas::stateFrom(*gas, given[0], given[1]);
    if (!molar) return molar.failure();
    return gas::State(gas, start.amount ? *start.amount : *start.volume / molar->molarVolume, *molar);
}

} // namespace quasistat::path
