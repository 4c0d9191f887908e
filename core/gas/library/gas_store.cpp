#include "core/gas/library/gas_store.h"

#include <algorithm>

namespace quasistat::gas
{

std::shared_ptr<const GasData> GasStore::find(std::string_view name)
{
    if (!std::ranges::binary_search(gasNames(), name, std::less<>{})) return nullptr;
    const std::lock_guard lock(m_mutex);
    const auto known = m_gases.find(name);
    if (known != m_gases.end()) return known->second;
    return m_gases.emplace(name, std::make_shared<const GasData>(readGas(name))).first->second;
}

std::shared_ptr<const GergModel> GasStore::gergModel()
{
    const std::lock_guard lock(m_mutex);
    if (!m_gerg) m_gerg = std::make_shared<const GergModel>();
    return m_gerg;
}

} // namespace quasistat::gas
