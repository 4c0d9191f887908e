#pragma once
// The colours, dash patterns and opacities of window and print, from resources/palette.json.

#include "core/path/kind.h"

#include <QColor>
#include <QList>
#include <QPalette>

#include <array>

namespace quasistat::ui
{

enum class Scheme { light, dark };

/// How one family of segments is drawn: never by its colour alone.
struct FamilyLook {
    QColor colour;
    QList<qreal> dash; ///< in multiples of the pen width, on and off in turn; empty: solid
};

/// A fill of an area that is work.
struct WorkFill {
    QColor colour;     ///< opaque
    double opacity;    ///< of one segment's area
    double netOpacity; ///< of the net area of a closed path
};

struct HatchLook {
    QColor colour; ///< opaque
    double opacity;
    double pitch; ///< [px] between lines, at 45°
    double line;  ///< [px]
};

struct EnvelopeLook {
    QColor colour;
    double forbiddenOpacity; ///< tint of the forbidden side
    QColor violatedHalo;
    double halo;   ///< [px] width of the halo around a violated stretch
    double casing; ///< [px] width of the ground-coloured casing inside it
};

struct Palette {
    Scheme scheme = Scheme::light;
    QColor ground;
    QColor panel;
    QColor field;
    QColor ink;
    QColor accent; ///< selection, focus and the one primary action
    QColor onAccent;
    QColor warning;
    QColor error;
    std::array<FamilyLook, 8> families;
    WorkFill workIn;  ///< work into the gas
    WorkFill workOut; ///< work leaving the gas
    HatchLook shortfall;
    EnvelopeLook envelope;

    [[nodiscard]] const FamilyLook &family(path::Family of) const { return families[static_cast<std::size_t>(of)]; }
    [[nodiscard]] const FamilyLook &family(path::Kind kind) const { return family(path::facts(kind).family); }
    [[nodiscard]] QColor secondary() const; ///< text of second rank: ink at 66 %
    [[nodiscard]] QColor rule() const;      ///< hairlines: ink at 12 %
    [[nodiscard]] QColor grid() const;      ///< grid of the diagram: ink at 7 %
};

/// `colour` with its opacity set, 0 to 1.
[[nodiscard]] QColor faded(QColor colour, double opacity);

[[nodiscard]] Palette palette(Scheme scheme);
/// For paper: the light palette on white.
[[nodiscard]] Palette printPalette();
/// Dark if the platform's window colour is. Needs a QGuiApplication.
[[nodiscard]] Scheme systemScheme();
/// The same colours for Qt's own widgets.
[[nodiscard]] QPalette widgetPalette(const Palette &palette);

} // namespace quasistat::ui
