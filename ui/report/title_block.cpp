// The title block and the line of what everything rests on.

#include "ui/canvas/limit_text.h"
#include "ui/gas/gas_words.h"
#include "ui/report/print_type.h"
#include "ui/report/sections.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"

#include <QCoreApplication>

#include <algorithm>

namespace quasistat::ui
{
namespace
{

constexpr double px = pageUnitsPerPixel;
constexpr double titleHeight = 78.0 * px;
constexpr double captionTop = 4.0 * px;

QString say(const char *text)
{
    return QCoreApplication::translate("Report", text);
}

struct Field {
    QString caption;
    QString value;
};

void paintField(QPainter &painter, const QRectF &cell, const Field &field, double inset)
{
    const Palette look = printPalette();
    painter.setPen(look.secondary());
    drawLine(painter, cell.topLeft() + QPointF(inset, captionTop), RichText::plain(field.caption), printCaptionFace());
    painter.setPen(look.ink);
    drawLine(painter, cell.topLeft() + QPointF(inset, captionTop + 12.0 * px),
             RichText::plain(elided(field.value, printValueFace(), cell.width() - 2.0 * inset)), printValueFace());
}

struct TitleBlock {
    std::vector<RichText> title;
    QString purpose;
    QString organisation;
    std::vector<Field> fields; ///< two rows of three
    double width;
    double height;

    void operator()(QPainter &painter, QPointF at) const
    {
        const Palette look = printPalette();
        const QRectF frame(at, QSizeF(width, height));
        const double divide = 0.484 * width;
        const double cell = (width - divide) / 3.0;
        painter.setPen(QPen(look.ink, 1.0 * px));
        painter.setBrush(Qt::NoBrush);
        painter.drawRect(frame);
        painter.drawLine(QPointF(at.x() + divide, at.y()), QPointF(at.x() + divide, at.y() + height));
        painter.setPen(QPen(look.ink, 0.6 * px));
        painter.drawLine(QPointF(at.x() + divide, at.y() + height / 2.0),
                         QPointF(at.x() + width, at.y() + height / 2.0));
        for (int i = 1; i < 3; ++i)
            painter.drawLine(QPointF(at.x() + divide + i * cell, at.y()),
                             QPointF(at.x() + divide + i * cell, at.y() + height));
        paintTitle(painter, at + QPointF(12.0 * px, 7.0 * px), divide - 24.0 * px);
        for (std::size_t i = 0; i < fields.size(); ++i) {
            const double row = i < 3 ? 0.0 : height / 2.0;
            const double left = at.x() + divide + static_cast<double>(i % 3) * cell;
            paintField(painter, {left, at.y() + row, cell, height / 2.0}, fields[i], 8.0 * px);
        }
    }

    void paintTitle(QPainter &painter, QPointF at, double room) const
    {
        const Palette look = printPalette();
        painter.setPen(look.ink);
        for (const RichText &line : title) {
            drawLine(painter, at, line, printTitleFace());
            at.ry() += lineHeight(printTitleFace());
        }
        painter.setPen(look.secondary());
        for (const QString &line : {purpose, organisation}) {
            drawLine(painter, at, RichText::plain(elided(line, printBodyFace(), room)), printBodyFace());
            at.ry() += 19.0 * px;
        }
    }
};

QString chargeWords(const analysis::Evaluation &evaluation, const document::Design &design,
                    const units::DisplayUnits &units)
{
    QStringList given;
    for (const char *key : {"/start/volume", "/start/amount", "/start/pressure", "/start/temperature"}) {
        const QString value = typedAt(design.json, key);
        if (!value.isEmpty()) given << printed(value);
    }
    const gas::State &start = evaluation.path.states.front().state;
    return say("%1 (%2)").arg(given.join(QStringLiteral(", ")),
                              shownFigure(start.amount(), units::Quantity::amount, units));
}

QString surroundingsWords(const analysis::Evaluation &evaluation, const document::Design &design,
                          const units::DisplayUnits &units)
{
    const auto &around = evaluation.input.surroundings;
    const QString pressure = typedAt(design.json, "/surroundings/pressure");
    const QString temperature = typedAt(design.json, "/surroundings/temperature");
    return QStringLiteral("%1, %2").arg(
        pressure.isEmpty() ? shownFigure(around.pressure, units::Quantity::pressure, units) : printed(pressure),
        temperature.isEmpty() ? shownFigure(around.temperature, units::Quantity::temperature, units)
                              : printed(temperature));
}

} // namespace

QString documentField(const document::Design &design, const char *key)
{
    return typedAt(design.json, std::string("/document/") + key);
}

std::vector<Block> titleBlock(const ReportContent &content)
{
    const document::Design &design = content.snapshot.design;
    const auto field = [&](const char *key) { return documentField(design, key); };
    QString title = typedAt(design.json, "/title");
    if (title.isEmpty()) title = say("Untitled design");
    TitleBlock block{.title = lines(RichText::plain(title), printTitleFace(), 0.484 * content.width - 24.0 * px),
                     .purpose = say("Process path, work and heat"),
                     .organisation = field("organisation"),
                     .fields = {{say("document"), field("number")},
                                {say("revision"), field("revision")},
                                {say("date"), field("date")},
                                {say("prepared"), field("prepared_by")},
                                {say("checked"), field("checked_by")},
                                {say("approved"), field("approved_by")}},
                     .width = content.width,
                     .height = 0.0};
    block.height =
        std::max(titleHeight, static_cast<double>(block.title.size()) * lineHeight(printTitleFace()) + 52.0 * px);
    return {{.height = block.height, .paint = block}, space(14.0)};
}

std::vector<Block> basis(const ReportContent &content)
{
    const auto &[snapshot, evaluation, order, width] = content;
    const gas::Gas &gas = *evaluation.path.gas;
    const QString name = QString::fromStdString(gas.name());
    const QString model = modelName(gas.model());
    const QString gamma = typedAt(snapshot.design.json, "/gas/heat_capacity_ratio");
    QString gasWords = name.isEmpty() ? model : QStringLiteral("%1, %2").arg(name, model);
    if (!gamma.isEmpty()) gasWords += QStringLiteral(", γ = %1").arg(gamma);
    const std::vector<std::pair<double, Field>> fields{
        {0.30, {say("gas and model"), gasWords}},
        {0.35, {say("charge"), chargeWords(evaluation, snapshot.design, snapshot.units)}},
        {0.175, {say("surroundings"), surroundingsWords(evaluation, snapshot.design, snapshot.units)}},
        {0.175,
         {say("sign of work and heat"),
          snapshot.units.workByGas ? say("positive by the gas") : say("positive into the gas")}}};
    // Long words run over more lines rather than being cut: this line is what the figures rest on.
    std::vector<std::vector<RichText>> values;
    std::size_t most = 1;
    for (const auto &[share, field] : fields) {
        values.push_back(lines(RichText::plain(field.value), printBodyFace(), share * width - 8.0 * px));
        most = std::max(most, values.back().size());
    }
    const double height = 13.0 * px + static_cast<double>(most) * lineHeight(printBodyFace()) + 7.0 * px;
    const double w = width;
    return {{.height = height,
             .paint =
                 [=](QPainter &painter, QPointF at) {
                     const Palette look = printPalette();
                     double x = at.x();
                     for (std::size_t i = 0; i < fields.size(); ++i) {
                         painter.setPen(look.secondary());
                         drawLine(painter, {x, at.y()}, RichText::plain(fields[i].second.caption), printCaptionFace());
                         painter.setPen(look.ink);
                         double y = at.y() + 13.0 * px;
                         for (const RichText &line : values[i]) {
                             drawLine(painter, {x, y}, line, printBodyFace());
                             y += lineHeight(printBodyFace());
                         }
                         x += fields[i].first * w;
                     }
                     painter.fillRect(QRectF(at.x(), at.y() + height - 1.0 * px, w, 0.6 * px), faded(look.ink, 0.4));
                 }},
            space(10.0)};
}

} // namespace quasistat::ui
