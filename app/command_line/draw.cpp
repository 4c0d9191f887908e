#include "ui/canvas/draw.h"
#include "app/command_line/picture.h"
#include "app/command_line/streams.h"
#include "app/command_line/subcommands.h"

#include <optional>

namespace quasistat::app
{

namespace
{

/// 16 : 10, wide enough for every segment to be named.
constexpr QSize drawingSize{960, 640};

std::optional<ui::Format> formatOf(const std::string &file)
{
    const auto dot = file.rfind('.');
    const std::string ending = dot == std::string::npos ? std::string() : file.substr(dot);
    if (ending == ".svg") return ui::Format::svg;
    if (ending == ".pdf") return ui::Format::pdf;
    if (ending == ".png") return ui::Format::png;
    return std::nullopt;
}

} // namespace

ExitStatus draw(const Options &options)
{
    const std::string plane = options.last("--plane").value_or("p-v");
    if (plane == "T-s" || plane == "p-T" || plane == "h-p")
        return wrongUsage({.text = "--plane {0}: not in this version; p-v is", .arguments = {plane}}, "draw");
    if (plane != "p-v")
        return wrongUsage({.text = "there is no plane “{0}”; p-v is one", .arguments = {plane}}, "draw");
    const std::string file = options.last("-o").value_or("");
    const auto format = formatOf(file);
    if (!file.empty() && !format)
        return wrongUsage({.text = "“{0}” must end in .svg, .pdf or .png", .arguments = {file}}, "draw");
    return pictured(options, "draw",
                    [&](const ui::Snapshot &snapshot) { return ui::drawing(snapshot, *format, drawingSize); });
}

} // namespace quasistat::app
