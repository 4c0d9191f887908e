#include "ui/gas/gas_list.h"

#include "core/gas/library/gas_files.h"

#include <QStringList>

#include <algorithm>

namespace quasistat::ui
{

namespace
{

bool isSame(const QString &a, const QString &b)
{
    return a.compare(b, Qt::CaseInsensitive) == 0;
}

} // namespace

std::vector<GasEntry> gasesOf(std::string_view model, const gas::Library &library)
{
    std::vector<GasEntry> gases;
    if (std::ranges::find(gas::modelsOfGases(), model) == gas::modelsOfGases().end()) return gases;
    for (const gas::ComponentFacts &facts : library.components(model)) {
        QStringList aliases;
        if (const auto data = library.data(facts.name))
            for (const std::string &alias : (*data)->aliases) aliases << QString::fromStdString(alias);
        gases.push_back({QString::fromStdString(facts.name), QString::fromStdString(facts.formula),
                         aliases.join(QLatin1Char('\n'))});
    }
    // A reference equation has air of its own; a mixture takes it as its parts.
    if (!gasNamed(gases, QStringLiteral("air"))) gases.push_back({QStringLiteral("air"), {}, {}});
    std::ranges::sort(gases, {}, &GasEntry::name);
    return gases;
}

const GasEntry *gasNamed(const std::vector<GasEntry> &gases, const QString &text)
{
    const QString wanted = text.trimmed();
    if (wanted.isEmpty()) return nullptr;
    for (const GasEntry &gas : gases)
        if (isSame(gas.name, wanted)) return &gas;
    const GasEntry *found = nullptr;
    for (const GasEntry &gas : gases) {
        const bool isAlias = gas.aliases.split(QLatin1Char('\n')).contains(wanted, Qt::CaseInsensitive);
        if (gas.formula != wanted && !isAlias) continue;
        if (found) return nullptr;
        found = &gas;
    }
    return found;
}

QStringList gasesNear(const std::vector<GasEntry> &gases, const QString &text, int most)
{
    QStringList near;
    for (int letters = std::min<int>(4, static_cast<int>(text.size())); letters >= 2 && near.isEmpty(); --letters)
        for (const GasEntry &gas : gases)
            if (near.size() < most && gas.name.startsWith(text.left(letters), Qt::CaseInsensitive)) near << gas.name;
    return near;
}

} // namespace quasistat::ui
