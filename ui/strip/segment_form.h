#pragma once
// Which fields a segment of a kind has, what they hold and what a design becomes when one is changed. No widgets.

#include "core/path/result.h"
#include "core/units/display.h"
#include "ui/fields/form_field.h"
#include "ui/session/design_reading.h"

namespace quasistat::ui
{

/// What new values are taken from when a choice changes: the segment as it was reached, if it was.
struct FormContext {
    const path::SegmentResult *result = nullptr;
    units::DisplayUnits units;
};

/// The fields of `segment` in the order they are shown. A kind that is not computed has its kind and label only.
/// `askDirection`: two directions reach the end, the user must choose.
[[nodiscard]] std::vector<FormField> segmentForm(const document::Json &segment, bool askDirection);

/// `segment` after `key` was chosen in `field` (any but "kind", which needs the whole design).
[[nodiscard]] document::Json segmentChosen(const document::Json &segment, const FormField &field,
                                           const std::string &key, const FormContext &context);
/// `segment` after `text` was entered in `field`; a blank label goes away, other blanks stay to be reported.
[[nodiscard]] document::Json segmentEntered(const document::Json &segment, const FormField &field, const QString &text);

/// What a number becomes in the document: a JSON number if that prints the same, else the string as typed.
[[nodiscard]] document::Json numberAsTyped(const QString &text);

/// A new segment of `kind` that leads somewhere visible from the state reached so far.
[[nodiscard]] document::Json segmentTemplate(path::Kind kind, const gas::State &from, const units::DisplayUnits &units);

} // namespace quasistat::ui
