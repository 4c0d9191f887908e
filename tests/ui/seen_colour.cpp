#include "seen_colour.h"

#include <algorithm>
#include <cmath>
#include <numbers>

namespace quasistat::seen
{
namespace
{

using Matrix = std::array<Triple, 3>;

constexpr Matrix protanMatrix{
    {{0.152286, 1.052583, -0.204868}, {0.114503, 0.786281, 0.099216}, {-0.003882, -0.048116, 1.051998}}};
constexpr Matrix deutanMatrix{
    {{0.367322, 0.860646, -0.227968}, {0.280085, 0.672501, 0.047413}, {-0.011820, 0.042940, 0.968881}}};
// Ottosson, "A perceptual color space for image processing" (2020).
constexpr Matrix toCones{{{0.4122214708, 0.5363325363, 0.0514459929},
                          {0.2119034982, 0.6806995451, 0.1073969566},
                          {0.0883024619, 0.2817188376, 0.6299787005}}};
constexpr Matrix toLab{{{0.2104542553, 0.7936177850, -0.0040720468},
                        {1.9779984951, -2.4285922050, 0.4505937099},
                        {0.0259040371, 0.7827717662, -0.8086757660}}};

Triple product(const Matrix &matrix, const Triple &vector)
{
    Triple result{};
    for (std::size_t i = 0; i < 3; ++i)
        for (std::size_t j = 0; j < 3; ++j) result[i] += matrix[i][j] * vector[j];
    return result;
}

double decoded(double value)
{
    return value <= 0.04045 ? value / 12.92 : std::pow((value + 0.055) / 1.055, 2.4);
}

double luminance(const QColor &colour)
{
    const Triple light = linearLight(colour);
    return 0.2126 * light[0] + 0.7152 * light[1] + 0.0722 * light[2];
}

double hue(const QColor &colour)
{
    const Triple lab = okLab(linearLight(colour));
    return std::atan2(lab[2], lab[1]) * 180.0 / std::numbers::pi;
}

} // namespace

Triple linearLight(const QColor &colour)
{
    return {decoded(colour.red() / 255.0), decoded(colour.green() / 255.0), decoded(colour.blue() / 255.0)};
}

Triple asSeenBy(Eye eye, const Triple &light)
{
    if (eye == Eye::normal) return light;
    Triple seen = product(eye == Eye::protan ? protanMatrix : deutanMatrix, light);
    for (double &part : seen) part = std::clamp(part, 0.0, 1.0);
    return seen;
}

Triple okLab(const Triple &light)
{
    Triple cones = product(toCones, light);
    for (double &cone : cones) cone = std::cbrt(cone);
    return product(toLab, cones);
}

double distance(const Triple &first, const Triple &second)
{
    return std::hypot(first[0] - second[0], first[1] - second[1], first[2] - second[2]);
}

double contrast(const QColor &first, const QColor &second)
{
    const auto [darker, brighter] = std::minmax({luminance(first), luminance(second)});
    return (brighter + 0.05) / (darker + 0.05);
}

double hueDifference(const QColor &first, const QColor &second)
{
    const double difference = std::abs(hue(first) - hue(second));
    return std::min(difference, 360.0 - difference);
}

} // namespace quasistat::seen
