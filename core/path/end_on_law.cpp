#include "core/path/end_on_law.h"

#include "core/gas/solve/solve.h"
#include "core/path/search_on_law.h"

#include <cmath>

namespace quasistat::path
{
namespace
{

using gas::MolarState;
using gas::Property;
using units::Quantity;

std::string pointerOf(EndKey key)
{
    return "/end/" + std::string(keyOf(key));
}

Failure undetermined(EndKey key, const char *why)
{
    return {Reason::undetermined, pointerOf(key), {why, {}}};
}

/// One end on one law. Each member answers for one key; the laws that have no such end never get here (endChoice).
class Ending
{
public:
    Ending(const gas::State &from, const Law &law, EndKey key, double value, std::optional<Direction> direction)
        : m_from(from), m_start(from.molar()), m_law(law), m_key(key), m_value(value), m_direction(direction)
    {
    }

    Outcome<EndPoint> point() const
    {
        switch (m_key) {
        case EndKey::volume: return atVolume(m_value / m_from.amount());
        case EndKey::volumeRatio: return atVolume(m_value * m_start.molarVolume);
        case EndKey::pressure: return atPressure(m_value);
        case EndKey::pressureRatio: return atPressure(m_value * m_start.pressure);
        case EndKey::temperature: return atTemperature();
        case EndKey::work: return afterWork();
        case EndKey::heat: return afterHeat();
        }
        return Failure{Reason::unknownName, pointerOf(m_key), {"this kind has no such end", {}}};
    }

private:
    Outcome<EndPoint> atCoordinate(double x) const
    {
        if (!(std::abs(x) <= farthestCoordinate))
            return unreachable(m_key, m_value, {"the volume would change by more than 26 decades", {}});
        const auto point = QuasiStaticCurve(m_from.sharedGas(), m_from.amount(), m_start, m_law, x).at(x);
        if (!point) return unreachable(m_key, m_value, point.failure().message);
        return EndPoint{x, point->state, {}};
    }

    /// The state with two given properties, as a point of the law it is known to lie on.
    Outcome<EndPoint> atState(gas::Given first, gas::Given second) const
    {
        const auto state = gas::stateFrom(m_from.gas(), first, second, &m_start);
        if (!state) return unreachable(m_key, m_value, state.failure().message);
        const bool isochoric = std::holds_alternative<ConstantVolume>(m_law);
        const double x = isochoric ? std::log(state->temperature / m_start.temperature)
                                   : std::log(state->molarVolume / m_start.molarVolume);
        if (!(std::abs(x) <= farthestCoordinate))
            return unreachable(m_key, m_value, {"the volume would change by more than 26 decades", {}});
        return EndPoint{x, *state, {}};
    }

    Outcome<EndPoint> atVolume(double molarVolume) const
    {
        if (!(molarVolume > 0.0)) return unreachable(m_key, m_value, {"a volume must stay above zero", {}});
        return atCoordinate(std::log(molarVolume / m_start.molarVolume));
    }

    Outcome<EndPoint> atPressure(double pressure) const
    {
        const gas::Given given{Property::pressure, pressure};
        if (std::holds_alternative<ConstantTemperature>(m_law))
            return atState({Property::temperature, m_start.temperature}, given);
        if (std::holds_alternative<ConstantVolume>(m_law))
            return atState({Property::molarVolume, m_start.molarVolume}, given);
        if (std::holds_alternative<ConstantEntropy>(m_law)) return atState({Property::entropy, m_start.entropy}, given);
        if (const auto *power = std::get_if<PowerLaw>(&m_law)) {
            if (power->exponent == 0.0)
                return undetermined(m_key,
                                    "with exponent 0 the pressure does not change; end by volume or temperature");
            return atCoordinate(-std::log(pressure / m_start.pressure) / power->exponent);
        }
        if (const auto *line = std::get_if<StraightLine>(&m_law)) {
            if (line->stiffness == 0.0)
                return undetermined(m_key, "with stiffness 0 the pressure does not change; end by volume");
            return atVolume(m_start.molarVolume + (pressure - m_start.pressure) / line->stiffness);
        }
        return undetermined(m_key, "the pressure does not change on this segment");
    }

    Outcome<EndPoint> atTemperature() const
    {
        const gas::Given given{Property::temperature, m_value};
        if (std::holds_alternative<ConstantPressure>(m_law))
            return atState({Property::pressure, m_start.pressure}, given);
        if (std::holds_alternative<ConstantVolume>(m_law))
            return atState({Property::molarVolume, m_start.molarVolume}, given);
        if (std::holds_alternative<ConstantEntropy>(m_law)) return atState({Property::entropy, m_start.entropy}, given);
        if (const auto *power = std::get_if<PowerLaw>(&m_law)) {
            if (m_from.gas().isIdeal()) return atIdealTemperature(power->exponent);
            return search([](const CurveState &c) { return c.state.temperature; });
        }
        return undetermined(m_key, "the temperature does not change on this segment");
    }

    /// p v = R T on p vⁿ = constant: T/T₁ = (v/v₁)^(1−n).
    Outcome<EndPoint> atIdealTemperature(double exponent) const
    {
        if (exponent == 1.0)
            return undetermined(m_key,
                                "with exponent 1 the temperature of an ideal gas does not change: any end of this "
                                "segment has it; end by pressure or volume");
        return atCoordinate(std::log(m_value / m_start.temperature) / (1.0 - exponent));
    }

    Outcome<EndPoint> afterWork() const
    {
        const double molarWork = m_value / m_from.amount();
        const double pv = m_start.pressure * m_start.molarVolume;
        if (std::holds_alternative<ConstantPressure>(m_law)) {
            if (!(molarWork < pv))
                return unreachable(m_key, m_value,
                                   {"pressing the gas to no volume at all takes {0}",
                                    {Figure{Quantity::energy, pv * m_from.amount()}}});
            return atVolume(m_start.molarVolume - molarWork / m_start.pressure);
        }
        if (std::holds_alternative<ConstantEntropy>(m_law))
            return atState({Property::entropy, m_start.entropy},
                           {Property::internalEnergy, m_start.internalEnergy + molarWork});
        if (const auto *power = std::get_if<PowerLaw>(&m_law))
            return afterPowerLawWork(power->exponent, molarWork / pv);
        if (m_from.gas().isIdeal()) return atCoordinate(-molarWork / pv);
        // At constant temperature the work is the change of the Helmholtz energy.
        const double a1 = m_start.internalEnergy - m_start.temperature * m_start.entropy;
        const double n = m_from.amount();
        return search([a1, n](const CurveState &c) {
            return n * (c.state.internalEnergy - c.state.temperature * c.state.entropy - a1);
        });
    }

    /// W/(n p₁v₁) = (e^((1−n)x) − 1)/(n − 1), for any gas, since the law prescribes p(v).
    Outcome<EndPoint> afterPowerLawWork(double exponent, double ratio) const
    {
        const double k = exponent - 1.0;
        if (std::abs(k) < 1e-12) return atCoordinate(-ratio);
        const double argument = ratio * k;
        if (!(argument > -1.0))
            return unreachable(m_key, m_value,
                               {"the work on this segment can only approach {0}",
                                {Figure{Quantity::energy, -m_start.pressure * m_from.volume() / k}}});
        return atCoordinate(-std::log1p(argument) / k);
    }

    Outcome<EndPoint> afterHeat() const
    {
        const double molarHeat = m_value / m_from.amount();
        if (std::holds_alternative<ConstantTemperature>(m_law))
            return atState({Property::temperature, m_start.temperature},
                           {Property::entropy, m_start.entropy + molarHeat / m_start.temperature});
        if (std::holds_alternative<ConstantPressure>(m_law))
            return atState({Property::pressure, m_start.pressure}, {Property::enthalpy, m_start.enthalpy + molarHeat});
        if (std::holds_alternative<ConstantVolume>(m_law))
            return atState({Property::molarVolume, m_start.molarVolume},
                           {Property::internalEnergy, m_start.internalEnergy + molarHeat});
        if (const auto *power = std::get_if<PowerLaw>(&m_law)) return afterPowerLawHeat(power->exponent);
        return undetermined(m_key, "no heat is exchanged on this segment");
    }

    Outcome<EndPoint> afterPowerLawHeat(double exponent) const
    {
        const double u1 = m_start.internalEnergy;
        const double pv = m_start.pressure * m_start.molarVolume;
        const double n = m_from.amount();
        const double k = exponent - 1.0;
        const double v1 = m_start.molarVolume;
        return search([=](const CurveState &c) {
            const double x = std::log(c.state.molarVolume / v1);
            const double work = std::abs(k) < 1e-12 ? -pv * x : pv * std::expm1(-k * x) / k;
            return n * (c.state.internalEnergy - u1 - work);
        });
    }

    Outcome<EndPoint> search(const AlongCurve &figure) const
    {
        return searchOnLaw(m_from, m_law, m_key, m_value, figure, m_direction);
    }

    const gas::State &m_from;
    const MolarState &m_start;
    const Law &m_law;
    EndKey m_key;
    double m_value;
    std::optional<Direction> m_direction;
};

} // namespace

Failure unreachable(EndKey key, double value, const Message &why)
{
    return {Reason::unreachable, pointerOf(key),
            because({"the gas cannot reach {0} on this segment", {Figure{quantityOf(key), value}}}, why)};
}

Outcome<EndPoint> endOnLaw(const gas::State &from, const Law &law, EndKey key, double value,
                           std::optional<Direction> direction)
{
    return Ending(from, law, key, value, direction).point();
}

} // namespace quasistat::path
