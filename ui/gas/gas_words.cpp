#include "ui/gas/gas_words.h"

#include "ui/fields/form_field.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"
#include "ui/strip/segment_form.h"

#include <QCoreApplication>
#include <QRegularExpression>

#include <algorithm>
#include <cmath>

namespace quasistat::ui
{

using document::Design;
using document::Json;

namespace
{

struct ModelWords {
    std::string_view key;
    const char *name;
    const char *choice;
};

constexpr std::array table{
    ModelWords{"perfect", QT_TRANSLATE_NOOP("Gas", "perfect gas"),
               QT_TRANSLATE_NOOP("Gas", "Perfect gas: constant heat capacity")},
    ModelWords{"ideal", QT_TRANSLATE_NOOP("Gas", "ideal gas"),
               QT_TRANSLATE_NOOP("Gas", "Ideal gas: published heat capacities")},
    ModelWords{"peng-robinson", QT_TRANSLATE_NOOP("Gas", "Peng–Robinson"),
               QT_TRANSLATE_NOOP("Gas", "Peng–Robinson: cubic, any mixture")},
    ModelWords{"soave-redlich-kwong", QT_TRANSLATE_NOOP("Gas", "Soave–Redlich–Kwong"),
               QT_TRANSLATE_NOOP("Gas", "Soave–Redlich–Kwong: cubic, any mixture")},
    ModelWords{"gerg-2008", QT_TRANSLATE_NOOP("Gas", "GERG-2008"),
               QT_TRANSLATE_NOOP("Gas", "GERG-2008: natural gases, air, 21 components")},
    ModelWords{"reference", QT_TRANSLATE_NOOP("Gas", "reference equation"),
               QT_TRANSLATE_NOOP("Gas", "Reference equation: one gas, most exact")},
};

QString say(const char *text)
{
    return QCoreApplication::translate("Gas", text);
}

QString keyText(std::string_view key)
{
    return QString::fromUtf8(key.data(), static_cast<qsizetype>(key.size()));
}

} // namespace

namespace
{

/// A mixture of many is called by what it has most of.
QString shortName(const Design &design)
{
    constexpr std::size_t mostNamed = 3;
    for (const char *pointer : {"/gas/composition", "/gas/composition_by_mass"}) {
        const Json *shares = valueAt(design.json, pointer);
        if (!shares || !shares->is_object() || shares->size() <= mostNamed) continue;
        const auto most = std::max_element(shares->begin(), shares->end(), [](const Json &a, const Json &b) {
            return typed(&a).toDouble() < typed(&b).toDouble();
        });
        return say("%1 %2 and %3 more").arg(QString::fromStdString(most.key()), typed(&*most)).arg(shares->size() - 1);
    }
    return gasName(design);
}

} // namespace

QString modelName(std::string_view model)
{
    for (const ModelWords &words : table)
        if (words.key == model) return say(words.name);
    return keyText(model);
}

QString modelChoiceWords(std::string_view model)
{
    for (const ModelWords &words : table)
        if (words.key == model) return say(words.choice);
    return keyText(model);
}

QString gasName(const Design &design)
{
    for (const char *pointer : {"/gas/name", "/gas/fluid"})
        if (const QString name = typedAt(design.json, pointer); !name.isEmpty()) return name;
    for (const char *pointer : {"/gas/composition", "/gas/composition_by_mass"})
        if (const Json *composition = valueAt(design.json, pointer)) return compositionText(*composition);
    return {};
}

RichText gasWords(const Design &design)
{
    const QString model = modelName(typedAt(design.json, "/gas/model").toStdString());
    const QString name = shortName(design);
    RichText words = RichText::plain(name.isEmpty() ? model : QStringLiteral("%1, %2").arg(name, model));
    if (valueAt(design.json, "/gas/composition_by_mass")) words += RichText::plain(say(", by mass"));
    const QString ratio = typedAt(design.json, "/gas/heat_capacity_ratio");
    if (!ratio.isEmpty()) words += RichText::marked(QStringLiteral(", <i>γ</i> ")) + RichText::plain(asPrinted(ratio));
    return words;
}

QString rangeWords(const gas::Range &range, const units::DisplayUnits &units)
{
    QString words = say("%1 to %2")
                        .arg(shownFigure(range.lowestTemperature, units::Quantity::temperature, units),
                             shownFigure(range.highestTemperature, units::Quantity::temperature, units));
    if (std::isfinite(range.highestPressure))
        words += say(", up to %1").arg(shownFigure(range.highestPressure, units::Quantity::pressure, units));
    return words;
}

QString validityWords(const gas::Validity &validity, const units::DisplayUnits &units)
{
    QStringList sentences;
    if (std::isfinite(validity.valid.highestTemperature))
        sentences << say("Published range: %1.").arg(rangeWords(validity.valid, units));
    QString uncertainty = QString::fromStdString(validity.uncertainty);
    if (!uncertainty.isEmpty()) {
        if (!uncertainty.endsWith(QLatin1Char('.'))) uncertainty += QLatin1Char('.');
        sentences << say("Published uncertainty: %1").arg(uncertainty);
    }
    return sentences.join(QLatin1Char(' '));
}

QString compositionText(const Json &composition)
{
    if (!composition.is_object()) return {};
    QStringList parts;
    for (const auto &[name, share] : composition.items()) {
        const QString component = QString::fromStdString(name);
        const bool alone = composition.size() == 1 && share == 1;
        parts << (alone ? component : component + QLatin1Char(' ') + typed(&share));
    }
    return parts.join(QStringLiteral(", "));
}

std::optional<Json> compositionFrom(const QString &text)
{
    static const QRegularExpression entry(QStringLiteral("^(.*\\S)\\s+([0-9.eE+-]+)$"));
    // Names such as 1,1-difluoroethane have commas of their own.
    static const QRegularExpression between(QStringLiteral(",(?:\\s+|(?=[A-Za-z]))"));
    const QStringList parts = text.split(between);
    Json composition = Json::object();
    for (const QString &part : parts) {
        const QString trimmed = part.trimmed();
        const auto match = entry.match(trimmed);
        if (trimmed.isEmpty() || (!match.hasMatch() && parts.size() > 1)) return {};
        if (!match.hasMatch()) {
            composition[trimmed.toStdString()] = 1;
            continue;
        }
        bool isNumber = false;
        const double share = match.captured(2).toDouble(&isNumber);
        if (!isNumber) return {};
        const Json asTyped = numberAsTyped(match.captured(2));
        composition[match.captured(1).toStdString()] = asTyped.is_number() ? asTyped : Json(share);
    }
    return composition;
}

} // namespace quasistat::ui
