#pragma once
// What a gas is made of: component names of the document (lower-case English) and mole fractions that sum to 1.

#include <string>
#include <vector>

namespace quasistat::gas
{

struct Share {
    std::string component; ///< "nitrogen", "carbon dioxide"
    double moleFraction;   ///< > 0
    bool operator==(const Share &) const = default;
};

/// Sorted by component name; empty for a perfect gas, which has no composition.
using Composition = std::vector<Share>;

} // namespace quasistat::gas
