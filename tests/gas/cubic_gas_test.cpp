// Gases by cubic equations: what they are built from, and that the whole gas is consistent.

#include "core/gas/constants.h"
#include "core/gas/equation/equation.h"
#include "core/gas/library/cubic_gas.h"
#include "core/gas/solve/solve.h"

#include <gtest/gtest.h>

#include <cmath>

namespace quasistat::gas
{
namespace
{

constexpr double R = molarGasConstant;

CubicRequest request(CubicForm form, const std::vector<std::string> &names, std::vector<double> fractions)
{
    CubicRequest result{.form = form,
                        .components = {},
                        .fractions = std::move(fractions),
                        .interaction = std::vector<double>(names.size() * names.size(), 0.0),
                        .name = "test gas"};
    for (const std::string &name : names) result.components.push_back(cubicComponent(readGas(name)));
    return result;
}

TEST(CubicGas, IsConsistentWithItsHelmholtzEnergy)
{
    for (const CubicForm form : {CubicForm::pengRobinson, CubicForm::soaveRedlichKwong}) {
        const auto gas = cubicGas(request(form, {"methane", "n-butane"}, {0.9, 0.1}));
        ASSERT_TRUE(gas.ok());
        for (const double T : {300.0, 450.0})
            for (const double v : {1e-4, 1e-3, 1.0}) {
                const MolarState state = (*gas)->at(T, v);
                const double h = 1e-5;
                const MolarState hot = (*gas)->at(T * (1 + h), v);
                const MolarState cold = (*gas)->at(T * (1 - h), v);
                const MolarState wide = (*gas)->at(T, v * (1 + h));
                const MolarState tight = (*gas)->at(T, v * (1 - h));
                EXPECT_NEAR((hot.internalEnergy - cold.internalEnergy) / (2 * h * T), state.isochoricHeatCapacity,
                            1e-6 * state.isochoricHeatCapacity);
                EXPECT_NEAR((hot.entropy - cold.entropy) / (2 * h), state.isochoricHeatCapacity,
                            1e-6 * state.isochoricHeatCapacity);
                EXPECT_NEAR((wide.entropy - tight.entropy) / (2 * h * v), state.dpdT, 1e-6 * state.dpdT); // Maxwell
                EXPECT_NEAR((wide.pressure - tight.pressure) / (2 * h * v), state.dpdv, 1e-6 * std::abs(state.dpdv));
                EXPECT_NEAR((wide.internalEnergy - tight.internalEnergy) / (2 * h * v), T * state.dpdT - state.pressure,
                            1e-5 * state.pressure);
            }
    }
}

TEST(CubicGas, IsIdealWhereItIsThin)
{
    const auto gas = cubicGas(request(CubicForm::pengRobinson, {"nitrogen", "oxygen"}, {0.79, 0.21}));
    ASSERT_TRUE(gas.ok());
    const double v = 1e5;
    const MolarState real = (*gas)->at(300.0, v);
    const MolarState ideal = (*gas)->idealPart().at(300.0, v);
    EXPECT_NEAR(real.pressure * v / (R * 300.0), 1.0, 1e-9);
    EXPECT_NEAR(real.enthalpy, ideal.enthalpy, 1e-5);
    EXPECT_NEAR(real.entropy, ideal.entropy, 1e-8);
}

TEST(CubicGas, StopsAtItsDewLine)
{
    const auto gas = cubicGas(request(CubicForm::pengRobinson, {"methane", "n-butane"}, {0.95, 0.05}));
    ASSERT_TRUE(gas.ok());
    const PhaseBoundary *boundary = (*gas)->equation()->boundary.get();
    ASSERT_NE(boundary, nullptr);
    const double T = boundary->temperatureAt(1e-3);
    EXPECT_TRUE(stateFrom(**gas, {Property::temperature, T + 0.01}, {Property::molarVolume, 1e-3}).ok());
    const auto below = stateFrom(**gas, {Property::temperature, T - 0.01}, {Property::molarVolume, 1e-3});
    ASSERT_FALSE(below.ok());
    EXPECT_EQ(below.failure().reason, Reason::condenses);
}

TEST(CubicGas, TakesThePublishedIdealPartThatThereIs)
{
    const CubicComponent polynomials = cubicComponent(readGas("n-butane"));
    EXPECT_NE(polynomials.idealSource.find("4513"), std::string::npos); // NASA TM-4513
    EXPECT_EQ(polynomials.idealRange.lowestTemperature, 200.0);
    GasData data = readGas("n-butane");
    data.idealGas.reset();
    const CubicComponent reference = cubicComponent(data);
    EXPECT_EQ(reference.idealSource, data.reference->source);
    // Both describe the same gas: 0.5 % in c_p over the range of the reference equation.
    for (const double T : {220.0, 298.15, 400.0, 550.0})
        EXPECT_NEAR(polynomials.ideal->at(T).heatCapacity / reference.ideal->at(T).heatCapacity, 1.0, 5e-3) << T;
}

TEST(CubicGas, IsValidWhereItsIdealPartsAreAndAboveHalfTheCriticalTemperature)
{
    const auto gas = cubicGas(request(CubicForm::soaveRedlichKwong, {"n-octane"}, {1.0}));
    ASSERT_TRUE(gas.ok());
    EXPECT_NEAR((*gas)->validity().valid.lowestTemperature, 0.5 * readGas("n-octane").critical->temperature, 1e-9);
    EXPECT_EQ((*gas)->validity().hard.lowestTemperature, 50.0);
    EXPECT_EQ((*gas)->validity().hard.highestTemperature, 6000.0);
    EXPECT_EQ((*gas)->model(), "soave-redlich-kwong");
    EXPECT_NE((*gas)->source().find("Soave"), std::string_view::npos);
}

TEST(CubicGas, RefusesConstantsThatMeanNothing)
{
    for (double CriticalConstants::*value :
         {&CriticalConstants::temperature, &CriticalConstants::pressure, &CriticalConstants::molarMass})
        for (const double wrong : {0.0, -1.0, std::nan(""), HUGE_VAL}) {
            CubicRequest bad = request(CubicForm::pengRobinson, {"argon"}, {1.0});
            bad.components.front().critical.*value = wrong;
            const auto gas = cubicGas(std::move(bad));
            ASSERT_FALSE(gas.ok());
            EXPECT_EQ(gas.failure().reason, Reason::outOfRange);
        }
    EXPECT_EQ(cubicGas(request(CubicForm::pengRobinson, {}, {})).failure().reason, Reason::missing);
}

TEST(StatedHeatCapacity, IsRefusedWhereItMeansNothing)
{
    struct Row {
        StatedHeatCapacity stated;
        const char *pointer;
        Reason reason;
    };
    const Row rows[]{{{{}, 200.0, 400.0}, "/cp_over_R", Reason::missing},
                     {{std::vector<double>(21, 4.0), 200.0, 400.0}, "/cp_over_R", Reason::outOfRange},
                     {{{3.5}, 400.0, 400.0}, "/to", Reason::outOfRange},
                     {{{3.5}, 7000.0, 8000.0}, "", Reason::outOfRange},
                     {{{3.5}, 10.0, 40.0}, "", Reason::outOfRange},
                     {{{1.0}, 200.0, 400.0}, "/cp_over_R", Reason::outOfRange},
                     {{{4.0, -0.01}, 200.0, 400.0}, "/cp_over_R", Reason::outOfRange}};
    for (const Row &row : rows) {
        const auto function = idealFunctionOf(row.stated);
        ASSERT_FALSE(function.ok());
        EXPECT_EQ(function.failure().reason, row.reason);
        EXPECT_EQ(function.failure().pointer, row.pointer);
    }
}

} // namespace
} // namespace quasistat::gas
