#pragma once
// The gases a model knows, as they are offered while a name is typed.

#include "core/gas/library/library.h"

#include <QString>

#include <string>
#include <string_view>
#include <vector>

namespace quasistat::ui
{

/// One gas to choose.
struct GasEntry {
    QString name;    ///< as the document writes it
    QString formula; ///< "CO2"
    QString aliases; ///< further names, to be found by
    bool operator==(const GasEntry &) const = default;
};

/// In order of their names; `air`, which every mixture model takes as its parts, is among them.
[[nodiscard]] std::vector<GasEntry> gasesOf(std::string_view model, const gas::Library &library);

/// The entry that `text` names, by name, formula or alias; null where none does, or a formula stands for several.
[[nodiscard]] const GasEntry *gasNamed(const std::vector<GasEntry> &gases, const QString &text);

/// Up to `most` names near `text`, for “perhaps: …”.
[[nodiscard]] QStringList gasesNear(const std::vector<GasEntry> &gases, const QString &text, int most = 4);

} // namespace quasistat::ui
