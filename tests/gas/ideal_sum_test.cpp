// Ideal parts of several forms, held beyond their ranges and added up.

#include "core/gas/constants.h"
#include "core/gas/ideal/held_ideal.h"
#include "core/gas/ideal/helmholtz_ideal.h"
#include "core/gas/ideal/ideal_sum.h"
#include "core/gas/library/ideal_part.h"

#include <gtest/gtest.h>

#include <cmath>

namespace quasistat::gas
{
namespace
{

using FunctionPtr = std::shared_ptr<const IdealFunction>;

FunctionPtr polynomial(std::vector<double> coefficients, double from, double to)
{
    return std::make_shared<HeatCapacity>(
        heatCapacityOf({.molarMass = 0.0, .limits = {from, to}, .rows = {std::move(coefficients)}, .source = {}}));
}

/// Planck–Einstein vibration over a rigid rotor.
FunctionPtr vibrating()
{
    return helmholtzIdeal({.reducingTemperature = 300.0, .logTau = 2.5, .powers = {}, .planckEinstein = {{1.0, 11.0}}});
}

void expectConsistent(const IdealFunction &function, double T)
{
    const double h = 1e-4 * T;
    const IdealProperties cold = function.at(T - h);
    const IdealProperties hot = function.at(T + h);
    const IdealProperties here = function.at(T);
    EXPECT_NEAR((hot.enthalpy - cold.enthalpy) / (2 * h), here.heatCapacity, 1e-6 * here.heatCapacity) << T;
    EXPECT_NEAR((hot.entropy - cold.entropy) / (2 * h), here.heatCapacity / T, 1e-6 * here.heatCapacity / T) << T;
}

TEST(HeatCapacity, TakesAsManyPowersAsItsSourceHas)
{
    const std::vector<double> a{3.1, 1e-3, -2e-7, 3e-10, 1e-13, -2e-16, 1e-19, 3e-24};
    const FunctionPtr function = polynomial(a, 200.0, 900.0);
    for (const double T : {250.0, 298.15, 500.0, 850.0}) {
        double value = 0.0;
        double enthalpy = 0.0;
        double entropy = a[0] * std::log(T / referenceTemperature);
        for (std::size_t k = 0; k < a.size(); ++k) {
            const double power = static_cast<double>(k);
            value += a[k] * std::pow(T, power);
            enthalpy += a[k] * (std::pow(T, power + 1) - std::pow(referenceTemperature, power + 1)) / (power + 1);
            if (k > 0) entropy += a[k] * (std::pow(T, power) - std::pow(referenceTemperature, power)) / power;
        }
        const IdealProperties at = function->at(T);
        EXPECT_NEAR(at.heatCapacity, value, 1e-13 * value);
        EXPECT_NEAR(at.enthalpy, enthalpy, 1e-12 * T);
        EXPECT_NEAR(at.entropy, entropy, 1e-12);
    }
}

TEST(HeatCapacity, OfOneNumberIsConstant)
{
    const FunctionPtr function = polynomial({2.5}, 300.0, 400.0);
    for (const double T : {60.0, 298.15, 350.0, 5000.0}) {
        EXPECT_DOUBLE_EQ(function->at(T).heatCapacity, 2.5);
        EXPECT_NEAR(function->at(T).enthalpy, 2.5 * (T - referenceTemperature), 1e-11 * T);
    }
}

TEST(HeldIdeal, KeepsItsHeatCapacityBeyondBothEnds)
{
    const FunctionPtr source = vibrating();
    const FunctionPtr held = heldIdeal(source, 200.0, 800.0);
    EXPECT_EQ(held->at(60.0).heatCapacity, source->at(200.0).heatCapacity);
    EXPECT_EQ(held->at(5000.0).heatCapacity, source->at(800.0).heatCapacity);
    EXPECT_NEAR(held->at(500.0).heatCapacity, source->at(500.0).heatCapacity, 1e-15);
    for (const double T : {60.0, 150.0, 298.15, 790.0, 900.0, 5000.0}) expectConsistent(*held, T);
    for (const double seam : {200.0, 800.0}) {
        const IdealProperties below = held->at(seam * (1.0 - 1e-13));
        const IdealProperties above = held->at(seam * (1.0 + 1e-13));
        EXPECT_NEAR(below.enthalpy, above.enthalpy, 1e-9);
        EXPECT_NEAR(below.entropy, above.entropy, 1e-11);
    }
    ASSERT_EQ(held->seams().size(), 2U);
    EXPECT_EQ(held->seams()[0], 200.0);
    EXPECT_EQ(held->seams()[1], 800.0);
}

TEST(HeldIdeal, IsZeroAtTheReferenceStateEvenWhereItsRangeBeginsAboveIt)
{
    const FunctionPtr held = heldIdeal(vibrating(), 350.0, 800.0);
    EXPECT_NEAR(held->at(referenceTemperature).enthalpy, 0.0, 1e-12);
    EXPECT_NEAR(held->at(referenceTemperature).entropy, 0.0, 1e-15);
}

TEST(IdealSum, WeighsFunctionsOfEveryForm)
{
    const std::vector<FunctionPtr> parts{polynomial({3.5, 1e-4}, 200.0, 1000.0), heldIdeal(vibrating(), 100.0, 700.0),
                                         polynomial({2.5}, 300.0, 2000.0)};
    const std::vector<double> weights{0.5, 0.3, 0.2};
    const FunctionPtr sum = idealSum(parts, weights);
    for (const double T : {60.0, 150.0, 298.15, 600.0, 900.0, 3000.0}) {
        IdealProperties expected{0.0, 0.0, 0.0};
        for (std::size_t i = 0; i < parts.size(); ++i) {
            const IdealProperties own = parts[i]->at(T);
            expected.heatCapacity += weights[i] * own.heatCapacity;
            expected.enthalpy += weights[i] * own.enthalpy;
            expected.entropy += weights[i] * own.entropy;
        }
        const IdealProperties found = sum->at(T);
        EXPECT_NEAR(found.heatCapacity, expected.heatCapacity, 1e-13);
        EXPECT_NEAR(found.enthalpy, expected.enthalpy, 1e-12 * T);
        EXPECT_NEAR(found.entropy, expected.entropy, 1e-12);
    }
    for (const double seam : {100.0, 200.0, 300.0, 700.0, 1000.0, 2000.0})
        EXPECT_NE(std::find(sum->seams().begin(), sum->seams().end(), seam), sum->seams().end()) << seam;
    EXPECT_TRUE(std::is_sorted(sum->seams().begin(), sum->seams().end()));
}

TEST(IdealSum, OfPolynomialsIsOnePolynomial)
{
    const FunctionPtr sum = idealSum({polynomial({3.5}, 200.0, 1000.0), polynomial({2.5, 1e-3, 1e-7}, 300.0, 900.0)},
                                     std::vector<double>{0.25, 0.75});
    EXPECT_NE(dynamic_cast<const HeatCapacity *>(sum.get()), nullptr);
}

} // namespace
} // namespace quasistat::gas
