#pragma once
// The start state as a form of three quantities, and what its card says.

#include "ui/fields/form_field.h"
#include "ui/session/session.h"

namespace quasistat::ui
{

/// Three lines: which quantity, and its value as typed.
[[nodiscard]] std::vector<FormField> startForm(const Snapshot &snapshot);
/// The design after another quantity was chosen in `field`: the value is the start state's own.
[[nodiscard]] document::Design startChosen(const Snapshot &snapshot, const FormField &field, const std::string &key);
[[nodiscard]] document::Design startEntered(const document::Design &design, const FormField &field,
                                            const QString &text);

/// The quantities given, as printed: "1 bar", "20 °C", "5 L".
[[nodiscard]] QStringList startWords(const document::Design &design);
/// Why there is no start state; empty if there is one.
[[nodiscard]] QString startFault(const Snapshot &snapshot);

} // namespace quasistat::ui
