#include "ui/canvas/ticks.h"

#include <algorithm>
#include <cmath>

namespace quasistat::ui
{

QVector<double> EngineeringTicker::places(const QCPRange &range, double pixels, double spacing)
{
    setTickCount(std::max(2, static_cast<int>(std::lround(pixels / spacing))));
    QVector<double> found;
    generate(range, QLocale::c(), QLatin1Char('f'), 0, found, nullptr, nullptr);
    found.removeIf([&](double place) { return !range.contains(place); });
    return found;
}

double EngineeringTicker::getTickStep(const QCPRange &range)
{
    const double exact = range.size() / std::max(1, tickCount());
    const double decade = std::pow(10.0, std::floor(std::log10(exact)));
    const double mantissa = exact / decade;
    const double step = mantissa < 1.5 ? 1.0 : mantissa < 3.5 ? 2.0 : mantissa < 7.5 ? 5.0 : 10.0;
    m_decimals = std::max(0, static_cast<int>(-std::floor(std::log10(step * decade) + 1e-9)));
    return step * decade;
}

QString tickText(double place, int decimals)
{
    const QString text = QString::number(std::abs(place), 'f', decimals);
    if (text.toDouble() == 0.0) return QStringLiteral("0");
    return place < 0.0 ? QChar(0x2212) + text : text;
}

} // namespace quasistat::ui
