#pragma once
// Reading the tables of the gas data files: coefficients in columns of equal length.

#include <nlohmann/json.hpp>

#include <string>
#include <vector>

namespace quasistat::gas
{

using Json = nlohmann::json;

/// One row of a table of columns. Throws Json::exception where the file is not what it should be.
struct TableRow {
    const Json &table;
    std::size_t index;

    [[nodiscard]] double operator[](const char *column) const { return table.at(column).at(index).get<double>(); }
    [[nodiscard]] int whole(const char *column) const { return table.at(column).at(index).get<int>(); }
    /// For columns that stand only where they say something.
    [[nodiscard]] double valueOr(const char *column, double usual) const
    {
        return table.contains(column) ? (*this)[column] : usual;
    }
};

/// `make(row)` of every row; the column "n" says how many there are.
template <class Make>
[[nodiscard]] auto eachRow(const Json &table, const Make &make)
{
    std::vector<decltype(make(TableRow{table, 0}))> terms;
    for (std::size_t i = 0; i < table.at("n").size(); ++i) terms.push_back(make(TableRow{table, i}));
    return terms;
}

/// The same of `group[kind]`; nothing where the group has no such table.
template <class Make>
[[nodiscard]] auto eachRow(const Json &group, const char *kind, const Make &make)
{
    return group.contains(kind) ? eachRow(group.at(kind), make) : decltype(eachRow(group, make)){};
}

/// References to literature as one line.
[[nodiscard]] std::string joinedLines(const Json &lines);
/// The text of "uncertainty" and where it is from; empty where there is none.
[[nodiscard]] std::string uncertaintyFrom(const Json &equation);

} // namespace quasistat::gas
