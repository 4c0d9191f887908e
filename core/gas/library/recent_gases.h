#pragma once
// Gases made lately, kept so that they are not made anew for every evaluation.

#include "core/gas/gas.h"

#include <deque>
#include <mutex>
#include <optional>
#include <utility>

namespace quasistat::gas
{

/// A gas with what was said when it was made from its description.
struct RecentGas {
    GasPtr gas;
    std::vector<Warning> warnings;
};

/// Any thread may ask. Holds a few: models compared under one path, not a history.
class RecentGases
{
public:
    [[nodiscard]] std::optional<RecentGas> find(const std::string &description);
    void add(const std::string &description, RecentGas gas);

private:
    static constexpr std::size_t most = 12;

    std::mutex m_mutex;
    std::deque<std::pair<std::string, RecentGas>> m_gases; ///< the latest first
};

} // namespace quasistat::gas
