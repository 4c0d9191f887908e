#pragma once
// Points of a curve for drawing: as many as its bends need, in every plane it may be drawn in.

#include "core/path/result.h"

namespace quasistat::path
{

/// Points from the start to the end of `curve`, ends included. Between neighbours the curve stays within 1/4000 of its
/// own extent of the chord, in p–V, log p–log V and T–S. Points stop where the curve leaves the model.
[[nodiscard]] Polyline sampled(const QuasiStaticCurve &curve);

/// A drawn point of a charge.
[[nodiscard]] CurvePoint curvePoint(const gas::State &state);

/// The even samples of `compute --curves N`: even in ln V, on a curve of constant volume in p. count ≥ 2.
[[nodiscard]] Outcome<Polyline> evenSamples(const QuasiStaticCurve &curve, int count);

} // namespace quasistat::path
