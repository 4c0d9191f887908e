// What an ideal gas would have given, segment by segment, beside the real figures.

#include "ui/gas/model_spread.h"
#include "ui/ledger/ledger_rows.h"
#include "ui/session/sentences.h"
#include "ui/strip/segment_words.h"

#include <QCoreApplication>

#include <cmath>

namespace quasistat::ui
{

using path::SegmentResult;
using units::Quantity;

namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("Ledger", text);
}

double scaleOf(const SegmentResult &segment)
{
    return std::max({std::abs(segment.work), std::abs(segment.heat), segment.audit.scale});
}

/// The segment whose ideal work is furthest off, in percent of the larger of its work and heat.
struct Worst {
    std::size_t segment = 0;
    double percent = 0.0;
};

Worst worstOf(const path::PathResult &path)
{
    Worst worst;
    for (std::size_t k = 0; k < path.segments.size(); ++k) {
        const SegmentResult &segment = path.segments[k];
        const double scale = std::max(std::abs(segment.work), std::abs(segment.heat));
        if (!segment.idealGas || scale == 0.0) continue;
        for (const double off : {segment.idealGas->work - segment.work, segment.idealGas->heat - segment.heat})
            if (const double percent = 100.0 * std::abs(off) / scale; percent > worst.percent) worst = {k, percent};
    }
    return worst;
}

QString summary(const path::PathResult &path)
{
    const Worst worst = worstOf(path);
    if (worst.percent < 0.05) return say("An ideal gas would give the same to 0.1 % on every segment.");
    const QString percent =
        QString::number(worst.percent, 'f', worst.percent < 9.95 ? 1 : 0) + QChar(0x202F) + QLatin1Char('%');
    return say("An ideal gas would be off by up to %1 of work or heat, on segment %2.")
        .arg(percent)
        .arg(worst.segment + 1);
}

LedgerRow spreadRow(const SegmentResult &segment, int index, const units::Scale &energy,
                    const units::Scale &temperature, const Snapshot &snapshot)
{
    LedgerRow row{.kind = LedgerRowKind::spread};
    row.lead = QString::number(index + 1);
    row.segment = index;
    row.label = RichText::plain(segmentTitle(*segmentAt(snapshot.design, index)));
    if (!segment.idealGas) {
        row.figures = {QStringLiteral("–"), QStringLiteral("–"), QStringLiteral("–")};
        return row;
    }
    const double sign = shownSign(snapshot.units);
    const path::IdealGasFigures &ideal = *segment.idealGas;
    const double scale = scaleOf(segment);
    row.figures = {figure(sign * ideal.work, energy), figure(sign * ideal.heat, energy),
                   figure(ideal.endTemperature, temperature)};
    row.remarks = {percentOff(ideal.work, segment.work, scale), percentOff(ideal.heat, segment.heat, scale),
                   segment.to.temperature()
                       ? degreesOff(ideal.endTemperature, *segment.to.temperature(), snapshot.units)
                       : QString()};
    return row;
}

} // namespace

std::vector<LedgerRow> spreadRows(const Snapshot &snapshot, const LedgerOpen &open)
{
    const path::PathResult &path = snapshot.evaluation->path;
    if (!hasSpread(path)) return {};
    LedgerRow section{.kind = LedgerRowKind::section};
    section.id = QStringLiteral("spread");
    section.label = RichText::plain(say("Model spread"));
    section.opens = true;
    section.isOpen = open.spread;
    LedgerRow words{.kind = LedgerRowKind::sentence};
    words.label = RichText::plain(summary(path));
    std::vector<LedgerRow> rows{section, words};
    if (!open.spread) return rows;

    std::vector<double> temperatures;
    for (const SegmentResult &segment : path.segments)
        if (segment.idealGas) temperatures.push_back(segment.idealGas->endTemperature);
    const units::Scale temperature = units::scaleFor(Quantity::temperature, temperatures, snapshot.units);
    const units::Scale energy = accountScale(path, snapshot.units);
    LedgerRow columns{.kind = LedgerRowKind::columns};
    columns.label = RichText::plain(say("as an ideal gas"));
    columns.figures = {QStringLiteral("<i>W</i>"), QStringLiteral("<i>Q</i>"),
                       QStringLiteral("<i>T</i> / %1").arg(QString::fromStdString(temperature.unit))};
    rows.push_back(columns);
    for (std::size_t k = 0; k < path.segments.size(); ++k)
        rows.push_back(spreadRow(path.segments[k], static_cast<int>(k), energy, temperature, snapshot));
    return rows;
}

} // namespace quasistat::ui
