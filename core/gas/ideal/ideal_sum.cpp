#include "core/gas/ideal/ideal_sum.h"

#include "core/gas/ideal/heat_capacity.h"

#include <algorithm>
#include <cassert>

namespace quasistat::gas
{
namespace
{

using FunctionPtr = std::shared_ptr<const IdealFunction>;

struct Part {
    FunctionPtr function;
    double weight;
};

class IdealSum final : public IdealFunction
{
public:
    explicit IdealSum(std::vector<Part> parts) : m_parts(std::move(parts))
    {
        for (const Part &part : m_parts)
            m_seams.insert(m_seams.end(), part.function->seams().begin(), part.function->seams().end());
        std::ranges::sort(m_seams);
        m_seams.erase(std::unique(m_seams.begin(), m_seams.end()), m_seams.end());
    }

    IdealProperties at(double temperature) const override
    {
        IdealProperties sum{0.0, 0.0, 0.0};
        for (const Part &part : m_parts) {
            const IdealProperties own = part.function->at(temperature);
            sum.heatCapacity += part.weight * own.heatCapacity;
            sum.enthalpy += part.weight * own.enthalpy;
            sum.entropy += part.weight * own.entropy;
        }
        return sum;
    }
    std::span<const double> seams() const override { return m_seams; }

private:
    std::vector<Part> m_parts;
    std::vector<double> m_seams;
};

} // namespace

FunctionPtr idealSum(const std::vector<FunctionPtr> &components, std::span<const double> weights)
{
    assert(components.size() == weights.size() && !components.empty());
    std::vector<Part> parts;
    std::vector<const HeatCapacity *> polynomials;
    std::vector<double> polynomialWeights;
    for (std::size_t i = 0; i < components.size(); ++i) {
        if (const auto *polynomial = dynamic_cast<const HeatCapacity *>(components[i].get())) {
            polynomials.push_back(polynomial);
            polynomialWeights.push_back(weights[i]);
        } else {
            parts.push_back({components[i], weights[i]});
        }
    }
    if (!polynomials.empty())
        parts.push_back({std::make_shared<HeatCapacity>(weightedSum(polynomials, polynomialWeights)), 1.0});
    if (parts.size() == 1 && parts.front().weight == 1.0) return parts.front().function;
    return std::make_shared<IdealSum>(std::move(parts));
}

} // namespace quasistat::gas
