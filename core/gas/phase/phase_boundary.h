#pragma once
// Where the homogeneous fluid ends: the curve in the (T, v) plane of one gas below which two phases share the volume.

namespace quasistat::gas
{

/// Every isochore meets the boundary at one temperature; below it the homogeneous fluid is not what is there. Immutable
/// and shared between threads.
class PhaseBoundary
{
public:
    virtual ~PhaseBoundary() = default;

    /// The temperature [K] at which the isochore v [m³/mol] meets the boundary, interpolated (a relative 1e-4); 0 where
    /// it meets none above the model's lowest temperature. No iteration.
    [[nodiscard]] virtual double temperatureNear(double molarVolume) const = 0;
    /// The same temperature to the last digits of the equation, found by iteration.
    [[nodiscard]] virtual double temperatureAt(double molarVolume) const = 0;
    /// No two-phase state is hotter [K]: the critical temperature of a pure fluid, the cricondentherm of a mixture.
    [[nodiscard]] virtual double highestTemperature() const = 0;
};

/// Whether (T, v) lies under the boundary; exact.
[[nodiscard]] inline bool isTwoPhase(const PhaseBoundary &boundary, double temperature, double molarVolume)
{
    if (temperature >= boundary.highestTemperature()) return false;
    const double near = boundary.temperatureNear(molarVolume);
    constexpr double band = 5e-4; // wider than the interpolation's error
    if (temperature > near * (1.0 + band)) return false;
    if (temperature < near * (1.0 - band)) return true;
    return temperature < boundary.temperatureAt(molarVolume);
}

} // namespace quasistat::gas
