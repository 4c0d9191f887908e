#include "core/gas/ideal/helmholtz_ideal.h"

#include "core/gas/constants.h"
#include "core/gas/equation/kernel/kernels.h"

#include <cmath>

namespace quasistat::gas
{
namespace
{

class HelmholtzIdeal final : public IdealFunction
{
public:
    explicit HelmholtzIdeal(const IdealTerms &terms)
        : m_reducingTemperature(terms.reducingTemperature), m_terms(compiled(terms)), m_kernels(kernels())
    {
        const IdealProperties zero = at(referenceTemperature);
        m_enthalpyShift = zero.enthalpy;
        m_entropyShift = zero.entropy;
    }

    IdealProperties at(double temperature) const override
    {
        const double tau = m_reducingTemperature / temperature;
        const IdealSums sums = m_kernels.idealAt(m_terms, tau);
        // At constant pressure ln δ brings ln T = ln T_r − ln τ; what else is constant the shift takes away.
        return {.heatCapacity = 1.0 - sums.a20,
                .enthalpy = temperature * (1.0 + sums.a10) - m_enthalpyShift,
                .entropy = sums.a10 - sums.a00 - sums.lnTau - m_entropyShift};
    }

    std::span<const double> seams() const override { return {}; }

private:
    double m_reducingTemperature;
    CompiledIdeal m_terms;
    Kernels m_kernels;
    double m_enthalpyShift = 0.0;
    double m_entropyShift = 0.0;
};

} // namespace

std::shared_ptr<const IdealFunction> helmholtzIdeal(const IdealTerms &terms)
{
    return std::make_shared<HelmholtzIdeal>(terms);
}

} // namespace quasistat::gas
