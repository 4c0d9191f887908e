#include "core/document/result_json.h"

#include "core/document/interpret.h"
#include "core/document/result_curve.h"

#include <cmath>

namespace quasistat::document
{

namespace
{

Json number(double value)
{
    return std::isfinite(value) ? Json(value) : Json(nullptr);
}

Json number(const std::optional<double> &value)
{
    return value ? number(*value) : Json(nullptr);
}

Json interval(const path::Interval &range)
{
    return Json::array({number(range.lowest), number(range.highest)});
}

Json compositionJson(const gas::Gas &gas)
{
    if (gas.composition().empty()) return nullptr; // a perfect gas has none
    Json shares = Json::object();
    for (const gas::Share &share : gas.composition()) shares[share.component] = share.moleFraction;
    return shares;
}

Json storedEnergyJson(const std::optional<path::StoredEnergy> &energy)
{
    if (!energy) return nullptr;
    return {{"ideal", number(energy->ideal)}, {"real", number(energy->real)}};
}

Json stateJson(std::size_t index, const path::StateResult &result)
{
    const gas::State &state = result.state;
    const bool evacuated = state.isEvacuated();
    Json json = Json::object();
    json["state"] = index + 1;
    json["pressure"] = number(state.pressure());
    json["volume"] = number(state.volume());
    json["temperature"] = number(state.temperature());
    json["amount"] = number(state.amount());
    json["mass"] = number(state.mass());
    json["internal_energy"] = number(evacuated ? 0.0 : state.internalEnergy());
    json["enthalpy"] = number(evacuated ? 0.0 : state.enthalpy());
    json["entropy"] = number(evacuated ? 0.0 : state.entropy());
    json["compressibility"] = number(state.compressibility());
    json["vapour_fraction"] = evacuated ? Json(nullptr) : number(state.molar().vapourFraction);
    json["composition"] = evacuated ? Json(nullptr) : compositionJson(state.gas());
    json["available_work"] = number(result.availableWork);
    json["stored_energy"] = storedEnergyJson(result.storedEnergy);
    return json;
}

void addWorkAndHeat(Json &json, const path::SegmentResult &segment)
{
    json["work"] = number(segment.work);
    json["heat"] = number(segment.heat);
    json["steady_flow_work"] = number(segment.steadyFlowWork);
    json["rod_work"] = number(segment.rodWork);
    json["atmosphere_work"] = number(segment.atmosphereWork);
    json["delta_internal_energy"] = number(segment.deltaInternalEnergy);
    json["delta_enthalpy"] = number(segment.deltaEnthalpy);
    json["delta_entropy"] = number(segment.deltaEntropy);
    json["entropy_generated"] = number(segment.entropyGenerated);
    json["lost_work"] = number(segment.lostWork);
    json["reversible_limit_work"] = number(segment.reversibleLimitWork);
    json["reversible_limit_steady_flow_work"] = number(segment.reversibleLimitSteadyFlowWork);
    json["shortfall"] = number(segment.shortfall);
    json["recovery"] = number(segment.recovery);
}

void addMatterAndIdealGas(Json &json, const path::SegmentResult &segment)
{
    json["energy_with_matter"] = number(segment.energyWithMatter);
    json["amount_in"] = number(segment.amountIn);
    json["available_work_out"] = number(segment.availableWorkOut);
    const std::optional<path::IdealGasFigures> &ideal = segment.idealGas;
    json["ideal_gas_work"] = ideal ? number(ideal->work) : Json(nullptr);
    json["ideal_gas_heat"] = ideal ? number(ideal->heat) : Json(nullptr);
    json["ideal_gas_end_temperature"] = ideal ? number(ideal->endTemperature) : Json(nullptr);
    json["duration"] = number(segment.duration);
}

Json segmentJson(std::size_t index, const path::SegmentResult &segment, int curvePoints)
{
    Json json = Json::object();
    json["segment"] = index + 1;
    json["kind"] = path::facts(segment.kind).key;
    json["label"] = segment.label;
    json["exponent"] = number(segment.exponent);
    addWorkAndHeat(json, segment);
    addMatterAndIdealGas(json, segment);
    json["extrema"] = {{"pressure", interval(segment.extrema.pressure)},
                       {"volume", interval(segment.extrema.volume)},
                       {"temperature", interval(segment.extrema.temperature)}};
    json["audit"] = {{"first_law_residual", number(segment.audit.firstLawResidual)},
                     {"heat_by_entropy", number(segment.audit.heatByEntropy)},
                     {"ok", segment.audit.ok}};
    if (curvePoints > 1 && segment.curve) json["curve"] = curveJson(*segment.curve, curvePoints);
    return json;
}

Json totalsJson(const path::Totals &totals)
{
    Json json = Json::object();
    json["work"] = number(totals.work);
    json["heat"] = number(totals.heat);
    json["heat_in"] = number(totals.heatIn);
    json["heat_out"] = number(totals.heatOut);
    json["steady_flow_work"] = number(totals.steadyFlowWork);
    json["entropy_generated"] = number(totals.entropyGenerated);
    json["lost_work"] = number(totals.lostWork);
    json["closed"] = totals.closed;
    json["net_work_out"] = number(totals.netWorkOut);
    json["thermal_efficiency"] = number(totals.thermalEfficiency);
    json["cop_heating"] = number(totals.copHeating);
    json["cop_cooling"] = number(totals.copCooling);
    json["carnot_ratio"] = number(totals.carnotRatio);
    json["mean_effective_pressure"] = number(totals.meanEffectivePressure);
    json["power"] = number(totals.power);
    return json;
}

std::string_view keyOf(analysis::LimitQuantity quantity)
{
    using analysis::LimitQuantity;
    switch (quantity) {
    case LimitQuantity::pressure: return "pressure";
    case LimitQuantity::volume: return "volume";
    case LimitQuantity::temperature: return "temperature";
    case LimitQuantity::pressureRatio: return "pressure_ratio";
    case LimitQuantity::work: return "work";
    case LimitQuantity::heat: return "heat";
    case LimitQuantity::amount: return "amount";
    case LimitQuantity::storedEnergy: return "stored_energy";
    }
    return {};
}

Json limitJson(const analysis::Limit &limit, const analysis::Verdict &verdict)
{
    Json json = Json::object();
    json["quantity"] = keyOf(limit.quantity);
    json["label"] = limit.label;
    if (limit.min) json["min"] = number(limit.min);
    if (limit.max) json["max"] = number(limit.max);
    if (!limit.maxAt.empty()) {
        Json pairs = Json::array();
        for (const analysis::Rating &rating : limit.maxAt)
            pairs.push_back(Json::array({number(rating.temperature), number(rating.pressure)}));
        json["max_at"] = std::move(pairs);
    }
    json["worst"] = number(verdict.worst);
    json["segment"] = verdict.segment > 0 ? Json(verdict.segment) : Json(nullptr);
    json["ok"] = verdict.ok;
    return json;
}

Json textOrEmpty(const Design &design, const char *key)
{
    const auto found = design.json.find(key);
    return found != design.json.end() && found->is_string() ? *found : Json("");
}

} // namespace

Json resultJson(const Design &design, const analysis::Evaluation &evaluation, int curvePoints,
                std::string_view programVersion)
{
    Json json = Json::object();
    json["quasistat_result"] = 1;
    json["program_version"] = programVersion;
    json["title"] = textOrEmpty(design, "title");
    json["gas"] = design.json.contains("gas") ? design.json.at("gas") : Json::object();

    const path::PathResult &path = evaluation.path;
    Json &states = json["states"] = Json::array();
    for (std::size_t i = 0; i < path.states.size(); ++i) states.push_back(stateJson(i, path.states[i]));
    Json &segments = json["segments"] = Json::array();
    for (std::size_t i = 0; i < path.segments.size(); ++i)
        segments.push_back(segmentJson(i, path.segments[i], curvePoints));
    json["totals"] = totalsJson(path.totals);
    json["alternatives"] = Json::array();
    json["targets"] = Json::array();
    Json &limits = json["limits"] = Json::array();
    for (const analysis::Verdict &verdict : evaluation.verdicts)
        limits.push_back(limitJson(evaluation.limits[verdict.limit], verdict));
    const units::DisplayUnits units = displayUnits(design);
    Json &warnings = json["warnings"] = Json::array();
    for (const Warning &warning : path.warnings)
        warnings.push_back({{"pointer", warning.pointer}, {"message", units::sentence(warning.message, units)}});
    return json;
}

} // namespace quasistat::document
