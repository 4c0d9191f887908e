#pragma once
// Colours as eyes see them: contrast, OKLab, and simulated colour blindness.

#include <QColor>

#include <array>

namespace quasistat::seen
{

using Triple = std::array<double, 3>;

enum class Eye { normal, protan, deutan };

/// sRGB 8-bit values as linear light, 0 to 1 (IEC 61966-2-1).
[[nodiscard]] Triple linearLight(const QColor &colour);
/// What a dichromat sees, in linear light, clipped to 0..1: matrices of Machado, Oliveira, Fernandes (2009), "A
/// Physiologically-based Model for Simulation of Color Vision Deficiency", severity 1.0.
[[nodiscard]] Triple asSeenBy(Eye eye, const Triple &light);
/// OKLab (Ottosson 2020): lightness, green–red, blue–yellow.
[[nodiscard]] Triple okLab(const Triple &light);
[[nodiscard]] double distance(const Triple &first, const Triple &second);
/// Contrast ratio as WCAG 2.1 defines it, 1 to 21.
[[nodiscard]] double contrast(const QColor &first, const QColor &second);
/// Angle between two hues in OKLab [degree], 0 to 180.
[[nodiscard]] double hueDifference(const QColor &first, const QColor &second);

} // namespace quasistat::seen
