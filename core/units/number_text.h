#pragma once
// Numbers as people type them: a decimal point, an optional exponent, nothing that a program alone would write.

#include "core/outcome/outcome.h"

#include <cstddef>
#include <string>
#include <string_view>

namespace quasistat::units
{

struct TypedNumber {
    double value;
    std::string text;   ///< as typed
    std::size_t length; ///< bytes of it in the text it was read from
};

/// The number that `text` begins with: sign (ASCII or U+2212), digits, decimal point, exponent. Never a hexadecimal
/// number, an infinity or NaN. Fails with Reason::syntax (no number, a decimal comma) or outOfRange (too large for a
/// double).
[[nodiscard]] Outcome<TypedNumber> leadingNumber(std::string_view text);

/// `text` without the blanks around it; narrow and ordinary no-break spaces count as blanks.
[[nodiscard]] std::string_view trimmed(std::string_view text);

/// A failure of typed text: the sentence and the words that go into it.
[[nodiscard]] Failure typingFailure(Reason reason, std::string_view sentence, std::initializer_list<std::string> words);

} // namespace quasistat::units
