// The single fields of a gas.

#include "ui/gas/gas_editor.h"
#include "ui/gas/gas_words.h"
#include "ui/session/design_reading.h"

#include <QCoreApplication>

namespace quasistat::ui
{

namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("Gas", text);
}

FormField valueField(const char *id, const QString &caption, FieldContent content, const document::Design &design)
{
    FormField field{.id = id, .caption = caption};
    field.content = content;
    field.pointer = std::string("/gas/") + id;
    field.value = typedAt(design.json, field.pointer);
    return field;
}

} // namespace

std::vector<FormField> gasForm(const document::Design &design, const gas::Library &library)
{
    FormField model{.id = "model", .caption = say("model")};
    for (const std::string_view key : gasModels) model.choices.push_back({std::string(key), modelChoiceWords(key)});
    model.chosen = typedAt(design.json, "/gas/model").toStdString();
    std::vector<FormField> form{model};
    if (model.chosen == "perfect") {
        form.push_back(valueField("heat_capacity_ratio", QStringLiteral("γ"), FieldContent::number, design));
        FormField mass = valueField("molar_mass", say("molar mass"), FieldContent::quantity, design);
        mass.quantity = units::Quantity::molarMass;
        form.push_back(mass);
        FormField name = valueField("name", say("called"), FieldContent::text, design);
        name.optional = true;
        form.push_back(name);
    } else if (model.chosen == "reference") {
        FormField fluid = valueField("fluid", say("gas"), FieldContent::text, design);
        fluid.placeholder = say("name or formula");
        fluid.suggestions = suggestionsOf(gasesOf("reference", library));
        form.push_back(fluid);
    }
    return form;
}

} // namespace quasistat::ui
