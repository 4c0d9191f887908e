// Gases of the cubic equations of state.

#include "core/document/faults.h"
#include "core/document/interpret_parts.h"
#include "core/document/own_gases.h"

#include <algorithm>
#include <utility>

namespace quasistat::document
{

namespace
{

/// kᵢⱼ of a composition, and which pairs were stated.
struct Interaction {
    std::vector<double> values; ///< row by row
    std::vector<bool> isStated;
};

using Pair = std::pair<std::size_t, std::size_t>;

std::size_t indexOf(const gas::Composition &composition, const std::string &name)
{
    const auto found = std::ranges::find(composition, name, &gas::Share::component);
    return static_cast<std::size_t>(found - composition.begin());
}

/// The two gases of a key "a/b" by their places in the composition.
Outcome<Pair> pairFrom(const std::string &key, const std::string &pointer, const gas::Composition &composition,
                       const CubicGases &gases)
{
    const std::size_t slash = key.find('/');
    if (slash == std::string::npos || key.find('/', slash + 1) != std::string::npos)
        return fault(Reason::syntax, pointer, "name two gases with “/” between them: \"nitrogen/methane\"");
    const auto index = [&](const std::string &typed) -> Outcome<std::size_t> {
        const Outcome<std::string> name = gases.name(typed);
        if (!name) return at(pointer, name.failure());
        const std::size_t place = indexOf(composition, *name);
        if (place == composition.size())
            return fault(Reason::contradiction, pointer, "{0} is not in this gas's composition", {*name});
        return place;
    };
    const Outcome<std::size_t> first = index(key.substr(0, slash));
    if (!first) return first.failure();
    const Outcome<std::size_t> second = index(key.substr(slash + 1));
    if (!second) return second.failure();
    if (*first == *second)
        return fault(Reason::contradiction, pointer, "a binary interaction is between two different gases");
    return Pair{*first, *second};
}

Outcome<Interaction> interactionFrom(const std::optional<Place> &place, const gas::Composition &composition,
                                     const CubicGases &gases)
{
    const std::size_t n = composition.size();
    Interaction interaction{std::vector<double>(n * n, 0.0), std::vector<bool>(n * n, false)};
    if (!place) return interaction;
    const Outcome<Fields> fields = Fields::of(*place);
    if (!fields) return fields.failure();
    for (const auto &item : place->value->items()) {
        const Place entry{&item.value(), fields->pointerTo(item.key())};
        const Outcome<Pair> pair = pairFrom(item.key(), entry.pointer, composition, gases);
        if (!pair) return pair.failure();
        const auto [i, j] = *pair;
        if (interaction.isStated[i * n + j])
            return fault(Reason::contradiction, entry.pointer, "the binary interaction of {0} and {1} is stated twice",
                         {composition[i].component, composition[j].component});
        const Outcome<double> value = numberAt(entry);
        if (!value) return value.failure();
        if (!(*value > -1.0 && *value < 1.0))
            return fault(Reason::outOfRange, entry.pointer,
                         "a binary interaction k lies between −1 and 1 (usual values: 0 to 0.2)");
        for (const std::size_t entryIndex : {i * n + j, j * n + i}) {
            interaction.values[entryIndex] = *value;
            interaction.isStated[entryIndex] = true;
        }
    }
    return interaction;
}

/// Says once which pairs are taken as 0.
void warnOfZeros(const Fields &fields, const gas::Composition &composition, const Interaction &interaction,
                 Warnings &warnings)
{
    constexpr std::size_t mostNamed = 6;
    const std::size_t n = composition.size();
    std::vector<std::string> absent;
    for (std::size_t i = 0; i < n; ++i)
        for (std::size_t j = i + 1; j < n; ++j)
            if (!interaction.isStated[i * n + j])
                absent.push_back(composition[i].component + "/" + composition[j].component);
    if (absent.empty()) return;
    std::string names;
    for (std::size_t k = 0; k < std::min(absent.size(), mostNamed); ++k) names += (k > 0 ? ", " : "") + absent[k];
    const std::string pointer =
        fields.has("binary_interaction") ? fields.pointerTo("binary_interaction") : fields.pointer();
    if (absent.size() <= mostNamed)
        warnings.push_back(remark(pointer, "no binary interaction is stated for {0}: it is taken as 0", {names}));
    else
        warnings.push_back(remark(pointer,
                                  "no binary interaction is stated for {0} and {1} more pairs: it is taken as 0",
                                  {names, std::to_string(absent.size() - mostNamed)}));
}

void warnOfIdle(const gas::Composition &composition, const CubicGases &gases, Warnings &warnings)
{
    for (const auto &[name, own] : gases.own())
        if (indexOf(composition, name) == composition.size())
            warnings.push_back(remark(own.pointer, "{0} is not in this gas's composition and not used", {name}));
}

} // namespace

Outcome<gas::GasPtr> cubicFrom(const Fields &fields, gas::CubicForm form, const gas::Library &library,
                               Warnings &warnings)
{
    fields.warnOfUnknown({keys::mixture, keys::cubicGas}, warnings);
    const Outcome<CubicGases> gases = CubicGases::from(fields.find("components"), form, library, warnings);
    if (!gases) return gases.failure();
    const Outcome<PlacedComposition> mixture = mixtureFrom(fields, *gases, warnings);
    if (!mixture) return mixture.failure();
    const gas::Composition &composition = mixture->composition;

    gas::CubicRequest request{
        .form = form, .components = {}, .fractions = {}, .interaction = {}, .name = mixtureName(composition)};
    for (const gas::Share &share : composition) {
        Outcome<gas::CubicComponent> component = gases->component(share.component);
        if (!component) // at the user's own gas, or at the composition that names an unknown one
            return component.failure().pointer.empty() ? at(mixture->place.pointer, component.failure())
                                                       : component.failure();
        request.components.push_back(std::move(*component));
        request.fractions.push_back(share.moleFraction);
    }
    const Outcome<Interaction> interaction = interactionFrom(fields.find("binary_interaction"), composition, *gases);
    if (!interaction) return interaction.failure();
    request.interaction = interaction->values;
    warnOfZeros(fields, composition, *interaction, warnings);
    warnOfIdle(composition, *gases, warnings);
    Outcome<gas::GasPtr> gas = gas::cubicGas(std::move(request));
    if (!gas) return at(fields.pointer(), gas.failure());
    return gas;
}

} // namespace quasistat::document
