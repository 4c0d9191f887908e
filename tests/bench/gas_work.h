#pragma once
// The work that is measured: the same states and paths by the product and by the published formulas as printed.

#include "core/gas/gas.h"
#include "tests/bench/transcription.h"

#include <memory>

namespace quasistat::bench
{

constexpr std::size_t stateCount = 64;

/// One gas, by both.
struct Subject {
    std::string name;
    gas::GasPtr gas;
    std::unique_ptr<transcription::Fluid> plain;
    double coldest; ///< [K]
    double hottest; ///< [K]
};
[[nodiscard]] std::vector<Subject> subjects();

/// The states of one run: spread over temperatures and pressures from 1 bar to 300 bar, in no order.
struct States {
    std::vector<double> temperatures;
    std::vector<double> pressures;
    std::vector<double> entropies;
    std::vector<double> volumes;
    std::vector<double> densities;
    std::vector<double> endPressures; ///< of (p, s): 2.5 times as high, at most 300 bar
    std::vector<double> plainEntropies;
};
[[nodiscard]] States statesOf(const Subject &subject);
/// Both sides must compute the same, or their times say nothing; says where they do not.
[[nodiscard]] bool agree(const Subject &subject);

/// Compression from 1 MPa to 20 MPa in 200 points, even in ln p [Pa].
[[nodiscard]] std::vector<double> isentropePressures();

// Each returns a sum over all seven properties of every state, so that none is left out: from (T, ρ), from (T, p), the
// end of an isentropic change at (p, s), an isentrope whose points start from their neighbours.
[[nodiscard]] double plainStates(const Subject &subject, const States &states);
[[nodiscard]] double productStates(const Subject &subject, const States &states);
[[nodiscard]] double productBatch(const Subject &subject, const States &states);
[[nodiscard]] double plainDensities(const Subject &subject, const States &states);
[[nodiscard]] double productDensities(const Subject &subject, const States &states);
[[nodiscard]] double plainEnds(const Subject &subject, const States &states);
[[nodiscard]] double productEnds(const Subject &subject, const States &states);
[[nodiscard]] double plainIsentrope(const Subject &subject, const std::vector<double> &pressures);
[[nodiscard]] double productIsentrope(const Subject &subject, const std::vector<double> &pressures);

} // namespace quasistat::bench
