#include "ui/window/header_forms.h"

#include "ui/gas/gas_words.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"
#include "ui/strip/segment_form.h"

#include <QCoreApplication>

namespace quasistat::ui
{

using document::Design;
using units::Quantity;

namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("Header", text);
}

const QString dot = QStringLiteral(" · ");

FormField valueField(const char *id, const char *caption, FieldContent content, const char *pointer,
                     const Design &design, Quantity quantity = Quantity::number)
{
    FormField field{.id = id, .caption = say(caption)};
    field.content = content;
    field.pointer = pointer;
    field.quantity = quantity;
    field.value = typedAt(design.json, pointer);
    return field;
}

// --- title block

QString numberAndRevision(const Design &design)
{
    const QString number = typedAt(design.json, "/document/number");
    const QString revision = typedAt(design.json, "/document/revision");
    if (number.isEmpty()) return revision.isEmpty() ? say("number · revision") : say("revision %1").arg(revision);
    return revision.isEmpty() ? number : number + dot + say("revision %1").arg(revision);
}

std::vector<FormField> titleForm(const Design &design)
{
    std::vector<FormField> form;
    const auto add = [&](const char *id, const char *caption, const char *pointer) {
        form.push_back(valueField(id, caption, FieldContent::text, pointer, design));
    };
    add("title", QT_TRANSLATE_NOOP("Header", "title"), "/title");
    add("number", QT_TRANSLATE_NOOP("Header", "number"), "/document/number");
    add("revision", QT_TRANSLATE_NOOP("Header", "revision"), "/document/revision");
    add("date", QT_TRANSLATE_NOOP("Header", "date"), "/document/date");
    add("organisation", QT_TRANSLATE_NOOP("Header", "for"), "/document/organisation");
    add("prepared_by", QT_TRANSLATE_NOOP("Header", "prepared"), "/document/prepared_by");
    add("checked_by", QT_TRANSLATE_NOOP("Header", "checked"), "/document/checked_by");
    add("approved_by", QT_TRANSLATE_NOOP("Header", "approved"), "/document/approved_by");
    add("notes", QT_TRANSLATE_NOOP("Header", "notes"), "/notes");
    return form;
}

// --- surroundings, units, rate

RichText surroundingsWords(const Snapshot &snapshot)
{
    const QString pressure = typedAt(snapshot.design.json, "/surroundings/pressure");
    const QString temperature = typedAt(snapshot.design.json, "/surroundings/temperature");
    const auto orDefault = [&](const QString &text, double value, Quantity quantity) {
        return text.isEmpty() ? shownFigure(value, quantity, snapshot.units) : asPrinted(text);
    };
    const path::Surroundings standard;
    return RichText::plain(orDefault(pressure, standard.pressure, Quantity::pressure) + dot +
                           orDefault(temperature, standard.temperature, Quantity::temperature));
}

std::vector<FormField> surroundingsForm(const Snapshot &snapshot)
{
    std::vector<FormField> form{valueField("pressure", QT_TRANSLATE_NOOP("Header", "pressure"), FieldContent::quantity,
                                           "/surroundings/pressure", snapshot.design, Quantity::pressure),
                                valueField("temperature", QT_TRANSLATE_NOOP("Header", "temperature"),
                                           FieldContent::quantity, "/surroundings/temperature", snapshot.design,
                                           Quantity::temperature)};
    form[0].placeholder = QStringLiteral("101.325 kPa");
    form[1].placeholder = QStringLiteral("25 °C");
    for (FormField &field : form) field.optional = true;
    return form;
}

FormField unitField(const char *id, const char *caption, const std::string &now,
                    std::initializer_list<const char *> offered)
{
    FormField field{.id = id, .caption = say(caption)};
    bool known = now.empty();
    for (const char *unit : offered) {
        const QString words = *unit ? QString::fromUtf8(unit) : say(QT_TRANSLATE_NOOP("Header", "as it reads well"));
        field.choices.push_back({unit, words});
        known = known || now == unit;
    }
    if (!known) field.choices.push_back({now, QString::fromStdString(now)});
    field.chosen = now;
    return field;
}

std::vector<FormField> unitsForm(const units::DisplayUnits &units)
{
    return {unitField("pressure", QT_TRANSLATE_NOOP("Header", "pressure"), units.pressure,
                      {"bar", "mbar", "kPa", "MPa", "Pa", "atm", "psi"}),
            unitField("volume", QT_TRANSLATE_NOOP("Header", "volume"), units.volume,
                      {"L", "mL", "cm3", "m3", "ft3", "in3"}),
            unitField("temperature", QT_TRANSLATE_NOOP("Header", "temperature"), units.temperature, {"°C", "K", "°F"}),
            unitField("energy", QT_TRANSLATE_NOOP("Header", "energy"), units.energy,
                      {"", "J", "kJ", "MJ", "Wh", "kWh", "cal", "kcal"})};
}

RichText unitsWords(const units::DisplayUnits &units)
{
    QStringList names;
    for (const Quantity quantity : {Quantity::pressure, Quantity::volume, Quantity::temperature, Quantity::energy})
        names << QString::fromStdString(units::scaleFor(quantity, {}, units).unit);
    return RichText::plain(names.join(dot));
}

} // namespace

HeaderText headerText(HeaderPart part, const Snapshot &snapshot)
{
    switch (part) {
    case HeaderPart::title: {
        const QString title = typedAt(snapshot.design.json, "/title");
        return {numberAndRevision(snapshot.design), RichText::plain(title.isEmpty() ? say("untitled design") : title)};
    }
    case HeaderPart::gas: return {say("gas"), gasWords(snapshot.design)};
    case HeaderPart::surroundings: return {say("surroundings"), surroundingsWords(snapshot)};
    case HeaderPart::sign:
        return {say("work and heat"),
                RichText::plain(snapshot.units.workByGas ? say("positive by the gas") : say("positive into the gas"))};
    case HeaderPart::units: return {say("units"), unitsWords(snapshot.units)};
    case HeaderPart::rate: {
        const QString rate = typedAt(snapshot.design.json, "/rate");
        return {say("rate"), RichText::plain(rate.isEmpty() ? say("none") : asPrinted(rate))};
    }
    }
    return {};
}

std::vector<FormField> headerForm(HeaderPart part, const Snapshot &snapshot)
{
    switch (part) {
    case HeaderPart::title: return titleForm(snapshot.design);
    case HeaderPart::gas: return {}; // its editor is one of its own
    case HeaderPart::surroundings: return surroundingsForm(snapshot);
    case HeaderPart::sign: return {};
    case HeaderPart::units: return unitsForm(snapshot.units);
    case HeaderPart::rate: {
        FormField field = valueField("rate", QT_TRANSLATE_NOOP("Header", "cycles"), FieldContent::quantity, "/rate",
                                     snapshot.design, Quantity::frequency);
        field.placeholder = QStringLiteral("60 1/min");
        field.optional = true;
        return {field};
    }
    }
    return {};
}

Design headerEntered(const Design &design, const FormField &field, const QString &text)
{
    return field.content == FieldContent::number ? withValue(design, field.pointer, numberAsTyped(text))
                                                 : withText(design, field.pointer, text);
}

Design headerChosen(const Snapshot &snapshot, const FormField &field, const std::string &key)
{
    return withValue(snapshot.design, "/view/units/" + field.id, key);
}

Design signTurned(const Snapshot &snapshot)
{
    return snapshot.units.workByGas ? withoutValue(snapshot.design, "/view/sign")
                                    : withValue(snapshot.design, "/view/sign", "by the gas");
}

} // namespace quasistat::ui
