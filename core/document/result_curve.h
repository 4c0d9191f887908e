#pragma once
// A quasi-static segment as a table of states, for recomputation by others.

#include "core/document/design.h"
#include "core/path/quasi_static_curve.h"

namespace quasistat::document
{

/// {volume, pressure, temperature, entropy}, `points` ≥ 2 values each [SI, whole charge], both ends included; even in
/// ln V, on an isochore in p. Null where a state on the way leaves the model.
[[nodiscard]] Json curveJson(const path::QuasiStaticCurve &curve, int points);

} // namespace quasistat::document
