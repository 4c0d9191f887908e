#include "core/document/design.h"

#include "core/document/sha256.h"

namespace quasistat::document
{

namespace
{

constexpr std::size_t widest = 110;

bool isContainer(const Json &value)
{
    return value.is_object() || value.is_array();
}

std::string quoted(const std::string &text)
{
    return Json(text).dump(-1, ' ', false, Json::error_handler_t::replace);
}

void appendOnOneLine(const Json &value, std::string &text)
{
    if (!isContainer(value)) {
        text += value.dump(-1, ' ', false, Json::error_handler_t::replace);
        return;
    }
    text += value.is_object() ? '{' : '[';
    bool first = true;
    for (const auto &item : value.items()) {
        if (!first) text += ", ";
        first = false;
        if (value.is_object()) text += quoted(item.key()) + ": ";
        appendOnOneLine(item.value(), text);
    }
    text += value.is_object() ? '}' : ']';
}

/// A list of objects is read line by line: a segment or a limit each.
bool isListOfObjects(const Json &value)
{
    return value.is_array() && !value.empty() && value.front().is_object();
}

void append(const Json &value, std::size_t indent, std::size_t column, bool mayFold, std::string &text)
{
    std::string line;
    if (!isContainer(value) || value.empty() || (mayFold && !isListOfObjects(value))) {
        appendOnOneLine(value, line);
        if (!isContainer(value) || value.empty() || column + line.size() <= widest) {
            text += line;
            return;
        }
    }
    text += value.is_object() ? "{\n" : "[\n";
    std::size_t left = value.size();
    for (const auto &item : value.items()) {
        text.append(indent + 2, ' ');
        std::size_t used = indent + 2;
        if (value.is_object()) {
            const std::string key = quoted(item.key()) + ": ";
            text += key;
            used += key.size();
        }
        append(item.value(), indent + 2, used, true, text);
        text += --left > 0 ? ",\n" : "\n";
    }
    text.append(indent, ' ');
    text += value.is_object() ? '}' : ']';
}

} // namespace

std::string written(const Design &design)
{
    std::string text;
    append(design.json, 0, 0, false, text);
    text += '\n';
    return text;
}

std::string fingerprint(const Design &design)
{
    const std::string digest = sha256(written(design));
    return digest.substr(0, 4) + " " + digest.substr(4, 4) + " " + digest.substr(8, 4);
}

} // namespace quasistat::document
