#include "app/command_line/account_text.h"

#include "app/command_line/limit_text.h"
#include "app/command_line/table.h"

#include <algorithm>
#include <cmath>
#include <functional>

namespace quasistat::app
{

namespace
{

using analysis::Evaluation;
using path::SegmentResult;
using path::StateResult;
using units::DisplayUnits;
using units::Quantity;
using units::Scale;

/// Figures of one column: what each row has there, in one scale.
template <class Row>
struct Figures {
    std::string symbol;
    Quantity quantity;
    std::function<std::optional<double>(const Row &)> value;
};

template <class Row>
Scale scaleOf(const Figures<Row> &figures, const std::vector<Row> &rows, const DisplayUnits &units,
              std::optional<double> total)
{
    std::vector<double> values;
    for (const Row &row : rows)
        if (const std::optional<double> value = figures.value(row)) values.push_back(*value);
    if (total) values.push_back(*total);
    return units::scaleFor(figures.quantity, values, units);
}

/// "W/J"; a unit that is itself a quotient stands in parentheses (ISO 80000-1, 7.1.4): "S/(J/K)".
std::string heading(const std::string &symbol, const Scale &scale)
{
    if (scale.unit.empty()) return symbol;
    const bool isQuotient = scale.unit.find('/') != std::string::npos;
    return symbol + (isQuotient ? "/(" + scale.unit + ")" : "/" + scale.unit);
}

std::string cell(const std::optional<double> &value, const Scale &scale)
{
    return value ? units::digits(*value, scale) : std::string();
}

std::string statesText(const Evaluation &evaluation, const DisplayUnits &units)
{
    const std::vector<StateResult> &states = evaluation.path.states;
    const std::vector<Figures<StateResult>> figures{
        {"p", Quantity::pressure, [](const StateResult &s) { return std::optional(s.state.pressure()); }},
        {"V", Quantity::volume, [](const StateResult &s) { return std::optional(s.state.volume()); }},
        {"T", Quantity::temperature, [](const StateResult &s) { return s.state.temperature(); }},
        {"n", Quantity::amount, [](const StateResult &s) { return std::optional(s.state.amount()); }},
        {"U", Quantity::energy, [](const StateResult &s) { return std::optional(s.state.internalEnergy()); }},
        {"H", Quantity::energy, [](const StateResult &s) { return std::optional(s.state.enthalpy()); }},
        {"S", Quantity::entropy, [](const StateResult &s) { return std::optional(s.state.entropy()); }},
        {"Z", Quantity::number,
         [](const StateResult &s) { return s.state.gas().isIdeal() ? std::nullopt : s.state.compressibility(); }},
        {"available work", Quantity::energy, [](const StateResult &s) { return s.availableWork; }},
        {"stored energy", Quantity::energy,
         [](const StateResult &s) { return s.storedEnergy ? std::optional(s.storedEnergy->real) : std::nullopt; }}};
    std::vector<Table::Column> columns{{"state"}};
    std::vector<Scale> scales;
    for (const auto &column : figures) {
        scales.push_back(scaleOf(column, states, units, std::nullopt));
        columns.push_back({heading(column.symbol, scales.back())});
    }
    Table table(columns);
    for (std::size_t i = 0; i < states.size(); ++i) {
        std::vector<std::string> row{std::to_string(i + 1)};
        for (std::size_t c = 0; c < figures.size(); ++c) row.push_back(cell(figures[c].value(states[i]), scales[c]));
        table.addRow(std::move(row));
    }
    return "States\n" + table.text();
}

/// A column of the ledger with its total, if it has one.
struct LedgerColumn {
    Figures<SegmentResult> figures;
    std::optional<double> total;
};

std::vector<LedgerColumn> ledgerColumns(const path::Totals &totals, double sign)
{
    const auto signedTotal = [sign](double value) { return std::optional(sign * value); };
    return {
        {{"W", Quantity::energy, [sign](const SegmentResult &s) { return std::optional(sign * s.work); }},
         signedTotal(totals.work)},
        {{"Q", Quantity::energy, [sign](const SegmentResult &s) { return std::optional(sign * s.heat); }},
         signedTotal(totals.heat)},
        {{"ΔU", Quantity::energy, [](const SegmentResult &s) { return std::optional(s.deltaInternalEnergy); }},
         totals.deltaInternalEnergy},
        {{"ΔH", Quantity::energy, [](const SegmentResult &s) { return std::optional(s.deltaEnthalpy); }}, std::nullopt},
        {{"ΔS", Quantity::entropy, [](const SegmentResult &s) { return std::optional(s.deltaEntropy); }}, std::nullopt},
        {{"generated S", Quantity::entropy, [](const SegmentResult &s) { return std::optional(s.entropyGenerated); }},
         totals.entropyGenerated},
        {{"lost work", Quantity::energy, [](const SegmentResult &s) { return std::optional(s.lostWork); }},
         totals.lostWork},
        {{"reversible W", Quantity::energy,
          [sign](const SegmentResult &s) {
              return s.reversibleLimitWork ? std::optional(sign * *s.reversibleLimitWork) : std::nullopt;
          }},
         std::nullopt},
        {{"shortfall", Quantity::energy, [](const SegmentResult &s) { return s.shortfall; }}, std::nullopt},
    };
}

/// One scale for every energy of the ledger and one for every entropy, so that rows add up as printed.
struct LedgerScales {
    Scale energy;
    Scale entropy;
    [[nodiscard]] const Scale &of(Quantity quantity) const { return quantity == Quantity::entropy ? entropy : energy; }
};

/// A scale for `values`; where they are nothing but rounding, for `everyday`, which belongs to the charge.
Scale ledgerScale(Quantity quantity, std::vector<double> values, double everyday, const DisplayUnits &units)
{
    constexpr double rounding = 1e-9; // as an audit allows
    const bool isRounding = std::ranges::all_of(values, [&](double v) { return std::abs(v) <= rounding * everyday; });
    if (isRounding) values.assign(1, everyday);
    return units::scaleFor(quantity, values, units);
}

LedgerScales ledgerScales(const Evaluation &evaluation, const std::vector<LedgerColumn> &ledger,
                          const DisplayUnits &units)
{
    std::vector<double> energies;
    std::vector<double> entropies;
    for (const LedgerColumn &column : ledger) {
        std::vector<double> &values = column.figures.quantity == Quantity::entropy ? entropies : energies;
        for (const SegmentResult &segment : evaluation.path.segments)
            if (const std::optional<double> value = column.figures.value(segment)) values.push_back(*value);
        if (column.total) values.push_back(*column.total);
    }
    const gas::State &charge = evaluation.path.states.front().state;
    const double entropy = charge.amount() * charge.gas().gasConstant();
    const double energy = entropy * charge.temperature().value_or(0.0);
    return {ledgerScale(Quantity::energy, std::move(energies), energy, units),
            ledgerScale(Quantity::entropy, std::move(entropies), entropy, units)};
}

std::string ledgerText(const Evaluation &evaluation, const std::vector<LedgerColumn> &ledger,
                       const LedgerScales &shared, const DisplayUnits &units)
{
    const std::vector<SegmentResult> &segments = evaluation.path.segments;
    std::vector<Table::Column> columns{{"segment"}, {"kind", Align::left}, {"label", Align::left}};
    std::vector<Scale> scales;
    for (const LedgerColumn &column : ledger) {
        scales.push_back(shared.of(column.figures.quantity));
        columns.push_back({heading(column.figures.symbol, scales.back())});
    }
    columns.push_back({"audit", Align::left});
    Table table(columns);
    for (std::size_t i = 0; i < segments.size(); ++i) {
        std::vector<std::string> row{std::to_string(i + 1), std::string(path::facts(segments[i].kind).words),
                                     segments[i].label};
        for (std::size_t c = 0; c < ledger.size(); ++c)
            row.push_back(cell(ledger[c].figures.value(segments[i]), scales[c]));
        row.emplace_back(segments[i].audit.ok ? "agrees" : "FAILED");
        table.addRow(std::move(row));
    }
    table.addRule();
    std::vector<std::string> total{"", evaluation.path.totals.closed ? "path, closed" : "path", ""};
    for (std::size_t c = 0; c < ledger.size(); ++c) total.push_back(cell(ledger[c].total, scales[c]));
    table.addRow(std::move(total));
    return std::string("Ledger, work and heat positive ") + (units.workByGas ? "by the gas" : "into the gas") + "\n" +
           table.text();
}

std::string totalsText(const path::Totals &totals, const Scale &energy, const DisplayUnits &units)
{
    struct Line {
        const char *words;
        Quantity quantity;
        std::optional<double> value;
    };
    const Line lines[] = {{"heat in", Quantity::energy, totals.heatIn},
                          {"heat out", Quantity::energy, totals.heatOut},
                          {"net work out", Quantity::energy, totals.netWorkOut},
                          {"steady-flow work", Quantity::energy, totals.steadyFlowWork},
                          {"thermal efficiency", Quantity::number, totals.thermalEfficiency},
                          {"coefficient of performance, heating", Quantity::number, totals.copHeating},
                          {"coefficient of performance, cooling", Quantity::number, totals.copCooling},
                          {"share of the Carnot bound", Quantity::number, totals.carnotRatio},
                          {"mean effective pressure", Quantity::pressureDifference, totals.meanEffectivePressure},
                          {"power", Quantity::power, totals.power}};
    std::size_t width = 0;
    for (const Line &line : lines)
        if (line.value) width = std::max(width, characterCount(line.words));
    std::string text = "Path\n";
    for (const Line &line : lines)
        if (line.value)
            text += "  " + std::string(line.words) + std::string(width + 2 - characterCount(line.words), ' ') +
                    (line.quantity == Quantity::energy ? units::digits(*line.value, energy) + "\u202F" + energy.unit
                                                       : units::shown(*line.value, line.quantity, units)) +
                    "\n";
    return text;
}

std::string envelopeText(const Evaluation &evaluation, const DisplayUnits &units)
{
    if (evaluation.verdicts.empty()) return {};
    std::string text = "Envelope\n";
    for (const analysis::Verdict &verdict : evaluation.verdicts) {
        const analysis::Limit &limit = evaluation.limits[verdict.limit];
        text += std::string("  ") + (verdict.ok ? "kept      " : "EXCEEDED  ") + limitText(limit, units) + "; worst " +
                verdictText(limit, verdict, units) + "\n";
    }
    return text + "\n";
}

std::string warningsText(const std::vector<Warning> &warnings, const DisplayUnits &units)
{
    if (warnings.empty()) return {};
    std::string text = "Warnings\n";
    for (const Warning &warning : warnings)
        text += "  " + (warning.pointer.empty() ? std::string() : warning.pointer + ": ") +
                units::sentence(warning.message, units) + "\n";
    return text + "\n";
}

std::string gasText(const gas::Gas &gas)
{
    const std::string name = gas.name().empty() ? std::string() : gas.name() + ", ";
    const std::string_view model = gas.model();
    if (model == "perfect") return name + "perfect gas";
    if (model == "ideal") return name + "ideal gas";
    return name + (model == "reference" ? "reference equation" : std::string(model));
}

std::string headerText(const document::Design &design, const Evaluation &evaluation, const DisplayUnits &units)
{
    std::string text;
    const auto title = design.json.find("title");
    if (title != design.json.end() && title->is_string()) text += title->get<std::string>() + "\n";
    const path::Surroundings &surroundings = evaluation.input.surroundings;
    text += "gas " + gasText(*evaluation.path.gas) + "; surroundings " +
            units::shown(surroundings.pressure, Quantity::pressure, units) + ", " +
            units::shown(surroundings.temperature, Quantity::temperature, units) + "\n\n";
    return text;
}

} // namespace

std::string accountText(const document::Design &design, const Evaluation &evaluation, const DisplayUnits &units)
{
    const std::vector<LedgerColumn> ledger = ledgerColumns(evaluation.path.totals, units.workByGas ? -1.0 : 1.0);
    const LedgerScales scales = ledgerScales(evaluation, ledger, units);
    return headerText(design, evaluation, units) + statesText(evaluation, units) + "\n" +
           ledgerText(evaluation, ledger, scales, units) + "\n" +
           totalsText(evaluation.path.totals, scales.energy, units) + "\n" + envelopeText(evaluation, units) +
           warningsText(evaluation.path.warnings, units) +
           "Results are estimates for planning. Pressure equipment, relief and oxygen service are governed by local "
           "codes\n"
           "and must be reviewed by a licensed or otherwise competent person.\n";
}

} // namespace quasistat::app
