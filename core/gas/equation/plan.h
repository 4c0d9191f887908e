#pragma once
// The residual part of a multiparameter equation, compiled for speed once per composition.

#include "core/gas/equation/compiled_terms.h"
#include "core/gas/equation/kernel/kernels.h"

namespace quasistat::gas
{

/// Agrees with publishedResidual to 1e-13 of the terms' magnitudes (tests/gas/plan_test).
class ResidualPlan final : public Residual
{
public:
    /// `family`: the best of this processor; a test may ask for another.
    explicit ResidualPlan(const ResidualTerms &published, const Kernels &family = kernels())
        : m_terms(compiled(published)), m_kernels(family)
    {
    }

    void atTemperature(double temperature, bool temperatureDerivatives, Isotherm &isotherm) const override
    {
        m_kernels.atTemperature(m_terms, temperature, temperatureDerivatives, isotherm);
    }
    [[nodiscard]] Alpha at(const Isotherm &isotherm, double density) const override
    {
        return m_kernels.onIsotherm(m_terms, isotherm, density);
    }
    [[nodiscard]] Alpha at(double temperature, double density) const override
    {
        return m_kernels.at(m_terms, temperature, density);
    }
    [[nodiscard]] DensityDerivatives densityDerivatives(const Isotherm &isotherm, double density) const override
    {
        return m_kernels.densityDerivatives(m_terms, isotherm, density);
    }
    void atEach(std::span<const double> temperatures, std::span<const double> densities,
                std::span<Alpha> results) const override
    {
        m_kernels.atEach(m_terms, temperatures, densities, results);
    }

    [[nodiscard]] const CompiledTerms &terms() const { return m_terms; }

private:
    CompiledTerms m_terms;
    Kernels m_kernels;
};

} // namespace quasistat::gas
