#pragma once
// Whether a segment comes to the very state it is told to arrive at.

#include "core/path/resolved_segment.h"

namespace quasistat::path
{

/// Fails with Reason::unreachable, naming the mismatch, unless `reached` is state `number` within 1e-6 in p, V and T.
struct Arrived {
};
[[nodiscard]] Outcome<Arrived> arrived(const gas::MolarState &reached, const gas::State &from, const gas::State &wanted,
                                       int number);

} // namespace quasistat::path
