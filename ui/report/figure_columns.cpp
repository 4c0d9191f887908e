#include "ui/report/figure_columns.h"

#include "ui/session/sentences.h"

namespace quasistat::ui
{

namespace
{

RichText headOf(const FigureColumn &column, const units::Scale &scale)
{
    const QString unit = QString::fromStdString(scale.unit);
    return RichText::marked(unit.isEmpty() ? column.symbol
                                           : QStringLiteral("%1\u00a0/\u00a0%2").arg(column.symbol, unit));
}

RichText cellOf(const std::optional<double> &value, const units::Scale &scale)
{
    return RichText::plain(value ? figure(*value, scale) : QStringLiteral("–"));
}

} // namespace

units::Scale FigureColumn::scaleIn(const units::DisplayUnits &units) const
{
    if (scale) return *scale;
    std::vector<double> known;
    for (const auto &value : values)
        if (value) known.push_back(*value);
    return units::scaleFor(quantity, known, units);
}

void addFigures(std::vector<TableColumn> &columns, std::vector<TableRow> &rows,
                const std::vector<FigureColumn> &figures, double share, const units::DisplayUnits &units)
{
    for (const FigureColumn &column : figures) {
        const units::Scale scale = column.scaleIn(units);
        columns.push_back({headOf(column, scale), share, Align::right});
        for (std::size_t r = 0; r < rows.size(); ++r) rows[r].cells.push_back({cellOf(column.values[r], scale), {}});
    }
}

RichText numbered(std::size_t number, const RichText &words)
{
    return RichText::plain(QStringLiteral("%1  ").arg(number)) + words;
}

} // namespace quasistat::ui
