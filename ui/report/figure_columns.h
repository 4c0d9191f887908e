#pragma once
// Columns of figures for the report's tables: each with its own unit in its head, all values at its decimals.

#include "core/units/display.h"
#include "ui/report/table.h"

#include <optional>
#include <vector>

namespace quasistat::ui
{

/// One column of figures: its head and scale, and the value of each row.
struct FigureColumn {
    QString symbol; ///< marked text
    units::Quantity quantity;
    std::vector<std::optional<double>> values;
    std::optional<units::Scale> scale{}; ///< chosen from the values where none is given

    [[nodiscard]] units::Scale scaleIn(const units::DisplayUnits &units) const;
};

/// Adds the figure columns to `columns` and a cell each to `rows`.
void addFigures(std::vector<TableColumn> &columns, std::vector<TableRow> &rows,
                const std::vector<FigureColumn> &figures, double share, const units::DisplayUnits &units);

template <class Items, class Value>
[[nodiscard]] std::vector<std::optional<double>> valuesOf(const Items &items, Value value)
{
    std::vector<std::optional<double>> values;
    for (const auto &item : items) values.push_back(value(item));
    return values;
}

/// "3  second stage".
[[nodiscard]] RichText numbered(std::size_t number, const RichText &words);

} // namespace quasistat::ui
