#include "core/gas/ideal/heat_capacity.h"

#include "core/gas/constants.h"

#include <algorithm>
#include <cassert>
#include <cmath>

namespace quasistat::gas
{
namespace
{

IdealProperties valueOn(const HeatCapacityPiece &piece, double t)
{
    // Horner's scheme for all three at once, from the highest power down.
    double heatCapacity = 0.0;
    double enthalpy = 0.0;
    double entropy = 0.0;
    for (std::size_t k = piece.a.size(); k-- > 0;) {
        const double a = piece.a[k];
        const auto power = static_cast<double>(k);
        heatCapacity = heatCapacity * t + a;
        enthalpy = enthalpy * t + a / (power + 1.0);
        if (k > 0) entropy = entropy * t + a / power;
    }
    return {heatCapacity, piece.enthalpyConstant + t * enthalpy,
            piece.entropyConstant + piece.a.front() * std::log(t) + t * entropy};
}

void joinTo(HeatCapacityPiece &piece, const HeatCapacityPiece &neighbour, double seam)
{
    const IdealProperties there = valueOn(neighbour, seam);
    const IdealProperties here = valueOn(piece, seam);
    piece.enthalpyConstant += there.enthalpy - here.enthalpy;
    piece.entropyConstant += there.entropy - here.entropy;
}

} // namespace

HeatCapacity::HeatCapacity(std::vector<HeatCapacityPiece> pieces) : m_pieces(std::move(pieces))
{
    assert(!m_pieces.empty());
    assert(std::ranges::none_of(m_pieces, [](const HeatCapacityPiece &piece) { return piece.a.empty(); }));
    for (std::size_t i = 1; i < m_pieces.size(); ++i) {
        assert(m_pieces[i].from == m_pieces[i - 1].to);
        m_seams.push_back(m_pieces[i].from);
        joinTo(m_pieces[i], m_pieces[i - 1], m_pieces[i].from);
    }
    const IdealProperties zero = valueOn(pieceAt(referenceTemperature), referenceTemperature);
    for (HeatCapacityPiece &piece : m_pieces) {
        piece.enthalpyConstant -= zero.enthalpy;
        piece.entropyConstant -= zero.entropy;
    }
}

const HeatCapacityPiece &HeatCapacity::pieceAt(double temperature) const
{
    // A handful of pieces: walking them is quicker than a search.
    for (std::size_t i = 0; i + 1 < m_pieces.size(); ++i)
        if (temperature <= m_pieces[i].to) return m_pieces[i];
    return m_pieces.back();
}

IdealProperties HeatCapacity::at(double temperature) const
{
    return valueOn(pieceAt(temperature), temperature);
}

HeatCapacity weightedSum(const std::vector<const HeatCapacity *> &components, const std::vector<double> &weights)
{
    assert(components.size() == weights.size() && !components.empty());
    std::vector<double> cuts;
    for (const HeatCapacity *component : components) {
        cuts.push_back(component->pieces().front().from);
        cuts.push_back(component->pieces().back().to);
        cuts.insert(cuts.end(), component->seams().begin(), component->seams().end());
    }
    std::sort(cuts.begin(), cuts.end());
    cuts.erase(std::unique(cuts.begin(), cuts.end()), cuts.end());

    std::vector<HeatCapacityPiece> pieces;
    for (std::size_t i = 0; i + 1 < cuts.size(); ++i) {
        HeatCapacityPiece sum{.from = cuts[i], .to = cuts[i + 1], .a = {}};
        const double middle = 0.5 * (cuts[i] + cuts[i + 1]);
        for (std::size_t c = 0; c < components.size(); ++c) {
            const auto &own = components[c]->pieces();
            const auto piece = std::find_if(own.begin(), own.end(), [&](const auto &p) { return middle <= p.to; });
            assert(piece != own.end());
            if (sum.a.size() < piece->a.size()) sum.a.resize(piece->a.size());
            for (std::size_t k = 0; k < piece->a.size(); ++k) sum.a[k] += weights[c] * piece->a[k];
        }
        pieces.push_back(sum);
    }
    return HeatCapacity(std::move(pieces));
}

} // namespace quasistat::gas
