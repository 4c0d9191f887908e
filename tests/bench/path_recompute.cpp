// How long a whole path takes to compute, audits, extrema and drawn curves included: 50 segments of ideal gases, 12 of
// real ones.

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

/// Twelve segments as an engineer would chain them, within the range of every model of nitrogen.
PathInput twelveSegments(gas::GasPtr gas)
{
    using test::segment;
    test::PathOf path{.gas = std::move(gas), .start = {.pressure = 2e6, .temperature = 300.0, .amount = 10.0}};
    for (int i = 0; i < 3; ++i) {
        path.segments.push_back(segment(Isentropic{}, EndKey::pressureRatio, 2.5));
        path.segments.push_back(segment(Isobaric{}, EndKey::temperature, 310.0));
        path.segments.push_back(segment(Polytropic{1.3}, EndKey::pressureRatio, 0.5));
        path.segments.push_back(segment(Isothermal{}, EndKey::pressureRatio, 0.8));
    }
    return path.input();
}

void recomputeTwelve(benchmark::State &state, const gas::GasPtr &gas)
{
    const PathInput input = twelveSegments(gas);
    for (auto _ : state) {
        const PathResult result = evaluate(input);
        if (!result.complete()) state.SkipWithError("the path is not complete");
        benchmark::DoNotOptimize(result.totals.work);
    }
}

BENCHMARK_CAPTURE(recomputeTwelve, twelve_segments_reference, test::reference("nitrogen"))
    ->Unit(benchmark::kMillisecond)
    ->Repetitions(9);
BENCHMARK_CAPTURE(recomputeTwelve, twelve_segments_gerg, test::gerg({{"nitrogen", 1.0}}))
    ->Unit(benchmark::kMillisecond)
    ->Repetitions(9);
BENCHMARK_CAPTURE(recomputeTwelve, twelve_segments_peng_robinson,
                  test::cubic(gas::CubicForm::pengRobinson, {{"nitrogen", 1.0}}))
    ->Unit(benchmark::kMillisecond)
    ->Repetitions(9);

} // namespace
} // namespace quasistat::path

BENCHMARK_MAIN();
