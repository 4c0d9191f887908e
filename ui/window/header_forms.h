#pragma once
// What the header's fields hold and what the design becomes when one is changed. No widgets.

#include "ui/fields/form_field.h"
#include "ui/look/rich_text.h"
#include "ui/session/session.h"

namespace quasistat::ui
{

enum class HeaderPart { title, gas, surroundings, sign, units, rate };

/// Caption and value as the header shows them.
struct HeaderText {
    QString caption;
    RichText value;
};
[[nodiscard]] HeaderText headerText(HeaderPart part, const Snapshot &snapshot);

/// The fields of the part's editor.
[[nodiscard]] std::vector<FormField> headerForm(HeaderPart part, const Snapshot &snapshot);

/// A changed design, or why the text does not do.
struct HeaderEdit {
    document::Design design;
    QString complaint;
};
[[nodiscard]] HeaderEdit headerEntered(HeaderPart part, const document::Design &design, const FormField &field,
                                       const QString &text);
[[nodiscard]] document::Design headerChosen(HeaderPart part, const Snapshot &snapshot, const FormField &field,
                                            const std::string &key);
/// Turns the display of work and heat to "by the gas" and back.
[[nodiscard]] document::Design signTurned(const Snapshot &snapshot);

/// "nitrogen 0.78, oxygen 0.22", as the composition of a document is written in one line; and back.
[[nodiscard]] QString compositionText(const document::Json &composition);
[[nodiscard]] std::optional<document::Json> compositionFrom(const QString &text);

} // namespace quasistat::ui
