#include "ui/gas/own_gas.h"

#include "core/units/measure.h"
#include "ui/session/design_reading.h"
#include "ui/strip/segment_form.h"

#include <QCoreApplication>
#include <QRegularExpression>

#include <array>

namespace quasistat::ui
{

using document::Design;
using document::Json;
using units::Quantity;

namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("Gas", text);
}

struct OwnField {
    const char *id; ///< pointer below the entry
    const char *caption;
    FieldContent content;
    Quantity quantity;
    const char *placeholder;
    bool isNeeded;
};

constexpr std::array fields{
    OwnField{"/critical_temperature", QT_TRANSLATE_NOOP("Gas", "critical temperature"), FieldContent::quantity,
             Quantity::temperature, "190.6 K", true},
    OwnField{"/critical_pressure", QT_TRANSLATE_NOOP("Gas", "critical pressure"), FieldContent::quantity,
             Quantity::pressure, "46.0 bar", true},
    OwnField{"/acentric_factor", QT_TRANSLATE_NOOP("Gas", "acentric factor"), FieldContent::number, Quantity::number,
             "0.011", true},
    OwnField{"/molar_mass", QT_TRANSLATE_NOOP("Gas", "molar mass"), FieldContent::quantity, Quantity::molarMass,
             "16.04 g/mol", true},
    OwnField{"/heat_capacity/cp_over_R", QT_TRANSLATE_NOOP("Gas", "cp/R, powers of T/K"), FieldContent::text,
             Quantity::number, "3.5, 1.2e-3, 0", false},
    OwnField{"/heat_capacity/from", QT_TRANSLATE_NOOP("Gas", "valid from"), FieldContent::quantity,
             Quantity::temperature, "200 K", false},
    OwnField{"/heat_capacity/to", QT_TRANSLATE_NOOP("Gas", "valid to"), FieldContent::quantity, Quantity::temperature,
             "1000 K", false},
};

QString listText(const Json *list)
{
    if (!list || !list->is_array()) return typed(list);
    QStringList parts;
    for (const Json &entry : *list) parts << typed(&entry);
    return parts.join(QStringLiteral(", "));
}

/// Coefficients as numbers; a text that is none stays as it was typed, for the reader to refuse.
Json coefficients(const QString &text)
{
    static const QRegularExpression between(QStringLiteral("[,;\\s]+"));
    Json list = Json::array();
    for (const QString &part : text.split(between, Qt::SkipEmptyParts)) list.push_back(numberAsTyped(part));
    return list;
}

bool has(const OwnGas &gas, const char *pointer)
{
    return valueAt(gas.facts, pointer) != nullptr;
}

} // namespace

std::vector<OwnGas> ownGases(const Design &design)
{
    std::vector<OwnGas> gases;
    if (const Json *own = valueAt(design.json, "/gas/components"); own && own->is_object())
        for (const auto &item : own->items()) gases.push_back({QString::fromStdString(item.key()), item.value()});
    return gases;
}

QStringList ownGasNames(const Design &design)
{
    QStringList names;
    for (const OwnGas &gas : ownGases(design)) names << gas.name;
    return names;
}

std::vector<FormField> ownGasForm(const OwnGas &gas)
{
    FormField name{.id = "name", .caption = say("called")};
    name.content = FieldContent::text;
    name.value = gas.name;
    name.placeholder = say("a name of your own");
    std::vector<FormField> form{name};
    for (const OwnField &entry : fields) {
        FormField field{.id = entry.id, .caption = say(entry.caption)};
        field.content = entry.content;
        field.quantity = entry.quantity;
        field.placeholder = QString::fromUtf8(entry.placeholder);
        field.optional = !entry.isNeeded;
        field.value = listText(valueAt(gas.facts, entry.id));
        form.push_back(field);
    }
    return form;
}

OwnGas ownGasEntered(const OwnGas &gas, const FormField &field, const QString &text)
{
    OwnGas changed = gas;
    const QString trimmed = text.trimmed();
    if (field.id == "name") {
        changed.name = trimmed;
        return changed;
    }
    const Json::json_pointer place(field.id);
    if (trimmed.isEmpty()) {
        if (!changed.facts.contains(place)) return changed;
        changed.facts.at(place.parent_pointer()).erase(place.back());
        if (changed.facts.value("heat_capacity", Json{{"", 0}}).empty()) changed.facts.erase("heat_capacity");
        return changed;
    }
    changed.facts[place] = field.content == FieldContent::number ? numberAsTyped(trimmed)
                           : field.content == FieldContent::text ? coefficients(trimmed)
                                                                 : Json(trimmed.toStdString());
    return changed;
}

QString stillMissing(const OwnGas &gas, bool isKnown)
{
    QStringList missing;
    if (gas.name.isEmpty()) missing << say("a name");
    if (isKnown && gas.facts.empty()) missing << say("a value of your own");
    const bool hasHeat = has(gas, "/heat_capacity");
    for (const OwnField &entry : fields) {
        const bool isOfHeat = !entry.isNeeded;
        const bool isNeeded = isOfHeat ? hasHeat : !isKnown;
        if (isNeeded && !has(gas, entry.id)) missing << say(entry.caption);
    }
    return missing.join(QStringLiteral(", "));
}

Design withOwnGases(const Design &design, const std::vector<OwnGas> &gases)
{
    Json own = Json::object();
    for (const OwnGas &gas : gases) own[gas.name.toStdString()] = gas.facts;
    return own.empty() ? withoutValue(design, "/gas/components") : withValue(design, "/gas/components", own);
}

Design renamedInMixture(const Design &design, const QString &before, const QString &after)
{
    Design changed = design;
    const std::string from = before.toStdString();
    for (const char *pointer : {"/gas/composition", "/gas/composition_by_mass"}) {
        const Json *shares = valueAt(design.json, pointer);
        if (!shares || !shares->is_object() || !shares->contains(from)) continue;
        Json renamed = Json::object();
        for (const auto &item : shares->items())
            renamed[item.key() == from ? after.toStdString() : item.key()] = item.value();
        changed = withValue(changed, pointer, renamed);
    }
    return changed;
}

} // namespace quasistat::ui
