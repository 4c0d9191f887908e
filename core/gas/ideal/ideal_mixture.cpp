#include "core/gas/ideal/ideal_mixture.h"

#include "core/gas/constants.h"

#include <cmath>

namespace quasistat::gas
{
namespace
{

class IdealMixture final : public Gas
{
public:
    IdealMixture(std::shared_ptr<const IdealFunction> function, IdealMixtureFacts facts)
        : m_function(std::move(function)), m_facts(std::move(facts)),
          m_mixingEntropy(mixingEntropy(m_facts.composition, m_facts.gasConstant))
    {
    }

    Helmholtz helmholtz(double temperature, double molarVolume) const override
    {
        const MolarState state = at(temperature, molarVolume);
        return {.a = state.internalEnergy - temperature * state.entropy,
                .aT = -state.entropy,
                .av = -state.pressure,
                .aTT = -state.isochoricHeatCapacity / temperature,
                .aTv = -state.dpdT,
                .avv = -state.dpdv};
    }

    MolarState at(double temperature, double molarVolume) const override
    {
        const IdealProperties ideal = m_function->at(temperature);
        const double R = m_facts.gasConstant;
        const double dpdT = R / molarVolume;
        const double pressure = dpdT * temperature;
        return {.temperature = temperature,
                .molarVolume = molarVolume,
                .pressure = pressure,
                .internalEnergy = R * (ideal.enthalpy - temperature),
                .enthalpy = R * ideal.enthalpy,
                .entropy = R * (ideal.entropy - std::log(pressure / referencePressure)) + m_mixingEntropy,
                .isochoricHeatCapacity = R * (ideal.heatCapacity - 1.0),
                .dpdT = dpdT,
                .dpdv = -pressure / molarVolume,
                .vapourFraction = std::nullopt};
    }

    const Gas &idealPart() const override { return *this; }
    double molarMass() const override { return m_facts.molarMass; }
    double gasConstant() const override { return m_facts.gasConstant; }
    const Composition &composition() const override { return m_facts.composition; }
    const Validity &validity() const override { return m_facts.validity; }
    std::span<const double> seams() const override { return m_function->seams(); }
    const Equation *equation() const override { return nullptr; }
    std::string_view model() const override { return m_facts.model; }
    std::string_view source() const override { return m_facts.source; }
    const std::string &name() const override { return m_facts.name; }

private:
    std::shared_ptr<const IdealFunction> m_function;
    IdealMixtureFacts m_facts;
    double m_mixingEntropy;
};

} // namespace

double mixingEntropy(const Composition &composition, double gasConstant)
{
    double sum = 0.0;
    for (const Share &share : composition) sum -= share.moleFraction * std::log(share.moleFraction);
    return gasConstant * sum;
}

GasPtr idealMixture(std::shared_ptr<const IdealFunction> function, IdealMixtureFacts facts)
{
    return std::make_shared<IdealMixture>(std::move(function), std::move(facts));
}

} // namespace quasistat::gas
