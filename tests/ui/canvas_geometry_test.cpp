#include "ui/canvas/label_placement.h"
#include "ui/canvas/pixel_geometry.h"
#include "ui/canvas/ticks.h"

#include <QTest>

#include <cmath>

using namespace quasistat::ui;

namespace
{

// A falling curve like those of a compression.
QPolygonF hyperbola()
{
    QPolygonF line;
    for (int i = 0; i <= 400; ++i) {
        const double x = 60.0 + i * 2.0;
        line.append({x, 560.0 - 30000.0 / x});
    }
    return line;
}

LabelRequest requestAt(QPointF anchor)
{
    return {.size = {96, 33}, .anchors = {anchor}, .clearance = 12.0};
}

double lengthInside(const QPolygonF &line, const QRectF &rect)
{
    double length = 0.0;
    for (const auto &piece : clippedLine(line, rect)) length += lengthOf(piece);
    return length;
}

} // namespace

class CanvasGeometryTest : public QObject
{
    Q_OBJECT
private slots:
    void aClippedLineStaysInsideAndKeepsItsPieces()
    {
        const QPolygonF zigzag{{-10, 5}, {5, 5}, {5, 30}, {8, 30}, {8, 5}};
        const auto pieces = clippedLine(zigzag, QRectF(0, 0, 10, 10));
        QCOMPARE(pieces.size(), 2);
        QCOMPARE(pieces.first().first(), QPointF(0, 5));
        QCOMPARE(pieces.first().last(), QPointF(5, 10));
        QCOMPARE(pieces.last().first(), QPointF(8, 10));
    }

    void aClippedAreaIsItsPartInside()
    {
        const QPolygonF area = clippedArea({{-5, -5}, {5, -5}, {5, 5}, {-5, 5}}, QRectF(0, 0, 10, 10));
        QCOMPARE(area.boundingRect(), QRectF(0, 0, 5, 5));
    }

    void aThinnedLineKeepsItsShapeWithFewPoints()
    {
        const QPolygonF line = hyperbola();
        const QPolygonF thin = thinned(line);
        QVERIFY(thin.size() < line.size() / 4);
        QCOMPARE(thin.first(), line.first());
        QCOMPARE(thin.last(), line.last());
        for (const auto &point : line) QVERIFY(distanceTo(thin, point) < 0.25);
    }

    void aThinnedLineKeepsItsCorners()
    {
        const QPolygonF stairs{{0, 0}, {0, 10}, {0, 20}, {10, 20}, {20, 20}, {20, 40}};
        QCOMPARE(thinned(stairs), QPolygonF({{0, 0}, {0, 20}, {20, 20}, {20, 40}}));
    }

    void hatchFillsAnAreaAtItsPitch()
    {
        const QPolygonF square{{0, 0}, {80, 0}, {80, 80}, {0, 80}};
        double length = 0.0;
        for (const auto &line : hatchLines(square, 8.0)) {
            QVERIFY(std::abs(line.dx() + line.dy()) < 1e-9); // 45°, rising to the right
            QVERIFY(QRectF(-0.01, -0.01, 80.02, 80.02).contains(line.p1()));
            length += line.length();
        }
        // Lines of one pitch cover area / pitch of length, to within one line.
        QVERIFY(std::abs(length - 80.0 * 80.0 / 8.0) < 80.0 * std::sqrt(2.0));
    }

    void hatchLeavesAHoleOfAConcaveAreaOpen()
    {
        const QPolygonF notched{{0, 0}, {90, 0}, {90, 90}, {60, 90}, {60, 30}, {30, 30}, {30, 90}, {0, 90}};
        for (const auto &line : hatchLines(notched, 8.0)) QVERIFY(!QRectF(31, 31, 28, 58).contains(line.center()));
    }

    void aPointAlongALineHasItsDirection()
    {
        const auto [point, direction] = pointAlong({{0, 0}, {10, 0}, {10, 10}}, 15.0);
        QCOMPARE(point, QPointF(10, 5));
        QCOMPARE(direction, QPointF(0, 1));
        QCOMPARE(lengthOf(part({{0, 0}, {10, 0}, {10, 10}}, 4.0, 15.0)), 11.0);
    }

    void aLoneLabelStandsBesideItsThing()
    {
        const auto places = labelPlaces({requestAt({300, 200})}, {.bounds = QRectF(0, 0, 600, 400)});
        QVERIFY(places.front());
        QVERIFY(!places.front()->leader);
        QVERIFY(places.front()->plate.left() > 300.0); // to the right reads best
    }

    void labelsOfAModeratelyCrowdedCurveCoverNothing()
    {
        Occupied occupied{.bounds = QRectF(40, 10, 860, 560), .lines = {hyperbola()}};
        std::vector<LabelRequest> requests;
        for (int i = 10; i < 400; i += 32) {
            requests.push_back(requestAt(hyperbola().at(i)));
            occupied.blocks.push_back(QRectF(hyperbola().at(i) - QPointF(7, 7), QSizeF(14, 14)));
        }
        const auto places = labelPlaces(requests, occupied);
        for (std::size_t i = 0; i < places.size(); ++i) {
            QVERIFY(places[i]);
            QVERIFY(occupied.bounds.adjusted(-1, -1, 1, 1).contains(places[i]->plate));
            QVERIFY(lengthInside(hyperbola(), places[i]->plate) < 4.0);
            for (const auto &block : occupied.blocks) QVERIFY(!block.intersects(places[i]->plate));
            for (std::size_t j = 0; j < i; ++j) QVERIFY(!places[j]->plate.intersects(places[i]->plate));
        }
    }

    void aLabelThatHasToStandAwayHasALeaderToItsThing()
    {
        Occupied occupied{.bounds = QRectF(0, 0, 600, 400), .blocks = {QRectF(180, 120, 240, 160)}};
        const auto place = labelPlaces({requestAt({300, 200})}, occupied).front();
        QVERIFY(place && place->leader);
        QVERIFY(QLineF(place->leader->p2(), QPointF(300, 200)).length() < 12.0);
    }

    void anOptionalLabelGivesWayAndItsShortFormIsTried()
    {
        // Everything is taken but a gap that only the short form fits.
        Occupied full{.bounds = QRectF(0, 0, 200, 100), .blocks = {QRectF(0, 0, 200, 100)}};
        LabelRequest request = requestAt({100, 50});
        request.optional = true;
        QVERIFY(!labelPlaces({request}, full).front());

        Occupied gap{.bounds = QRectF(0, 0, 200, 100), .blocks = {QRectF(0, 0, 200, 30), QRectF(0, 70, 200, 30), QRectF(60, 30, 50, 40)}};
        request.compact = QSizeF(24, 22);
        const auto place = labelPlaces({request}, gap).front();
        QVERIFY(place && place->isCompact);
    }

    void aRegionTakesALabelThatFits()
    {
        LabelRequest request{
            .size = {120, 40}, .anchors = {{250, 180}}, .region = QPolygonF(QRectF(100, 80, 300, 200))};
        const auto place = labelPlaces({request}, {.bounds = QRectF(0, 0, 600, 400)}).front();
        QVERIFY(place && QRectF(100, 80, 300, 200).contains(place->plate));
    }

    void ticksAreRoundNumbers()
    {
        EngineeringTicker ticker;
        const auto places = ticker.places(QCPRange(0.0, 5.4), 1020.0, 150.0);
        QCOMPARE(places.size(), 6);
        QCOMPARE(tickText(places.at(5), ticker.decimals()), QStringLiteral("5"));
        (void)ticker.places(QCPRange(0.0, 0.54), 1020.0, 150.0);
        QCOMPARE(ticker.decimals(), 1);
        QCOMPARE(tickText(0.0, 1), QStringLiteral("0"));
        QCOMPARE(tickText(-0.5, 1), QChar(0x2212) + QStringLiteral("0.5"));
    }
};

QTEST_MAIN(CanvasGeometryTest)
#include "canvas_geometry_test.moc"
