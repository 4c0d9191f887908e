#pragma once
// The gases of every model as text for a terminal.

#include "core/gas/library/library.h"

#include <string>

namespace quasistat::app
{

/// Models one after the other, each a table of its gases; sources numbered and listed once at the end.
[[nodiscard]] std::string gasListing(const gas::Library &library);

/// The one line the perfect gas names as its source.
[[nodiscard]] std::string perfectGasSource();

} // namespace quasistat::app
