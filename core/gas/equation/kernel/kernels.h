#pragma once
// The innermost loops, compiled for any x86-64 and again for processors with wider vectors; the program takes the best
// its processor has. Results differ between families in the last bits only, and never between runs on one machine.

#include "core/gas/equation/compiled_ideal.h"
#include "core/gas/equation/compiled_terms.h"
#include "core/gas/equation/residual.h"

#include <string_view>
#include <vector>

namespace quasistat::gas
{

/// Arguments, results and preconditions as those of Residual's functions.
struct Kernels {
    std::string_view family; ///< "x86-64", "AVX2", "AVX-512"
    Alpha (*at)(const CompiledTerms &, double temperature, double density);
    void (*atTemperature)(const CompiledTerms &, double temperature, bool temperatureDerivatives, Isotherm &);
    Alpha (*onIsotherm)(const CompiledTerms &, const Isotherm &, double density);
    DensityDerivatives (*densityDerivatives)(const CompiledTerms &, const Isotherm &, double density);
    void (*atEach)(const CompiledTerms &, std::span<const double> temperatures, std::span<const double> densities,
                   std::span<Alpha> results);
    IdealSums (*idealAt)(const CompiledIdeal &, double tau);
};

/// Those of the best family that this processor has.
[[nodiscard]] const Kernels &kernels();
/// Every family this processor has, the plainest first: for tests.
[[nodiscard]] std::vector<Kernels> allKernels();

} // namespace quasistat::gas
