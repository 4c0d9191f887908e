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

    enum class Operation { given, product, root, reciprocal, exponential };
    /// One power from earlier ones; the first two, τ⁰ and τ¹, are given.
    struct Step {
        double exponent;
        Operation operation;
        std::size_t a = 0;
        std::size_t b = 0;
    };
    [[nodiscard]] const std::vector<Step> &steps() const { return m_steps; }
    [[nodiscard]] bool needsLogarithm() const { return m_needsLogarithm; }

private:
    [[nodiscard]] std::size_t find(double exponent) const;
    std::size_t add(const Step &step);
    std::size_t positive(double exponent);

    std::vector<Step> m_steps;
    bool m_needsLogarithm = false;
};

} // namespace quasistat::gas
