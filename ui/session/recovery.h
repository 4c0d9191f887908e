#pragma once
// Unsaved work, kept beside the user's settings until it is saved or given up, so that no crash loses it.

#include "core/document/design.h"

#include <QLockFile>
#include <QString>

#include <memory>
#include <optional>
#include <vector>

namespace quasistat::ui
{

/// Work left behind by a program that ended without saving.
struct LeftBehind {
    QString recoveryFile;
    QString path; ///< the document's own file; empty if it never had one
    document::Design design;
};

/// The recovery file of this window. Held by a lock as long as the program lives, so that a second window never offers
/// the work of one that is still open.
class Recovery
{
public:
    /// `folder` is made if it does not exist.
    explicit Recovery(const QString &folder);
    ~Recovery();
    Recovery(const Recovery &) = delete;
    Recovery &operator=(const Recovery &) = delete;

    /// QStandardPaths::AppDataLocation + "/recovery".
    [[nodiscard]] static QString defaultFolder();

    /// Writes the file whole. False if the disk refuses; the last copy then stands.
    bool keep(const document::Design &design, const QString &path);
    void discard(); ///< removes this window's file

    /// Files in the folder that no living program holds, newest first; unreadable ones are left alone.
    [[nodiscard]] std::vector<LeftBehind> leftBehind() const;
    static void remove(const LeftBehind &work);

private:
    QString m_folder;
    QString m_file;
    std::unique_ptr<QLockFile> m_lock;
};

} // namespace quasistat::ui
