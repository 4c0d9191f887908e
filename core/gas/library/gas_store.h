#pragma once
// The gas data read so far: each file is read once, when it is first asked for.

#include "core/gas/library/gerg_2008.h"

#include <map>
#include <memory>
#include <mutex>

namespace quasistat::gas
{

/// Any thread may ask; what is given out is const and outlives the store.
class GasStore
{
public:
    /// Null where no gas has this name.
    [[nodiscard]] std::shared_ptr<const GasData> find(std::string_view name);
    [[nodiscard]] std::shared_ptr<const GergModel> gergModel();

private:
    std::mutex m_mutex;
    std::map<std::string, std::shared_ptr<const GasData>, std::less<>> m_gases;
    std::shared_ptr<const GergModel> m_gerg;
};

} // namespace quasistat::gas
