// States and ledger: the figures of the path in columns.

#include "ui/ledger/ledger_rows.h"
#include "ui/report/figure_columns.h"
#include "ui/report/prose.h"
#include "ui/report/sections.h"
#include "ui/report/table.h"
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
using path::StateResult;
using units::Quantity;

QString say(const char *text)
{
    return QCoreApplication::translate("Report", text);
}

RichText marked(const QString &markup)
{
    return RichText::marked(markup);
}

RichText titleAndKind(const document::Json &segment, const SegmentResult &result)
{
    const QString title = segmentTitle(segment);
    const RichText kind = kindWords(segment, &result);
    if (typedAt(segment, "/label").isEmpty()) return kind;
    return RichText::plain(title + QStringLiteral(", ")) + kind;
}

bool isViolatedOn(const analysis::Evaluation &evaluation, int segment)
{
    return std::any_of(evaluation.verdicts.begin(), evaluation.verdicts.end(), [&](const analysis::Verdict &verdict) {
        return std::any_of(verdict.violations.begin(), verdict.violations.end(),
                           [&](const analysis::Violation &violation) { return violation.segment == segment; });
    });
}

/// A column only where a state has one.
void addVapourFractions(std::vector<TableColumn> &columns, std::vector<TableRow> &rows,
                        const std::vector<StateResult> &states, const units::DisplayUnits &units)
{
    const auto fractions = valuesOf(states, [](const StateResult &s) {
        return s.state.isEvacuated() ? std::nullopt : s.state.molar().vapourFraction;
    });
    if (std::none_of(fractions.begin(), fractions.end(), [](const auto &x) { return x.has_value(); })) return;
    const units::Scale share{.unit = {}, .factor = 1.0, .offset = 0.0, .decimals = 4};
    addFigures(columns, rows, {{say("vapour <i>x</i>"), Quantity::number, fractions, share}}, 0.9, units);
}

StateMark auditMark(bool ok)
{
    return ok ? StateMark::tick : StateMark::cross;
}

} // namespace

std::vector<Block> statesSection(const ReportContent &content)
{
    const path::PathResult &path = content.evaluation.path;
    std::vector<StateResult> states = path.states;
    if (path.totals.closed) states.pop_back(); // it is state 1 again, and the first row says so
    std::vector<TableColumn> columns{{RichText::plain(say("state")), 0.7, Align::left}};
    std::vector<TableRow> rows;
    for (std::size_t k = 0; k < states.size(); ++k) {
        const QString number =
            k == 0 && path.totals.closed ? QStringLiteral("1 = %1").arg(path.states.size()) : QString::number(k + 1);
        rows.push_back({{{RichText::plain(number), {}}}});
    }
    const gas::State &first = states.front().state;
    const std::vector<FigureColumn> figures{
        {QStringLiteral("<i>p</i>"), Quantity::pressure,
         valuesOf(states, [](const auto &s) { return s.state.pressure(); })},
        {QStringLiteral("<i>V</i>"), Quantity::volume,
         valuesOf(states, [](const auto &s) { return s.state.volume(); })},
        {QStringLiteral("<i>T</i>"), Quantity::temperature,
         valuesOf(states, [](const auto &s) { return s.state.temperature(); })},
        {QStringLiteral("<i>U</i> − <i>U</i><sub>1</sub>"), Quantity::energy,
         valuesOf(states, [&](const auto &s) { return s.state.internalEnergy() - first.internalEnergy(); })},
        {QStringLiteral("<i>S</i> − <i>S</i><sub>1</sub>"), Quantity::entropy,
         valuesOf(states, [&](const auto &s) { return entropyChange(first, s.state); })},
        {say("amount"), Quantity::amount, valuesOf(states, [](const auto &s) { return s.state.amount(); })},
        {say("stored energy"), Quantity::energy, valuesOf(states, [](const auto &s) {
             return s.storedEnergy ? std::optional(s.storedEnergy->real) : std::nullopt;
         })}};
    addFigures(columns, rows, figures, 1.0, content.snapshot.units);
    columns.back().share = 1.35; // its head is long
    addVapourFractions(columns, rows, states, content.snapshot.units);
    std::vector<Block> blocks{heading(say("States"), content.width)};
    for (Block &block : table(columns, rows, content.width)) blocks.push_back(std::move(block));
    blocks.push_back(space(10.0));
    return blocks;
}

std::vector<Block> ledgerSection(const ReportContent &content)
{
    const analysis::Evaluation &evaluation = content.evaluation;
    const path::PathResult &path = evaluation.path;
    const units::DisplayUnits &units = content.snapshot.units;
    const double sign = shownSign(units);
    std::vector<TableColumn> columns{{RichText::plain(say("segment")), 2.55, Align::left},
                                     {RichText::plain(say("end, as given")), 1.45, Align::left}};
    std::vector<TableRow> rows;
    for (std::size_t k = 0; k < path.segments.size(); ++k) {
        const document::Json &segment = *segmentAt(content.snapshot.design, static_cast<int>(k));
        TableCell end{endWords(segment), {}};
        if (isViolatedOn(evaluation, static_cast<int>(k) + 1)) end.mark = StateMark::warning;
        rows.push_back({{{numbered(k + 1, titleAndKind(segment, path.segments[k])), {}}, end}});
    }
    rows.push_back({{{RichText::plain(path.totals.closed ? say("path, closed") : say("path")), {}}, {{}, {}}}, true});

    const auto withTotal = [&](auto value, double total) {
        auto values = valuesOf(path.segments, value);
        values.emplace_back(total);
        return values;
    };
    const units::Scale energy = accountScale(path, units);
    const std::vector<FigureColumn> figures{
        {QStringLiteral("<i>W</i>"), Quantity::energy,
         withTotal([&](const SegmentResult &s) { return sign * s.work; }, sign * path.totals.work), energy},
        {QStringLiteral("<i>Q</i>"), Quantity::energy,
         withTotal([&](const SegmentResult &s) { return sign * s.heat; }, sign * path.totals.heat), energy},
        {QStringLiteral("Δ<i>U</i>"), Quantity::energy,
         withTotal([](const SegmentResult &s) { return s.deltaInternalEnergy; }, path.totals.deltaInternalEnergy),
         energy},
        {QStringLiteral("<i>S</i><sub>gen</sub>"), Quantity::entropy,
         withTotal([](const SegmentResult &s) { return s.entropyGenerated; }, path.totals.entropyGenerated)},
        {say("lost work"), Quantity::energy,
         withTotal([](const SegmentResult &s) { return s.lostWork; }, path.totals.lostWork), energy}};
    addFigures(columns, rows, figures, 0.95, units);
    columns.back().share = 1.15;
    columns.push_back({RichText::plain(say("audit")), 0.5, Align::right});
    for (std::size_t k = 0; k < path.segments.size(); ++k)
        rows[k].cells.push_back({{}, auditMark(path.segments[k].audit.ok)});
    rows.back().cells.push_back({{}, auditMark(evaluation.auditsAgree())});

    const QString balance = sign > 0
                                ? say("Δ<i>U</i> = <i>Q</i> + <i>W</i> on every row; totals from unrounded figures")
                                : say("Δ<i>U</i> = −<i>Q</i> − <i>W</i> on every row; totals from unrounded figures");
    std::vector<Block> blocks{heading(say("Ledger"), content.width, marked(balance))};
    for (Block &block : table(columns, rows, content.width)) blocks.push_back(std::move(block));
    blocks.push_back(space(10.0));
    return blocks;
}

std::vector<Block> limitsReachedSection(const ReportContent &content)
{
    const path::PathResult &path = content.evaluation.path;
    const units::DisplayUnits &units = content.snapshot.units;
    const double sign = shownSign(units);
    if (path.segments.empty()) return {};
    std::vector<TableColumn> columns{{RichText::plain(say("segment")), 1.4, Align::left}};
    std::vector<TableRow> rows;
    for (std::size_t k = 0; k < path.segments.size(); ++k)
        rows.push_back(
            {{{numbered(k + 1, RichText::plain(segmentTitle(*segmentAt(content.snapshot.design, static_cast<int>(k))))),
               {}}}});
    const auto signedFigure = [&](std::optional<double> SegmentResult::*figure) {
        return valuesOf(path.segments, [=](const SegmentResult &s) {
            return s.*figure ? std::optional(sign * *(s.*figure)) : std::nullopt;
        });
    };
    units::Scale share{.unit = {}, .factor = 1.0, .offset = 0.0, .decimals = 4};
    const units::Scale energy = accountScale(path, units);
    const std::vector<FigureColumn> figures{
        {QStringLiteral("Δ<i>H</i>"), Quantity::energy,
         valuesOf(path.segments, [](const SegmentResult &s) { return s.deltaEnthalpy; }), energy},
        {QStringLiteral("Δ<i>S</i>"), Quantity::entropy,
         valuesOf(path.segments, [](const SegmentResult &s) { return entropyChange(s.from, s.to); })},
        {QStringLiteral("<i>W</i><sub>flow</sub>"), Quantity::energy, signedFigure(&SegmentResult::steadyFlowWork),
         energy},
        {QStringLiteral("<i>W</i><sub>rod</sub>"), Quantity::energy, signedFigure(&SegmentResult::rodWork), energy},
        {QStringLiteral("<i>W</i><sub>rev</sub>"), Quantity::energy, signedFigure(&SegmentResult::reversibleLimitWork),
         energy},
        {say("shortfall"), Quantity::energy, signedFigure(&SegmentResult::shortfall), energy},
        {say("recovery"), Quantity::number, valuesOf(path.segments, [](const SegmentResult &s) { return s.recovery; }),
         share},
        {QStringLiteral("<i>T</i><sub>min</sub>"), Quantity::temperature,
         valuesOf(path.segments, [](const SegmentResult &s) { return s.extrema.temperature.lowest; })},
        {QStringLiteral("<i>T</i><sub>max</sub>"), Quantity::temperature,
         valuesOf(path.segments, [](const SegmentResult &s) { return s.extrema.temperature.highest; })}};
    addFigures(columns, rows, figures, 0.9, units);
    columns[6].share = 1.1; // "shortfall / kJ" on one line
    std::vector<Block> blocks{
        heading(say("Further figures"), content.width,
                marked(say("<i>W</i><sub>flow</sub> = Δ<i>H</i> − <i>Q</i>; <i>W</i><sub>rod</sub> = <i>W</i> + "
                           "<i>p</i><sub>0</sub>Δ<i>V</i>")))};
    for (Block &block : table(columns, rows, content.width)) blocks.push_back(std::move(block));
    blocks.push_back(space(10.0));
    return blocks;
}

} // namespace quasistat::ui
