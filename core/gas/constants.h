#pragma once
// Constants of nature and of the common reference state, each written once.

namespace quasistat::gas
{

/// Molar gas constant [J/(mol K)], exact. Source: SI Brochure, 9th ed. (2019): k · N_A.
inline constexpr double molarGasConstant = 8.31446261815324;

/// Common reference state of all models: each component as ideal gas here has h = 0 and s = 0.
inline constexpr double referenceTemperature = 298.15; ///< [K]
inline constexpr double referencePressure = 100000.0;  ///< [Pa]

} // namespace quasistat::gas
