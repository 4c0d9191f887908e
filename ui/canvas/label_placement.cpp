#include "ui/canvas/label_placement.h"

#include <algorithm>
#include <array>
#include <cmath>
#include <limits>
#include <numbers>

namespace quasistat::ui
{
namespace
{

// How much of the lines lies in a rectangle, answered in constant time by a table of sums over cells.
class LineDensity
{
public:
    explicit LineDensity(const Occupied &occupied) : LineDensity(occupied.bounds)
    {
        for (const auto &line : occupied.lines) add(line, lineWeight);
        for (const auto &line : occupied.quiet) add(line, quietWeight);
        for (int row = 1; row < m_rows; ++row)
            for (int column = 1; column < m_columns; ++column)
                at(column, row) += at(column - 1, row) + at(column, row - 1) - at(column - 1, row - 1);
    }

    /// Length of line inside `rect`, in cells, each by its weight.
    [[nodiscard]] int inside(const QRectF &rect) const
    {
        const int left = column(rect.left()) - 1;
        const int right = column(rect.right());
        const int top = row(rect.top()) - 1;
        const int bottom = row(rect.bottom());
        return at(right, bottom) - at(left, bottom) - at(right, top) + at(left, top);
    }

    static constexpr int lineWeight = 4;
    static constexpr int quietWeight = 1;

private:
    static constexpr double cell = 3.0;

    explicit LineDensity(const QRectF &bounds)
        : m_bounds(bounds), m_columns(static_cast<int>(bounds.width() / cell) + 2),
          m_rows(static_cast<int>(bounds.height() / cell) + 2),
          m_sums(static_cast<std::size_t>(m_columns) * static_cast<std::size_t>(m_rows), 0)
    {
    }

    [[nodiscard]] int column(double x) const
    {
        return std::clamp(static_cast<int>((x - m_bounds.left()) / cell) + 1, 1, m_columns - 1);
    }
    [[nodiscard]] int row(double y) const
    {
        return std::clamp(static_cast<int>((y - m_bounds.top()) / cell) + 1, 1, m_rows - 1);
    }
    [[nodiscard]] int &at(int column, int row) { return m_sums[static_cast<std::size_t>(row * m_columns + column)]; }
    [[nodiscard]] int at(int column, int row) const
    {
        return m_sums[static_cast<std::size_t>(row * m_columns + column)];
    }

    void add(const QPolygonF &line, int weight)
    {
        for (qsizetype i = 0; i + 1 < line.size(); ++i) {
            const QLineF piece(line.at(i), line.at(i + 1));
            const int steps = std::max(1, static_cast<int>(piece.length() / cell));
            for (int step = 0; step < steps; ++step) {
                const QPointF point = piece.pointAt((step + 0.5) / steps);
                if (m_bounds.contains(point)) at(column(point.x()), row(point.y())) += weight;
            }
        }
    }

    QRectF m_bounds;
    int m_columns;
    int m_rows;
    std::vector<int> m_sums;
};

// Distances of the plate from its anchor's clearance [px], nearest first.
constexpr std::array distances{0.0, 6.0, 14.0, 24.0, 38.0, 58.0, 82.0, 112.0, 150.0, 200.0, 260.0, 330.0};
constexpr int directions = 24;
constexpr double nudge = 14.0; // a candidate that stands out of the bounds by less is moved inside

constexpr double costOfLineCell = 1.0; // by its weight
constexpr double costOfBlock = 400.0;
constexpr double costOfDistance = 0.14;
constexpr double costOfLeader = 5.0;
constexpr double costOfCrossedCell = 4.0;
constexpr double costOfCrossedPlate = 60.0;
constexpr double costOfCornerOutside = 25.0; // of a label that should stand in a region
constexpr double costOfDoubt = 50.0;         // of standing nearer to another thing
constexpr double costOfLeavingRegion = 15.0;
constexpr double unacceptable = 90.0;

double overlap(const QRectF &first, const QRectF &second)
{
    const QRectF common = first.intersected(second);
    return common.isEmpty() ? 0.0 : common.width() * common.height();
}

double distanceFrom(const QRectF &rect, QPointF point)
{
    return std::hypot(std::max({rect.left() - point.x(), 0.0, point.x() - rect.right()}),
                      std::max({rect.top() - point.y(), 0.0, point.y() - rect.bottom()}));
}

bool crosses(const QLineF &line, const QRectF &rect)
{
    if (std::max(line.x1(), line.x2()) < rect.left() || std::min(line.x1(), line.x2()) > rect.right() ||
        std::max(line.y1(), line.y2()) < rect.top() || std::min(line.y1(), line.y2()) > rect.bottom())
        return false;
    // The corners lie on both sides of the line.
    const auto side = [&](double x, double y) { return line.dx() * (y - line.y1()) > line.dy() * (x - line.x1()); };
    const bool first = side(rect.left(), rect.top());
    return side(rect.right(), rect.top()) != first || side(rect.left(), rect.bottom()) != first ||
           side(rect.right(), rect.bottom()) != first;
}

// From the plate's edge towards the anchor, ending where the anchor's own mark begins.
QLineF leaderOf(const QRectF &plate, QPointF anchor, double clearance)
{
    const double inset = std::min(8.0, plate.width() / 2.0);
    const QPointF from(std::clamp(anchor.x(), plate.left() + inset, plate.right() - inset),
                       std::clamp(anchor.y(), plate.top(), plate.bottom()));
    QLineF leader(from, anchor);
    const double free = std::min(clearance * 0.6, leader.length());
    leader.setLength(std::max(0.0, leader.length() - free));
    return leader;
}

// From the middle of a rectangle of these half sides to its edge.
QPointF ray(double angle, double halfWidth, double halfHeight)
{
    const double x = std::cos(angle);
    const double y = -std::sin(angle);
    const double reach = std::min(halfWidth / std::max(std::abs(x), 1e-9), halfHeight / std::max(std::abs(y), 1e-9));
    return {x * reach, y * reach};
}

QRectF movedInside(QRectF plate, const QRectF &bounds)
{
    if (plate.left() < bounds.left()) plate.moveLeft(bounds.left());
    if (plate.right() > bounds.right()) plate.moveRight(bounds.right());
    if (plate.top() < bounds.top()) plate.moveTop(bounds.top());
    if (plate.bottom() > bounds.bottom()) plate.moveBottom(bounds.bottom());
    return plate;
}

class Placement
{
public:
    explicit Placement(const Occupied &occupied)
        : m_bounds(occupied.bounds), m_density(occupied), m_blocks(occupied.blocks), m_things(occupied.things)
    {
    }

    std::optional<LabelPlace> place(const LabelRequest &request)
    {
        m_best.reset();
        m_bestCost = std::numeric_limits<double>::infinity();
        if (!request.region.isEmpty()) tryWithin(request);
        tryAround(request, request.size, false);
        if (request.compact && m_bestCost > request.compactCost) tryAround(request, *request.compact, true);
        if (!m_best || (request.optional && m_bestCost >= unacceptable)) return std::nullopt;
        m_blocks.push_back(m_best->plate);
        if (m_best->leader) m_leaders.push_back(*m_best->leader);
        return m_best;
    }

private:
    struct Candidate {
        QRectF plate;
        QPointF anchor;
        double clearance = 0.0;
        bool wantsLeader = false;
        bool isCompact = false;
    };

    void tryAround(const LabelRequest &request, QSizeF size, bool compact)
    {
        for (const double distance : distances) {
            // No farther candidate can be better, or is wanted.
            if (m_bestCost <= distance * costOfDistance || distance > request.farthest) return;
            for (const QPointF anchor : request.anchors) ring(request, anchor, size, distance, compact);
        }
    }

    void ring(const LabelRequest &request, QPointF anchor, QSizeF size, double distance, bool compact)
    {
        const double reach = request.clearance + distance;
        for (int direction = 0; direction < directions; ++direction) {
            const double angle = 2.0 * std::numbers::pi * direction / directions;
            QRectF plate(QPointF(), size);
            plate.moveCenter(anchor + ray(angle, size.width() / 2.0 + reach, size.height() / 2.0 + reach));
            // To the right reads best; the other sides are a little dearer.
            double cost = distance * costOfDistance + 0.6 * (1.0 - std::cos(angle));
            if (compact) cost += request.compactCost;
            if (!request.region.isEmpty()) cost += costOfLeavingRegion;
            consider({plate, anchor, request.clearance, distance > request.beside, compact}, cost);
        }
    }

    void tryWithin(const LabelRequest &request)
    {
        const QRectF extent = request.region.boundingRect();
        constexpr double step = 10.0;
        for (double y = extent.top(); y <= extent.bottom(); y += step)
            for (double x = extent.left(); x <= extent.right(); x += step) {
                QRectF plate(QPointF(), request.size);
                plate.moveCenter({x, y});
                double cost = 0.02 * QLineF(plate.center(), request.anchors.front()).length();
                for (const QPointF corner :
                     {plate.topLeft(), plate.topRight(), plate.bottomLeft(), plate.bottomRight()})
                    if (!request.region.containsPoint(corner, Qt::OddEvenFill)) cost += costOfCornerOutside;
                consider({.plate = plate, .anchor = plate.center()}, cost);
            }
    }

    void consider(const Candidate &candidate, double cost)
    {
        if (cost >= m_bestCost) return;
        const QRectF plate = movedInside(candidate.plate, m_bounds);
        const double moved = QLineF(plate.center(), candidate.plate.center()).length();
        if (moved > nudge || !m_bounds.adjusted(-0.5, -0.5, 0.5, 0.5).contains(plate)) return;
        if (moved > 0.0 && plate.adjusted(-4, -4, 4, 4).contains(candidate.anchor)) return;
        const QRectF wide = plate.adjusted(-3, -3, 3, 3);
        cost += costOfLineCell * m_density.inside(wide);
        if (cost >= m_bestCost) return;
        for (const auto &block : m_blocks)
            if (const double area = overlap(wide, block); area > 0.0) cost += costOfBlock + area;
        for (const auto &leader : m_leaders)
            if (crosses(leader, plate)) cost += costOfCrossedPlate;
        if (cost >= m_bestCost) return;
        std::optional<QLineF> leader;
        if (candidate.wantsLeader) {
            leader = leaderOf(plate, candidate.anchor, candidate.clearance);
            cost += costOfLeader + leaderCost(*leader);
        } else if (candidate.clearance > 0.0 && isNearerToAnother(plate, candidate.anchor)) {
            cost += costOfDoubt;
        }
        if (cost >= m_bestCost) return;
        m_bestCost = cost;
        m_best = LabelPlace{plate, leader, candidate.isCompact};
    }

    [[nodiscard]] bool isNearerToAnother(const QRectF &plate, QPointF anchor) const
    {
        const double own = distanceFrom(plate, anchor);
        return std::any_of(m_things.begin(), m_things.end(), [&](QPointF thing) {
            return QLineF(thing, anchor).length() > 1.0 && distanceFrom(plate, thing) < own - 1.0;
        });
    }

    [[nodiscard]] double leaderCost(const QLineF &leader) const
    {
        double cost = 0.0;
        for (const auto &block : m_blocks)
            if (!block.contains(leader.p2()) && crosses(leader, block)) cost += costOfCrossedPlate;
        for (const auto &other : m_leaders)
            if (leader.intersects(other, nullptr) == QLineF::BoundedIntersection) cost += costOfCrossedPlate;
        // The last stretch reaches the thing itself and does not count.
        const int steps = static_cast<int>((leader.length() - 12.0) / 8.0);
        for (int step = 0; step < steps; ++step)
            if (m_density.inside(QRectF(leader.pointAt((step + 0.5) * 8.0 / leader.length()), QSizeF(1, 1))) >=
                LineDensity::lineWeight)
                cost += costOfCrossedCell;
        return cost;
    }

    QRectF m_bounds;
    LineDensity m_density;
    std::vector<QRectF> m_blocks;
    std::vector<QPointF> m_things;
    std::vector<QLineF> m_leaders;
    std::optional<LabelPlace> m_best;
    double m_bestCost = 0.0;
};

} // namespace

std::vector<std::optional<LabelPlace>> labelPlaces(const std::vector<LabelRequest> &requests, const Occupied &occupied)
{
    Placement placement(occupied);
    std::vector<std::optional<LabelPlace>> places;
    places.reserve(requests.size());
    for (const auto &request : requests) places.push_back(placement.place(request));
    return places;
}

} // namespace quasistat::ui
