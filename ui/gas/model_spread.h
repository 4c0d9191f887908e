#pragma once
// How far two answers lie apart: a real gas from its ideal part, one model from another. In words; no thermodynamics.

#include "ui/look/rich_text.h"
#include "ui/session/session.h"

namespace quasistat::ui
{

/// Difference of `other` from `value` in percent of `value`, larger of either sign +: "+1.3 %"; "–" where `value` is
/// nothing beside `scale`.
[[nodiscard]] QString percentOff(double other, double value, double scale);
/// Difference of two temperatures [K], with its sign, in K or °F: "+3.2 K".
[[nodiscard]] QString degreesOff(double other, double value, const units::DisplayUnits &units);

/// "Reference equation instead of ideal gas: W 8.41 → 8.36 kJ (−0.6 %), …" for the step from `before` to `now`.
[[nodiscard]] RichText modelChangeWords(const Snapshot &before, const Snapshot &now);

/// True if the path has a figure of the ideal part beside a real one.
[[nodiscard]] bool hasSpread(const path::PathResult &path);

} // namespace quasistat::ui
