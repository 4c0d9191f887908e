#include "core/document/edit.h"

#include "core/document/faults.h"
#include "core/document/interpret.h"
#include "core/document/pointer.h"
#include "core/document/references.h"

#include <algorithm>

namespace quasistat::document
{

namespace
{

/// A design whose segments are a list, whatever it was before: an edit of a segment needs one to stand in.
Design withSegments(Design design)
{
    Json &segments = design.json["segments"];
    if (!segments.is_array()) segments = Json::array();
    return design;
}

std::size_t segmentCount(const Design &design)
{
    const auto found = design.json.find("segments");
    return found != design.json.end() && found->is_array() ? found->size() : 0;
}

FormerValues formerValues(const Design &design, const path::PathResult &before)
{
    return {.path = before, .units = displayUnits(design)};
}

/// Segment k (from 1) ends in state k + 1; state 1 is the start and stays.
Renumbering bySegments(std::function<std::optional<int>(int)> segment)
{
    const auto state = [segment](int number) -> std::optional<int> {
        if (number <= 1) return number;
        const std::optional<int> ending = segment(number - 1);
        if (!ending) return std::nullopt;
        return *ending + 1;
    };
    return {.state = state, .segment = segment};
}

Json::array_t &segmentList(Design &design)
{
    return design.json["segments"].get_ref<Json::array_t &>();
}

std::optional<Json> parsedOrNone(std::string_view text)
{
    Json value = Json::parse(text, nullptr, false);
    if (value.is_discarded()) return std::nullopt;
    return value;
}

/// The value that holds the last token of a pointer; null where there is none.
Json *parentOf(Json &root, const std::vector<std::string> &tokens)
{
    Json *value = &root;
    for (std::size_t i = 0; i + 1 < tokens.size(); ++i) {
        if (value->is_object() && value->contains(tokens[i])) {
            value = &(*value)[tokens[i]];
            continue;
        }
        const std::optional<std::size_t> index = value->is_array() ? arrayIndex(tokens[i]) : std::nullopt;
        if (!index || *index >= value->size()) return nullptr;
        value = &(*value)[*index];
    }
    return value->is_object() || value->is_array() ? value : nullptr;
}

} // namespace

Edited segmentInserted(const Design &design, std::size_t index, Json segment, const path::PathResult &before)
{
    const FormerValues former = formerValues(design, before);
    Design next = withSegments(design);
    Json::array_t &list = segmentList(next);
    index = std::min(index, list.size());
    const int place = static_cast<int>(index);
    list.insert(list.begin() + place, std::move(segment));
    return renumbered(std::move(next),
                      bySegments([place](int number) { return number <= place ? number : number + 1; }), former);
}

Edited segmentDeleted(const Design &design, std::size_t index, const path::PathResult &before)
{
    if (index >= segmentCount(design)) return {.design = design, .remarks = {}};
    const FormerValues former = formerValues(design, before);
    Design next = design;
    Json::array_t &list = segmentList(next);
    const int place = static_cast<int>(index);
    list.erase(list.begin() + place);
    const auto number = [place](int old) -> std::optional<int> {
        if (old == place + 1) return std::nullopt;
        return old <= place ? old : old - 1;
    };
    return renumbered(std::move(next), bySegments(number), former);
}

Edited segmentMoved(const Design &design, std::size_t from, std::size_t to, const path::PathResult &before)
{
    const std::size_t count = segmentCount(design);
    if (from >= count || to >= count || from == to) return {.design = design, .remarks = {}};
    const FormerValues former = formerValues(design, before);
    Design next = design;
    Json::array_t &list = segmentList(next);
    Json moved = std::move(list[from]);
    list.erase(list.begin() + static_cast<std::ptrdiff_t>(from));
    list.insert(list.begin() + static_cast<std::ptrdiff_t>(to), std::move(moved));

    const int source = static_cast<int>(from) + 1;
    const int target = static_cast<int>(to) + 1;
    const auto number = [source, target](int old) -> std::optional<int> {
        if (old == source) return target;
        if (source < target && old > source && old <= target) return old - 1;
        if (target < source && old >= target && old < source) return old + 1;
        return old;
    };
    return renumbered(std::move(next), bySegments(number), former);
}

Edited segmentDuplicated(const Design &design, std::size_t index, const path::PathResult &before)
{
    if (index >= segmentCount(design)) return {.design = design, .remarks = {}};
    Json copy = design.json.at("segments").at(index);
    // Two segments in a regenerator name each other; a third cannot.
    if (copy.is_object()) {
        copy.erase("regenerator");
        copy.erase("effectiveness");
    }
    return segmentInserted(design, index + 1, std::move(copy), before);
}

Outcome<Design> valueSet(const Design &design, std::string_view pointer, std::string_view value)
{
    const std::optional<std::vector<std::string>> tokens = pointerTokens(pointer);
    if (!tokens || tokens->empty())
        return fault(Reason::syntax, std::string(pointer),
                     "“{0}” is no pointer to a value; write for instance “/segments/0/end/pressure”",
                     {std::string(pointer)});
    Design next = design;
    Json *parent = parentOf(next.json, *tokens);
    if (!parent)
        return fault(Reason::missing, std::string(pointer), "the document has no place “{0}” to put a value",
                     {std::string(pointer)});
    Json content = parsedOrNone(value).value_or(Json(std::string(value)));
    const std::string &last = tokens->back();
    if (parent->is_object()) {
        (*parent)[last] = std::move(content);
        return next;
    }
    const std::optional<std::size_t> index = last == "-" ? parent->size() : arrayIndex(last);
    if (!index || *index > parent->size())
        return fault(Reason::missing, std::string(pointer), "the list there has {0} entries, counted from 0",
                     {std::to_string(parent->size())});
    if (*index == parent->size())
        parent->push_back(std::move(content));
    else
        (*parent)[*index] = std::move(content);
    return next;
}

} // namespace quasistat::document
