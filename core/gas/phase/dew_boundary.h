#pragma once
// Where a mixture parts into two phases, by the fugacities of its own equation.

#include "core/gas/phase/fugacity.h"
#include "core/gas/phase/phase_boundary.h"

#include <memory>
#include <mutex>
#include <vector>

namespace quasistat::gas
{

class BoundaryTrace;

/// On each isochore the highest temperature at which the homogeneous fluid is only just stable against the first trace
/// of another phase: a liquid below the critical density, a vapour above it. Any number of components, one included.
///
/// Traced at first use, at once for all densities: about a millisecond for a cubic equation, some tens for GERG-2008.
/// It begins with every liquid that the thin mixture can form and with the bubble of the cold liquid; where one branch
/// ends because another phase takes over, that is looked for and followed too; the hottest branch counts. Where none
/// can be followed further (an equation outside its range, liquids of hydrogen and helium that close at no density) the
/// boundary ends, and beyond that density it knows of no second phase. Of 2400 random mixtures by both cubic equations
/// four ended so, all of them denser than 1/(2b).
class DewBoundary final : public PhaseBoundary
{
public:
    /// `fractions` > 0, sum 1. `lowestTemperature` [K] of the model: the boundary is not followed below it.
    DewBoundary(std::shared_ptr<const Fugacities> fugacities, std::vector<double> fractions, double lowestTemperature);
    ~DewBoundary() override;

    [[nodiscard]] double temperatureNear(double molarVolume) const override;
    [[nodiscard]] double temperatureAt(double molarVolume) const override;
    [[nodiscard]] double highestTemperature() const override;

    /// Molar volumes [m³/mol] between which the boundary is known; 0 and 0 where there is none.
    struct Volumes {
        double smallest;
        double greatest;
    };
    [[nodiscard]] Volumes knownVolumes() const;

private:
    struct Table;
    [[nodiscard]] const Table &table() const;

    std::shared_ptr<const Fugacities> m_fugacities;
    std::vector<double> m_fractions;
    double m_lowestTemperature;
    mutable std::once_flag m_isTraced;
    mutable std::unique_ptr<const Table> m_table;
};

} // namespace quasistat::gas
