// The perfect gas: p v = R T with constant heat capacities.

#include "core/gas/constants.h"
#include "core/gas/library/library.h"

#include <cmath>
#include <limits>

namespace quasistat::gas
{
namespace
{

constexpr double infinity = std::numeric_limits<double>::infinity();

class Perfect final : public Gas
{
public:
    explicit Perfect(const PerfectGas &parameters)
        : m_molarMass(parameters.molarMass), m_cv(molarGasConstant / (parameters.heatCapacityRatio - 1.0)),
          m_cp(parameters.heatCapacityRatio * m_cv), m_name(parameters.name)
    {
    }

    Helmholtz helmholtz(double temperature, double molarVolume) const override
    {
        const MolarState state = at(temperature, molarVolume);
        return {.a = state.internalEnergy - temperature * state.entropy,
                .aT = -state.entropy,
                .av = -state.pressure,
                .aTT = -m_cv / temperature,
                .aTv = -state.dpdT,
                .avv = -state.dpdv};
    }

    MolarState at(double temperature, double molarVolume) const override
    {
        constexpr double referenceVolume = molarGasConstant * referenceTemperature / referencePressure;
        const double dpdT = molarGasConstant / molarVolume;
        const double pressure = dpdT * temperature;
        const double enthalpy = m_cp * (temperature - referenceTemperature);
        return {.temperature = temperature,
                .molarVolume = molarVolume,
                .pressure = pressure,
                .internalEnergy = enthalpy - molarGasConstant * temperature,
                .enthalpy = enthalpy,
                .entropy = m_cv * std::log(temperature / referenceTemperature) +
                           molarGasConstant * std::log(molarVolume / referenceVolume),
                .isochoricHeatCapacity = m_cv,
                .dpdT = dpdT,
                .dpdv = -pressure / molarVolume,
                .vapourFraction = std::nullopt};
    }

    const Gas &idealPart() const override { return *this; }
    double molarMass() const override { return m_molarMass; }
    double gasConstant() const override { return molarGasConstant; }
    const Composition &composition() const override { return m_composition; }
    const Validity &validity() const override { return m_validity; }
    std::span<const double> seams() const override { return {}; }
    const Equation *equation() const override { return nullptr; }
    std::string_view model() const override { return "perfect"; }
    std::string_view source() const override
    {
        return "p v = R T with constant heat capacities; R exact: SI Brochure, 9th ed. (2019)";
    }
    const std::string &name() const override { return m_name; }

private:
    double m_molarMass;
    double m_cv;
    double m_cp;
    std::string m_name;
    Composition m_composition;
    Validity m_validity{{0.0, infinity, infinity}, {0.0, infinity, infinity}, {}};
};

} // namespace

Outcome<GasPtr> perfectGas(const PerfectGas &parameters)
{
    const double gamma = parameters.heatCapacityRatio;
    if (!(gamma > 1.0) || !std::isfinite(gamma))
        return Failure{Reason::outOfRange,
                       "/heat_capacity_ratio",
                       {"the heat capacity ratio is {0}, but must be greater than 1 (air 1.4, a monatomic gas 1.667)",
                        {Figure{units::Quantity::number, gamma}}}};
    if (!(parameters.molarMass > 0.0) || !std::isfinite(parameters.molarMass))
        return Failure{Reason::outOfRange, "/molar_mass", {"a molar mass must be greater than zero", {}}};
    return GasPtr(std::make_shared<Perfect>(parameters));
}

} // namespace quasistat::gas
