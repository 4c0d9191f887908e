// One job from end to end in a real window on an X server: open, drag a handle, write the report, read its text.

#include "tests/ui/open_window.h"
#include "ui/canvas/canvas.h"
#include "ui/canvas/diagram.h"
#include "ui/ledger/ledger_rows.h"
#include "ui/session/sentences.h"

#include <QProcess>

namespace quasistat::ui
{

class RealWindowTest : public QObject
{
    Q_OBJECT
private slots:
    void initTestCase() { isolateSettings(m_folder); }
    void a_dragged_handle_reaches_the_report();

private:
    QTemporaryDir m_folder;
};

void RealWindowTest::a_dragged_handle_reaches_the_report()
{
    QCOMPARE(QGuiApplication::platformName(), QStringLiteral("xcb"));
    MainWindow window(m_folder.path());
    showWith(window, sampleDesign("letdown-slow"));
    auto *canvas = window.findChild<Canvas *>();
    QVERIFY(canvas);
    Session &session = window.session();
    const auto before = session.now().evaluation->path.segments[0].work;

    // Along the isotherm from 1 bar up to about 3 bar.
    const Plane &plane = canvas->diagram().plane();
    const auto &states = session.now().evaluation->path.states;
    const QPoint from =
        canvas->diagram().mapTo(canvas, plane.pixel(states[1].state.volume(), states[1].state.pressure()).toPoint());
    const double target = 3e5;
    const double volume = states[1].state.volume() * states[1].state.pressure() / target;
    const QPoint to = canvas->diagram().mapTo(canvas, plane.pixel(volume, target).toPoint());
    QTest::mousePress(canvas, Qt::LeftButton, {}, from);
    for (int i = 1; i <= 10; ++i) QTest::mouseMove(canvas, from + (to - from) * i / 10);
    QTest::mouseRelease(canvas, Qt::LeftButton, {}, to);

    const double pressure = session.now().evaluation->path.states[1].state.pressure();
    QVERIFY2(std::abs(pressure - target) < 0.05 * target, qPrintable(QString::number(pressure)));
    QCOMPARE(session.undoStack().count(), 1);
    const double work = session.now().evaluation->path.segments[0].work;
    QVERIFY(work > before);
    // The closed form W = n R T ln(V₁/V₂) of what stands on the screen.
    const auto &start = session.now().evaluation->path.states[0].state;
    const double closed = start.pressure() * start.volume() * std::log(pressure / start.pressure());
    QVERIFY(std::abs(work - closed) < 1e-9 * std::abs(closed));

    const QString file = m_folder.filePath(QStringLiteral("report.pdf"));
    QVERIFY(window.writeReport(file, PageSize::a4));
    QProcess text;
    text.start(QStringLiteral("pdftotext"), {QStringLiteral("-layout"), file, QStringLiteral("-")});
    QVERIFY(text.waitForFinished());
    const QString words = QString::fromUtf8(text.readAllStandardOutput());
    const QString figure = ui::figure(work, accountScale(session.now().evaluation->path, session.now().units));
    QVERIFY2(words.contains(figure), qPrintable(figure + QLatin1Char('\n') + words));
    QProcess open;
    open.start(QStringLiteral("qpdf"), {QStringLiteral("--qdf"), file, QStringLiteral("-")});
    QVERIFY(open.waitForFinished());
    QVERIFY(open.readAllStandardOutput().count(" l\n") > 100); // the diagram is vectors
}

} // namespace quasistat::ui

QTEST_MAIN(quasistat::ui::RealWindowTest)
#include "real_window_test.moc"
