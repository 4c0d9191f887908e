#pragma once
// A sentence for a person, not yet put into words: an English template and the figures that go into it.
// Core composes no prose in a unit; whoever shows the message renders it with the reader's units
// (units/sentence.h), and a translator finds the whole sentence in one piece.

#include "core/units/quantity.h"

#include <string>
#include <variant>
#include <vector>

namespace quasistat
{

/// One figure of a message: an SI value with its quantity, or words that are shown as they stand.
struct Figure {
    units::Quantity quantity = units::Quantity::number;
    double value = 0.0;
};

struct Message {
    /// Template with {0}, {1}, … for the entries of `arguments`.
    std::string text;
    std::vector<std::variant<Figure, std::string>> arguments;
};

/// "what: why" as one message, the figures of both kept.
[[nodiscard]] Message because(Message what, const Message &why);

/// A message that belongs to a place of the document (JSON Pointer, RFC 6901; empty: the whole document).
struct Warning {
    std::string pointer;
    Message message;
};

} // namespace quasistat
