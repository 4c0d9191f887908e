#include "ui/fields/form_field.h"
#include "ui/gas/model_spread.h"
#include "ui/ledger/formulas.h"
#include "ui/ledger/ledger_rows.h"
#include "ui/session/design_reading.h"
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

/// Rows of figures that open to their formula.
class FigureList
{
public:
    FigureList(QString prefix, const LedgerOpen &open, const units::DisplayUnits &units)
        : m_prefix(std::move(prefix)), m_open(open), m_units(units)
    {
    }

    void add(const char *key, const QString &words, double value, Quantity quantity)
    {
        const units::Scale scale = quantity == Quantity::number
                                       ? units::Scale{.unit = {}, .decimals = 4}
                                       : units::scaleFor(quantity, std::span(&value, 1), m_units);
        push(key, words, figure(value, scale), QString::fromStdString(scale.unit));
    }
    void add(const char *key, const QString &words, const std::optional<double> &value, Quantity quantity)
    {
        if (value) add(key, words, *value, quantity);
    }
    void addAt(const char *key, const QString &words, double value, const units::Scale &scale)
    {
        push(key, words, figure(value, scale), QString::fromStdString(scale.unit));
    }
    void addText(const QString &words, const QString &text)
    {
        LedgerRow row{.kind = LedgerRowKind::route};
        row.label = RichText::marked(words);
        row.figures = {text};
        m_rows.push_back(row);
    }
    void addSentence(const QString &words, LedgerRowKind kind = LedgerRowKind::sentence)
    {
        LedgerRow row{.kind = kind};
        row.label = RichText::plain(words);
        m_rows.push_back(row);
    }
    [[nodiscard]] std::vector<LedgerRow> take() { return std::move(m_rows); }

private:
    void push(const char *key, const QString &words, const QString &digits, const QString &unit)
    {
        LedgerRow row{.kind = LedgerRowKind::figure};
        row.id = m_prefix + QLatin1String(key);
        row.label = RichText::marked(words);
        row.figures = {digits};
        row.unit = unit;
        row.isOpen = m_open.figure == row.id;
        m_rows.push_back(row);
        if (!row.isOpen) return;
        const Formula formula = figureFormula(QLatin1String(key));
        for (const auto &[kind, text] : {std::pair(LedgerRowKind::formula, RichText::marked(formula.markup)),
                                         std::pair(LedgerRowKind::source, RichText::plain(formula.source))}) {
            LedgerRow opened{.kind = kind};
            opened.label = text;
            opened.opened = true;
            m_rows.push_back(opened);
        }
    }

    QString m_prefix;
    const LedgerOpen &m_open;
    const units::DisplayUnits &m_units;
    std::vector<LedgerRow> m_rows;
};

LedgerRow sectionRow(const QString &id, const QString &words, bool opens, bool isOpen)
{
    LedgerRow row{.kind = LedgerRowKind::section};
    row.id = id;
    row.label = RichText::plain(words);
    row.opens = opens;
    row.isOpen = isOpen;
    return row;
}

void append(std::vector<LedgerRow> &rows, std::vector<LedgerRow> more)
{
    rows.insert(rows.end(), std::make_move_iterator(more.begin()), std::make_move_iterator(more.end()));
}

QString atSurroundings(const analysis::Evaluation &evaluation, const units::DisplayUnits &units)
{
    const double temperature = evaluation.input.surroundings.temperature;
    return say("lost work, at %1").arg(shownFigure(temperature, Quantity::temperature, units, 3));
}

void addMachineFigures(FigureList &list, const Snapshot &snapshot)
{
    const path::Totals &totals = snapshot.evaluation->path.totals;
    list.add("mean_effective_pressure", say("mean effective pressure"), totals.meanEffectivePressure,
             Quantity::pressure);
    list.add("thermal_efficiency", say("thermal efficiency"), totals.thermalEfficiency, Quantity::number);
    list.add("cop_heating", say("coefficient of performance, heating"), totals.copHeating, Quantity::number);
    list.add("cop_cooling", say("coefficient of performance, cooling"), totals.copCooling, Quantity::number);
    list.add("carnot_ratio", say("ratio to the Carnot bound"), totals.carnotRatio, Quantity::number);
    if (!totals.power) return;
    const QString rate = asPrinted(typedAt(snapshot.design.json, "/rate"));
    list.add("power", (*totals.power < 0 ? say("power taken, at %1") : say("power given, at %1")).arg(rate),
             std::abs(*totals.power), Quantity::power);
}

QString rangeText(const path::Interval &range, Quantity quantity, const units::DisplayUnits &units)
{
    const double ends[] = {range.lowest, range.highest};
    const units::Scale scale = units::scaleFor(quantity, ends, units);
    return figure(range.lowest, scale) + QStringLiteral(" … ") + figureWithUnit(range.highest, scale);
}

void addIrreversibility(FigureList &list, const SegmentResult &segment, const Snapshot &snapshot)
{
    const double sign = shownSign(snapshot.units);
    const auto turned = [sign](const std::optional<double> &value) {
        return value ? std::optional(sign * *value) : std::nullopt;
    };
    list.add("entropy_generated", say("entropy generated"), segment.entropyGenerated, Quantity::entropy);
    list.add("lost_work", atSurroundings(*snapshot.evaluation, snapshot.units), segment.lostWork, Quantity::energy);
    list.add("reversible_limit_work", say("reversible limit"), turned(segment.reversibleLimitWork), Quantity::energy);
    list.add("reversible_limit_steady_flow_work", say("reversible limit, steady flow"),
             turned(segment.reversibleLimitSteadyFlowWork), Quantity::energy);
    list.add("shortfall", say("shortfall"), segment.shortfall, Quantity::energy);
    list.add("recovery", say("recovery"), segment.recovery, Quantity::number);
}

/// Beside the real figures, with how far the ideal ones are off.
void addIdealGas(FigureList &list, const SegmentResult &result, const units::DisplayUnits &units)
{
    if (!result.idealGas || result.from.gas().isIdeal()) return;
    const path::IdealGasFigures &ideal = *result.idealGas;
    const double sign = shownSign(units);
    const auto words = [](const QString &symbol, const QString &off) {
        const QString text = say("as an ideal gas: %1").arg(symbol);
        return off == QStringLiteral("–") || off.isEmpty() ? text : QStringLiteral("%1 (%2)").arg(text, off);
    };
    list.add("ideal_gas_work",
             words(QStringLiteral("<i>W</i>"), percentOff(ideal.work, result.work, result.audit.scale)),
             sign * ideal.work, Quantity::energy);
    list.add("ideal_gas_heat",
             words(QStringLiteral("<i>Q</i>"), percentOff(ideal.heat, result.heat, result.audit.scale)),
             sign * ideal.heat, Quantity::energy);
    const auto end = result.to.temperature();
    list.add("ideal_gas_end_temperature",
             words(say("end <i>T</i>"), end ? degreesOff(ideal.endTemperature, *end, units) : QString()),
             ideal.endTemperature, Quantity::temperature);
}

void addCrossings(FigureList &list, const SegmentResult &result, const units::DisplayUnits &units)
{
    for (const path::PhaseCrossing &crossing : result.phaseCrossings) {
        const gas::State &state = crossing.state;
        QString where = shownFigure(state.pressure(), Quantity::pressure, units);
        if (const auto temperature = state.temperature())
            where += QStringLiteral(", ") + shownFigure(*temperature, Quantity::temperature, units);
        list.addText(crossing.entersTwoPhase ? say("enters two phases at") : say("leaves two phases at"), where);
    }
}

std::optional<double> vapourFraction(const gas::State &state)
{
    return state.isEvacuated() ? std::nullopt : state.molar().vapourFraction;
}

void addState(FigureList &list, const path::StateResult &state, int number, const units::DisplayUnits &units)
{
    list.add("vapour_fraction", say("state %1: vapour fraction <i>x</i>").arg(number), vapourFraction(state.state),
             Quantity::number);
    list.add("available_work", say("state %1: available work").arg(number), state.availableWork, Quantity::energy);
    if (!state.storedEnergy) return;
    list.add("stored_energy", say("state %1: stored energy").arg(number), state.storedEnergy->real, Quantity::energy);
    constexpr double tntEnergy = 4.184e6; // [J/kg], the usual convention for TNT equivalents
    list.addText(say("as TNT equivalent"), shownFigure(state.storedEnergy->real / tntEnergy, Quantity::mass, units));
    list.addSentence(
        say("An estimate of what a sudden release could set free, for planning only. Pressure equipment must be "
            "reviewed by a competent person."));
}

} // namespace

std::vector<LedgerRow> pathFigureRows(const Snapshot &snapshot, const LedgerOpen &open)
{
    const path::PathResult &path = snapshot.evaluation->path;
    if (path.segments.empty()) return {};
    const path::Totals &totals = path.totals;
    const units::Scale scale = accountScale(path, snapshot.units);
    FigureList list(QStringLiteral("path."), open, snapshot.units);
    list.addAt("work", snapshot.units.workByGas ? say("net work by the gas") : say("net work into the gas"),
               shownSign(snapshot.units) * totals.work, scale);
    list.addAt("heat_in", say("heat in"), totals.heatIn, scale);
    list.addAt("heat_out", say("heat out"), totals.heatOut, scale);
    if (totals.steadyFlowWork)
        list.addAt("steady_flow_work", say("steady-flow work"), shownSign(snapshot.units) * *totals.steadyFlowWork,
                   scale);
    list.add("entropy_generated", say("entropy generated"), totals.entropyGenerated, Quantity::entropy);
    list.addAt("lost_work", atSurroundings(*snapshot.evaluation, snapshot.units), totals.lostWork, scale);
    addMachineFigures(list, snapshot);
    std::vector<LedgerRow> rows{sectionRow(QString(), say("Path"), false, true)};
    append(rows, list.take());
    return rows;
}

std::vector<LedgerRow> segmentFigureRows(const Snapshot &snapshot, int segment, const LedgerOpen &open)
{
    const path::PathResult &path = snapshot.evaluation->path;
    if (segment < 0 || static_cast<std::size_t>(segment) >= path.segments.size()) return {};
    const SegmentResult &result = path.segments[static_cast<std::size_t>(segment)];
    const QString title = segmentTitle(*segmentAt(snapshot.design, segment));
    std::vector<LedgerRow> rows{sectionRow(QStringLiteral("segment"), say("Segment %1, %2").arg(segment + 1).arg(title),
                                           true, open.segmentFigures)};
    if (!open.segmentFigures) return rows;

    const double sign = shownSign(snapshot.units);
    FigureList list(QStringLiteral("segment."), open, snapshot.units);
    list.add("delta_enthalpy", QStringLiteral("Δ<i>H</i>"), result.deltaEnthalpy, Quantity::energy);
    list.add("delta_entropy", QStringLiteral("Δ<i>S</i>"), entropyChange(result.from, result.to), Quantity::entropy);
    if (result.steadyFlowWork)
        list.add("steady_flow_work", say("steady-flow work"), sign * *result.steadyFlowWork, Quantity::energy);
    if (result.rodWork) list.add("rod_work", say("rod work"), sign * *result.rodWork, Quantity::energy);
    list.add("atmosphere_work", say("work on the surroundings"), result.atmosphereWork, Quantity::energy);
    addIrreversibility(list, result, snapshot);
    list.addText(QStringLiteral("<i>p</i>"), rangeText(result.extrema.pressure, Quantity::pressure, snapshot.units));
    list.addText(QStringLiteral("<i>V</i>"), rangeText(result.extrema.volume, Quantity::volume, snapshot.units));
    list.addText(QStringLiteral("<i>T</i>"),
                 rangeText(result.extrema.temperature, Quantity::temperature, snapshot.units));
    addCrossings(list, result, snapshot.units);
    addIdealGas(list, result, snapshot.units);
    const auto end = static_cast<std::size_t>(segment) + 1;
    if (end < path.states.size()) addState(list, path.states[end], segment + 2, snapshot.units);
    append(rows, list.take());
    return rows;
}

} // namespace quasistat::ui
