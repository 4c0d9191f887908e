#pragma once
// The envelope on the diagram: its boundary with ticks and labels, the forbidden side, the stretches that violate it.

#include "ui/canvas/scene.h"

namespace quasistat::ui
{

/// `avoid`: lines that a label on the boundary should keep clear of. A stretch too short for its label has it in
/// `beside`, to be placed like any other.
struct LooseLabel {
    QPointF anchor;
    RichText text;
};
[[nodiscard]] BoundaryScene boundaryScene(const Snapshot &snapshot, const Plane &plane, const DiagramStyle &style,
                                          const std::vector<QPolygonF> &avoid, QList<LooseLabel> &beside);

} // namespace quasistat::ui
