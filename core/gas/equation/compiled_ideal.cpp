#include "core/gas/equation/compiled_ideal.h"

#include <algorithm>
#include <cmath>

namespace quasistat::gas
{

namespace
{

constexpr double mostProducts = 4.0;
constexpr std::size_t few = 2;

} // namespace

CompiledIdeal compiled(const IdealTerms &published)
{
    CompiledIdeal made;
    std::ranges::copy(published.lead, made.lead);
    made.logTau = published.logTau;
    for (const IdealPowerTerm &term : published.powers) {
        const bool isWhole = term.t == std::floor(term.t) && term.t != 0.0 && std::abs(term.t) <= mostProducts;
        if (isWhole)
            made.wholePowers.push_back({term.n, static_cast<int>(term.t)});
        else
            made.powers.push_back(term);
    }
    if (published.planckEinstein.size() <= few) {
        made.few = published.planckEinstein;
        return made;
    }
    for (const PlanckEinsteinTerm &term : published.planckEinstein) {
        made.n.push_back(term.n);
        made.theta.push_back(term.theta);
        made.c.push_back(term.c);
        made.d.push_back(term.d);
    }
    while (made.n.size() % 8 != 0) { // 0 ln(1 + 0)
        made.n.push_back(0.0);
        made.theta.push_back(0.0);
        made.c.push_back(1.0);
        made.d.push_back(0.0);
    }
    return made;
}

} // namespace quasistat::gas
