// What the path comes to, and how far its figures were checked.

#include "ui/canvas/limit_text.h"
#include "ui/ledger/ledger_rows.h"
#include "ui/report/prose.h"
#include "ui/report/sections.h"
#include "ui/report/table.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"

#include <QCoreApplication>

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

/// Figures of the path in two columns of words and value.
class FigureRows
{
public:
    FigureRows(const units::DisplayUnits &units, const units::Scale &energy) : m_units(units), m_energy(energy) {}

    void add(const QString &words, std::optional<double> value, Quantity quantity)
    {
        if (!value) return;
        const QString text =
            quantity == Quantity::number ? QString::number(*value, 'f', 4) : shownFigure(*value, quantity, m_units);
        m_rows.push_back({{{RichText::plain(words), {}}, {RichText::plain(text), {}}}});
    }
    [[nodiscard]] const std::vector<TableRow> &rows() const { return m_rows; }

private:
    const units::DisplayUnits &m_units;
    units::Scale m_energy; ///< of the ledger, so that figures agree as printed
    std::vector<TableRow> m_rows;
};

RichText routeWords(const SegmentResult &segment)
{
    if (segment.audit.heatByEntropy)
        return RichText::marked(say("∫<i>p</i> d<i>V</i> and ∫<i>T</i> d<i>S</i> by quadrature"));
    return RichText::marked(
        say("Δ<i>U</i>, Δ<i>S</i> from ∫<i>c<sub>v</sub></i> d<i>T</i> and <i>p</i>(<i>T</i>, <i>v</i>)"));
}

/// Share of the audit's scale; what is below rounding is said to be.
QString residualWords(const path::Audit &audit)
{
    const double share = audit.scale > 0.0 ? std::abs(audit.firstLawResidual) / audit.scale : 0.0;
    if (share < 1e-15) return QStringLiteral("< 1e−15");
    return QString::number(share, 'e', 1).replace(QLatin1Char('-'), QChar(0x2212));
}

} // namespace

std::vector<Block> pathFiguresSection(const ReportContent &content)
{
    const path::Totals &totals = content.evaluation.path.totals;
    const units::DisplayUnits &units = content.snapshot.units;
    FigureRows list(units, accountScale(content.evaluation.path, units));
    const bool takes = totals.netWorkOut < 0.0;
    list.add(takes ? say("net work into the gas") : say("net work by the gas"), std::abs(totals.netWorkOut),
             Quantity::energy);
    list.add(say("heat in"), totals.heatIn, Quantity::energy);
    list.add(say("heat out"), totals.heatOut, Quantity::energy);
    list.add(say("steady-flow work, positive into the gas"), totals.steadyFlowWork, Quantity::energy);
    list.add(say("entropy generated"), totals.entropyGenerated, Quantity::entropy);
    list.add(say("lost work, at %1")
                 .arg(shownFigure(content.evaluation.input.surroundings.temperature, Quantity::temperature, units)),
             totals.lostWork, Quantity::energy);
    list.add(say("thermal efficiency"), totals.thermalEfficiency, Quantity::number);
    list.add(say("coefficient of performance, heating"), totals.copHeating, Quantity::number);
    list.add(say("coefficient of performance, cooling"), totals.copCooling, Quantity::number);
    list.add(say("ratio to the Carnot bound"), totals.carnotRatio, Quantity::number);
    list.add(say("mean effective pressure"), totals.meanEffectivePressure, Quantity::pressure);
    if (totals.power && content.evaluation.input.rate)
        list.add((takes ? say("power taken, at %1") : say("power given, at %1"))
                     .arg(printed(typedAt(content.snapshot.design.json, "/rate"))),
                 std::abs(*totals.power), Quantity::power);

    std::vector<Block> blocks{heading(say("Path"), content.width)};
    const std::vector<TableColumn> columns{{RichText::plain(say("figure")), 2.0, Align::left},
                                           {RichText::plain(say("value")), 1.0, Align::right}};
    for (Block &block : table(columns, list.rows(), 0.62 * content.width)) blocks.push_back(std::move(block));
    blocks.push_back(space(10.0));
    return blocks;
}

std::vector<Block> auditSection(const ReportContent &content)
{
    const path::PathResult &path = content.evaluation.path;
    if (path.segments.empty()) return {};
    const units::Scale scale = accountScale(path, content.snapshot.units);
    const auto energy = [&](double value) { return TableCell{RichText::plain(figure(value, scale)), {}}; };
    std::vector<TableRow> rows;
    for (std::size_t k = 0; k < path.segments.size(); ++k) {
        const SegmentResult &s = path.segments[k];
        const auto words = path::facts(s.kind).words;
        const QString kind = QString::fromUtf8(words.data(), static_cast<qsizetype>(words.size()));
        rows.push_back({{{RichText::plain(QStringLiteral("%1  %2").arg(k + 1).arg(kind)), {}},
                         {routeWords(s), {}},
                         energy(s.deltaInternalEnergy),
                         energy(s.work),
                         energy(s.heat),
                         {RichText::plain(residualWords(s.audit)), {}},
                         {{}, s.audit.ok ? StateMark::tick : StateMark::cross}}});
    }
    const QString unit = QString::fromStdString(scale.unit);
    const auto head = [&](const char *symbol) {
        return RichText::marked(QStringLiteral("%1\u00a0/\u00a0%2").arg(QString::fromUtf8(symbol), unit));
    };
    const std::vector<TableColumn> columns{{RichText::plain(say("segment")), 2.2, Align::left},
                                           {RichText::plain(say("second route")), 2.5, Align::left},
                                           {head("Δ<i>U</i>"), 1.0, Align::right},
                                           {head("<i>W</i>"), 1.0, Align::right},
                                           {head("<i>Q</i>"), 1.0, Align::right},
                                           {RichText::plain(say("residual")), 1.0, Align::right},
                                           {RichText::plain(say("audit")), 0.5, Align::right}};
    std::vector<Block> blocks{
        heading(say("Audit"), content.width,
                RichText::marked(say(
                    "positive into the gas; residual Δ<i>U</i> − <i>W</i> − <i>Q</i> over the largest of the three, "
                    "allowed 1e−9")))};
    for (Block &block : table(columns, rows, content.width)) blocks.push_back(std::move(block));
    blocks.push_back(space(10.0));
    return blocks;
}

} // namespace quasistat::ui
