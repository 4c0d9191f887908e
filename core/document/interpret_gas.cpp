#include "core/document/faults.h"
#include "core/document/interpret_parts.h"

#include <fmt/format.h>

#include <algorithm>
#include <array>
#include <cmath>
#include <map>

namespace quasistat::document
{

namespace
{

constexpr double toleratedSum = 1e-4; // of the format
constexpr double rounding = 1e-12;    // decimal fractions that sum to 1 on paper

/// Dry air of the format, `simple_3` of the polynomials' data (composition of the air model of Lemmon et al., 2000).
constexpr std::array airShares{std::pair{"nitrogen", 0.7812}, std::pair{"oxygen", 0.2096}, std::pair{"argon", 0.0092}};

using Shares = std::map<std::string, double>;

/// Adds `share` of the named gas, `air` as its parts.
Outcome<bool> addShare(Shares &shares, const std::string &name, double share, FractionBasis basis,
                       const gas::Library &library)
{
    if (name != "air") {
        const Outcome<std::string> component = library.componentName(name);
        if (!component) return component.failure();
        const bool isNew = shares.emplace(*component, share).second;
        if (!isNew) return fault(Reason::contradiction, "", "{0} stands twice in this composition", {*component});
        return true;
    }
    double total = 0.0;
    std::array<double, airShares.size()> weights{};
    for (std::size_t i = 0; i < airShares.size(); ++i) {
        const Outcome<double> molarMass = library.molarMass(airShares[i].first);
        if (!molarMass) return molarMass.failure();
        weights[i] = airShares[i].second * (basis == FractionBasis::mass ? *molarMass : 1.0);
        total += weights[i];
    }
    for (std::size_t i = 0; i < airShares.size(); ++i) shares[airShares[i].first] += share * weights[i] / total;
    return true;
}

/// Mole fractions from mass fractions: x_i ∝ w_i/M_i.
Outcome<Shares> moleFractions(Shares shares, FractionBasis basis, const gas::Library &library)
{
    double total = 0.0;
    for (auto &[name, share] : shares) {
        if (basis == FractionBasis::mass) {
            const Outcome<double> molarMass = library.molarMass(name);
            if (!molarMass) return molarMass.failure();
            share /= *molarMass;
        }
        total += share;
    }
    for (auto &[name, share] : shares) share /= total;
    return shares;
}

Outcome<double> fractionAt(const Place &place)
{
    const Outcome<double> fraction = numberAt(place);
    if (fraction && !(*fraction >= 0.0 && *fraction <= 1.0))
        return fault(Reason::outOfRange, place.pointer, "a fraction lies between 0 and 1");
    return fraction;
}

Outcome<gas::GasPtr> perfectFrom(const Fields &fields, Warnings &warnings)
{
    fields.warnOfUnknown({keys::perfectGas}, warnings);
    const Outcome<Place> ratioPlace = fields.required("heat_capacity_ratio");
    if (!ratioPlace) return ratioPlace.failure();
    const Outcome<double> ratio = numberAt(*ratioPlace);
    if (!ratio) return ratio.failure();
    const Outcome<Place> massPlace = fields.required("molar_mass");
    if (!massPlace) return massPlace.failure();
    const Outcome<double> molarMass = positiveQuantityAt(*massPlace, units::Quantity::molarMass, {1.0, 1.0});
    if (!molarMass) return molarMass.failure();
    const Outcome<std::optional<std::string>> name = fields.text("name");
    if (!name) return name.failure();
    Outcome<gas::GasPtr> gas =
        gas::perfectGas({.heatCapacityRatio = *ratio, .molarMass = *molarMass, .name = name->value_or(std::string())});
    if (!gas) return at(fields.pointer(), gas.failure());
    return gas;
}

Outcome<gas::GasPtr> idealFrom(const Fields &fields, const gas::Library &library, Warnings &warnings)
{
    fields.warnOfUnknown({keys::idealGas}, warnings);
    const bool byMass = fields.has("composition_by_mass");
    if (byMass && fields.has("composition"))
        return fault(Reason::contradiction, fields.pointerTo("composition_by_mass"),
                     "“composition” and “composition_by_mass” exclude each other: remove one");
    const Outcome<Place> place = fields.required(byMass ? "composition_by_mass" : "composition");
    if (!place) return place.failure();
    const Outcome<gas::Composition> composition =
        compositionFrom(*place, byMass ? FractionBasis::mass : FractionBasis::amount, library, warnings);
    if (!composition) return composition.failure();
    Outcome<gas::GasPtr> gas = library.idealGas(*composition, mixtureName(*composition, library));
    if (!gas) return at(place->pointer, gas.failure());
    return gas;
}

} // namespace

Outcome<gas::Composition> compositionFrom(const Place &place, FractionBasis basis, const gas::Library &library,
                                          Warnings &warnings)
{
    const Outcome<Fields> fields = Fields::of(place);
    if (!fields) return fields.failure();
    Shares shares;
    double sum = 0.0;
    for (const auto &item : place.value->items()) {
        const Place entry{&item.value(), fields->pointerTo(item.key())};
        const Outcome<double> fraction = fractionAt(entry);
        if (!fraction) return fraction.failure();
        const Outcome<bool> added = addShare(shares, item.key(), *fraction, basis, library);
        if (!added) return at(entry.pointer, added.failure());
        sum += *fraction;
    }
    if (std::abs(sum - 1.0) > toleratedSum)
        return fault(Reason::contradiction, place.pointer, "these fractions sum to {0}, not to 1",
                     {fmt::format("{:.6g}", sum)});
    if (std::abs(sum - 1.0) > rounding)
        warnings.push_back(
            remark(place.pointer, "these fractions sum to {0} and are divided by it", {fmt::format("{:.8g}", sum)}));
    Outcome<Shares> fractions = moleFractions(std::move(shares), basis, library);
    if (!fractions) return at(place.pointer, fractions.failure());
    gas::Composition composition;
    for (const auto &[name, share] : *fractions)
        if (share > 0.0) composition.push_back({name, share});
    return composition;
}

std::string mixtureName(const gas::Composition &composition, const gas::Library &library)
{
    if (composition.size() == 1) return composition.front().component;
    Shares air;
    const bool isKnown = addShare(air, "air", 1.0, FractionBasis::amount, library).ok();
    const auto isAirShare = [&](const gas::Share &share) {
        const auto found = air.find(share.component);
        return found != air.end() && std::abs(found->second - share.moleFraction) < 1e-9;
    };
    if (isKnown && composition.size() == air.size() && std::ranges::all_of(composition, isAirShare)) return "air";

    gas::Composition sorted = composition;
    std::ranges::stable_sort(sorted, std::greater<>{}, &gas::Share::moleFraction);
    std::string name;
    for (const gas::Share &share : sorted) {
        // Two decimals as the trade writes a mixture, more only where they carry something.
        std::string digits = fmt::format("{:.4f}", share.moleFraction);
        while (digits.size() > 4 && digits.back() == '0') digits.pop_back();
        name += (name.empty() ? "" : ", ") + share.component + " " + digits;
    }
    return name;
}

Outcome<gas::GasPtr> gasFrom(const Place &place, const gas::Library &library, Warnings &warnings)
{
    const Outcome<Fields> fields = Fields::of(place);
    if (!fields) return fields.failure();
    const Outcome<Place> modelPlace = fields->required("model");
    if (!modelPlace) return modelPlace.failure();
    const Outcome<std::string> model = textAt(*modelPlace);
    if (!model) return model.failure();
    if (*model == "perfect") return perfectFrom(*fields, warnings);
    if (*model == "ideal") return idealFrom(*fields, library, warnings);
    if (std::ranges::find(keys::models, *model) != keys::models.end())
        return notComputed(modelPlace->pointer, "the gas model “" + *model + "”");
    return unknownName(modelPlace->pointer, "gas model", *model, keys::models);
}

} // namespace quasistat::document
