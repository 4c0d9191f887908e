#pragma once
// Ticks of an axis at 1, 2 or 5 times a power of ten.

#include <QString>

#include <qcustomplot.h>

namespace quasistat::ui
{

class EngineeringTicker : public QCPAxisTicker
{
public:
    /// Places inside `range` for an axis of `pixels`, about `spacing` pixels apart.
    [[nodiscard]] QVector<double> places(const QCPRange &range, double pixels, double spacing);
    /// Decimals that tell the places found last apart.
    [[nodiscard]] int decimals() const { return m_decimals; }

protected:
    double getTickStep(const QCPRange &range) override;

private:
    int m_decimals = 0;
};

/// A tick's number with U+2212 for minus.
[[nodiscard]] QString tickText(double place, int decimals);

} // namespace quasistat::ui
