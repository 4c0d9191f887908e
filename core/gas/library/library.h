#pragma once
// The gases this version can compute with: built from the data files of resources/gases.

#include "core/gas/gas.h"

#include <filesystem>
#include <map>
#include <vector>

namespace quasistat::gas
{

/// A perfect gas: p v = R T, constant c_p = γ R/(γ − 1). Exact SI gas constant.
struct PerfectGas {
    double heatCapacityRatio; ///< γ > 1
    double molarMass;         ///< [kg/mol] > 0
    std::string name;         ///< may be empty
};
[[nodiscard]] Outcome<GasPtr> perfectGas(const PerfectGas &parameters);

/// One component the ideal-gas model knows, as `quasistat gases` lists it.
struct ComponentFacts {
    std::string name;    ///< "carbon dioxide"
    std::string formula; ///< "CO2"
    double molarMass;    ///< [kg/mol]
    Range range;
};

/// The published ideal-gas polynomials, read once; then const and shared.
class Library
{
public:
    /// Reads the data compiled into the program (resources/gases).
    Library();
    ~Library();
    Library(const Library &) = delete;
    Library &operator=(const Library &) = delete;

    [[nodiscard]] const std::vector<ComponentFacts> &idealComponents() const;
    /// "N2", "nitrogen" → "nitrogen". Fails with Reason::unknownName naming what is near.
    [[nodiscard]] Outcome<std::string> componentName(std::string_view nameOrFormula) const;
    /// Molar mass [kg/mol] of a component by its canonical name. Fails as above.
    [[nodiscard]] Outcome<double> molarMass(std::string_view component) const;
    /// Ideal-gas mixture; fractions > 0 that sum to 1 within rounding. `name` as shown ("air"), may be empty.
    [[nodiscard]] Outcome<GasPtr> idealGas(const Composition &composition, std::string name) const;

private:
    /// “there is no gas named …”, with the names near it.
    [[nodiscard]] Failure unknown(std::string_view name) const;

    struct Data;
    std::unique_ptr<const Data> m_data;
};

} // namespace quasistat::gas
