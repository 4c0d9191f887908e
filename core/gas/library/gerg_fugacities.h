#pragma once
// Fugacities of GERG-2008.

#include "core/gas/library/gerg_2008.h"
#include "core/gas/phase/fugacity.h"

namespace quasistat::gas
{

/// Φᵢ from the published mixture formulas (O. Kunz et al., GERG Technical Monograph 15 (2007), ch. 7: n ∂α^r/∂nᵢ with
/// the composition derivatives of the reducing functions). Terms are evaluated as published; only what terms share (τᵗ,
/// δᵈ, exp(−δˡ), a departure function of several pairs) is worked out once.
class GergFugacities final : public Fugacities
{
public:
    /// `critical`: of each component, in its order; for first guesses alone. `gasConstant`: of GERG-2008.
    GergFugacities(GergMixture mixture, std::vector<Critical> critical, double gasConstant);

    [[nodiscard]] std::size_t components() const override { return m_mixture.components.size(); }
    [[nodiscard]] double gasConstant() const override { return m_gasConstant; }
    [[nodiscard]] Critical critical(std::size_t component) const override { return m_critical[component]; }
    double residualPotentials(double temperature, double density, std::span<const double> fractions,
                              std::span<double> result) const override;
    [[nodiscard]] PressureSlope pressure(double temperature, double density,
                                         std::span<const double> fractions) const override;
    [[nodiscard]] double closestPacking(std::span<const double> fractions) const override;

private:
    /// Of one pure or departure function: α^r and what pressure and potentials take of its derivatives.
    struct Part {
        double a00 = 0.0;
        double a10 = 0.0;
        double a01 = 0.0;
        double a02 = 0.0;
    };
    struct Departure {
        const std::vector<DepartureTerm> *terms;
        std::vector<std::size_t> temperaturePowers; ///< into m_exponents, one for each term
    };
    struct Pair {
        std::size_t i;
        std::size_t j;
        double factor; ///< F_ij
        std::size_t departure;
    };
    class Shared; // δᵈ, exp(−δˡ), τᵗ of one state

    [[nodiscard]] std::size_t exponent(double t);
    [[nodiscard]] Part pure(const Shared &shared, std::size_t component) const;
    [[nodiscard]] static Part departure(const Shared &shared, const Departure &function);

    GergMixture m_mixture;
    std::vector<Critical> m_critical;
    double m_gasConstant;
    std::vector<double> m_exponents;                           ///< every t that occurs, once
    std::vector<std::vector<std::size_t>> m_temperaturePowers; ///< into m_exponents, for each component's terms
    std::vector<Departure> m_departures;
    std::vector<Pair> m_pairs; ///< those with a departure function, i < j
};

} // namespace quasistat::gas
