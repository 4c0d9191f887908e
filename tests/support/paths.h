#pragma once
// Paths made in words short enough for a table of tests.

#include "core/path/evaluate.h"
#include "tests/support/gases.h"

namespace quasistat::test
{

inline path::Segment segment(path::Process process, path::EndKey key, double value, std::string label = {})
{
    path::Segment result{process, {}, std::move(label)};
    result.end.values.push_back({key, value});
    return result;
}

/// Start 1 mol at 300 K and 1 bar unless said; surroundings stated.
struct PathOf {
    gas::GasPtr gas = perfect();
    path::Start start{.pressure = 1e5, .temperature = 300.0, .amount = 1.0};
    std::vector<path::Segment> segments;
    path::Surroundings surroundings{101325.0, 298.15, true, true};
    std::optional<double> rate;

    [[nodiscard]] path::PathInput input() const
    {
        path::PathInput in{gas, start, {}, surroundings, rate};
        for (const auto &s : segments) in.segments.emplace_back(s);
        return in;
    }
    [[nodiscard]] path::PathResult evaluated() const { return path::evaluate(input()); }

    /// The only segment's result; the test fails if it is not computed.
    [[nodiscard]] path::SegmentResult only() const
    {
        auto result = evaluated();
        EXPECT_TRUE(result.complete()) << (result.failures.empty() || !result.failures[0]
                                               ? "no segment"
                                               : result.failures[0]->message.text);
        return result.segments.at(0);
    }
    /// Why the only segment is not computed.
    [[nodiscard]] Failure failure() const
    {
        auto result = evaluated();
        EXPECT_TRUE(result.failures.at(0).has_value()) << "expected a failure";
        return result.failures.at(0).value_or(Failure{});
    }
};

} // namespace quasistat::test
