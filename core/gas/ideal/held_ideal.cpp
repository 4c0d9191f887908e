#include "core/gas/ideal/held_ideal.h"

#include "core/gas/constants.h"

#include <cassert>
#include <cmath>
#include <vector>

namespace quasistat::gas
{
namespace
{

class HeldIdeal final : public IdealFunction
{
public:
    HeldIdeal(std::shared_ptr<const IdealFunction> function, double from, double to)
        : m_function(std::move(function)), m_from(from), m_to(to), m_atFrom(m_function->at(from)),
          m_atTo(m_function->at(to)), m_seams{from}
    {
        assert(from < to);
        for (const double seam : m_function->seams())
            if (seam > from && seam < to) m_seams.push_back(seam);
        m_seams.push_back(to);
        const IdealProperties zero = unshifted(referenceTemperature);
        m_enthalpy = zero.enthalpy;
        m_entropy = zero.entropy;
    }

    IdealProperties at(double temperature) const override
    {
        const IdealProperties value = unshifted(temperature);
        return {value.heatCapacity, value.enthalpy - m_enthalpy, value.entropy - m_entropy};
    }
    std::span<const double> seams() const override { return m_seams; }

private:
    IdealProperties unshifted(double temperature) const
    {
        if (temperature < m_from) return carriedOn(m_atFrom, m_from, temperature);
        if (temperature > m_to) return carriedOn(m_atTo, m_to, temperature);
        return m_function->at(temperature);
    }

    static IdealProperties carriedOn(const IdealProperties &end, double at, double temperature)
    {
        return {end.heatCapacity, end.enthalpy + end.heatCapacity * (temperature - at),
                end.entropy + end.heatCapacity * std::log(temperature / at)};
    }

    std::shared_ptr<const IdealFunction> m_function;
    double m_from;
    double m_to;
    IdealProperties m_atFrom;
    IdealProperties m_atTo;
    double m_enthalpy = 0.0;
    double m_entropy = 0.0;
    std::vector<double> m_seams;
};

} // namespace

std::shared_ptr<const IdealFunction> heldIdeal(std::shared_ptr<const IdealFunction> function, double from, double to)
{
    return std::make_shared<HeldIdeal>(std::move(function), from, to);
}

} // namespace quasistat::gas
