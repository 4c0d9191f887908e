#pragma once
// The part "reference" of a gas data file.

#include "core/gas/library/gas_files.h"
#include "core/gas/library/json_rows.h"

namespace quasistat::gas
{

/// Throws Json::exception where the file is not what it should be.
[[nodiscard]] ReferenceData referenceFrom(const Json &reference);

} // namespace quasistat::gas
