// Where pure fluids and mixtures part, by cubic equations.

#include "core/gas/constants.h"
#include "core/gas/phase/cubic_fugacities.h"
#include "core/gas/phase/dew_boundary.h"
#include "core/gas/phase/incipient_phase.h"

#include <gtest/gtest.h>

#include <cmath>
#include <numeric>
#include <thread>

namespace quasistat::gas
{
namespace
{

constexpr double R = molarGasConstant;
constexpr double coldest = 50.0;

const CubicSubstance methane{190.564, 4.5992e6, 0.01142};
const CubicSubstance nitrogen{126.192, 3.3958e6, 0.0372};
const CubicSubstance oxygen{154.581, 5.043e6, 0.0222};
const CubicSubstance argon{150.687, 4.863e6, -0.00219};
const CubicSubstance ethane{305.322, 4.8722e6, 0.0995};
const CubicSubstance propane{369.89, 4.2512e6, 0.1521};
const CubicSubstance butane{425.125, 3.796e6, 0.2008101};
const CubicSubstance decane{617.7, 2.103e6, 0.4884};
const CubicSubstance dioxide{304.1282, 7.3773e6, 0.22394};
const CubicSubstance water{647.096, 22.064e6, 0.3442920843};
const CubicSubstance hydrogen{33.145, 1.2964e6, -0.219};
const CubicSubstance helium{5.1953, 0.2276e6, -0.3836};

constexpr CubicForm forms[]{CubicForm::pengRobinson, CubicForm::soaveRedlichKwong};

struct Fluid {
    const char *name;
    std::vector<CubicSubstance> gases;
    std::vector<double> fractions;
};
const Fluid fluids[]{{"propane", {propane}, {1.0}},
                     {"carbon dioxide", {dioxide}, {1.0}},
                     {"methane, n-butane", {methane, butane}, {0.95, 0.05}},
                     {"methane, n-decane", {methane, decane}, {0.5, 0.5}},
                     {"air", {argon, nitrogen, oxygen}, {0.0092, 0.7812, 0.2096}},
                     {"helium, nitrogen", {helium, nitrogen}, {0.3, 0.7}},
                     {"hydrogen, n-decane", {hydrogen, decane}, {0.95, 0.05}},
                     {"methane, water", {methane, water}, {0.99, 0.01}},
                     {"carbon dioxide with a trace of water", {dioxide, water}, {1.0 - 1e-9, 1e-9}},
                     {"natural gas",
                      {methane, nitrogen, dioxide, ethane, propane, butane, decane, water, helium, hydrogen},
                      {0.85, 0.03, 0.02, 0.05, 0.02, 0.01, 0.002, 0.001, 0.007, 0.01}}};

std::shared_ptr<const CubicFugacities> fugacities(const std::vector<CubicSubstance> &gases, CubicForm form)
{
    return std::make_shared<CubicFugacities>(
        CubicMixture(form, gases, std::vector<double>(gases.size() * gases.size(), 0.0)));
}

DewBoundary boundaryOf(const Fluid &fluid, CubicForm form = CubicForm::pengRobinson)
{
    return {fugacities(fluid.gases, form), fluid.fractions, coldest};
}

/// The other density of a pure fluid with the same pressure and fugacity, by plain bisection on the densest root.
double liquidDensity(const Fugacities &fluid, double T, double pressure)
{
    const std::vector<double> pure{1.0};
    double high = 0.9999 * fluid.closestPacking(pure);
    double low = high;
    while (fluid.pressure(T, low, pure).pressure > pressure) low *= 0.99;
    for (int k = 0; k < 100; ++k) {
        const double middle = 0.5 * (low + high);
        (fluid.pressure(T, middle, pure).pressure > pressure ? high : low) = middle;
    }
    return 0.5 * (low + high);
}

TEST(DewBoundary, GivesTheVapourPressureThatDefinesTheAcentricFactor)
{
    for (const CubicForm form : forms)
        for (const CubicSubstance &gas : {argon, methane, propane, butane, dioxide}) {
            const auto fluid = fugacities({gas}, form);
            const DewBoundary boundary(fluid, {1.0}, coldest);
            // The vapour's volume at which it is saturated at 0.7 T_c.
            double thin = std::log(R * gas.criticalTemperature / (1e-4 * gas.criticalPressure));
            double dense = std::log(R * gas.criticalTemperature / gas.criticalPressure);
            for (int k = 0; k < 100; ++k) {
                const double middle = 0.5 * (thin + dense);
                (boundary.temperatureAt(std::exp(middle)) > 0.7 * gas.criticalTemperature ? dense : thin) = middle;
            }
            const double T = 0.7 * gas.criticalTemperature;
            const double density = std::exp(-thin);
            const std::vector<double> pure{1.0};
            const double pressure = fluid->pressure(T, density, pure).pressure;
            // ω = −lg(p_s/p_c) − 1 at 0.7 T_c. Soave fitted his function to 1 %; to carbon dioxide's triple point none.
            const double defined = std::pow(10.0, -1.0 - gas.acentricFactor) * gas.criticalPressure;
            EXPECT_NEAR(pressure / defined, 1.0, 0.015) << gas.criticalTemperature;

            std::vector<double> vapour(1);
            std::vector<double> liquid(1);
            fluid->lnFugacityCoefficients(T, density, pure, vapour);
            fluid->lnFugacityCoefficients(T, liquidDensity(*fluid, T, pressure), pure, liquid);
            EXPECT_NEAR(vapour[0], liquid[0], 1e-9);
        }
}

TEST(DewBoundary, OfAPureFluidEndsInItsCriticalPoint)
{
    for (const CubicForm form : forms)
        for (const CubicSubstance &gas : {argon, methane, butane, decane, water}) {
            const DewBoundary boundary(fugacities({gas}, form), {1.0}, coldest);
            EXPECT_NEAR(boundary.highestTemperature() / gas.criticalTemperature, 1.0, 3e-9);
            const double v = factsOf(form).criticalCompressibility * R * gas.criticalTemperature / gas.criticalPressure;
            EXPECT_NEAR(boundary.temperatureAt(v) / gas.criticalTemperature, 1.0, 3e-9);
        }
}

TEST(DewBoundary, FollowsRaoultInAThinMixture)
{
    // 1/p = Σ zᵢ/pᵢ with each component's own vapour pressure by the same equation, phases ideal to 1 %: propane and
    // n-butane at some 10 kPa.
    const DewBoundary boundary(fugacities({propane, butane}, CubicForm::pengRobinson), {0.5, 0.5}, coldest);
    const double v = 0.2;
    const double T = boundary.temperatureAt(v);
    const auto vapourPressure = [&](const CubicSubstance &gas) {
        const DewBoundary pure(fugacities({gas}, CubicForm::pengRobinson), {1.0}, coldest);
        double low = std::log(1e-3);
        double high = std::log(1e3);
        for (int k = 0; k < 100; ++k) {
            const double middle = 0.5 * (low + high);
            (pure.temperatureAt(std::exp(middle)) > T ? low : high) = middle;
        }
        return R * T / std::exp(low);
    };
    const double raoult = 1.0 / (0.5 / vapourPressure(propane) + 0.5 / vapourPressure(butane));
    EXPECT_NEAR(R * T / v / raoult, 1.0, 0.02);
}

TEST(DewBoundary, LetsRichGasCondenseAboveItsCriticalTemperature)
{
    // Retrograde condensation: the cricondentherm lies on the dew side, far from the critical point, where trace and
    // mixture are the same.
    const DewBoundary boundary = boundaryOf(fluids[2]);
    const double highest = boundary.highestTemperature();
    double hottest = 0.0;
    double volume = 0.0;
    const auto [smallest, greatest] = boundary.knownVolumes();
    for (double v = greatest; v > smallest; v /= 1.01)
        if (const double T = boundary.temperatureAt(v); T > hottest) {
            hottest = T;
            volume = v;
        }
    EXPECT_NEAR(hottest, highest, 1e-4 * highest);
    EXPECT_LE(hottest, highest * (1.0 + 1e-9));
    EXPECT_GT(highest, 250.0);
    EXPECT_LT(highest, 300.0);
    // At twice its density the fluid is still two-phase below, but at a much lower temperature.
    EXPECT_LT(boundary.temperatureAt(volume / 4.0), highest - 10.0);
}

/// Trace phase of a state on the boundary with everything solved again by plain successive substitution, as textbooks
/// have it; whether Σ W = 1, which is what makes it the boundary.
double sumOfTrace(const Fugacities &fluid, const std::vector<double> &z, double T, double density)
{
    const std::size_t n = z.size();
    std::vector<double> mixture(n);
    std::vector<double> trace(n);
    std::vector<double> w(n);
    const double pressure = fluid.pressure(T, density, z).pressure;
    fluid.lnFugacityCoefficients(T, density, z, mixture);
    for (std::size_t i = 0; i < n; ++i) {
        const auto critical = fluid.critical(i);
        w[i] = z[i] * pressure / critical.pressure *
               std::exp(-5.373 * (1.0 + critical.acentricFactor) * (1.0 - critical.temperature / T));
    }
    double sum = 0.0;
    for (int k = 0; k < 3000; ++k) {
        sum = std::accumulate(w.begin(), w.end(), 0.0);
        for (double &share : w) share /= sum;
        double high = 0.9999 * fluid.closestPacking(w);
        double low = high;
        while (fluid.pressure(T, low, w).pressure > pressure) low *= 0.99;
        for (int j = 0; j < 60; ++j) {
            const double middle = 0.5 * (low + high);
            (fluid.pressure(T, middle, w).pressure > pressure ? high : low) = middle;
        }
        fluid.lnFugacityCoefficients(T, low, w, trace);
        for (std::size_t i = 0; i < n; ++i) w[i] = z[i] * std::exp(mixture[i] - trace[i]);
    }
    return std::accumulate(w.begin(), w.end(), 0.0);
}

TEST(DewBoundary, IsWhereSuccessiveSubstitutionFindsATraceOfLiquid)
{
    for (const std::size_t which : {2U, 3U, 4U}) {
        const Fluid &fluid = fluids[which];
        const auto equation = fugacities(fluid.gases, CubicForm::pengRobinson);
        const DewBoundary boundary = boundaryOf(fluid);
        for (const double v : {3e-2, 3e-3, 1e-3}) {
            const double T = boundary.temperatureAt(v);
            ASSERT_GT(T, coldest);
            EXPECT_NEAR(sumOfTrace(*equation, fluid.fractions, T, 1.0 / v), 1.0, 1e-8) << fluid.name << " " << v;
            EXPECT_LT(sumOfTrace(*equation, fluid.fractions, T * 1.001, 1.0 / v), 1.0) << fluid.name << " " << v;
            EXPECT_GT(sumOfTrace(*equation, fluid.fractions, T * 0.999, 1.0 / v), 1.0) << fluid.name << " " << v;
        }
    }
}

TEST(DewBoundary, InterpolatesWithinWhatItClaims)
{
    for (const CubicForm form : forms)
        for (const Fluid &fluid : fluids) {
            const DewBoundary boundary = boundaryOf(fluid, form);
            const auto [smallest, greatest] = boundary.knownVolumes();
            ASSERT_GT(greatest, smallest) << fluid.name;
            double worst = 0.0;
            for (double v = greatest / 1.0001; v > smallest; v /= 1.037) {
                const double exact = boundary.temperatureAt(v);
                if (exact == 0.0 || exact < coldest * 1.001) continue;
                worst = std::max(worst, std::abs(boundary.temperatureNear(v) / exact - 1.0));
                EXPECT_LE(exact, boundary.highestTemperature() * (1.0 + 1e-8)) << fluid.name << " " << v;
            }
            EXPECT_LT(worst, 1e-4) << fluid.name;
            EXPECT_GT(worst, 0.0) << fluid.name; // the exact one is found anew
        }
}

TEST(DewBoundary, ReachesFromThinVapourToLiquid)
{
    for (const Fluid &fluid : fluids) {
        const DewBoundary boundary = boundaryOf(fluid);
        const auto [smallest, greatest] = boundary.knownVolumes();
        const double b = 1.0 / fugacities(fluid.gases, CubicForm::pengRobinson)->closestPacking(fluid.fractions);
        EXPECT_LT(smallest, 1.5 * b) << fluid.name;
        EXPECT_GT(greatest, 1e4 * b) << fluid.name;
    }
}

TEST(DewBoundary, GoesOnWhereAnotherLiquidTakesOver)
{
    // The first drop in the thin gas is mostly ethanol, in the dense one mostly propane: the one branch ends in a cusp
    // before the other is done.
    const CubicSubstance ethanol{514.71, 6.268e6, 0.646};
    for (const double share : {0.002, 0.004, 0.01}) {
        const std::vector<double> z{0.6, 0.4 - share, share};
        const std::vector<double> k{0.0, 0.1, 0.1, 0.1, 0.0, 0.1, 0.1, 0.1, 0.0};
        const auto fluid =
            std::make_shared<CubicFugacities>(CubicMixture(CubicForm::pengRobinson, {helium, propane, ethanol}, k));
        const DewBoundary boundary(fluid, z, coldest);
        EXPECT_LT(boundary.knownVolumes().smallest * fluid->closestPacking(z), 1.1);
        for (const double v : {5e-2, 5e-3, 5e-4}) {
            const double T = boundary.temperatureAt(v);
            ASSERT_GT(T, coldest);
            EXPECT_NEAR(sumOfTrace(*fluid, z, T, 1.0 / v), 1.0, 1e-8) << share << " " << v;
        }
        // No step where they change: the temperatures of neighbouring volumes stay together.
        double previous = boundary.temperatureAt(0.1);
        for (double v = 0.1 / 1.01; v > 2e-4; v /= 1.01) {
            const double T = boundary.temperatureAt(v);
            EXPECT_NEAR(T, previous, 0.01 * previous) << share << " " << v;
            previous = T;
        }
    }
}

TEST(DewBoundary, KnowsNoSecondPhaseBelowTheModelsLowestTemperature)
{
    for (const CubicSubstance &gas : {hydrogen, helium}) {
        const DewBoundary boundary(fugacities({gas}, CubicForm::pengRobinson), {1.0}, coldest);
        EXPECT_EQ(boundary.highestTemperature(), 0.0);
        for (double v = 1e-5; v < 1e3; v *= 1.7) {
            EXPECT_EQ(boundary.temperatureNear(v), 0.0);
            EXPECT_EQ(boundary.temperatureAt(v), 0.0);
            EXPECT_FALSE(isTwoPhase(boundary, 60.0, v));
        }
    }
}

TEST(DewBoundary, AgreesWithItselfFromSeveralThreads)
{
    const DewBoundary boundary = boundaryOf(fluids[9]);
    const DewBoundary other = boundaryOf(fluids[9]);
    std::vector<double> found(8);
    std::vector<std::thread> threads;
    for (double &result : found) threads.emplace_back([&boundary, &result] { result = boundary.temperatureAt(2e-3); });
    for (std::thread &thread : threads) thread.join();
    for (const double result : found) EXPECT_EQ(result, other.temperatureAt(2e-3));
    EXPECT_GT(found.front(), 200.0);
}

} // namespace
} // namespace quasistat::gas
