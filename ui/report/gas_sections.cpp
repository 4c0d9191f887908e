// The gas: what it is made of, whose equation, how far that is valid; and how far an ideal gas would have been off.

#include "ui/gas/gas_words.h"
#include "ui/gas/model_spread.h"
#include "ui/ledger/ledger_rows.h"
#include "ui/report/figure_columns.h"
#include "ui/report/prose.h"
#include "ui/report/sections.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"
#include "ui/strip/segment_words.h"

#include <QCoreApplication>

#include <algorithm>
#include <cmath>

namespace quasistat::ui
{
namespace
{

using path::SegmentResult;
using units::Quantity;

QString say(const char *text)
{
    return QCoreApplication::translate("Report", text);
}

QString text(std::string_view words)
{
    return QString::fromUtf8(words.data(), static_cast<qsizetype>(words.size()));
}

QString compositionWords(const gas::Composition &composition)
{
    QStringList shares;
    for (const gas::Share &share : composition)
        shares << QStringLiteral("%1 %2").arg(QString::fromStdString(share.component),
                                              QString::number(share.moleFraction, 'g', 6));
    return shares.join(QStringLiteral(", "));
}

/// Pairs as the document gives them; that the others are 0 is said.
QString interactionWords(const document::Design &design)
{
    QStringList pairs;
    if (const document::Json *stated = valueAt(design.json, "/gas/binary_interaction"); stated && stated->is_object())
        for (const auto &item : stated->items())
            pairs << QStringLiteral("%1 %2").arg(QString::fromStdString(item.key()), typed(&item.value()));
    return pairs.isEmpty() ? say("Binary interaction parameters: none given, 0 for every pair.")
                           : say("Binary interaction parameters: %1; 0 for every other pair.")
                                 .arg(pairs.join(QStringLiteral(", ")));
}

std::optional<double> idealFigure(const SegmentResult &segment, double path::IdealGasFigures::*member, double sign)
{
    return segment.idealGas ? std::optional(sign * *segment.idealGas.*member) : std::nullopt;
}

/// Puts a column of words behind the last one.
void addWords(std::vector<TableColumn> &columns, std::vector<TableRow> &rows, const QStringList &words)
{
    columns.push_back({RichText::plain(say("off\u00a0by")), 0.85, Align::right});
    for (std::size_t r = 0; r < rows.size(); ++r)
        rows[r].cells.push_back({RichText::plain(words.at(static_cast<qsizetype>(r))), {}});
}

} // namespace

std::vector<Block> spreadSection(const ReportContent &content)
{
    const path::PathResult &path = content.evaluation.path;
    if (!hasSpread(path)) return {};
    const units::DisplayUnits &units = content.snapshot.units;
    const double sign = shownSign(units);
    std::vector<TableColumn> columns{{RichText::plain(say("segment")), 1.5, Align::left}};
    std::vector<TableRow> rows;
    QStringList workOff;
    QStringList heatOff;
    QStringList degrees;
    for (std::size_t k = 0; k < path.segments.size(); ++k) {
        const SegmentResult &segment = path.segments[k];
        const document::Json &json = *segmentAt(content.snapshot.design, static_cast<int>(k));
        rows.push_back({{{numbered(k + 1, RichText::plain(segmentTitle(json))), {}}}});
        const auto &ideal = segment.idealGas;
        const auto end = segment.to.temperature();
        const QString none = QStringLiteral("–");
        workOff << (ideal ? percentOff(ideal->work, segment.work, segment.audit.scale) : none);
        heatOff << (ideal ? percentOff(ideal->heat, segment.heat, segment.audit.scale) : none);
        degrees << (ideal && end ? degreesOff(ideal->endTemperature, *end, units) : none);
    }
    const units::Scale energy = accountScale(path, units);
    const auto add = [&](const FigureColumn &real, const FigureColumn &ideal, const QStringList &off) {
        addFigures(columns, rows, {real, ideal}, 0.95, units);
        addWords(columns, rows, off);
    };
    add({QStringLiteral("<i>W</i>"), Quantity::energy,
         valuesOf(path.segments, [&](const SegmentResult &s) { return sign * s.work; }), energy},
        {say("ideal"), Quantity::energy,
         valuesOf(path.segments,
                  [&](const SegmentResult &s) { return idealFigure(s, &path::IdealGasFigures::work, sign); }),
         energy},
        workOff);
    add({QStringLiteral("<i>Q</i>"), Quantity::energy,
         valuesOf(path.segments, [&](const SegmentResult &s) { return sign * s.heat; }), energy},
        {say("ideal"), Quantity::energy,
         valuesOf(path.segments,
                  [&](const SegmentResult &s) { return idealFigure(s, &path::IdealGasFigures::heat, sign); }),
         energy},
        heatOff);
    add({say("end <i>T</i>"), Quantity::temperature,
         valuesOf(path.segments, [](const SegmentResult &s) { return s.to.temperature(); })},
        {say("ideal"), Quantity::temperature,
         valuesOf(path.segments,
                  [](const SegmentResult &s) { return idealFigure(s, &path::IdealGasFigures::endTemperature, 1.0); })},
        degrees);
    std::vector<Block> blocks{
        heading(say("Model spread"), content.width,
                RichText::plain(say("what an ideal gas would give: each segment from its real start to its end as "
                                    "written")))};
    for (Block &block : table(columns, rows, content.width)) blocks.push_back(std::move(block));
    blocks.push_back(space(10.0));
    return blocks;
}

std::vector<Block> modelSection(const ReportContent &content)
{
    const gas::Gas &gas = *content.evaluation.path.gas;
    const document::Design &design = content.snapshot.design;
    const units::DisplayUnits &units = content.snapshot.units;
    std::vector<RichText> list;
    const auto add = [&](const QString &words) { list.push_back(RichText::plain(words)); };
    QString lead = gasWords(design).unstyled();
    if (!lead.isEmpty()) lead[0] = lead[0].toUpper();
    add(say("%1. Molar mass %2, gas constant of the equation %3 J/(mol K).")
            .arg(lead, shownFigure(gas.molarMass(), Quantity::molarMass, units),
                 QString::number(gas.gasConstant(), 'f', 6)));
    if (gas.composition().size() > 1) add(say("Mole fractions: %1.").arg(compositionWords(gas.composition())));
    const bool isCubic = gas.model() == "peng-robinson" || gas.model() == "soave-redlich-kwong";
    if (isCubic && gas.composition().size() > 1) add(interactionWords(design));
    if (const QString words = validityWords(gas.validity(), units); !words.isEmpty()) add(words);
    if (gas.validity().uncertainty.empty() && !gas.isIdeal())
        add(say("No published uncertainty is known here for this gas."));
    const QString source = text(gas.source());
    add(say("Source: %1").arg(source) + (source.endsWith(QLatin1Char('.')) ? QString() : QStringLiteral(".")));
    std::vector<Block> blocks{heading(say("Gas, model and sources"), content.width)};
    for (const RichText &words : list) blocks.push_back(paragraph(words, content.width));
    blocks.push_back(space(8.0));
    return blocks;
}

} // namespace quasistat::ui
