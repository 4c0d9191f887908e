#pragma once
// The small drawn shape of each kind of segment, from resources/glyphs.json.

#include "ui/look/palette.h"

#include <QByteArray>
#include <QIcon>
#include <QPainter>

#include <string_view>

namespace quasistat::ui
{

/// The glyph as an SVG image of 24 × 24 units in `colour`; `key` as in the document ("free-expansion"). Empty for a key
/// that has no glyph.
[[nodiscard]] QByteArray glyphImage(std::string_view key, const QColor &colour);

/// Draws the kind's glyph into `square` in `colour`, as vectors where the painter's device takes them. A card has 22
/// px, a list 16 px.
void drawGlyph(QPainter &painter, const QRectF &square, path::Kind kind, const QColor &colour);

/// The kind's glyph in its family's colour, sharp at any size.
[[nodiscard]] QIcon glyphIcon(path::Kind kind, const Palette &palette);

} // namespace quasistat::ui
