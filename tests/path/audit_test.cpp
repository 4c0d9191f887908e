// The audit must see what it is there to see.

#include "core/path/audit.h"
#include "tests/support/paths.h"

namespace quasistat::path
{
namespace
{

using test::PathOf;
using test::segment;

/// A perfect gas whose heat capacity does not belong to its internal energy: 1 + 1e-7 too large.
class Inconsistent final : public gas::Gas
{
public:
    gas::Helmholtz helmholtz(double T, double v) const override { return m_true->helmholtz(T, v); }
    gas::MolarState at(double T, double v) const override
    {
        gas::MolarState s = m_true->at(T, v);
        s.isochoricHeatCapacity *= 1.0 + 1e-7;
        return s;
    }
    const Gas &idealPart() const override { return *this; }
    double molarMass() const override { return m_true->molarMass(); }
    double gasConstant() const override { return m_true->gasConstant(); }
    const gas::Composition &composition() const override { return m_true->composition(); }
    const gas::Validity &validity() const override { return m_true->validity(); }
    std::span<const double> seams() const override { return {}; }
    const gas::Equation *equation() const override { return nullptr; }
    std::string_view model() const override { return "inconsistent"; }
    std::string_view source() const override { return "a test"; }
    const std::string &name() const override { return m_true->name(); }

private:
    gas::GasPtr m_true = test::perfect();
};

TEST(Audit, FailsWhereHeatAndInternalEnergyDisagree)
{
    const auto wrong = std::make_shared<Inconsistent>();
    for (const Segment &s :
         {segment(Isobaric{}, EndKey::temperature, 500.0), segment(Isochoric{}, EndKey::temperature, 500.0),
          segment(Polytropic{1.2}, EndKey::pressure, 8e5)}) {
        const auto bad = PathOf{.gas = wrong, .segments = {s}}.only();
        EXPECT_FALSE(bad.audit.ok);
        EXPECT_GT(std::abs(bad.audit.firstLawResidual), 1e-9 * bad.audit.scale);
        EXPECT_TRUE((PathOf{.segments = {s}}.only().audit.ok));
    }
}

TEST(Audit, OfAnIrreversibleSegmentFailsWhereItsTwoRoutesDisagree)
{
    const auto wrong = std::make_shared<Inconsistent>();
    const Segment fall{ConstantExternalPressure{0.2e5, Thermal::adiabatic}, {.balance = true}, ""};
    EXPECT_FALSE((PathOf{.gas = wrong, .segments = {fall}}.only().audit.ok));
    EXPECT_TRUE((PathOf{.segments = {fall}}.only().audit.ok));
}

TEST(Audit, FailsForWorkHeatOrLostWorkThatIsOff)
{
    const auto r = PathOf{.segments = {segment(Polytropic{1.2}, EndKey::pressure, 8e5)}}.only();
    EXPECT_TRUE(quasiStaticAudit(r.from, r.to, r.work, r.heat).ok);
    EXPECT_FALSE(quasiStaticAudit(r.from, r.to, r.work * (1 + 1e-8), r.heat).ok);
    EXPECT_FALSE(quasiStaticAudit(r.from, r.to, r.work, r.heat * (1 - 1e-7)).ok);

    const auto i = PathOf{.segments = {{ConstantExternalPressure{0.5e5}, {.balance = true}, ""}}}.only();
    const IrreversibleAccount good{i.work, i.heat, i.lostWork, 300.0, 298.15};
    EXPECT_TRUE(irreversibleAudit(i.from, i.to, good).ok);
    for (double IrreversibleAccount::*figure :
         {&IrreversibleAccount::work, &IrreversibleAccount::heat, &IrreversibleAccount::lostWork}) {
        IrreversibleAccount bad = good;
        bad.*figure *= 1.0 + 1e-7;
        EXPECT_FALSE(irreversibleAudit(i.from, i.to, bad).ok);
    }
}

TEST(Audit, HeatByEntropyBelongsToQuasiStaticSegmentsOnly)
{
    EXPECT_TRUE((PathOf{.segments = {segment(Isothermal{}, EndKey::volumeRatio, 2.0)}}.only().audit.heatByEntropy));
    EXPECT_FALSE((PathOf{.segments = {segment(FreeExpansion{}, EndKey::volumeRatio, 2.0)}}.only().audit.heatByEntropy));
}

} // namespace
} // namespace quasistat::path
