#pragma once
// The designs that come with the program, compiled in.

#include "core/document/design.h"

#include <QString>

#include <vector>

namespace quasistat::ui
{

struct Sample {
    QString name; ///< of the file, without its ending
    QString title;
    QString about; ///< its notes
    document::Design design;
};

[[nodiscard]] std::vector<Sample> samples();

/// Air at 1 bar and 20 °C in one litre, without a segment.
[[nodiscard]] document::Design blankDesign();

} // namespace quasistat::ui
