// The annotated diagram, as vectors.

#include "ui/canvas/draw.h"
#include "ui/report/prose.h"
#include "ui/report/sections.h"

#include <QCoreApplication>

namespace quasistat::ui
{

std::vector<Block> diagramSection(const ReportContent &content)
{
    constexpr double diagramHeight = 404.0 * pageUnitsPerPixel;
    const double width = content.width;
    const Snapshot &snapshot = content.snapshot;
    return {heading(QCoreApplication::translate("Report", "Diagram"), width),
            {.height = diagramHeight,
             .paint =
                 [&snapshot, width](QPainter &painter, QPointF at) {
                     painter.save();
                     painter.translate(at);
                     painter.scale(pageUnitsPerPixel, pageUnitsPerPixel);
                     drawDiagram(snapshot, painter,
                                 QRectF(0.0, 0.0, width / pageUnitsPerPixel, diagramHeight / pageUnitsPerPixel));
                     painter.restore();
                 }},
            space(10.0)};
}

} // namespace quasistat::ui
