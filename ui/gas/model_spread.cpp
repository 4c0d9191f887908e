#include "ui/gas/model_spread.h"

#include "ui/gas/gas_words.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"

#include <QCoreApplication>

#include <algorithm>
#include <array>
#include <cmath>

namespace quasistat::ui
{

using units::Quantity;

namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("Gas", text);
}

QString withSign(double value, int decimals)
{
    const QString digits = QString::number(std::abs(value), 'f', decimals);
    const bool isZero = digits.toDouble() == 0.0;
    return (isZero ? QString() : value < 0.0 ? QString(QChar(0x2212)) : QStringLiteral("+")) + digits;
}

/// "W 8.412 → 8.361 kJ (−0.6 %)".
RichText energyChange(const char *symbol, double before, double now, double scale, const units::DisplayUnits &units)
{
    const std::array ends{before, now};
    const units::Scale unit = units::scaleFor(Quantity::energy, ends, units);
    RichText words = RichText::marked(QStringLiteral("<i>%1</i> ").arg(QLatin1String(symbol))) +
                     RichText::plain(QStringLiteral("%1 → %2").arg(figure(shownSign(units) * before, unit),
                                                                   figureWithUnit(shownSign(units) * now, unit)));
    const QString off = percentOff(now, before, scale);
    return off == QStringLiteral("–") ? words : words + RichText::plain(QStringLiteral(" (%1)").arg(off));
}

RichText temperatureChange(const path::PathResult &before, const path::PathResult &now,
                           const units::DisplayUnits &units)
{
    const auto from = before.states.back().state.temperature();
    const auto to = now.states.back().state.temperature();
    if (!from || !to) return {};
    const std::array ends{*from, *to};
    const units::Scale unit = units::scaleFor(Quantity::temperature, ends, units);
    if (figure(*from, unit) == figure(*to, unit)) return {};
    return RichText::marked(say(", end <i>T</i> ")) +
           RichText::plain(QStringLiteral("%1 → %2").arg(figure(*from, unit), figureWithUnit(*to, unit)));
}

} // namespace

QString percentOff(double other, double value, double scale)
{
    if (!(std::abs(value) > 1e-9 * scale) || !std::isfinite(other)) return QStringLiteral("–");
    const double percent = 100.0 * (other / value - 1.0);
    if (std::abs(percent) >= 1e4) return QStringLiteral("–");
    return withSign(percent, std::abs(percent) < 9.95 ? 1 : 0) + QChar(0x202F) + QLatin1Char('%');
}

QString degreesOff(double other, double value, const units::DisplayUnits &units)
{
    const bool isFahrenheit = units.temperature == "°F" || units.temperature == "°R";
    const double difference = (other - value) * (isFahrenheit ? 1.8 : 1.0);
    return withSign(difference, 1) + QChar(0x202F) + (isFahrenheit ? QStringLiteral("°F") : QStringLiteral("K"));
}

RichText modelChangeWords(const Snapshot &before, const Snapshot &now)
{
    QString model = modelName(typedAt(now.design.json, "/gas/model").toStdString());
    model[0] = model[0].toUpper();
    const QString old = modelName(typedAt(before.design.json, "/gas/model").toStdString());
    const RichText lead = RichText::plain(say("%1 instead of %2: ").arg(model, old));
    const auto isWhole = [](const Snapshot &s) { return s.evaluation && s.evaluation->path.complete(); };
    if (!isWhole(now)) return lead + RichText::plain(say("the path cannot be computed whole."));
    if (!isWhole(before)) return lead + RichText::plain(say("the path is computed whole."));
    const path::PathResult &was = before.evaluation->path;
    const path::PathResult &is = now.evaluation->path;
    if (is.segments.empty()) return lead + RichText::plain(say("the path has no segments yet."));
    const double scale = std::max(
        {std::abs(was.totals.work), std::abs(was.totals.heat), std::abs(is.totals.work), std::abs(is.totals.heat)});
    return lead + energyChange("W", was.totals.work, is.totals.work, scale, now.units) +
           RichText::plain(QStringLiteral(", ")) +
           energyChange("Q", was.totals.heat, is.totals.heat, scale, now.units) +
           temperatureChange(was, is, now.units) + RichText::plain(QStringLiteral("."));
}

bool hasSpread(const path::PathResult &path)
{
    return std::ranges::any_of(path.segments, [](const path::SegmentResult &segment) {
        return segment.idealGas && !segment.from.gas().isIdeal();
    });
}

} // namespace quasistat::ui
