// The published and recomputed check values of single gases and of GERG-2008, row by row.
//
// data/checks_pure.csv:
// - `computed` rows: an independent evaluator with 34 digits, printed with 15, at (T, ρ); homogeneous also where the
//   fluid is not. Compared to 1e-10 (u, h, s relative to R T or R); double precision gives 1e-12 or better (c_p next to
//   a critical point: 2e-12).
// - `published` rows: the tables of the articles named in `source`, for water IAPWS R6-95. `tol_…` are half a unit of
// the
//   last digit printed. `given` says what is fixed: `Trho` T and ρ exactly; `Tp` T and p exactly; `Tsat_liq`,
//   `Tsat_vap` saturation at T. An empty cell was not printed, or its zero of h and s differs from the data file's.
// h and s are in the zeros of each source: aligned here by the ideal parts as published.
// data/checks_gerg2008.csv: see gerg_assembly_test.cpp.

#include "core/gas/constants.h"
#include "core/gas/equation/equation.h"
#include "core/gas/phase/saturation.h"
#include "core/gas/solve/density.h"
#include "core/gas/solve/solve.h"
#include "tests/bench/transcription.h"
#include "tests/gas/check_rows.h"
#include "tests/support/gases.h"

#include <cmath>

namespace quasistat::gas
{
namespace
{

/// What turns our zeros of h and s into those of a source.
struct Zeros {
    double enthalpy; ///< [J/mol] to add
    double entropy;  ///< [J/(mol K)] to add
};

/// From the ideal terms as published (the data file's `ideal_gas_298` has ten digits of the same). Ours: h = 0 and s =
/// 0 of the ideal gas at 298.15 K and 100 kPa, mixing apart.
Zeros zerosOf(const IdealTerms &terms, double reducingDensity, double gasConstant)
{
    const double density = referencePressure / (gasConstant * referenceTemperature);
    const transcription::Derivatives a =
        transcription::idealSum(terms, terms.reducingTemperature / referenceTemperature, density / reducingDensity);
    return {.enthalpy = gasConstant * referenceTemperature * (1.0 + a.a10), .entropy = gasConstant * (a.a10 - a.a00)};
}

Zeros zerosOfReference(const std::string &name)
{
    const ReferenceData &data = *(*test::library().data(name, "reference"))->reference;
    return zerosOf(data.ideal, data.residual.reducingDensity, data.gasConstant);
}

Zeros zerosOfGerg(const Composition &composition)
{
    const GergMixture mixture = *test::library().gergMixture(composition);
    std::vector<double> fractions;
    for (const Share &share : composition) fractions.push_back(share.moleFraction);
    return zerosOf(idealTerms(mixture, fractions), reducing(mixture, fractions).density, mixture.model->gasConstant());
}

/// In the zeros of the source.
MolarState inZeros(MolarState state, const Zeros &zeros)
{
    state.internalEnergy += zeros.enthalpy;
    state.enthalpy += zeros.enthalpy;
    state.entropy += zeros.entropy;
    return state;
}

/// (∂T/∂p)_h = (T (∂v/∂T)_p − v)/c_p [K/Pa].
double jouleThomson(const MolarState &state)
{
    const double expansion = -state.dpdT / state.dpdv;
    return (state.temperature * expansion - state.molarVolume) / isobaricHeatCapacity(state);
}

/// Compares a state with a row at `tolerance` relative; u, h, s relative to R T and R.
void expectRow(const MolarState &state, const Gas &gas, const test::CheckRow &row, double tolerance)
{
    const double r = gas.gasConstant();
    const double rt = r * state.temperature;
    EXPECT_NEAR(state.pressure / *row.number("p_Pa"), 1.0, tolerance);
    EXPECT_NEAR(state.internalEnergy / rt, *row.number("u_J_mol") / rt, tolerance);
    EXPECT_NEAR(state.enthalpy / rt, *row.number("h_J_mol") / rt, tolerance);
    EXPECT_NEAR(state.entropy / r, *row.number("s_J_molK") / r, tolerance);
    EXPECT_NEAR(state.isochoricHeatCapacity / *row.number("cv_J_molK"), 1.0, tolerance);
    EXPECT_NEAR(isobaricHeatCapacity(state) / *row.number("cp_J_molK"), 1.0, tolerance);
    EXPECT_NEAR(speedOfSound(state, gas.molarMass()) / *row.number("w_m_s"), 1.0, tolerance);
}

void expectPrinted(const char *what, double found, const test::CheckRow &row, const std::string &column,
                   const std::string &tolerance)
{
    const auto printed = row.number(column);
    const auto half = row.number(tolerance);
    if (!printed || !half) return;
    EXPECT_NEAR(found, *printed, *half) << what;
}

void expectPrintedState(const MolarState &state, const Gas &gas, const test::CheckRow &row)
{
    expectPrinted("density", 1.0 / state.molarVolume, row, "rho_mol_m3", "tol_rho");
    expectPrinted("pressure", state.pressure, row, "p_Pa", "tol_p");
    expectPrinted("internal energy", state.internalEnergy, row, "u_J_mol", "tol_u");
    expectPrinted("enthalpy", state.enthalpy, row, "h_J_mol", "tol_h");
    expectPrinted("entropy", state.entropy, row, "s_J_molK", "tol_s");
    expectPrinted("c_p", isobaricHeatCapacity(state), row, "cp_J_molK", "tol_cp");
    expectPrinted("c_v", state.isochoricHeatCapacity, row, "cv_J_molK", "tol_cv");
    expectPrinted("speed of sound", speedOfSound(state, gas.molarMass()), row, "w_m_s", "tol_w");
}

/// Equal pressure and Gibbs energy of both phases by Newton in both densities, to 1e-13 of the densities.
SaturatedPair pairAt(const Equation &equation, double temperature, double liquid, double vapour)
{
    for (int i = 0; i < 50; ++i) {
        const MolarState l = homogeneousState(equation, temperature, 1.0 / liquid);
        const MolarState v = homogeneousState(equation, temperature, 1.0 / vapour);
        // ∂p/∂ρ = −v² ∂p/∂v and ∂g/∂ρ = (∂p/∂ρ)/ρ at constant temperature.
        const double slopeL = -l.dpdv / (liquid * liquid);
        const double slopeV = -v.dpdv / (vapour * vapour);
        const double dp = v.pressure - l.pressure;
        const double dg = (v.enthalpy - temperature * v.entropy) - (l.enthalpy - temperature * l.entropy);
        const double stepV = (dp / liquid - dg) / (slopeV * (1.0 / vapour - 1.0 / liquid));
        const double stepL = (dp + slopeV * stepV) / slopeL;
        liquid += stepL;
        vapour += stepV;
        if (std::abs(stepL) < 1e-13 * liquid && std::abs(stepV) < 1e-13 * vapour) break;
    }
    return {homogeneousState(equation, temperature, 1.0 / liquid),
            homogeneousState(equation, temperature, 1.0 / vapour)};
}

/// Vapour and liquid at T. Tables begin at the triple point rounded, which may lie a little below where the program
/// stops: there the equation itself is asked.
std::optional<SaturatedPair> saturationAt(const Gas &gas, const ReferenceData &data, double temperature)
{
    const Saturation &saturation = *gas.equation()->saturation;
    if (temperature >= saturation.lowestTemperature()) return saturation.atTemperature(temperature);
    EXPECT_NEAR(temperature, saturation.lowestTemperature(), 5e-4);
    EXPECT_FALSE(saturation.atTemperature(temperature));
    return pairAt(*gas.equation(), temperature, valueOf(data.liquidDensity, temperature),
                  valueOf(data.vapourDensity, temperature));
}

/// The homogeneous state at T and p. Some tables go beyond the limits the data file gives (n-butane 50 MPa, R134a 460
/// K): the program refuses, the equation itself is asked.
std::optional<MolarState> stateAtPressure(const Gas &gas, double temperature, double pressure)
{
    const auto state = stateFrom(gas, {Property::temperature, temperature}, {Property::pressure, pressure});
    if (state) return *state;
    const Range &hard = gas.validity().hard;
    EXPECT_EQ(state.failure().reason, Reason::outsideModel);
    EXPECT_TRUE(temperature > hard.highestTemperature || pressure > hard.highestPressure);
    const auto volume = molarVolumeAt(*gas.equation(), temperature, pressure);
    EXPECT_TRUE(volume.has_value());
    return volume ? std::optional(homogeneousState(*gas.equation(), temperature, *volume)) : std::nullopt;
}

/// The state a published row speaks of; none, with a failure of the test, where it cannot be found.
std::optional<MolarState> publishedState(const Gas &gas, const ReferenceData &data, const test::CheckRow &row)
{
    const std::string &given = row.text("given");
    const double temperature = *row.number("T_K");
    if (given == "Trho") return homogeneousState(*gas.equation(), temperature, 1.0 / *row.number("rho_mol_m3"));
    if (given == "Tp") return stateAtPressure(gas, temperature, *row.number("p_Pa"));
    const auto pair = saturationAt(gas, data, temperature);
    EXPECT_TRUE(pair.has_value());
    if (!pair) return std::nullopt;
    return given == "Tsat_liq" ? pair->liquid : pair->vapour;
}

TEST(PublishedChecks, RecomputedRowsOfReferenceEquations)
{
    int rows = 0;
    for (const test::CheckRow &row : test::checkRows("checks_pure.csv")) {
        if (row.text("kind") != "computed") continue;
        SCOPED_TRACE(row.text("fluid") + ", line " + std::to_string(row.line()));
        const std::string name = *test::library().componentName(row.text("fluid"), "reference");
        const GasPtr gas = *test::library().reference(name);
        const Zeros zeros = zerosOfReference(name);
        const MolarState state =
            homogeneousState(*gas->equation(), *row.number("T_K"), 1.0 / *row.number("rho_mol_m3"));
        expectRow(inZeros(state, zeros), *gas, row, 1e-10);
        ++rows;
    }
    EXPECT_EQ(rows, 308);
}

TEST(PublishedChecks, PrintedTablesOfReferenceEquations)
{
    int rows = 0;
    for (const test::CheckRow &row : test::checkRows("checks_pure.csv")) {
        if (row.text("kind") != "published") continue;
        SCOPED_TRACE(row.text("fluid") + " " + row.text("given") + ", line " + std::to_string(row.line()) + ", " +
                     row.text("source"));
        const std::string name = *test::library().componentName(row.text("fluid"), "reference");
        const GasPtr gas = *test::library().reference(name);
        const ReferenceData &data = *(*test::library().data(name, "reference"))->reference;
        const Zeros zeros = zerosOfReference(name);
        if (const auto state = publishedState(*gas, data, row)) expectPrintedState(inZeros(*state, zeros), *gas, row);
        ++rows;
    }
    EXPECT_EQ(rows, 331);
}

TEST(PublishedChecks, Gerg2008AgainstItsReferenceCode)
{
    int rows = 0;
    for (const test::CheckRow &row : test::checkRows("checks_gerg2008.csv")) {
        SCOPED_TRACE(row.text("case") + ", line " + std::to_string(row.line()));
        const Composition composition = test::compositionOf(row.text("composition"));
        const GasPtr gas = *test::library().gerg2008(composition, row.text("case"));
        const MolarState state =
            inZeros(homogeneousState(*gas->equation(), *row.number("T_K"), 1.0 / *row.number("rho_mol_m3")),
                    zerosOfGerg(composition));
        const double tolerance = row.text("kind") == "published" ? 1e-9 : 1e-10;
        expectRow(state, *gas, row, tolerance);
        EXPECT_NEAR(jouleThomson(state) / *row.number("jt_K_Pa"), 1.0, tolerance);
        EXPECT_NEAR(state.pressure * state.molarVolume / (gas->gasConstant() * state.temperature) / *row.number("z"),
                    1.0, tolerance);
        ++rows;
    }
    EXPECT_EQ(rows, 167);
}

TEST(PublishedChecks, Gerg2008DensityOfThePublishedPoint)
{
    // 21 components at 400 K, 50 MPa: ρ = 12.798 286 260 820 62 mol/L. Source: test of NIST's AGA 8 reference code.
    for (const test::CheckRow &row : test::checkRows("checks_gerg2008.csv")) {
        if (row.text("kind") != "published") continue;
        const GasPtr gas = *test::library().gerg2008(test::compositionOf(row.text("composition")), "");
        const auto state = stateFrom(*gas, {Property::temperature, 400.0}, {Property::pressure, 50e6});
        ASSERT_TRUE(state.ok());
        EXPECT_NEAR(1.0 / state->molarVolume / 12798.28626082062, 1.0, 1e-9);
        EXPECT_NEAR(isobaricHeatCapacity(*state) / 58.45522051000366, 1.0, 1e-9);
        EXPECT_NEAR(state->isochoricHeatCapacity / 39.02948218156372, 1.0, 1e-9);
        EXPECT_NEAR(speedOfSound(*state, gas->molarMass()) / 714.4248840596024, 1.0, 1e-9);
        EXPECT_NEAR(jouleThomson(*state) / 7.155629581480913e-08, 1.0, 1e-9);
    }
}

} // namespace
} // namespace quasistat::gas
