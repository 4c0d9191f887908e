#include "ui/session/design_reading.h"

#include <charconv>

namespace quasistat::ui
{

using document::Design;
using document::Json;

namespace
{

constexpr std::string_view segmentsPrefix = "/segments/";

Json::json_pointer pointerOf(const std::string &pointer)
{
    return Json::json_pointer(pointer);
}

} // namespace

int segmentCount(const Design &design)
{
    const Json *segments = valueAt(design.json, "/segments");
    return segments && segments->is_array() ? static_cast<int>(segments->size()) : 0;
}

const Json *segmentAt(const Design &design, int index)
{
    if (index < 0 || index >= segmentCount(design)) return nullptr;
    return &design.json["segments"][static_cast<std::size_t>(index)];
}

const Json *valueAt(const Json &json, const std::string &pointer)
{
    const auto place = pointerOf(pointer);
    return json.contains(place) ? &json.at(place) : nullptr;
}

QString typed(const Json *value)
{
    if (!value) return {};
    if (value->is_string()) return QString::fromStdString(value->get<std::string>());
    if (value->is_number()) return QString::fromStdString(value->dump());
    return {};
}

QString typedAt(const Json &json, const std::string &pointer)
{
    return typed(valueAt(json, pointer));
}

Design withValue(const Design &design, const std::string &pointer, Json value)
{
    Design changed = design;
    changed.json[pointerOf(pointer)] = std::move(value);
    return changed;
}

Design withoutValue(const Design &design, const std::string &pointer)
{
    if (!valueAt(design.json, pointer)) return design;
    Design changed = design;
    const auto place = pointerOf(pointer);
    Json &parent = changed.json.at(place.parent_pointer());
    if (parent.is_object()) parent.erase(place.back());
    if (parent.is_array()) parent.erase(static_cast<std::size_t>(std::stoul(place.back())));
    return changed;
}

Design withText(const Design &design, const std::string &pointer, const QString &text)
{
    const QString trimmed = text.trimmed();
    return trimmed.isEmpty() ? withoutValue(design, pointer) : withValue(design, pointer, trimmed.toStdString());
}

std::string segmentPointer(int index, const std::string &key)
{
    return std::string(segmentsPrefix) + std::to_string(index) + key;
}

int segmentOf(const std::string &pointer)
{
    if (pointer.compare(0, segmentsPrefix.size(), segmentsPrefix) != 0) return -1;
    int index = -1;
    std::from_chars(pointer.data() + segmentsPrefix.size(), pointer.data() + pointer.size(), index);
    return index;
}

} // namespace quasistat::ui
