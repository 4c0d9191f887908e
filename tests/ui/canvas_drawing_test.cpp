#include "ui/canvas/draw.h"

#include "core/document/interpret.h"

#include <QImage>
#include <QProcess>
#include <QTemporaryDir>
#include <QTest>

using namespace quasistat;
using namespace quasistat::ui;

namespace
{

// Invented: a closed path of the gas workshop with a limit that it exceeds.
constexpr const char *loop = R"({
  "quasistat": 1, "title": "Two-stage air",
  "gas": {"model": "perfect", "heat_capacity_ratio": 1.4, "molar_mass": "28.96 g/mol"},
  "surroundings": {"pressure": "1 bar", "temperature": "20 °C"},
  "start": {"pressure": "1 bar", "temperature": "20 °C", "volume": "5 L"},
  "segments": [
    {"kind": "polytropic", "exponent": 1.3, "end": {"pressure": "3 bar"}, "label": "first stage"},
    {"kind": "isobaric", "end": {"temperature": "35 °C"}, "label": "intercooler"},
    {"kind": "isentropic", "end": {"pressure": "10 bar"}, "label": "second stage"},
    {"kind": "isobaric", "end": {"temperature": "@1"}, "label": "aftercooler"},
    {"kind": "constant-external-pressure", "external_pressure": "1 bar", "label": "letdown"}
  ],
  "limits": [{"quantity": "temperature", "max": "140 °C", "label": "discharge"}]
})";

Snapshot snapshotOf(const char *text)
{
    document::Position position;
    Snapshot snapshot;
    snapshot.design = *document::read(text, position);
    const gas::Library library;
    auto evaluation = document::evaluate(snapshot.design, library);
    if (evaluation)
        snapshot.evaluation = std::make_shared<const analysis::Evaluation>(std::move(*evaluation));
    else
        snapshot.failure = evaluation.failure();
    return snapshot;
}

} // namespace

class CanvasDrawingTest : public QObject
{
    Q_OBJECT
private slots:
    void svgIsVectorsWithTextAsText()
    {
        const auto bytes = drawing(snapshotOf(loop), Format::svg, {1000, 640});
        QVERIFY(bytes.ok());
        const QString text = QString::fromUtf8(*bytes);
        QVERIFY(!text.contains(QLatin1String("<image")));
        QVERIFY(text.contains(QLatin1String("second stage")));
        QVERIFY(text.contains(QRegularExpression(QStringLiteral("10\\.000[\u202F\u2009]bar")))); // as the face has it
        QVERIFY(text.count(QLatin1String("<path")) + text.count(QLatin1String("<polyline")) > 20);
    }

    void pdfIsVectorsWithTheRightFigures()
    {
        QTemporaryDir folder;
        const auto bytes = drawing(snapshotOf(loop), Format::pdf, {1000, 640});
        QVERIFY(bytes.ok() && bytes->startsWith("%PDF"));
        QVERIFY(!bytes->contains("/Subtype /Image"));
        const QString path = folder.filePath(QStringLiteral("diagram.pdf"));
        QFile file(path);
        QVERIFY(file.open(QIODevice::WriteOnly));
        file.write(*bytes);
        file.close();
        QProcess reader;
        reader.start(QStringLiteral("pdftotext"), {path, QStringLiteral("-")});
        if (!reader.waitForStarted()) QSKIP("pdftotext is not installed");
        QVERIFY(reader.waitForFinished());
        const QString text = QString::fromUtf8(reader.readAllStandardOutput());
        // 930.47 J: closed form of the five works, γ = 1.4, computed by hand for 5 L of air at 1 bar and 20 °C.
        QVERIFY2(text.contains(QLatin1String("930.47")), qPrintable(text));
        QVERIFY2(text.contains(QLatin1String("161.52")), qPrintable(text));
        QVERIFY2(text.contains(QLatin1String("second stage")), qPrintable(text));
    }

    void pngHasTwiceTheSizeAndShowsSomething()
    {
        const auto bytes = drawing(snapshotOf(loop), Format::png, {800, 500});
        QVERIFY(bytes.ok());
        const QImage image = QImage::fromData(*bytes);
        QCOMPARE(image.size(), QSize(1600, 1000));
        QCOMPARE(image.pixelColor(4, 4), QColor(Qt::white));
        int coloured = 0;
        for (int y = 0; y < image.height(); y += 4)
            for (int x = 0; x < image.width(); x += 4) coloured += image.pixelColor(x, y) == Qt::white ? 0 : 1;
        QVERIFY(coloured > 5000);
    }

    void whatCannotBeComputedIsNotDrawn()
    {
        const auto snapshot =
            snapshotOf(R"({"quasistat": 1, "gas": {"model": "perfect"}, "start": {}, "segments": []})");
        const auto bytes = drawing(snapshot, Format::svg, {1000, 640});
        QVERIFY(!bytes.ok());
        QVERIFY(!bytes.failure().pointer.empty());
    }
};

QTEST_MAIN(CanvasDrawingTest)
#include "canvas_drawing_test.moc"
