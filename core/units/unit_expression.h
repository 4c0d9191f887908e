#pragma once
// Products and powers of unit names, read by our own grammar; UDUNITS-2 is asked for single names only. Left to itself
// it would take "bar 3" for three bar, "rad/s" for hertz and "gal" for an acceleration.

#include "core/outcome/outcome.h"
#include "core/units/unit.h"

#include <udunits2.h>

#include <memory>
#include <string_view>

namespace quasistat::units
{

struct UnitDeleter {
    void operator()(ut_unit *unit) const { ut_free(unit); }
};
using UnitPtr = std::unique_ptr<ut_unit, UnitDeleter>;

/// The unit table of UDUNITS-2. Not thread-safe: whoever owns one calls it under a lock.
class UnitSystem
{
public:
    UnitSystem();
    ~UnitSystem();
    UnitSystem(const UnitSystem &) = delete;
    UnitSystem &operator=(const UnitSystem &) = delete;

    /// The unit of `text`, without a gauge suffix.
    [[nodiscard]] Outcome<Unit> unit(std::string_view text) const;

private:
    ut_system *m_system;
};

} // namespace quasistat::units
