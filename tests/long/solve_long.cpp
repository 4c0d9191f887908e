// A hundred thousand states of every fluid, from every pair of properties and back.

#include "tests/support/gases.h"
#include "tests/support/solve_check.h"

namespace quasistat::gas
{
namespace
{

constexpr int states = 100000;

TEST(SolveLong, ComesBackToAnyStateOfEveryReferenceFluid)
{
    for (const ComponentFacts &facts : test::library().components("reference"))
        test::expectWayBack(*test::reference(facts.name), states, 3);
}

TEST(SolveLong, ComesBackToAnyStateOfAMixtureAndOfACubicGas)
{
    for (const auto &[name, gas] : test::everyRealGas())
        if (gas->model() != "reference") test::expectWayBack(*gas, states, 4);
}

} // namespace
} // namespace quasistat::gas
