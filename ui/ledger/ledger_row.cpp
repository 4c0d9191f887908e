#include "ui/ledger/ledger_row.h"

#include <QRegularExpression>

namespace quasistat::ui
{

QString LedgerRow::spoken() const
{
    QStringList parts{lead, label.unstyled()};
    parts += figures;
    QString text = parts.filter(QRegularExpression(QStringLiteral("."))).join(QLatin1Char(' '));
    if (!unit.isEmpty()) text += QLatin1Char(' ') + unit;
    return text;
}

} // namespace quasistat::ui
