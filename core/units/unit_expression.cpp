#include "core/units/unit_expression.h"

#include "core/units/number_text.h"
#include "core/units/special_units.h"

#include <fmt/format.h>

#include <locale.h> // newlocale and uselocale are POSIX

#include <algorithm>
#include <charconv>
#include <cmath>
#include <optional>
#include <utility>
#include <vector>

namespace quasistat::units
{

namespace
{

using namespace std::string_view_literals;

constexpr int deepest = 8;
constexpr int largestExponent = 9;

constexpr std::array superscripts{std::pair{"⁰"sv, 0}, std::pair{"¹"sv, 1}, std::pair{"²"sv, 2}, std::pair{"³"sv, 3},
                                  std::pair{"⁴"sv, 4}, std::pair{"⁵"sv, 5}, std::pair{"⁶"sv, 6}, std::pair{"⁷"sv, 7},
                                  std::pair{"⁸"sv, 8}, std::pair{"⁹"sv, 9}};

bool isAsciiLetter(char c)
{
    return (c >= 'a' && c <= 'z') || (c >= 'A' && c <= 'Z') || c == '_';
}
bool isAsciiDigit(char c)
{
    return c >= '0' && c <= '9';
}

std::string lowered(std::string_view text)
{
    std::string lower(text);
    std::ranges::transform(lower, lower.begin(), [](char c) { return c >= 'A' && c <= 'Z' ? char(c - 'A' + 'a') : c; });
    return lower;
}

/// Names UDUNITS-2 would read as something else than the writer means: its calorie is the International Table one, its
/// gal an acceleration, its angles and turns pass for plain numbers, its names ignore case.
bool isMisread(std::string_view name)
{
    const std::string lower = lowered(name);
    constexpr std::array endings{"cal"sv, "gal"sv, "calorie"sv, "calories"sv, "radian"sv, "radians"sv, "rad"sv};
    constexpr std::array names{"degree"sv,   "degrees"sv,   "deg"sv, "°"sv,   "turn"sv, "turns"sv,
                               "rotation"sv, "circle"sv,    "rpm"sv, "rps"sv, "cps"sv,  "rev"sv,
                               "sr"sv,       "steradian"sv, "'"sv,   "\""sv};
    return std::ranges::any_of(endings, [&](std::string_view ending) { return lower.ends_with(ending); }) ||
           std::ranges::find(names, lower) != names.end();
}

Failure unknownUnit(std::string_view name)
{
    return typingFailure(Reason::unknownName, "“{0}” is not a unit known here", {std::string(name)});
}

/// Reads one expression; a cursor over its text.
class Expression
{
public:
    Expression(const ut_system *system, std::string_view text) : m_system(system), m_text(text) {}

    Outcome<UnitPtr> whole()
    {
        Outcome<UnitPtr> unit = product(0);
        if (unit && m_position != m_text.size()) return notAUnit();
        return unit;
    }

private:
    [[nodiscard]] std::string_view rest() const { return m_text.substr(m_position); }
    bool took(std::string_view token)
    {
        if (!rest().starts_with(token)) return false;
        m_position += token.size();
        return true;
    }
    void skipBlanks()
    {
        const std::size_t before = m_position;
        while (took(" ") || took("\u00A0") || took("\u202F") || took("\u2009")) continue;
        m_afterBlank = m_position != before;
    }
    [[nodiscard]] Failure notAUnit() const
    {
        return typingFailure(Reason::syntax, "“{0}” is not a unit", {std::string(m_text)});
    }

    Outcome<UnitPtr> product(int depth)
    {
        Outcome<UnitPtr> unit = factor(depth);
        while (unit) {
            skipBlanks();
            if (rest().empty() || rest().starts_with(')')) break;
            const bool divides = took("/");
            const bool multiplies = divides || took("·") || took("⋅") || took("*") || took(".");
            if (!multiplies && !m_afterBlank) return notAUnit();
            skipBlanks();
            Outcome<UnitPtr> next = factor(depth);
            if (!next) return next;
            UnitPtr joined(divides ? ut_divide(unit->get(), next->get()) : ut_multiply(unit->get(), next->get()));
            if (!joined) return notAUnit();
            unit = std::move(joined);
        }
        return unit;
    }

    Outcome<UnitPtr> factor(int depth)
    {
        Outcome<UnitPtr> unit = primary(depth);
        if (!unit) return unit;
        const std::optional<int> power = exponent();
        if (!power) return unit;
        if (std::abs(*power) > largestExponent || *power == 0) return notAUnit();
        UnitPtr raised(ut_raise(unit->get(), *power));
        if (!raised) return notAUnit();
        return Outcome<UnitPtr>(std::move(raised));
    }

    Outcome<UnitPtr> primary(int depth)
    {
        if (rest().starts_with('/') && m_position == 0) return Outcome<UnitPtr>(one()); // "/min"
        if (took("(")) {
            if (depth >= deepest) return notAUnit();
            Outcome<UnitPtr> inner = product(depth + 1);
            if (inner && !took(")")) return notAUnit();
            return inner;
        }
        if (rest().starts_with("1/") || rest().starts_with("1 /")) {
            took("1");
            return Outcome<UnitPtr>(one());
        }
        return named();
    }

    [[nodiscard]] UnitPtr one() const { return UnitPtr(ut_get_dimensionless_unit_one(m_system)); }

    Outcome<UnitPtr> named()
    {
        if (const SpecialUnit *special = specialHere()) {
            m_position += special->name.size();
            const UnitPtr base(ut_parse(m_system, std::string(special->siUnit).c_str(), UT_UTF8));
            if (!base) return unknownUnit(special->name);
            return Outcome<UnitPtr>(UnitPtr(ut_scale(special->factor, base.get())));
        }
        const std::string_view name = nameHere();
        if (name.empty()) return notAUnit();
        m_position += name.size();
        if (isMisread(name)) return unknownUnit(name);
        std::string plain(name);
        // The Greek letter and the micro sign look alike; UDUNITS-2 knows the latter.
        if (const std::size_t mu = plain.find("μ"); mu != std::string::npos) plain.replace(mu, "μ"sv.size(), "µ");
        UnitPtr unit(ut_parse(m_system, plain.c_str(), UT_UTF8));
        if (!unit) return unknownUnit(name);
        return Outcome<UnitPtr>(std::move(unit));
    }

    /// A special unit whose whole name stands here.
    [[nodiscard]] const SpecialUnit *specialHere() const
    {
        const SpecialUnit *found = nullptr;
        for (const SpecialUnit &special : specialUnits) {
            if (!rest().starts_with(special.name)) continue;
            const std::string_view after = rest().substr(special.name.size());
            if (!after.empty() && isAsciiLetter(after.front())) continue;
            if (!found || special.name.size() > found->name.size()) found = &special;
        }
        return found;
    }

    /// Letters of a unit name; digits end it.
    [[nodiscard]] std::string_view nameHere() const
    {
        constexpr std::array others{"µ"sv, "μ"sv, "°"sv, "Ω"sv};
        std::size_t end = 0;
        while (end < rest().size()) {
            const std::string_view here = rest().substr(end);
            const auto *const other =
                std::ranges::find_if(others, [&](std::string_view o) { return here.starts_with(o); });
            if (isAsciiLetter(here.front()))
                ++end;
            else if (other != others.end())
                end += other->size();
            else
                break;
        }
        return rest().substr(0, end);
    }

    std::optional<int> exponent()
    {
        const std::size_t before = m_position;
        [[maybe_unused]] const bool marked = took("**") || took("^");
        const bool negative = took("-") || took("\u2212") || took("⁻");
        std::size_t digits = 0;
        int value = 0;
        while (!rest().empty() && isAsciiDigit(rest().front()) && digits < 2) {
            value = 10 * value + (rest().front() - '0');
            ++m_position;
            ++digits;
        }
        for (bool found = digits == 0; found;) {
            found = false;
            for (const auto &[sign, number] : superscripts) {
                if (digits >= 2 || !took(sign)) continue;
                value = 10 * value + number;
                ++digits;
                found = true;
            }
        }
        if (digits > 0) return negative ? -value : value;
        m_position = before; // a sign without a digit is no exponent, and the caller fails on it
        return std::nullopt;
    }

    const ut_system *m_system;
    std::string_view m_text;
    std::size_t m_position = 0;
    bool m_afterBlank = false; ///< blanks were skipped just now: they multiply where no sign follows
};

/// UDUNITS-2 reads its table and its numbers with the C library, in the language of the desktop: where that writes a
/// decimal comma, "0.0254" would end at its point. While this lives, the calling thread reads them as they are written.
class PlainNumerals
{
public:
    PlainNumerals() : m_plain(::newlocale(LC_NUMERIC_MASK, "C", nullptr))
    {
        if (m_plain) m_before = ::uselocale(m_plain);
    }
    ~PlainNumerals()
    {
        if (!m_plain) return;
        ::uselocale(m_before);
        ::freelocale(m_plain);
    }
    PlainNumerals(const PlainNumerals &) = delete;
    PlainNumerals &operator=(const PlainNumerals &) = delete;

private:
    locale_t m_plain;
    locale_t m_before = nullptr;
};

/// A factor that is a short decimal but for rounding becomes that decimal: (0.01)³ is 1e-6, not 1.0000000000000002e-06.
double withoutRounding(double factor)
{
    const std::string text = fmt::format("{:.11e}", factor);
    double shorter = factor;
    std::from_chars(text.data(), text.data() + text.size(), shorter);
    return std::abs(shorter - factor) <= 4.0 * std::abs(factor) * 2.3e-16 ? shorter : factor;
}

/// Conversion of `unit` to `siUnit`, if it has that dimension. UDUNITS-2 also "converts" to a reciprocal (s to Hz): a
/// conversion that is not linear is none.
std::optional<Unit> conversion(ut_unit *unit, ut_system *system, std::string_view siUnit)
{
    const UnitPtr target(ut_parse(system, std::string(siUnit).c_str(), UT_UTF8));
    if (!target || ut_are_convertible(unit, target.get()) == 0) return std::nullopt;
    const std::unique_ptr<cv_converter, decltype(&cv_free)> converter(ut_get_converter(unit, target.get()), &cv_free);
    if (!converter) return std::nullopt;
    const double atZero = cv_convert_double(converter.get(), 0.0);
    const double atOne = cv_convert_double(converter.get(), 1.0);
    const double atTwo = cv_convert_double(converter.get(), 2.0);
    const bool linear = std::isfinite(atZero) && std::isfinite(atOne) && atOne > atZero &&
                        std::abs(atTwo - 2.0 * atOne + atZero) <= 1e-12 * std::abs(atTwo);
    if (!linear) return std::nullopt;
    return Unit{.siUnit = siUnit, .factor = withoutRounding(atOne - atZero), .offset = atZero};
}

} // namespace

UnitSystem::UnitSystem()
{
    const PlainNumerals numerals;
    ut_set_error_message_handler(ut_ignore);
    m_system = ut_read_xml(nullptr);
}

UnitSystem::~UnitSystem()
{
    ut_free_system(m_system);
}

Outcome<Unit> UnitSystem::unit(std::string_view text) const
{
    if (!m_system)
        return typingFailure(Reason::unreadable,
                             "the unit table of UDUNITS-2 is not installed (package libudunits2-data)", {});
    // A special unit alone keeps its exact factor and its offset.
    for (const SpecialUnit &special : specialUnits) {
        if (special.name != text) continue;
        for (const QuantityFacts &row : quantityTable)
            if (row.unit == special.siUnit)
                return Unit{.siUnit = row.unit, .factor = special.factor, .offset = special.offset};
    }
    const PlainNumerals numerals;
    const Outcome<UnitPtr> unit = Expression(m_system, text).whole();
    if (!unit) return unit.failure();
    for (const QuantityFacts &row : quantityTable)
        if (const std::optional<Unit> found = conversion(unit->get(), m_system, row.unit)) return *found;
    return Unit{};
}

} // namespace quasistat::units
