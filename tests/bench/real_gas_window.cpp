// Real gases in the window of 1600 × 1000, offscreen, under a path of twelve segments: from a change of the model to
// the painted frame, and from mouse move to painted frame while a handle is dragged. Prints medians and the worst.

#include "ui/canvas/canvas.h"
#include "ui/canvas/diagram.h"
#include "ui/window/main_window.h"

#include <QApplication>
#include <QElapsedTimer>
#include <QTemporaryDir>
#include <QTest>

#include <algorithm>
#include <cstdio>

using namespace quasistat;

namespace
{

using document::Json;

document::Design twelveSegments(const Json &gas)
{
    Json segments = Json::array();
    for (int i = 0; i < 3; ++i) {
        segments.push_back({{"kind", "isentropic"}, {"end", {{"pressure_ratio", 2.5}}}});
        segments.push_back({{"kind", "isobaric"}, {"end", {{"temperature", "310 K"}}}});
        segments.push_back({{"kind", "polytropic"}, {"exponent", 1.3}, {"end", {{"pressure_ratio", 0.5}}}});
        segments.push_back({{"kind", "isothermal"}, {"end", {{"pressure_ratio", 0.8}}}});
    }
    return {{{"quasistat", 1},
             {"gas", gas},
             {"surroundings", {{"pressure", "1 bar"}, {"temperature", "20 °C"}}},
             {"start", {{"pressure", "20 bar"}, {"temperature", "300 K"}, {"volume", "5 L"}}},
             {"segments", segments}}};
}

std::vector<Json> models()
{
    const Json nitrogen{{"nitrogen", 1.0}};
    return {{{"model", "reference"}, {"fluid", "nitrogen"}},
            {{"model", "gerg-2008"}, {"composition", nitrogen}},
            {{"model", "peng-robinson"}, {"composition", nitrogen}},
            {{"model", "soave-redlich-kwong"}, {"composition", nitrogen}},
            {{"model", "ideal"}, {"composition", nitrogen}}};
}

void print(const char *what, std::vector<double> times)
{
    std::sort(times.begin(), times.end());
    std::printf("%s: median %.2f ms, worst %.2f ms of %zu\n", what, times[times.size() / 2], times.back(),
                times.size());
}

std::vector<double> switches(ui::MainWindow &window)
{
    std::vector<double> times;
    for (int i = 0; i < 50; ++i) {
        QElapsedTimer timer;
        timer.start();
        window.session().apply(twelveSegments(models()[static_cast<std::size_t>(i % 5)]), QStringLiteral("model"));
        QCoreApplication::processEvents();
        window.repaint();
        times.push_back(static_cast<double>(timer.nsecsElapsed()) * 1e-6);
    }
    return times;
}

std::vector<double> frames(ui::MainWindow &window)
{
    window.session().apply(twelveSegments(models().front()), QStringLiteral("model"));
    QTest::qWait(200);
    auto *canvas = window.findChild<ui::Canvas *>();
    const auto &state = window.session().now().evaluation->path.states.at(1).state;
    const QPoint from =
        canvas->diagram().mapTo(canvas, canvas->diagram().plane().pixel(state.volume(), state.pressure()).toPoint());
    std::vector<double> times;
    QTest::mousePress(canvas, Qt::LeftButton, {}, from);
    for (int i = 1; i <= 300; ++i) {
        QElapsedTimer timer;
        timer.start();
        QTest::mouseMove(canvas, from + QPoint(i % 20, -(i % 30)));
        QCoreApplication::processEvents();
        window.repaint();
        times.push_back(static_cast<double>(timer.nsecsElapsed()) * 1e-6);
    }
    QTest::mouseRelease(canvas, Qt::LeftButton, {}, from);
    return times;
}

} // namespace

int main(int argc, char **argv)
{
    qputenv("QT_QPA_PLATFORM", "offscreen");
    QElapsedTimer start;
    start.start();
    QApplication application(argc, argv);
    QTemporaryDir folder;
    ui::MainWindow window(folder.path());
    window.resize(1600, 1000);
    window.session().open(twelveSegments(models().front()), {});
    window.show();
    QCoreApplication::processEvents();
    window.repaint();
    std::printf("first window: %.0f ms\n", static_cast<double>(start.nsecsElapsed()) * 1e-6);
    QTest::qWait(200);
    print("change of model", switches(window));
    print("drag frame", frames(window));
    return 0;
}
