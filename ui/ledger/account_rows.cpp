#include "ui/ledger/formulas.h"
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

RichText marked(const QString &markup)
{
    return RichText::marked(markup);
}

struct Line {
    double work;
    double heat;
    double internalEnergy;
};

std::vector<Line> linesOf(const path::PathResult &path)
{
    std::vector<Line> lines;
    for (const SegmentResult &segment : path.segments)
        lines.push_back({segment.work, segment.heat, segment.deltaInternalEnergy});
    lines.push_back({path.totals.work, path.totals.heat, path.totals.deltaInternalEnergy});
    return lines;
}

/// The figure as printed, in units of the last decimal.
long long ticks(double value, const units::Scale &scale)
{
    return std::llround(value * scale.factor * std::pow(10.0, scale.decimals));
}

bool closesAsPrinted(const std::vector<Line> &lines, const units::Scale &scale)
{
    long long work = 0;
    long long heat = 0;
    long long energy = 0;
    for (std::size_t i = 0; i < lines.size(); ++i) {
        const long long w = ticks(lines[i].work, scale);
        const long long q = ticks(lines[i].heat, scale);
        const long long u = ticks(lines[i].internalEnergy, scale);
        if (w + q != u) return false;
        if (i + 1 == lines.size()) return w == work && q == heat && u == energy;
        work += w;
        heat += q;
        energy += u;
    }
    return true;
}

QStringList figuresOf(const Line &line, const units::Scale &scale, double sign)
{
    return {figure(sign * line.work, scale), figure(sign * line.heat, scale), figure(line.internalEnergy, scale)};
}

LedgerRow openedRow(LedgerRowKind kind, const RichText &label, int segment)
{
    LedgerRow row{.kind = kind};
    row.label = label;
    row.segment = segment;
    row.opened = true;
    return row;
}

LedgerRow routeRow(const QString &markup, const QString &value, int segment)
{
    LedgerRow row = openedRow(LedgerRowKind::route, marked(markup), segment);
    row.figures = {value};
    return row;
}

/// "< 1 × 10⁻⁹ of the largest", or the residual itself where the audit failed.
QString residualWords(double residual, const path::Audit &audit, const units::DisplayUnits &units)
{
    if (std::abs(residual) <= 1e-9 * audit.scale) return say("< 1 × 10⁻⁹ of the largest");
    return shownFigure(residual, Quantity::energy, units);
}

QString fine(double value, units::Scale scale)
{
    scale.decimals += 2;
    return figureWithUnit(value, scale);
}

void addRoutes(std::vector<LedgerRow> &rows, const SegmentResult &segment, int index, const units::Scale &scale,
               const Snapshot &snapshot)
{
    const double sign = shownSign(snapshot.units);
    const bool quasiStatic = path::facts(segment.kind).quasiStatic;
    rows.push_back(
        routeRow(quasiStatic ? say("−∫<i>p</i> d<i>V</i>, by quadrature") : say("<i>W</i>, against the load"),
                 fine(sign * segment.work, scale), index));
    if (segment.audit.heatByEntropy)
        rows.push_back(routeRow(say("∫<i>T</i> d<i>S</i>, by quadrature"),
                                fine(sign * *segment.audit.heatByEntropy, scale), index));
    else
        rows.push_back(routeRow(say("<i>Q</i>, by its own route"), fine(sign * segment.heat, scale), index));
    const QString difference =
        quasiStatic ? say("Δ<i>U</i> − <i>W</i> − ∫<i>T</i> d<i>S</i>") : say("Δ<i>U</i> − <i>W</i> − <i>Q</i>");
    rows.push_back(
        routeRow(difference, residualWords(segment.audit.firstLawResidual, segment.audit, snapshot.units), index));
    if (!quasiStatic)
        rows.push_back(routeRow(say("lost work, both ways"),
                                residualWords(segment.audit.lostWorkResidual, segment.audit, snapshot.units), index));
}

void addOpened(std::vector<LedgerRow> &rows, const SegmentResult &segment, int index, const QString &column,
               const units::Scale &scale, const Snapshot &snapshot)
{
    const Formula formula = column == QLatin1String("W")   ? workFormula(segment, index + 1)
                            : column == QLatin1String("Q") ? heatFormula(segment, index + 1)
                                                           : internalEnergyFormula(index + 1);
    rows.push_back(openedRow(LedgerRowKind::formula, marked(formula.markup), index));
    addRoutes(rows, segment, index, scale, snapshot);
    rows.push_back(openedRow(LedgerRowKind::source, RichText::plain(formula.source), index));
}

LedgerRow segmentRow(const SegmentResult &segment, int index, const units::Scale &scale, const Snapshot &snapshot)
{
    LedgerRow row{.kind = LedgerRowKind::segment};
    row.id = QString::number(index + 1);
    row.lead = row.id;
    row.segment = index;
    row.label = RichText::plain(segmentTitle(*segmentAt(snapshot.design, index)));
    row.figures =
        figuresOf({segment.work, segment.heat, segment.deltaInternalEnergy}, scale, shownSign(snapshot.units));
    row.mark = segment.audit.ok ? StateMark::tick : StateMark::cross;
    row.struck = !segment.audit.ok;
    return row;
}

LedgerRow failedRow(int index, const Failure &failure, const Snapshot &snapshot)
{
    LedgerRow row{.kind = LedgerRowKind::segment};
    row.id = QString::number(index + 1);
    row.lead = row.id;
    row.segment = index;
    row.label = RichText::plain(segmentTitle(*segmentAt(snapshot.design, index)));
    row.figures = {QStringLiteral("–"), QStringLiteral("–"), QStringLiteral("–")};
    if (failure.reason != Reason::notReached) row.mark = StateMark::cross;
    return row;
}

LedgerRow totalRow(const path::PathResult &path, const units::Scale &scale, const units::DisplayUnits &units,
                   bool agree)
{
    LedgerRow row{.kind = LedgerRowKind::total};
    row.id = QStringLiteral("total");
    row.label = RichText::plain(!path.complete()     ? say("path so far")
                                : path.totals.closed ? say("path, closed")
                                                     : say("path"));
    row.figures =
        figuresOf({path.totals.work, path.totals.heat, path.totals.deltaInternalEnergy}, scale, shownSign(units));
    row.mark = agree ? StateMark::tick : StateMark::cross;
    return row;
}

LedgerRow closureRow(const path::PathResult &path)
{
    LedgerRow row{.kind = LedgerRowKind::sentence};
    row.id = QStringLiteral("closure");
    const auto last = static_cast<int>(path.states.size());
    row.label = path.totals.closed
                    ? marked(say("State %1 is state 1: <i>p</i>, <i>V</i>, <i>T</i> and amount agree.").arg(last))
                    : marked(say("Open path: state %1 is not state 1.").arg(last));
    return row;
}

} // namespace

units::Scale accountScale(const path::PathResult &path, const units::DisplayUnits &units)
{
    const std::vector<Line> lines = linesOf(path);
    std::vector<double> values;
    for (const Line &line : lines) values.insert(values.end(), {line.work, line.heat, line.internalEnergy});
    units::Scale scale = units::scaleFor(Quantity::energy, values, units);
    const int readable = scale.decimals;
    while (scale.decimals < readable + 2 && !closesAsPrinted(lines, scale)) ++scale.decimals;
    if (!closesAsPrinted(lines, scale)) scale.decimals = readable; // no number of digits would: stay readable
    return scale;
}

std::vector<LedgerRow> accountRows(const Snapshot &snapshot, const LedgerOpen &open)
{
    std::vector<LedgerRow> rows;
    const analysis::Evaluation &evaluation = *snapshot.evaluation;
    const path::PathResult &path = evaluation.path;
    const units::Scale scale = accountScale(path, snapshot.units);

    LedgerRow heading{.kind = LedgerRowKind::heading};
    heading.label = RichText::plain(say("Ledger"));
    heading.unit = QString::fromStdString(scale.unit) +
                   (snapshot.units.workByGas ? say(", positive by the gas") : say(", positive into the gas"));
    rows.push_back(heading);
    LedgerRow columns{.kind = LedgerRowKind::columns};
    columns.label = RichText::plain(say("segment"));
    columns.figures = {QStringLiteral("<i>W</i>"), QStringLiteral("<i>Q</i>"), QStringLiteral("Δ<i>U</i>")};
    rows.push_back(columns);

    for (std::size_t k = 0; k < path.failures.size(); ++k) {
        const int index = static_cast<int>(k);
        if (k >= path.segments.size()) {
            if (path.failures[k]) rows.push_back(failedRow(index, *path.failures[k], snapshot));
            continue;
        }
        rows.push_back(segmentRow(path.segments[k], index, scale, snapshot));
        const QString prefix = QString::number(index + 1) + QLatin1Char('.');
        if (open.figure.startsWith(prefix))
            addOpened(rows, path.segments[k], index, open.figure.mid(prefix.size()), scale, snapshot);
    }
    if (path.segments.empty()) return rows;
    rows.push_back(totalRow(path, scale, snapshot.units, evaluation.auditsAgree()));
    if (path.complete()) rows.push_back(closureRow(path));
    return rows;
}

} // namespace quasistat::ui
