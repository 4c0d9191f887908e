#pragma once
// Curves, areas, hatches and ghosts of the segments in pixels.

#include "ui/canvas/scene.h"

namespace quasistat::ui
{

/// One scene a computed segment, in path order.
[[nodiscard]] QList<SegmentScene> segmentScenes(const path::PathResult &path, const Plane &plane,
                                                const DiagramStyle &style);

/// Fills the net area of a closed path into `scene` if the area under every segment is its work; takes it out of the
/// segments' own fills, so that it stands out.
void addNetArea(Scene &scene, const path::PathResult &path, const DiagramStyle &style);

/// The states that are drawn, those that coincide joined.
[[nodiscard]] QList<HandleScene> handleScenes(const path::PathResult &path, const Plane &plane);

} // namespace quasistat::ui
