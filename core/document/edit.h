#pragma once
// Changes to a design that keep it whole: references ("@3", {"state": 3}, regenerator) follow their state.

#include "core/document/design.h"
#include "core/gas/library/library.h"
#include "core/path/result.h"

#include <cstddef>

namespace quasistat::document
{

/// An edited design and what had to be said about it (a reference that became a plain value).
struct Edited {
    Design design;
    std::vector<Warning> remarks;
};

/// Segments count from 0 here, as in the JSON Pointer. `before`: the path of the design as it was, for the values of
/// references that would point ahead or to nothing.
[[nodiscard]] Edited segmentInserted(const Design &design, std::size_t index, Json segment,
                                     const path::PathResult &before);
[[nodiscard]] Edited segmentDeleted(const Design &design, std::size_t index, const path::PathResult &before);
[[nodiscard]] Edited segmentMoved(const Design &design, std::size_t from, std::size_t to,
                                  const path::PathResult &before);
[[nodiscard]] Edited segmentDuplicated(const Design &design, std::size_t index, const path::PathResult &before);

/// The segment as another kind, its end state kept as far as that kind can: the end's quantity stays if the new kind
/// takes it, else it is the quantity of the reached state that it does take. Keys of the old kind alone are dropped,
/// needed ones are added (exponent from the two states, external pressure = pressure reached, 5 steps).
[[nodiscard]] Edited kindChanged(const Design &design, std::size_t index, path::Kind kind,
                                 const path::PathResult &before);

/// Sets the value at a JSON Pointer; `value` is JSON if it parses, else a string. Creates the last key, never a parent.
/// Fails with Reason::missing where the parent does not exist.
[[nodiscard]] Outcome<Design> valueSet(const Design &design, std::string_view pointer, std::string_view value);

} // namespace quasistat::document
