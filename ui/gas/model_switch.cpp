#include "ui/gas/model_switch.h"

#include "ui/gas/gas_list.h"
#include "ui/gas/gas_words.h"
#include "ui/session/design_reading.h"

#include <QCoreApplication>

#include <cmath>

namespace quasistat::ui
{

using document::Design;
using document::Json;

namespace
{

constexpr const char *massMark = " by mass";

QString say(const char *text)
{
    return QCoreApplication::translate("Gas", text);
}

bool isCubic(const std::string &model)
{
    return model == "peng-robinson" || model == "soave-redlich-kwong";
}

/// The shares of dry air in the format, as a person writes them out.
bool isAir(const Json &composition)
{
    return composition == Json{{"air", 1}} || composition == Json{{"air", 1.0}} ||
           (composition.size() == 3 && composition.value("nitrogen", Json()) == 0.7812 &&
            composition.value("oxygen", Json()) == 0.2096 && composition.value("argon", Json()) == 0.0092);
}

/// A mixture with the key it stands under.
struct Mixture {
    std::string key;
    Json shares;
};

Mixture mixtureFromText(QString text)
{
    const QLatin1String mark(massMark);
    const bool byMass = text.endsWith(mark);
    if (byMass) text.chop(mark.size());
    const auto shares = compositionFrom(text);
    return {byMass ? "composition_by_mass" : "composition", shares ? *shares : Json{{text.toStdString(), 1}}};
}

/// A perfect gas goes by its own name or, near 28.96 g/mol, for air.
Mixture mixtureFromPerfect(const Snapshot &snapshot, const gas::Library &library)
{
    QString name = typedAt(snapshot.design.json, "/gas/name").trimmed();
    if (name.startsWith(QLatin1String("dry "), Qt::CaseInsensitive)) name = name.mid(4);
    if (const GasEntry *known = gasNamed(gasesOf("ideal", library), name))
        return {"composition", Json{{known->name.toStdString(), 1}}};
    if (const auto parts = compositionFrom(name.toLower()); parts && parts->size() > 1) return {"composition", *parts};
    constexpr double airMass = 0.02896;
    const bool isLikeAir =
        snapshot.evaluation && std::abs(snapshot.evaluation->path.gas->molarMass() / airMass - 1.0) < 0.005;
    if (isLikeAir && name.isEmpty()) return {"composition", Json{{"air", 1}}};
    return {"composition", name.isEmpty() ? Json::object() : Json{{name.toStdString(), 1}}};
}

Mixture mixtureOf(const Snapshot &snapshot, const gas::Library &library)
{
    const Json &json = snapshot.design.json;
    if (const Json *byMass = valueAt(json, "/gas/composition_by_mass")) return {"composition_by_mass", *byMass};
    if (const Json *shares = valueAt(json, "/gas/composition")) return {"composition", *shares};
    if (const QString fluid = typedAt(json, "/gas/fluid"); !fluid.isEmpty()) return mixtureFromText(fluid);
    return mixtureFromPerfect(snapshot, library);
}

std::string fluidText(const Mixture &mixture)
{
    if (isAir(mixture.shares)) return "air";
    if (mixture.shares.is_object() && mixture.shares.size() == 1) return mixture.shares.begin().key();
    const std::string text = compositionText(mixture.shares).toStdString();
    return mixture.key == "composition" ? text : text + massMark;
}

Json perfectFrom(const Snapshot &snapshot)
{
    const QString name = gasName(snapshot.design);
    Json gas{{"model", "perfect"}, {"heat_capacity_ratio", 1.4}, {"molar_mass", "28.96 g/mol"}};
    if (snapshot.evaluation) {
        const gas::Gas &now = *snapshot.evaluation->path.gas;
        const auto &states = snapshot.evaluation->path.states;
        const double temperature = states.empty() ? 298.15 : states.front().state.temperature().value_or(298.15);
        gas["heat_capacity_ratio"] = std::round(gas::idealHeatCapacityRatio(now, temperature) * 1e4) / 1e4;
        gas["molar_mass"] = QStringLiteral("%1 g/mol").arg(now.molarMass() * 1e3, 0, 'g', 6).toStdString();
    }
    if (!name.isEmpty()) gas["name"] = name.toStdString();
    return gas;
}

} // namespace

Json gasInModel(const Snapshot &snapshot, const std::string &model, const gas::Library &library)
{
    const Json &now = snapshot.design.json.contains("gas") ? snapshot.design.json.at("gas") : Json();
    if (model == "perfect") return perfectFrom(snapshot);
    const Mixture mixture = mixtureOf(snapshot, library);
    if (model == "reference") return Json{{"model", model}, {"fluid", fluidText(mixture)}};
    Json gas{{"model", model}, {mixture.key, mixture.shares}};
    if (isCubic(model) && now.is_object())
        for (const char *key : {"components", "binary_interaction"})
            if (now.contains(key)) gas[key] = now.at(key);
    return gas;
}

Design ModelSwitch::switched(const Snapshot &snapshot, const std::string &model, const gas::Library &library)
{
    const Json now = snapshot.design.json.value("gas", Json::object());
    const std::string leaving = typedAt(snapshot.design.json, "/gas/model").toStdString();
    Json next = gasInModel(snapshot, model, library);
    // Unchanged since it was left: the way back leads to exactly what was there, γ and interactions included.
    if (const auto left = m_left.find(model); left != m_left.end() && gasInModel(left->second, leaving, library) == now)
        next = left->second.design.json.at("gas");
    m_left[leaving] = snapshot;
    return withValue(snapshot.design, "/gas", next);
}

QString lackingWords(const Design &design, const gas::Library &library)
{
    const std::string model = typedAt(design.json, "/gas/model").toStdString();
    const std::vector<GasEntry> gases = gasesOf(model, library);
    if (gases.empty()) return {};
    if (model == "reference") {
        const QString fluid = typedAt(design.json, "/gas/fluid");
        if (fluid.isEmpty() || gasNamed(gases, fluid)) return {};
        const auto parts = mixtureFromText(fluid).shares;
        if (parts.size() > 1)
            return say("A reference equation is of one gas: choose one, or take GERG-2008 or a cubic equation for the "
                       "mixture.");
        return say("There is no reference equation of %1 here.").arg(fluid);
    }
    const Json *own = valueAt(design.json, "/gas/components");
    QStringList lacking;
    for (const char *pointer : {"/gas/composition", "/gas/composition_by_mass"})
        if (const Json *shares = valueAt(design.json, pointer); shares && shares->is_object())
            for (const auto &item : shares->items()) {
                const QString name = QString::fromStdString(item.key());
                const bool isOwn = own && own->is_object() && own->contains(item.key());
                if (!isOwn && !gasNamed(gases, name)) lacking << name;
            }
    if (lacking.isEmpty()) return {};
    return say("%1: there is no %2 in this model.").arg(modelName(model), lacking.join(say(" and no ")));
}

} // namespace quasistat::ui
