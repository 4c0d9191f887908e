#pragma once
// A gas of the user's own for a cubic equation, as texts in a form. No widgets.

#include "ui/fields/form_field.h"
#include "ui/session/session.h"

namespace quasistat::ui
{

/// An entry of `components` while it is being written.
struct OwnGas {
    QString name;
    document::Json facts = document::Json::object(); ///< of the document, as far as typed
    bool operator==(const OwnGas &) const = default;
};

[[nodiscard]] std::vector<OwnGas> ownGases(const document::Design &design);
[[nodiscard]] QStringList ownGasNames(const document::Design &design);

[[nodiscard]] std::vector<FormField> ownGasForm(const OwnGas &gas);
/// The entry after `text` was entered in `field`.
[[nodiscard]] OwnGas ownGasEntered(const OwnGas &gas, const FormField &field, const QString &text);
/// What it still needs before it can stand in the document: "critical pressure, molar mass"; empty if nothing. A gas
/// that the library knows needs only what shall differ.
[[nodiscard]] QString stillMissing(const OwnGas &gas, bool isKnown);

/// The design with these gases of the user’s own; each needs its name.
[[nodiscard]] document::Design withOwnGases(const document::Design &design, const std::vector<OwnGas> &gases);
[[nodiscard]] document::Design renamedInMixture(const document::Design &design, const QString &before,
                                                const QString &after);

} // namespace quasistat::ui
