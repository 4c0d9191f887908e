// GERG-2008 put together from its data: against NIST's reference code, and the merged terms against the printed loops.
//
// data/checks_gerg2008.csv: kind `nist_code` = NIST's GERG2008.cpp, unmodified, compiled, printed with 15 digits (E. W.
// Lemmon, I. H. Bell, AGA 8 Part 2 reference implementation 2.01, public domain); `published` = the point of NIST's own
// test. Homogeneous single-phase values, h and s of every pure ideal component zero at 298.15 K, 101325 Pa. Double
// precision gives 1e-12 or better on every row (Joule–Thomson coefficient 6e-12).

#include "tests/bench/transcription.h"
#include "tests/gas/check_rows.h"
#include "tests/support/gases.h"

#include <algorithm>
#include <cmath>

namespace quasistat::gas
{
namespace
{

struct Mixture {
    GergMixture mixture;
    std::vector<double> fractions;
};

Mixture mixtureOf(const Composition &composition)
{
    Mixture result{.mixture = *test::library().gergMixture(composition), .fractions = {}};
    for (const Share &share : composition) result.fractions.push_back(share.moleFraction);
    return result;
}

TEST(GergAssembly, PrintedLoopsGiveTheValuesOfTheReferenceCode)
{
    for (const test::CheckRow &row : test::checkRows("checks_gerg2008.csv")) {
        SCOPED_TRACE(row.text("case") + ", line " + std::to_string(row.line()));
        auto [mixture, fractions] = mixtureOf(test::compositionOf(row.text("composition")));
        const transcription::GergFluid fluid(std::move(mixture), std::move(fractions));
        const double temperature = *row.number("T_K");
        const double density = *row.number("rho_mol_m3");
        const transcription::Properties found = fluid.at(temperature, density);
        const double rt = fluid.gasConstant() * temperature;
        // The published point fixes p and prints ρ with 16 digits: 1e-9 there leaves p its conditioning.
        const double tolerance = row.text("kind") == "published" ? 1e-9 : 1e-10;
        EXPECT_NEAR(found.pressure / *row.number("p_Pa"), 1.0, tolerance);
        EXPECT_NEAR(found.internalEnergy / rt, *row.number("u_J_mol") / rt, tolerance);
        EXPECT_NEAR(found.enthalpy / rt, *row.number("h_J_mol") / rt, tolerance);
        EXPECT_NEAR(found.entropy / fluid.gasConstant(), *row.number("s_J_molK") / fluid.gasConstant(), tolerance);
        EXPECT_NEAR(found.isobaricHeatCapacity / *row.number("cp_J_molK"), 1.0, tolerance);
        EXPECT_NEAR(found.isochoricHeatCapacity / *row.number("cv_J_molK"), 1.0, tolerance);
        EXPECT_NEAR(found.speedOfSound / *row.number("w_m_s"), 1.0, tolerance);
        EXPECT_NEAR(found.jouleThomson / *row.number("jt_K_Pa"), 1.0, tolerance);
    }
}

TEST(GergAssembly, MergedTermsAreTheSameFunction)
{
    for (const test::CheckRow &row : test::checkRows("checks_gerg2008.csv")) {
        SCOPED_TRACE(row.text("case") + ", line " + std::to_string(row.line()));
        const auto [mixture, fractions] = mixtureOf(test::compositionOf(row.text("composition")));
        const transcription::GergFluid fluid(mixture, fractions);
        const double temperature = *row.number("T_K");
        const double density = *row.number("rho_mol_m3");

        const ResidualTerms terms = residualTerms(mixture, fractions);
        const double tau = terms.reducingTemperature / temperature;
        const double delta = density / terms.reducingDensity;
        transcription::Derivatives merged;
        transcription::add(terms.powers, 1.0, tau, delta, merged);
        transcription::add(terms.departures, 1.0, tau, delta, merged);
        const transcription::Derivatives printed = fluid.residual(temperature, density);
        // The same numbers added in another order; the terms nearly cancel and are up to 1e2.
        EXPECT_NEAR(merged.a00, printed.a00, 1e-12);
        EXPECT_NEAR(merged.a10, printed.a10, 1e-12);
        EXPECT_NEAR(merged.a01, printed.a01, 1e-12);
        EXPECT_NEAR(merged.a20, printed.a20, 2e-12);
        EXPECT_NEAR(merged.a11, printed.a11, 2e-12);
        EXPECT_NEAR(merged.a02, printed.a02, 2e-12);

        double mixing = 0.0;
        for (const double x : fractions) mixing += x * std::log(x);
        const transcription::Derivatives logs = transcription::idealSum(idealTerms(mixture, fractions), tau, delta);
        const transcription::Derivatives sinhs = fluid.ideal(temperature, density);
        // n₁ and n₂ of heavy components are up to 1e2 and nearly cancel.
        EXPECT_NEAR(logs.a00 + mixing, sinhs.a00, 1e-12);
        EXPECT_NEAR(logs.a10, sinhs.a10, 1e-12);
        EXPECT_NEAR(logs.a20, sinhs.a20, 1e-12);
    }
}

TEST(GergAssembly, TermsOfEqualExponentsAreOne)
{
    // Ten components have 166 terms of their own and many departure functions between them, most of equal exponents.
    const auto [mixture, fractions] = mixtureOf(test::compositionOf(
        "methane=0.965222;nitrogen=0.002595;carbon dioxide=0.005956;ethane=0.018186;propane=0.004596;"
        "isobutane=0.000977;n-butane=0.001007;isopentane=0.000473;n-pentane=0.000324;n-hexane=0.000664"));
    std::size_t own = 0;
    for (const GergComponent &component : mixture.components) own += component.terms.size();
    const ResidualTerms terms = residualTerms(mixture, fractions);
    EXPECT_EQ(own, 166u);
    EXPECT_LT(terms.powers.size(), own / 2);
    for (std::size_t i = 1; i < terms.powers.size(); ++i) {
        const PowerTerm &a = terms.powers[i - 1];
        const PowerTerm &b = terms.powers[i];
        EXPECT_TRUE(a.d != b.d || a.t != b.t || a.l != b.l);
    }
}

TEST(GergAssembly, OrderOfTheComponentsDoesNotMatter)
{
    const Mixture one = mixtureOf({{"isobutane", 0.3}, {"methane", 0.2}, {"n-butane", 0.5}});
    const Mixture other = mixtureOf({{"n-butane", 0.5}, {"methane", 0.2}, {"isobutane", 0.3}});
    const GergReducing a = reducing(one.mixture, one.fractions);
    const GergReducing b = reducing(other.mixture, other.fractions);
    EXPECT_NEAR(a.temperature / b.temperature, 1.0, 1e-15);
    EXPECT_NEAR(a.density / b.density, 1.0, 1e-15);
}

TEST(GergAssembly, APureMixtureReducesToItsCriticalPoint)
{
    const Mixture pure = mixtureOf({{"nitrogen", 1.0}});
    const GergReducing point = reducing(pure.mixture, pure.fractions);
    EXPECT_DOUBLE_EQ(point.temperature, 126.192);
    EXPECT_DOUBLE_EQ(point.density, 11183.9);
}

TEST(GergAssembly, HasAllPairsOfItsComponents)
{
    const auto components = test::library().components("gerg-2008");
    ASSERT_EQ(components.size(), 21u);
    const GergModel model;
    int departures = 0;
    for (std::size_t i = 0; i < components.size(); ++i)
        for (std::size_t j = i + 1; j < components.size(); ++j) {
            const GergPair pair = model.pair(components[i].name, components[j].name);
            const GergPair reversed = model.pair(components[j].name, components[i].name);
            // No pair of the published table has all four parameters at 1 (water with most comes close).
            EXPECT_DOUBLE_EQ(pair.betaV * reversed.betaV, 1.0);
            EXPECT_DOUBLE_EQ(pair.betaT * reversed.betaT, 1.0);
            EXPECT_EQ(pair.gammaV, reversed.gammaV);
            EXPECT_EQ(pair.departure, reversed.departure);
            if (pair.departure) ++departures;
        }
    EXPECT_EQ(departures, 15); // "8 departure functions used by 15 pairs"
}

} // namespace
} // namespace quasistat::gas
