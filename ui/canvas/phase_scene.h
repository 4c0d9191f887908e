#pragma once
// The phase boundary on the diagram: the dome with its inside, lines of equal vapour fraction, the critical point.

#include "ui/canvas/scene.h"

#include <string>

namespace quasistat::ui
{

/// The boundary of the gas that a snapshot's path begins with; computed once for each gas, since a charge of another
/// amount has the same lines at other volumes.
class PhaseCache
{
public:
    /// Volumes are those of the snapshot's first state. Null where there is no boundary.
    [[nodiscard]] const analysis::PhaseLines *linesFor(const Snapshot &snapshot);

private:
    std::string m_gas; ///< as the document has it
    analysis::PhaseLines m_perMole;
    analysis::PhaseLines m_lines;
    double m_amount = 0.0;
};

/// What of `lines` comes into the plot; empty where nothing does.
[[nodiscard]] PhaseScene phaseScene(const analysis::PhaseLines &lines, const Plane &plane);

/// Marks where segments meet the boundary.
[[nodiscard]] QList<CrossingScene> crossingScenes(const path::PathResult &path, const Plane &plane);

/// Names the critical point above the dome if nothing drawn is there; the other labels then keep clear of it.
void addCriticalLabel(Scene &scene, const DiagramStyle &style);
/// Writes the vapour fraction on its lines where nothing else stands. All other labels of `scene` are placed.
void addFractionLabels(Scene &scene, const DiagramStyle &style);

} // namespace quasistat::ui
