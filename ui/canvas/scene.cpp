#include "ui/canvas/scene.h"

#include "core/units/display.h"
#include "ui/canvas/boundary_scene.h"
#include "ui/canvas/labels.h"
#include "ui/canvas/phase_scene.h"
#include "ui/canvas/pixel_geometry.h"
#include "ui/canvas/segment_scenes.h"

namespace quasistat::ui
{

namespace
{

// Where a state's label is likely to stand: nothing else should be put there first.
QPolygonF roomOf(const HandleScene &handle)
{
    constexpr double width = 44.0;
    constexpr double height = 16.0;
    const QPointF c = handle.centre;
    return {{c.x() - width, c.y() - height},
            {c.x() + width, c.y() + height},
            c,
            {c.x() - width, c.y() + height},
            {c.x() + width, c.y() - height}};
}

} // namespace

int Scene::handleAt(QPointF point, double reach) const
{
    int found = -1;
    for (qsizetype i = 0; i < handles.size(); ++i) {
        const double distance = QLineF(handles.at(i).centre, point).length();
        if (distance > reach) continue;
        reach = distance;
        found = static_cast<int>(i);
    }
    return found;
}

int Scene::segmentAt(QPointF point, double reach) const
{
    int found = -1;
    const auto consider = [&](const QPolygonF &line, int index) {
        const QRectF near = line.boundingRect().adjusted(-reach, -reach, reach, reach);
        if (!near.contains(point)) return;
        const double distance = distanceTo(line, point);
        if (distance >= reach) return;
        reach = distance;
        found = index;
    };
    for (const auto &segment : segments) {
        for (const auto &piece : segment.line) consider(piece, segment.index);
        for (const auto &drop : segment.drops) consider({drop.p1(), drop.p2()}, segment.index);
    }
    return found;
}

Scene sceneOf(const Snapshot &snapshot, const Plane &plane, const AxisScene &axes, const DiagramStyle &style,
              const analysis::PhaseLines *phases)
{
    Scene scene;
    scene.plane = plane;
    scene.axes = axes;
    if (snapshot.failure)
        scene.sentence = QString::fromStdString(units::sentence(snapshot.failure->message, snapshot.units));
    if (!snapshot.evaluation) return scene;
    const path::PathResult &path = snapshot.evaluation->path;
    if (path.startFailure)
        scene.sentence = QString::fromStdString(units::sentence(path.startFailure->message, snapshot.units));
    scene.segments = segmentScenes(path, plane, style);
    addNetArea(scene, path, style);
    scene.handles = handleScenes(path, plane);
    if (phases) scene.phase = phaseScene(*phases, plane);
    scene.crossings = crossingScenes(path, plane);
    QList<LooseLabel> beside;
    std::vector<QPolygonF> avoid = linesOf(scene);
    for (const auto &handle : scene.handles) avoid.push_back(roomOf(handle));
    scene.boundary = boundaryScene(snapshot, plane, style, avoid, beside);
    addCriticalLabel(scene, style);
    addLabels(scene, snapshot, style, beside);
    addFractionLabels(scene, style);
    return scene;
}

} // namespace quasistat::ui
