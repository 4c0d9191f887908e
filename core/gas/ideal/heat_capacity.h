#pragma once
// Ideal-gas heat capacity as a piecewise polynomial of temperature, with its integrals h and s° joined at the seams.

#include "core/gas/ideal/ideal_function.h"

#include <vector>

namespace quasistat::gas
{

/// c_p/R = a₀ + a₁T + a₂T² + … between two temperatures, with as many powers as its source has; h/R and s°/R are its
/// integrals ∫c_p dT and ∫c_p/T dT plus a constant each.
struct HeatCapacityPiece {
    double from;                   ///< [K]
    double to;                     ///< [K]
    std::vector<double> a;         ///< [1/Kᵏ], at least one
    double enthalpyConstant = 0.0; ///< [K]
    double entropyConstant = 0.0;
};

class HeatCapacity final : public IdealFunction
{
public:
    /// Pieces that follow each other without gaps, ascending; the integration constants are set here so that h and s°
    /// are continuous over every seam and zero at 298.15 K.
    explicit HeatCapacity(std::vector<HeatCapacityPiece> pieces);

    /// Beyond the first and the last piece their polynomial goes on; whoever calls keeps to the range.
    [[nodiscard]] IdealProperties at(double temperature) const override;
    [[nodiscard]] const std::vector<HeatCapacityPiece> &pieces() const { return m_pieces; }
    /// Temperatures between pieces [K].
    [[nodiscard]] std::span<const double> seams() const override { return m_seams; }

private:
    [[nodiscard]] const HeatCapacityPiece &pieceAt(double temperature) const;

    std::vector<HeatCapacityPiece> m_pieces;
    std::vector<double> m_seams;
};

/// Σ xᵢ c_p,i of components with mole fractions `weights`: the pieces of all, cut at every seam of any.
[[nodiscard]] HeatCapacity weightedSum(const std::vector<const HeatCapacity *> &components,
                                       const std::vector<double> &weights);

} // namespace quasistat::gas
