#include "core/units/unit.h"

#include "core/units/number_text.h"
#include "core/units/unit_expression.h"

#include <algorithm>
#include <array>
#include <map>
#include <mutex>
#include <optional>
#include <utility>

namespace quasistat::units
{

namespace
{

using namespace std::string_view_literals;

/// The text without a gauge or absolute suffix, and which of them it had.
struct PressureText {
    std::string_view unit;
    std::optional<bool> gauge;
};

PressureText withoutSuffix(std::string_view text)
{
    constexpr std::array suffixes{std::pair{"(g)"sv, true},    std::pair{"(gauge)"sv, true},
                                  std::pair{" gauge"sv, true}, std::pair{"(a)"sv, false},
                                  std::pair{"(abs)"sv, false}, std::pair{"(absolute)"sv, false},
                                  std::pair{" abs"sv, false}};
    for (const auto &[suffix, gauge] : suffixes)
        if (text.ends_with(suffix)) return {trimmed(text.substr(0, text.size() - suffix.size())), gauge};
    // Run together only with these: "Pa" itself ends like an absolute suffix.
    constexpr std::array fused{"bar"sv, "mbar"sv, "psi"sv, "ksi"sv, "Pa"sv, "kPa"sv, "MPa"sv};
    if (text.ends_with('g') || text.ends_with('a')) {
        const std::string_view stem = text.substr(0, text.size() - 1);
        if (std::ranges::find(fused, stem) != fused.end()) return {stem, text.ends_with('g')};
    }
    return {text, std::nullopt};
}

/// Units already read. UDUNITS-2 is not thread-safe and slow to start; the interface of this folder is free functions
/// of text, so the one table of the process lives behind this lock.
class KnownUnits
{
public:
    Outcome<Unit> unit(std::string_view text)
    {
        const std::lock_guard lock(m_mutex);
        if (const auto known = m_known.find(text); known != m_known.end()) return known->second;
        const PressureText pressure = withoutSuffix(text);
        Outcome<Unit> unit = m_system.unit(pressure.unit);
        if (!unit) return unit;
        if (pressure.gauge && unit->siUnit != facts(Quantity::pressure).unit)
            return typingFailure(Reason::unknownName, "“{0}” is not a unit known here", {std::string(text)});
        unit->gauge = pressure.gauge.value_or(false);
        if (m_known.size() >= mostKept) m_known.clear();
        m_known.emplace(text, *unit);
        return unit;
    }

private:
    static constexpr std::size_t mostKept = 4096;
    std::mutex m_mutex;
    UnitSystem m_system;
    std::map<std::string, Unit, std::less<>> m_known;
};

} // namespace

Outcome<Unit> unitFrom(std::string_view text)
{
    static KnownUnits known;
    return known.unit(trimmed(text));
}

bool measures(const Unit &unit, Quantity quantity)
{
    if (unit.siUnit.empty()) return false;
    return unit.siUnit == facts(quantity).unit ||
           (quantity == Quantity::amount && unit.siUnit == facts(Quantity::mass).unit);
}

std::string printedUnit(std::string_view text)
{
    constexpr std::array names{std::pair{"degC"sv, "°C"sv}, std::pair{"degF"sv, "°F"sv}, std::pair{"degR"sv, "°R"sv},
                               std::pair{"degK"sv, "K"sv}};
    for (const auto &[typed, printed] : names)
        if (text == typed) return std::string(printed);
    constexpr std::array water{"mmH2O"sv, "cmH2O"sv, "mH2O"sv, "inH2O"sv, "ftH2O"sv};
    if (std::ranges::find(water, text) != water.end()) return std::string(text.substr(0, text.size() - 3)) + "H₂O";

    std::string printed;
    for (std::size_t i = 0; i < text.size(); ++i) {
        const bool afterLetter =
            i > 0 && ((text[i - 1] >= 'a' && text[i - 1] <= 'z') || (text[i - 1] >= 'A' && text[i - 1] <= 'Z'));
        if (afterLetter && text[i] == '2')
            printed += "²";
        else if (afterLetter && text[i] == '3')
            printed += "³";
        else if (text[i] == '.' || text[i] == '*')
            printed += "·";
        else if (text[i] != '^')
            printed += text[i];
    }
    return printed;
}

} // namespace quasistat::units
