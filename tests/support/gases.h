#pragma once
// Gases that many tests use.

#include "core/gas/library/cubic_gas.h"
#include "core/gas/library/library.h"

#include <gtest/gtest.h>

namespace quasistat::test
{

inline const gas::Library &library()
{
    static const gas::Library theLibrary;
    return theLibrary;
}

inline gas::GasPtr perfect(double gamma = 1.4, double molarMass = 0.02896)
{
    return *gas::perfectGas({gamma, molarMass, ""});
}

inline gas::GasPtr ideal(const gas::Composition &composition)
{
    return *library().idealGas(composition, "");
}

/// Dry air of the data file (`simple_3`): composition of the air model of Lemmon et al. 2000.
inline gas::GasPtr idealAir()
{
    return ideal({{"argon", 0.0092}, {"nitrogen", 0.7812}, {"oxygen", 0.2096}});
}

inline gas::GasPtr reference(std::string_view fluid)
{
    return *library().reference(fluid);
}

inline gas::GasPtr gerg(const gas::Composition &composition)
{
    return *library().gerg2008(composition, "");
}

/// By a cubic equation without binary interaction.
inline gas::GasPtr cubic(gas::CubicForm form, const gas::Composition &composition)
{
    gas::CubicRequest request{.form = form, .components = {}, .fractions = {}, .interaction = {}, .name = ""};
    for (const gas::Share &share : composition) {
        request.components.push_back(gas::cubicComponent(**library().data(share.component)));
        request.fractions.push_back(share.moleFraction);
    }
    request.interaction.assign(composition.size() * composition.size(), 0.0);
    return *gas::cubicGas(std::move(request));
}

struct NamedGas {
    const char *name;
    gas::GasPtr gas;
};

/// Ideal gases of every kind.
inline std::vector<NamedGas> everyIdealGas()
{
    return {{"perfect, γ 1.4", perfect()},
            {"perfect, γ 5/3", perfect(5.0 / 3.0, 0.004)},
            {"ideal air", idealAir()},
            {"ideal carbon dioxide", ideal({{"carbon dioxide", 1.0}})},
            {"ideal helium", ideal({{"helium", 1.0}})},
            {"ideal methane, hydrogen", ideal({{"hydrogen", 0.4}, {"methane", 0.6}})}};
}

/// Real gases of every kind: with and without two-phase states, with every kind of term.
inline std::vector<NamedGas> everyRealGas()
{
    using Form = gas::CubicForm;
    static const std::vector<NamedGas> gases{
        {"nitrogen, reference", reference("nitrogen")},
        {"carbon dioxide, reference", reference("carbon dioxide")},
        {"water, reference", reference("water")},
        {"ammonia, reference", reference("ammonia")},
        {"hydrogen, reference", reference("hydrogen")},
        {"air, reference", reference("air")},
        {"air, GERG-2008", gerg({{"argon", 0.0092}, {"nitrogen", 0.7812}, {"oxygen", 0.2096}})},
        {"natural gas, GERG-2008",
         gerg({{"carbon dioxide", 0.02}, {"ethane", 0.06}, {"methane", 0.89}, {"nitrogen", 0.02}, {"propane", 0.01}})},
        {"nitrogen, Peng–Robinson", cubic(Form::pengRobinson, {{"nitrogen", 1.0}})},
        {"methane, carbon dioxide, Peng–Robinson",
         cubic(Form::pengRobinson, {{"carbon dioxide", 0.3}, {"methane", 0.7}})},
        {"argon, oxygen, Soave–Redlich–Kwong", cubic(Form::soaveRedlichKwong, {{"argon", 0.5}, {"oxygen", 0.5}})}};
    return gases;
}

/// One gas of every kind the program computes with.
inline std::vector<NamedGas> everyGas()
{
    std::vector<NamedGas> all = everyIdealGas();
    for (const NamedGas &gas : everyRealGas()) all.push_back(gas);
    return all;
}

} // namespace quasistat::test
