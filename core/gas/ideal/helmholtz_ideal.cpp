#include "core/gas/ideal/helmholtz_ideal.h"

#include "core/gas/constants.h"

#include <cmath>

namespace quasistat::gas
{
namespace
{

class HelmholtzIdeal final : public IdealFunction
{
public:
    explicit HelmholtzIdeal(const IdealTerms &terms) : m_terms(terms)
    {
        const IdealProperties zero = at(referenceTemperature);
        m_enthalpyShift = zero.enthalpy;
        m_entropyShift = zero.entropy;
    }

    IdealProperties at(double temperature) const override
    {
        const double tau = m_terms.reducingTemperature / temperature;
        const double lnTau = std::log(tau);
        // α⁰ without ln δ, τ α⁰_τ and τ² α⁰_ττ
        double a = m_terms.lead[0] + m_terms.lead[1] * tau + m_terms.logTau * lnTau;
        double first = m_terms.lead[1] * tau + m_terms.logTau;
        double second = -m_terms.logTau;
        for (const IdealPowerTerm &term : m_terms.powers) {
            const double value = term.n * std::exp(term.t * lnTau);
            a += value;
            first += term.t * value;
            second += term.t * (term.t - 1.0) * value;
        }
        for (const PlanckEinsteinTerm &term : m_terms.planckEinstein) {
            const double x = term.theta * tau;
            const double e = term.d * std::exp(-x);
            const double sum = term.c + e;
            const double ratio = e / sum;
            a += term.n * std::log(sum);
            first -= term.n * x * ratio;
            second += term.n * x * x * ratio * (1.0 - ratio);
        }
        // At constant pressure ln δ brings ln T = ln T_r − ln τ; what else is constant the shift takes away.
        return {.heatCapacity = 1.0 - second,
                .enthalpy = temperature * (1.0 + first) - m_enthalpyShift,
                .entropy = first - a - lnTau - m_entropyShift};
    }

    std::span<const double> seams() const override { return {}; }

private:
    IdealTerms m_terms;
    double m_enthalpyShift = 0.0;
    double m_entropyShift = 0.0;
};

} // namespace

std::shared_ptr<const IdealFunction> helmholtzIdeal(const IdealTerms &terms)
{
    return std::make_shared<HelmholtzIdeal>(terms);
}

} // namespace quasistat::gas
