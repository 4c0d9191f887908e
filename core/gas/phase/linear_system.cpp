#include "core/gas/phase/linear_system.h"

#include <cassert>
#include <cmath>
#include <utility>

namespace quasistat::gas
{

bool LinearSystem::factor()
{
    for (std::size_t k = 0; k < m_size; ++k) {
        std::size_t pivot = k;
        for (std::size_t row = k + 1; row < m_size; ++row)
            if (std::abs(entry(row, k)) > std::abs(entry(pivot, k))) pivot = row;
        m_order[k] = pivot;
        if (pivot != k)
            for (std::size_t column = 0; column < m_size; ++column) std::swap(entry(k, column), entry(pivot, column));
        const double head = entry(k, k);
        if (head == 0.0 || !std::isfinite(head)) return false;
        for (std::size_t row = k + 1; row < m_size; ++row) {
            const double factor = entry(row, k) /= head;
            if (factor == 0.0) continue;
            for (std::size_t column = k + 1; column < m_size; ++column) entry(row, column) -= factor * entry(k, column);
        }
    }
    return true;
}

void LinearSystem::solve(std::span<double> side) const
{
    assert(side.size() == m_size);
    for (std::size_t k = 0; k < m_size; ++k) std::swap(side[k], side[m_order[k]]);
    for (std::size_t row = 1; row < m_size; ++row)
        for (std::size_t k = 0; k < row; ++k) side[row] -= m_entries[row * m_size + k] * side[k];
    for (std::size_t row = m_size; row-- > 0;) {
        for (std::size_t k = row + 1; k < m_size; ++k) side[row] -= m_entries[row * m_size + k] * side[k];
        side[row] /= m_entries[row * m_size + row];
    }
}

} // namespace quasistat::gas
