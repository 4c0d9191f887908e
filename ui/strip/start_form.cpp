#include "ui/strip/start_form.h"

#include "ui/session/sentences.h"
#include "ui/strip/end_field.h"

#include <array>

namespace quasistat::ui
{

using document::Json;
using units::Quantity;

namespace
{

constexpr std::array startQuantities{Quantity::pressure, Quantity::temperature, Quantity::volume, Quantity::amount};

QString say(const char *text)
{
    return QCoreApplication::translate("StartForm", text);
}

std::string keyOf(Quantity quantity)
{
    return std::string(units::facts(quantity).key);
}

QString wordsOf(Quantity quantity)
{
    switch (quantity) {
    case Quantity::pressure: return say("pressure");
    case Quantity::temperature: return say("temperature");
    case Quantity::volume: return say("volume");
    default: return say("amount");
    }
}

std::optional<Quantity> quantityOf(const std::string &key)
{
    for (const Quantity quantity : startQuantities)
        if (keyOf(quantity) == key) return quantity;
    return {};
}

std::vector<Quantity> given(const document::Design &design)
{
    std::vector<Quantity> found;
    const Json *start = valueAt(design.json, "/start");
    if (!start || !start->is_object()) return found;
    for (const auto &[key, value] : start->items())
        if (const auto quantity = quantityOf(key)) found.push_back(*quantity);
    return found;
}

const gas::State *startState(const Snapshot &snapshot)
{
    if (!snapshot.evaluation || snapshot.evaluation->path.states.empty()) return nullptr;
    return &snapshot.evaluation->path.states.front().state;
}

double valueIn(const gas::State &state, Quantity quantity)
{
    switch (quantity) {
    case Quantity::pressure: return state.pressure();
    case Quantity::temperature: return state.temperature().value_or(0.0);
    case Quantity::volume: return state.volume();
    default: return state.amount();
    }
}

} // namespace

std::vector<FormField> startForm(const Snapshot &snapshot)
{
    const auto quantities = given(snapshot.design);
    std::vector<FormField> form;
    for (std::size_t i = 0; i < quantities.size(); ++i) {
        FormField field{.id = "start" + std::to_string(i + 1)};
        field.caption = i == 0 ? say("state 1") : i + 1 < quantities.size() ? QString() : say("and");
        for (const Quantity quantity : startQuantities) {
            const bool taken = std::find(quantities.begin(), quantities.end(), quantity) != quantities.end();
            if (!taken || quantity == quantities[i]) field.choices.push_back({keyOf(quantity), wordsOf(quantity)});
        }
        field.chosen = keyOf(quantities[i]);
        field.content = FieldContent::quantity;
        field.quantity = quantities[i];
        field.pointer = "/start/" + field.chosen;
        field.value = typedAt(snapshot.design.json, field.pointer);
        form.push_back(std::move(field));
    }
    return form;
}

document::Design startChosen(const Snapshot &snapshot, const FormField &field, const std::string &key)
{
    const auto quantity = quantityOf(key);
    const gas::State *state = startState(snapshot);
    if (!quantity || key == field.chosen) return snapshot.design;
    const QString value = state ? typedValue(valueIn(*state, *quantity), *quantity, snapshot.units) : QString();
    Json start = Json::object();
    for (const auto &[name, old] : snapshot.design.json["start"].items()) {
        if (name == field.chosen)
            start[key] = value.toStdString();
        else
            start[name] = old;
    }
    return withValue(snapshot.design, "/start", start);
}

document::Design startEntered(const document::Design &design, const FormField &field, const QString &text)
{
    return withValue(design, field.pointer, text.trimmed().toStdString());
}

QStringList startWords(const document::Design &design)
{
    QStringList words;
    for (const Quantity quantity : given(design)) words << asPrinted(typedAt(design.json, "/start/" + keyOf(quantity)));
    return words;
}

QString startFault(const Snapshot &snapshot)
{
    if (snapshot.failure) return sentenceOf(*snapshot.failure, snapshot.units);
    if (snapshot.evaluation && snapshot.evaluation->path.startFailure)
        return sentenceOf(*snapshot.evaluation->path.startFailure, snapshot.units);
    return {};
}

} // namespace quasistat::ui
