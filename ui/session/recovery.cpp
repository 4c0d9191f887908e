#include "ui/session/recovery.h"

#include "core/document/file.h"
#include "ui/session/design_reading.h"

#include <QDir>
#include <QStandardPaths>
#include <QUuid>

namespace quasistat::ui
{

using document::Design;

namespace
{

QString lockOf(const QString &file)
{
    return file + QStringLiteral(".lock");
}

std::unique_ptr<QLockFile> lockFor(const QString &file)
{
    auto lock = std::make_unique<QLockFile>(lockOf(file));
    lock->setStaleLockTime(0); // stale only if its process has ended, however long that takes
    return lock;
}

std::optional<LeftBehind> readBack(const QString &file)
{
    const Outcome<std::string> text = document::fileText(file.toStdString());
    if (!text) return {};
    document::Position position;
    const Outcome<Design> envelope = document::read(*text, position);
    if (!envelope) return {};
    const document::Json *design = valueAt(envelope->json, "/design");
    if (!design || !design->is_object()) return {};
    return LeftBehind{file, typedAt(envelope->json, "/path"), Design{*design}};
}

} // namespace

Recovery::Recovery(const QString &folder) : m_folder(folder)
{
    QDir().mkpath(folder);
    m_file = QDir(folder).filePath(QUuid::createUuid().toString(QUuid::WithoutBraces) + QStringLiteral(".recovery"));
    m_lock = lockFor(m_file);
    m_lock->tryLock(0);
}

Recovery::~Recovery() = default;

QString Recovery::defaultFolder()
{
    return QStandardPaths::writableLocation(QStandardPaths::AppDataLocation) + QStringLiteral("/recovery");
}

bool Recovery::keep(const Design &design, const QString &path)
{
    Design envelope;
    envelope.json = document::Json::object();
    envelope.json["path"] = path.toStdString();
    envelope.json["design"] = design.json;
    return document::writeWhole(m_file.toStdString(), document::written(envelope)).ok();
}

void Recovery::discard()
{
    QFile::remove(m_file);
}

std::vector<LeftBehind> Recovery::leftBehind() const
{
    std::vector<LeftBehind> found;
    const auto files = QDir(m_folder).entryInfoList({QStringLiteral("*.recovery")}, QDir::Files, QDir::Time);
    for (const QFileInfo &info : files) {
        const QString file = info.absoluteFilePath();
        if (QFileInfo(m_file) == info) continue;
        if (!lockFor(file)->tryLock(0)) continue;
        if (auto work = readBack(file)) found.push_back(std::move(*work));
    }
    return found;
}

void Recovery::remove(const LeftBehind &work)
{
    QFile::remove(work.recoveryFile);
    QFile::remove(lockOf(work.recoveryFile));
}

} // namespace quasistat::ui
