#pragma once
// GERG-2008: pure equations, reducing functions and departure functions joined into one equation per composition.
// Source: O. Kunz, W. Wagner, J. Chem. Eng. Data 57 (2012) 3032–3091; ISO 20765-2:2015.

#include "core/gas/library/gas_files.h"

#include <functional>
#include <map>
#include <memory>
#include <span>

namespace quasistat::gas
{

/// Parameters of a pair (i, j); for (j, i) both betas are inverted.
struct GergPair {
    double betaV = 1.0;
    double gammaV = 1.0;
    double betaT = 1.0;
    double gammaT = 1.0;
    double departureFactor = 0.0;                          ///< F_ij; 0 where there is no departure function
    const std::vector<DepartureTerm> *departure = nullptr; ///< owned by GergModel
};

/// What GERG-2008 says of mixtures: everything but the pure components. Immutable, shared between threads.
class GergModel
{
public:
    /// Reads the data compiled into the program (resources/gases/mixtures).
    GergModel();
    GergModel(const GergModel &) = delete;
    GergModel &operator=(const GergModel &) = delete;

    [[nodiscard]] double gasConstant() const { return m_gasConstant; } ///< R [J/(mol K)]
    /// R of the ideal parts [J/(mol K)]: their terms count by its ratio to gasConstant().
    [[nodiscard]] double idealGasConstant() const { return m_idealGasConstant; }
    [[nodiscard]] const Validity &validity() const { return m_validity; } ///< normal and extended range
    [[nodiscard]] const std::string &source() const { return m_source; }
    /// Parameters of two components by name. Precondition: both are among the 21.
    [[nodiscard]] GergPair pair(std::string_view first, std::string_view second) const;

private:
    double m_gasConstant = 0.0;
    double m_idealGasConstant = 0.0;
    Validity m_validity{};
    std::string m_source;
    std::map<std::string, std::vector<DepartureTerm>, std::less<>> m_departures;
    std::map<std::pair<std::string, std::string>, GergPair, std::less<>> m_pairs; ///< in the order printed
};

struct GergReducing {
    double temperature; ///< T_r(x) [K]
    double density;     ///< ρ_r(x) [mol/m³]
};

/// The components of one mixture, in the order of its composition, with the parameters between them.
struct GergMixture {
    std::shared_ptr<const GergModel> model;
    std::vector<GergComponent> components;
    std::vector<GergPair> pairs; ///< components² entries, row by row
    [[nodiscard]] const GergPair &pair(std::size_t i, std::size_t j) const { return pairs[i * components.size() + j]; }
};
/// `names`: of the components, in their order.
[[nodiscard]] GergMixture gergMixture(std::shared_ptr<const GergModel> model, std::span<const std::string> names,
                                      std::vector<GergComponent> components);

/// All three at mole fractions ≥ 0, one per component, that sum to 1.
[[nodiscard]] GergReducing reducing(const GergMixture &mixture, const std::vector<double> &fractions);
/// α^r of the mixture at fixed composition: terms of equal exponents of all components and departures added up.
[[nodiscard]] ResidualTerms residualTerms(const GergMixture &mixture, const std::vector<double> &fractions);
/// α⁰ without mixing entropy, as terms in τ = T_r(x)/T. Zeros of h and s as in the data: every component as ideal gas
/// at 298.15 K and 101325 Pa.
[[nodiscard]] IdealTerms idealTerms(const GergMixture &mixture, const std::vector<double> &fractions);

} // namespace quasistat::gas
