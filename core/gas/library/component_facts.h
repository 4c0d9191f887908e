#pragma once
// What a model knows of a gas.

#include "core/gas/library/gas_store.h"

#include <optional>

namespace quasistat::gas
{

/// One gas of a model, as `quasistat gases` lists it.
struct ComponentFacts {
    std::string name;    ///< "carbon dioxide"
    std::string formula; ///< "CO2"
    double molarMass;    ///< [kg/mol] of the model's own source
    Range range;         ///< where the model holds; of a cubic equation: where its ideal part does
    Range hard;          ///< where it ends
    std::string source;
    std::string uncertainty; ///< published, in words; empty where none is known here
};

/// The models that are built from gases, by their keys in the document: "ideal", "peng-robinson", ….
[[nodiscard]] std::span<const std::string_view> modelsOfGases();

/// None where the model does not have the gas. A cubic equation has those with critical constants and an ideal part.
[[nodiscard]] std::optional<ComponentFacts> factsIn(std::string_view model, const GasData &data, GasStore &store);
/// Whether factsIn would give any; cheap.
[[nodiscard]] bool isIn(std::string_view model, const GasData &data);
/// Molar mass [kg/mol] the model computes with. Precondition: isIn().
[[nodiscard]] double molarMassIn(std::string_view model, const GasData &data);

} // namespace quasistat::gas
