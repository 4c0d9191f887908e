// What the path comes to, and how far its figures were checked.

#include "ui/report/prose.h"
#include "ui/report/sections.h"
#include "ui/report/table.h"
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
    explicit FigureRows(const units::DisplayUnits &units) : m_units(units) {}

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
    std::vector<TableRow> m_rows;
};

} // namespace

std::vector<Block> pathFiguresSection(const ReportContent &content)
{
    const path::Totals &totals = content.evaluation.path.totals;
    const units::DisplayUnits &units = content.snapshot.units;
    FigureRows list(units);
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
                     .arg(shownFigure(*content.evaluation.input.rate, Quantity::frequency, units)),
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
    const auto &segments = content.evaluation.path.segments;
    if (segments.empty()) return {};
    const units::DisplayUnits &units = content.snapshot.units;
    std::vector<TableRow> rows;
    for (std::size_t k = 0; k < segments.size(); ++k) {
        const SegmentResult &s = segments[k];
        const auto energy = [&](double value) {
            return TableCell{RichText::plain(shownFigure(value, Quantity::energy, units)), {}};
        };
        const double share = s.audit.scale > 0.0 ? std::abs(s.audit.firstLawResidual) / s.audit.scale : 0.0;
        const QString residual = share < 1e-15
                                     ? QStringLiteral("0")
                                     : QString::number(share, 'e', 1).replace(QLatin1Char('-'), QChar(0x2212));
        rows.push_back({{{RichText::plain(QStringLiteral("%1  %2").arg(k + 1).arg(
                              QString::fromUtf8(path::facts(s.kind).words.data()))),
                          {}},
                         {RichText::plain(s.audit.heatByEntropy ? say("∫T dS and ∫p dV by quadrature")
                                                                : say("ΔU and ΔS by quadrature of c_v and p(T, v)")),
                          {}},
                         energy(s.deltaInternalEnergy),
                         energy(s.work),
                         energy(s.heat),
                         {RichText::plain(residual), {}},
                         {{}, s.audit.ok ? StateMark::tick : StateMark::cross}}});
    }
    const std::vector<TableColumn> columns{{RichText::plain(say("segment")), 1.9, Align::left},
                                           {RichText::plain(say("second route")), 2.4, Align::left},
                                           {RichText::marked(QStringLiteral("Δ<i>U</i>")), 1.0, Align::right},
                                           {RichText::marked(QStringLiteral("<i>W</i>")), 1.0, Align::right},
                                           {RichText::marked(QStringLiteral("<i>Q</i>")), 1.0, Align::right},
                                           {RichText::plain(say("residual / scale")), 1.0, Align::right},
                                           {RichText::plain(say("audit")), 0.5, Align::right}};
    std::vector<Block> blocks{
        heading(say("Audit"), content.width,
                RichText::plain(say("positive into the gas; agreement within 1e−9 of the largest of |W|, |Q|, |ΔU|")))};
    for (Block &block : table(columns, rows, content.width)) blocks.push_back(std::move(block));
    blocks.push_back(space(10.0));
    return blocks;
}

} // namespace quasistat::ui
