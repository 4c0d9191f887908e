#include "ui/window/action_table.h"

#include <QCoreApplication>

namespace quasistat::ui
{

QMap<ActionId, QAction *> createActions(QObject *owner)
{
    QMap<ActionId, QAction *> actions;
    for (const ActionFacts &entry : actionTable) {
        auto *action = new QAction(QCoreApplication::translate("Actions", entry.text), owner);
        action->setObjectName(QLatin1String(entry.name));
        action->setShortcut(QKeySequence(QLatin1String(entry.key)));
        action->setShortcutContext(Qt::WindowShortcut);
        actions.insert(entry.id, action);
    }
    return actions;
}

} // namespace quasistat::ui
