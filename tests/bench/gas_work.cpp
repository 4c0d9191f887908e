#include "tests/bench/gas_work.h"

#include "core/gas/equation/equation.h"
#include "core/gas/solve/solve.h"
#include "tests/support/gases.h"

#include <fmt/format.h>

#include <array>
#include <cmath>

namespace quasistat::bench
{

using gas::MolarState;
using gas::Property;
using transcription::Fluid;
using transcription::Point;

namespace
{

constexpr std::size_t isentropePoints = 200;

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

} // namespace

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

std::vector<double> isentropePressures()
{
    std::vector<double> pressures;
    for (std::size_t i = 0; i < isentropePoints; ++i)
        pressures.push_back(1e6 * std::pow(20.0, static_cast<double>(i) / (isentropePoints - 1)));
    return pressures;
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

} // namespace quasistat::bench
