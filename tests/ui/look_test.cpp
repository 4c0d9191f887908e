#include "seen_colour.h"
#include "ui/look/figure_text.h"
#include "ui/look/glyph.h"
#include "ui/look/mark.h"
#include "ui/look/palette.h"
#include "ui/look/type.h"

#include <QImage>
#include <QTest>

using namespace quasistat;
using namespace quasistat::ui;

namespace
{

// How much of an image is painted at all.
int paintedPixels(const QImage &image)
{
    int count = 0;
    for (int y = 0; y < image.height(); ++y)
        for (int x = 0; x < image.width(); ++x) count += qAlpha(image.pixel(x, y)) > 40 ? 1 : 0;
    return count;
}

QImage canvasOf(int side)
{
    QImage image(side, side, QImage::Format_ARGB32_Premultiplied);
    image.fill(Qt::transparent);
    return image;
}

} // namespace

class LookTest : public QObject
{
    Q_OBJECT
private slots:
    void everyFamilyHasContrastToGroundAndPanel_data() { schemes(); }
    void everyFamilyHasContrastToGroundAndPanel()
    {
        QFETCH(bool, dark);
        const Palette looks = palette(dark ? Scheme::dark : Scheme::light);
        for (const auto &family : looks.families) {
            QVERIFY(seen::contrast(family.colour, looks.ground) >= 3.0);
            QVERIFY(seen::contrast(family.colour, looks.panel) >= 3.0);
        }
        for (const auto &colour : {looks.ink, looks.accent, looks.warning, looks.error, looks.envelope.colour})
            QVERIFY(seen::contrast(colour, looks.ground) >= 4.5);
    }

    void familiesDifferForEveryEye_data() { schemes(); }
    void familiesDifferForEveryEye()
    {
        QFETCH(bool, dark);
        const Palette looks = palette(dark ? Scheme::dark : Scheme::light);
        for (const auto eye : {seen::Eye::normal, seen::Eye::protan, seen::Eye::deutan})
            for (std::size_t i = 0; i < looks.families.size(); ++i)
                for (std::size_t j = 0; j < i; ++j) {
                    const auto first = seen::okLab(seen::asSeenBy(eye, seen::linearLight(looks.families[i].colour)));
                    const auto second = seen::okLab(seen::asSeenBy(eye, seen::linearLight(looks.families[j].colour)));
                    QVERIFY2(seen::distance(first, second) >= 0.10,
                             qPrintable(QStringLiteral("families %1 and %2").arg(i).arg(j)));
                }
    }

    void hueStaysBetweenLightAndDark()
    {
        const Palette light = palette(Scheme::light);
        const Palette dark = palette(Scheme::dark);
        for (std::size_t i = 0; i < light.families.size(); ++i)
            QVERIFY(seen::hueDifference(light.families[i].colour, dark.families[i].colour) <= 40.0);
    }

    void noTwoFamiliesShareADashPattern()
    {
        const Palette looks = palette(Scheme::light);
        for (std::size_t i = 0; i < looks.families.size(); ++i)
            for (std::size_t j = 0; j < i; ++j) QVERIFY(looks.families[i].dash != looks.families[j].dash);
        QVERIFY(looks.family(path::Kind::isothermal).dash.isEmpty());
    }

    void fillsAndEnvelopeAreRead()
    {
        const Palette looks = palette(Scheme::light);
        QCOMPARE(looks.workIn.opacity, 0.16);
        QCOMPARE(looks.workOut.netOpacity, 0.28);
        QCOMPARE(looks.shortfall.pitch, 8.0);
        QCOMPARE(looks.envelope.halo, 13.0);
        QCOMPARE(printPalette().ground, QColor(Qt::white));
    }

    void figuresOfEqualLengthAreEquallyWide()
    {
        const QFont font = bodyFace();
        QCOMPARE(textWidth(QStringLiteral("111.11"), font), textWidth(QStringLiteral("480.93"), font));
    }

    void decimalSignsOfAColumnAlign()
    {
        const QFont font = bodyFace();
        const QStringList figures{QStringLiteral("2.3923"), QStringLiteral("1380.47")};
        const DecimalColumn column = decimalColumn(figures, font);
        QCOMPARE(column.whole, textWidth(QStringLiteral("1380"), font));
        QCOMPARE(column.fraction, textWidth(QStringLiteral(".3923"), font));
    }

    void marksBecomeStyles()
    {
        const auto text = RichText::marked(QStringLiteral("<i>p</i><sub>ext</sub> < 3"));
        QCOMPARE(text.runs().size(), 3);
        QVERIFY(text.runs().at(0).italic);
        QVERIFY(text.runs().at(1).subscript);
        QCOMPARE(text.unstyled(), QStringLiteral("pext < 3"));
        QCOMPARE(RichText::plain(QStringLiteral("<i>p</i>")).unstyled(), QStringLiteral("<i>p</i>"));
    }

    void elidedTextFits()
    {
        const QFont font = labelFace();
        const QString text = QStringLiteral("second stage of the shutter drive");
        const QString shorter = elided(text, font, 80.0);
        QVERIFY(shorter.endsWith(QChar(0x2026)));
        QVERIFY(textWidth(shorter, font) <= 80.0);
        QCOMPARE(elided(text, font, 1000.0), text);
    }

    void everyKindHasAGlyphOfItsOwn()
    {
        QList<QImage> drawn;
        for (const auto &facts : path::kindTable) {
            QImage image = canvasOf(22);
            QPainter painter(&image);
            drawGlyph(painter, QRectF(0, 0, 22, 22), facts.kind, Qt::black);
            painter.end();
            QVERIFY2(paintedPixels(image) > 30, facts.key.data());
            QVERIFY2(!drawn.contains(image), facts.key.data());
            drawn.append(image);
        }
        QVERIFY(glyphImage("no-such-kind", Qt::black).isEmpty());
        QCOMPARE(glyphIcon(path::Kind::linear, palette(Scheme::light)).pixmap(16, 16).size(), QSize(16, 16));
    }

    void glyphsOfKindsToComeAreThere()
    {
        for (const char *key :
             {"adiabatic", "throttle", "trace", "intake", "discharge", "fill", "vent", "connect", "isolate"})
            QVERIFY2(!glyphImage(key, Qt::black).isEmpty(), key);
    }

    void marksDiffer()
    {
        QList<QImage> drawn;
        for (const auto mark : {StateMark::tick, StateMark::warning, StateMark::cross, StateMark::dots}) {
            QImage image = canvasOf(18);
            QPainter painter(&image);
            drawMark(painter, mark, QPointF(9, 9), Qt::black, Qt::white);
            painter.end();
            QVERIFY(paintedPixels(image) > 10);
            QVERIFY(!drawn.contains(image));
            drawn.append(image);
        }
    }

private:
    static void schemes()
    {
        QTest::addColumn<bool>("dark");
        QTest::newRow("light") << false;
        QTest::newRow("dark") << true;
    }
};

QTEST_MAIN(LookTest)
#include "look_test.moc"
