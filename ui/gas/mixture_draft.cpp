#include "ui/gas/mixture_draft.h"

#include "core/units/measure.h"
#include "ui/session/design_reading.h"
#include "ui/strip/segment_form.h"

#include <QCoreApplication>

#include <cmath>

namespace quasistat::ui
{

using document::Design;
using document::Json;

namespace
{

constexpr double toleratedSum = 1e-4; // of the format

QString say(const char *text)
{
    return QCoreApplication::translate("Gas", text);
}

QString plain(double value)
{
    return QString::number(value, 'g', 6);
}

std::optional<double> shareOf(const MixtureRow &row)
{
    const auto share = units::plainNumber(row.share.trimmed().toStdString());
    return share ? std::optional(share->value) : std::nullopt;
}

/// Two rows name the same gas.
bool isTwice(const MixtureDraft &draft, std::size_t row, const std::vector<GasEntry> &gases)
{
    const auto named = [&](std::size_t i) {
        const GasEntry *gas = gasNamed(gases, draft.rows[i].name);
        return gas ? gas->name : draft.rows[i].name.trimmed();
    };
    for (std::size_t i = 0; i < row; ++i)
        if (named(i) == named(row)) return true;
    return false;
}

QString nameWords(const QString &name, const std::vector<GasEntry> &gases)
{
    const QStringList near = gasesNear(gases, name);
    return near.isEmpty() ? say("There is no gas named “%1” in this model.").arg(name)
                          : say("There is no gas named “%1” in this model; near it: %2.")
                                .arg(name, near.join(QStringLiteral(", ")));
}

QString rowWords(const MixtureDraft &draft, std::size_t index, const std::vector<GasEntry> &gases,
                 const QStringList &own)
{
    const MixtureRow &row = draft.rows[index];
    const QString name = row.name.trimmed();
    if (name.isEmpty()) return row.share.trimmed().isEmpty() ? QString() : say("Name the gas.");
    if (!own.contains(name) && !gasNamed(gases, name)) return nameWords(name, gases);
    if (isTwice(draft, index, gases)) return say("%1 stands twice: join the two rows.").arg(name);
    if (row.share.trimmed().isEmpty()) return say("Write its fraction.");
    const auto share = shareOf(row);
    if (!share) return say("A fraction is a number such as 0.21.");
    if (*share < 0.0 || *share > 1.0) return say("A fraction lies between 0 and 1.");
    return {};
}

/// What was stated of a pair goes with the gas that has gone.
void dropPairsWithout(Json &gas, const Json &before, const Json &shares)
{
    const auto stated = gas.find("binary_interaction");
    if (stated == gas.end() || !stated->is_object()) return;
    const auto has = [](const Json &mixture, const std::string &name) {
        const bool isOfAir = name == "nitrogen" || name == "oxygen" || name == "argon";
        return mixture.contains(name) || (isOfAir && mixture.contains("air"));
    };
    const auto isGone = [&](const std::string &name) { return has(before, name) && !has(shares, name); };
    Json kept = Json::object();
    for (const auto &pair : stated->items()) {
        const auto slash = pair.key().find('/');
        if (slash == std::string::npos ||
            (!isGone(pair.key().substr(0, slash)) && !isGone(pair.key().substr(slash + 1))))
            kept[pair.key()] = pair.value();
    }
    if (kept.empty())
        gas.erase("binary_interaction");
    else
        *stated = kept;
}

QString sumWords(double sum)
{
    const double off = sum - 1.0;
    if (std::abs(off) < 1e-12) return say("sum 1");
    if (std::abs(off) <= toleratedSum) return say("sum %1, divided by it").arg(QString::number(sum, 'g', 7));
    return off < 0.0 ? say("Sum %1: %2 is missing to 1.").arg(plain(sum), plain(-off))
                     : say("Sum %1: %2 too much.").arg(plain(sum), plain(off));
}

} // namespace

MixtureDraft mixtureDraft(const Design &design)
{
    MixtureDraft draft;
    const Json *shares = valueAt(design.json, "/gas/composition");
    if (const Json *byMass = valueAt(design.json, "/gas/composition_by_mass")) {
        shares = byMass;
        draft.byMass = true;
    }
    if (shares && shares->is_object())
        for (const auto &item : shares->items())
            draft.rows.push_back({QString::fromStdString(item.key()), typed(&item.value())});
    return draft;
}

MixtureVerdict verdictOn(const MixtureDraft &draft, const std::vector<GasEntry> &gases, const QStringList &own)
{
    MixtureVerdict verdict;
    double sum = 0.0;
    bool isSummed = true;
    int named = 0;
    for (std::size_t i = 0; i < draft.rows.size(); ++i) {
        const QString words = rowWords(draft, i, gases, own);
        if (!words.isEmpty()) verdict.rowWords.insert(static_cast<int>(i), words);
        if (draft.rows[i].name.trimmed().isEmpty() && draft.rows[i].share.trimmed().isEmpty()) continue;
        ++named;
        const auto share = shareOf(draft.rows[i]);
        isSummed = isSummed && share;
        sum += share.value_or(0.0);
    }
    if (named == 0) {
        verdict.words = say("A gas needs at least one component.");
        return verdict;
    }
    if (isSummed) {
        verdict.sum = sum;
        verdict.words = sumWords(sum);
    }
    verdict.isWhole = verdict.rowWords.isEmpty() && isSummed && std::abs(sum - 1.0) <= toleratedSum;
    return verdict;
}

Design withMixture(const Design &design, const MixtureDraft &draft)
{
    Json shares = Json::object();
    for (const MixtureRow &row : draft.rows)
        if (!row.name.trimmed().isEmpty())
            shares[row.name.trimmed().toStdString()] = numberAsTyped(row.share.trimmed());
    // In the place where it stood: the order of the file is kept.
    Json gas = Json::object();
    Json before = Json::object();
    const std::string key = draft.byMass ? "composition_by_mass" : "composition";
    bool isPlaced = false;
    for (const auto &item : design.json.at("gas").items()) {
        const bool isMixture = item.key() == "composition" || item.key() == "composition_by_mass";
        if (!isMixture)
            gas[item.key()] = item.value();
        else if (!isPlaced)
            gas[key] = shares;
        if (isMixture && item.value().is_object()) before = item.value();
        isPlaced = isPlaced || isMixture;
    }
    if (!isPlaced) gas[key] = shares;
    dropPairsWithout(gas, before, shares);
    return withValue(design, "/gas", gas);
}

MixtureDraft dividedBySum(const MixtureDraft &draft)
{
    double sum = 0.0;
    for (const MixtureRow &row : draft.rows) sum += shareOf(row).value_or(0.0);
    MixtureDraft result = draft;
    for (MixtureRow &row : result.rows)
        if (const auto share = shareOf(row)) row.share = plain(*share / sum);
    return result;
}

} // namespace quasistat::ui
