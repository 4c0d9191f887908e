#pragma once
// Gases that a user states for a cubic equation of state, alone or over what the library knows.

#include "core/document/fields.h"
#include "core/document/interpret_parts.h"
#include "core/gas/library/cubic_gas.h"

#include <map>
#include <optional>
#include <string>

namespace quasistat::document
{

/// What is stated of one gas; the rest comes from the library if it knows the gas.
struct OwnGas {
    std::string pointer;
    std::optional<double> criticalTemperature; ///< [K]
    std::optional<double> criticalPressure;    ///< [Pa]
    std::optional<double> acentricFactor;
    std::optional<double> molarMass; ///< [kg/mol]
    std::optional<gas::StatedHeatCapacity> heatCapacity;
    std::shared_ptr<const gas::IdealFunction> ideal; ///< of heatCapacity
};

/// The names a cubic equation knows: the user's own first, then the library's.
class CubicGases final : public KnownGases
{
public:
    /// `components` of the document, or none. Warns of a gas of the library whose values are replaced. Fails at the
    /// value at fault. `library` outlives the result.
    [[nodiscard]] static Outcome<CubicGases> from(const std::optional<Place> &components, gas::CubicForm form,
                                                  const gas::Library &library, Warnings &warnings);

    [[nodiscard]] Outcome<std::string> name(std::string_view typed) const override;
    [[nodiscard]] Outcome<double> molarMass(std::string_view name) const override;
    [[nodiscard]] bool isOwn(std::string_view typed) const override;

    /// By its name. Fails with Reason::missing at the user's own gas where something is stated nowhere, unknownName.
    [[nodiscard]] Outcome<gas::CubicComponent> component(const std::string &name) const;
    /// The user's own by name.
    [[nodiscard]] const std::map<std::string, OwnGas> &own() const { return m_own; }

private:
    CubicGases(gas::CubicForm form, const gas::Library &library) : m_form(form), m_library(&library) {}

    [[nodiscard]] Outcome<gas::CubicComponent> stated(const std::string &name, const OwnGas &own) const;

    gas::CubicForm m_form;
    const gas::Library *m_library;
    std::map<std::string, OwnGas> m_own;
};

} // namespace quasistat::document
