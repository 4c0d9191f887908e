// The compiled plan against the published form, evaluated term by term.

#include "core/gas/equation/plan.h"
#include "core/gas/equation/published.h"
#include "tests/support/gases.h"

#include <algorithm>
#include <cmath>
#include <random>

namespace quasistat::gas
{
namespace
{

struct NamedTerms {
    std::string name;
    ResidualTerms terms;
};

/// Every reference equation, and a mixture of all 21 components of GERG-2008.
std::vector<NamedTerms> everyEquation()
{
    std::vector<NamedTerms> all;
    for (const ComponentFacts &facts : test::library().components("reference"))
        all.push_back({facts.name, (*test::library().data(facts.name))->reference->residual});
    Composition mixture;
    for (const ComponentFacts &facts : test::library().components("gerg-2008"))
        mixture.push_back({facts.name, 1.0 / 21.0});
    const std::vector<double> fractions(mixture.size(), 1.0 / 21.0);
    all.push_back({"all of GERG-2008", residualTerms(*test::library().gergMixture(mixture), fractions)});
    return all;
}

std::array<double, 6> asArray(const Alpha &a)
{
    return {a.a00, a.a10, a.a01, a.a20, a.a11, a.a02};
}

/// The magnitudes that cancel in each derivative: 1e-13 of them is what double precision leaves of a sum.
std::array<double, 6> magnitudes(const ResidualTerms &terms, double temperature, double density)
{
    std::array<double, 6> sum{};
    const auto addOne = [&](const ResidualTerms &one) {
        const auto values = asArray(publishedResidual(one, temperature, density));
        for (std::size_t i = 0; i < sum.size(); ++i) sum[i] += std::abs(values[i]);
    };
    ResidualTerms one{.reducingTemperature = terms.reducingTemperature, .reducingDensity = terms.reducingDensity};
    for (const PowerTerm &term : terms.powers) addOne((one.powers = {term}, one));
    one.powers.clear();
    for (const GaussianTerm &term : terms.gaussians) addOne((one.gaussians = {term}, one));
    one.gaussians.clear();
    for (const DepartureTerm &term : terms.departures) addOne((one.departures = {term}, one));
    one.departures.clear();
    for (const AssociatingTerm &term : terms.associating) addOne((one.associating = {term}, one));
    one.associating.clear();
    for (const NonAnalyticTerm &term : terms.nonAnalytic) addOne((one.nonAnalytic = {term}, one));
    return sum;
}

struct States {
    std::vector<double> temperatures;
    std::vector<double> densities;
};

/// Not a multiple of eight: the last block of a batch is a part of one.
States statesOf(const ResidualTerms &terms)
{
    std::mt19937 random(20);
    std::uniform_real_distribution<double> lnTemperature(-0.6, 1.6);
    std::uniform_real_distribution<double> lnDensity(-9.0, 1.05);
    States states;
    for (int i = 0; i < 101; ++i) {
        states.temperatures.push_back(terms.reducingTemperature * std::exp(lnTemperature(random)));
        states.densities.push_back(terms.reducingDensity * std::exp(lnDensity(random)));
    }
    return states;
}

void expectSame(const Alpha &found, const Alpha &published, const std::array<double, 6> &magnitude)
{
    const auto a = asArray(found);
    const auto b = asArray(published);
    for (std::size_t i = 0; i < a.size(); ++i) EXPECT_NEAR(a[i], b[i], 1e-13 * magnitude[i]) << "derivative " << i;
}

TEST(Plan, AgreesWithThePublishedFormOnEveryProcessorFamilyAloneOnIsothermsAndInBatches)
{
    for (const auto &[name, terms] : everyEquation()) {
        const States states = statesOf(terms);
        for (const Kernels &family : allKernels()) {
            SCOPED_TRACE(testing::Message() << name << ", " << family.family);
            const ResidualPlan plan(terms, family);
            std::vector<Alpha> batch(states.temperatures.size());
            plan.atEach(states.temperatures, states.densities, batch);
            for (std::size_t i = 0; i < batch.size(); ++i) {
                const double T = states.temperatures[i];
                const double rho = states.densities[i];
                const Alpha published = publishedResidual(terms, T, rho);
                const auto magnitude = magnitudes(terms, T, rho);
                expectSame(plan.at(T, rho), published, magnitude);
                expectSame(batch[i], published, magnitude);
                Isotherm isotherm;
                plan.atTemperature(T, true, isotherm);
                expectSame(plan.at(isotherm, rho), published, magnitude);
                const DensityDerivatives slopes = plan.densityDerivatives(isotherm, rho);
                EXPECT_NEAR(slopes.a01, published.a01, 1e-13 * magnitude[2]);
                EXPECT_NEAR(slopes.a02, published.a02, 1e-13 * magnitude[5]);
            }
        }
    }
}

TEST(Plan, FoldsTermsThatShareTheirFunctions)
{
    // Counted in the data of nitrogen's 36 terms: 25 pairs of δᵈ with one of four exp(−δˡ), none, or three Gaussians.
    const auto nitrogen = (*test::library().data("nitrogen"))->reference->residual;
    EXPECT_EQ(compiled(nitrogen).columns.size(), 25u);
    EXPECT_TRUE(compiled(nitrogen).powers.exponentials().empty()); // every exponent is a multiple of 1/8
}

TEST(Plan, IsFiniteAtTheCriticalPointWhereItsDerivativesAreSingular)
{
    for (const char *fluid : {"carbon dioxide", "water"}) {
        const auto terms = (*test::library().data(fluid))->reference->residual;
        const Alpha alpha = ResidualPlan(terms).at(terms.reducingTemperature, terms.reducingDensity);
        for (const double value : asArray(alpha)) EXPECT_TRUE(std::isfinite(value)) << fluid;
    }
}

} // namespace
} // namespace quasistat::gas
