// Evaluation of compiled terms. Included by kernels.cpp once per processor family, like lanes.h.

/// τᵗ = exp(t ln τ): eight exponents side by side for one state, one exponent for eight states.
[[gnu::always_inline]] inline void evaluateExponentials(const PowerChain &chain, double lnTau, double *powers)
{
    const std::vector<std::size_t> &places = chain.exponentials();
    const std::vector<double> &exponents = chain.exponentialExponents();
    for (std::size_t from = 0; from < places.size(); from += 8) {
        Eight block;
        std::memcpy(&block, exponents.data() + from, sizeof block);
        const Eight values = exponential(block * lnTau);
        const std::size_t count = std::min<std::size_t>(8, places.size() - from);
        for (std::size_t i = 0; i < count; ++i) powers[places[from + i]] = values[i];
    }
}
[[gnu::always_inline]] inline void evaluateExponentials(const PowerChain &chain, const Eight &lnTau, Eight *powers)
{
    const std::vector<std::size_t> &places = chain.exponentials();
    for (std::size_t i = 0; i < places.size(); ++i)
        powers[places[i]] = exponential(chain.exponentialExponents()[i] * lnTau);
}

/// Every power of τ that the equation needs.
template <class Lanes>
[[gnu::always_inline]] inline void evaluatePowers(const PowerChain &chain, const Lanes &tau, Lanes *powers)
{
    powers[0] = Lanes{} + 1.0;
    powers[1] = tau;
    if (!chain.exponentials().empty()) evaluateExponentials(chain, logarithm(tau), powers);
    for (const PowerChain::OfOne &root : chain.roots()) powers[root.place] = squareRoot(powers[root.a]);
    for (const PowerChain::Product &product : chain.products())
        powers[product.place] = powers[product.a] * powers[product.b];
    for (const PowerChain::OfOne &reciprocal : chain.reciprocals())
        powers[reciprocal.place] = 1.0 / powers[reciprocal.a];
}

/// A temperature factor with its logarithmic derivatives: first = τ ∂ln g/∂τ, slope = τ ∂first/∂τ.
template <class Lanes>
struct TemperatureParts {
    Lanes powers[PowerChain::mostPowers];
    Lanes value[CompiledTerms::mostFactors];
    Lanes first[CompiledTerms::mostFactors];
    Lanes slope[CompiledTerms::mostFactors];
};

/// A density factor with δ-powers and logarithmic derivatives.
template <class Lanes>
struct Factors {
    Lanes powers[CompiledTerms::mostDensityPowers];
    Lanes value[CompiledTerms::mostFactors];
    Lanes first[CompiledTerms::mostFactors];
    Lanes slope[CompiledTerms::mostFactors];
};

template <class Lanes>
struct Sums {
    Lanes a00{};
    Lanes a10{};
    Lanes a01{};
    Lanes a20{};
    Lanes a11{};
    Lanes a02{};
};

template <class Lanes>
[[gnu::always_inline]] inline void evaluateTemperature(const CompiledTerms &terms, const Lanes &tau,
                                                       TemperatureParts<Lanes> &parts)
{
    evaluatePowers(terms.powers, tau, parts.powers);
    for (std::size_t i = 1; i < terms.temperatureFactors.size(); ++i) {
        const CompiledTerms::TemperatureFactor &f = terms.temperatureFactors[i];
        const Lanes x = tau - f.gamma;
        if (f.form == CompiledTerms::TemperatureFactor::Form::bell) {
            parts.value[i] = exponential(-f.beta * (x * x));
            parts.first[i] = -2.0 * f.beta * tau * x;
            parts.slope[i] = -2.0 * f.beta * tau * (x + tau);
        } else {
            const Lanes w = 1.0 / (f.beta * (x * x) + f.b);
            parts.value[i] = exponential(w);
            const Lanes slope = -2.0 * f.beta * x * w * w;
            parts.first[i] = tau * slope;
            parts.slope[i] = tau * slope + tau * tau * (8.0 * f.beta * f.beta * (x * x) * w - 2.0 * f.beta) * w * w;
        }
    }
}

template <class Lanes>
[[gnu::always_inline]] inline void columnFactors(const CompiledTerms &terms, const CompiledTerms::Column &column,
                                                 const TemperatureParts<Lanes> &parts, Lanes &a, Lanes &b, Lanes &c)
{
    for (std::size_t i = column.firstTerm; i < column.endPlainTerm; ++i) {
        const CompiledTerms::Term &term = terms.terms[i];
        const Lanes power = parts.powers[term.power];
        a += term.n * power;
        b += term.nt * power;
        c += term.ntt * power;
    }
    for (std::size_t i = column.endPlainTerm; i < column.endTerm; ++i) {
        const CompiledTerms::Term &term = terms.terms[i];
        const Lanes value = term.n * parts.powers[term.power] * parts.value[term.factor];
        const Lanes first = term.t + parts.first[term.factor];
        a += value;
        b += value * first;
        c += value * (first * (first - 1.0) + parts.slope[term.factor]);
    }
}

template <class Lanes>
[[gnu::always_inline]] inline void evaluateDensity(const CompiledTerms &terms, const Lanes &delta,
                                                   Factors<Lanes> &factors)
{
    factors.powers[0] = Lanes{} + 1.0;
    for (int d = 1; d <= terms.highestDensityPower; ++d) factors.powers[d] = factors.powers[d - 1] * delta;
    factors.value[0] = Lanes{} + 1.0;
    factors.first[0] = Lanes{};
    factors.slope[0] = Lanes{};
    for (std::size_t i = 1; i < terms.densityFactors.size(); ++i) {
        const CompiledTerms::DensityFactor &f = terms.densityFactors[i];
        if (f.form == CompiledTerms::DensityFactor::Form::power) {
            const Lanes u = f.g * factors.powers[f.l];
            factors.value[i] = exponential(-u);
            factors.first[i] = -static_cast<double>(f.l) * u;
            factors.slope[i] = -static_cast<double>(f.l * f.l) * u;
        } else {
            const Lanes x = delta - f.epsilon;
            factors.value[i] = exponential(-f.eta * (x * x) - f.beta * (delta - f.gamma));
            factors.first[i] = -2.0 * f.eta * delta * x - f.beta * delta;
            factors.slope[i] = -2.0 * f.eta * delta * (x + delta) - f.beta * delta;
        }
    }
}

/// Sums over the terms of one density factor, without it: Σ v, Σ d v, Σ d(d − 1) v, and with t for each order in τ.
template <class Lanes>
[[gnu::always_inline]] inline Sums<Lanes> groupSums(const CompiledTerms &terms, const CompiledTerms::Group &group,
                                                    const TemperatureParts<Lanes> &parts, const Factors<Lanes> &factors)
{
    Sums<Lanes> sums;
    for (std::size_t i = group.firstWhole; i < group.endWhole; ++i) {
        const CompiledTerms::WholeTerm &term = terms.wholeTerms[i];
        const Lanes power = parts.powers[term.power] * factors.powers[term.d];
        sums.a00 += term.n * power;
        sums.a01 += term.nd * power;
        sums.a02 += term.ndd * power;
        sums.a10 += term.nt * power;
        sums.a11 += term.ntd * power;
        sums.a20 += term.ntt * power;
    }
    for (std::size_t i = group.firstFactored; i < group.endFactored; ++i) {
        const CompiledTerms::FactoredTerm &term = terms.factoredTerms[i];
        const Lanes value =
            term.n * parts.powers[term.power] * factors.powers[term.densityPower] * parts.value[term.factor];
        const Lanes first = term.t + parts.first[term.factor];
        const Lanes once = value * first;
        sums.a00 += value;
        sums.a01 += term.d * value;
        sums.a02 += term.d * (term.d - 1.0) * value;
        sums.a10 += once;
        sums.a11 += term.d * once;
        sums.a20 += value * (first * (first - 1.0) + parts.slope[term.factor]);
    }
    return sums;
}

template <class Lanes>
[[gnu::always_inline]] inline void evaluate(const CompiledTerms &terms, const Lanes &tau, const Lanes &delta,
                                            Sums<Lanes> &sums)
{
    TemperatureParts<Lanes> parts;
    evaluateTemperature(terms, tau, parts);
    Factors<Lanes> factors;
    evaluateDensity(terms, delta, factors);
    for (const CompiledTerms::Group &group : terms.groups) {
        const Sums<Lanes> own = groupSums(terms, group, parts, factors);
        // The product rule with the factor's logarithmic derivatives.
        const Lanes value = factors.value[group.factor];
        const Lanes first = factors.first[group.factor];
        const Lanes second = first * (first - 1.0) + factors.slope[group.factor];
        sums.a00 += value * own.a00;
        sums.a10 += value * own.a10;
        sums.a20 += value * own.a20;
        sums.a01 += value * (own.a01 + first * own.a00);
        sums.a11 += value * (own.a11 + first * own.a10);
        sums.a02 += value * (own.a02 + 2.0 * first * own.a01 + second * own.a00);
    }
}

inline void addNonAnalytic(const CompiledTerms &terms, double tau, double delta, Alpha &alpha)
{
    for (const NonAnalyticTerm &term : terms.nonAnalytic) add(alpha, nonAnalytic(term, tau, delta));
}

inline Alpha at(const CompiledTerms &terms, double temperature, double density)
{
    const double tau = terms.reducingTemperature / temperature;
    const double delta = density / terms.reducingDensity;
    Sums<double> sums;
    evaluate(terms, tau, delta, sums);
    Alpha alpha{sums.a00, sums.a10, sums.a01, sums.a20, sums.a11, sums.a02};
    addNonAnalytic(terms, tau, delta, alpha);
    return alpha;
}

inline void atTemperature(const CompiledTerms &terms, double temperature, bool temperatureDerivatives,
                          Isotherm &isotherm)
{
    isotherm.temperature = temperature;
    TemperatureParts<double> parts;
    evaluateTemperature(terms, terms.reducingTemperature / temperature, parts);
    for (std::size_t j = 0; j < terms.columns.size(); ++j) {
        double a = 0.0;
        double b = 0.0;
        double c = 0.0;
        columnFactors(terms, terms.columns[j], parts, a, b, c);
        isotherm.value[j] = a;
        if (!temperatureDerivatives) continue;
        isotherm.first[j] = b;
        isotherm.second[j] = c;
    }
}

/// δ² f″/f of a column, multiplied out: in a thin gas the factor's share is small beside d.
inline double secondOf(const CompiledTerms::Column &column, const Factors<double> &factors)
{
    const double d = column.d;
    const double rest = factors.first[column.factor];
    return d * (d - 1.0) + rest * (2.0 * d - 1.0) + (rest * rest + factors.slope[column.factor]);
}

inline Alpha onIsotherm(const CompiledTerms &terms, const Isotherm &isotherm, double density)
{
    const double delta = density / terms.reducingDensity;
    Factors<double> factors;
    evaluateDensity(terms, delta, factors);
    Alpha alpha;
    for (std::size_t j = 0; j < terms.columns.size(); ++j) {
        const CompiledTerms::Column &column = terms.columns[j];
        const double f = factors.powers[column.d] * factors.value[column.factor];
        const double first = column.d + factors.first[column.factor];
        alpha.a00 += isotherm.value[j] * f;
        alpha.a10 += isotherm.first[j] * f;
        alpha.a20 += isotherm.second[j] * f;
        alpha.a01 += isotherm.value[j] * f * first;
        alpha.a11 += isotherm.first[j] * f * first;
        alpha.a02 += isotherm.value[j] * f * secondOf(column, factors);
    }
    addNonAnalytic(terms, terms.reducingTemperature / isotherm.temperature, delta, alpha);
    return alpha;
}

inline DensityDerivatives densityDerivatives(const CompiledTerms &terms, const Isotherm &isotherm, double density)
{
    const double delta = density / terms.reducingDensity;
    Factors<double> factors;
    evaluateDensity(terms, delta, factors);
    DensityDerivatives sum{0.0, 0.0};
    for (std::size_t j = 0; j < terms.columns.size(); ++j) {
        const CompiledTerms::Column &column = terms.columns[j];
        const double f = isotherm.value[j] * factors.powers[column.d] * factors.value[column.factor];
        const double first = column.d + factors.first[column.factor];
        sum.a01 += f * first;
        sum.a02 += f * secondOf(column, factors);
    }
    const double tau = terms.reducingTemperature / isotherm.temperature;
    for (const NonAnalyticTerm &term : terms.nonAnalytic) {
        const Alpha alpha = nonAnalytic(term, tau, delta);
        sum.a01 += alpha.a01;
        sum.a02 += alpha.a02;
    }
    return sum;
}

inline void atEach(const CompiledTerms &terms, std::span<const double> temperatures, std::span<const double> densities,
                   std::span<Alpha> results)
{
    assert(temperatures.size() == densities.size() && densities.size() == results.size());
    for (std::size_t from = 0; from < results.size(); from += 8) {
        const std::size_t count = std::min<std::size_t>(8, results.size() - from);
        Eight tau;
        Eight delta;
        for (std::size_t i = 0; i < 8; ++i) { // the last block repeats its first state where there are fewer than eight
            const std::size_t at = from + (i < count ? i : 0);
            tau[i] = terms.reducingTemperature / temperatures[at];
            delta[i] = densities[at] / terms.reducingDensity;
        }
        Sums<Eight> sums;
        evaluate(terms, tau, delta, sums);
        for (std::size_t i = 0; i < count; ++i) {
            results[from + i] = {sums.a00[i], sums.a10[i], sums.a01[i], sums.a20[i], sums.a11[i], sums.a02[i]};
            addNonAnalytic(terms, tau[i], delta[i], results[from + i]);
        }
    }
}

/// The sums of an ideal part at τ: α⁰ without ln δ and its scaled derivatives.
inline IdealSums idealAt(const CompiledIdeal &ideal, double tau)
{
    const double lnTau = std::log(tau);
    const double inverse = 1.0 / tau;
    IdealSums sums{ideal.lead[0] + ideal.lead[1] * tau + ideal.logTau * lnTau, ideal.lead[1] * tau + ideal.logTau,
                   -ideal.logTau, lnTau};
    for (const CompiledIdeal::WholePower &term : ideal.wholePowers) {
        const double factor = term.t > 0 ? tau : inverse;
        double value = term.n;
        for (int i = 0; i < std::abs(term.t); ++i) value *= factor;
        sums.a00 += value;
        sums.a10 += term.t * value;
        sums.a20 += term.t * (term.t - 1) * value;
    }
    for (const IdealPowerTerm &term : ideal.powers) {
        const double value = term.n * exponential(term.t * lnTau);
        sums.a00 += value;
        sums.a10 += term.t * value;
        sums.a20 += term.t * (term.t - 1.0) * value;
    }
    for (const PlanckEinsteinTerm &term : ideal.few) {
        const double x = term.theta * tau;
        const double e = term.d * exponential(-x);
        const double sum = term.c + e;
        const double ratio = e / sum;
        sums.a00 += term.n * std::log(sum);
        sums.a10 -= term.n * x * ratio;
        sums.a20 += term.n * x * x * ratio * (1.0 - ratio);
    }
    for (std::size_t from = 0; from < ideal.n.size(); from += 8) {
        Eight n;
        Eight theta;
        Eight c;
        Eight d;
        std::memcpy(&n, ideal.n.data() + from, sizeof n);
        std::memcpy(&theta, ideal.theta.data() + from, sizeof theta);
        std::memcpy(&c, ideal.c.data() + from, sizeof c);
        std::memcpy(&d, ideal.d.data() + from, sizeof d);
        const Eight x = theta * tau;
        const Eight e = d * exponential(-x);
        const Eight sum = c + e;
        const Eight ratio = e / sum;
        const Eight a = n * logarithm(sum);
        const Eight first = n * x * ratio;
        const Eight second = first * x * (1.0 - ratio);
        for (int i = 0; i < 8; ++i) {
            sums.a00 += a[i];
            sums.a10 -= first[i];
            sums.a20 += second[i];
        }
    }
    return sums;
}
