#pragma once
// A property with the value it shall have, and how far a state is from it.

#include "core/gas/gas.h"

namespace quasistat::gas
{

struct Given {
    Property property;
    double value; ///< SI, molar
};

[[nodiscard]] double valueOf(Property property, const MolarState &state);
/// The given value of `property`, if one of the two has it.
[[nodiscard]] std::optional<double> valueOf(Property property, Given first, Given second);

/// Of order one when the property is off by its own size, with its slopes in ln T and ln v.
struct Residue {
    double value;
    double slopeT;
    double slopeV;
};
[[nodiscard]] Residue residue(const MolarState &state, Given given, double gasConstant);

/// “the gas has no state with …”.
[[nodiscard]] Failure noState(Given first, Given second);
[[nodiscard]] std::string wordsOf(Property property);

} // namespace quasistat::gas
