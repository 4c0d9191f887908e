#include "core/document/pointer.h"

#include <charconv>

namespace quasistat::document
{

namespace
{

/// One token with "~1" and "~0" resolved; none where another "~" stands in it.
std::optional<std::string> unescaped(std::string_view token)
{
    std::string text;
    for (std::size_t i = 0; i < token.size(); ++i) {
        if (token[i] != '~') {
            text += token[i];
            continue;
        }
        ++i;
        if (i == token.size() || (token[i] != '0' && token[i] != '1')) return std::nullopt;
        text += token[i] == '0' ? '~' : '/';
    }
    return text;
}

} // namespace

std::optional<std::vector<std::string>> pointerTokens(std::string_view pointer)
{
    std::vector<std::string> tokens;
    if (pointer.empty()) return tokens;
    if (pointer.front() != '/') return std::nullopt;
    while (!pointer.empty()) {
        pointer.remove_prefix(1);
        const std::size_t end = std::min(pointer.find('/'), pointer.size());
        std::optional<std::string> token = unescaped(pointer.substr(0, end));
        if (!token) return std::nullopt;
        tokens.push_back(std::move(*token));
        pointer.remove_prefix(end);
    }
    return tokens;
}

std::string pointerTo(std::string_view parent, std::string_view key)
{
    std::string pointer(parent);
    pointer += '/';
    for (const char c : key) {
        if (c == '~')
            pointer += "~0";
        else if (c == '/')
            pointer += "~1";
        else
            pointer += c;
    }
    return pointer;
}

std::string pointerTo(std::string_view parent, std::size_t index)
{
    return std::string(parent) + "/" + std::to_string(index);
}

std::optional<std::size_t> arrayIndex(std::string_view token)
{
    if (token.empty() || (token.size() > 1 && token.front() == '0')) return std::nullopt;
    std::size_t index = 0;
    const auto [end, error] = std::from_chars(token.data(), token.data() + token.size(), index);
    if (error != std::errc{} || end != token.data() + token.size()) return std::nullopt;
    return index;
}

} // namespace quasistat::document
