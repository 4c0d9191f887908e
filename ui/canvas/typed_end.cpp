#include "ui/canvas/typed_end.h"

#include "core/units/measure.h"

#include <algorithm>
#include <cmath>

namespace quasistat::ui
{
namespace
{

using document::Json;
using path::EndKey;

// Digits so that the last one is finer than a pixel; temperature and ratios have no axis of their own here.
int significantDigits(double value, EndKey key, const Plane &plane)
{
    const auto metric = plane.metric();
    double perPixel = std::abs(value) * 1e-4;
    if (key == EndKey::pressure) perPixel = 1.0 / metric.pressureScale;
    if (key == EndKey::volume) perPixel = 1.0 / metric.volumeScale;
    const double digits = std::ceil(std::log10(std::max(std::abs(value), 1e-300) / perPixel)) + 1.0;
    return static_cast<int>(std::clamp(digits, 4.0, 9.0));
}

std::string displayUnit(units::Quantity quantity, const units::DisplayUnits &units)
{
    std::string unit;
    if (quantity == units::Quantity::pressure) unit = units.pressure;
    if (quantity == units::Quantity::volume) unit = units.volume;
    if (quantity == units::Quantity::temperature) unit = units.temperature;
    if (quantity == units::Quantity::energy) unit = units.energy;
    return unit.empty() ? std::string(units::facts(quantity).unit) : unit;
}

// The unit that stands in `typed`, if it is a quantity of that kind at all ("@3" is none).
std::string typedUnit(const Json &typed, units::Quantity quantity)
{
    if (!typed.is_string()) return {};
    const auto measure = units::measured(typed.get<std::string>(), quantity);
    return measure ? measure->unit : std::string();
}

std::string uncertaintyTail(const Json &typed)
{
    if (!typed.is_string()) return {};
    const auto text = typed.get<std::string>();
    for (const char *mark : {"±", "+/-"})
        if (const auto at = text.find(mark); at != std::string::npos)
            return std::string(1, ' ').append(text, at, std::string::npos);
    return {};
}

double rounded(double value, int digits)
{
    if (value == 0.0) return value;
    const int decimals = digits - 1 - static_cast<int>(std::floor(std::log10(std::abs(value))));
    return QString::number(value, 'f', std::clamp(decimals, 0, 15)).toDouble();
}

} // namespace

Outcome<Json> typedEnd(double value, EndKey key, const Json &typed, const Snapshot &snapshot, const Plane &plane)
{
    const units::Quantity quantity = path::quantityOf(key);
    const int digits = significantDigits(value, key, plane);
    const std::string tail = uncertaintyTail(typed);
    if (quantity == units::Quantity::number) {
        const double ratio = rounded(value, digits);
        if (tail.empty()) return Json(ratio);
        return Json(QString::number(ratio, 'g', 12).toStdString() + tail);
    }
    std::string unit = typedUnit(typed, quantity);
    if (unit.empty()) unit = displayUnit(quantity, snapshot.units);
    const double surroundings = snapshot.evaluation->input.surroundings.pressure;
    auto text = units::typedIn(value, quantity, unit, surroundings, digits);
    if (!text) return text.failure();
    return Json(*text + tail);
}

} // namespace quasistat::ui
