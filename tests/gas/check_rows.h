#pragma once
// Rows of the check files in tests/gas/data.

#include "core/gas/composition.h"

#include <map>
#include <optional>
#include <string>
#include <vector>

namespace quasistat::test
{

class CheckRow
{
public:
    CheckRow(int line, std::map<std::string, std::string> cells) : m_line(line), m_cells(std::move(cells)) {}

    [[nodiscard]] const std::string &text(const std::string &column) const { return m_cells.at(column); }
    /// None where the cell is empty.
    [[nodiscard]] std::optional<double> number(const std::string &column) const;
    [[nodiscard]] int line() const { return m_line; }

private:
    int m_line;
    std::map<std::string, std::string> m_cells;
};

/// The rows of a comma-separated file with a line of headings, by name from tests/gas/data. Fails the test if there is
/// none.
[[nodiscard]] std::vector<CheckRow> checkRows(const std::string &name);
/// "nitrogen=0.7812;oxygen=0.2188", sorted by name.
[[nodiscard]] gas::Composition compositionOf(const std::string &text);

} // namespace quasistat::test
