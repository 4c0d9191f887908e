#pragma once
// The view that shows a whole path with room for its labels.

#include "core/analysis/evaluation.h"
#include "ui/canvas/plane.h"

#include <QSizeF>

namespace quasistat::ui
{

/// A view of `plot` pixels that holds every curve, ghost and state of the path and, where one is near, the limit above
/// it. It begins at zero volume and pressure unless the path is far from there, so that areas can be compared.
[[nodiscard]] View fittedView(const analysis::Evaluation &evaluation, QSizeF plot);

} // namespace quasistat::ui
