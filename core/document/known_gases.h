#pragma once
// The gases that the names in a composition may mean.

#include "core/gas/library/library.h"

#include <string>
#include <string_view>

namespace quasistat::document
{

class KnownGases
{
public:
    virtual ~KnownGases() = default;
    /// "N2", "Nitrogen" → "nitrogen". Fails with Reason::unknownName or ambiguous.
    [[nodiscard]] virtual Outcome<std::string> name(std::string_view typed) const = 0;
    /// Molar mass [kg/mol] of a gas by its name. Fails with Reason::unknownName.
    [[nodiscard]] virtual Outcome<double> molarMass(std::string_view name) const = 0;
    /// Whether `typed` means a gas of its own even where it is “air”, which else stands for its parts.
    [[nodiscard]] virtual bool isOwn(std::string_view typed) const = 0;
};

/// The gases of one model, as the library has them.
class LibraryGases final : public KnownGases
{
public:
    /// `library` and `model` outlive this.
    LibraryGases(const gas::Library &library, std::string_view model) : m_library(library), m_model(model) {}

    [[nodiscard]] Outcome<std::string> name(std::string_view typed) const override
    {
        return m_library.componentName(typed, m_model);
    }
    [[nodiscard]] Outcome<double> molarMass(std::string_view name) const override
    {
        return m_library.molarMass(name, m_model);
    }
    [[nodiscard]] bool isOwn(std::string_view) const override { return false; }

private:
    const gas::Library &m_library;
    std::string_view m_model;
};

} // namespace quasistat::document
