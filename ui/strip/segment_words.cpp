#include "ui/strip/segment_words.h"

#include "ui/fields/form_field.h"
#include "ui/strip/end_field.h"

namespace quasistat::ui
{

using document::Json;
using path::Kind;

namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("SegmentWords", text);
}

std::optional<Kind> kindOf(const Json &segment)
{
    return path::kindFromKey(typedAt(segment, "/kind").toStdString());
}

QString kindName(const Json &segment)
{
    if (const auto kind = kindOf(segment)) {
        const auto words = path::facts(*kind).words;
        return QString::fromUtf8(words.data(), static_cast<qsizetype>(words.size()));
    }
    return typedAt(segment, "/kind");
}

RichText marked(const QString &markup)
{
    return RichText::marked(markup);
}
RichText plain(const QString &text)
{
    return RichText::plain(text);
}

/// "10 bar", or the symbol of the state referred to: T₁.
RichText valueWords(const QString &typedText, const char *symbol)
{
    if (!typedText.startsWith(QLatin1Char('@'))) return plain(asPrinted(typedText));
    return marked(QStringLiteral("<i>%1</i><sub>%2</sub>").arg(QString::fromUtf8(symbol), typedText.mid(1)));
}

RichText endValueWords(const Json &segment, path::EndKey key)
{
    const EndKeyFacts &entry = facts(key);
    const QString value = typedAt(segment, "/end/" + std::string(path::keyOf(key)));
    const QString symbol = QString::fromUtf8(entry.symbol);
    const RichText words = valueWords(value, entry.symbol);
    switch (key) {
    case path::EndKey::pressure:
    case path::EndKey::volume:
    case path::EndKey::temperature: return words;
    case path::EndKey::pressureRatio: return words + marked(say(" times <i>p</i>"));
    case path::EndKey::volumeRatio: return words + marked(say(" times <i>V</i>"));
    case path::EndKey::work:
    case path::EndKey::heat: return marked(QStringLiteral("<i>%1</i> ").arg(symbol)) + words;
    }
    return words;
}

/// `to`: with the word in front.
RichText balanceWords(const Json &segment, bool to)
{
    if (valueAt(segment, "/load")) return plain(to ? say("to balance with the load") : say("balance with the load"));
    return plain(to ? say("to balance at ") : say("balance at ")) +
           valueWords(typedAt(segment, "/external_pressure"), "p");
}

RichText endWordsWith(const Json &segment, bool to)
{
    const QString state = typedAt(segment, "/end/state");
    if (!state.isEmpty()) return plain((to ? say("to state %1") : say("state %1")).arg(state));
    const auto keys = endKeysOf(segment);
    if (keys.empty() && kindOf(segment) == Kind::constantExternalPressure) return balanceWords(segment, to);
    if (keys.empty()) return {};
    RichText words = to ? plain(say("to ")) : RichText();
    for (std::size_t i = 0; i < keys.size(); ++i) {
        if (i > 0) words += plain(QStringLiteral(", "));
        words += endValueWords(segment, keys[i]);
    }
    return words;
}

RichText exponentWords(const Json &segment, const path::SegmentResult *result)
{
    QString exponent = typedAt(segment, "/exponent");
    if (exponent.isEmpty() && result && result->exponent) exponent = QString::number(*result->exponent, 'f', 3);
    if (exponent.isEmpty()) return {};
    return marked(QStringLiteral(", <i>n</i> ")) + plain(asPrinted(exponent));
}

} // namespace

QString segmentTitle(const Json &segment)
{
    const QString label = typedAt(segment, "/label");
    if (!label.isEmpty()) return label;
    const QString kind = kindName(segment);
    return kind.isEmpty() ? say("segment") : kind;
}

RichText kindWords(const Json &segment, const path::SegmentResult *result)
{
    const auto kind = kindOf(segment);
    if (!kind) return plain(kindName(segment));
    switch (*kind) {
    case Kind::polytropic: return plain(kindName(segment)) + exponentWords(segment, result);
    case Kind::constantExternalPressure: return marked(say("constant <i>p</i><sub>ext</sub>"));
    case Kind::stepped: return plain(kindName(segment) + say(", %1 steps").arg(typedAt(segment, "/steps")));
    case Kind::isothermal:
    case Kind::isobaric:
    case Kind::isochoric:
    case Kind::isentropic:
    case Kind::linear:
    case Kind::freeExpansion: return plain(kindName(segment));
    }
    return {};
}

RichText endWords(const Json &segment)
{
    return endWordsWith(segment, true);
}

RichText endWordsInShort(const Json &segment)
{
    return endWordsWith(segment, false);
}

} // namespace quasistat::ui
