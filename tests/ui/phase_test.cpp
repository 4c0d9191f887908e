// The phase boundary on the diagram: drawn where it comes into the view, labelled where there is room.

#include "core/document/file.h"
#include "core/document/interpret.h"
#include "core/gas/solve/solve.h"
#include "ui/canvas/diagram.h"
#include "ui/canvas/phase_scene.h"

#include <QTest>

#include <cmath>

namespace quasistat::ui
{

namespace
{

using analysis::PhaseLine;
using analysis::PhaseLines;
using Kind = PhaseLine::Kind;

Snapshot snapshotOf(const char *sample)
{
    static const gas::Library library;
    const auto text = document::fileText(std::string(SAMPLES_DIR) + "/" + sample + ".qpath");
    document::Position position;
    const document::Design design = *document::read(*text, position);
    auto evaluation = document::evaluate(design, library);
    return {.design = design,
            .evaluation = std::make_shared<const analysis::Evaluation>(std::move(*evaluation)),
            .failure = std::nullopt,
            .units = document::displayUnits(design)};
}

/// A made-up dome between p and V of a letdown from 8 bar, 10 L: liquid at 1 L … 6 L, vapour at 6 L … 60 L, critical at
/// 5 bar.
PhaseLines dome()
{
    PhaseLine liquid{Kind::saturatedLiquid, 0.0, {}};
    PhaseLine vapour{Kind::saturatedVapour, 1.0, {}};
    std::vector<PhaseLine> inner;
    for (int i = 1; i < 10; ++i) inner.push_back({Kind::equalVapourFraction, 0.1 * i, {}});
    for (int k = 0; k <= 60; ++k) {
        const double share = k / 60.0;
        const double pressure = 5e5 * share;
        const double liquidVolume = 1e-3 + 5e-3 * share * share;
        const double vapourVolume = 6e-3 + 54e-3 * (1.0 - share) * (1.0 - share);
        liquid.points.emplace_back(liquidVolume, pressure);
        vapour.points.emplace_back(vapourVolume, pressure);
        for (PhaseLine &line : inner)
            line.points.emplace_back(liquidVolume + line.vapourFraction * (vapourVolume - liquidVolume), pressure);
    }
    PhaseLines lines{{liquid, vapour}, std::pair(6e-3, 5e5)};
    lines.lines.insert(lines.lines.end(), inner.begin(), inner.end());
    return lines;
}

Plane planeOf(double volume, double pressure)
{
    return {QRectF(64, 16, 900, 600), {{0.0, volume}, {0.0, pressure}}};
}

Scene sceneWith(const Snapshot &snapshot, const Plane &plane)
{
    const PhaseLines lines = dome();
    return sceneOf(snapshot, plane, {}, windowStyle(Scheme::light), &lines);
}

} // namespace

class PhaseTest : public QObject
{
    Q_OBJECT
private slots:
    void the_dome_is_cut_to_the_plot();
    void a_dome_beside_the_view_leaves_no_trace();
    void the_inside_lies_between_liquid_and_vapour();
    void fraction_labels_keep_clear_of_everything();
    void the_critical_point_has_its_mark_and_label();
    void the_fit_of_the_view_does_not_reach_for_the_dome();
    void where_a_segment_enters_two_phases_it_is_marked_and_said();
    void an_ideal_gas_has_no_boundary();
};

void PhaseTest::the_dome_is_cut_to_the_plot()
{
    const Plane plane = planeOf(30e-3, 9e5);
    const PhaseScene phase = phaseScene(dome(), plane);
    QCOMPARE(phase.boundary.size(), qsizetype(2));
    QCOMPARE(phase.fractions.size(), qsizetype(9));
    for (const QPolygonF &line : phase.boundary)
        for (const QPointF point : line) QVERIFY(plane.rect.adjusted(-0.01, -0.01, 0.01, 0.01).contains(point));
    // The vapour line leaves the plot at 30 L: (1 − share)² = 24/54 there.
    const double pressure = 5e5 * (1.0 - std::sqrt(24.0 / 54.0));
    double lowest = 0.0;
    for (const QPointF point : phase.boundary.at(1)) lowest = std::max(lowest, point.y());
    QVERIFY(std::abs(lowest - plane.pixel(30e-3, pressure).y()) < 1.5);
}

void PhaseTest::a_dome_beside_the_view_leaves_no_trace()
{
    const Plane high{QRectF(64, 16, 900, 600), {{0.0, 30e-3}, {7e5, 9e5}}};
    const PhaseScene phase = phaseScene(dome(), high);
    QVERIFY(phase.boundary.isEmpty());
    QVERIFY(phase.fractions.isEmpty());
    QVERIFY(!phase.critical);
    QVERIFY(phase.inside.boundingRect().height() < 0.01);
}

void PhaseTest::the_inside_lies_between_liquid_and_vapour()
{
    const Plane plane = planeOf(80e-3, 9e5);
    const QPolygonF inside = phaseScene(dome(), plane).inside;
    QVERIFY(inside.containsPoint(plane.pixel(10e-3, 2e5), Qt::OddEvenFill));
    QVERIFY(!inside.containsPoint(plane.pixel(10e-3, 6e5), Qt::OddEvenFill));
    QVERIFY(!inside.containsPoint(plane.pixel(60e-3, 2e5), Qt::OddEvenFill));
    QVERIFY(!inside.containsPoint(plane.pixel(0.5e-3, 2e5), Qt::OddEvenFill));
}

void PhaseTest::fraction_labels_keep_clear_of_everything()
{
    const Scene scene = sceneWith(snapshotOf("letdown-slow"), planeOf(90e-3, 9e5));
    QVERIFY(scene.phase.labels.size() >= 5);
    for (const PhaseLabel &label : scene.phase.labels) {
        QVERIFY(scene.plane.rect.contains(label.plate));
        for (const LabelScene &other : scene.labels) QVERIFY(!other.plate.intersects(label.plate));
        for (const PhaseLabel &other : scene.phase.labels)
            QVERIFY(&other == &label || !other.plate.intersects(label.plate));
        for (const HandleScene &handle : scene.handles) QVERIFY(!label.plate.contains(handle.centre));
    }
}

void PhaseTest::the_critical_point_has_its_mark_and_label()
{
    const Scene scene = sceneWith(snapshotOf("letdown-slow"), planeOf(90e-3, 9e5));
    QVERIFY(scene.phase.critical);
    const auto named = std::ranges::find(scene.phase.labels, QStringLiteral("critical point"), &PhaseLabel::text);
    QVERIFY(named != scene.phase.labels.end());
    QVERIFY(named->plate.bottom() < scene.phase.critical->y());
    for (const LabelScene &label : scene.labels) QVERIFY(!label.plate.intersects(named->plate));
}

void PhaseTest::the_fit_of_the_view_does_not_reach_for_the_dome()
{
    const auto snapshot = std::make_shared<const Snapshot>(snapshotOf("letdown-slow"));
    Diagram diagram(windowStyle(Scheme::light));
    diagram.resize(900, 600);
    diagram.show(snapshot);
    diagram.zoomToPath();
    const double widest = snapshot->evaluation->path.states.back().state.volume();
    QVERIFY(diagram.view().volume.highest < 1.3 * widest);
}

void PhaseTest::where_a_segment_enters_two_phases_it_is_marked_and_said()
{
    Snapshot snapshot = snapshotOf("letdown-slow");
    analysis::Evaluation evaluation = *snapshot.evaluation;
    // The state half-way stands in for one on a boundary.
    const gas::State &from = evaluation.path.states[0].state;
    const auto half =
        gas::stateFrom(from.gas(), {gas::Property::temperature, *from.temperature()}, {gas::Property::pressure, 4e5});
    QVERIFY(half);
    evaluation.path.segments[0].phaseCrossings.push_back({gas::State(from.sharedGas(), from.amount(), *half), true});
    snapshot.evaluation = std::make_shared<const analysis::Evaluation>(evaluation);
    const Plane plane = planeOf(90e-3, 9e5);
    const Scene scene = sceneOf(snapshot, plane, {}, windowStyle(Scheme::light));
    QCOMPARE(scene.crossings.size(), qsizetype(1));
    QVERIFY(QLineF(scene.crossings.first().centre, plane.pixel(20e-3, 4e5)).length() < 0.5); // Boyle: 8 bar × 10 L
    QVERIFY(std::ranges::any_of(scene.labels, [](const LabelScene &label) {
        return !label.lines.isEmpty() &&
               label.lines.first().text.unstyled().startsWith(QStringLiteral("enters two phases, 4"));
    }));
}

void PhaseTest::an_ideal_gas_has_no_boundary()
{
    PhaseCache cache;
    QVERIFY(!cache.linesFor(snapshotOf("letdown-slow")));
}

} // namespace quasistat::ui

QTEST_MAIN(quasistat::ui::PhaseTest)
#include "phase_test.moc"
