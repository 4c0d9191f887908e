#include "core/units/number_text.h"

#include <array>
#include <charconv>
#include <cmath>

namespace quasistat::units
{

namespace
{

constexpr std::string_view minusSign = "\u2212";

bool isDigit(std::string_view text, std::size_t position)
{
    return position < text.size() && text[position] >= '0' && text[position] <= '9';
}

std::size_t digitsFrom(std::string_view text, std::size_t position)
{
    std::size_t end = position;
    while (isDigit(text, end)) ++end;
    return end - position;
}

/// Bytes of a sign at `position`; `negative` says which.
std::size_t signAt(std::string_view text, std::size_t position, bool &negative)
{
    const std::string_view rest = text.substr(std::min(position, text.size()));
    negative = rest.starts_with('-') || rest.starts_with(minusSign);
    if (rest.starts_with('-') || rest.starts_with('+')) return 1;
    return rest.starts_with(minusSign) ? minusSign.size() : 0;
}

/// Bytes of an exponent ("e-3") at `position`, 0 if there is none; its ASCII form is appended to `plain`.
std::size_t exponentAt(std::string_view text, std::size_t position, std::string &plain)
{
    if (position >= text.size() || (text[position] != 'e' && text[position] != 'E')) return 0;
    bool negative = false;
    const std::size_t sign = signAt(text, position + 1, negative);
    const std::size_t digits = digitsFrom(text, position + 1 + sign);
    if (digits == 0) return 0;
    plain += negative ? "e-" : "e";
    plain += text.substr(position + 1 + sign, digits);
    return 1 + sign + digits;
}

Failure noNumber(std::string_view text)
{
    return typingFailure(Reason::syntax, "“{0}” does not begin with a number", {std::string(text)});
}

Failure decimalComma(std::string_view text, std::size_t comma)
{
    std::string right(text);
    right[comma] = '.';
    return typingFailure(Reason::syntax, "“{0}” has a comma; the decimal sign is a point: “{1}”",
                         {std::string(text), right});
}

} // namespace

Failure typingFailure(Reason reason, std::string_view sentence, std::initializer_list<std::string> words)
{
    Message message{.text = std::string(sentence), .arguments = {}};
    for (const std::string &word : words) message.arguments.emplace_back(word);
    return {.reason = reason, .pointer = {}, .message = std::move(message)};
}

std::string_view trimmed(std::string_view text)
{
    constexpr std::array<std::string_view, 7> blanks{" ", "\t", "\n", "\r", "\u00A0", "\u202F", "\u2009"};
    for (bool again = true; again;) {
        again = false;
        for (const std::string_view blank : blanks) {
            if (text.starts_with(blank)) {
                text.remove_prefix(blank.size());
                again = true;
            }
            if (text.ends_with(blank)) {
                text.remove_suffix(blank.size());
                again = true;
            }
        }
    }
    return text;
}

Outcome<TypedNumber> leadingNumber(std::string_view text)
{
    bool negative = false;
    std::size_t end = signAt(text, 0, negative);
    const std::size_t whole = digitsFrom(text, end);
    std::string plain = negative ? "-" : "";
    plain += text.substr(end, whole);
    end += whole;
    std::size_t fraction = 0;
    if (end < text.size() && text[end] == '.') {
        fraction = digitsFrom(text, end + 1);
        // A point without digits on either side belongs to a unit ("2 L.atm"), or is no number at all.
        if (fraction > 0) {
            plain += text.substr(end, 1 + fraction);
            end += 1 + fraction;
        }
    }
    if (whole + fraction == 0) return noNumber(text);
    if (end < text.size() && text[end] == ',' && isDigit(text, end + 1)) return decimalComma(text, end);
    end += exponentAt(text, end, plain);

    double value = 0.0;
    const auto [last, error] = std::from_chars(plain.data(), plain.data() + plain.size(), value);
    if (error != std::errc{} || last != plain.data() + plain.size() || !std::isfinite(value))
        return typingFailure(Reason::outOfRange, "“{0}” is too large or too small a number", {plain});
    return TypedNumber{.value = value, .text = std::string(text.substr(0, end)), .length = end};
}

} // namespace quasistat::units
