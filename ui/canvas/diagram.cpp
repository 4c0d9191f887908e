#include "ui/canvas/diagram.h"

#include "core/units/display.h"
#include "ui/canvas/fitted_view.h"

#include <algorithm>

namespace quasistat::ui
{
namespace
{

constexpr double volumeTickSpacing = 150.0; // [px]
constexpr double pressureTickSpacing = 90.0;
constexpr double deepestZoom = 1e-5; // of the largest value shown

/// One stratum of the diagram on its QCustomPlot layer.
class StratumLayer : public QCPLayerable
{
public:
    using Paint = std::function<void(QPainter &)>;
    StratumLayer(QCustomPlot *plot, const QString &layer, Paint paint)
        : QCPLayerable(plot, layer), m_paint(std::move(paint))
    {
    }

protected:
    void applyDefaultAntialiasingHint(QCPPainter *painter) const override { painter->setAntialiasing(false); }
    void draw(QCPPainter *painter) override
    {
        // Through QPainter: QCPPainter would move lines by half a pixel, but the scene is exact already.
        m_paint(*painter);
    }

private:
    Paint m_paint;
};

QCPRange inUnit(const path::Interval &interval, const units::Scale &scale)
{
    return {interval.lowest * scale.factor + scale.offset, interval.highest * scale.factor + scale.offset};
}

units::Scale axisScale(units::Quantity quantity, const path::Interval &interval, const units::DisplayUnits &units)
{
    return units::scaleFor(quantity, std::array{interval.highest}, units);
}

RichText axisTitle(QChar symbol, const units::Scale &scale)
{
    return RichText::marked(QStringLiteral("<i>%1</i> / ").arg(symbol)) +
           RichText::plain(QString::fromStdString(scale.unit));
}

path::Interval moved(const path::Interval &interval, double by)
{
    by = std::max(by, -interval.lowest); // nothing lies below zero
    return {interval.lowest + by, interval.highest + by};
}

path::Interval scaled(const path::Interval &interval, double factor, double about)
{
    const path::Interval result{std::max(0.0, about + (interval.lowest - about) * factor),
                                about + (interval.highest - about) * factor};
    const bool tooDeep = result.highest - result.lowest < deepestZoom * result.highest;
    return tooDeep ? interval : result;
}

bool contains(const path::Interval &interval, double value)
{
    const double slack = 1e-9 * (interval.highest - interval.lowest);
    return value >= interval.lowest - slack && value <= interval.highest + slack;
}

bool isLoose(const path::Interval &shown, const path::Interval &fitting)
{
    return fitting.highest - fitting.lowest < 0.6 * (shown.highest - shown.lowest);
}

} // namespace

Diagram::Diagram(DiagramStyle style, QWidget *parent)
    : QCustomPlot(parent), m_style(std::move(style)), m_volumeTicker(new EngineeringTicker),
      m_pressureTicker(new EngineeringTicker)
{
    setNoAntialiasingOnDrag(false);
    setBackground(QBrush(m_style.palette.ground));
    axisRect()->setAutoMargins(QCP::msNone);
    for (auto *axis : axisRect()->axes()) axis->setVisible(false);
    xAxis->grid()->setVisible(false);
    yAxis->grid()->setVisible(false);
    createLayers();
}

void Diagram::createLayers()
{
    int number = 0;
    for (const Stratum stratum : strata) {
        const QString name = QStringLiteral("stratum %1").arg(number++);
        addLayer(name);
        // What follows the pointer has a buffer of its own, and so has what lies above it.
        if (stratum == Stratum::emphasis) layer(name)->setMode(QCPLayer::lmBuffered);
        new StratumLayer(this, name, [this, stratum](QPainter &painter) {
            paint(stratum, painter, {m_scene, m_style, m_emphasis});
        });
    }
}

void Diagram::setStyle(DiagramStyle style)
{
    m_style = std::move(style);
    setBackground(QBrush(m_style.palette.ground));
    refresh();
}

void Diagram::show(SnapshotPtr snapshot)
{
    m_snapshot = std::move(snapshot);
    refresh();
}

void Diagram::setEmphasis(Emphasis emphasis)
{
    if (m_emphasis == emphasis) return;
    m_emphasis = emphasis;
    layer(QStringLiteral("stratum %1").arg(static_cast<int>(Stratum::emphasis)))->replot();
}

void Diagram::setInset(int pixels)
{
    if (m_inset == pixels) return;
    m_inset = pixels;
    refresh();
}

void Diagram::setView(const View &view)
{
    m_view = view;
    refresh();
}

void Diagram::zoomToPath()
{
    if (!m_snapshot || !m_snapshot->evaluation || m_snapshot->evaluation->path.states.empty()) return;
    setView(fittedView(*m_snapshot->evaluation, plotRect().size()));
}

void Diagram::zoom(double factor, QPointF about)
{
    setView({scaled(m_view.volume, factor, plane().volumeAt(about.x())),
             scaled(m_view.pressure, factor, plane().pressureAt(about.y()))});
}

void Diagram::pan(QPointF pixels)
{
    const auto metric = plane().metric();
    setView({moved(m_view.volume, -pixels.x() / metric.volumeScale),
             moved(m_view.pressure, pixels.y() / metric.pressureScale)});
}

bool Diagram::needsFit() const
{
    if (!m_snapshot || !m_snapshot->evaluation || m_snapshot->evaluation->path.states.empty()) return false;
    const View fitting = fittedView(*m_snapshot->evaluation, plotRect().size());
    if (isLoose(m_view.volume, fitting.volume) || isLoose(m_view.pressure, fitting.pressure)) return true;
    const auto &states = m_snapshot->evaluation->path.states;
    return std::any_of(states.begin(), states.end(), [this](const path::StateResult &state) {
        return !contains(m_view.volume, state.state.volume()) || !contains(m_view.pressure, state.state.pressure());
    });
}

void Diagram::refresh()
{
    prepare();
    replot(QCustomPlot::rpQueuedReplot);
}

QRectF Diagram::plotRect() const
{
    return QRectF(QPointF(), QSizeF(size()).expandedTo({160, 120}))
        .marginsRemoved(m_style.margins)
        .adjusted(0, 0, 0, -m_inset);
}

AxisScene Diagram::axisScene(const Plane &plane)
{
    const units::DisplayUnits units = m_snapshot ? m_snapshot->units : units::DisplayUnits{};
    const auto volume = axisScale(units::Quantity::volume, plane.view.volume, units);
    const auto pressure = axisScale(units::Quantity::pressure, plane.view.pressure, units);
    xAxis->setRange(inUnit(plane.view.volume, volume));
    yAxis->setRange(inUnit(plane.view.pressure, pressure));

    AxisScene axes;
    axes.volumeTitle = axisTitle(QLatin1Char('V'), volume);
    axes.pressureTitle = axisTitle(QLatin1Char('p'), pressure);
    for (const double place : m_volumeTicker->places(xAxis->range(), plane.rect.width(), volumeTickSpacing)) {
        const double x = plane.pixel((place - volume.offset) / volume.factor, 0.0).x();
        axes.volume.append({x, tickText(place, m_volumeTicker->decimals())});
    }
    for (const double place : m_pressureTicker->places(yAxis->range(), plane.rect.height(), pressureTickSpacing)) {
        const double y = plane.pixel(0.0, (place - pressure.offset) / pressure.factor).y();
        // The axis symbol stands in place of the topmost number.
        const bool underTitle = y < plane.rect.top() + 1.4 * m_style.labelPixels;
        axes.pressure.append({y, underTitle ? QString() : tickText(place, m_pressureTicker->decimals())});
    }
    return axes;
}

void Diagram::prepare()
{
    const Plane plane{plotRect(), m_view};
    const AxisScene axes = axisScene(plane);
    const SnapshotPtr snapshot = m_snapshot ? m_snapshot : std::make_shared<const Snapshot>();
    m_scene = sceneOf(*snapshot, plane, axes, m_style, m_phases.linesFor(*snapshot));
}

void Diagram::paintTo(QPainter &painter) const
{
    painter.fillRect(QRectF(QPointF(), QSizeF(size())), m_style.palette.ground);
    for (const Stratum stratum : strata) paint(stratum, painter, {m_scene, m_style, m_emphasis});
}

void Diagram::resizeEvent(QResizeEvent *event)
{
    QCustomPlot::resizeEvent(event);
    refresh();
}

} // namespace quasistat::ui
