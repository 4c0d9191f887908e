#pragma once
// The ideal part of a multiparameter equation in the form it is evaluated in.

#include "core/gas/equation/terms.h"

#include <vector>

namespace quasistat::gas
{

/// IdealTerms by what each costs: whole powers by products, a few Planck–Einstein terms one by one, many side by side.
struct CompiledIdeal {
    struct WholePower {
        double n;
        int t; ///< not 0
    };
    double lead[2] = {0.0, 0.0};
    double logTau = 0.0;
    std::vector<WholePower> wholePowers;
    std::vector<IdealPowerTerm> powers;
    std::vector<PlanckEinsteinTerm> few;
    /// Many: in columns, filled up with terms that are zero to a whole number of eights.
    std::vector<double> n;
    std::vector<double> theta;
    std::vector<double> c;
    std::vector<double> d;
};

[[nodiscard]] CompiledIdeal compiled(const IdealTerms &published);

/// α⁰ without ln δ, τ α⁰_τ and τ² α⁰_ττ; and ln τ, which its caller needs too.
struct IdealSums {
    double a00;
    double a10;
    double a20;
    double lnTau;
};

} // namespace quasistat::gas
