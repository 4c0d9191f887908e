#include "core/gas/equation/power_chain.h"

#include <cassert>
#include <cmath>

namespace quasistat::gas
{
namespace
{

constexpr std::size_t none = static_cast<std::size_t>(-1);

bool areEqual(double a, double b)
{
    return std::abs(a - b) < 1e-12;
}

bool isMultiple(double exponent, double of)
{
    return areEqual(exponent / of, std::round(exponent / of));
}

} // namespace

PowerChain::PowerChain() : m_steps{{0.0, Operation::given}, {1.0, Operation::given}} {}

std::size_t PowerChain::find(double exponent) const
{
    for (std::size_t i = 0; i < m_steps.size(); ++i)
        if (areEqual(m_steps[i].exponent, exponent)) return i;
    return none;
}

std::size_t PowerChain::add(const Step &step)
{
    assert(m_steps.size() < mostPowers);
    m_steps.push_back(step);
    if (step.operation == Operation::exponential) m_needsLogarithm = true;
    return m_steps.size() - 1;
}

std::size_t PowerChain::place(double exponent)
{
    if (const std::size_t known = find(exponent); known != none) return known;
    if (exponent > 0.0) return positive(exponent);
    const std::size_t inverse = positive(-exponent);
    return add({exponent, Operation::reciprocal, inverse});
}

std::size_t PowerChain::positive(double exponent)
{
    if (const std::size_t known = find(exponent); known != none) return known;
    // A sum of two that are there already.
    for (std::size_t i = 1; i < m_steps.size(); ++i) {
        const std::size_t rest = find(exponent - m_steps[i].exponent);
        if (rest != none && rest != 0 && m_steps[i].exponent > 0.0) return add({exponent, Operation::product, i, rest});
    }
    if (!isMultiple(exponent, 0.125)) return add({exponent, Operation::exponential});
    if (exponent < 1.0) {
        for (const double root : {0.5, 0.25, 0.125})
            if (areEqual(exponent, root)) return add({exponent, Operation::root, positive(2.0 * root)});
        const double largest = exponent > 0.5 ? 0.5 : 0.25;
        const std::size_t a = positive(largest);
        const std::size_t b = positive(exponent - largest);
        return add({exponent, Operation::product, a, b});
    }
    // Binary: the largest power of two below, and the rest.
    double whole = 1.0;
    while (2.0 * whole <= exponent) whole *= 2.0;
    const double part = areEqual(whole, exponent) ? 0.5 * whole : whole;
    const std::size_t a = positive(part);
    const std::size_t b = positive(exponent - part);
    return add({exponent, Operation::product, a, b});
}

} // namespace quasistat::gas
