#pragma once
// Where labels stand: beside their thing, away from curves, handles and each other.

#include <QLineF>
#include <QPolygonF>
#include <QRectF>
#include <QSizeF>

#include <optional>
#include <vector>

namespace quasistat::ui
{

/// A label that looks for its place.
struct LabelRequest {
    QSizeF size;                        ///< [px]
    std::vector<QPointF> anchors;       ///< places of the thing it belongs to, any of them will do; at least one
    double clearance = 0;               ///< [px] kept free around the anchor
    double beside = 16.0;               ///< [px] beyond the clearance up to which it needs no leader
    QPolygonF region = {};              ///< where it should stand if it fits, without a leader
    std::optional<QSizeF> compact = {}; ///< a shorter form, taken where the whole one has no good place
    double compactCost = 12.0;          ///< how much better the place of the shorter form must be
    double farthest = 1000.0;           ///< [px] from the anchor's clearance to the plate
    bool optional = false;              ///< left out rather than put over another label
};

/// What is on the plane already.
struct Occupied {
    QRectF bounds;                ///< labels stay inside
    std::vector<QPolygonF> lines; ///< to be kept free where possible
    std::vector<QPolygonF> quiet; ///< better free, but of less weight: ghosts
    std::vector<QRectF> blocks;   ///< handles, fixed labels: never covered if there is any other place
    std::vector<QPointF> things;  ///< what labels stand for: without a leader none stands nearer to another one's
};

struct LabelPlace {
    QRectF plate;
    std::optional<QLineF> leader; ///< from the plate to the thing, where it cannot stand beside it
    bool isCompact = false;
};

/// One place for each request, chosen in their order, greedily: of the candidates around the anchor the one with the
/// least sum of what it covers, its distance and what its leader crosses. Nothing for an optional label without a free
/// place. Deterministic. About 150 candidates a label, each in constant time in the number of line points.
[[nodiscard]] std::vector<std::optional<LabelPlace>> labelPlaces(const std::vector<LabelRequest> &requests,
                                                                 const Occupied &occupied);

} // namespace quasistat::ui
