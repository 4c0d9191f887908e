#include "ui/look/palette.h"

#include <QGuiApplication>
#include <QJsonArray>
#include <QJsonDocument>
#include <QJsonObject>

#include <string_view>

namespace quasistat::resources
{
std::string_view paletteJson();
}

namespace quasistat::ui
{
namespace
{

// In the order of path::Family.
constexpr std::array familyKeys{"isothermal",           "isobaric",      "isochoric",    "polytropic",
                                "isentropic_adiabatic", "linear_traced", "irreversible", "moving_matter"};

QColor colour(const QJsonObject &from, const char *key)
{
    return QColor(from.value(QLatin1String(key)).toString());
}

double number(const QJsonObject &from, const char *key)
{
    return from.value(QLatin1String(key)).toDouble();
}

QJsonObject object(const QJsonObject &from, const char *key)
{
    return from.value(QLatin1String(key)).toObject();
}

FamilyLook familyLook(const QJsonObject &from)
{
    FamilyLook look{colour(from, "colour"), {}};
    for (const auto &length : from.value(QLatin1String("dash")).toArray()) look.dash.append(length.toDouble());
    return look;
}

WorkFill workFill(const QJsonObject &from)
{
    return {colour(from, "colour"), number(from, "opacity"), number(from, "net_opacity")};
}

HatchLook hatchLook(const QJsonObject &from)
{
    return {colour(from, "colour"), number(from, "opacity"), number(from, "pitch_px"), number(from, "line_px")};
}

EnvelopeLook envelopeLook(const QJsonObject &from)
{
    return {colour(from, "colour"), number(from, "forbidden_opacity"), colour(from, "violated_halo"),
            number(from, "halo_px"), number(from, "casing_px")};
}

} // namespace

QColor faded(QColor colour, double opacity)
{
    colour.setAlphaF(static_cast<float>(opacity));
    return colour;
}

QColor Palette::secondary() const
{
    return faded(ink, 0.66);
}
QColor Palette::rule() const
{
    return faded(ink, 0.12);
}
QColor Palette::grid() const
{
    return faded(ink, 0.07);
}

Palette palette(Scheme scheme)
{
    const auto text = resources::paletteJson();
    const auto all = QJsonDocument::fromJson(QByteArray(text.data(), static_cast<qsizetype>(text.size()))).object();
    const auto from = object(all, scheme == Scheme::light ? "light" : "dark");
    Q_ASSERT(!from.isEmpty());

    Palette result;
    result.scheme = scheme;
    result.ground = colour(from, "ground");
    result.panel = colour(from, "panel");
    result.field = colour(from, "field");
    result.ink = colour(from, "ink");
    result.accent = colour(from, "accent");
    result.onAccent = colour(from, "on_accent");
    result.warning = colour(from, "warning");
    result.error = colour(from, "error");
    const auto families = object(from, "families");
    for (std::size_t i = 0; i < familyKeys.size(); ++i)
        result.families[i] = familyLook(object(families, familyKeys[i]));
    result.workIn = workFill(object(from, "work_in"));
    result.workOut = workFill(object(from, "work_out"));
    result.shortfall = hatchLook(object(from, "shortfall_hatch"));
    result.envelope = envelopeLook(object(from, "envelope"));
    return result;
}

Palette printPalette()
{
    Palette result = palette(Scheme::light);
    result.ground = Qt::white;
    result.panel = Qt::white;
    return result;
}

Scheme systemScheme()
{
    return QGuiApplication::palette().color(QPalette::Window).lightnessF() < 0.5F ? Scheme::dark : Scheme::light;
}

QPalette widgetPalette(const Palette &from)
{
    QPalette result;
    const QColor disabled = faded(from.ink, 0.45);
    result.setColor(QPalette::Window, from.panel);
    result.setColor(QPalette::WindowText, from.ink);
    result.setColor(QPalette::Base, from.field);
    result.setColor(QPalette::AlternateBase, from.panel);
    result.setColor(QPalette::Text, from.ink);
    result.setColor(QPalette::PlaceholderText, from.secondary());
    result.setColor(QPalette::Button, from.panel);
    result.setColor(QPalette::ButtonText, from.ink);
    result.setColor(QPalette::ToolTipBase, from.ground);
    result.setColor(QPalette::ToolTipText, from.ink);
    result.setColor(QPalette::Highlight, from.accent);
    result.setColor(QPalette::HighlightedText, from.onAccent);
    result.setColor(QPalette::Link, from.accent);
    for (const auto role : {QPalette::WindowText, QPalette::Text, QPalette::ButtonText})
        result.setColor(QPalette::Disabled, role, disabled);
    return result;
}

} // namespace quasistat::ui
