#pragma once
// The heat capacity of the ideal gas and its integrals, whatever form they were published in.

#include <span>

namespace quasistat::gas
{

/// Ratios to R at one temperature.
struct IdealProperties {
    double heatCapacity; ///< c_p/R
    double enthalpy;     ///< h/R [K], zero at 298.15 K
    double entropy;      ///< s°/R at the reference pressure of 100 kPa, zero at 298.15 K
};

/// Immutable, shared between threads.
class IdealFunction
{
public:
    virtual ~IdealFunction() = default;
    /// T [K] > 0. Beyond the published range the function goes on as its source says; whoever calls keeps to the range.
    [[nodiscard]] virtual IdealProperties at(double temperature) const = 0;
    /// Temperatures [K], ascending, where c_p may jump.
    [[nodiscard]] virtual std::span<const double> seams() const = 0;
};

} // namespace quasistat::gas
