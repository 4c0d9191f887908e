#include "ui/look/glyph.h"

#include <QIconEngine>
#include <QJsonDocument>
#include <QJsonObject>
#include <QSvgRenderer>

namespace quasistat::resources
{
std::string_view glyphsJson();
}

namespace quasistat::ui
{
namespace
{

QLatin1String latin1(std::string_view text)
{
    return QLatin1String(text.data(), static_cast<qsizetype>(text.size()));
}

QJsonObject glyphOf(std::string_view key)
{
    const auto text = resources::glyphsJson();
    const auto all = QJsonDocument::fromJson(QByteArray(text.data(), static_cast<qsizetype>(text.size()))).object();
    return all.value(QLatin1String("glyphs")).toObject().value(latin1(key)).toObject();
}

// One path of a glyph with the attributes that only it has; nothing where the glyph has no such path.
QString element(const QJsonObject &glyph, const char *part, const QString &attributes)
{
    const QString data = glyph.value(QLatin1String(part)).toString();
    return data.isEmpty() ? QString() : QStringLiteral("<path d=\"%1\"%2/>").arg(data, attributes);
}

class GlyphEngine : public QIconEngine
{
public:
    GlyphEngine(path::Kind kind, const QColor &colour) : m_kind(kind), m_colour(colour) {}

    void paint(QPainter *painter, const QRect &rect, QIcon::Mode mode, QIcon::State) override
    {
        const double side = std::min(rect.width(), rect.height());
        const QRectF square(rect.center().x() + 0.5 - side / 2.0, rect.center().y() + 0.5 - side / 2.0, side, side);
        drawGlyph(*painter, square, m_kind, mode == QIcon::Disabled ? faded(m_colour, 0.4) : m_colour);
    }
    QPixmap pixmap(const QSize &size, QIcon::Mode mode, QIcon::State state) override
    {
        QPixmap result(size);
        result.fill(Qt::transparent);
        QPainter painter(&result);
        paint(&painter, QRect(QPoint(), size), mode, state);
        return result;
    }
    [[nodiscard]] QIconEngine *clone() const override { return new GlyphEngine(*this); }

private:
    path::Kind m_kind;
    QColor m_colour;
};

} // namespace

QByteArray glyphImage(std::string_view key, const QColor &colour)
{
    const QJsonObject glyph = glyphOf(key);
    if (glyph.isEmpty()) return {};
    const QString paint = colour.name(QColor::HexRgb);
    QString image = QStringLiteral("<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 24 24\">"
                                   "<g fill=\"none\" stroke=\"%1\" stroke-width=\"1.75\" stroke-linecap=\"round\" "
                                   "stroke-linejoin=\"round\" opacity=\"%2\">")
                        .arg(paint)
                        .arg(static_cast<double>(colour.alphaF()));
    image += element(glyph, "line", QString());
    image += element(glyph, "dashed", QStringLiteral(" stroke-dasharray=\"2.2 3\""));
    image += element(glyph, "dots", QStringLiteral(" fill=\"%1\" stroke=\"none\"").arg(paint));
    return (image + QStringLiteral("</g></svg>")).toUtf8();
}

void drawGlyph(QPainter &painter, const QRectF &square, path::Kind kind, const QColor &colour)
{
    QSvgRenderer(glyphImage(path::facts(kind).key, colour)).render(&painter, square);
}

QIcon glyphIcon(path::Kind kind, const Palette &palette)
{
    return QIcon(new GlyphEngine(kind, palette.family(kind).colour));
}

} // namespace quasistat::ui
