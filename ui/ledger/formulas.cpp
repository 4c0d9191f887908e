#include "ui/ledger/formulas.h"

#include <QCoreApplication>

#include <array>

namespace quasistat::ui
{

using path::Kind;
using path::SegmentResult;

namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("Formulas", text);
}

// Published texts that define what is computed.
constexpr const char *definitionOfWork = "source: IUPAC Green Book (2007), section 2.11";
constexpr const char *clausius = "source: R. Clausius, Annalen der Physik 125 (1865) 353";
constexpr const char *gouyStodola = "source: G. Gouy, J. Phys. Théor. Appl. 8 (1889) 501";
constexpr const char *carnot = "source: S. Carnot, Réflexions sur la puissance motrice du feu (1824)";
constexpr const char *quantities = "source: ISO 80000-5:2019, Thermodynamics";
constexpr const char *formatDefinition = "source: definition of the document format";

/// Puts the state numbers in: {a} is the state before, {b} the one after.
QString withStates(const char *markup, int number)
{
    QString text = QString::fromUtf8(markup);
    text.replace(QLatin1String("{a}"), QStringLiteral("<sub>%1</sub>").arg(number));
    text.replace(QLatin1String("{b}"), QStringLiteral("<sub>%1</sub>").arg(number + 1));
    return text;
}

/// The work in closed form where the gas is ideal; the integral that is computed otherwise.
const char *workMarkup(const SegmentResult &segment)
{
    const bool ideal = segment.from.gas().isIdeal();
    const bool perfect = ideal && segment.from.gas().model() == "perfect";
    switch (segment.kind) {
    case Kind::isothermal:
        if (ideal) return "<i>W</i> = <i>n R T</i> ln(<i>V</i>{a} / <i>V</i>{b})";
        break;
    case Kind::isobaric: return "<i>W</i> = −<i>p</i> (<i>V</i>{b} − <i>V</i>{a})";
    case Kind::isochoric: return "<i>W</i> = 0: the volume stays";
    case Kind::polytropic: return "<i>W</i> = (<i>p</i>{b}<i>V</i>{b} − <i>p</i>{a}<i>V</i>{a}) / (exponent − 1)";
    case Kind::isentropic:
        if (perfect) return "<i>W</i> = <i>n R</i> (<i>T</i>{b} − <i>T</i>{a}) / (<i>γ</i> − 1)";
        break;
    case Kind::linear: return "<i>W</i> = −½ (<i>p</i>{a} + <i>p</i>{b}) (<i>V</i>{b} − <i>V</i>{a})";
    case Kind::constantExternalPressure: return "<i>W</i> = −<i>p</i><sub>ext</sub> (<i>V</i>{b} − <i>V</i>{a})";
    case Kind::stepped: return "<i>W</i> = −Σ <i>p</i><sub>ext,i</sub> Δ<i>V</i><sub>i</sub>";
    case Kind::freeExpansion: return "<i>W</i> = 0: nothing is pushed";
    }
    return "<i>W</i> = −∫<i>p</i> d<i>V</i>";
}

struct FigureFormula {
    const char *key;
    const char *markup;
    const char *source;
};

constexpr std::array figureTable{
    FigureFormula{"work", "net work = Σ <i>W</i> of the segments", definitionOfWork},
    FigureFormula{"heat_in", "heat in = ∫max(δ<i>Q</i>, 0) along the path", formatDefinition},
    FigureFormula{"heat_out", "heat out = ∫max(−δ<i>Q</i>, 0) along the path", formatDefinition},
    FigureFormula{"steady_flow_work", "<i>W</i><sub>flow</sub> = Δ<i>H</i> − <i>Q</i>", quantities},
    FigureFormula{"entropy_generated", "<i>S</i><sub>gen</sub> = Δ<i>S</i> − Σ∫δ<i>Q</i>/<i>T</i><sub>b</sub>",
                  clausius},
    FigureFormula{"lost_work", "lost work = <i>T</i><sub>0</sub> <i>S</i><sub>gen</sub>", gouyStodola},
    FigureFormula{"mean_effective_pressure", "mep = |net work| / (<i>V</i><sub>max</sub> − <i>V</i><sub>min</sub>)",
                  formatDefinition},
    FigureFormula{"power", "power = net work × rate", formatDefinition},
    FigureFormula{"thermal_efficiency", "<i>η</i> = net work out / heat in", quantities},
    FigureFormula{"cop_heating", "COP = heat out / net work in", formatDefinition},
    FigureFormula{"cop_cooling", "COP = heat in / net work in", formatDefinition},
    FigureFormula{"carnot_ratio", "ratio to the bound 1 − <i>T</i><sub>c</sub>/<i>T</i><sub>h</sub>", carnot},
    FigureFormula{"delta_entropy", "Δ<i>S</i> = <i>S</i> after − <i>S</i> before", clausius},
    FigureFormula{"delta_enthalpy", "Δ<i>H</i> = Δ(<i>U</i> + <i>pV</i>)", quantities},
    FigureFormula{"rod_work", "rod work = <i>W</i> + <i>p</i><sub>0</sub> Δ<i>V</i>", formatDefinition},
    FigureFormula{"atmosphere_work", "on the surroundings = <i>p</i><sub>0</sub> Δ<i>V</i>", formatDefinition},
    FigureFormula{"reversible_limit_work", "the reversible path between the same contact and states", clausius},
    FigureFormula{"reversible_limit_steady_flow_work", "Δ<i>H</i> of the isentrope to the same pressure", clausius},
    FigureFormula{"shortfall", "shortfall = <i>W</i> − <i>W</i><sub>rev</sub>", formatDefinition},
    FigureFormula{"recovery", "<i>W</i>/<i>W</i><sub>rev</sub> expanding, <i>W</i><sub>rev</sub>/<i>W</i> compressing",
                  formatDefinition},
    FigureFormula{"ideal_gas_work", "<i>W</i> from the same start with the ideal part of the equation",
                  formatDefinition},
    FigureFormula{"ideal_gas_heat", "<i>Q</i> from the same start with the ideal part of the equation",
                  formatDefinition},
    FigureFormula{"ideal_gas_end_temperature", "<i>T</i> at the end as written, with the ideal part of the equation",
                  formatDefinition},
    FigureFormula{"vapour_fraction", "<i>x</i> = moles of vapour / moles, by the lever rule", formatDefinition},
    FigureFormula{"available_work",
                  "(<i>U</i>−<i>U</i><sub>0</sub>) + <i>p</i><sub>0</sub>(<i>V</i>−<i>V</i><sub>0</sub>) − "
                  "<i>T</i><sub>0</sub>(<i>S</i>−<i>S</i><sub>0</sub>)",
                  gouyStodola},
    FigureFormula{"stored_energy", "<i>U</i> − <i>U</i>(<i>s</i>, <i>p</i><sub>0</sub>), released isentropically",
                  formatDefinition},
};

} // namespace

Formula workFormula(const SegmentResult &segment, int number)
{
    return {withStates(workMarkup(segment), number), say(definitionOfWork)};
}

Formula heatFormula(const SegmentResult &segment, int number)
{
    if (path::facts(segment.kind).quasiStatic) return {QStringLiteral("<i>Q</i> = ∫<i>T</i> d<i>S</i>"), say(clausius)};
    const bool passed = segment.heat != 0.0;
    return {passed ? withStates("<i>Q</i> = <i>U</i>{b} − <i>U</i>{a} − <i>W</i>", number)
                   : say("<i>Q</i> = 0: no heat passes"),
            say(definitionOfWork)};
}

Formula internalEnergyFormula(int number)
{
    return {withStates("Δ<i>U</i> = <i>U</i>{b} − <i>U</i>{a} = <i>Q</i> + <i>W</i>", number), say(definitionOfWork)};
}

Formula figureFormula(const QString &key)
{
    for (const FigureFormula &entry : figureTable)
        if (key == QLatin1String(entry.key)) return {say(entry.markup), say(entry.source)};
    return {};
}

} // namespace quasistat::ui
