#pragma once
// The plate of a label: how large it is and how its discs and lines stand on it.

#include "ui/canvas/scene.h"

#include <QPainter>
#include <QStringList>

namespace quasistat::ui
{

[[nodiscard]] QSizeF labelSize(const LabelScene &label);

/// Draws plate, discs and lines; the leader apart, so that none crosses another label's plate.
void drawLabel(QPainter &painter, const LabelScene &label, const Palette &palette);
void drawLeader(QPainter &painter, const LabelScene &label, const Palette &palette);

/// `text` in lines no wider than `width` pixels, broken at blanks.
[[nodiscard]] QStringList wrapped(const QString &text, const QFont &font, double width);

} // namespace quasistat::ui
