#pragma once
// References inside a document ("@3", {"state": 3}, regenerator) when segments change their places.

#include "core/document/edit.h"
#include "core/units/display.h"

#include <functional>
#include <optional>
#include <string>

namespace quasistat::document
{

/// Where states and segments went, by their old numbers from 1; none: there is no such state or segment any more.
struct Renumbering {
    std::function<std::optional<int>(int)> state;
    std::function<std::optional<int>(int)> segment;
};

/// What a reference that loses its state is replaced with.
struct FormerValues {
    const path::PathResult &path;
    units::DisplayUnits units;
    /// The plain value a state had, in the design's display units; none where it was not computed.
    [[nodiscard]] std::optional<std::string> text(int state, path::EndKey key) const;
};

/// Renumbers every reference of `design`'s segments, which stand in their new order already. One that points ahead, or
/// to nothing, becomes the plain value it had, with a remark.
[[nodiscard]] Edited renumbered(Design design, const Renumbering &renumbering, const FormerValues &former);

} // namespace quasistat::document
