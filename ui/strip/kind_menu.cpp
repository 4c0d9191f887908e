#include "ui/strip/kind_menu.h"

#include "ui/look/glyph.h"

namespace quasistat::ui
{

void addKinds(QMenu &menu, const Palette &look, const std::function<void(path::Kind)> &choose)
{
    for (const path::KindFacts &entry : path::kindTable) {
        const QString words = QString::fromUtf8(entry.words.data(), static_cast<qsizetype>(entry.words.size()));
        QAction *action = menu.addAction(glyphIcon(entry.kind, look), words);
        action->setObjectName(QString::fromUtf8(entry.key.data(), static_cast<qsizetype>(entry.key.size())));
        QObject::connect(action, &QAction::triggered, &menu, [choose, kind = entry.kind] { choose(kind); });
    }
}

} // namespace quasistat::ui
