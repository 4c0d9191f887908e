#include "ui/canvas/draw.h"

#include "ui/canvas/diagram.h"

#include <QBuffer>
#include <QPageSize>
#include <QPdfWriter>
#include <QSvgGenerator>

namespace quasistat::ui
{
namespace
{

constexpr int cssDotsPerInch = 96;
constexpr int pdfDotsPerInch = 1200;
constexpr int pngScale = 2;

QString titleOf(const Snapshot &snapshot)
{
    const auto &json = snapshot.design.json;
    if (!json.is_object()) return {};
    const auto title = json.find("title");
    return title != json.end() && title->is_string() ? QString::fromStdString(title->get<std::string>()) : QString();
}

QByteArray svg(const Snapshot &snapshot, QSize size)
{
    QByteArray bytes;
    QBuffer buffer(&bytes);
    buffer.open(QIODevice::WriteOnly);
    QSvgGenerator generator;
    generator.setOutputDevice(&buffer);
    generator.setResolution(cssDotsPerInch);
    generator.setSize(size);
    generator.setViewBox(QRect(QPoint(), size));
    generator.setTitle(titleOf(snapshot));
    QPainter painter(&generator);
    drawDiagram(snapshot, painter, QRectF(QPointF(), size), drawingStyle());
    painter.end();
    return bytes;
}

QByteArray pdf(const Snapshot &snapshot, QSize size)
{
    QByteArray bytes;
    QBuffer buffer(&bytes);
    buffer.open(QIODevice::WriteOnly);
    QPdfWriter writer(&buffer);
    writer.setResolution(pdfDotsPerInch);
    writer.setTitle(titleOf(snapshot));
    writer.setPageMargins(QMarginsF());
    writer.setPageSize(QPageSize(QSizeF(size) / cssDotsPerInch, QPageSize::Inch, QString(), QPageSize::ExactMatch));
    QPainter painter(&writer);
    const double scale = static_cast<double>(pdfDotsPerInch) / cssDotsPerInch;
    painter.scale(scale, scale);
    drawDiagram(snapshot, painter, QRectF(QPointF(), size), drawingStyle());
    painter.end();
    return bytes;
}

QByteArray png(const Snapshot &snapshot, QSize size)
{
    QImage image(size * pngScale, QImage::Format_RGB32);
    image.setDevicePixelRatio(pngScale);
    QPainter painter(&image);
    drawDiagram(snapshot, painter, QRectF(QPointF(), size), drawingStyle());
    painter.end();
    QByteArray bytes;
    QBuffer buffer(&bytes);
    buffer.open(QIODevice::WriteOnly);
    image.save(&buffer, "PNG");
    return bytes;
}

} // namespace

Outcome<QByteArray> drawing(const Snapshot &snapshot, Format format, QSize size)
{
    if (snapshot.failure) return *snapshot.failure;
    if (!snapshot.evaluation) return Failure{Reason::missing, "", {"There is no path to draw.", {}}};
    if (snapshot.evaluation->path.startFailure) return *snapshot.evaluation->path.startFailure;
    switch (format) {
    case Format::svg: return svg(snapshot, size);
    case Format::pdf: return pdf(snapshot, size);
    case Format::png: return png(snapshot, size);
    }
    return QByteArray();
}

void drawDiagram(const Snapshot &snapshot, QPainter &painter, const QRectF &target, const DiagramStyle &style)
{
    Diagram diagram(style);
    diagram.resize(target.size().toSize());
    diagram.show(std::make_shared<const Snapshot>(snapshot));
    diagram.zoomToPath();
    painter.save();
    painter.translate(target.topLeft());
    diagram.paintTo(painter);
    painter.restore();
}

} // namespace quasistat::ui
