// Whatever a document says, reading it ends in an answer or in a failure with a place, never in a crash.

#include "designs.h"

#include "core/document/edit.h"
#include "core/document/result_json.h"

#include <rapidcheck/gtest.h>

#include <array>

using namespace quasistat;
using document::Design;
using document::Json;

namespace
{

const gas::Library &library()
{
    static const gas::Library data;
    return data;
}

/// Pointers to every value of a document.
void collect(const Json &value, const std::string &pointer, std::vector<std::string> &pointers)
{
    pointers.push_back(pointer);
    std::size_t index = 0;
    if (value.is_object() || value.is_array())
        for (const auto &item : value.items())
            collect(item.value(), pointer + "/" + (value.is_object() ? item.key() : std::to_string(index++)), pointers);
}

rc::Gen<std::string> anyValue()
{
    return rc::gen::elementOf(std::vector<std::string>{"null",
                                                       "true",
                                                       "0",
                                                       "-1",
                                                       "1e300",
                                                       "1",
                                                       "3",
                                                       "2.5",
                                                       "[]",
                                                       "{}",
                                                       "\"\"",
                                                       "\"@1\"",
                                                       "\"@2\"",
                                                       "\"@9\"",
                                                       "\"@\"",
                                                       "\"8 bar\"",
                                                       "\"1 bar\"",
                                                       "\"300 K\"",
                                                       "\"2 L\"",
                                                       "\"0 L\"",
                                                       "\"1 mol\"",
                                                       "\"50 J\"",
                                                       "\"-50 J\"",
                                                       "\"balance\"",
                                                       "\"isothermal\"",
                                                       "\"isentropic\"",
                                                       "\"linear\"",
                                                       "\"stepped\"",
                                                       "\"free-expansion\"",
                                                       "\"constant-external-pressure\"",
                                                       "\"throttle\"",
                                                       "\"ideal\"",
                                                       "{\"state\": 1}",
                                                       "{\"state\": 2}",
                                                       "{\"pressure\": \"3 bar\"}",
                                                       "{\"volume\": \"@1\"}",
                                                       "{\"volume_ratio\": 2}",
                                                       "{\"temperature\": \"5000 K\"}",
                                                       "{\"model\": \"ideal\", \"composition\": {\"air\": 1}}",
                                                       "[{\"kind\": \"isochoric\", \"end\": {\"heat\": \"1 J\"}}]",
                                                       "\"1e-30 Pa\"",
                                                       "\"1e30 bar\"",
                                                       "\"\\u0000\"",
                                                       "[[]]"});
}

Design mutated()
{
    Design design = tests::plainDesign();
    const int count = *rc::gen::inRange(1, 5);
    for (int i = 0; i < count; ++i) {
        std::vector<std::string> pointers;
        collect(design.json, "", pointers);
        std::string pointer = *rc::gen::elementOf(pointers);
        if (*rc::gen::inRange(0, 4) == 0)
            pointer += *rc::gen::elementOf(std::vector<std::string>{"/end", "/state", "/steps", "/steady_cycle", "/0",
                                                                    "/stiffness", "/external_pressure", "/heat",
                                                                    "/regenerator"});
        const auto next = document::valueSet(design, pointer, *anyValue());
        if (next) design = *next;
    }
    return design;
}

} // namespace

RC_GTEST_PROP(Mutation, EndsInAnAnswerOrAFailureWithAPlace, ())
{
    const Design design = mutated();
    const auto evaluation = document::evaluate(design, library());
    const auto isInside = [](const std::string &pointer) { return pointer.empty() || pointer.front() == '/'; };
    if (!evaluation) {
        RC_ASSERT(!evaluation.failure().message.text.empty());
        RC_ASSERT(isInside(evaluation.failure().pointer));
        return;
    }
    for (const auto &failure : evaluation->path.failures)
        if (failure) RC_ASSERT(isInside(failure->pointer));
    // No number is written that JSON cannot carry, and nothing shown is NaN.
    const std::string text = document::resultJson(design, *evaluation, 5, "test").dump();
    RC_ASSERT(text.find("nan") == std::string::npos);
}

RC_GTEST_PROP(Mutation, DisplayUnitsAndTextOfAnyDocumentExist, ())
{
    const Design design = mutated();
    const units::DisplayUnits units = document::displayUnits(design);
    RC_ASSERT(units.surroundingsPressure > 0.0);
    document::Position position;
    const auto back = document::read(document::written(design), position);
    RC_ASSERT(back.ok());
    RC_ASSERT(back->json == design.json);
}

RC_GTEST_PROP(Mutation, EditsOfAnyDocumentEnd, ())
{
    const Design design = mutated();
    path::PathResult before;
    if (const auto evaluation = document::evaluate(design, library())) before = evaluation->path;
    const auto index = *rc::gen::inRange<std::size_t>(0, 4);
    const auto other = *rc::gen::inRange<std::size_t>(0, 4);
    const auto kind = path::kindTable[*rc::gen::inRange<std::size_t>(0, path::kindTable.size())].kind;
    const std::array<document::Edited, 5> edited{
        document::segmentInserted(design, index, Json{{"kind", "isobaric"}}, before),
        document::segmentDeleted(design, index, before), document::segmentMoved(design, index, other, before),
        document::segmentDuplicated(design, index, before), document::kindChanged(design, index, kind, before)};
    for (const document::Edited &edit : edited) RC_ASSERT(edit.design.json.is_object());
}
