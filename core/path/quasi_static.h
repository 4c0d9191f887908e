#pragma once
// Segments that follow a law through equilibrium states: isothermal, isobaric, isochoric, polytropic, isentropic,
// linear.

#include "core/path/resolved_segment.h"
#include "core/path/result.h"

namespace quasistat::path
{

/// Law and end of a quasi-static segment, before anything is integrated.
struct Course {
    Law law;
    double endCoordinate;
    gas::MolarState end;
    std::optional<double> exponent; ///< polytropic: as given or from the two states; none at constant volume
    std::vector<Message> remarks;
};
[[nodiscard]] Outcome<Course> courseOf(const gas::State &from, const ResolvedSegment &segment);

/// The segment with work, heat, extrema, heat exchange, audit, drawing and curve; figures that need the surroundings
/// are left to completed(). Precondition: a quasi-static kind.
[[nodiscard]] Outcome<SegmentResult> quasiStatic(const gas::State &from, const ResolvedSegment &segment);

/// Work [J] and end of `law` from `from`, without heat and drawing: for reversible limits.
[[nodiscard]] Outcome<double> workAlong(const gas::State &from, const Law &law, double endCoordinate);

} // namespace quasistat::path
