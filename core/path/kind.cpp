#include "core/path/kind.h"

#include <algorithm>

namespace quasistat::path
{
namespace
{

using enum EndKey;

constexpr std::array isothermalEnds{pressure, volume, pressureRatio, volumeRatio, work, heat};
constexpr std::array isobaricEnds{volume, temperature, volumeRatio, work, heat};
constexpr std::array isochoricEnds{pressure, temperature, pressureRatio, heat};
constexpr std::array polytropicEnds{pressure, volume, temperature, pressureRatio, volumeRatio, work, heat};
constexpr std::array twoPointEnds{pressure, volume, temperature};
constexpr std::array isentropicEnds{pressure, volume, temperature, pressureRatio, volumeRatio, work};
constexpr std::array linearEnds{pressure, volume};
constexpr std::array balanceEnds{volume};
constexpr std::array steppedEnds{pressure};
constexpr std::array freeExpansionEnds{volume, volumeRatio};

struct EndChoiceOf {
    EndChoice operator()(const Isothermal &) const { return {isothermalEnds, 1}; }
    EndChoice operator()(const Isobaric &) const { return {isobaricEnds, 1}; }
    EndChoice operator()(const Isochoric &) const { return {isochoricEnds, 1}; }
    EndChoice operator()(const Polytropic &p) const
    {
        return p.exponent ? EndChoice{polytropicEnds, 1} : EndChoice{twoPointEnds, 2};
    }
    EndChoice operator()(const Isentropic &) const { return {isentropicEnds, 1}; }
    EndChoice operator()(const Linear &l) const { return {linearEnds, l.stiffness ? 1 : 2}; }
    EndChoice operator()(const ConstantExternalPressure &) const { return {balanceEnds, 0}; }
    EndChoice operator()(const Stepped &) const { return {steppedEnds, 1}; }
    EndChoice operator()(const FreeExpansion &) const { return {freeExpansionEnds, 1}; }
};

constexpr std::array<std::string_view, 9> notComputed{"adiabatic", "throttle", "trace",   "intake", "discharge",
                                                      "fill",      "vent",     "connect", "isolate"};

} // namespace

std::optional<Kind> kindFromKey(std::string_view key)
{
    const auto it = std::find_if(kindTable.begin(), kindTable.end(), [&](const KindFacts &f) { return f.key == key; });
    if (it == kindTable.end()) return std::nullopt;
    return it->kind;
}

std::span<const std::string_view> kindsNotComputed()
{
    return notComputed;
}

EndChoice endChoice(const Process &process)
{
    return std::visit(EndChoiceOf{}, process);
}

} // namespace quasistat::path
