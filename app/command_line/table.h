#pragma once
// Aligned columns of text for a terminal.

#include <string>
#include <vector>

namespace quasistat::app
{

enum class Align { left, right };

class Table
{
public:
    struct Column {
        std::string heading;
        Align align = Align::right;
    };
    explicit Table(std::vector<Column> columns) : m_columns(std::move(columns)) {}

    /// As many cells as columns.
    void addRow(std::vector<std::string> cells);
    /// A rule, then rows that add up what stands above it.
    void addRule() { m_rows.emplace_back(); }
    /// Lines, each ended; columns two blanks apart, indented by two. Columns without any content are left out.
    [[nodiscard]] std::string text() const;

private:
    std::vector<Column> m_columns;
    std::vector<std::vector<std::string>> m_rows; ///< an empty row is a rule
};

/// Characters of UTF-8 text.
[[nodiscard]] std::size_t characterCount(std::string_view text);

} // namespace quasistat::app
