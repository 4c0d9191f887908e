#include "core/gas/library/recent_gases.h"

#include <algorithm>

namespace quasistat::gas
{

std::optional<RecentGas> RecentGases::find(const std::string &description)
{
    const std::scoped_lock lock(m_mutex);
    const auto it = std::ranges::find(m_gases, description, &std::pair<std::string, RecentGas>::first);
    if (it == m_gases.end()) return std::nullopt;
    std::rotate(m_gases.begin(), it, it + 1);
    return m_gases.front().second;
}

void RecentGases::add(const std::string &description, RecentGas gas)
{
    const std::scoped_lock lock(m_mutex);
    m_gases.emplace_front(description, std::move(gas));
    if (m_gases.size() > most) m_gases.pop_back();
}

} // namespace quasistat::gas
