// Which law a quasi-static segment follows and where it ends.

#include "core/gas/solve/solve.h"
#include "core/path/arrival.h"
#include "core/path/end_on_law.h"
#include "core/path/phase_crossings.h"
#include "core/path/quasi_static.h"

#include <algorithm>
#include <cmath>

namespace quasistat::path
{
namespace
{

using gas::MolarState;
using gas::Property;

template <class... Cases>
struct Overloaded : Cases... {
    using Cases::operator()...;
};
template <class... Cases>
Overloaded(Cases...) -> Overloaded<Cases...>;

/// Closer than this two volumes are one: the exponent between them would be noise.
constexpr double sameVolume = 1e-12;

double logRatio(double a, double b)
{
    return std::log(a / b);
}

std::optional<double> given(const ResolvedSegment &segment, EndKey key)
{
    for (const auto &[k, value] : segment.ends)
        if (k == key) return value;
    return std::nullopt;
}

Course courseOn(const Law &law, const gas::State &from, const MolarState &end)
{
    const MolarState &start = from.molar();
    const double x = std::holds_alternative<ConstantVolume>(law) ? logRatio(end.temperature, start.temperature)
                                                                 : logRatio(end.molarVolume, start.molarVolume);
    return {law, x, end, std::nullopt, {}};
}

/// The end of a law whose state is given by another: there must be a point of the law.
Outcome<Course> arrivingOn(const Law &law, const gas::State &from, const ResolvedSegment &segment)
{
    const MolarState &target = segment.arrival->molar();
    Course course = courseOn(law, from, target);
    const auto reached = QuasiStaticCurve(from.sharedGas(), from.amount(), from.molar(), law, course.endCoordinate)
                             .at(course.endCoordinate);
    if (!reached) return at("/end/state", Failure{reached.failure().reason, "", reached.failure().message});
    const auto check = arrived(reached->state, from, *segment.arrival, segment.arrivalNumber);
    if (!check) return check.failure();
    return course;
}

Outcome<Course> endingOn(const Law &law, const gas::State &from, const ResolvedSegment &segment)
{
    if (segment.arrival) return arrivingOn(law, from, segment);
    const auto &[key, value] = segment.ends.front();
    auto end = endOnLaw(from, law, key, value, segment.direction);
    if (!end && !computesTwoPhaseStates(from.gas()))
        if (const auto dew = firstCondensation(from, law)) // why the end is not reached
            return at("/end/" + std::string(keyOf(key)), condensesAt(*dew, from.amount()));
    if (!end) return end.failure();
    return Course{law, end->coordinate, end->state, std::nullopt, std::move(end->remarks)};
}

/// The end state that two of p, V, T fix, or the one to arrive at.
Outcome<MolarState> endState(const gas::State &from, const ResolvedSegment &segment)
{
    if (segment.arrival) {
        if (std::abs(segment.arrival->amount() - from.amount()) > 1e-6 * from.amount())
            return arrived(segment.arrival->molar(), from, *segment.arrival, segment.arrivalNumber).failure();
        return segment.arrival->molar();
    }
    std::vector<gas::Given> two;
    if (const auto p = given(segment, EndKey::pressure)) two.push_back({Property::pressure, *p});
    if (const auto V = given(segment, EndKey::volume)) two.push_back({Property::molarVolume, *V / from.amount()});
    if (const auto T = given(segment, EndKey::temperature)) two.push_back({Property::temperature, *T});
    if (two.size() != 2)
        return Failure{Reason::contradiction, "/end", {"this segment needs two values as its end", {}}};
    const auto state = gas::stateFrom(from.gas(), two[0], two[1], &from.molar());
    if (!state) return at("/end", state.failure());
    return state;
}

Outcome<Course> betweenTwoPoints(const gas::State &from, const ResolvedSegment &segment)
{
    const auto end = endState(from, segment);
    if (!end) return end.failure();
    const double lnV = logRatio(end->molarVolume, from.molar().molarVolume);
    if (std::abs(lnV) < sameVolume) return courseOn(ConstantVolume{}, from, *end);
    const double exponent = -logRatio(end->pressure, from.molar().pressure) / lnV;
    Course course = courseOn(PowerLaw{exponent}, from, *end);
    course.exponent = exponent;
    return course;
}

Outcome<Course> straightTo(const gas::State &from, const ResolvedSegment &segment)
{
    const auto end = endState(from, segment);
    if (!end) return end.failure();
    const double deltaV = end->molarVolume - from.molar().molarVolume;
    if (std::abs(deltaV) < sameVolume * from.molar().molarVolume) return courseOn(ConstantVolume{}, from, *end);
    return courseOn(StraightLine{(end->pressure - from.molar().pressure) / deltaV}, from, *end);
}

} // namespace

Outcome<Course> courseOf(const gas::State &from, const ResolvedSegment &segment)
{
    if (segment.ends.empty() && !segment.arrival)
        return Failure{Reason::missing, "/end", {"this segment needs an end", {}}};
    return std::visit(
        Overloaded{[&](const Isothermal &) { return endingOn(ConstantTemperature{}, from, segment); },
                   [&](const Isobaric &) { return endingOn(ConstantPressure{}, from, segment); },
                   [&](const Isochoric &) { return endingOn(ConstantVolume{}, from, segment); },
                   [&](const Isentropic &) { return endingOn(ConstantEntropy{}, from, segment); },
                   [&](const Polytropic &p) -> Outcome<Course> {
                       if (!p.exponent) return betweenTwoPoints(from, segment);
                       auto c = endingOn(PowerLaw{*p.exponent}, from, segment);
                       if (c) c->exponent = *p.exponent;
                       return c;
                   },
                   [&](const Linear &l) {
                       if (!l.stiffness) return straightTo(from, segment);
                       return endingOn(StraightLine{*l.stiffness * from.amount()}, from, segment);
                   },
                   [](const auto &) -> Outcome<Course> {
                       return Failure{Reason::unknownName, "/kind", {"this kind follows no quasi-static law", {}}};
                   }},
        segment.process);
}

} // namespace quasistat::path
