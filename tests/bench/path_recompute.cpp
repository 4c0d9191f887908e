// How long a whole path takes to compute: 50 segments, audits, extrema and drawn curves included.

#include "core/path/evaluate.h"
#include "tests/support/paths.h"

#include <benchmark/benchmark.h>

namespace quasistat::path
{
namespace
{

PathInput fiftySegments(gas::GasPtr gas)
{
    using test::segment;
    test::PathOf path{.gas = std::move(gas)};
    for (int i = 0; i < 10; ++i) {
        path.segments.push_back(segment(Isothermal{}, EndKey::pressureRatio, 2.0));
        path.segments.push_back(segment(Isobaric{}, EndKey::temperature, 420.0));
        path.segments.push_back(segment(Polytropic{1.3}, EndKey::pressureRatio, 0.5));
        path.segments.push_back(segment(Isentropic{}, EndKey::volumeRatio, 1.1));
        path.segments.push_back(segment(Isochoric{}, EndKey::temperature, 300.0));
    }
    return path.input();
}

void recompute(benchmark::State &state, const gas::GasPtr &gas)
{
    const PathInput input = fiftySegments(gas);
    for (auto _ : state) {
        const PathResult result = evaluate(input);
        benchmark::DoNotOptimize(result.totals.work);
    }
}

BENCHMARK_CAPTURE(recompute, path_recompute_perfect_gas, test::perfect())
    ->Unit(benchmark::kMillisecond)
    ->Repetitions(9);
BENCHMARK_CAPTURE(recompute, path_recompute_ideal_air, test::idealAir())->Unit(benchmark::kMillisecond)->Repetitions(9);

} // namespace
} // namespace quasistat::path

BENCHMARK_MAIN();
