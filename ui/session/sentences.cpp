#include "ui/session/sentences.h"

#include <QCoreApplication>

#include <algorithm>
#include <array>
#include <cmath>

namespace quasistat::ui
{

using analysis::LimitQuantity;
using units::Quantity;

namespace
{

struct LimitFacts {
    LimitQuantity quantity;
    Quantity unit;
    const char *words;
    const char *symbol;
};
constexpr std::array limitTable{
    LimitFacts{LimitQuantity::pressure, Quantity::pressure, QT_TRANSLATE_NOOP("Limit", "pressure"), "<i>p</i>"},
    LimitFacts{LimitQuantity::volume, Quantity::volume, QT_TRANSLATE_NOOP("Limit", "volume"), "<i>V</i>"},
    LimitFacts{LimitQuantity::temperature, Quantity::temperature, QT_TRANSLATE_NOOP("Limit", "temperature"),
               "<i>T</i>"},
    LimitFacts{LimitQuantity::pressureRatio, Quantity::number, QT_TRANSLATE_NOOP("Limit", "pressure ratio"),
               "<i>p</i><sub>max</sub>/<i>p</i><sub>min</sub>"},
    LimitFacts{LimitQuantity::work, Quantity::energy, QT_TRANSLATE_NOOP("Limit", "work"), "<i>W</i>"},
    LimitFacts{LimitQuantity::heat, Quantity::energy, QT_TRANSLATE_NOOP("Limit", "heat"), "<i>Q</i>"},
    LimitFacts{LimitQuantity::amount, Quantity::amount, QT_TRANSLATE_NOOP("Limit", "amount"), "<i>n</i>"},
    LimitFacts{LimitQuantity::storedEnergy, Quantity::energy, QT_TRANSLATE_NOOP("Limit", "stored energy"),
               "<i>E</i><sub>stored</sub>"},
};

const LimitFacts &facts(LimitQuantity quantity)
{
    return limitTable[static_cast<std::size_t>(quantity)];
}

} // namespace

QString sentenceOf(const Message &message, const units::DisplayUnits &units)
{
    QString text = QString::fromStdString(units::sentence(message, units));
    if (text.isEmpty()) return text;
    text[0] = text[0].toUpper();
    static const QString ends = QStringLiteral(".!?…");
    return ends.contains(text.back()) ? text : text + QLatin1Char('.');
}

QString sentenceOf(const Failure &failure, const units::DisplayUnits &units)
{
    return sentenceOf(failure.message, units);
}

double shownSign(const units::DisplayUnits &units)
{
    return units.workByGas ? -1.0 : 1.0;
}

double entropyChange(const gas::State &from, const gas::State &to)
{
    constexpr double rounding = 1e-10; // what a solver for an isentrope leaves, with room
    const double change = to.entropy() - from.entropy();
    const double scale =
        std::max({std::abs(from.entropy()), std::abs(to.entropy()), to.amount() * to.gas().gasConstant()});
    return std::abs(change) <= rounding * scale ? 0.0 : change;
}

QString figure(double value, const units::Scale &scale)
{
    return QString::fromStdString(units::digits(value, scale));
}

QString figureWithUnit(double value, const units::Scale &scale)
{
    const QString unit = QString::fromStdString(scale.unit);
    return unit.isEmpty() ? figure(value, scale) : figure(value, scale) + QChar(0x202F) + unit;
}

QString shownFigure(double value, Quantity quantity, const units::DisplayUnits &units, int significant)
{
    if (significant <= 0) return QString::fromStdString(units::shown(value, quantity, units));
    units::Scale scale = units::scaleFor(quantity, std::span(&value, 1), units);
    const double size = std::abs(value * scale.factor + scale.offset);
    const int whole = size > 0.0 ? static_cast<int>(std::floor(std::log10(size))) + 1 : 1;
    scale.decimals = std::max(0, significant - whole);
    return figureWithUnit(value, scale);
}

QString limitName(const analysis::Limit &limit)
{
    return limit.label.empty() ? limitQuantityWords(limit.quantity) : QString::fromStdString(limit.label);
}

QString limitQuantityWords(LimitQuantity quantity)
{
    return QCoreApplication::translate("Limit", facts(quantity).words);
}

Quantity limitUnitQuantity(LimitQuantity quantity)
{
    return facts(quantity).unit;
}

QString limitSymbol(LimitQuantity quantity)
{
    return QString::fromUtf8(facts(quantity).symbol);
}

} // namespace quasistat::ui
