#include "ui/canvas/limit_text.h"

#include "core/units/display.h"
#include "core/units/unit.h"

#include <QCoreApplication>

namespace quasistat::ui
{
namespace
{

using analysis::LimitQuantity;

QString symbol(LimitQuantity quantity)
{
    switch (quantity) {
    case LimitQuantity::pressure: return QStringLiteral("<i>p</i>");
    case LimitQuantity::volume: return QStringLiteral("<i>V</i>");
    case LimitQuantity::temperature: return QStringLiteral("<i>T</i>");
    case LimitQuantity::pressureRatio: return QStringLiteral("<i>p</i><sub>max</sub>/<i>p</i><sub>min</sub>");
    case LimitQuantity::work: return QStringLiteral("<i>W</i>");
    case LimitQuantity::heat: return QStringLiteral("<i>Q</i>");
    case LimitQuantity::amount: return QStringLiteral("<i>n</i>");
    case LimitQuantity::storedEnergy: return QStringLiteral("<i>E</i>");
    }
    return {};
}

units::Quantity quantityOf(LimitQuantity quantity)
{
    switch (quantity) {
    case LimitQuantity::pressure: return units::Quantity::pressure;
    case LimitQuantity::volume: return units::Quantity::volume;
    case LimitQuantity::temperature: return units::Quantity::temperature;
    case LimitQuantity::amount: return units::Quantity::amount;
    case LimitQuantity::pressureRatio: return units::Quantity::number;
    case LimitQuantity::work:
    case LimitQuantity::heat:
    case LimitQuantity::storedEnergy: return units::Quantity::energy;
    }
    return units::Quantity::number;
}

QString typedBound(const Snapshot &snapshot, std::size_t limit, bool upper)
{
    const auto &json = snapshot.design.json;
    if (!json.is_object() || !json.contains("limits")) return {};
    const auto &limits = json.at("limits");
    const char *key = upper ? "max" : "min";
    if (!limits.is_array() || limit >= limits.size() || !limits[limit].is_object() || !limits[limit].contains(key))
        return {};
    const auto &bound = limits[limit].at(key);
    return bound.is_string() ? printed(QString::fromStdString(bound.get<std::string>())) : QString();
}

} // namespace

QString printed(const QString &typed)
{
    QString text = typed;
    for (const auto &mark : {QStringLiteral("±"), QStringLiteral("+/-")})
        if (const qsizetype at = text.indexOf(mark); at >= 0) text.truncate(at);
    text = text.trimmed();
    // The unit begins at the first character that cannot be part of a number.
    qsizetype end = 0;
    while (end < text.size() && QStringLiteral("+-0123456789.eE \u2212").contains(text.at(end))) ++end;
    QString number = text.left(end).trimmed();
    number.replace(QLatin1Char('-'), QChar(0x2212));
    if (end == text.size()) return number;
    return number + QChar(0x202F) + QString::fromStdString(units::printedUnit(text.mid(end).toStdString()));
}

RichText limitText(const Snapshot &snapshot, std::size_t index, bool upper)
{
    const analysis::Limit &limit = snapshot.evaluation->limits[index];
    RichText text;
    if (!limit.label.empty())
        text = RichText::plain(QCoreApplication::translate("Diagram", "%1: ", "label of a limit, before its bound")
                                   .arg(QString::fromStdString(limit.label)));
    if (!limit.maxAt.empty())
        return text + RichText::marked(QCoreApplication::translate("Diagram", "<i>p</i> rated by <i>T</i>"));
    QString value = typedBound(snapshot, index, upper);
    const auto bound = upper ? limit.max : limit.min;
    if (value.isEmpty() && bound)
        value = QString::fromStdString(units::shown(*bound, quantityOf(limit.quantity), snapshot.units));
    text += RichText::marked(symbol(limit.quantity) + QStringLiteral(" "));
    text += RichText::plain((upper ? QStringLiteral("≤ ") : QStringLiteral("≥ ")) + value);
    return text;
}

} // namespace quasistat::ui
