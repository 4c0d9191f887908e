// How fast real gases are computed: the product against the published formulas as they are printed, in one run. Prints
// medians of nine repetitions and their ratios. With --gate the exit status is 1 where all properties from (T, ρ) are
// less than eight times faster than the transcription.

#include "core/gas/equation/equation.h"
#include "core/gas/solve/solve.h"
#include "tests/bench/transcription.h"
#include "tests/support/gases.h"

#include <benchmark/benchmark.h>
#include <fmt/format.h>

#include <cmath>
#include <memory>

namespace quasistat
{
namespace
{

using gas::MolarState;
using gas::Property;
using transcription::Fluid;
using transcription::Point;

constexpr int repetitions = 9;
constexpr double secondsEach = 0.05;
constexpr std::size_t stateCount = 64;
constexpr std::size_t isentropePoints = 200;
constexpr double leastRatio = 8.0;

struct Subject {
    std::string name;
    gas::GasPtr gas;
    std::unique_ptr<Fluid> plain;
    double coldest; ///< [K]
    double hottest; ///< [K]
};

std::vector<Subject> subjects()
{
    const gas::Library &library = test::library();
    std::vector<Subject> list;
    list.push_back(
        {"nitrogen, reference", *library.reference("nitrogen"),
         std::make_unique<transcription::ReferenceFluid>(*(*library.data("nitrogen", "reference"))->reference), 250.0,
         450.0});
    const auto addMixture = [&](const std::string &name, const gas::Composition &composition, double coldest) {
        std::vector<double> fractions;
        for (const gas::Share &share : composition) fractions.push_back(share.moleFraction);
        list.push_back(
            {name, *library.gerg2008(composition, name),
             std::make_unique<transcription::GergFluid>(*library.gergMixture(composition), std::move(fractions)),
             coldest, 440.0});
    };
    addMixture("dry air, GERG-2008", {{"argon", 0.0092}, {"nitrogen", 0.7812}, {"oxygen", 0.2096}}, 250.0);
    // Gulf Coast gas of the check values (tests/gas/data/checks_gerg2008.csv).
    addMixture("natural gas of 10, GERG-2008",
               {{"carbon dioxide", 0.005956},
                {"ethane", 0.018186},
                {"isobutane", 0.000977},
                {"isopentane", 0.000473},
                {"methane", 0.965222},
                {"n-butane", 0.001007},
                {"n-hexane", 0.000664},
                {"n-pentane", 0.000324},
                {"nitrogen", 0.002595},
                {"propane", 0.004596}},
               290.0);
    return list;
}

/// The states of one run: spread over temperatures and pressures from 1 bar to 300 bar, in no order.
struct States {
    std::vector<double> temperatures;
    std::vector<double> pressures;
    std::vector<double> entropies;
    std::vector<double> volumes;
    std::vector<double> densities;
    std::vector<double> endPressures; ///< of (p, s): 2.5 times as high
    std::vector<double> plainEntropies;
};

States statesOf(const Subject &subject)
{
    States states;
    for (std::size_t i = 0; i < stateCount; ++i) {
        const double first = std::fmod(0.5 + static_cast<double>(i) * 0.618033988749895, 1.0);
        const double second = std::fmod(0.5 + static_cast<double>(i) * 0.754877666246693, 1.0);
        const double temperature = subject.coldest + (subject.hottest - subject.coldest) * first;
        const double pressure = 1e5 * std::pow(300.0, second);
        const auto state =
            gas::stateFrom(*subject.gas, {Property::temperature, temperature}, {Property::pressure, pressure});
        states.temperatures.push_back(temperature);
        states.pressures.push_back(pressure);
        states.volumes.push_back(state->molarVolume);
        states.densities.push_back(1.0 / state->molarVolume);
        states.entropies.push_back(state->entropy);
        states.endPressures.push_back(std::min(2.5 * pressure, 3e7));
        states.plainEntropies.push_back(subject.plain->at(temperature, 1.0 / state->molarVolume).entropy);
    }
    return states;
}

/// Compression from 1 MPa, coldest temperature + 30 K, to 20 MPa, even in ln p.
std::vector<double> isentropePressures()
{
    std::vector<double> pressures;
    for (std::size_t i = 0; i < isentropePoints; ++i)
        pressures.push_back(1e6 * std::pow(20.0, static_cast<double>(i) / (isentropePoints - 1)));
    return pressures;
}

double isentropeStart(const Subject &subject)
{
    return subject.coldest + 30.0;
}

// All seven properties are consumed, as a caller would.
double sumOf(const MolarState &state, double molarMass)
{
    return state.pressure + state.internalEnergy + state.enthalpy + state.entropy + state.isochoricHeatCapacity +
           gas::isobaricHeatCapacity(state) + gas::speedOfSound(state, molarMass);
}
double sumOf(const transcription::Properties &p)
{
    return p.pressure + p.internalEnergy + p.enthalpy + p.entropy + p.isochoricHeatCapacity + p.isobaricHeatCapacity +
           p.speedOfSound;
}

/// Where the ideal gas with the start's heat capacity would be.
Point endOfIdealGas(const Fluid &fluid, Point start, double ratio)
{
    const transcription::Properties here = fluid.at(start.temperature, start.density);
    const double exponent = fluid.gasConstant() / here.isobaricHeatCapacity;
    const double temperature = start.temperature * std::pow(ratio, exponent);
    return {temperature, here.pressure * ratio / (fluid.gasConstant() * temperature)};
}

double plainStates(const Subject &subject, const States &states)
{
    double sum = 0.0;
    for (std::size_t i = 0; i < stateCount; ++i)
        sum += sumOf(subject.plain->at(states.temperatures[i], states.densities[i]));
    return sum;
}

double productStates(const Subject &subject, const States &states)
{
    double sum = 0.0;
    for (std::size_t i = 0; i < stateCount; ++i)
        sum += sumOf(subject.gas->at(states.temperatures[i], states.volumes[i]), subject.gas->molarMass());
    return sum;
}

double productBatch(const Subject &subject, const States &states)
{
    std::array<MolarState, stateCount> results{};
    gas::homogeneousStates(*subject.gas->equation(), states.temperatures, states.volumes, results);
    double sum = 0.0;
    for (const MolarState &state : results) sum += sumOf(state, subject.gas->molarMass());
    return sum;
}

double plainDensities(const Subject &subject, const States &states)
{
    double sum = 0.0;
    for (std::size_t i = 0; i < stateCount; ++i)
        sum += sumOf(
            subject.plain->at(states.temperatures[i],
                              transcription::densityAt(*subject.plain, states.temperatures[i], states.pressures[i])));
    return sum;
}

double productDensities(const Subject &subject, const States &states)
{
    double sum = 0.0;
    for (std::size_t i = 0; i < stateCount; ++i)
        sum += sumOf(*gas::stateFrom(*subject.gas, {Property::temperature, states.temperatures[i]},
                                     {Property::pressure, states.pressures[i]}),
                     subject.gas->molarMass());
    return sum;
}

double plainEnds(const Subject &subject, const States &states)
{
    double sum = 0.0;
    for (std::size_t i = 0; i < stateCount; ++i) {
        const Point start{states.temperatures[i], states.densities[i]};
        const Point guess = endOfIdealGas(*subject.plain, start, states.endPressures[i] / states.pressures[i]);
        const Point end =
            transcription::pointAt(*subject.plain, states.endPressures[i], states.plainEntropies[i], guess);
        sum += sumOf(subject.plain->at(end.temperature, end.density));
    }
    return sum;
}

double productEnds(const Subject &subject, const States &states)
{
    double sum = 0.0;
    for (std::size_t i = 0; i < stateCount; ++i)
        sum += sumOf(*gas::stateFrom(*subject.gas, {Property::pressure, states.endPressures[i]},
                                     {Property::entropy, states.entropies[i]}),
                     subject.gas->molarMass());
    return sum;
}

double plainIsentrope(const Subject &subject, const std::vector<double> &pressures)
{
    const Fluid &fluid = *subject.plain;
    Point point{isentropeStart(subject), 0.0};
    point.density = transcription::densityAt(fluid, point.temperature, pressures.front());
    const double entropy = fluid.at(point.temperature, point.density).entropy;
    double sum = 0.0;
    for (const double pressure : pressures) {
        point = transcription::pointAt(fluid, pressure, entropy, point);
        sum += sumOf(fluid.at(point.temperature, point.density));
    }
    return sum;
}

double productIsentrope(const Subject &subject, const std::vector<double> &pressures)
{
    MolarState state = *gas::stateFrom(*subject.gas, {Property::temperature, isentropeStart(subject)},
                                       {Property::pressure, pressures.front()});
    const double entropy = state.entropy;
    double sum = 0.0;
    for (const double pressure : pressures) {
        state = *gas::stateFrom(*subject.gas, {Property::pressure, pressure}, {Property::entropy, entropy}, &state);
        sum += sumOf(state, subject.gas->molarMass());
    }
    return sum;
}

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

/// Both sides must compute the same, or their times say nothing. Speeds and heat capacities do not depend on zeros.
bool agree(const Subject &subject)
{
    const States states = statesOf(subject);
    for (std::size_t i = 0; i < stateCount; ++i) {
        const double density = transcription::densityAt(*subject.plain, states.temperatures[i], states.pressures[i]);
        const auto plain = subject.plain->at(states.temperatures[i], density);
        const MolarState product = subject.gas->at(states.temperatures[i], states.volumes[i]);
        const Point start{states.temperatures[i], states.densities[i]};
        const Point end =
            transcription::pointAt(*subject.plain, states.endPressures[i], states.plainEntropies[i],
                                   endOfIdealGas(*subject.plain, start, states.endPressures[i] / states.pressures[i]));
        const auto productEnd = gas::stateFrom(*subject.gas, {Property::pressure, states.endPressures[i]},
                                               {Property::entropy, states.entropies[i]});
        if (!productEnd || std::abs(density * states.volumes[i] - 1.0) > 1e-10 ||
            std::abs(plain.speedOfSound / gas::speedOfSound(product, subject.gas->molarMass()) - 1.0) > 1e-10 ||
            std::abs(end.temperature / productEnd->temperature - 1.0) > 1e-10) {
            fmt::print(stderr, "{}: the transcription and the product differ at {} K, {} Pa\n", subject.name,
                       states.temperatures[i], states.pressures[i]);
            return false;
        }
    }
    return true;
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
} // namespace quasistat

int main(int argc, char **argv)
{
    using namespace quasistat;
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
