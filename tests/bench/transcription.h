#pragma once
// The published formulas written down as they are printed: one loop over the terms, std::pow and std::exp for each.
// What the product's evaluators are measured and checked against; shares nothing with them but the coefficients.

#include "core/gas/library/gerg_2008.h"

#include <vector>

namespace quasistat::transcription
{

/// α and its derivatives, scaled: a_ij = τⁱ δʲ ∂ⁱ⁺ʲα/∂τⁱ∂δʲ.
struct Derivatives {
    double a00 = 0.0;
    double a10 = 0.0;
    double a01 = 0.0;
    double a20 = 0.0;
    double a11 = 0.0;
    double a02 = 0.0;
};

/// SI, molar; h and s in the zeros of the source.
struct Properties {
    double pressure;
    double internalEnergy;
    double enthalpy;
    double entropy;
    double isochoricHeatCapacity;
    double isobaricHeatCapacity;
    double speedOfSound;
    double jouleThomson;     ///< (∂T/∂p)_h [K/Pa]
    double densitySlope;     ///< (∂p/∂ρ)_T [Pa m³/mol]
    double temperatureSlope; ///< (∂p/∂T)_ρ [Pa/K]
};

class Fluid
{
public:
    virtual ~Fluid() = default;
    [[nodiscard]] virtual Derivatives ideal(double temperature, double density) const = 0;
    [[nodiscard]] virtual Derivatives residual(double temperature, double density) const = 0;
    [[nodiscard]] virtual double gasConstant() const = 0;
    [[nodiscard]] virtual double molarMass() const = 0;

    [[nodiscard]] Properties at(double temperature, double density) const;
};

/// A reference equation of power and Gaussian terms.
class ReferenceFluid final : public Fluid
{
public:
    explicit ReferenceFluid(gas::ReferenceData data) : m_data(std::move(data)) {}
    [[nodiscard]] Derivatives ideal(double temperature, double density) const override;
    [[nodiscard]] Derivatives residual(double temperature, double density) const override;
    [[nodiscard]] double gasConstant() const override { return m_data.gasConstant; }
    [[nodiscard]] double molarMass() const override { return m_data.molarMass; }

private:
    gas::ReferenceData m_data;
};

/// GERG-2008 as printed: components and departure pairs one after the other, heat capacities by sinh and cosh. The
/// reducing point of the fixed composition is worked out once.
class GergFluid final : public Fluid
{
public:
    GergFluid(gas::GergMixture mixture, std::vector<double> fractions);
    [[nodiscard]] Derivatives ideal(double temperature, double density) const override;
    [[nodiscard]] Derivatives residual(double temperature, double density) const override;
    [[nodiscard]] double gasConstant() const override { return m_mixture.model->gasConstant(); }
    [[nodiscard]] double molarMass() const override;

private:
    gas::GergMixture m_mixture;
    std::vector<double> m_fractions;
    double m_reducingTemperature = 0.0;
    double m_reducingDensity = 0.0;
};

/// Sums over lists of terms at τ, δ.
void add(const std::vector<gas::PowerTerm> &terms, double weight, double tau, double delta, Derivatives &sum);
void add(const std::vector<gas::GaussianTerm> &terms, double weight, double tau, double delta, Derivatives &sum);
void add(const std::vector<gas::DepartureTerm> &terms, double weight, double tau, double delta, Derivatives &sum);
[[nodiscard]] Derivatives idealSum(const gas::IdealTerms &terms, double tau, double delta);

struct Point {
    double temperature; ///< [K]
    double density;     ///< [mol/m³]
};
/// Newton in the density from the ideal gas [mol/m³].
[[nodiscard]] double densityAt(const Fluid &fluid, double temperature, double pressure);
/// Newton in (ln T, ln ρ) from a point nearby. p [Pa], s [J/(mol K)].
[[nodiscard]] Point pointAt(const Fluid &fluid, double pressure, double entropy, Point guess);

} // namespace quasistat::transcription
