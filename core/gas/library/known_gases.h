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
struct KnownGas {
    GasPtr gas;
    std::vector<Warning> warnings;
};

/// Any thread may ask. Holds a few: models compared under one path, not a history.
class KnownGases
{
public:
    [[nodiscard]] std::optional<KnownGas> find(const std::string &description);
    void add(const std::string &description, KnownGas gas);

private:
    static constexpr std::size_t most = 12;

    std::mutex m_mutex;
    std::deque<std::pair<std::string, KnownGas>> m_gases; ///< the latest first
};

} // namespace quasistat::gas
