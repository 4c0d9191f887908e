// What every gas model must satisfy, whatever its equation.

#include "core/gas/solve/solve.h"
#include "tests/support/gases.h"

#include <cmath>

namespace quasistat::gas
{
namespace
{

struct Point {
    double temperature;
    double molarVolume;
};

constexpr Point points[]{{120.0, 0.01}, {250.0, 0.0005}, {298.15, 0.0248},
                         {700.0, 2.0},  {1500.0, 0.03},  {4000.0, 1e-3}};

/// Inside the model, and not in two phases: there the derivatives are those of one phase.
bool isHomogeneous(const Gas &gas, const Point &p)
{
    const auto state = stateAt(gas, p.temperature, p.molarVolume);
    return state && !state->vapourFraction;
}

/// Central difference with a step whose truncation and rounding errors are about 1e-8 relative.
template <class F>
double derivative(F f, double x)
{
    const double h = 1e-4 * x;
    return (8.0 * (f(x + h) - f(x - h)) - (f(x + 2 * h) - f(x - 2 * h))) / (12.0 * h);
}

class EveryGasAndState : public testing::Test
{
protected:
    template <class Check>
    void forAll(Check check)
    {
        for (const auto &[name, gas] : test::everyGas())
            for (const Point &p : points) {
                if (!isHomogeneous(*gas, p)) continue;
                SCOPED_TRACE(testing::Message()
                             << name << " at " << p.temperature << " K, " << p.molarVolume << " m³/mol");
                check(*gas, p.temperature, p.molarVolume);
            }
    }
};

TEST_F(EveryGasAndState, HelmholtzDerivativesAreThoseOfItsEnergy)
{
    forAll([](const Gas &gas, double T, double v) {
        const Helmholtz h = gas.helmholtz(T, v);
        const double scale = gas.gasConstant() * T;
        const auto a = [&](double t, double w) { return gas.helmholtz(t, w).a; };
        EXPECT_NEAR(h.aT, derivative([&](double t) { return a(t, v); }, T), 1e-6 * scale / T * 10);
        EXPECT_NEAR(h.av, derivative([&](double w) { return a(T, w); }, v), 1e-6 * scale / v);
        EXPECT_NEAR(h.aTT, derivative([&](double t) { return gas.helmholtz(t, v).aT; }, T), 1e-6 * scale / T / T);
        EXPECT_NEAR(h.aTv, derivative([&](double t) { return gas.helmholtz(t, v).av; }, T), 1e-6 * scale / T / v);
        EXPECT_NEAR(h.avv, derivative([&](double w) { return gas.helmholtz(T, w).av; }, v), 1e-6 * scale / v / v);
    });
}

TEST_F(EveryGasAndState, StateIsTheOneOfItsHelmholtzEnergy)
{
    forAll([](const Gas &gas, double T, double v) {
        const MolarState s = gas.at(T, v);
        const MolarState h = homogeneousState(gas, T, v);
        const double RT = gas.gasConstant() * T;
        EXPECT_NEAR(s.pressure, h.pressure, 1e-13 * s.pressure);
        EXPECT_NEAR(s.internalEnergy, h.internalEnergy, 1e-12 * RT);
        EXPECT_NEAR(s.enthalpy, h.enthalpy, 1e-12 * RT);
        EXPECT_NEAR(s.entropy, h.entropy, 1e-12 * gas.gasConstant());
        EXPECT_NEAR(s.isochoricHeatCapacity, h.isochoricHeatCapacity, 1e-12 * s.isochoricHeatCapacity);
        EXPECT_NEAR(s.dpdT, h.dpdT, 1e-13 * s.dpdT);
        EXPECT_NEAR(s.dpdv, h.dpdv, -1e-13 * s.dpdv);
    });
}

TEST_F(EveryGasAndState, EnthalpyIsInternalEnergyPlusPv)
{
    forAll([](const Gas &gas, double T, double v) {
        const MolarState s = gas.at(T, v);
        EXPECT_NEAR(s.enthalpy, s.internalEnergy + s.pressure * v, 1e-12 * gas.gasConstant() * T);
    });
}

TEST_F(EveryGasAndState, HeatCapacitiesOfAnIdealGasDifferByItsConstant)
{
    forAll([](const Gas &gas, double T, double v) {
        if (!gas.isIdeal()) return;
        const MolarState s = gas.at(T, v);
        EXPECT_NEAR(isobaricHeatCapacity(s) - s.isochoricHeatCapacity, gas.gasConstant(), 1e-11);
    });
}

TEST_F(EveryGasAndState, EntropyAndEnergyObeyTheGibbsEquation)
{
    // du = T ds − p dv, by differences along a slanted direction.
    forAll([](const Gas &gas, double T, double v) {
        const double dT = 1e-4 * T;
        const double dv = 2e-4 * v;
        const MolarState a = gas.at(T - dT, v - dv);
        const MolarState b = gas.at(T + dT, v + dv);
        const MolarState m = gas.at(T, v);
        const double change = T * (b.entropy - a.entropy) - m.pressure * 2.0 * dv;
        EXPECT_NEAR(b.internalEnergy - a.internalEnergy, change, 1e-7 * gas.gasConstant() * T);
    });
}

TEST_F(EveryGasAndState, NothingIsNotANumber)
{
    forAll([](const Gas &gas, double T, double v) {
        const MolarState s = gas.at(T, v);
        for (const double x : {s.pressure, s.internalEnergy, s.enthalpy, s.entropy, s.isochoricHeatCapacity, s.dpdT,
                               s.dpdv, speedOfSound(s, gas.molarMass())})
            EXPECT_TRUE(std::isfinite(x));
    });
}

} // namespace
} // namespace quasistat::gas
