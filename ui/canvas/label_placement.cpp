#include "ui/canvas/label_placement.h"

#include "ui/canvas/pixel_geometry.h"

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
    LineDensity(const QRectF &bounds, const std::vector<QPolygonF> &lines)
        : m_origin(bounds.topLeft()), m_columns(static_cast<int>(bounds.width() / cell) + 2),
          m_rows(static_cast<int>(bounds.height() / cell) + 2),
          m_sums(static_cast<std::size_t>(m_columns) * static_cast<std::size_t>(m_rows), 0)
    {
        for (const auto &line : lines) add(line);
        for (int row = 1; row < m_rows; ++row)
            for (int column = 1; column < m_columns; ++column)
                at(column, row) += at(column - 1, row) + at(column, row - 1) - at(column - 1, row - 1);
    }

    /// Length of line inside `rect`, in cells.
    [[nodiscard]] int inside(const QRectF &rect) const
    {
        const int left = column(rect.left()) - 1;
        const int right = column(rect.right());
        const int top = row(rect.top()) - 1;
        const int bottom = row(rect.bottom());
        return at(right, bottom) - at(left, bottom) - at(right, top) + at(left, top);
    }

private:
    static constexpr double cell = 4.0;

    [[nodiscard]] int column(double x) const
    {
        return std::clamp(static_cast<int>((x - m_origin.x()) / cell) + 1, 1, m_columns - 1);
    }
    [[nodiscard]] int row(double y) const
    {
        return std::clamp(static_cast<int>((y - m_origin.y()) / cell) + 1, 1, m_rows - 1);
    }
    [[nodiscard]] int &at(int column, int row) { return m_sums[static_cast<std::size_t>(row * m_columns + column)]; }
    [[nodiscard]] int at(int column, int row) const
    {
        return m_sums[static_cast<std::size_t>(row * m_columns + column)];
    }

    void add(const QPolygonF &line)
    {
        for (qsizetype i = 0; i + 1 < line.size(); ++i) {
            const QLineF piece(line.at(i), line.at(i + 1));
            const int steps = std::max(1, static_cast<int>(piece.length() / cell));
            for (int step = 0; step < steps; ++step) {
                const QPointF point = piece.pointAt((step + 0.5) / steps);
                ++at(column(point.x()), row(point.y()));
            }
        }
    }

    QPointF m_origin;
    int m_columns;
    int m_rows;
    std::vector<int> m_sums;
};

// Distances of the plate from its anchor's clearance [px], nearest first.
constexpr std::array distances{2.0, 10.0, 22.0, 38.0, 58.0, 82.0, 112.0, 150.0, 200.0, 260.0, 330.0};
constexpr double besideAtMost = 24.0; // farther away a label needs a leader
constexpr int directions = 16;

constexpr double costOfLineCell = 5.0;
constexpr double costOfBlock = 400.0;
constexpr double costOfDistance = 0.14;
constexpr double costOfLeader = 5.0;
constexpr double costOfCrossedPlate = 60.0;
constexpr double unacceptable = 400.0;

double overlap(const QRectF &first, const QRectF &second)
{
    const QRectF common = first.intersected(second);
    return common.isEmpty() ? 0.0 : common.width() * common.height();
}

bool crosses(const QLineF &line, const QRectF &rect)
{
    return !clippedLine(QPolygonF{line.p1(), line.p2()}, rect).isEmpty();
}

// From the plate's edge towards the anchor, ending where the anchor's own mark begins.
QLineF leaderOf(const QRectF &plate, const LabelRequest &request)
{
    const double inset = std::min(8.0, plate.width() / 2.0);
    const QPointF from(std::clamp(request.anchor.x(), plate.left() + inset, plate.right() - inset),
                       std::clamp(request.anchor.y(), plate.top(), plate.bottom()));
    QLineF leader(from, request.anchor);
    const double free = std::min(request.clearance * 0.6, leader.length());
    leader.setLength(std::max(0.0, leader.length() - free));
    return leader;
}

class Placement
{
public:
    explicit Placement(const Occupied &occupied)
        : m_bounds(occupied.bounds), m_density(occupied.bounds, occupied.lines), m_blocks(occupied.blocks)
    {
    }

    std::optional<LabelPlace> place(const LabelRequest &request)
    {
        m_best.reset();
        m_bestCost = std::numeric_limits<double>::infinity();
        if (request.region.isEmpty())
            tryAround(request);
        else
            tryWithin(request);
        if (!m_best || (request.optional && m_bestCost >= unacceptable)) return std::nullopt;
        m_blocks.push_back(m_best->plate);
        if (m_best->leader) m_leaders.push_back(*m_best->leader);
        return m_best;
    }

private:
    void tryAround(const LabelRequest &request)
    {
        for (const double distance : distances) {
            if (m_bestCost <= distance * costOfDistance) return; // no farther candidate can be better
            for (int direction = 0; direction < directions; ++direction) {
                const double angle = 2.0 * std::numbers::pi * direction / directions;
                const double reach = request.clearance + distance;
                const QPointF centre =
                    request.anchor + QPointF(std::cos(angle) * (request.size.width() / 2.0 + reach),
                                             -std::sin(angle) * (request.size.height() / 2.0 + reach));
                // To the right reads best; then, a little dearer, the other sides.
                consider(request, centre, distance, distance * costOfDistance + 0.6 * (1.0 - std::cos(angle)));
            }
        }
    }

    void tryWithin(const LabelRequest &request)
    {
        const QRectF extent = request.region.boundingRect();
        constexpr double step = 12.0;
        for (double y = extent.top(); y <= extent.bottom(); y += step)
            for (double x = extent.left(); x <= extent.right(); x += step) {
                const QPointF centre(x, y);
                const double outside = request.region.containsPoint(centre, Qt::OddEvenFill) ? 0.0 : 60.0;
                const double distance = QLineF(centre, request.anchor).length();
                consider(request, centre, 0.0, 0.25 * costOfDistance * distance + outside);
            }
    }

    void consider(const LabelRequest &request, QPointF centre, double distance, double cost)
    {
        QRectF plate(QPointF(), request.size);
        plate.moveCenter(centre);
        if (!m_bounds.contains(plate) || cost >= m_bestCost) return;
        cost += costOfLineCell * m_density.inside(plate.adjusted(-3, -3, 3, 3));
        if (cost >= m_bestCost) return;
        const QRectF wide = plate.adjusted(-3, -3, 3, 3);
        for (const auto &block : m_blocks)
            if (const double area = overlap(wide, block); area > 0.0) cost += costOfBlock + area;
        for (const auto &leader : m_leaders)
            if (crosses(leader, plate)) cost += costOfCrossedPlate;
        if (cost >= m_bestCost) return;
        std::optional<QLineF> leader;
        if (request.region.isEmpty() && distance > besideAtMost) {
            leader = leaderOf(plate, request);
            cost += costOfLeader + leaderCost(*leader);
        }
        if (cost >= m_bestCost) return;
        m_bestCost = cost;
        m_best = LabelPlace{plate, leader};
    }

    [[nodiscard]] double leaderCost(const QLineF &leader) const
    {
        double cost = 0.0;
        for (const auto &block : m_blocks)
            if (!block.contains(leader.p2()) && crosses(leader, block)) cost += costOfCrossedPlate;
        for (const auto &other : m_leaders)
            if (leader.intersects(other, nullptr) == QLineF::BoundedIntersection) cost += costOfCrossedPlate;
        return cost;
    }

    QRectF m_bounds;
    LineDensity m_density;
    std::vector<QRectF> m_blocks;
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
