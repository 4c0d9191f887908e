#pragma once
// All the powers τᵗ an equation needs, by as few and as cheap operations as they allow.

#include <cstddef>
#include <vector>

namespace quasistat::gas
{

/// Published exponents are mostly multiples of 1/8 or sums of each other: square roots and products of earlier powers
/// give them, and only what is left needs an exponential.
class PowerChain
{
public:
    static constexpr std::size_t mostPowers = 96;

    PowerChain();
    /// Makes τᵗ part of the chain; its place.
    std::size_t place(double exponent);

    /// τᵗ at `place` from the powers at `a` and `b`.
    struct Product {
        std::size_t place;
        std::size_t a;
        std::size_t b;
    };
    /// Its square root, or 1 over it, at `place`.
    struct OfOne {
        std::size_t place;
        std::size_t a;
    };
    [[nodiscard]] std::size_t size() const { return m_exponents.size(); }
    // In the order of evaluation: roots depend on τ and roots, exponentials on nothing, products on all before them,
    // reciprocals on anything but reciprocals.
    [[nodiscard]] const std::vector<OfOne> &roots() const { return m_roots; }
    [[nodiscard]] const std::vector<std::size_t> &exponentials() const { return m_exponentials; }
    /// Exponents of the exponentials, filled up with zeros to a whole number of eights.
    [[nodiscard]] const std::vector<double> &exponentialExponents() const { return m_exponentialExponents; }
    [[nodiscard]] const std::vector<Product> &products() const { return m_products; }
    [[nodiscard]] const std::vector<OfOne> &reciprocals() const { return m_reciprocals; }

private:
    [[nodiscard]] std::size_t find(double exponent) const;
    std::size_t add(double exponent);
    std::size_t positive(double exponent);
    std::size_t exponential(double exponent);
    std::size_t product(double exponent, std::size_t a, std::size_t b);

    std::vector<double> m_exponents; ///< of every place; τ⁰ and τ¹ are given
    std::vector<OfOne> m_roots;
    std::vector<std::size_t> m_exponentials;
    std::vector<double> m_exponentialExponents;
    std::vector<Product> m_products;
    std::vector<OfOne> m_reciprocals;
};

} // namespace quasistat::gas
