#include "core/gas/ideal_mixture.h"

#include "core/gas/constants.h"

#include <cmath>

namespace quasistat::gas
{
namespace
{

constexpr double R = molarGasConstant;

double mixingEntropy(const Composition &composition)
{
    double sum = 0.0;
    for (const Share &share : composition) sum -= share.moleFraction * std::log(share.moleFraction);
    return R * sum;
}

class IdealMixture final : public Gas
{
public:
    IdealMixture(HeatCapacity heatCapacity, IdealMixtureFacts facts)
        : m_heatCapacity(std::move(heatCapacity)), m_facts(std::move(facts)),
          m_mixingEntropy(mixingEntropy(m_facts.composition))
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
        const IdealProperties ideal = m_heatCapacity.at(temperature);
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
    double gasConstant() const override { return R; }
    const Composition &composition() const override { return m_facts.composition; }
    const Validity &validity() const override { return m_facts.validity; }
    std::span<const double> seams() const override { return m_heatCapacity.seams(); }
    bool isIdeal() const override { return true; }
    std::string_view model() const override { return "ideal"; }
    std::string_view source() const override { return m_facts.source; }
    const std::string &name() const override { return m_facts.name; }

private:
    HeatCapacity m_heatCapacity;
    IdealMixtureFacts m_facts;
    double m_mixingEntropy;
};

} // namespace

GasPtr idealMixture(HeatCapacity heatCapacity, IdealMixtureFacts facts)
{
    return std::make_shared<IdealMixture>(std::move(heatCapacity), std::move(facts));
}

} // namespace quasistat::gas
