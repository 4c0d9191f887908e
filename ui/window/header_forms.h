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

/// The fields of the part's editor; none for sign, which turns by a click, and gas, which has an editor of its own.
[[nodiscard]] std::vector<FormField> headerForm(HeaderPart part, const Snapshot &snapshot);

/// The design after `text` was entered in `field`.
[[nodiscard]] document::Design headerEntered(const document::Design &design, const FormField &field,
                                             const QString &text);
[[nodiscard]] document::Design headerChosen(const Snapshot &snapshot, const FormField &field, const std::string &key);
/// Turns the display of work and heat to "by the gas" and back.
[[nodiscard]] document::Design signTurned(const Snapshot &snapshot);

} // namespace quasistat::ui
