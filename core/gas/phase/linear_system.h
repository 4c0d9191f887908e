#pragma once
// Small dense systems of linear equations, factored once and solved for several right-hand sides.

#include <cstddef>
#include <span>
#include <vector>

namespace quasistat::gas
{

/// A square matrix and its LU factors, with row pivoting. Rows and columns are of the same scale here.
class LinearSystem
{
public:
    explicit LinearSystem(std::size_t size) : m_size(size), m_entries(size * size), m_order(size) {}

    [[nodiscard]] double &entry(std::size_t row, std::size_t column) { return m_entries[row * m_size + column]; }
    /// Replaces the matrix by its factors; false where it is singular to the last digit or not finite.
    [[nodiscard]] bool factor();
    /// Solves for `side`, which becomes the solution. Precondition: factor() succeeded.
    void solve(std::span<double> side) const;

private:
    std::size_t m_size;
    std::vector<double> m_entries;
    std::vector<std::size_t> m_order; ///< row that was brought to each place
};

} // namespace quasistat::gas
