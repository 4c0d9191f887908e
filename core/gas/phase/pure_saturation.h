#pragma once
// Saturation of a pure fluid from its own equation.

#include "core/gas/phase/saturation.h"
#include "core/gas/phase/saturation_table.h"

#include <functional>

namespace quasistat::gas
{

struct PureFluid {
    double tripleTemperature; ///< [K]: the colder end of the curve
    /// Critical point of the equation itself, to the digits its source gives.
    SaturationTable::CriticalPoint critical;
    /// First guess of both densities at T below about 0.98 T_c; a few per cent are near enough.
    std::function<SaturatedDensities(double temperature)> guess;
};

/// The saturation curve and the boundary that it is.
struct PureEquilibrium {
    std::shared_ptr<const Saturation> saturation;
    std::shared_ptr<const PhaseBoundary> boundary;
};

/// `equation`: ideal and residual part; its saturation and boundary are not looked at. Solved by Newton's method in both
/// densities for equal pressure and Gibbs energy (the linear system of R. Akasaka, J. Therm. Sci. Technol. 3 (2008) 442;
/// from memory), from the cold end up; the last millionth below T_c is interpolated.
[[nodiscard]] PureEquilibrium pureEquilibrium(const Equation &equation, const PureFluid &fluid);

/// A pseudo-pure fluid: its dew line from a published dew pressure p_dew(T), its bubble line from a published liquid
/// density.
struct PseudoPureFluid {
    double lowestTemperature;
    SaturationTable::CriticalPoint critical;
    std::function<double(double temperature)> dewPressure;
    std::function<double(double temperature)> liquidDensity;
};
[[nodiscard]] std::shared_ptr<const PhaseBoundary> pseudoPureBoundary(const Equation &equation,
                                                                      const PseudoPureFluid &fluid);

} // namespace quasistat::gas
