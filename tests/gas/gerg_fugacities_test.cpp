// Fugacities of GERG-2008 against differences of the mixture's Helmholtz energy, and the boundary they give.

#include "core/gas/library/gerg_2008.h"
#include "core/gas/phase/dew_boundary.h"
#include "core/gas/library/gerg_fugacities.h"
#include "core/gas/library/gerg_reducing.h"

#include <gtest/gtest.h>

#include <cmath>

namespace quasistat::gas
{
namespace
{

struct Mixture {
    std::vector<std::string> names;
    std::vector<double> fractions;
};
/// Ten components, with departure functions of their own, the common one, and pairs without any.
const Mixture naturalGas{{"methane", "nitrogen", "carbon dioxide", "ethane", "propane", "n-butane", "isobutane",
                          "n-pentane", "hydrogen", "water"},
                         {0.86, 0.03, 0.02, 0.05, 0.02, 0.006, 0.004, 0.002, 0.0075, 0.0005}};
const Mixture air{{"argon", "nitrogen", "oxygen"}, {0.0092, 0.7812, 0.2096}};
const Mixture methaneAndButane{{"methane", "n-butane"}, {0.95, 0.05}};
const Mixture nitrogen{{"nitrogen"}, {1.0}};

GergMixture loaded(const Mixture &mixture)
{
    std::vector<GergComponent> components;
    for (const std::string &name : mixture.names) components.push_back(*readGas(name).gerg);
    return gergMixture(std::make_shared<GergModel>(), mixture.names, std::move(components));
}

std::shared_ptr<const GergFugacities> fugacities(const Mixture &mixture)
{
    std::vector<Fugacities::Critical> critical;
    for (const std::string &name : mixture.names) {
        const CriticalConstants constants = *readGas(name).critical;
        critical.push_back({constants.temperature, constants.pressure, constants.acentricFactor});
    }
    const GergMixture parameters = loaded(mixture);
    return std::make_shared<GergFugacities>(parameters, critical, parameters.model->gasConstant());
}

/// α^r from the mixture's terms as assembled for one composition, evaluated as published.
double residualEnergy(const GergMixture &mixture, const std::vector<double> &x, double T, double density)
{
    const ResidualTerms terms = residualTerms(mixture, x);
    const double tau = terms.reducingTemperature / T;
    const double delta = density / terms.reducingDensity;
    double sum = 0.0;
    for (const PowerTerm &t : terms.powers)
        sum +=
            t.n * std::pow(delta, t.d) * std::pow(tau, t.t) * (t.l == 0 ? 1.0 : std::exp(-t.g * std::pow(delta, t.l)));
    for (const DepartureTerm &t : terms.departures)
        sum += t.n * std::pow(delta, t.d) * std::pow(tau, t.t) *
               std::exp(-t.eta * (delta - t.epsilon) * (delta - t.epsilon) - t.beta * (delta - t.gamma));
    return sum;
}

TEST(GergFugacities, UseTheSameReducingFunctionsAsTheEquation)
{
    for (const Mixture &mixture : {naturalGas, air, methaneAndButane, nitrogen}) {
        const GergMixture parameters = loaded(mixture);
        const GergReducing expected = reducing(parameters, mixture.fractions);
        const GergReducingSlopes found = reducingSlopes(parameters, mixture.fractions);
        EXPECT_NEAR(found.temperature / expected.temperature, 1.0, 1e-14);
        EXPECT_NEAR(found.volume * expected.density, 1.0, 1e-14);
    }
}

TEST(GergFugacities, AreDerivativesOfTheMixturesHelmholtzEnergy)
{
    for (const Mixture &mixture : {naturalGas, air, methaneAndButane, nitrogen}) {
        const GergMixture parameters = loaded(mixture);
        const auto fluid = fugacities(mixture);
        const std::size_t n = mixture.names.size();
        for (const double T : {150.0, 300.0, 450.0})
            for (const double density : {10.0, 6000.0, 18000.0}) {
                const auto energy = [&](std::vector<double> amounts) { // n α^r in V = 1/ρ
                    double total = 0.0;
                    for (const double amount : amounts) total += amount;
                    for (double &amount : amounts) amount /= total;
                    return total * residualEnergy(parameters, amounts, T, total * density);
                };
                std::vector<double> potentials(n);
                const double p = fluid->residualPotentials(T, density, mixture.fractions, potentials);
                double mean = 0.0;
                for (std::size_t i = 0; i < n; ++i) {
                    const double h = 2e-4 * mixture.fractions[i] + 1e-7;
                    const auto at = [&](double by) {
                        auto amounts = mixture.fractions;
                        amounts[i] += by;
                        return energy(amounts);
                    };
                    // Fourth order: truncation h⁴, rounding ε/h.
                    const double slope = (8.0 * (at(h) - at(-h)) - (at(2 * h) - at(-2 * h))) / (12.0 * h);
                    EXPECT_NEAR(potentials[i], slope, 1e-8 * (1.0 + std::abs(slope)) + 2e-15 / h)
                        << mixture.names[i] << " " << T << " " << density;
                    mean += mixture.fractions[i] * potentials[i];
                }
                // Σ xᵢΦᵢ = α^r + Z − 1, Euler's theorem.
                const double Z = p / (density * fluid->gasConstant() * T);
                EXPECT_NEAR(mean, residualEnergy(parameters, mixture.fractions, T, density) + Z - 1.0,
                            1e-12 * (1.0 + std::abs(Z)));
            }
    }
}

TEST(GergFugacities, ObeyGibbsAndDuhem)
{
    // Σ xᵢ dΦᵢ/dρ = (1/ρ)(dp/dρ/(RT) − 1) at constant temperature and composition.
    const auto fluid = fugacities(naturalGas);
    const double T = 280.0;
    for (const double density : {100.0, 3000.0, 9000.0}) {
        const double h = 1e-4 * density;
        std::vector<double> more(naturalGas.names.size());
        std::vector<double> less(naturalGas.names.size());
        const double high = fluid->residualPotentials(T, density + h, naturalGas.fractions, more);
        const double low = fluid->residualPotentials(T, density - h, naturalGas.fractions, less);
        double mean = 0.0;
        for (std::size_t i = 0; i < more.size(); ++i) mean += naturalGas.fractions[i] * (more[i] - less[i]) / (2 * h);
        const auto [p, slope] = fluid->pressure(T, density, naturalGas.fractions);
        EXPECT_NEAR(slope, (high - low) / (2 * h), 1e-6 * slope);
        EXPECT_NEAR(mean * density, slope / (fluid->gasConstant() * T) - 1.0, 1e-6);
        EXPECT_GT(p, 0.0);
    }
}

TEST(GergBoundary, OfAPureGasHasItsBoilingPointAndCriticalPoint)
{
    const auto fluid = fugacities(nitrogen);
    const DewBoundary boundary(fluid, {1.0}, 60.0);
    // Critical temperature of nitrogen as Kunz & Wagner (2012) reduce it, Table A5: 126.192 K; the short equation of
    // GERG-2008 has its own critical point within 0.3 K of it.
    EXPECT_NEAR(boundary.highestTemperature(), 126.192, 0.3);
    // Saturated vapour at 101325 Pa: 77.355 K, 4.6118 kg/m³ (R. Span et al., J. Phys. Chem. Ref. Data 29 (2000) 1361,
    // from memory); GERG-2008 states 0.5 % for vapour pressures, so 0.1 % in T.
    EXPECT_NEAR(boundary.temperatureAt(0.0280134 / 4.6118), 77.355, 0.1);
}

TEST(GergBoundary, OfAirHasItsDewPoint)
{
    // Dew point of dry air at 101325 Pa: 81.72 K, 4.4770 kg/m³ (E. W. Lemmon et al., J. Phys. Chem. Ref. Data 29
    // (2000) 331, from memory).
    const DewBoundary boundary(fugacities(air), air.fractions, 60.0);
    EXPECT_NEAR(boundary.temperatureAt(0.0289586 / 4.477), 81.72, 0.15);
    EXPECT_NEAR(boundary.highestTemperature(), 132.6, 0.5); // maxcondentherm 132.6312 K, same source
}

TEST(GergBoundary, InterpolatesWithinWhatItClaims)
{
    for (const Mixture &mixture : {naturalGas, air, methaneAndButane, nitrogen}) {
        const DewBoundary boundary(fugacities(mixture), mixture.fractions, 60.0);
        const auto [smallest, greatest] = boundary.knownVolumes();
        ASSERT_GT(greatest, 1e3 * smallest);
        double worst = 0.0;
        for (double v = greatest / 1.0001; v > smallest; v /= 1.09) {
            const double exact = boundary.temperatureAt(v);
            if (exact == 0.0) continue;
            worst = std::max(worst, std::abs(boundary.temperatureNear(v) / exact - 1.0));
            EXPECT_LE(exact, boundary.highestTemperature() * (1.0 + 1e-8)) << v;
        }
        EXPECT_LT(worst, 1e-4);
        EXPECT_GT(worst, 0.0);
    }
}

} // namespace
} // namespace quasistat::gas
