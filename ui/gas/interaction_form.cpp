#include "ui/gas/interaction_form.h"

#include "ui/session/design_reading.h"
#include "ui/strip/segment_form.h"

#include <QStringList>

#include <algorithm>

namespace quasistat::ui
{

using document::Design;
using document::Json;

namespace
{

constexpr const char *interactions = "/gas/binary_interaction";

std::string reversed(const std::string &pair)
{
    const auto slash = pair.find('/');
    return slash == std::string::npos ? pair : pair.substr(slash + 1) + "/" + pair.substr(0, slash);
}

void addName(std::vector<std::string> &names, const std::string &name)
{
    if (name == "air")
        for (const char *part : {"nitrogen", "oxygen", "argon"}) addName(names, part);
    else if (std::ranges::find(names, name) == names.end())
        names.push_back(name);
}

/// Pairs "a/b" in the order of the composition; as the document writes them where it does.
std::vector<std::string> pairsOf(const Design &design)
{
    std::vector<std::string> names;
    for (const char *pointer : {"/gas/composition", "/gas/composition_by_mass"})
        if (const Json *shares = valueAt(design.json, pointer); shares && shares->is_object())
            for (const auto &item : shares->items()) addName(names, item.key());
    const Json *stated = valueAt(design.json, interactions);
    const bool isStated = stated && stated->is_object();
    std::vector<std::string> pairs;
    for (std::size_t i = 0; i < names.size(); ++i)
        for (std::size_t j = i + 1; j < names.size(); ++j) {
            const std::string pair = names[i] + "/" + names[j];
            pairs.push_back(isStated && stated->contains(reversed(pair)) ? reversed(pair) : pair);
        }
    if (isStated)
        for (const auto &item : stated->items())
            if (std::ranges::find(pairs, item.key()) == pairs.end()) pairs.push_back(item.key());
    return pairs;
}

} // namespace

std::vector<FormField> interactionForm(const Design &design)
{
    std::vector<FormField> form;
    const Json *stated = valueAt(design.json, interactions);
    for (const std::string &pair : pairsOf(design)) {
        QString caption = QString::fromStdString(pair);
        caption.replace(QLatin1Char('/'), QStringLiteral(" – "));
        FormField field{.id = pair, .caption = caption};
        field.content = FieldContent::number;
        field.placeholder = QStringLiteral("0");
        field.optional = true;
        if (stated && stated->is_object() && stated->contains(pair)) field.value = typed(&stated->at(pair));
        form.push_back(field);
    }
    return form;
}

Design interactionEntered(const Design &design, const FormField &field, const QString &text)
{
    Design changed = design;
    Json &gas = changed.json["gas"];
    Json stated = gas.value("binary_interaction", Json::object());
    if (!stated.is_object()) stated = Json::object();
    if (text.trimmed().isEmpty())
        stated.erase(field.id);
    else
        stated[field.id] = numberAsTyped(text.trimmed());
    if (stated.empty())
        gas.erase("binary_interaction");
    else
        gas["binary_interaction"] = stated;
    return changed;
}

} // namespace quasistat::ui
