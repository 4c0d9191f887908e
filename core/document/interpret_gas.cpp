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

/// How the shares of a mixture are meant.
struct Basis {
    FractionBasis fractions;
    std::string_view model; ///< whose gases these are
    const gas::Library &library;
};

bool isAir(std::string_view name)
{
    return name == "air" || name == "Air";
}

/// Adds `share` of the named gas, `air` as its parts.
Outcome<bool> addShare(Shares &shares, const std::string &name, double share, const Basis &basis)
{
    if (!isAir(name)) {
        const Outcome<std::string> component = basis.library.componentName(name, basis.model);
        if (!component) return component.failure();
        const bool isNew = shares.emplace(*component, share).second;
        if (!isNew) return fault(Reason::contradiction, "", "{0} stands twice in this composition", {*component});
        return true;
    }
    double total = 0.0;
    std::array<double, airShares.size()> weights{};
    for (std::size_t i = 0; i < airShares.size(); ++i) {
        const Outcome<double> molarMass = basis.library.molarMass(airShares[i].first, basis.model);
        if (!molarMass) return molarMass.failure();
        weights[i] = airShares[i].second * (basis.fractions == FractionBasis::mass ? *molarMass : 1.0);
        total += weights[i];
    }
    for (std::size_t i = 0; i < airShares.size(); ++i) shares[airShares[i].first] += share * weights[i] / total;
    return true;
}

/// Mole fractions from mass fractions: x_i ∝ w_i/M_i.
Outcome<Shares> moleFractions(Shares shares, const Basis &basis)
{
    double total = 0.0;
    for (auto &[name, share] : shares) {
        if (basis.fractions == FractionBasis::mass) {
            const Outcome<double> molarMass = basis.library.molarMass(name, basis.model);
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

/// A composition and the place it stands at.
struct PlacedComposition {
    Place place;
    gas::Composition composition;
};

/// `composition` or `composition_by_mass` of a gas that has no other keys.
Outcome<PlacedComposition> mixtureFrom(const Fields &fields, std::string_view model, const gas::Library &library,
                                       Warnings &warnings)
{
    fields.warnOfUnknown({keys::mixture}, warnings);
    const bool byMass = fields.has("composition_by_mass");
    if (byMass && fields.has("composition"))
        return fault(Reason::contradiction, fields.pointerTo("composition_by_mass"),
                     "“composition” and “composition_by_mass” exclude each other: remove one");
    const Outcome<Place> place = fields.required(byMass ? "composition_by_mass" : "composition");
    if (!place) return place.failure();
    Outcome<gas::Composition> composition =
        compositionFrom(*place, byMass ? FractionBasis::mass : FractionBasis::amount, model, library, warnings);
    if (!composition) return composition.failure();
    return PlacedComposition{*place, std::move(*composition)};
}

Outcome<gas::GasPtr> idealFrom(const Fields &fields, const gas::Library &library, Warnings &warnings)
{
    const Outcome<PlacedComposition> mixture = mixtureFrom(fields, "ideal", library, warnings);
    if (!mixture) return mixture.failure();
    Outcome<gas::GasPtr> gas = library.idealGas(mixture->composition, mixtureName(mixture->composition));
    if (!gas) return at(mixture->place.pointer, gas.failure());
    return gas;
}

Outcome<gas::GasPtr> gergFrom(const Fields &fields, const gas::Library &library, Warnings &warnings)
{
    const Outcome<PlacedComposition> mixture = mixtureFrom(fields, "gerg-2008", library, warnings);
    if (!mixture) return mixture.failure();
    Outcome<gas::GasPtr> gas = library.gerg2008(mixture->composition, mixtureName(mixture->composition));
    if (!gas) return at(mixture->place.pointer, gas.failure());
    return gas;
}

Outcome<gas::GasPtr> referenceGasFrom(const Fields &fields, const gas::Library &library, Warnings &warnings)
{
    fields.warnOfUnknown({keys::referenceGas}, warnings);
    const Outcome<Place> place = fields.required("fluid");
    if (!place) return place.failure();
    const Outcome<std::string> fluid = textAt(*place);
    if (!fluid) return fluid.failure();
    const Outcome<std::string> name = library.componentName(*fluid, "reference");
    if (!name) return at(place->pointer, name.failure());
    Outcome<gas::GasPtr> gas = library.reference(*name);
    if (!gas) return at(place->pointer, gas.failure());
    return gas;
}

} // namespace

Outcome<gas::Composition> compositionFrom(const Place &place, FractionBasis fractionBasis, std::string_view model,
                                          const gas::Library &library, Warnings &warnings)
{
    const Basis basis{fractionBasis, model, library};
    const Outcome<Fields> fields = Fields::of(place);
    if (!fields) return fields.failure();
    Shares shares;
    double sum = 0.0;
    for (const auto &item : place.value->items()) {
        const Place entry{&item.value(), fields->pointerTo(item.key())};
        const Outcome<double> fraction = fractionAt(entry);
        if (!fraction) return fraction.failure();
        const Outcome<bool> added = addShare(shares, item.key(), *fraction, basis);
        if (!added) return at(entry.pointer, added.failure());
        sum += *fraction;
    }
    if (std::abs(sum - 1.0) > toleratedSum)
        return fault(Reason::contradiction, place.pointer, "these fractions sum to {0}, not to 1",
                     {fmt::format("{:.6g}", sum)});
    if (std::abs(sum - 1.0) > rounding)
        warnings.push_back(
            remark(place.pointer, "these fractions sum to {0} and are divided by it", {fmt::format("{:.8g}", sum)}));
    Outcome<Shares> fractions = moleFractions(std::move(shares), basis);
    if (!fractions) return at(place.pointer, fractions.failure());
    gas::Composition composition;
    for (const auto &[name, share] : *fractions)
        if (share > 0.0) composition.push_back({name, share});
    return composition;
}

std::string mixtureName(const gas::Composition &composition)
{
    if (composition.size() == 1) return composition.front().component;
    const auto isAirShare = [&](const gas::Share &share) {
        const auto part = std::ranges::find(airShares, share.component, [](const auto &p) { return p.first; });
        return part != airShares.end() && std::abs(part->second - share.moleFraction) < 1e-9;
    };
    if (composition.size() == airShares.size() && std::ranges::all_of(composition, isAirShare)) return "air";

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
    if (*model == "gerg-2008") return gergFrom(*fields, library, warnings);
    if (*model == "reference") return referenceGasFrom(*fields, library, warnings);
    if (std::ranges::find(keys::models, *model) != keys::models.end())
        return notComputed(modelPlace->pointer, "the gas model “" + *model + "”");
    return unknownName(modelPlace->pointer, "gas model", *model, keys::models);
}

} // namespace quasistat::document
