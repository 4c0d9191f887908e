#include "app/command_line/table.h"

#include <algorithm>
#include <numeric>
#include <string_view>

namespace quasistat::app
{

namespace
{

std::string padded(const std::string &cell, std::size_t width, Align align)
{
    const std::string blanks(width - std::min(width, characterCount(cell)), ' ');
    return align == Align::left ? cell + blanks : blanks + cell;
}

} // namespace

std::size_t characterCount(std::string_view text)
{
    return static_cast<std::size_t>(
        std::ranges::count_if(text, [](char c) { return (static_cast<unsigned char>(c) & 0xC0) != 0x80; }));
}

void Table::addRow(std::vector<std::string> cells)
{
    cells.resize(m_columns.size());
    m_rows.push_back(std::move(cells));
}

std::string Table::text() const
{
    std::vector<std::size_t> widths(m_columns.size(), 0);
    for (const auto &row : m_rows)
        for (std::size_t i = 0; i < row.size(); ++i) widths[i] = std::max(widths[i], characterCount(row[i]));
    for (std::size_t i = 0; i < widths.size(); ++i)
        if (widths[i] > 0) widths[i] = std::max(widths[i], characterCount(m_columns[i].heading));

    const auto line = [&](auto cellOf) {
        std::string text;
        for (std::size_t i = 0; i < widths.size(); ++i)
            if (widths[i] > 0) text += "  " + padded(cellOf(i), widths[i], m_columns[i].align);
        text.erase(text.find_last_not_of(' ') + 1);
        return text + "\n";
    };
    std::string text = line([&](std::size_t i) { return m_columns[i].heading; });
    for (const auto &row : m_rows) {
        if (row.empty()) {
            const std::size_t total =
                std::accumulate(widths.begin(), widths.end(), std::size_t{0}) +
                2 * static_cast<std::size_t>(std::ranges::count_if(widths, [](auto w) { return w > 0; }));
            for (std::size_t i = 2; i < total; ++i) text += i == 2 ? "  ─" : "─";
            text += "\n";
            continue;
        }
        text += line([&](std::size_t i) { return row[i]; });
    }
    return text;
}

} // namespace quasistat::app
