#include "core/document/design.h"
#include "core/document/faults.h"
#include "core/document/text_scan.h"

#include <algorithm>

namespace quasistat::document
{

namespace
{

// More than any document has; keeps walks that call themselves off the end of the stack.
constexpr int deepestNesting = 100;

/// What the parser says after its own address: "syntax error while parsing value - unexpected end of input; …".
std::string parserWords(std::string_view what)
{
    const std::size_t column = what.find("column ");
    const std::size_t colon = what.find(": ", column == std::string_view::npos ? 0 : column);
    std::string words(colon == std::string_view::npos ? what : what.substr(colon + 2));
    constexpr std::string_view opening = "syntax error while parsing ";
    if (words.starts_with(opening)) words.erase(0, opening.size());
    return words;
}

Failure notJson(std::string_view text, std::string_view words, std::size_t byte, Position &position)
{
    position = positionAt(text, byte);
    return fault(Reason::syntax, "", "this is not JSON: {0}", {std::string(words)});
}

Outcome<Json> parsed(std::string_view text, Position &position)
{
    try {
        return Json::parse(text);
    } catch (const Json::parse_error &error) {
        return notJson(text, parserWords(error.what()), error.byte > 0 ? error.byte - 1 : 0, position);
    } catch (const Json::exception &error) { // a number that no double holds
        return notJson(text, parserWords(error.what()), 0, position);
    }
}

std::optional<Failure> repeatedKey(std::string_view text, Position &position)
{
    std::optional<Failure> failure;
    walkPlaces(text, [&](const Place &place) {
        if (!place.isRepeatedKey) return true;
        position = positionAt(text, place.keyByte);
        failure = fault(Reason::syntax, std::string(place.pointer), "this key stands twice in the same object");
        return false;
    });
    return failure;
}

} // namespace

Outcome<Design> read(std::string_view text, Position &position)
{
    if (nestingDepth(text) > deepestNesting) return notJson(text, "brackets nest more than 100 deep", 0, position);
    Outcome<Json> json = parsed(text, position);
    if (!json) return json.failure();
    if (const std::optional<Failure> repeated = repeatedKey(text, position)) return *repeated;
    if (!json->is_object()) {
        position = positionOf(text, "");
        return fault(Reason::wrongType, "", "a design is a JSON object: {…}");
    }
    return Design{std::move(*json)};
}

Position positionOf(std::string_view text, std::string_view pointer)
{
    std::size_t nearest = 0;
    walkPlaces(text, [&](const Place &place) {
        const bool encloses = pointer.starts_with(place.pointer) &&
                              (pointer.size() == place.pointer.size() || pointer[place.pointer.size()] == '/');
        if (encloses) nearest = place.byte;
        return !(encloses && pointer.size() == place.pointer.size());
    });
    return positionAt(text, nearest);
}

} // namespace quasistat::document
