#include "core/gas/equation/cubic_mixture.h"

#include "core/gas/constants.h"

#include <algorithm>
#include <cassert>
#include <cmath>

namespace quasistat::gas
{

CubicMixture::CubicMixture(CubicForm form, const std::vector<CubicSubstance> &substances,
                           std::vector<double> interaction)
    : m_form(factsOf(form)), m_substances(substances), m_factors(std::move(interaction))
{
    const std::size_t n = size();
    assert(n > 0 && m_factors.size() == n * n);
    for (std::size_t i = 0; i < n; ++i) {
        for (std::size_t j = 0; j < n; ++j) m_factors[i * n + j] = i == j ? 1.0 : 1.0 - m_factors[i * n + j];
        const CubicSubstance &substance = m_substances[i];
        const double RT = molarGasConstant * substance.criticalTemperature;
        const double rootAtCritical = std::sqrt(m_form.omegaA / substance.criticalPressure) * RT;
        const double m = alphaSlope(form, substance.acentricFactor);
        m_roots.push_back({rootAtCritical * (1.0 + m), rootAtCritical * m / std::sqrt(substance.criticalTemperature)});
        m_covolumes.push_back(m_form.omegaB * RT / substance.criticalPressure);
    }
}

double CubicMixture::covolume(std::span<const double> fractions) const
{
    assert(fractions.size() == size());
    double sum = 0.0;
    for (std::size_t i = 0; i < size(); ++i) sum += fractions[i] * m_covolumes[i];
    return sum;
}

CubicPacking cubicPacking(const CubicFormFacts &form, double packing)
{
    const double y = std::min(packing, closestCubicPacking);
    const double free = y / (1.0 - y);
    const double difference = form.delta1 - form.delta2;
    const double lower = 1.0 + form.delta2 * y;
    const double first = y / ((1.0 + form.delta1 * y) * lower);
    return {.logFree = -std::log1p(-y),
            .free1 = free,
            .free2 = free * free,
            .attraction = std::log1p(difference * y / lower) / difference,
            .attraction1 = first,
            .attraction2 = -first * first * (form.delta1 + form.delta2 + 2.0 * form.delta1 * form.delta2 * y)};
}

} // namespace quasistat::gas
