#pragma once
// GERG-2008: pure equations, reducing functions and departure functions joined into one equation per composition.
// Source: O. Kunz, W. Wagner, J. Chem. Eng. Data 57 (2012) 3032–3091; ISO 20765-2:2015.

#include "core/gas/library/gas_files.h"

#include <memory>

namespace quasistat::gas
{

/// Parameters of a pair (i, j); for (j, i) both betas are inverted.
struct GergPair {
    double betaV = 1.0;
    double gammaV = 1.0;
    double betaT = 1.0;
    double gammaT = 1.0;
    double departureFactor = 0.0;                     ///< F_ij; 0 where there is no departure function
    const std::vector<DepartureTerm> *departure = nullptr; ///< owned by GergModel
};

struct GergReducing {
    double temperature; ///< T_r(x) [K]
    double density;     ///< ρ_r(x) [mol/m³]
};

/// The components of one mixture, in the order of its composition, with the parameters between them.
struct GergMixture {
    std::vector<GergComponent> components;
    std::vector<GergPair> pairs; ///< components² entries, row by row
    [[nodiscard]] const GergPair &pair(std::size_t i, std::size_t j) const { return pairs[i * components.size() + j]; }
};

[[nodiscard]] GergReducing reducing(const GergMixture &mixture, const std::vector<double> &fractions);
/// α^r of the mixture at fixed composition: terms of equal exponents of all components and departures added up.
[[nodiscard]] ResidualTerms residualTerms(const GergMixture &mixture, const std::vector<double> &fractions);
/// α⁰ without mixing entropy and without ln δ, as terms in τ = T_r(x)/T, zeros of h and s on the common reference state.
[[nodiscard]] IdealTerms idealTerms(const GergMixture &mixture, const std::vector<double> &fractions);

} // namespace quasistat::gas
