#pragma once
// The p–V diagram: draws a snapshot at any size, in the window and on paper. Knows no session and no gesture.

#include "ui/canvas/phase_scene.h"
#include "ui/canvas/scene.h"
#include "ui/canvas/strata.h"
#include "ui/canvas/ticks.h"

#include <qcustomplot.h>

namespace quasistat::ui
{

/// Layers, ranges and ticks are QCustomPlot's; every layer paints from one Scene that is prepared when snapshot, view,
/// size or style have changed, never while painting.
class Diagram : public QCustomPlot
{
    Q_OBJECT
public:
    explicit Diagram(DiagramStyle style, QWidget *parent = nullptr);

    void setStyle(DiagramStyle style);
    [[nodiscard]] const DiagramStyle &style() const { return m_style; }
    void show(SnapshotPtr snapshot);
    void setEmphasis(Emphasis emphasis); ///< redraws the one layer that shows it
    /// Keeps `pixels` at the lower edge free: what lies over the diagram there.
    void setInset(int pixels);

    [[nodiscard]] const View &view() const { return m_view; }
    void setView(const View &view);
    /// The whole path with room for its labels; keeps the view where there is no path.
    void zoomToPath();
    /// Scales the view by `factor` (below 1: closer) about a pixel.
    void zoom(double factor, QPointF about);
    void pan(QPointF pixels);
    /// True if a state of the path lies outside the view, or the view is much wider than the path needs.
    [[nodiscard]] bool needsFit() const;

    [[nodiscard]] const Scene &scene() const { return m_scene; }
    [[nodiscard]] const Plane &plane() const { return m_scene.plane; }
    /// Repaints now what has changed.
    void refresh();
    /// Draws everything to `painter`, the diagram's upper left corner at its origin, at the diagram's own size.
    void paintTo(QPainter &painter) const;

protected:
    void resizeEvent(QResizeEvent *event) override;

private:
    void createLayers();
    void prepare();
    [[nodiscard]] QRectF plotRect() const;
    [[nodiscard]] AxisScene axisScene(const Plane &plane);

    DiagramStyle m_style;
    SnapshotPtr m_snapshot;
    Emphasis m_emphasis;
    View m_view;
    int m_inset = 0;
    PhaseCache m_phases;
    Scene m_scene;
    QSharedPointer<EngineeringTicker> m_volumeTicker;
    QSharedPointer<EngineeringTicker> m_pressureTicker;
};

} // namespace quasistat::ui
