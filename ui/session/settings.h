#pragma once
// What the program remembers between starts: one typed declaration each.

#include <QByteArray>
#include <QSettings>
#include <QStringList>

namespace quasistat::ui
{

/// One remembered value: its key and what holds before anybody has chosen.
template <class T>
struct Setting {
    QLatin1String key;
    T fallback;
};

namespace settings
{
inline const Setting<QStringList> recentFiles{QLatin1String("recentFiles"), {}};
inline const Setting<QByteArray> windowGeometry{QLatin1String("windowGeometry"), {}};
inline const Setting<int> ledgerWidth{QLatin1String("ledgerWidth"), 340};
inline const Setting<QString> scheme{QLatin1String("scheme"), QStringLiteral("system")}; ///< light, dark or system
inline const Setting<QString> lastFolder{QLatin1String("lastFolder"), {}};
} // namespace settings

class Settings
{
public:
    /// The user's own file, by organisation and application name.
    Settings() = default;

    template <class T>
    [[nodiscard]] T value(const Setting<T> &setting) const
    {
        return m_store.value(setting.key, QVariant::fromValue(setting.fallback)).template value<T>();
    }
    template <class T>
    void set(const Setting<T> &setting, const T &value)
    {
        m_store.setValue(setting.key, QVariant::fromValue(value));
    }

    /// Puts `path` first; at most ten are kept. Files that are gone stay listed: a drive may come back.
    void rememberFile(const QString &path);
    void forgetFile(const QString &path);

private:
    QSettings m_store;
};

} // namespace quasistat::ui
