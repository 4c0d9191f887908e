#pragma once
// Gases that many tests use.

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

struct NamedGas {
    const char *name;
    gas::GasPtr gas;
};

/// One gas of every kind the program computes with.
inline std::vector<NamedGas> everyGas()
{
    return {{"perfect, γ 1.4", perfect()},
            {"perfect, γ 5/3", perfect(5.0 / 3.0, 0.004)},
            {"ideal air", idealAir()},
            {"ideal carbon dioxide", ideal({{"carbon dioxide", 1.0}})},
            {"ideal helium", ideal({{"helium", 1.0}})},
            {"ideal methane, hydrogen", ideal({{"hydrogen", 0.4}, {"methane", 0.6}})}};
}

} // namespace quasistat::test
