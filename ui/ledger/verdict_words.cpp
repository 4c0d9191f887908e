#include "ui/ledger/verdict_words.h"

#include "ui/session/sentences.h"

#include <QCoreApplication>

#include <cmath>

namespace quasistat::ui
{

using analysis::Limit;
using analysis::Verdict;
using analysis::Violation;

namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("Verdict", text);
}

QString shownValue(const Limit &limit, double value, const units::DisplayUnits &units)
{
    return shownFigure(value, limitUnitQuantity(limit.quantity), units);
}

/// A limit's own value was typed round: the digits that say no more are left out ("140 °C", not "140.00 °C").
QString roundFigure(const Limit &limit, double value, const units::DisplayUnits &units)
{
    units::Scale scale = units::scaleFor(limitUnitQuantity(limit.quantity), std::span(&value, 1), units);
    const double shown = value * scale.factor + scale.offset;
    for (int decimals = 0; decimals < scale.decimals; ++decimals) {
        const double power = std::pow(10.0, decimals);
        if (std::abs(std::round(shown * power) / power - shown) > 1e-6 * std::abs(shown)) continue;
        scale.decimals = decimals;
        break;
    }
    return figureWithUnit(value, scale);
}

bool samePoint(const path::CurvePoint &point, const gas::State &state)
{
    const auto near = [](double a, double b) { return std::abs(a - b) <= 1e-6 * std::max(std::abs(a), std::abs(b)); };
    return near(point.volume, state.volume()) && near(point.pressure, state.pressure());
}

/// How a violated stretch lies on its segment.
enum class Reach { whole, fromStart, toEnd, atStart, atEnd, within };

Reach reachOf(const Violation &violation, const path::SegmentResult &segment)
{
    const path::Polyline &stretch = violation.stretch;
    if (stretch.empty()) return Reach::whole;
    const bool start = samePoint(stretch.front(), segment.from);
    const bool end = samePoint(stretch.back(), segment.to);
    if (start && end && stretch.size() > 1) return Reach::whole;
    if (stretch.size() < 2) return start ? Reach::atStart : end ? Reach::atEnd : Reach::within;
    return start ? Reach::fromStart : end ? Reach::toEnd : Reach::within;
}

/// Where a crossing lies: by pressure, or by volume where the pressure does not change along the segment.
QString placeOf(const path::CurvePoint &point, const path::SegmentResult &segment, const units::DisplayUnits &units)
{
    const auto &range = segment.extrema.pressure;
    const bool byVolume = range.highest - range.lowest <= 1e-9 * range.highest;
    return byVolume ? shownFigure(point.volume, units::Quantity::volume, units)
                    : shownFigure(point.pressure, units::Quantity::pressure, units);
}

bool rises(const path::CurvePoint &from, const path::CurvePoint &to, const path::SegmentResult &segment)
{
    const auto &range = segment.extrema.pressure;
    const bool byVolume = range.highest - range.lowest <= 1e-9 * range.highest;
    return byVolume ? to.volume > from.volume : to.pressure > from.pressure;
}

QString stretchWords(const Violation &violation, const path::SegmentResult &segment, const units::DisplayUnits &units)
{
    const path::Polyline &stretch = violation.stretch;
    switch (reachOf(violation, segment)) {
    case Reach::whole: return say("on segment %1").arg(violation.segment);
    case Reach::atStart: return say("at the start of segment %1").arg(violation.segment);
    case Reach::atEnd: return say("at the end of segment %1").arg(violation.segment);
    case Reach::toEnd:
        return (rises(stretch.front(), stretch.back(), segment) ? say("above %1 on segment %2")
                                                                : say("below %1 on segment %2"))
            .arg(placeOf(stretch.front(), segment, units))
            .arg(violation.segment);
    case Reach::fromStart:
        return say("from the start of segment %2 to %1")
            .arg(placeOf(stretch.back(), segment, units))
            .arg(violation.segment);
    case Reach::within:
        return say("between %1 and %2 on segment %3")
            .arg(placeOf(stretch.front(), segment, units), placeOf(stretch.back(), segment, units))
            .arg(violation.segment);
    }
    return {};
}

QString worstPlace(const Verdict &verdict)
{
    if (verdict.state > 0) return say("; worst at state %1").arg(verdict.state);
    if (verdict.segment > 0) return say("; worst within segment %1").arg(verdict.segment);
    return {};
}

const path::SegmentResult *segmentOfViolation(const analysis::Evaluation &evaluation, const Violation &violation)
{
    const auto &segments = evaluation.path.segments;
    const auto index = static_cast<std::size_t>(violation.segment - 1);
    return violation.segment >= 1 && index < segments.size() ? &segments[index] : nullptr;
}

} // namespace

QString limitTerms(const Limit &limit, const units::DisplayUnits &units)
{
    const QString symbol = limitSymbol(limit.quantity);
    if (!limit.maxAt.empty()) return say("%1 ≤ rating at <i>T</i>").arg(symbol);
    if (limit.min && limit.max)
        return QStringLiteral("%1 ≤ %2 ≤ %3")
            .arg(roundFigure(limit, *limit.min, units), symbol, roundFigure(limit, *limit.max, units));
    if (limit.max) return QStringLiteral("%1 ≤ %2").arg(symbol, roundFigure(limit, *limit.max, units));
    if (limit.min) return QStringLiteral("%1 ≥ %2").arg(symbol, roundFigure(limit, *limit.min, units));
    return symbol;
}

QString worstFigure(const Limit &limit, const Verdict &verdict, const units::DisplayUnits &units)
{
    return verdict.worst ? shownValue(limit, *verdict.worst, units) : QString();
}

QString verdictSentence(const analysis::Evaluation &evaluation, const Verdict &verdict,
                        const units::DisplayUnits &units)
{
    if (verdict.ok) return {};
    QStringList places;
    for (const Violation &violation : verdict.violations)
        if (const auto *segment = segmentOfViolation(evaluation, violation))
            places << stretchWords(violation, *segment, units);
    if (places.isEmpty()) return say("Exceeded%1.").arg(worstPlace(verdict));
    QString list = places.takeFirst();
    while (!places.isEmpty()) list += (places.size() == 1 ? say(", and %1") : say(", %1")).arg(places.takeFirst());
    return say("Exceeded %1%2.").arg(list, worstPlace(verdict));
}

QString passingSentence(const analysis::Evaluation &evaluation, const Verdict &verdict, int segment,
                        const units::DisplayUnits &units)
{
    if (verdict.ok) return {};
    for (const Violation &violation : verdict.violations) {
        if (violation.segment != segment + 1) continue;
        const auto *result = segmentOfViolation(evaluation, violation);
        if (!result) continue;
        const Limit &limit = evaluation.limits[verdict.limit];
        const auto allowed = verdict.worstAllowed ? verdict.worstAllowed : limit.max ? limit.max : limit.min;
        const QString value = allowed ? roundFigure(limit, *allowed, units) : limitName(limit);
        switch (reachOf(violation, *result)) {
        case Reach::toEnd:
        case Reach::within:
            return say("Passes %1 at %2.").arg(value, placeOf(violation.stretch.front(), *result, units));
        case Reach::fromStart:
            return say("Beyond %1 until %2.").arg(value, placeOf(violation.stretch.back(), *result, units));
        case Reach::atStart: return say("Beyond %1 at its start.").arg(value);
        case Reach::atEnd: return say("Beyond %1 at its end.").arg(value);
        case Reach::whole: return say("Beyond %1 all along.").arg(value);
        }
    }
    return {};
}

} // namespace quasistat::ui
