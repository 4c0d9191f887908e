#include "ui/look/type.h"

#include <QFontDatabase>
#include <QFontMetricsF>

#include <cmath>

namespace quasistat::ui
{
namespace
{

// What platforms answer when they have no interface face of their own.
bool isGeneric(const QString &family)
{
    static constexpr const char *generic[] = {"",          "Sans",  "Sans Serif",    "sans-serif",
                                              "Helvetica", "Arial", "MS Sans Serif", "DejaVu Sans"};
    for (const char *name : generic)
        if (family.compare(QLatin1String(name), Qt::CaseInsensitive) == 0) return true;
    return false;
}

QFont sized(const QStringList &families, double pixels, QFont::Weight weight)
{
    QFont result;
    result.setFamilies(families); // the first that is installed
    result.setPixelSize(static_cast<int>(std::lround(pixels)));
    result.setWeight(weight);
    // Fractional advances: a label keeps its width on screen, in print and at any zoom.
    result.setHintingPreference(QFont::PreferNoHinting);
    return result;
}

bool hasTabularDigits(const QFont &font)
{
    const QFontMetricsF metrics(font);
    return std::abs(metrics.horizontalAdvance(QLatin1Char('1')) - metrics.horizontalAdvance(QLatin1Char('8'))) <
           0.005 * font.pixelSize();
}

} // namespace

QStringList interfaceFamilies()
{
    const QString system = QFontDatabase::systemFont(QFontDatabase::GeneralFont).family();
    if (!isGeneric(system)) return {system};
    return {QStringLiteral("Inter"), QStringLiteral("DejaVu Sans"), system};
}

QFont face(double pixels, QFont::Weight weight)
{
    return sized(interfaceFamilies(), pixels, weight);
}

QFont printFace(double pixels, QFont::Weight weight)
{
    const QFont interface = face(pixels, weight);
    QFont font = hasTabularDigits(interface)
                     ? interface
                     : sized({QStringLiteral("Open Sans"), QStringLiteral("DejaVu Sans")}, pixels, weight);
    // Any spacing keeps letters from joining: a search for "first" must find it.
    font.setLetterSpacing(QFont::AbsoluteSpacing, 0.01);
    return font;
}

QFont headingFace()
{
    return face(16, QFont::DemiBold);
}
QFont titleFace()
{
    return face(14, QFont::DemiBold);
}
QFont bodyFace()
{
    return face(13);
}
QFont labelFace()
{
    return face(12);
}
QFont captionFace()
{
    return face(11);
}

} // namespace quasistat::ui
