// Envelope, notes, warnings, assumptions, the model and the cautions: what a reviewer asks after the figures.

#include "core/analysis/caution.h"
#include "ui/ledger/verdict_words.h"
#include "ui/report/prose.h"
#include "ui/report/sections.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"

#include <QCoreApplication>

#include <algorithm>

namespace quasistat::ui
{
namespace
{

using path::Kind;

QString say(const char *text)
{
    return QCoreApplication::translate("Report", text);
}

std::vector<Block> section(const QString &title, const std::vector<RichText> &paragraphs, double width)
{
    if (paragraphs.empty()) return {};
    std::vector<Block> blocks{heading(title, width)};
    for (const RichText &words : paragraphs) blocks.push_back(paragraph(words, width));
    blocks.push_back(space(8.0));
    return blocks;
}

bool uses(const path::PathResult &path, Kind kind)
{
    return std::any_of(path.segments.begin(), path.segments.end(),
                       [&](const path::SegmentResult &segment) { return segment.kind == kind; });
}

/// Meaning of the kinds that occur, in the words of the format.
void addMeanings(std::vector<RichText> &list, const path::PathResult &path)
{
    const bool quasiStatic =
        std::any_of(path.segments.begin(), path.segments.end(),
                    [](const path::SegmentResult &segment) { return path::facts(segment.kind).quasiStatic; });
    if (quasiStatic)
        list.push_back(RichText::marked(
            say("Quasi-static segments pass through equilibrium states: <i>W</i> = −∫<i>p</i> d<i>V</i>, "
                "<i>Q</i> = ∫<i>T</i> d<i>S</i>, each by its own quadrature; no entropy is generated.")));
    if (uses(path, Kind::constantExternalPressure))
        list.push_back(RichText::marked(
            say("Constant external pressure: <i>W</i> = −<i>p</i><sub>ext</sub> Δ<i>V</i>; the gas is in "
                "equilibrium at the start and at the end only.")));
    if (uses(path, Kind::stepped))
        list.push_back(
            RichText::plain(say("Stepped: each step is made against its own constant pressure and ends at balance.")));
    if (uses(path, Kind::freeExpansion))
        list.push_back(RichText::marked(
            say("Free expansion: <i>W</i> = 0; the drawn curve is a guide for the eye, its area is no work.")));
}

} // namespace

std::vector<Block> notesSection(const ReportContent &content)
{
    const QString notes = typedAt(content.snapshot.design.json, "/notes");
    if (notes.trimmed().isEmpty()) return {};
    std::vector<RichText> paragraphs;
    for (const QString &line : notes.split(QLatin1Char('\n'), Qt::SkipEmptyParts))
        paragraphs.push_back(RichText::plain(line));
    return section(say("Purpose and notes"), paragraphs, content.width);
}

std::vector<Block> envelopeSection(const ReportContent &content)
{
    const analysis::Evaluation &evaluation = content.evaluation;
    if (evaluation.verdicts.empty()) return {};
    std::vector<Block> blocks{heading(say("Envelope"), content.width)};
    for (const analysis::Verdict &verdict : evaluation.verdicts) {
        const analysis::Limit &limit = evaluation.limits[verdict.limit];
        const units::DisplayUnits &units = content.snapshot.units;
        QString name = limitName(limit);
        if (!name.isEmpty()) name[0] = name[0].toUpper();
        const QString terms = limitTerms(limit, units);
        const QString worst = worstFigure(limit, verdict, units);
        // A label may hold any character; only the terms are marked text.
        RichText words =
            RichText::plain((verdict.ok ? say("Kept. %1, ") : say("%1, ")).arg(name)) + RichText::marked(terms);
        if (worst.isEmpty())
            words += RichText::plain(say(": nothing to check on this path."));
        else if (verdict.ok)
            words += RichText::plain(say(": nearest at %1.").arg(worst));
        else
            words += RichText::plain(say(": %1. %2").arg(worst, verdictSentence(evaluation, verdict, units)));
        blocks.push_back(paragraph(words, content.width, verdict.ok ? StateMark::tick : StateMark::warning));
    }
    blocks.push_back(space(8.0));
    return blocks;
}

std::vector<Block> warningsSection(const ReportContent &content)
{
    if (content.evaluation.path.warnings.empty()) return {};
    std::vector<Block> blocks{heading(say("Warnings"), content.width)};
    for (const Warning &warning : content.evaluation.path.warnings) {
        QString words = sentenceOf(warning.message, content.snapshot.units);
        if (const int segment = segmentOf(warning.pointer); segment >= 0)
            words = say("Segment %1: %2").arg(segment + 1).arg(words);
        blocks.push_back(paragraph(RichText::plain(words), content.width, StateMark::warning));
    }
    blocks.push_back(space(8.0));
    return blocks;
}

std::vector<Block> assumptionsSection(const ReportContent &content)
{
    const path::PathResult &path = content.evaluation.path;
    std::vector<RichText> list;
    list.push_back(RichText::marked(
        content.snapshot.units.workByGas
            ? say("Work and heat are shown positive when energy leaves the gas; the file and its figures keep the "
                  "IUPAC sign, positive into the gas, Δ<i>U</i> = <i>Q</i> + <i>W</i>.")
            : say("Work and heat are positive when energy enters the gas (IUPAC), Δ<i>U</i> = <i>Q</i> + <i>W</i>.")));
    addMeanings(list, path);
    list.push_back(RichText::marked(
        say("Lost work is <i>T</i><sub>0</sub> times the entropy generated (Gouy–Stodola), at the temperature of the "
            "surroundings.")));
    list.push_back(RichText::plain(say(
        "The charge is closed: its amount does not change. Kinetic energy, height, leakage and the heat capacity of "
        "the walls are left out.")));
    list.push_back(RichText::plain(
        say("Energies and entropies are zero for each component as ideal gas at 298.15 K and 100 kPa.")));
    list.push_back(RichText::plain(say("Stored energy is an isentropic release to the pressure of the surroundings.")));
    return section(say("Assumptions"), list, content.width);
}

std::vector<Block> cautionSection(const ReportContent &content)
{
    std::vector<RichText> paragraphs{
        RichText::marked(QStringLiteral("<b>%1</b> ").arg(say("Caution."))) +
        RichText::plain(say("These results are estimates for planning. Pressure equipment, relief and oxygen service "
                            "are governed by local "
                            "codes and must be reviewed by a licensed or otherwise competent person."))};
    for (const Warning &warning : analysis::cautions(content.evaluation.path))
        paragraphs.push_back(RichText::plain(sentenceOf(warning.message, content.snapshot.units)));
    return {space(2.0), caution(paragraphs, content.width), space(12.0)};
}

} // namespace quasistat::ui
