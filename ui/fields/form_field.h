#pragma once
// One line of a form: a caption, perhaps a choice, perhaps a value. No widgets.

#include "core/path/kind.h"
#include "core/units/quantity.h"
#include "ui/fields/suggestion.h"

#include <QString>

#include <optional>
#include <string>
#include <vector>

namespace quasistat::ui
{

/// What a field takes.
enum class FieldContent {
    none,         ///< the choice alone says it
    quantity,     ///< number and unit
    quantityOrAt, ///< number and unit, or "@3"
    number,       ///< a plain number, kept as typed
    count,        ///< a whole number ≥ 1
    text,         ///< words
};

struct FieldChoice {
    std::string key;
    QString words;
    std::optional<path::Kind> glyph{}; ///< drawn before the words
};

struct FormField {
    std::string id; ///< unique in its form: "kind", "end", "exponent"
    QString caption{};
    std::vector<FieldChoice> choices{}; ///< empty: no choice
    std::string chosen{};               ///< key of the choice that holds
    FieldContent content = FieldContent::none;
    std::string pointer{}; ///< of the value, as the owner of the form reads it
    units::Quantity quantity = units::Quantity::number;
    QString value{}; ///< as typed
    QString placeholder{};
    bool optional = false;                 ///< may be left blank
    std::vector<Suggestion> suggestions{}; ///< offered while typing
};

/// Why `text` cannot stand in `field`, as a sentence; empty if it can. Judges the text alone, not what comes of it.
[[nodiscard]] QString complaintOf(const FormField &field, const QString &text);

/// `text` as it is printed: a narrow space between number and unit, U+2212 for a leading minus.
[[nodiscard]] QString asPrinted(const QString &text);

} // namespace quasistat::ui
