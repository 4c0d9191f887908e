#pragma once
// The binary interaction parameters of a cubic equation as a form: one field a pair of the composition. No widgets.

#include "ui/fields/form_field.h"
#include "ui/session/session.h"

namespace quasistat::ui
{

/// Blank where the document says nothing: 0 holds. Air is its parts.
[[nodiscard]] std::vector<FormField> interactionForm(const document::Design &design);
/// Blank takes the pair out.
[[nodiscard]] document::Design interactionEntered(const document::Design &design, const FormField &field,
                                                  const QString &text);

} // namespace quasistat::ui
