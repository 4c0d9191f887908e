#pragma once
// What the card of a segment says, made from one evaluation; and how it is painted.

#include "core/units/display.h"
#include "ui/look/palette.h"
#include "ui/look/rich_text.h"
#include "ui/session/session.h"

#include <QPainter>

namespace quasistat::ui
{

/// The standing of a segment, worst first where several hold.
enum class CardStanding {
    error,       ///< could not be computed: `sentence` says why
    waiting,     ///< an earlier segment could not be computed
    failedAudit, ///< the two routes differ
    warned,      ///< exceeds the limit named in `mark`
    good,
};

struct CardFace {
    int segment = 0; ///< from 0
    std::optional<path::Kind> kind;
    QString title;
    RichText second; ///< the kind, where the title is a label
    RichText end;
    RichText endInShort; ///< where a narrow card has no room for it
    CardStanding standing = CardStanding::good;
    QString mark;      ///< the limit's name, "audit"
    QString sentence;  ///< of an error, or what is waited for
    double work = 0.0; ///< [J] into the gas, for the bar
    double heat = 0.0;
    QString workText;
    QString heatText;

    [[nodiscard]] bool hasFigures() const { return standing >= CardStanding::failedAudit; }
    [[nodiscard]] QString spoken() const; ///< the whole card in words
};

/// One scale for the bars of all cards.
struct StripScale {
    double largest = 0.0; ///< |W| or |Q| [J] of a full bar
    QString caption;      ///< "full bar: 900 J"
};

struct StripFaces {
    std::vector<CardFace> cards;
    StripScale scale;
};
[[nodiscard]] StripFaces stripFaces(const Snapshot &snapshot);

/// What the card is in at the moment, besides its face.
struct CardPose {
    bool selected = false;
    bool hovered = false;
    bool unfolded = false; ///< its fields stand above it: no upper edge
    bool focused = false;
    double halfBar = 38.0; ///< [px] half width of a full bar
};

/// The place of the three dots that open the card's actions.
[[nodiscard]] QRectF dotsPlace(const QRectF &card);
void paintCard(QPainter &painter, const QRectF &card, const CardFace &face, const CardPose &pose,
               const StripScale &scale, const Palette &look);

/// The outline of a card: ground, edge by its standing and pose. Shared with the start's card.
void paintCardGround(QPainter &painter, const QRectF &card, const CardPose &pose, const QColor &edge,
                     const Palette &look);

} // namespace quasistat::ui
