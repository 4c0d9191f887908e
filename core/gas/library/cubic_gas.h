#pragma once
// A gas or mixture by a cubic equation of state.

#include "core/gas/equation/cubic_form.h"
#include "core/gas/ideal/ideal_function.h"
#include "core/gas/library/gas_files.h"

#include <memory>
#include <string_view>
#include <vector>

namespace quasistat::gas
{

/// What a cubic equation takes of one component.
struct CubicComponent {
    std::string name;
    CriticalConstants critical;
    std::shared_ptr<const IdealFunction> ideal; ///< holds its c_p outside `idealRange`
    Range idealRange;                           ///< as published, or the user's
    std::string idealSource;
};

/// Of a gas in the data: NASA's polynomials, else the ideal part of its reference equation. Precondition:
/// `data.critical`, and one of the two.
[[nodiscard]] CubicComponent cubicComponent(const GasData &data);

/// The ideal part a user states: c_p/R in ascending powers of T between two temperatures, constant beyond.
struct StatedHeatCapacity {
    std::vector<double> coefficients;
    double from; ///< [K]
    double to;   ///< [K]
};
/// Fails with Reason::outOfRange or missing, pointers relative to the object that states it: no coefficients or more
/// than 20, from ≥ to, a range outside 50 K to 6000 K, c_p/R ≤ 1 anywhere in it.
[[nodiscard]] Outcome<std::shared_ptr<const IdealFunction>> idealFunctionOf(const StatedHeatCapacity &stated);

struct CubicRequest {
    CubicForm form;
    std::vector<CubicComponent> components;
    std::vector<double> fractions;   ///< of the components, > 0, sum 1 within rounding
    std::vector<double> interaction; ///< kᵢⱼ row by row, symmetric
    std::string name;                ///< as shown
};

/// "peng-robinson", "soave-redlich-kwong": keys of the document.
[[nodiscard]] std::string_view keyOf(CubicForm form);

/// Valid where all ideal parts are and T ≥ half the mean critical temperature Σ xᵢT_c,i: below that vapour pressures of
/// both equations are worth little. Fails with Reason::missing without components, outOfRange for critical constants
/// that mean nothing.
[[nodiscard]] Outcome<GasPtr> cubicGas(CubicRequest request);

} // namespace quasistat::gas
