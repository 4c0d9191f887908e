#include "ui/ledger/ledger_row.h"

#include <QRegularExpression>

namespace quasistat::ui
{

QString LedgerRow::spoken() const
{
    if (kind == LedgerRowKind::columns) return label.unstyled();
    QStringList parts{lead, label.unstyled()};
    for (qsizetype i = 0; i < figures.size(); ++i) {
        parts << figures[i];
        if (const QString remark = remarks.value(i); !remark.isEmpty()) parts << QStringLiteral("(%1)").arg(remark);
    }
    QString text = parts.filter(QRegularExpression(QStringLiteral("."))).join(QLatin1Char(' '));
    if (!unit.isEmpty()) text += QLatin1Char(' ') + unit;
    return text;
}

} // namespace quasistat::ui
