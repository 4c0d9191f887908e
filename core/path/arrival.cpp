#include "core/path/arrival.h"

#include <cmath>

namespace quasistat::path
{
namespace
{

/// As close as a path counts as closed (format of the document, "closed").
constexpr double arrivalTolerance = 1e-6;

bool agree(double a, double b)
{
    return std::abs(a - b) <= arrivalTolerance * std::abs(b);
}

} // namespace

Outcome<Arrived> arrived(const gas::MolarState &reached, const gas::State &from, const gas::State &wanted, int number)
{
    using units::Quantity;
    const gas::MolarState &target = wanted.molar();
    if (!agree(from.amount(), wanted.amount()))
        return Failure{Reason::unreachable,
                       "/end/state",
                       {"state {0} holds {1}, but {2} move along this segment",
                        {Figure{Quantity::number, static_cast<double>(number)},
                         Figure{Quantity::amount, wanted.amount()}, Figure{Quantity::amount, from.amount()}}}};
    if (agree(reached.pressure, target.pressure) && agree(reached.temperature, target.temperature) &&
        agree(reached.molarVolume, target.molarVolume))
        return Arrived{};
    return Failure{
        Reason::unreachable,
        "/end/state",
        {"this segment does not pass through state " + std::to_string(number) +
             ": it would come to {0} at {1}, the state is at {2} and {3}; a polytropic segment without exponent "
             "or a linear one arrives at any state",
         {Figure{Quantity::pressure, reached.pressure}, Figure{Quantity::temperature, reached.temperature},
          Figure{Quantity::pressure, target.pressure}, Figure{Quantity::temperature, target.temperature}}}};
}

} // namespace quasistat::path
