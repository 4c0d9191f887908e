// The same arithmetic for one state or for eight side by side. Included by kernels.cpp once per processor family,
// inside that family's namespace and target options; so there is no include guard, and the standard headers come from
// there.

/// Eight numbers that one instruction, or a few, work on. GCC's and Clang's vector extension: any x86-64 will do.
using Eight = double __attribute__((vector_size(64)));
using EightBits = std::int64_t __attribute__((vector_size(64)));

[[gnu::always_inline]] inline double squareRoot(double x)
{
    return std::sqrt(x);
}
[[gnu::always_inline]] inline double logarithm(double x)
{
    return std::log(x);
}

[[gnu::always_inline]] inline Eight squareRoot(const Eight &x)
{
    Eight r{};
    for (int i = 0; i < 8; ++i) r[i] = std::sqrt(x[i]);
    return r;
}

/// eˣ within 2 ulp for −708 ≤ x ≤ 708; the value at the nearer bound beyond. x = k ln 2 + r, |r| ≤ ln 2/2, and eʳ by
/// its Taylor series, whose remainder r¹⁴/14! is below 5e-18. `Lanes` with integers as wide, `Bits`.
template <class Lanes, class Bits>
[[gnu::always_inline]] inline Lanes exponentialOf(const Lanes &x)
{
    constexpr double most = 708.0;
    constexpr double log2e = 1.4426950408889634;
    constexpr double ln2High = 6.93147180369123816490e-01; // its last 21 bits are zero: k ln2High is exact
    constexpr double ln2Low = 1.90821492927058770002e-10;
    constexpr double magic = 6755399441055744.0; // 1.5 · 2⁵²: adding it leaves the rounded integer in the low bits
    const Lanes bounded = x < -most ? Lanes{} - most : (x > most ? Lanes{} + most : x);
    const Lanes shifted = bounded * log2e + magic;
    const Lanes k = shifted - magic;
    const Lanes r = (bounded - k * ln2High) - k * ln2Low;
    Lanes p = Lanes{} + 1.0 / 6227020800.0;
    for (const double coefficient :
         {1.0 / 479001600.0, 1.0 / 39916800.0, 1.0 / 3628800.0, 1.0 / 362880.0, 1.0 / 40320.0, 1.0 / 5040.0,
          1.0 / 720.0, 1.0 / 120.0, 1.0 / 24.0, 1.0 / 6.0, 0.5, 1.0, 1.0})
        p = p * r + coefficient;
    // The low bits of `shifted` are k; moved into the exponent field they are 2ᵏ.
    const Bits exponent = (std::bit_cast<Bits>(shifted) + 1023) << 52;
    return p * std::bit_cast<Lanes>(exponent);
}

/// The same for one number, within 1 ulp or so: k/128 of a power of two from a table leaves |r| ≤ ln 2/256, and a fifth
/// of the series.
[[gnu::always_inline]] inline double exponential(double x)
{
    constexpr double perOctave = 128.0;
    constexpr double most = 708.0;
    constexpr double scale = 184.66496523378731; // 128/ln 2
    constexpr double ln2High = 6.93147180369123816490e-01 / perOctave;
    constexpr double ln2Low = 1.90821492927058770002e-10 / perOctave;
    constexpr double magic = 6755399441055744.0;
    const double bounded = x < -most ? -most : (x > most ? most : x);
    const double shifted = bounded * scale + magic;
    const double k = shifted - magic;
    const double r = (bounded - k * ln2High) - k * ln2Low;
    const double p = r + r * r * (0.5 + r * (1.0 / 6.0 + r * (1.0 / 24.0 + r * (1.0 / 120.0))));
    const auto bits = std::bit_cast<std::int64_t>(shifted);
    const double root = rootsOfTwo[static_cast<std::size_t>(bits & 127)];
    const auto power = std::bit_cast<double>(((bits >> 7) + 1023) << 52);
    return (root + root * p) * power;
}
[[gnu::always_inline]] inline Eight exponential(const Eight &x)
{
    return exponentialOf<Eight, EightBits>(x);
}

/// ln x within 2 ulp of the larger of its value and 1, for normal x > 0. x = m 2ᵏ with m in (√½, √2], and
/// ln m = 2 artanh((m − 1)/(m + 1)) by its series.
[[gnu::always_inline]] inline Eight logarithm(const Eight &x)
{
    constexpr double ln2High = 6.93147180369123816490e-01;
    constexpr double ln2Low = 1.90821492927058770002e-10;
    constexpr double magic = 6755399441055744.0;
    constexpr std::int64_t halfRoot = 0x3FE6A09E667F3BCD; // bits of √½
    const EightBits bits = std::bit_cast<EightBits>(x);
    const EightBits k = (bits - halfRoot) >> 52;
    const EightBits mantissa = bits - (k << 52);
    const Eight m = std::bit_cast<Eight>(mantissa);
    const EightBits shifted = k + static_cast<std::int64_t>(0x4338000000000000); // bits of `magic`, plus k
    const Eight kd = std::bit_cast<Eight>(shifted) - magic;
    const Eight s = (m - 1.0) / (m + 1.0);
    const Eight z = s * s;
    Eight p = Eight{} + 1.0 / 21.0;
    p = p * z + 1.0 / 19.0;
    p = p * z + 1.0 / 17.0;
    p = p * z + 1.0 / 15.0;
    p = p * z + 1.0 / 13.0;
    p = p * z + 1.0 / 11.0;
    p = p * z + 1.0 / 9.0;
    p = p * z + 1.0 / 7.0;
    p = p * z + 1.0 / 5.0;
    p = p * z + 1.0 / 3.0;
    return kd * ln2High + ((2.0 * s) * z * p + kd * ln2Low) + 2.0 * s;
}
