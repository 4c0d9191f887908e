#pragma once
// Segments between two equilibrium states without equilibrium between: constant external pressure, stepped, free
// expansion.

#include "core/path/input.h"
#include "core/path/resolved_segment.h"
#include "core/path/result.h"

namespace quasistat::path
{

/// The segment with work, heat, entropy generated, reversible limit, audit and drawing. Precondition: an irreversible
/// kind.
[[nodiscard]] Outcome<SegmentResult> irreversible(const gas::State &from, const ResolvedSegment &segment,
                                                  const Surroundings &surroundings);

} // namespace quasistat::path
