#include "ui/window/run_window.h"

#include "ui/window/main_window.h"

namespace quasistat::ui
{

int runWindow(QApplication &application, const QString &file)
{
    QApplication::setOrganizationName(QStringLiteral("Quasistat"));
    QApplication::setApplicationName(QStringLiteral("quasistat"));
    QApplication::setApplicationDisplayName(QStringLiteral("Quasistat"));
    MainWindow window;
    if (!file.isEmpty()) window.openFile(file);
    window.show();
    return application.exec();
}

} // namespace quasistat::ui
