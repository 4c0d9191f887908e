#include "core/path/segment.h"

namespace quasistat::path
{

std::string_view keyOf(EndKey key)
{
    switch (key) {
    case EndKey::pressure: return "pressure";
    case EndKey::volume: return "volume";
    case EndKey::temperature: return "temperature";
    case EndKey::pressureRatio: return "pressure_ratio";
    case EndKey::volumeRatio: return "volume_ratio";
    case EndKey::work: return "work";
    case EndKey::heat: return "heat";
    }
    return {};
}

units::Quantity quantityOf(EndKey key)
{
    switch (key) {
    case EndKey::pressure: return units::Quantity::pressure;
    case EndKey::volume: return units::Quantity::volume;
    case EndKey::temperature: return units::Quantity::temperature;
    case EndKey::pressureRatio:
    case EndKey::volumeRatio: return units::Quantity::number;
    case EndKey::work:
    case EndKey::heat: return units::Quantity::energy;
    }
    return units::Quantity::number;
}

} // namespace quasistat::path
