#pragma once
// What the user said of a segment, in SI, and nothing derived.

#include "core/units/quantity.h"

#include <optional>
#include <string>
#include <string_view>
#include <variant>
#include <vector>

namespace quasistat::path
{

/// Keys of `end` in the document.
enum class EndKey { pressure, volume, temperature, pressureRatio, volumeRatio, work, heat };
[[nodiscard]] std::string_view keyOf(EndKey key); ///< "pressure_ratio"
[[nodiscard]] units::Quantity quantityOf(EndKey key);

/// "@3": the same as state 3 has of this quantity. States count from 1.
struct SameAs {
    int state;
    bool operator==(const SameAs &) const = default;
};

struct EndValue {
    EndKey key;
    std::variant<double, SameAs> value; ///< SI; work and heat positive into the gas
};

enum class Direction { compress, expand };

/// Where a segment stops: values, an earlier state to arrive at exactly, or balance with the load.
struct End {
    std::vector<EndValue> values;
    std::optional<int> state;
    bool balance = false;
    std::optional<Direction> direction;
};

enum class Thermal { isothermal, adiabatic };
enum class Spacing { ratio, pressure };

struct Isothermal {
};
struct Isobaric {
};
struct Isochoric {
};
struct Polytropic {
    std::optional<double> exponent; ///< none: from the two values of the end
};
struct Isentropic {
};
struct Linear {
    std::optional<double> stiffness; ///< dp/dV [Pa/m³]; none: the end gives pressure and volume
};
struct ConstantExternalPressure {
    std::variant<double, SameAs> externalPressure; ///< [Pa]
    Thermal thermal = Thermal::isothermal;
};
struct Stepped {
    int steps = 1; ///< ≥ 1
    Spacing spacing = Spacing::ratio;
    Thermal thermal = Thermal::isothermal;
};
struct FreeExpansion {
    Thermal thermal = Thermal::adiabatic;
};

/// Every kind that is computed. A new one does not compile until each visit has an answer for it.
using Process = std::variant<Isothermal, Isobaric, Isochoric, Polytropic, Isentropic, Linear, ConstantExternalPressure,
                             Stepped, FreeExpansion>;

struct Segment {
    Process process;
    End end;
    std::string label;
};

} // namespace quasistat::path
