#include "ui/session/settings.h"

#include <QFileInfo>

namespace quasistat::ui
{

void Settings::rememberFile(const QString &path)
{
    constexpr int kept = 10;
    const QString absolute = QFileInfo(path).absoluteFilePath();
    QStringList files = value(settings::recentFiles);
    files.removeAll(absolute);
    files.prepend(absolute);
    while (files.size() > kept) files.removeLast();
    set(settings::recentFiles, files);
    set(settings::lastFolder, QFileInfo(absolute).absolutePath());
}

void Settings::forgetFile(const QString &path)
{
    QStringList files = value(settings::recentFiles);
    files.removeAll(QFileInfo(path).absoluteFilePath());
    set(settings::recentFiles, files);
}

} // namespace quasistat::ui
