#include "core/document/own_gases.h"

#include "core/document/faults.h"

#include <algorithm>
#include <cmath>

namespace quasistat::document
{

namespace
{

constexpr units::Conversion noConversion{0.0, 1.0}; // nothing here is relative to the surroundings or by mass

/// A quantity above zero; a gauge pressure is refused, since no gas's property depends on the weather.
Outcome<std::optional<double>> positive(const Fields &fields, std::string_view key, units::Quantity quantity)
{
    const std::optional<Place> place = fields.find(key);
    if (!place) return std::optional<double>();
    if (place->value->is_string()) {
        const Outcome<units::Measure> measure = units::measured(place->value->get<std::string>(), quantity);
        if (measure && measure->basis == units::Basis::gauge)
            return fault(Reason::wrongType, place->pointer, "write this as an absolute pressure, not as “{0}”",
                         {measure->unit});
    }
    const Outcome<double> value = positiveQuantityAt(*place, quantity, noConversion);
    if (!value) return value.failure();
    return std::optional(*value);
}

Outcome<std::optional<double>> acentricFactorFrom(const Fields &fields)
{
    const std::optional<Place> place = fields.find("acentric_factor");
    if (!place) return std::optional<double>();
    const Outcome<double> value = numberAt(*place);
    if (!value) return value.failure();
    if (!(*value > -1.0 && *value < 2.0))
        return fault(Reason::outOfRange, place->pointer,
                     "an acentric factor lies between −1 and 2 (argon 0, water 0.344)");
    return std::optional(*value);
}

Outcome<double> requiredTemperature(const Fields &fields, std::string_view key)
{
    const Outcome<Place> place = fields.required(key);
    if (!place) return place.failure();
    return positiveQuantityAt(*place, units::Quantity::temperature, noConversion);
}

Outcome<gas::StatedHeatCapacity> heatCapacityFrom(const Place &place, Warnings &warnings)
{
    const Outcome<Fields> fields = Fields::of(place);
    if (!fields) return fields.failure();
    fields->warnOfUnknown({keys::heatCapacity}, warnings);
    const Outcome<Place> list = fields->required("cp_over_R");
    if (!list) return list.failure();
    if (!list->value->is_array())
        return fault(Reason::wrongType, list->pointer, "here stands {0}, not a list of coefficients: [a0, a1, …]",
                     {typeWords(*list->value)});
    gas::StatedHeatCapacity stated{};
    for (std::size_t k = 0; k < list->value->size(); ++k) {
        const Outcome<double> coefficient = numberAt({&(*list->value)[k], list->pointer + "/" + std::to_string(k)});
        if (!coefficient) return coefficient.failure();
        stated.coefficients.push_back(*coefficient);
    }
    const Outcome<double> from = requiredTemperature(*fields, "from");
    if (!from) return from.failure();
    const Outcome<double> to = requiredTemperature(*fields, "to");
    if (!to) return to.failure();
    stated.from = *from;
    stated.to = *to;
    return stated;
}

Outcome<OwnGas> ownGasFrom(const Place &place, Warnings &warnings)
{
    const Outcome<Fields> fields = Fields::of(place);
    if (!fields) return fields.failure();
    fields->warnOfUnknown({keys::ownGas}, warnings);
    OwnGas own{.pointer = place.pointer};
    struct Row {
        std::string_view key;
        units::Quantity quantity;
        std::optional<double> OwnGas::*value;
    };
    for (const Row &row : {Row{"critical_temperature", units::Quantity::temperature, &OwnGas::criticalTemperature},
                           Row{"critical_pressure", units::Quantity::pressure, &OwnGas::criticalPressure},
                           Row{"molar_mass", units::Quantity::molarMass, &OwnGas::molarMass}}) {
        const auto value = positive(*fields, row.key, row.quantity);
        if (!value) return value.failure();
        own.*row.value = *value;
    }
    const auto acentricFactor = acentricFactorFrom(*fields);
    if (!acentricFactor) return acentricFactor.failure();
    own.acentricFactor = *acentricFactor;
    if (const std::optional<Place> capacity = fields->find("heat_capacity")) {
        const Outcome<gas::StatedHeatCapacity> stated = heatCapacityFrom(*capacity, warnings);
        if (!stated) return stated.failure();
        auto ideal = gas::idealFunctionOf(*stated);
        if (!ideal) return at(capacity->pointer, ideal.failure());
        own.heatCapacity = *stated;
        own.ideal = *ideal;
    }
    return own;
}

Failure nowhere(const OwnGas &own, const std::string &name, std::string_view key)
{
    return fault(Reason::missing, own.pointer, "“{0}” is missing here: the library does not know it of {1}",
                 {std::string(key), name});
}

} // namespace

Outcome<CubicGases> CubicGases::from(const std::optional<Place> &components, gas::CubicForm form,
                                     const gas::Library &library, Warnings &warnings)
{
    CubicGases gases(form, library);
    if (!components) return gases;
    const Outcome<Fields> fields = Fields::of(*components);
    if (!fields) return fields.failure();
    for (const auto &item : components->value->items()) {
        const Place place{&item.value(), fields->pointerTo(item.key())};
        if (item.key().empty() || item.key().find('/') != std::string::npos)
            return fault(Reason::syntax, place.pointer,
                         "the name of a gas may not be empty or hold “/”, which parts the gases of a pair");
        const Outcome<OwnGas> own = ownGasFrom(place, warnings);
        if (!own) return own.failure();
        const Outcome<std::string> known = library.componentName(item.key());
        const std::string name = known ? *known : item.key();
        if (known)
            warnings.push_back(
                remark(place.pointer, "what is stated here of {0} replaces the library's values", {name}));
        if (!gases.m_own.emplace(name, *own).second)
            return fault(Reason::contradiction, place.pointer, "{0} is stated twice here", {name});
    }
    return gases;
}

bool CubicGases::isOwn(std::string_view typed) const
{
    if (m_own.contains(std::string(typed))) return true;
    const Outcome<std::string> known = m_library->componentName(typed);
    return known && m_own.contains(*known);
}

Outcome<std::string> CubicGases::name(std::string_view typed) const
{
    // The user's own names stand as they are written; by another name or its formula, a gas of the library.
    if (m_own.contains(std::string(typed))) return std::string(typed);
    const Outcome<std::string> known = m_library->componentName(typed);
    if (known && m_own.contains(*known)) return *known;
    Outcome<std::string> name = m_library->componentName(typed, gas::keyOf(m_form));
    if (name || !known) return name;
    return fault(Reason::missing, "",
                 "no heat capacity of {0} is known here: state “heat_capacity” of it under “components”", {*known});
}

Outcome<double> CubicGases::molarMass(std::string_view name) const
{
    const auto own = m_own.find(std::string(name));
    if (own != m_own.end() && own->second.molarMass) return *own->second.molarMass;
    const auto found = component(std::string(name));
    if (!found) return found.failure();
    return found->critical.molarMass;
}

Outcome<gas::CubicComponent> CubicGases::component(const std::string &name) const
{
    if (const auto own = m_own.find(name); own != m_own.end()) return stated(name, own->second);
    const auto data = m_library->data(name, gas::keyOf(m_form));
    if (!data) return data.failure();
    return gas::cubicComponent(**data);
}

Outcome<gas::CubicComponent> CubicGases::stated(const std::string &name, const OwnGas &own) const
{
    const auto data = m_library->data(name);
    const gas::GasData *known = data ? data->get() : nullptr;
    const gas::CriticalConstants *critical = known && known->critical ? &*known->critical : nullptr;

    gas::CubicComponent component{.name = name, .critical = {}, .ideal = {}, .idealRange = {}, .idealSource = {}};
    bool isAllStated = true;
    struct Row {
        std::string_view key;
        const std::optional<double> &own;
        double gas::CriticalConstants::*value;
    };
    for (const Row &row : {Row{"critical_temperature", own.criticalTemperature, &gas::CriticalConstants::temperature},
                           Row{"critical_pressure", own.criticalPressure, &gas::CriticalConstants::pressure},
                           Row{"acentric_factor", own.acentricFactor, &gas::CriticalConstants::acentricFactor},
                           Row{"molar_mass", own.molarMass, &gas::CriticalConstants::molarMass}}) {
        if (!row.own && !critical) return nowhere(own, name, row.key);
        component.critical.*row.value = row.own ? *row.own : critical->*row.value;
        isAllStated = isAllStated && row.own;
    }
    component.critical.source = "as stated for " + name;
    if (!isAllStated) component.critical.source += ", else " + critical->source;

    if (own.ideal) {
        component.ideal = own.ideal;
        component.idealRange = {own.heatCapacity->from, own.heatCapacity->to, INFINITY};
        component.idealSource = "as stated for " + name;
        return component;
    }
    if (!known || !(known->idealGas || known->reference)) return nowhere(own, name, "heat_capacity");
    gas::GasData capacityData = *known;
    capacityData.critical = component.critical;
    const gas::CubicComponent published = gas::cubicComponent(capacityData);
    component.ideal = published.ideal;
    component.idealRange = published.idealRange;
    component.idealSource = published.idealSource;
    return component;
}

} // namespace quasistat::document
