#include "core/document/interpret.h"

#include "core/document/faults.h"
#include "core/document/interpret_parts.h"
#include "core/document/pointer.h"

namespace quasistat::document
{

namespace
{

constexpr int formatVersion = 1;

std::optional<Failure> wrongVersion(const Fields &design)
{
    const Outcome<Place> place = design.required("quasistat");
    if (!place) return place.failure();
    if (place->value->is_number_integer() && *place->value == formatVersion) return std::nullopt;
    return fault(Reason::outOfRange, place->pointer, "this version reads documents with \"quasistat\": 1, not {0}",
                 {place->value->dump(-1, ' ', false, Json::error_handler_t::replace)});
}

std::optional<Failure> wrongTitles(const Fields &design, Warnings &warnings)
{
    for (const std::string_view key : {"title", "notes"})
        if (const auto text = design.text(key); !text) return text.failure();
    const std::optional<Place> place = design.find("document");
    if (!place) return std::nullopt;
    const Outcome<Fields> block = Fields::of(*place);
    if (!block) return block.failure();
    block->warnOfUnknown({keys::titleBlock}, warnings);
    for (const std::string_view key : keys::titleBlock)
        if (const auto text = block->text(key); !text) return text.failure();
    return std::nullopt;
}

/// `steady_cycle` changes every figure, so it cannot be left out quietly.
std::optional<Failure> steadyCycle(const Fields &design)
{
    const std::optional<Place> place = design.find("steady_cycle");
    if (!place) return std::nullopt;
    if (!place->value->is_boolean())
        return fault(Reason::wrongType, place->pointer, "here stands {0}, not true or false",
                     {typeWords(*place->value)});
    if (place->value->get<bool>()) return notComputed(place->pointer, "a steady cycle");
    return std::nullopt;
}

void warnOfView(const Fields &design, Warnings &warnings)
{
    const std::optional<Place> view = design.find("view");
    if (!view || !view->value->is_object() || !view->value->contains("units")) return;
    const Place unitsPlace{&(*view->value)["units"], pointerTo(view->pointer, "units")};
    struct Row {
        const char *key;
        units::Quantity quantity;
    };
    for (const Row &row : {Row{"pressure", units::Quantity::pressure}, Row{"volume", units::Quantity::volume},
                           Row{"temperature", units::Quantity::temperature}, Row{"energy", units::Quantity::energy}}) {
        if (!unitsPlace.value->is_object() || !unitsPlace.value->contains(row.key)) continue;
        const Json &unit = (*unitsPlace.value)[row.key];
        if (unit.is_string() && unit.get<std::string>().empty()) continue;
        if (!unit.is_string() || !units::inUnit(1.0, row.quantity, unit.get<std::string>(), 0.0))
            warnings.push_back(remark(pointerTo(unitsPlace.pointer, row.key), "this is no unit of {0}; it is not used",
                                      {std::string(units::facts(row.quantity).words)}));
    }
}

Outcome<std::optional<double>> rateFrom(const Fields &design)
{
    const std::optional<Place> place = design.find("rate");
    if (!place) return std::optional<double>();
    const Outcome<double> rate = positiveQuantityAt(*place, units::Quantity::frequency, {0.0, 1.0});
    if (!rate) return rate.failure();
    return std::optional(*rate);
}

Outcome<std::vector<Outcome<path::Segment>>> segmentsFrom(const Fields &design, const units::Conversion &conversion,
                                                          Warnings &warnings)
{
    const Outcome<Place> place = design.required("segments");
    if (!place) return place.failure();
    if (!place->value->is_array())
        return fault(Reason::wrongType, place->pointer, "here stands {0}, not a list of segments: […]",
                     {typeWords(*place->value)});
    std::vector<Outcome<path::Segment>> segments;
    for (std::size_t i = 0; i < place->value->size(); ++i)
        segments.push_back(segmentFrom({&(*place->value)[i], pointerTo(place->pointer, i)}, i, conversion, warnings));
    return segments;
}

/// Everything that concerns the whole document and is no input of the path.
std::optional<Failure> wrongFrame(const Fields &design, Warnings &warnings)
{
    if (std::optional<Failure> failure = wrongVersion(design)) return failure;
    if (std::optional<Failure> failure = wrongTitles(design, warnings)) return failure;
    if (std::optional<Failure> failure = steadyCycle(design)) return failure;
    design.warnOfUnknown({keys::design, keys::designElsewhere}, warnings);
    warnOfView(design, warnings);
    return std::nullopt;
}

} // namespace

Outcome<Interpretation> interpret(const Design &design, const gas::Library &library)
{
    const Outcome<Fields> fields = Fields::of({&design.json, ""});
    if (!fields) return fields.failure();
    Warnings warnings;
    if (const std::optional<Failure> failure = wrongFrame(*fields, warnings)) return *failure;

    const Outcome<Place> gasPlace = fields->required("gas");
    if (!gasPlace) return gasPlace.failure();
    const Outcome<gas::GasPtr> gas = gasFrom(*gasPlace, library, warnings);
    if (!gas) return gas.failure();
    const Outcome<path::Surroundings> surroundings = surroundingsFrom(fields->find("surroundings"), warnings);
    if (!surroundings) return surroundings.failure();
    const units::Conversion conversion{.surroundingsPressure = surroundings->pressure,
                                       .molarMass = (*gas)->molarMass()};

    const Outcome<Place> startPlace = fields->required("start");
    if (!startPlace) return startPlace.failure();
    const Outcome<path::Start> start = startFrom(*startPlace, conversion, warnings);
    if (!start) return start.failure();
    const Outcome<std::optional<double>> rate = rateFrom(*fields);
    if (!rate) return rate.failure();
    std::vector<analysis::Limit> limits;
    if (const std::optional<Place> place = fields->find("limits")) {
        Outcome<std::vector<analysis::Limit>> read = limitsFrom(*place, conversion, warnings);
        if (!read) return read.failure();
        limits = std::move(*read);
    }
    Outcome<std::vector<Outcome<path::Segment>>> segments = segmentsFrom(*fields, conversion, warnings);
    if (!segments) return segments.failure();
    return Interpretation{.input = {.gas = *gas,
                                    .start = *start,
                                    .segments = std::move(*segments),
                                    .surroundings = *surroundings,
                                    .rate = *rate},
                          .limits = std::move(limits),
                          .warnings = std::move(warnings)};
}

Outcome<analysis::Evaluation> evaluate(const Design &design, const gas::Library &library)
{
    Outcome<Interpretation> interpretation = interpret(design, library);
    if (!interpretation) return interpretation.failure();
    analysis::Evaluation evaluation =
        analysis::evaluate(std::move(interpretation->input), std::move(interpretation->limits));
    std::vector<Warning> &warnings = evaluation.path.warnings;
    warnings.insert(warnings.begin(), interpretation->warnings.begin(), interpretation->warnings.end());
    return evaluation;
}

std::optional<Failure> firstFailure(const analysis::Evaluation &evaluation)
{
    if (evaluation.path.startFailure) return evaluation.path.startFailure;
    for (const std::optional<Failure> &failure : evaluation.path.failures)
        if (failure) return failure;
    return std::nullopt;
}

} // namespace quasistat::document
