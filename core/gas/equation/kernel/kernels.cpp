#include "core/gas/equation/kernel/kernels.h"

#include "core/gas/equation/non_analytic.h"

#include <algorithm>
#include <array>
#include <bit>
#include <cassert>
#include <cmath>
#include <cstdint>
#include <cstdlib>
#include <cstring>

// How vectors are passed between functions differs between families; none is ever passed.
#pragma GCC diagnostic ignored "-Wpsabi"

namespace quasistat::gas
{
namespace
{

/// eˣ by its series, for the table below only: |x| < 1, in the widest arithmetic there is.
constexpr long double seriesOfExponential(long double x)
{
    long double sum = 1.0L;
    long double term = 1.0L;
    for (int i = 1; i < 40; ++i) {
        term *= x / i;
        sum += term;
    }
    return sum;
}

/// 2^(i/128).
constexpr std::array<double, 128> rootsOfTwo = [] {
    constexpr long double ln2 = 0.693147180559945309417232121458176568L;
    std::array<double, 128> roots{};
    for (std::size_t i = 0; i < roots.size(); ++i)
        roots[i] = static_cast<double>(seriesOfExponential(ln2 * static_cast<long double>(i) / 128.0L));
    return roots;
}();

// Three copies of the same text in three namespaces, each with its family's instructions. (Function attributes would be
// shorter, but the compiler takes wide vectors apart before it inlines the templates into such a function.)

namespace plain
{
#include "core/gas/equation/kernel/lanes.h"
#include "core/gas/equation/kernel/plan_kernel.h"
} // namespace plain

#ifdef __x86_64__

#pragma GCC push_options
#pragma GCC target("avx2,fma")
namespace avx2
{
#include "core/gas/equation/kernel/lanes.h"
#include "core/gas/equation/kernel/plan_kernel.h"
} // namespace avx2
#pragma GCC pop_options

#pragma GCC push_options
#pragma GCC target("avx2,fma,avx512f,avx512dq,avx512vl")
namespace avx512
{
#include "core/gas/equation/kernel/lanes.h"
#include "core/gas/equation/kernel/plan_kernel.h"
} // namespace avx512
#pragma GCC pop_options

#endif

} // namespace

std::vector<Kernels> allKernels()
{
    std::vector<Kernels> all{{"x86-64", plain::at, plain::atTemperature, plain::onIsotherm, plain::densityDerivatives,
                              plain::atEach, plain::idealAt}};
#ifdef __x86_64__
    if (__builtin_cpu_supports("avx2") && __builtin_cpu_supports("fma"))
        all.push_back({"AVX2", avx2::at, avx2::atTemperature, avx2::onIsotherm, avx2::densityDerivatives, avx2::atEach,
                       avx2::idealAt});
    if (__builtin_cpu_supports("avx512f") && __builtin_cpu_supports("avx512dq") && __builtin_cpu_supports("avx512vl"))
        all.push_back({"AVX-512", avx512::at, avx512::atTemperature, avx512::onIsotherm, avx512::densityDerivatives,
                       avx512::atEach, avx512::idealAt});
#endif
    return all;
}

const Kernels &kernels()
{
    static const Kernels best = allKernels().back();
    return best;
}

} // namespace quasistat::gas
