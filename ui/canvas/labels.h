#pragma once
// The labels of a diagram: what they say and where they stand.

#include "ui/canvas/boundary_scene.h"

namespace quasistat::ui
{

/// Composes and places every label of `scene`, whose segments, handles and boundary stand; `beside`: labels of
/// boundaries that found no room on their line.
void addLabels(Scene &scene, const Snapshot &snapshot, const DiagramStyle &style, const QList<LooseLabel> &beside);

/// Lines that labels keep clear of.
[[nodiscard]] std::vector<QPolygonF> linesOf(const Scene &scene);

} // namespace quasistat::ui
