// From mouse move to painted frame while a handle is dragged: 50 perfect-gas segments in a window of 1600 × 1000,
// offscreen. Prints median and 99th percentile of 300 frames.

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

document::Design fiftySegments()
{
    using document::Json;
    Json segments = Json::array();
    for (int i = 0; i < 10; ++i) {
        segments.push_back({{"kind", "isothermal"}, {"end", {{"pressure_ratio", 2.0}}}});
        segments.push_back({{"kind", "isobaric"}, {"end", {{"temperature", "420 K"}}}});
        segments.push_back({{"kind", "polytropic"}, {"exponent", 1.3}, {"end", {{"pressure_ratio", 0.5}}}});
        segments.push_back({{"kind", "isentropic"}, {"end", {{"volume_ratio", 1.1}}}});
        segments.push_back({{"kind", "isochoric"}, {"end", {{"temperature", "300 K"}}}});
    }
    return {{{"quasistat", 1},
             {"gas", {{"model", "perfect"}, {"heat_capacity_ratio", 1.4}, {"molar_mass", "28.96 g/mol"}}},
             {"surroundings", {{"pressure", "1 bar"}, {"temperature", "20 °C"}}},
             {"start", {{"pressure", "1 bar"}, {"temperature", "300 K"}, {"volume", "5 L"}}},
             {"segments", segments}}};
}

} // namespace

int main(int argc, char **argv)
{
    qputenv("QT_QPA_PLATFORM", "offscreen");
    QApplication application(argc, argv);
    QTemporaryDir folder;
    ui::MainWindow window(folder.path());
    window.resize(1600, 1000);
    window.session().open(fiftySegments(), {});
    window.show();
    QTest::qWait(200);

    auto *canvas = window.findChild<ui::Canvas *>();
    const auto &state = window.session().now().evaluation->path.states.at(1).state;
    const QPoint from =
        canvas->diagram().mapTo(canvas, canvas->diagram().plane().pixel(state.volume(), state.pressure()).toPoint());
    std::vector<double> frames;
    QTest::mousePress(canvas, Qt::LeftButton, {}, from);
    for (int i = 1; i <= 300; ++i) {
        QElapsedTimer timer;
        timer.start();
        QTest::mouseMove(canvas, from + QPoint(i % 40, -(i % 60)));
        QCoreApplication::processEvents();
        window.repaint();
        frames.push_back(static_cast<double>(timer.nsecsElapsed()) * 1e-6);
    }
    QTest::mouseRelease(canvas, Qt::LeftButton, {}, from);
    std::sort(frames.begin(), frames.end());
    std::printf("drag_repaint: median %.2f ms, 99th percentile %.2f ms of %zu frames\n", frames[frames.size() / 2],
                frames[frames.size() * 99 / 100], frames.size());
    return 0;
}
