// A gas of any equation of state.

#include "core/gas/equation/equation.h"
#include "core/gas/ideal/ideal_mixture.h"
#include "core/gas/phase/saturation.h"

#include <cassert>

namespace quasistat::gas
{
namespace
{

class RealGas final : public Gas
{
public:
    RealGas(Equation equation, RealGasFacts facts)
        : m_equation(std::move(equation)), m_facts(std::move(facts)),
          m_ideal(idealMixture(m_equation.ideal, {.model = m_facts.model,
                                                  .composition = m_facts.composition,
                                                  .molarMass = m_facts.molarMass,
                                                  .gasConstant = m_equation.gasConstant,
                                                  .validity = m_facts.validity,
                                                  .name = m_facts.name,
                                                  .source = m_facts.source}))
    {
        assert(m_equation.ideal && m_equation.residual && m_equation.highestDensity > 0.0);
    }

    Helmholtz helmholtz(double temperature, double molarVolume) const override
    {
        const MolarState s = homogeneousState(m_equation, temperature, molarVolume);
        return {.a = s.internalEnergy - temperature * s.entropy,
                .aT = -s.entropy,
                .av = -s.pressure,
                .aTT = -s.isochoricHeatCapacity / temperature,
                .aTv = -s.dpdT,
                .avv = -s.dpdv};
    }

    MolarState at(double temperature, double molarVolume) const override
    {
        if (m_equation.saturation && isTwoPhase(*m_equation.boundary, temperature, molarVolume))
            if (const auto pair = m_equation.saturation->atTemperature(temperature);
                pair && molarVolume > pair->liquid.molarVolume && molarVolume < pair->vapour.molarVolume)
                return twoPhaseState(*pair, molarVolume);
        return homogeneousState(m_equation, temperature, molarVolume);
    }

    const Gas &idealPart() const override { return *m_ideal; }
    double molarMass() const override { return m_facts.molarMass; }
    double gasConstant() const override { return m_equation.gasConstant; }
    const Composition &composition() const override { return m_facts.composition; }
    const Validity &validity() const override { return m_facts.validity; }
    std::span<const double> seams() const override { return m_equation.ideal->seams(); }
    const Equation *equation() const override { return &m_equation; }
    std::string_view model() const override { return m_facts.model; }
    std::string_view source() const override { return m_facts.source; }
    const std::string &name() const override { return m_facts.name; }

private:
    Equation m_equation;
    RealGasFacts m_facts;
    GasPtr m_ideal;
};

} // namespace

GasPtr realGas(Equation equation, RealGasFacts facts)
{
    return std::make_shared<RealGas>(std::move(equation), std::move(facts));
}

} // namespace quasistat::gas
