#include "ui/canvas/labels.h"

#include "core/units/display.h"
#include "ui/canvas/label_box.h"
#include "ui/canvas/pixel_geometry.h"
#include "ui/look/figure_text.h"
#include "ui/look/type.h"

#include <QCoreApplication>
#include <QTransform>

#include <algorithm>
#include <cmath>

namespace quasistat::ui
{
namespace
{

constexpr double handleClearance = 12.0;
constexpr qsizetype mostNamedSegments = 24; // more names than this hide the path

QString tr(const char *text, const char *note = nullptr)
{
    return QCoreApplication::translate("Diagram", text, note);
}

QString utf8(const std::string &text)
{
    return QString::fromStdString(text);
}

QString withUnit(double value, const units::Scale &scale)
{
    return utf8(units::digits(value, scale)) + QChar(0x202F) + utf8(scale.unit);
}

LabelScene shortForm(const LabelScene &label)
{
    LabelScene result = label;
    result.lines.resize(std::min<qsizetype>(label.shortLines, label.lines.size()));
    return result;
}

// Labels with the requests for their places, in the order in which they choose.
struct Waiting {
    QList<LabelScene> labels;
    std::vector<LabelRequest> requests;
    /// `shortLines`: how many lines its shorter form keeps; −1: it has none.
    void add(LabelScene label, LabelRequest request, int shortLines = -1)
    {
        request.size = labelSize(label);
        label.shortLines = shortLines;
        if (shortLines >= 0) request.compact = labelSize(shortForm(label));
        labels.append(label);
        requests.push_back(std::move(request));
    }
};

class LabelMaker
{
public:
    LabelMaker(const Scene &scene, const Snapshot &snapshot, const DiagramStyle &style)
        : m_scene(scene), m_snapshot(snapshot), m_path(snapshot.evaluation->path), m_style(style),
          m_plain(style.font(style.labelPixels)), m_medium(style.font(style.labelPixels, QFont::Medium)),
          m_strong(style.font(style.labelPixels, QFont::DemiBold))
    {
        std::vector<double> energies;
        for (const auto &segment : m_path.segments) {
            energies.push_back(segment.work);
            energies.push_back(segment.heat);
        }
        m_energy = units::scaleFor(units::Quantity::energy, energies, snapshot.units);
    }

    [[nodiscard]] Waiting all(const QList<LooseLabel> &beside) const
    {
        Waiting waiting;
        addNet(waiting);
        addStates(waiting);
        addCrossings(waiting);
        for (const auto &label : beside) addBoundary(waiting, label);
        addFailure(waiting);
        if (m_style.isPrint()) addSegments(waiting);
        addLimits(waiting);
        addDewLine(waiting);
        return waiting;
    }

private:
    [[nodiscard]] LabelScene label() const
    {
        LabelScene result;
        result.colour = m_style.palette.ink;
        return result;
    }

    void addStates(Waiting &waiting) const
    {
        std::vector<double> pressures;
        std::vector<double> temperatures;
        for (const auto &state : m_path.states) {
            pressures.push_back(state.state.pressure());
            if (const auto temperature = state.state.temperature()) temperatures.push_back(*temperature);
        }
        const auto pressure = units::scaleFor(units::Quantity::pressure, pressures, m_snapshot.units);
        const auto temperature = units::scaleFor(units::Quantity::temperature, temperatures, m_snapshot.units);
        for (const auto &handle : m_scene.handles) {
            if (!m_scene.plane.rect.adjusted(-1, -1, 1, 1).contains(handle.centre)) continue;
            const gas::State &state = m_path.states[static_cast<std::size_t>(handle.states.first() - 1)].state;
            LabelScene text = label();
            text.numbers = handle.states;
            if (m_style.purpose != Purpose::report) {
                text.lines.append({RichText::plain(withUnit(state.pressure(), pressure)), {}, m_medium});
                if (const auto degrees = state.temperature())
                    text.lines.append({RichText::plain(withUnit(*degrees, temperature)), {}, m_plain, 0.8});
                if (!state.isEvacuated() && state.molar().vapourFraction)
                    text.lines.append({RichText::marked(QStringLiteral("<i>x</i> ")) +
                                           RichText::plain(QString::number(*state.molar().vapourFraction, 'f', 3)),
                                       {},
                                       m_plain,
                                       0.8});
            }
            waiting.add(text,
                        {.size = {},
                         .anchors = {handle.centre},
                         .clearance = handleClearance,
                         .farthest = isCrowded() ? 40.0 : 1000.0,
                         .optional = isCrowded()},
                        text.lines.isEmpty() ? -1 : 0);
        }
    }

    void addNet(Waiting &waiting) const
    {
        const path::Totals &totals = m_path.totals;
        if (!totals.closed || totals.netWorkOut == 0.0 || m_path.segments.empty()) return;
        const bool in = totals.netWorkOut < 0.0;
        LabelScene text = label();
        text.plateOpacity = 0.92;
        text.lines.append({RichText::plain(in ? tr("net work in") : tr("net work out")),
                           withUnit(std::abs(totals.netWorkOut), m_energy), m_strong});
        double shortfall = 0.0;
        for (const auto &segment : m_path.segments)
            if (segment.drawing.hatchShortfall) shortfall += segment.shortfall.value_or(0.0);
        if (shortfall > 0.0)
            text.lines.append({RichText::plain(in ? tr("of it shortfall") : tr("shortfall")),
                               withUnit(shortfall, m_energy), m_plain, 0.85});
        const QPolygonF region = m_scene.netArea.isEmpty() ? QPolygonF(m_scene.plane.rect) : m_scene.netArea;
        waiting.add(text, {.size = {}, .anchors = {deepestPoint(region, 14.0)}, .region = region});
    }

    void addBoundary(Waiting &waiting, const LooseLabel &loose) const
    {
        LabelScene text = label();
        text.colour = m_style.palette.envelope.colour;
        text.lines.append({loose.text, {}, m_strong});
        waiting.add(text, {.size = {}, .anchors = {loose.anchor}, .clearance = 6.0});
    }

    // Where segments meet the phase boundary.
    void addCrossings(Waiting &waiting) const
    {
        for (const CrossingScene &crossing : m_scene.crossings) {
            LabelScene text = label();
            const QString pressure =
                QString::fromStdString(units::shown(crossing.pressure, units::Quantity::pressure, m_snapshot.units));
            text.lines.append(
                {RichText::plain((crossing.entersTwoPhase ? tr("enters two phases, %1") : tr("leaves two phases, %1"))
                                     .arg(pressure)),
                 {},
                 m_plain,
                 0.9});
            waiting.add(text, {.size = {}, .anchors = {crossing.centre}, .clearance = 8.0});
        }
    }

    void addDewLine(Waiting &waiting) const
    {
        if (!m_scene.phase.isDewLine || m_scene.phase.boundary.isEmpty()) return;
        const auto &lines = m_scene.phase.boundary;
        const auto longest = std::max_element(lines.begin(), lines.end(),
                                              [](const auto &a, const auto &b) { return lengthOf(a) < lengthOf(b); });
        if (lengthOf(*longest) < 60.0) return;
        LabelScene text = label();
        text.lines.append({RichText::plain(tr("dew line")), {}, m_plain, 0.75});
        waiting.add(text, {.size = {},
                           .anchors = pointsOn(*longest),
                           .clearance = 5.0,
                           .beside = 4.0,
                           .farthest = 30.0,
                           .optional = true});
    }

    // What stops the path, beside the last state reached.
    void addFailure(Waiting &waiting) const
    {
        const auto failed = std::find_if(m_path.failures.begin(), m_path.failures.end(),
                                         [](const auto &failure) { return failure.has_value(); });
        if (failed == m_path.failures.end() || m_scene.handles.isEmpty()) return;
        const auto reached = m_path.states.back().state;
        LabelScene text = label();
        text.colour = m_style.palette.error;
        const int number = static_cast<int>(failed - m_path.failures.begin()) + 1;
        text.lines.append(
            {RichText::plain(tr("segment %1 is not reached", "a segment that failed").arg(number)), {}, m_strong});
        for (const auto &line : wrapped(utf8(units::sentence((*failed)->message, m_snapshot.units)), m_plain, 240.0))
            text.lines.append({RichText::plain(line), {}, m_plain});
        waiting.add(text, {.size = {},
                           .anchors = {m_scene.plane.pixel(reached.volume(), reached.pressure())},
                           .clearance = handleClearance});
    }

    void addSegments(Waiting &waiting) const
    {
        if (m_scene.segments.size() > mostNamedSegments) return;
        for (const auto &drawn : m_scene.segments) {
            if (drawn.line.isEmpty()) continue;
            const auto &segment = m_path.segments[static_cast<std::size_t>(drawn.index)];
            LabelScene text = label();
            text.plateOpacity = 0.92;
            text.dotted = true;
            text.lines.append({segmentName(drawn.index, segment), {}, m_strong});
            text.lines.append(
                {RichText::marked(QStringLiteral("<i>W</i> ")) +
                     RichText::plain(withUnit(shownEnergy(segment.work), m_energy) + QStringLiteral("\u2003")) +
                     RichText::marked(QStringLiteral("<i>Q</i> ")) +
                     RichText::plain(withUnit(shownEnergy(segment.heat), m_energy)),
                 {},
                 m_plain,
                 0.9});
            waiting.add(text,
                        {.size = {},
                         .anchors = pointsOn(drawn.line.first()),
                         .clearance = 5.0,
                         .beside = 4.0,
                         .compactCost = 70.0,
                         .optional = true},
                        1);
        }
    }

    [[nodiscard]] double shownEnergy(double energy) const { return m_snapshot.units.workByGas ? -energy : energy; }

    [[nodiscard]] static RichText segmentName(int index, const path::SegmentResult &segment)
    {
        const auto words = path::facts(segment.kind).words;
        const QString kind = QCoreApplication::translate("Kind", std::string(words).c_str());
        QString name = QString::number(index + 1) + QLatin1Char(' ');
        if (!segment.label.empty()) name += utf8(segment.label) + QStringLiteral(", ");
        RichText text = RichText::plain(name + kind);
        if (segment.kind == path::Kind::polytropic && segment.exponent)
            text += RichText::marked(QStringLiteral(" <i>n</i> ")) +
                    RichText::plain(QString::number(*segment.exponent, 'f', 3));
        return text;
    }

    // Places along a line that its label may point to, off the ends and the arrow in the middle.
    [[nodiscard]] static std::vector<QPointF> pointsOn(const QPolygonF &line)
    {
        std::vector<QPointF> points;
        for (const double share : {0.36, 0.62, 0.25, 0.5, 0.75})
            points.push_back(pointAlong(line, share * lengthOf(line)).point);
        return points;
    }

    /// So many states that their figures cannot all be read beside each other.
    [[nodiscard]] bool isCrowded() const { return m_scene.handles.size() > 16; }

    void addLimits(Waiting &waiting) const
    {
        const auto ghosts = std::count_if(m_scene.segments.begin(), m_scene.segments.end(),
                                          [](const auto &segment) { return !segment.limit.isEmpty(); });
        for (const auto &drawn : m_scene.segments) {
            if (drawn.limit.isEmpty() || lengthOf(drawn.limit.first()) < 60.0) continue;
            LabelScene text = label();
            text.plateOpacity = 0.92;
            const QString words = ghosts > 1 || m_style.isPrint() ? tr("reversible limit of %1").arg(drawn.index + 1)
                                                                  : tr("reversible limit");
            text.lines.append({RichText::plain(words), {}, m_plain, 0.85});
            waiting.add(text, {.size = {},
                               .anchors = pointsOn(drawn.limit.first()),
                               .clearance = 5.0,
                               .beside = 4.0,
                               .optional = ghosts > 1});
        }
    }

    const Scene &m_scene;
    const Snapshot &m_snapshot;
    const path::PathResult &m_path;
    const DiagramStyle &m_style;
    QFont m_plain;
    QFont m_medium;
    QFont m_strong;
    units::Scale m_energy;
};

Occupied occupied(const Scene &scene)
{
    Occupied result;
    result.bounds = scene.plane.rect.adjusted(4, 4, -2, -4);
    result.lines = linesOf(scene);
    for (const auto &segment : scene.segments)
        for (const auto &piece : segment.limit) result.quiet.push_back(piece);
    for (const auto &piece : scene.phase.boundary) result.quiet.push_back(piece);
    for (const auto &fraction : scene.phase.fractions) result.quiet.push_back(fraction.line);
    if (scene.phase.critical) result.blocks.push_back(QRectF(*scene.phase.critical - QPointF(4, 4), QSizeF(8, 8)));
    for (const auto &crossing : scene.crossings) {
        result.things.push_back(crossing.centre);
        result.blocks.push_back(QRectF(crossing.centre - QPointF(5, 5), QSizeF(10, 10)));
    }
    for (const auto &handle : scene.handles) result.things.push_back(handle.centre);
    for (const auto &handle : scene.handles)
        result.blocks.push_back(QRectF(handle.centre - QPointF(7, 7), QSizeF(14, 14)));
    for (const auto &label : scene.boundary.labels)
        result.blocks.push_back(
            QTransform().translate(label.centre.x(), label.centre.y()).rotate(label.angle).mapRect(label.plate));
    for (const auto &segment : scene.segments)
        if (!segment.head.isEmpty()) result.blocks.push_back(segment.head.boundingRect());
    return result;
}

} // namespace

std::vector<QPolygonF> linesOf(const Scene &scene)
{
    std::vector<QPolygonF> lines;
    for (const auto &segment : scene.segments) {
        lines.insert(lines.end(), segment.line.begin(), segment.line.end());
        for (const auto &drop : segment.drops) lines.push_back(QPolygonF{drop.p1(), drop.p2()});
    }
    lines.insert(lines.end(), scene.boundary.lines.begin(), scene.boundary.lines.end());
    return lines;
}

void addLabels(Scene &scene, const Snapshot &snapshot, const DiagramStyle &style, const QList<LooseLabel> &beside)
{
    Waiting waiting = LabelMaker(scene, snapshot, style).all(beside);
    const auto places = labelPlaces(waiting.requests, occupied(scene));
    for (std::size_t i = 0; i < places.size(); ++i) {
        if (!places[i]) continue;
        LabelScene &label = waiting.labels[static_cast<qsizetype>(i)];
        label.plate = places[i]->plate;
        label.leader = places[i]->leader;
        if (places[i]->isCompact) label.lines = shortForm(label).lines;
        scene.labels.append(label);
    }
}

} // namespace quasistat::ui
