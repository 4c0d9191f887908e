#pragma once
// The gases this version can compute with: built from the data files of resources/gases.

#include "core/gas/gas.h"
#include "core/gas/library/component_facts.h"
#include "core/gas/library/recent_gases.h"

#include <memory>
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

/// Gases by name and what each model makes of them. Data are read when first asked for, then kept; any thread may ask.
/// `model` is a key of the document that is built from gases: one of modelsOfGases().
class Library
{
public:
    Library();
    ~Library();
    Library(const Library &) = delete;
    Library &operator=(const Library &) = delete;

    /// The gases of a model, by name. Reads every file.
    [[nodiscard]] std::vector<ComponentFacts> components(std::string_view model) const;

    /// "N2", "Nitrogen", "R134a" → the gas's name, whatever models have it. Of several gases with one formula those
    /// that have an ideal part count. Fails with Reason::unknownName naming what is near, Reason::ambiguous.
    [[nodiscard]] Outcome<std::string> componentName(std::string_view nameFormulaOrAlias) const;
    /// The same among the gases of `model`. A gas that the model does not have: Reason::unknownName, with the models
    /// that have it.
    [[nodiscard]] Outcome<std::string> componentName(std::string_view nameFormulaOrAlias, std::string_view model) const;
    /// Molar mass [kg/mol] of a component by its name, as `model` has it. Fails as above.
    [[nodiscard]] Outcome<double> molarMass(std::string_view component, std::string_view model) const;
    /// All that is published of a gas, by its name, for `model`. Fails as above.
    [[nodiscard]] Outcome<std::shared_ptr<const GasData>> data(std::string_view component,
                                                               std::string_view model) const;
    /// All that is published of a gas, whatever models have it. Fails with Reason::unknownName.
    [[nodiscard]] Outcome<std::shared_ptr<const GasData>> data(std::string_view component) const;

    /// Ideal-gas mixture; fractions > 0 that sum to 1 within rounding. `name` as shown ("air"), may be empty.
    [[nodiscard]] Outcome<GasPtr> idealGas(const Composition &composition, std::string name) const;
    /// The same as a real mixture of its components among the 21 of GERG-2008.
    [[nodiscard]] Outcome<GasPtr> gerg2008(const Composition &composition, std::string name) const;
    /// The components of a mixture with all parameters between them, in its order.
    [[nodiscard]] Outcome<GergMixture> gergMixture(const Composition &composition) const;
    /// A single gas by its own published equation; `fluid` is its name.
    [[nodiscard]] Outcome<GasPtr> reference(std::string_view fluid) const;

    /// The gas last made from this description (the text of a document's "gas"), if it is still known: what a gas finds
    /// out about itself at first use, such as its phase boundary, is then not found out again at every change of a
    /// path.
    [[nodiscard]] std::optional<RecentGas> recalled(const std::string &description) const;
    void remember(const std::string &description, RecentGas gas) const;

private:
    /// “there is no gas named …”, with the names near it among those of `model` (of all, if that is empty).
    [[nodiscard]] Failure unknown(std::string_view name, std::string_view model) const;
    /// A gas there is, but not in `model`: which models have it.
    [[nodiscard]] Failure elsewhere(const GasData &data, std::string_view model) const;
    /// Every gas, or every gas of `model`.
    [[nodiscard]] std::vector<std::shared_ptr<const GasData>> gases(std::string_view model) const;

    std::unique_ptr<GasStore> m_store;
    std::unique_ptr<RecentGases> m_recent;
};

} // namespace quasistat::gas
