#include "core/document/faults.h"

#include "core/outcome/near_names.h"

#include <vector>

namespace quasistat::document
{

namespace
{

Message message(std::string_view sentence, std::initializer_list<Argument> arguments)
{
    return {.text = std::string(sentence), .arguments = {arguments.begin(), arguments.end()}};
}

} // namespace

Failure fault(Reason reason, std::string pointer, std::string_view sentence, std::initializer_list<Argument> arguments)
{
    return {.reason = reason, .pointer = std::move(pointer), .message = message(sentence, arguments)};
}

Warning remark(std::string pointer, std::string_view sentence, std::initializer_list<Argument> arguments)
{
    return {.pointer = std::move(pointer), .message = message(sentence, arguments)};
}

Failure notComputed(std::string pointer, std::string_view words)
{
    return fault(Reason::notComputed, std::move(pointer), "{0}: not computed by this version", {std::string(words)});
}

Failure unknownName(std::string pointer, std::string_view what, std::string_view name,
                    std::span<const std::string_view> names)
{
    constexpr std::size_t longestShown = 60; // a whole paragraph pasted as a name is not repeated in full
    const std::vector<std::string_view> near = namesNear(name, names);
    const std::string_view sentence =
        near.empty() ? "“{0}” is no {1}; known here: {2}" : "“{0}” is no {1}; did you mean {2}?";
    std::string shortened(name.substr(0, longestShown));
    // Not in the middle of a character of UTF-8.
    while (name.size() > longestShown && !shortened.empty() &&
           (static_cast<unsigned char>(shortened.back()) & 0x80) != 0)
        shortened.pop_back();
    return fault(Reason::unknownName, std::move(pointer), sentence,
                 {shortened, std::string(what), near.empty() ? listed(names) : listed(near, "or")});
}

std::string listed(std::span<const std::string_view> names, std::string_view conjunction)
{
    std::string text;
    for (std::size_t i = 0; i < names.size(); ++i) {
        const bool isLast = i + 1 == names.size();
        if (i > 0 && !isLast) text += ", ";
        if (i > 0 && isLast) text.append(" ").append(conjunction).append(" ");
        text += names[i];
    }
    return text;
}

} // namespace quasistat::document
