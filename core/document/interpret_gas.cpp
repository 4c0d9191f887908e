#include "core/document/faults.h"
#include "core/document/interpret_parts.h"

namespace quasistat::document
{

namespace
{

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

/// `composition` or `composition_by_mass` of a gas that has no other keys.
Outcome<PlacedComposition> plainMixtureFrom(const Fields &fields, std::string_view model, const gas::Library &library,
                                            Warnings &warnings)
{
    fields.warnOfUnknown({keys::mixture}, warnings);
    return mixtureFrom(fields, LibraryGases(library, model), warnings);
}

Outcome<gas::GasPtr> idealFrom(const Fields &fields, const gas::Library &library, Warnings &warnings)
{
    const Outcome<PlacedComposition> mixture = plainMixtureFrom(fields, "ideal", library, warnings);
    if (!mixture) return mixture.failure();
    Outcome<gas::GasPtr> gas = library.idealGas(mixture->composition, mixtureName(mixture->composition));
    if (!gas) return at(mixture->place.pointer, gas.failure());
    return gas;
}

Outcome<gas::GasPtr> gergFrom(const Fields &fields, const gas::Library &library, Warnings &warnings)
{
    const Outcome<PlacedComposition> mixture = plainMixtureFrom(fields, "gerg-2008", library, warnings);
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

namespace
{

Outcome<gas::GasPtr> gasMadeFrom(const Place &place, const gas::Library &library, Warnings &warnings)
{
    const Outcome<Fields> fields = Fields::of(place);
    if (!fields) return fields.failure();
    const Outcome<Place> modelPlace = fields->required("model");
    if (!modelPlace) return modelPlace.failure();
    const Outcome<std::string> model = textAt(*modelPlace);
    if (!model) return model.failure();
    if (*model == "perfect") return perfectFrom(*fields, warnings);
    if (*model == "ideal") return idealFrom(*fields, library, warnings);
    for (const gas::CubicForm form : {gas::CubicForm::pengRobinson, gas::CubicForm::soaveRedlichKwong})
        if (*model == gas::keyOf(form)) return cubicFrom(*fields, form, library, warnings);
    if (*model == "gerg-2008") return gergFrom(*fields, library, warnings);
    if (*model == "reference") return referenceGasFrom(*fields, library, warnings);
    return unknownName(modelPlace->pointer, "gas model", *model, keys::models);
}

} // namespace

Outcome<gas::GasPtr> gasFrom(const Place &place, const gas::Library &library, Warnings &warnings)
{
    const std::string description =
        place.pointer + " " + place.value->dump(-1, ' ', false, Json::error_handler_t::replace);
    if (const auto known = library.recalled(description)) {
        warnings.insert(warnings.end(), known->warnings.begin(), known->warnings.end());
        return known->gas;
    }
    Warnings own;
    Outcome<gas::GasPtr> gas = gasMadeFrom(place, library, own);
    if (gas) library.remember(description, {*gas, own});
    warnings.insert(warnings.end(), own.begin(), own.end());
    return gas;
}

} // namespace quasistat::document
