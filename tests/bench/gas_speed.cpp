// How fast real gases are computed: the product against the published formulas as they are printed, in one run. Prints
// medians of nine repetitions and their ratios. With --gate the exit status is 1 where all properties from (T, ρ) are
// less than eight times faster than the transcription.

#include "tests/bench/gas_work.h"

#include <benchmark/benchmark.h>
#include <fmt/format.h>

#include <map>
#include <memory>

namespace quasistat::bench
{
namespace
{

constexpr int repetitions = 9;
constexpr double secondsEach = 0.05;
constexpr double leastRatio = 8.0;

/// Collects the medians of CPU time [ns] by name; prints nothing.
class Medians final : public benchmark::BenchmarkReporter
{
public:
    bool ReportContext(const Context &) override { return true; }
    void ReportRuns(const std::vector<Run> &runs) override
    {
        for (const Run &run : runs)
            if (run.aggregate_name == "median") m_medians[run.run_name.function_name] = run.GetAdjustedCPUTime();
    }
    [[nodiscard]] double of(const std::string &name) const { return m_medians.at(name); }

private:
    std::map<std::string, double> m_medians;
};

template <class Work>
void enter(const std::string &name, const Work &work)
{
    benchmark::RegisterBenchmark(name.c_str(),
                                 [work](benchmark::State &state) {
                                     for (auto _ : state) benchmark::DoNotOptimize(work());
                                 })
        ->Repetitions(repetitions)
        ->MinTime(secondsEach)
        ->Unit(benchmark::kNanosecond);
}

struct Task {
    const char *words;
    std::string plain;
    std::string product;
    double states;
    bool isGated;
};

/// Enters the benchmarks of one gas; says which two belong together.
std::vector<Task> tasksOf(const Subject &subject)
{
    const auto states = std::make_shared<const States>(statesOf(subject));
    const auto pressures = std::make_shared<const std::vector<double>>(isentropePressures());
    const auto name = [&](const char *what) { return subject.name + ": " + what; };
    enter(name("T rho plain"), [&subject, states] { return plainStates(subject, *states); });
    enter(name("T rho"), [&subject, states] { return productStates(subject, *states); });
    enter(name("T rho batch"), [&subject, states] { return productBatch(subject, *states); });
    enter(name("T p plain"), [&subject, states] { return plainDensities(subject, *states); });
    enter(name("T p"), [&subject, states] { return productDensities(subject, *states); });
    enter(name("p s plain"), [&subject, states] { return plainEnds(subject, *states); });
    enter(name("p s"), [&subject, states] { return productEnds(subject, *states); });
    enter(name("isentrope plain"), [&subject, pressures] { return plainIsentrope(subject, *pressures); });
    enter(name("isentrope"), [&subject, pressures] { return productIsentrope(subject, *pressures); });
    constexpr auto count = static_cast<double>(stateCount);
    return {{"properties from (T, rho)", name("T rho plain"), name("T rho"), count, true},
            {"the same in batches", name("T rho plain"), name("T rho batch"), count, true},
            {"properties from (T, p)", name("T p plain"), name("T p"), count, false},
            {"properties from (p, s)", name("p s plain"), name("p s"), count, false},
            {"isentrope in 200 points", name("isentrope plain"), name("isentrope"), 1.0, false}};
}

std::string timeWords(double nanoseconds)
{
    return nanoseconds < 2000.0 ? fmt::format("{:.0f} ns", nanoseconds) : fmt::format("{:.2f} us", nanoseconds / 1e3);
}

/// Whether every gated ratio is reached.
bool printTable(const std::vector<Subject> &subjects, const std::vector<std::vector<Task>> &tasks,
                const Medians &medians)
{
    bool isFastEnough = true;
    fmt::print("median CPU time of {} repetitions, one thread; p, u, h, s, cv, cp, w of each state\n", repetitions);
    for (std::size_t i = 0; i < subjects.size(); ++i) {
        fmt::print("\n{:<28}{:>14}{:>14}{:>9}\n", subjects[i].name, "as printed", "product", "ratio");
        for (const Task &task : tasks[i]) {
            const double plain = medians.of(task.plain) / task.states;
            const double product = medians.of(task.product) / task.states;
            const bool isTooSlow = task.isGated && plain < leastRatio * product;
            isFastEnough = isFastEnough && !isTooSlow;
            fmt::print("  {:<26}{:>14}{:>14}{:>9.1f}{}\n", task.words, timeWords(plain), timeWords(product),
                       plain / product, isTooSlow ? "  below 8" : "");
        }
    }
    return isFastEnough;
}

} // namespace
} // namespace quasistat::bench

int main(int argc, char **argv)
{
    using namespace quasistat::bench;
    bool isGate = false;
    std::vector<char *> words;
    for (int i = 0; i < argc; ++i)
        if (std::string_view(argv[i]) == "--gate")
            isGate = true;
        else
            words.push_back(argv[i]);
    // Both sides of a ratio see the same disturbances of the machine.
    std::string interleaving = "--benchmark_enable_random_interleaving=true";
    words.push_back(interleaving.data());
    int count = static_cast<int>(words.size());
    benchmark::Initialize(&count, words.data());

    const std::vector<Subject> list = subjects();
    std::vector<std::vector<Task>> tasks;
    for (const Subject &subject : list) {
        if (!agree(subject)) return 1;
        tasks.push_back(tasksOf(subject));
    }
    Medians medians;
    benchmark::RunSpecifiedBenchmarks(&medians);
    const bool isFastEnough = printTable(list, tasks, medians);
    return isGate && !isFastEnough ? 1 : 0;
}
