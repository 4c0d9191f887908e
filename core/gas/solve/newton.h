#pragma once
// Newton's method in both temperature and volume.

#include "core/gas/solve/given.h"

#include <functional>

namespace quasistat::gas
{

struct Place {
    double temperature;
    double molarVolume;
};

/// The homogeneous state nearest to `start` in which both properties have their values, in ln T and ln v with steps cut
/// where they go far, to the last bits; none if it does not get there in a hundred steps or the two conditions are
/// parallel on the way. Whether the state is what is there, and inside the model, is for the caller to say.
/// `known`: a state of this gas, or null; if it is the one at `start`, it is not worked out again.
[[nodiscard]] std::optional<MolarState> newton(const Gas &gas, Given first, Given second, Place start,
                                               const MolarState *known = nullptr);

} // namespace quasistat::gas
