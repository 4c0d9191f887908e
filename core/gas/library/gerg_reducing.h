#pragma once
// The reducing functions of GERG-2008 with their composition derivatives.

#include "core/gas/library/gerg_2008.h"

#include <span>
#include <vector>

namespace quasistat::gas
{

/// T_r and v_r = 1/ρ_r and their ∂/∂xᵢ, all fractions taken as independent. Source: O. Kunz, W. Wagner, J. Chem. Eng.
/// Data 57 (2012) 3032, eqs. (16) and (17) (numbers from memory).
struct GergReducingSlopes {
    double temperature; ///< [K]
    double volume;      ///< [m³/mol]
    std::vector<double> temperatureSlopes;
    std::vector<double> volumeSlopes;
};
[[nodiscard]] GergReducingSlopes reducingSlopes(const GergMixture &mixture, std::span<const double> fractions);

} // namespace quasistat::gas
