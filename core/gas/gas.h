#pragma once
// The one interface that every gas model shares: the molar Helmholtz energy and what bounds it. A gas is immutable,
// composition included, and shared between threads; everything else is a free function over it.

#include "core/gas/composition.h"
#include "core/gas/molar_state.h"
#include "core/outcome/outcome.h"

#include <memory>
#include <optional>
#include <span>
#include <string>
#include <string_view>

namespace quasistat::gas
{

/// Molar Helmholtz energy a(T, v) [J/mol] of the homogeneous fluid and its partial derivatives.
struct Helmholtz {
    double a;
    double aT;  ///< −s
    double av;  ///< −p
    double aTT; ///< −c_v/T
    double aTv; ///< −(∂p/∂T)_v
    double avv; ///< −(∂p/∂v)_T
};

/// Where a model may be used. Outside `valid` results carry a warning, outside `hard` there are none.
struct Range {
    double lowestTemperature;  ///< [K]
    double highestTemperature; ///< [K]
    double highestPressure;    ///< [Pa]; infinity where the model sets none
};
struct Validity {
    Range valid;
    Range hard;
    /// Published uncertainty inside and outside `valid`, in words; empty where none is known.
    std::string uncertainty;
};

struct Equation;

/// Two of its intensive properties fix a state.
enum class Property { temperature, molarVolume, pressure, internalEnergy, enthalpy, entropy };

class Gas
{
public:
    virtual ~Gas() = default;

    /// Homogeneous Helmholtz energy at T [K] > 0, v [m³/mol] > 0 inside the hard range.
    [[nodiscard]] virtual Helmholtz helmholtz(double temperature, double molarVolume) const = 0;
    /// Equilibrium state at (T, v): the homogeneous one, or by the lever rule under the dome of models that have one.
    [[nodiscard]] virtual MolarState at(double temperature, double molarVolume) const = 0;
    /// The same equation's ideal part: the gas at v → ∞. A gas that is ideal returns itself.
    [[nodiscard]] virtual const Gas &idealPart() const = 0;

    [[nodiscard]] virtual double molarMass() const = 0;   ///< [kg/mol]
    [[nodiscard]] virtual double gasConstant() const = 0; ///< [J/(mol K)], of this equation
    [[nodiscard]] virtual const Composition &composition() const = 0;
    [[nodiscard]] virtual const Validity &validity() const = 0;
    /// Temperatures [K], ascending, where c_v may jump (seams of piecewise heat capacities): integrals are split there.
    [[nodiscard]] virtual std::span<const double> seams() const = 0;
    /// What makes the gas real; null if p v = R T everywhere.
    [[nodiscard]] virtual const Equation *equation() const = 0;
    [[nodiscard]] bool isIdeal() const { return equation() == nullptr; }

    [[nodiscard]] virtual std::string_view model() const = 0;  ///< key of the document: "perfect"
    [[nodiscard]] virtual std::string_view source() const = 0; ///< published source, one line
    /// What the gas is called: "air", "nitrogen 0.70, helium 0.30", the user's name of a perfect gas.
    [[nodiscard]] virtual const std::string &name() const = 0;
};

using GasPtr = std::shared_ptr<const Gas>;

/// The homogeneous state at (T, v) from the Helmholtz energy: p = −a_v, s = −a_T, u = a + T s, h = u + p v.
[[nodiscard]] MolarState homogeneousState(const Gas &gas, double temperature, double molarVolume);

/// c_p/c_v of the ideal part at `temperature`.
[[nodiscard]] double idealHeatCapacityRatio(const Gas &gas, double temperature);

} // namespace quasistat::gas
