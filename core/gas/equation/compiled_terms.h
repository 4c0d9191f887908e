#pragma once
// A multiparameter equation in the form it is evaluated in.

#include "core/gas/equation/power_chain.h"
#include "core/gas/equation/terms.h"

#include <vector>

namespace quasistat::gas
{

/// Every published term but the non-analytic ones is a product f(δ) g(τ), and most share their f or their g with
/// others: α^r = Σ_j f_j(δ) Σ_k n_jk g_k(τ). Here are the distinct f_j ("columns") and what the g_k are made of, each
/// to be evaluated once.
struct CompiledTerms {
    static constexpr std::size_t mostFactors = 32;       ///< distinct exponentials in δ, and in τ
    static constexpr std::size_t mostDensityPowers = 24; ///< δ⁰ … δ²³

    /// exp(−g δˡ), exp(−η(δ − ε)² − β(δ − γ)), or 1.
    struct DensityFactor {
        enum class Form { one, power, bell } form = Form::one;
        int l = 0;
        double g = 1.0;
        double eta = 0.0;
        double epsilon = 0.0;
        double beta = 0.0;
        double gamma = 0.0;
        bool operator==(const DensityFactor &) const = default;
    };
    /// exp(−β(τ − γ)²), exp(1/(β(τ − γ)² + b)), or 1.
    struct TemperatureFactor {
        enum class Form { one, bell, association } form = Form::one;
        double beta = 0.0;
        double gamma = 0.0;
        double b = 0.0;
        bool operator==(const TemperatureFactor &) const = default;
    };
    /// f(δ) = δᵈ times a density factor. Its terms: plain ones, then those with a temperature factor.
    struct Column {
        std::size_t factor;
        int d;
        std::size_t firstTerm;
        std::size_t endPlainTerm;
        std::size_t endTerm;
    };
    /// n τᵗ times a temperature factor, with what its derivatives take.
    struct Term {
        double n;
        double nt;  ///< n t
        double ntt; ///< n t (t − 1)
        double t;
        std::size_t power;
        std::size_t factor;
    };

    /// The same terms once more, for all derivatives of one state: gathered by density factor, with the products that
    /// derivatives of δᵈ τᵗ take.
    struct WholeTerm {
        double n;
        double nd;  ///< n d
        double ndd; ///< n d (d − 1)
        double nt;  ///< n t
        double ntd; ///< n t d
        double ntt; ///< n t (t − 1)
        std::size_t power;
        std::size_t d;
    };
    struct FactoredTerm {
        double n;
        double t;
        double d;
        std::size_t power;
        std::size_t densityPower;
        std::size_t factor;
    };
    struct Group {
        std::size_t factor; ///< in δ
        std::size_t firstWhole;
        std::size_t endWhole;
        std::size_t firstFactored; ///< those with a temperature factor
        std::size_t endFactored;
    };

    double reducingTemperature = 0.0; ///< [K]
    double reducingDensity = 0.0;     ///< [mol/m³]
    PowerChain powers;
    int highestDensityPower = 0;
    std::vector<DensityFactor> densityFactors{1}; ///< the first is 1
    std::vector<TemperatureFactor> temperatureFactors{1};
    std::vector<Column> columns;
    std::vector<Term> terms;
    std::vector<Group> groups;
    std::vector<WholeTerm> wholeTerms;
    std::vector<FactoredTerm> factoredTerms;
    std::vector<NonAnalyticTerm> nonAnalytic; ///< as published: no product of the two
};

[[nodiscard]] CompiledTerms compiled(const ResidualTerms &published);

} // namespace quasistat::gas
