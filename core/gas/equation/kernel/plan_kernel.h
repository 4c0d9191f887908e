// Evaluation of compiled terms. Included by kernels.cpp once per processor family, like lanes.h.

/// Every power of τ that the equation needs.
template <class Lanes>
[[gnu::always_inline]] inline void evaluatePowers(const PowerChain &chain, const Lanes &tau, Lanes *powers)
{
    Lanes lnTau{};
    if (chain.needsLogarithm()) lnTau = logarithm(tau);
    powers[0] = Lanes{} + 1.0;
    powers[1] = tau;
    for (std::size_t i = 2; i < chain.steps().size(); ++i) {
        const PowerChain::Step &step = chain.steps()[i];
        switch (step.operation) {
        case PowerChain::Operation::given: break;
        case PowerChain::Operation::product: powers[i] = powers[step.a] * powers[step.b]; break;
        case PowerChain::Operation::root: powers[i] = squareRoot(powers[step.a]); break;
        case PowerChain::Operation::reciprocal: powers[i] = 1.0 / powers[step.a]; break;
        case PowerChain::Operation::exponential: powers[i] = exponential(step.exponent * lnTau); break;
        }
    }
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
    for (std::size_t i = column.firstTerm; i < column.endTerm; ++i) {
        const CompiledTerms::Term &term = terms.terms[i];
        const Lanes power = term.n * parts.powers[term.power];
        if (term.factor == 0) {
            const Lanes once = term.t * power;
            a += power;
            b += once;
            c += (term.t - 1.0) * once;
            continue;
        }
        const Lanes value = power * parts.value[term.factor];
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

template <class Lanes>
[[gnu::always_inline]] inline void evaluate(const CompiledTerms &terms, const Lanes &tau, const Lanes &delta,
                                            Sums<Lanes> &sums)
{
    TemperatureParts<Lanes> parts;
    evaluateTemperature(terms, tau, parts);
    Factors<Lanes> factors;
    evaluateDensity(terms, delta, factors);
    for (std::size_t j = 0; j < terms.columns.size(); ++j) {
        Lanes a{};
        Lanes b{};
        Lanes c{};
        columnFactors(terms, terms.columns[j], parts, a, b, c);
        const CompiledTerms::Column &column = terms.columns[j];
        const Lanes f = factors.powers[column.d] * factors.value[column.factor];
        const Lanes first = static_cast<double>(column.d) + factors.first[column.factor];
        const Lanes fFirst = f * first;
        sums.a00 += a * f;
        sums.a10 += b * f;
        sums.a20 += c * f;
        sums.a01 += a * fFirst;
        sums.a11 += b * fFirst;
        sums.a02 += a * f * (first * (first - 1.0) + factors.slope[column.factor]);
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
        alpha.a02 += isotherm.value[j] * f * (first * (first - 1.0) + factors.slope[column.factor]);
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
        sum.a02 += f * (first * (first - 1.0) + factors.slope[column.factor]);
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
