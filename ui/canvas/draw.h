#pragma once
// The diagram without a window: for the command line and the report.

#include "core/outcome/outcome.h"
#include "ui/canvas/diagram_style.h"
#include "ui/session/session.h"

#include <QByteArray>
#include <QRectF>
#include <QSize>

class QPainter;

namespace quasistat::ui
{

enum class Format { svg, pdf, png };

/// The annotated p–V diagram of `snapshot` as the bytes of a file, `size` in CSS pixels (1/96 inch); png at twice that
/// many dots. svg and pdf are vectors throughout, text stays text. Fails with the snapshot's own failure where nothing
/// could be computed. Needs a QApplication (the offscreen platform will do).
[[nodiscard]] Outcome<QByteArray> drawing(const Snapshot &snapshot, Format format, QSize size);

/// Draws the diagram into `target` of a painter whose units are CSS pixels: for a page of the report.
void drawDiagram(const Snapshot &snapshot, QPainter &painter, const QRectF &target,
                 const DiagramStyle &style = reportStyle());

} // namespace quasistat::ui
