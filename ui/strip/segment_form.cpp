#include "ui/strip/segment_form.h"

#include "ui/strip/end_field.h"

namespace quasistat::ui
{

using document::Json;
using path::EndKey;
using path::Kind;
using units::Quantity;

namespace
{

QString words(const char *text)
{
    return QCoreApplication::translate("SegmentForm", text);
}

FormField kindField(const Json &segment)
{
    FormField field{.id = "kind", .caption = words(QT_TRANSLATE_NOOP("SegmentForm", "kind"))};
    for (const path::KindFacts &entry : path::kindTable)
        field.choices.push_back(
            {std::string(entry.key), QString::fromUtf8(entry.words.data(), qsizetype(entry.words.size())), entry.kind});
    field.chosen = typedAt(segment, "/kind").toStdString();
    return field;
}

FormField valueField(std::string id, const char *caption, FieldContent content, std::string pointer,
                     const Json &segment, Quantity quantity = Quantity::number)
{
    FormField field{.id = std::move(id), .caption = words(caption)};
    field.content = content;
    field.quantity = quantity;
    field.value = typedAt(segment, pointer);
    field.pointer = std::move(pointer);
    return field;
}

FormField choiceField(std::string id, const char *caption, const Json &segment, std::vector<FieldChoice> choices)
{
    FormField field{.id = id, .caption = words(caption), .choices = std::move(choices)};
    field.chosen = typedAt(segment, "/" + id).toStdString();
    if (field.chosen.empty()) field.chosen = field.choices.front().key;
    return field;
}

FormField polytropicLaw(const Json &segment)
{
    FormField field =
        valueField("law", QT_TRANSLATE_NOOP("SegmentForm", "law"), FieldContent::none, "/exponent", segment);
    field.choices = {{"exponent", words(QT_TRANSLATE_NOOP("SegmentForm", "exponent"))},
                     {"points", words(QT_TRANSLATE_NOOP("SegmentForm", "from two ends"))}};
    field.chosen = valueAt(segment, "/exponent") ? "exponent" : "points";
    if (field.chosen == "exponent") field.content = FieldContent::number;
    return field;
}

FormField linearLaw(const Json &segment)
{
    FormField field = valueField("law", QT_TRANSLATE_NOOP("SegmentForm", "line"), FieldContent::none, "/stiffness",
                                 segment, Quantity::stiffness);
    field.choices = {{"points", words(QT_TRANSLATE_NOOP("SegmentForm", "to a point"))},
                     {"stiffness", words(QT_TRANSLATE_NOOP("SegmentForm", "stiffness"))}};
    field.chosen = valueAt(segment, "/stiffness") ? "stiffness" : "points";
    if (field.chosen == "stiffness") field.content = FieldContent::quantity;
    return field;
}

FormField thermalField(const Json &segment, bool isothermalFirst)
{
    std::vector<FieldChoice> choices{{"isothermal", words(QT_TRANSLATE_NOOP("SegmentForm", "isothermal"))},
                                     {"adiabatic", words(QT_TRANSLATE_NOOP("SegmentForm", "adiabatic"))}};
    if (!isothermalFirst) std::swap(choices.front(), choices.back());
    return choiceField("thermal", QT_TRANSLATE_NOOP("SegmentForm", "contact"), segment, std::move(choices));
}

void addExternalPressure(std::vector<FormField> &form, const Json &segment)
{
    const bool loaded = valueAt(segment, "/load") != nullptr;
    FormField field =
        valueField("external", QT_TRANSLATE_NOOP("SegmentForm", "against"),
                   loaded ? FieldContent::quantity : FieldContent::quantityOrAt,
                   loaded ? "/load/mass" : "/external_pressure", segment, loaded ? Quantity::mass : Quantity::pressure);
    field.choices = {{"external_pressure", words(QT_TRANSLATE_NOOP("SegmentForm", "pressure"))},
                     {"load", words(QT_TRANSLATE_NOOP("SegmentForm", "loaded piston"))}};
    field.chosen = loaded ? "load" : "external_pressure";
    form.push_back(std::move(field));
    if (loaded)
        form.push_back(valueField("bore", QT_TRANSLATE_NOOP("SegmentForm", "bore"), FieldContent::quantity,
                                  "/load/bore", segment, Quantity::length));
}

void addOwnKeys(std::vector<FormField> &form, const Json &segment, Kind kind)
{
    switch (kind) {
    case Kind::isothermal:
    case Kind::isobaric:
    case Kind::isochoric:
    case Kind::isentropic: return;
    case Kind::polytropic: form.push_back(polytropicLaw(segment)); return;
    case Kind::linear: form.push_back(linearLaw(segment)); return;
    case Kind::constantExternalPressure:
        addExternalPressure(form, segment);
        form.push_back(thermalField(segment, true));
        return;
    case Kind::stepped:
        form.push_back(
            valueField("steps", QT_TRANSLATE_NOOP("SegmentForm", "steps"), FieldContent::count, "/steps", segment));
        form.push_back(choiceField("spacing", QT_TRANSLATE_NOOP("SegmentForm", "spaced by"), segment,
                                   {{"ratio", words(QT_TRANSLATE_NOOP("SegmentForm", "equal ratios"))},
                                    {"pressure", words(QT_TRANSLATE_NOOP("SegmentForm", "equal differences"))}}));
        form.push_back(thermalField(segment, true));
        return;
    case Kind::freeExpansion: form.push_back(thermalField(segment, false)); return;
    }
}

void giveEndValue(FormField &field, const Json &segment, EndKey key)
{
    field.chosen = std::string(path::keyOf(key));
    field.pointer = "/end/" + field.chosen;
    field.quantity = facts(key).quantity;
    field.content = field.quantity == Quantity::number ? FieldContent::number : FieldContent::quantityOrAt;
    field.value = typedAt(segment, field.pointer);
}

FormField singleEnd(const Json &segment, const path::EndChoice &choice)
{
    FormField field{.id = "end", .caption = words(QT_TRANSLATE_NOOP("SegmentForm", "end")), .pointer = "/end"};
    if (choice.needed == 0) field.choices.push_back({"balance", words(QT_TRANSLATE_NOOP("SegmentForm", "balance"))});
    for (const EndKey key : choice.keys) field.choices.push_back({std::string(path::keyOf(key)), endKeyWords(key)});
    field.choices.push_back({"state", words(QT_TRANSLATE_NOOP("SegmentForm", "at state"))});

    const auto keys = endKeysOf(segment);
    if (!keys.empty())
        giveEndValue(field, segment, keys.front());
    else if (valueAt(segment, "/end/state")) {
        field.chosen = "state";
        field.pointer = "/end/state";
        field.content = FieldContent::count;
        field.value = typedAt(segment, "/end/state");
    } else if (choice.needed == 0)
        field.chosen = "balance";
    return field;
}

void addTwoEnds(std::vector<FormField> &form, const Json &segment, const path::EndChoice &choice)
{
    const auto keys = endKeysOf(segment);
    for (std::size_t i = 0; i < 2; ++i) {
        FormField field{.id = i == 0 ? "end" : "end2",
                        .caption = words(i == 0 ? QT_TRANSLATE_NOOP("SegmentForm", "end")
                                                : QT_TRANSLATE_NOOP("SegmentForm", "and"))};
        for (const EndKey key : choice.keys)
            if (i >= keys.size() || key == keys[i] || keys.size() < 2 || key != keys[1 - i])
                field.choices.push_back({std::string(path::keyOf(key)), endKeyWords(key)});
        if (i < keys.size()) giveEndValue(field, segment, keys[i]);
        form.push_back(std::move(field));
    }
}

void addEnd(std::vector<FormField> &form, const Json &segment, const path::EndChoice &choice)
{
    if (choice.needed == 2 && !valueAt(segment, "/end/state"))
        addTwoEnds(form, segment, choice);
    else
        form.push_back(singleEnd(segment, choice));
}

FormField directionField(const Json &segment)
{
    FormField field{.id = "direction", .caption = words(QT_TRANSLATE_NOOP("SegmentForm", "direction"))};
    field.choices = {{"", words(QT_TRANSLATE_NOOP("SegmentForm", "as reached"))},
                     {"compress", words(QT_TRANSLATE_NOOP("SegmentForm", "compress"))},
                     {"expand", words(QT_TRANSLATE_NOOP("SegmentForm", "expand"))}};
    field.chosen = typedAt(segment, "/direction").toStdString();
    return field;
}

void setOrErase(Json &segment, const char *key, const std::string &value)
{
    if (value.empty())
        segment.erase(key);
    else
        segment[key] = value;
}

Json endValueOf(EndKey key, const FormContext &context)
{
    if (!context.result) return std::string();
    const QString text = reachedValue(*context.result, key, context.units);
    return facts(key).quantity == Quantity::number ? numberAsTyped(text) : Json(text.toStdString());
}

/// The end as an object that can take a key; "balance" and an end at a state give way.
Json &endObject(Json &segment)
{
    Json &end = segment["end"];
    if (!end.is_object() || end.contains("state")) end = Json::object();
    return end;
}

void chooseEnd(Json &segment, const FormField &field, const std::string &key, const FormContext &context)
{
    if (key == "balance") {
        segment["end"] = "balance";
        return;
    }
    if (key == "state") {
        segment["end"] = Json{{"state", 1}};
        return;
    }
    const auto endKey = endKeyFrom(key);
    if (!endKey) return;
    const Json value = endValueOf(*endKey, context);
    Json renamed = Json::object(); // keeps the order of two ends, where erase and insert would swap them
    for (const auto &[name, old] : endObject(segment).items()) {
        if (name == field.chosen)
            renamed[key] = value;
        else
            renamed[name] = old;
    }
    renamed[key] = value;
    segment["end"] = renamed;
}

/// An exponent or stiffness taken away needs a second end quantity, one put in needs it gone.
void fitEnds(Json &segment, const FormContext &context)
{
    const auto process = processOf(segment);
    if (!process) return;
    const path::EndChoice choice = path::endChoice(*process);
    auto keys = endKeysOf(segment);
    if (choice.needed == 1 && keys.size() > 1) segment["end"].erase(std::string(path::keyOf(keys.back())));
    if (choice.needed != 2) return;
    Json &end = endObject(segment);
    for (const EndKey key : keys) { // work or ratios cannot stand where two of p, V, T are asked for
        const bool fits = std::find(choice.keys.begin(), choice.keys.end(), key) != choice.keys.end();
        if (!fits) end.erase(std::string(path::keyOf(key)));
    }
    for (const EndKey key : choice.keys)
        if (end.size() < 2 && !end.contains(std::string(path::keyOf(key))))
            end[std::string(path::keyOf(key))] = endValueOf(key, context);
}

void chooseLaw(Json &segment, const std::string &key, const FormContext &context)
{
    if (key == "points") {
        segment.erase("exponent");
        segment.erase("stiffness");
    } else if (key == "exponent") {
        const double exponent = context.result && context.result->exponent ? *context.result->exponent : 1.3;
        segment["exponent"] = numberAsTyped(QString::number(exponent, 'g', 4));
    } else if (context.result) {
        const auto &from = context.result->from;
        const auto &to = context.result->to;
        const double change = to.volume() - from.volume();
        const double stiffness = change == 0.0 ? 1e8 : (to.pressure() - from.pressure()) / change;
        segment["stiffness"] = QStringLiteral("%1 Pa/m3").arg(stiffness, 0, 'g', 5).toStdString();
    } else
        segment["stiffness"] = "1e8 Pa/m3";
    fitEnds(segment, context);
}

void chooseExternal(Json &segment, const std::string &key, const FormContext &context)
{
    if (key == "load") {
        segment.erase("external_pressure");
        segment["load"] = Json{{"mass", "10 kg"}, {"bore", "100 mm"}};
        return;
    }
    segment.erase("load");
    const double pressure = context.result ? context.result->to.pressure() : context.units.surroundingsPressure;
    segment["external_pressure"] = typedValue(pressure, Quantity::pressure, context.units).toStdString();
}

} // namespace

std::vector<FormField> segmentForm(const Json &segment, bool askDirection)
{
    std::vector<FormField> form{kindField(segment)};
    if (const auto process = processOf(segment)) {
        addOwnKeys(form, segment, path::kindOf(*process));
        addEnd(form, segment, path::endChoice(*process));
        if (askDirection || valueAt(segment, "/direction")) form.push_back(directionField(segment));
    }
    form.push_back(
        valueField("label", QT_TRANSLATE_NOOP("SegmentForm", "label"), FieldContent::text, "/label", segment));
    return form;
}

Json segmentChosen(const Json &segment, const FormField &field, const std::string &key, const FormContext &context)
{
    Json changed = segment;
    if (field.id == "end" || field.id == "end2")
        chooseEnd(changed, field, key, context);
    else if (field.id == "law")
        chooseLaw(changed, key, context);
    else if (field.id == "external")
        chooseExternal(changed, key, context);
    else
        setOrErase(changed, field.id.c_str(), key);
    return changed;
}

Json segmentEntered(const Json &segment, const FormField &field, const QString &text)
{
    Json changed = segment;
    const QString trimmed = text.trimmed();
    const Json::json_pointer place(field.pointer);
    if (field.content == FieldContent::text) {
        if (trimmed.isEmpty())
            changed.erase(field.id);
        else
            changed[place] = trimmed.toStdString();
    } else if (field.content == FieldContent::quantity || field.content == FieldContent::quantityOrAt)
        changed[place] = trimmed.toStdString();
    else
        changed[place] = numberAsTyped(trimmed);
    return changed;
}

Json numberAsTyped(const QString &text)
{
    const std::string typedText = text.trimmed().toStdString();
    const Json parsed = Json::parse(typedText, nullptr, false);
    return !parsed.is_discarded() && parsed.is_number() && parsed.dump() == typedText ? parsed : Json(typedText);
}

Json segmentTemplate(Kind kind, const gas::State &from, const units::DisplayUnits &units)
{
    Json segment{{"kind", std::string(path::facts(kind).key)}};
    const auto pressure = [&](double factor) {
        return typedValue(from.pressure() * factor, Quantity::pressure, units).toStdString();
    };
    const auto volume = [&](double factor) {
        return typedValue(from.volume() * factor, Quantity::volume, units).toStdString();
    };
    switch (kind) {
    case Kind::isothermal:
    case Kind::isentropic: segment["end"]["pressure"] = pressure(2); break;
    case Kind::isobaric:
    case Kind::freeExpansion: segment["end"]["volume"] = volume(2); break;
    case Kind::isochoric: segment["end"]["pressure"] = pressure(2); break;
    case Kind::polytropic:
        segment["exponent"] = 1.3;
        segment["end"]["pressure"] = pressure(2);
        break;
    case Kind::linear:
        segment["end"]["pressure"] = pressure(2);
        segment["end"]["volume"] = volume(0.5);
        break;
    case Kind::constantExternalPressure:
        segment["external_pressure"] = pressure(0.5);
        segment["end"] = "balance";
        break;
    case Kind::stepped:
        segment["steps"] = 5;
        segment["end"]["pressure"] = pressure(0.5);
        break;
    }
    return segment;
}

} // namespace quasistat::ui
