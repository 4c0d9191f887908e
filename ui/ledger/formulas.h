#pragma once
// The formula behind each figure and where it is published.

#include "core/path/result.h"

#include <QString>

namespace quasistat::ui
{

struct Formula {
    QString markup; ///< with <i>, <sub>
    QString source;
};

/// `number` of the segment counts from 1 and names its states.
[[nodiscard]] Formula workFormula(const path::SegmentResult &segment, int number);
[[nodiscard]] Formula heatFormula(const path::SegmentResult &segment, int number);
[[nodiscard]] Formula internalEnergyFormula(int number);

/// Figures of the path and further figures of a segment, by the key of the result: "lost_work", "thermal_efficiency", …
[[nodiscard]] Formula figureFormula(const QString &key);

} // namespace quasistat::ui
