#include "ui/canvas/canvas.h"
#include "ui/canvas/limit_text.h"
#include "ui/canvas/pixel_geometry.h"

#include <QSignalSpy>
#include <QTest>
#include <QWheelEvent>

#include <cmath>

using namespace quasistat;
using namespace quasistat::ui;

namespace
{

document::Design designOf(const char *text)
{
    document::Position position;
    auto design = document::read(text, position);
    Q_ASSERT(design.ok());
    return *design;
}

// Invented: air of the gas workshop, compressed in one stroke and cooled.
constexpr const char *stroke = R"({
  "quasistat": 1,
  "gas": {"model": "perfect", "heat_capacity_ratio": 1.4, "molar_mass": "28.96 g/mol"},
  "surroundings": {"pressure": "1 bar", "temperature": "20 °C"},
  "start": {"pressure": "1 bar", "temperature": "20 °C", "volume": "5 L"},
  "segments": [
    {"kind": "isentropic", "end": {"pressure": "120 psi"}, "label": "compress"},
    {"kind": "isobaric", "end": {"temperature": "@1"}, "label": "cool"}
  ]
})";

constexpr const char *byWork = R"({
  "quasistat": 1,
  "gas": {"model": "perfect", "heat_capacity_ratio": 1.4, "molar_mass": "28.96 g/mol"},
  "surroundings": {"pressure": "1 bar", "temperature": "20 °C"},
  "start": {"pressure": "1 bar", "temperature": "20 °C", "volume": "5 L"},
  "segments": [{"kind": "isothermal", "end": {"work": "400 J"}}]
})";

std::string endOf(const Session &session, std::size_t segment, const char *key)
{
    return session.now().design.json.at("segments").at(segment).at("end").at(key).get<std::string>();
}

/// A canvas on a design, shown, with what a hand does on it.
struct Desk {
    Session session;
    Canvas canvas{session, Scheme::light};

    explicit Desk(const char *design)
    {
        session.open(designOf(design), QString());
        canvas.resize(1000, 700);
        canvas.show();
        (void)QTest::qWaitForWindowExposed(&canvas);
        QCoreApplication::processEvents();
    }
    [[nodiscard]] const Scene &scene() const { return canvas.diagram().scene(); }
    [[nodiscard]] QPoint handle(int state) const
    {
        for (const auto &found : scene().handles)
            if (found.states.contains(state)) return found.centre.toPoint();
        return {};
    }
    [[nodiscard]] QPoint onSegment(int segment, double share) const
    {
        const QPolygonF line = scene().segments.at(segment).line.first();
        return pointAlong(line, share * lengthOf(line)).point.toPoint();
    }
    void moveTo(QPoint point) { QTest::mouseMove(&canvas, point); }
    void press(QPoint point) { QTest::mousePress(&canvas, Qt::LeftButton, {}, point); }
    void release(QPoint point) { QTest::mouseRelease(&canvas, Qt::LeftButton, {}, point); }
    void wheel(QPoint point, int notches)
    {
        QWheelEvent event(point, canvas.mapToGlobal(point), {}, {0, 120 * notches}, Qt::NoButton, {}, Qt::NoScrollPhase,
                          false);
        QCoreApplication::sendEvent(&canvas, &event);
    }
};

double pVGamma(const gas::State &state)
{
    return state.pressure() * std::pow(state.volume(), 1.4);
}

} // namespace

class CanvasTest : public QObject
{
    Q_OBJECT
private slots:
    void theWholePathIsInView()
    {
        Desk desk(stroke);
        QCOMPARE(desk.scene().segments.size(), 2);
        QCOMPARE(desk.scene().handles.size(), 3);
        for (const auto &handle : desk.scene().handles) QVERIFY(desk.scene().plane.rect.contains(handle.centre));
    }

    void pointingAtACurveHighlightsItsSegment()
    {
        Desk desk(stroke);
        desk.moveTo(desk.onSegment(0, 0.7));
        QCOMPARE(desk.session.hovered(), 0);
        desk.moveTo(desk.onSegment(1, 0.5));
        QCOMPARE(desk.session.hovered(), 1);
        desk.moveTo(QPoint(900, 60));
        QCOMPARE(desk.session.hovered(), -1);
    }

    void aClickSelectsASegmentAndOnEmptyGroundNone()
    {
        Desk desk(stroke);
        QTest::mouseClick(&desk.canvas, Qt::LeftButton, {}, desk.onSegment(1, 0.5));
        QCOMPARE(desk.session.selected(), 1);
        QTest::mouseClick(&desk.canvas, Qt::LeftButton, {}, QPoint(900, 60));
        QCOMPARE(desk.session.selected(), -1);
    }

    void aClickOnTheFirstStateSelectsTheStart()
    {
        Desk desk(stroke);
        QTest::mouseClick(&desk.canvas, Qt::LeftButton, {}, desk.handle(1));
        QCOMPARE(desk.session.selected(), startSelected);
        QTest::mouseClick(&desk.canvas, Qt::LeftButton, {}, desk.handle(2));
        QCOMPARE(desk.session.selected(), 0);
    }

    void aTypedQuantityIsPrintedWithItsSigns()
    {
        const QChar blank(0x202F);
        QCOMPARE(printed(QStringLiteral("50 cm3")), QStringLiteral("50") + blank + QStringLiteral("cm³"));
        QCOMPARE(printed(QStringLiteral("-5 degC ± 1 degC")),
                 QChar(0x2212) + QStringLiteral("5") + blank + QStringLiteral("°C"));
        QCOMPARE(printed(QStringLiteral("11 bar(g)")), QStringLiteral("11") + blank + QStringLiteral("bar(g)"));
    }

    void aHandleIsHitAnywhereWithin28Pixels()
    {
        Desk desk(stroke);
        const QPoint state = desk.handle(2);
        QVERIFY(desk.scene().handleAt(state + QPoint(13, 0), 14.0) >= 0);
        QVERIFY(desk.scene().handleAt(state + QPoint(0, -13), 14.0) >= 0);
    }

    void aDraggedStateSlidesAlongItsIsentropeInOneUndoStep()
    {
        Desk desk(stroke);
        const auto before = desk.session.now().design;
        const double law = pVGamma(desk.session.now().evaluation->path.states.front().state);
        const QPoint from = desk.handle(2);
        const QPoint to = desk.onSegment(0, 0.6);
        desk.press(from);
        for (int i = 1; i <= 8; ++i) desk.moveTo(from + (to - from) * i / 8);
        QVERIFY(desk.session.isPreviewing());
        QCOMPARE(desk.session.undoStack().count(), 0);
        const auto &states = desk.session.now().evaluation->path.states;
        QVERIFY(std::abs(pVGamma(states.at(1).state) / law - 1.0) < 1e-9);
        QVERIFY(QLineF(desk.handle(2), to).length() < 4.0);
        desk.release(to);

        QVERIFY(!desk.session.isPreviewing());
        QCOMPARE(desk.session.undoStack().count(), 1);
        const std::string end = endOf(desk.session, 0, "pressure");
        QVERIFY2(end.ends_with(" psi"), end.c_str());
        QVERIFY(end != "120 psi" && end.size() <= 10);
        QVERIFY(desk.session.now().evaluation->path.complete());
        desk.session.undo();
        QVERIFY(desk.session.now().design == before);
    }

    void escapePutsADraggedStateBack()
    {
        Desk desk(stroke);
        const auto before = desk.session.now().design;
        const QPoint from = desk.handle(2);
        desk.press(from);
        desk.moveTo(from + QPoint(30, 60));
        desk.moveTo(from + QPoint(60, 120));
        QVERIFY(!(desk.session.now().design == before));
        QTest::keyClick(&desk.canvas, Qt::Key_Escape);
        QVERIFY(desk.session.now().design == before);
        QVERIFY(desk.canvas.isSelecting());
        desk.release(from + QPoint(60, 120));
        QVERIFY(desk.session.now().design == before);
        QCOMPARE(desk.session.undoStack().count(), 0);
    }

    void anEndGivenAsWorkBecomesAPressureWhenDragged()
    {
        Desk desk(byWork);
        QSignalSpy remarks(&desk.session, &Session::remarked);
        const QPoint from = desk.handle(2);
        desk.press(from);
        desk.moveTo(from + QPoint(20, 20));
        desk.moveTo(from + QPoint(60, 40));
        desk.release(from + QPoint(60, 40));
        const auto &end = desk.session.now().design.json.at("segments").at(0).at("end");
        QVERIFY(end.contains("pressure") && !end.contains("work"));
        QCOMPARE(remarks.count(), 1);
    }

    void draggingTheFirstStateChangesTheStart()
    {
        Desk desk(byWork);
        const QPoint from = desk.handle(1);
        desk.press(from);
        desk.moveTo(from + QPoint(-20, -20));
        desk.moveTo(from + QPoint(-60, -40));
        desk.release(from + QPoint(-60, -40));
        const auto &start = desk.session.now().design.json.at("start");
        QVERIFY(start.at("volume").get<std::string>() != "5 L");
        QVERIFY(start.at("pressure").get<std::string>() != "1 bar");
        QCOMPARE(start.at("temperature").get<std::string>(), std::string("20 °C"));
        QVERIFY(QLineF(desk.handle(1), from + QPoint(-60, -40)).length() < 4.0);
    }

    void placingShowsTheSegmentAtTheCursorAndAClickSetsIt()
    {
        Desk desk(stroke);
        desk.canvas.place(path::Kind::isochoric);
        QVERIFY(!desk.canvas.isSelecting());
        const QPoint end = desk.handle(3) + QPoint(0, 200);
        desk.moveTo(end);
        QCOMPARE(desk.session.now().evaluation->path.segments.size(), std::size_t{3});
        QCOMPARE(desk.session.undoStack().count(), 0);
        QTest::mouseClick(&desk.canvas, Qt::LeftButton, {}, end);
        QVERIFY(desk.canvas.isSelecting());
        QCOMPARE(desk.session.undoStack().count(), 1);
        QCOMPARE(desk.session.selected(), 2);
        QVERIFY(endOf(desk.session, 2, "pressure").ends_with(" bar"));
        QVERIFY(desk.session.now().evaluation->path.complete());
    }

    void everyKindCanBePlaced_data()
    {
        QTest::addColumn<int>("kind");
        for (const auto &facts : path::kindTable) QTest::newRow(facts.key.data()) << static_cast<int>(facts.kind);
    }
    void everyKindCanBePlaced()
    {
        QFETCH(int, kind);
        Desk desk(stroke);
        desk.canvas.place(static_cast<path::Kind>(kind));
        const QPoint end = desk.handle(3) + QPoint(120, 160);
        desk.moveTo(end);
        QTest::mouseClick(&desk.canvas, Qt::LeftButton, {}, end);
        QCOMPARE(desk.session.undoStack().count(), 1);
        const auto &path = desk.session.now().evaluation->path;
        QVERIFY(path.complete());
        QCOMPARE(static_cast<int>(path.segments.back().kind), kind);
    }

    void escapeLeavesPlacingWithoutATrace()
    {
        Desk desk(stroke);
        const auto before = desk.session.now().design;
        desk.canvas.place(path::Kind::isothermal);
        desk.moveTo(desk.handle(3) + QPoint(150, 200));
        QVERIFY(!(desk.session.now().design == before));
        QTest::keyClick(&desk.canvas, Qt::Key_Escape);
        QVERIFY(desk.session.now().design == before);
        QVERIFY(desk.canvas.isSelecting());
    }

    void theWheelZoomsAboutTheCursor()
    {
        Desk desk(stroke);
        const QPoint at(500, 400);
        const double volume = desk.scene().plane.volumeAt(at.x());
        const double pressure = desk.scene().plane.pressureAt(at.y());
        const View before = desk.canvas.diagram().view();
        desk.wheel(at, 2);
        const View after = desk.canvas.diagram().view();
        QVERIFY(after.volume.highest - after.volume.lowest < 0.8 * (before.volume.highest - before.volume.lowest));
        QVERIFY(std::abs(desk.scene().plane.volumeAt(at.x()) / volume - 1.0) < 1e-9);
        QVERIFY(std::abs(desk.scene().plane.pressureAt(at.y()) / pressure - 1.0) < 1e-9);
        desk.canvas.zoomToPath();
        QVERIFY(std::abs(desk.canvas.diagram().view().volume.highest / before.volume.highest - 1.0) < 1e-9);
    }

    void emptyGroundIsDraggedToPan()
    {
        Desk desk(stroke);
        desk.wheel(QPoint(500, 400), 3);
        const double lowest = desk.canvas.diagram().view().volume.lowest;
        const QPoint empty(900, 60);
        desk.press(empty);
        desk.moveTo(empty + QPoint(-40, 0));
        desk.moveTo(empty + QPoint(-80, 0));
        desk.release(empty + QPoint(-80, 0));
        QVERIFY(desk.canvas.diagram().view().volume.lowest > lowest);
        QCOMPARE(desk.session.selected(), -1);
    }

    void theViewKeepsClearOfWhatLiesOverItsLowerEdge()
    {
        Desk desk(stroke);
        desk.canvas.setInset(146);
        QVERIFY(desk.scene().plane.rect.bottom() <= 700 - 146 - 40);
        for (const auto &handle : desk.scene().handles) QVERIFY(handle.centre.y() < 700 - 146);
    }

    void labelsOfStatesCoverNoHandle()
    {
        Desk desk(stroke);
        int numbered = 0;
        for (const auto &label : desk.scene().labels) {
            numbered += label.numbers.isEmpty() ? 0 : 1;
            for (const auto &handle : desk.scene().handles) QVERIFY(!label.plate.contains(handle.centre));
        }
        QCOMPARE(numbered, 3);
    }

    void aDesignThatCannotBeComputedSaysWhy()
    {
        Desk desk(R"({"quasistat": 1, "gas": {"model": "perfect"}, "start": {}, "segments": []})");
        QVERIFY(desk.session.now().failure.has_value());
        QVERIFY(!desk.scene().sentence.isEmpty());
        desk.moveTo(QPoint(300, 300));
        QTest::mouseClick(&desk.canvas, Qt::LeftButton, {}, QPoint(300, 300));
    }
};

QTEST_MAIN(CanvasTest)
#include "canvas_test.moc"
