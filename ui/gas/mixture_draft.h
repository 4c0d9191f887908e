#pragma once
// A composition while it is being written: texts in rows, judged as a whole. No widgets.

#include "ui/gas/gas_list.h"
#include "ui/session/session.h"

#include <QMap>
#include <QString>

#include <vector>

namespace quasistat::ui
{

struct MixtureRow {
    QString name;
    QString share; ///< as typed
    bool operator==(const MixtureRow &) const = default;
};

struct MixtureDraft {
    bool byMass = false;
    std::vector<MixtureRow> rows;
    bool operator==(const MixtureDraft &) const = default;
};

[[nodiscard]] MixtureDraft mixtureDraft(const document::Design &design);

/// What a draft comes to.
struct MixtureVerdict {
    std::optional<double> sum;   ///< none while a fraction is no number
    QString words;               ///< the sum, and what is wrong with the whole
    QMap<int, QString> rowWords; ///< what is wrong with a row
    bool isWhole = false;        ///< can stand in the document
};
/// `own`: names of the user's own gases, besides those of the model.
[[nodiscard]] MixtureVerdict verdictOn(const MixtureDraft &draft, const std::vector<GasEntry> &gases,
                                       const QStringList &own);

/// The design with this composition. Precondition: the verdict on it is whole.
[[nodiscard]] document::Design withMixture(const document::Design &design, const MixtureDraft &draft);

/// Every fraction divided by their sum. Precondition: there is a sum above zero.
[[nodiscard]] MixtureDraft dividedBySum(const MixtureDraft &draft);

} // namespace quasistat::ui
