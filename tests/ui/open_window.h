#pragma once
// A window with a design in it, its settings and recovery files in a folder of its own.

#include "core/document/file.h"
#include "ui/session/design_reading.h"
#include "ui/window/main_window.h"

#include <QSettings>
#include <QSignalSpy>
#include <QTemporaryDir>
#include <QTest>

namespace quasistat::ui
{

/// Before any test that reads settings: they go to `folder`, never to the user's.
inline void isolateSettings(const QTemporaryDir &folder)
{
    QCoreApplication::setOrganizationName(QStringLiteral("QuasistatTest"));
    QCoreApplication::setApplicationName(QStringLiteral("test"));
    QSettings::setPath(QSettings::NativeFormat, QSettings::UserScope, folder.path());
    QSettings().clear();
}

inline document::Design sampleDesign(const char *name)
{
    const auto text = document::fileText(std::string(SAMPLES_DIR) + "/" + name + ".qpath");
    document::Position position;
    return *document::read(*text, position);
}

/// Shown at the size the pictures have.
inline void showWith(MainWindow &window, const document::Design &design)
{
    window.resize(1440, 900);
    window.session().open(design, QString());
    window.show();
    QVERIFY(QTest::qWaitForWindowExposed(&window));
    QTest::qWait(30);
}

inline QString typedEnd(const MainWindow &window, int segment, const char *key)
{
    const auto &design = const_cast<MainWindow &>(window).session().now().design;
    return typedAt(design.json, segmentPointer(segment, std::string("/end/") + key));
}

/// Replaces a field's text with real keys.
inline void typeInto(QWidget *field, const QString &text)
{
    QTest::keyClick(field, Qt::Key_A, Qt::ControlModifier);
    QTest::keyClicks(field, text);
}

} // namespace quasistat::ui
