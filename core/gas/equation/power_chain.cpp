#include "core/gas/equation/power_chain.h"

#include <algorithm>
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

PowerChain::PowerChain() : m_exponents{0.0, 1.0} {}

std::size_t PowerChain::find(double exponent) const
{
    for (std::size_t i = 0; i < m_exponents.size(); ++i)
        if (areEqual(m_exponents[i], exponent)) return i;
    return none;
}

std::size_t PowerChain::add(double exponent)
{
    assert(m_exponents.size() < mostPowers);
    m_exponents.push_back(exponent);
    return m_exponents.size() - 1;
}

std::size_t PowerChain::product(double exponent, std::size_t a, std::size_t b)
{
    const std::size_t place = add(exponent);
    m_products.push_back({place, a, b});
    return place;
}

std::size_t PowerChain::exponential(double exponent)
{
    const std::size_t place = add(exponent);
    m_exponentials.push_back(place);
    if (m_exponentials.size() > m_exponentialExponents.size())
        m_exponentialExponents.resize(m_exponentialExponents.size() + 8, 0.0);
    m_exponentialExponents[m_exponentials.size() - 1] = exponent;
    return place;
}

std::size_t PowerChain::place(double exponent)
{
    if (const std::size_t known = find(exponent); known != none) return known;
    if (exponent > 0.0) return positive(exponent);
    const std::size_t inverse = positive(-exponent);
    const std::size_t place = add(exponent);
    m_reciprocals.push_back({place, inverse});
    return place;
}

std::size_t PowerChain::positive(double exponent)
{
    if (const std::size_t known = find(exponent); known != none) return known;
    // A sum of two that are there already.
    for (std::size_t i = 1; i < m_exponents.size(); ++i) {
        const double rest = exponent - m_exponents[i];
        if (m_exponents[i] <= 0.0 || rest <= 0.0) continue;
        if (const std::size_t other = find(rest); other != none) return product(exponent, i, other);
    }
    if (!isMultiple(exponent, 0.125)) return exponential(exponent);
    if (exponent < 1.0) {
        for (const double root : {0.5, 0.25, 0.125})
            if (areEqual(exponent, root)) {
                const std::size_t square = positive(2.0 * root);
                const bool isRoot = std::ranges::find(m_roots, square, &OfOne::place) != m_roots.end();
                if (square != 1 && !isRoot) return exponential(exponent); // the square is made after the roots
                const std::size_t place = add(exponent);
                m_roots.push_back({place, square});
                return place;
            }
        const double largest = exponent > 0.5 ? 0.5 : 0.25;
        const std::size_t a = positive(largest);
        const std::size_t b = positive(exponent - largest);
        return product(exponent, a, b);
    }
    // Binary: the largest power of two below, and the rest.
    double whole = 1.0;
    while (2.0 * whole <= exponent) whole *= 2.0;
    const double part = areEqual(whole, exponent) ? 0.5 * whole : whole;
    const std::size_t a = positive(part);
    const std::size_t b = positive(exponent - part);
    return product(exponent, a, b);
}

} // namespace quasistat::gas
