// Compositions by mole fractions or by mass.

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
    const KnownGases &gases;
};

bool isAir(std::string_view name)
{
    return name == "air" || name == "Air";
}

/// Adds `share` of the named gas, `air` as its parts.
Outcome<bool> addShare(Shares &shares, const std::string &name, double share, const Basis &basis)
{
    if (!isAir(name) || basis.gases.isOwn(name)) {
        const Outcome<std::string> component = basis.gases.name(name);
        if (!component) return component.failure();
        const bool isNew = shares.emplace(*component, share).second;
        if (!isNew) return fault(Reason::contradiction, "", "{0} stands twice in this composition", {*component});
        return true;
    }
    double total = 0.0;
    std::array<double, airShares.size()> weights{};
    for (std::size_t i = 0; i < airShares.size(); ++i) {
        const Outcome<double> molarMass = basis.gases.molarMass(airShares[i].first);
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
            const Outcome<double> molarMass = basis.gases.molarMass(name);
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

} // namespace

Outcome<gas::Composition> compositionFrom(const Place &place, FractionBasis fractionBasis, const KnownGases &gases,
                                          Warnings &warnings)
{
    const Basis basis{fractionBasis, gases};
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

Outcome<PlacedComposition> mixtureFrom(const Fields &fields, const KnownGases &gases, Warnings &warnings)
{
    const bool byMass = fields.has("composition_by_mass");
    if (byMass && fields.has("composition"))
        return fault(Reason::contradiction, fields.pointerTo("composition_by_mass"),
                     "“composition” and “composition_by_mass” exclude each other: remove one");
    const Outcome<Place> place = fields.required(byMass ? "composition_by_mass" : "composition");
    if (!place) return place.failure();
    Outcome<gas::Composition> composition =
        compositionFrom(*place, byMass ? FractionBasis::mass : FractionBasis::amount, gases, warnings);
    if (!composition) return composition.failure();
    return PlacedComposition{*place, std::move(*composition)};
}

} // namespace quasistat::document
