#include "tests/gas/check_rows.h"

#include <gtest/gtest.h>

#include <algorithm>
#include <fstream>
#include <sstream>

namespace quasistat::test
{
namespace
{

std::vector<std::string> split(const std::string &line, char separator)
{
    std::vector<std::string> parts;
    std::istringstream stream(line);
    for (std::string part; std::getline(stream, part, separator);) parts.push_back(part);
    return parts;
}

} // namespace

std::optional<double> CheckRow::number(const std::string &column) const
{
    const std::string &cell = text(column);
    if (cell.empty()) return std::nullopt;
    return std::stod(cell);
}

std::vector<CheckRow> checkRows(const std::string &name)
{
    std::ifstream file(std::string(TEST_DATA_DIR) + "/data/" + name);
    std::string line;
    std::getline(file, line);
    const std::vector<std::string> headings = split(line, ',');
    std::vector<CheckRow> rows;
    for (int number = 2; std::getline(file, line); ++number) {
        std::vector<std::string> cells = split(line, ',');
        cells.resize(headings.size());
        std::map<std::string, std::string> row;
        for (std::size_t i = 0; i < headings.size(); ++i) row[headings[i]] = cells[i];
        rows.emplace_back(number, std::move(row));
    }
    EXPECT_FALSE(rows.empty()) << name;
    return rows;
}

gas::Composition compositionOf(const std::string &text)
{
    gas::Composition composition;
    for (const std::string &entry : split(text, ';')) {
        const auto equals = entry.find('=');
        composition.push_back({entry.substr(0, equals), std::stod(entry.substr(equals + 1))});
    }
    std::ranges::sort(composition, {}, &gas::Share::component);
    return composition;
}

} // namespace quasistat::test
