#include "core/gas/equation/compiled_terms.h"

#include "core/gas/equation/residual.h"

#include <algorithm>
#include <cassert>
#include <tuple>

namespace quasistat::gas
{

namespace
{

using DensityFactor = CompiledTerms::DensityFactor;
using TemperatureFactor = CompiledTerms::TemperatureFactor;

/// A term on its way into a column.
struct Entry {
    std::size_t densityFactor;
    int d;
    CompiledTerms::Term term;
};

/// The place of `factor` in `known`, added where it is new.
template <class Factor>
std::size_t placeOf(const Factor &factor, std::vector<Factor> &known)
{
    const auto it = std::find(known.begin(), known.end(), factor);
    if (it != known.end()) return static_cast<std::size_t>(it - known.begin());
    known.push_back(factor);
    assert(known.size() <= CompiledTerms::mostFactors);
    return known.size() - 1;
}

/// Every product term with its factors found or added.
std::vector<Entry> gathered(const ResidualTerms &terms, CompiledTerms &made)
{
    std::vector<Entry> entries;
    const auto gather = [&](double n, int d, double t, const DensityFactor &inDelta, const TemperatureFactor &inTau) {
        entries.push_back(
            {placeOf(inDelta, made.densityFactors),
             d,
             {n, n * t, n * t * (t - 1.0), t, made.powers.place(t), placeOf(inTau, made.temperatureFactors)}});
        made.highestDensityPower = std::max({made.highestDensityPower, d, inDelta.l});
    };
    using D = DensityFactor::Form;
    using T = TemperatureFactor::Form;
    for (const PowerTerm &k : terms.powers)
        gather(k.n, k.d, k.t, k.l == 0 ? DensityFactor{} : DensityFactor{.form = D::power, .l = k.l, .g = k.g}, {});
    for (const GaussianTerm &k : terms.gaussians)
        gather(k.n, k.d, k.t, {.form = D::bell, .eta = k.eta, .epsilon = k.epsilon},
               {.form = T::bell, .beta = k.beta, .gamma = k.gamma});
    for (const DepartureTerm &k : terms.departures)
        gather(
            k.n, k.d, k.t,
            k.eta == 0.0 && k.beta == 0.0
                ? DensityFactor{}
                : DensityFactor{.form = D::bell, .eta = k.eta, .epsilon = k.epsilon, .beta = k.beta, .gamma = k.gamma},
            {});
    for (const AssociatingTerm &k : terms.associating)
        gather(k.n, k.d, k.t, {.form = D::bell, .eta = -k.eta, .epsilon = k.epsilon},
               {.form = T::association, .beta = k.beta, .gamma = k.gamma, .b = k.b});
    return entries;
}

/// Adds the terms of one density factor as a group. `entries` are sorted by it.
void addGroups(const std::vector<Entry> &entries, CompiledTerms &made)
{
    for (const Entry &entry : entries) {
        if (made.groups.empty() || made.groups.back().factor != entry.densityFactor)
            made.groups.push_back({entry.densityFactor, made.wholeTerms.size(), made.wholeTerms.size(),
                                   made.factoredTerms.size(), made.factoredTerms.size()});
        const auto &[n, nt, ntt, t, power, factor] = entry.term;
        const double d = entry.d;
        const auto densityPower = static_cast<std::size_t>(entry.d);
        if (factor == 0)
            made.wholeTerms.push_back({n, n * d, n * d * (d - 1.0), nt, nt * d, ntt, power, densityPower});
        else
            made.factoredTerms.push_back({n, t, d, power, densityPower, factor});
        made.groups.back().endWhole = made.wholeTerms.size();
        made.groups.back().endFactored = made.factoredTerms.size();
    }
}

} // namespace

CompiledTerms compiled(const ResidualTerms &published)
{
    CompiledTerms made;
    made.reducingTemperature = published.reducingTemperature;
    made.reducingDensity = published.reducingDensity;
    made.nonAnalytic = published.nonAnalytic;
    std::vector<Entry> entries = gathered(published, made);
    std::stable_sort(entries.begin(), entries.end(), [](const Entry &a, const Entry &b) {
        return std::tuple(a.densityFactor, a.d, a.term.factor != 0) <
               std::tuple(b.densityFactor, b.d, b.term.factor != 0);
    });
    addGroups(entries, made);
    for (const Entry &entry : entries) {
        if (made.columns.empty() || made.columns.back().factor != entry.densityFactor ||
            made.columns.back().d != entry.d)
            made.columns.push_back({entry.densityFactor, entry.d, made.terms.size(), made.terms.size(), 0});
        made.terms.push_back(entry.term);
        if (entry.term.factor == 0) made.columns.back().endPlainTerm = made.terms.size();
        made.columns.back().endTerm = made.terms.size();
    }
    assert(static_cast<std::size_t>(made.highestDensityPower) < CompiledTerms::mostDensityPowers);
    assert(made.columns.size() <= Isotherm::mostColumns);
    return made;
}

} // namespace quasistat::gas
