#include "ui/report/report.h"

#include "ui/report/print_type.h"
#include "ui/report/sections.h"
#include "ui/session/design_reading.h"

#include <QBuffer>
#include <QCoreApplication>
#include <QPageSize>
#include <QPdfWriter>

namespace quasistat::ui
{
namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("Report", text);
}

std::vector<Block> blocksOf(const ReportContent &content)
{
    std::vector<Block> blocks;
    for (const Section section : reportSections)
        for (Block &block : section(content)) blocks.push_back(std::move(block));
    return blocks;
}

struct Foot {
    QString left;
    QString right; ///< with %1 for the page and %2 for their number

    void paint(QPainter &painter, const QRectF &area, int page, int pages) const
    {
        constexpr double px = pageUnitsPerPixel;
        const Palette look = printPalette();
        painter.fillRect(QRectF(area.left(), area.top() + 8.0 * px, area.width(), 0.6 * px), faded(look.ink, 0.4));
        painter.setPen(look.secondary());
        const QPointF at(area.left(), area.top() + 12.0 * px);
        drawLine(painter, at, RichText::plain(left), printCaptionFace());
        drawLine(painter, at + QPointF(area.width(), 0.0), RichText::plain(right.arg(page).arg(pages)),
                 printCaptionFace(), Align::right);
    }
};

Foot footOf(const Snapshot &snapshot, const ReportOrder &order)
{
    const QString number = documentField(snapshot.design, "number");
    const QString revision = documentField(snapshot.design, "revision");
    const QString document = QStringList{number, revision}.join(QLatin1Char(' ')).trimmed();
    const QString pages = say("%1 of %2");
    return {say("Quasistat %1 · design %2")
                .arg(order.programVersion, QString::fromStdString(document::fingerprint(snapshot.design))),
            document.isEmpty() ? pages : QStringLiteral("%1 · %2").arg(document, pages)};
}

QString attachmentName(const ReportOrder &order)
{
    return order.fileName.isEmpty() ? QStringLiteral("design.qpath") : order.fileName;
}

void describe(QPdfWriter &writer, const Snapshot &snapshot, const ReportOrder &order)
{
    writer.setPdfVersion(QPagedPaintDevice::PdfVersion_1_6);
    writer.setResolution(static_cast<int>(pageUnitsPerInch) * 8);
    writer.setPageSize(QPageSize(order.pageSize == PageSize::a4 ? QPageSize::A4 : QPageSize::Letter));
    writer.setPageMargins(QMarginsF());
    writer.setTitle(typedAt(snapshot.design.json, "/title"));
    writer.setCreator(QStringLiteral("Quasistat %1").arg(order.programVersion));
    writer.addFileAttachment(attachmentName(order), QByteArray::fromStdString(document::written(snapshot.design)),
                             QStringLiteral("application/json"));
}

} // namespace

Outcome<QByteArray> report(const Snapshot &snapshot, const ReportOrder &order)
{
    if (snapshot.failure) return *snapshot.failure;
    if (!snapshot.evaluation) return Failure{Reason::missing, "", {"there is no path to report", {}}};
    if (const auto failure = document::firstFailure(*snapshot.evaluation)) return *failure;

    const QRectF area = textArea(order.pageSize);
    const ReportContent content{snapshot, *snapshot.evaluation, order, area.width()};
    const std::vector<Block> blocks = blocksOf(content);
    const std::vector<PagePlan> pages = paginated(blocks, area);
    const Foot foot = footOf(snapshot, order);

    QByteArray bytes;
    QBuffer buffer(&bytes);
    buffer.open(QIODevice::WriteOnly);
    QPdfWriter writer(&buffer);
    describe(writer, snapshot, order);
    QPainter painter(&writer);
    painter.scale(8.0, 8.0);
    for (std::size_t i = 0; i < pages.size(); ++i) {
        if (i > 0) writer.newPage();
        for (const PlacedBlock &placed : pages[i])
            if (placed.block->paint) placed.block->paint(painter, placed.at);
        foot.paint(painter, footArea(order.pageSize), static_cast<int>(i) + 1, static_cast<int>(pages.size()));
    }
    painter.end();
    return bytes;
}

} // namespace quasistat::ui
