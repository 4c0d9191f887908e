#pragma once
// Everything drawn on the diagram, in pixels: made once for a snapshot, a view and a size; painting only walks through
// it.

#include "core/analysis/phase_lines.h"
#include "ui/canvas/diagram_style.h"
#include "ui/canvas/label_placement.h"
#include "ui/canvas/plane.h"
#include "ui/look/rich_text.h"
#include "ui/session/session.h"

#include <QFont>
#include <QLineF>
#include <QList>
#include <QPainterPath>
#include <QPolygonF>

namespace quasistat::ui
{

struct AxisTick {
    double place; ///< x or y [px]
    QString text; ///< empty where the axis symbol or nothing stands
};

struct AxisScene {
    QList<AxisTick> volume;
    QList<AxisTick> pressure;
    RichText volumeTitle;
    RichText pressureTitle;
};

/// One segment as drawn.
struct SegmentScene {
    int index = 0; ///< from 0
    path::Kind kind = path::Kind::isothermal;
    QList<QPolygonF> line; ///< dashed over its spine; cut to the plot
    QList<QLineF> drops;   ///< dotted: from a state to a level that it does not lie on
    QPolygonF head;        ///< arrow in the direction of the path; empty where there is no room
    QPolygonF area;        ///< under the work line, its area the work; empty where it is none
    QPainterPath fill;     ///< the area without the net area of a closed path
    bool workIn = false;
    QList<QLineF> dots;       ///< rows of dots in the fill of work leaving, for print
    QList<QPolygonF> outline; ///< dashed: the drawn curve's own area, where it is not the work
    QList<QPolygonF> limit;   ///< ghost of the reversible limit
    QList<QLineF> hatch;      ///< the shortfall against it
};

struct HandleScene {
    QPointF centre;
    QList<int> states; ///< numbers from 1 of the states that lie here
};

/// A label on the boundary of the envelope, in a gap of its line.
struct BoundaryLabel {
    QPointF centre;
    double angle; ///< [degree], clockwise
    QRectF plate; ///< around the origin, before rotation
    RichText text;
};

struct BoundaryScene {
    QPainterPath forbidden;
    QList<QPolygonF> lines;
    QList<QLineF> ticks;
    QList<BoundaryLabel> labels;
    QList<QPolygonF> violated;
};

/// A line of equal vapour fraction, cut to the plot.
struct FractionLine {
    QPolygonF line;
    double vapourFraction;
};
/// A figure that stands on its line, or the name of the critical point.
struct PhaseLabel {
    QRectF plate;
    QString text;
};

/// The phase boundary as far as it comes into the plot.
struct PhaseScene {
    QPolygonF inside;          ///< of the dome
    QList<QPolygonF> boundary; ///< saturated vapour and liquid, or the dew line of a mixture
    bool isDewLine = false;
    QList<FractionLine> fractions;
    QList<PhaseLabel> labels;
    std::optional<QPointF> critical;
};

/// Where a segment meets the phase boundary.
struct CrossingScene {
    QPointF centre;
    int segment = 0; ///< from 0
    bool entersTwoPhase = true;
    double pressure = 0.0; ///< [Pa]
};

struct LabelLine {
    RichText text;
    QString figure; ///< at the right end of the plate
    QFont font;
    double opacity = 1.0;
};

struct LabelScene {
    QList<int> numbers; ///< state numbers in discs, joined by "="
    QList<LabelLine> lines;
    QColor colour;
    double plateOpacity = 0.86;
    QRectF plate;
    std::optional<QLineF> leader;
    bool dotted = false; ///< the leader ends in a dot on its thing
    int shortLines = -1; ///< lines that the shorter form keeps; −1: it has none
};

struct Scene {
    Plane plane;
    AxisScene axes;
    QList<SegmentScene> segments;
    QPolygonF netArea;
    QList<QLineF> netDots;
    bool netWorkIn = false;
    QList<HandleScene> handles;
    PhaseScene phase;
    QList<CrossingScene> crossings;
    BoundaryScene boundary;
    QList<LabelScene> labels;
    QString sentence; ///< why there is nothing to draw

    /// The handle within `reach` pixels of `point`, the nearest; −1: none.
    [[nodiscard]] int handleAt(QPointF point, double reach) const;
    /// Index of the segment whose line passes within `reach` pixels of `point`, the nearest; −1: none.
    [[nodiscard]] int segmentAt(QPointF point, double reach) const;
};

/// The scene of `snapshot` on `plane` with axes ticked as given; `phases`: the boundary of its gas, or null. Evaluates
/// nothing.
[[nodiscard]] Scene sceneOf(const Snapshot &snapshot, const Plane &plane, const AxisScene &axes,
                            const DiagramStyle &style, const analysis::PhaseLines *phases = nullptr);

} // namespace quasistat::ui
