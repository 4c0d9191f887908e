#include "ui/ledger/ledger_rows.h"

#include "ui/gas/model_spread.h"
#include "ui/ledger/verdict_words.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"

#include <QCoreApplication>

namespace quasistat::ui
{
namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("Ledger", text);
}

void append(std::vector<LedgerRow> &rows, std::vector<LedgerRow> more)
{
    rows.insert(rows.end(), std::make_move_iterator(more.begin()), std::make_move_iterator(more.end()));
}

LedgerRow textRow(LedgerRowKind kind, const QString &text)
{
    LedgerRow row{.kind = kind};
    row.label = RichText::plain(text);
    return row;
}

LedgerRow limitRow(const analysis::Limit &limit, const analysis::Verdict &verdict, const units::DisplayUnits &units)
{
    LedgerRow row{.kind = LedgerRowKind::limit};
    row.id = QStringLiteral("limit%1").arg(verdict.limit + 1);
    const RichText terms = RichText::marked(limitTerms(limit, units));
    row.label = limit.label.empty()
                    ? terms
                    : RichText::plain(QString::fromStdString(limit.label) + QStringLiteral(", ")) + terms;
    row.figures = {worstFigure(limit, verdict, units)};
    row.warned = !verdict.ok;
    if (verdict.worst) row.mark = verdict.ok ? StateMark::tick : StateMark::warning;
    row.segment = verdict.segment - 1;
    return row;
}

QString placed(const Warning &warning, const units::DisplayUnits &units)
{
    const QString sentence = sentenceOf(warning.message, units);
    const int segment = segmentOf(warning.pointer);
    return segment < 0 ? sentence : say("Segment %1: %2").arg(segment + 1).arg(sentence);
}

} // namespace

std::vector<LedgerRow> envelopeRows(const Snapshot &snapshot)
{
    const analysis::Evaluation &evaluation = *snapshot.evaluation;
    LedgerRow section = textRow(LedgerRowKind::section, say("Envelope"));
    section.id = QStringLiteral("envelope");
    section.opens = true;
    std::vector<LedgerRow> rows{section};
    if (evaluation.limits.empty())
        rows.push_back(textRow(LedgerRowKind::sentence, say("No limits are stated for the equipment.")));
    for (const analysis::Verdict &verdict : evaluation.verdicts) {
        rows.push_back(limitRow(evaluation.limits[verdict.limit], verdict, snapshot.units));
        const QString sentence = verdictSentence(evaluation, verdict, snapshot.units);
        if (!sentence.isEmpty()) {
            LedgerRow row = textRow(LedgerRowKind::sentence, sentence);
            row.lead = QStringLiteral(" "); // under the name, not under the mark
            rows.push_back(row);
        }
    }
    return rows;
}

std::vector<LedgerRow> warningRows(const Snapshot &snapshot)
{
    std::vector<LedgerRow> rows;
    const path::PathResult &path = snapshot.evaluation->path;
    QStringList said; // a segment's own warnings may stand among the path's too
    const auto add = [&](const QString &sentence, int segment) {
        if (said.contains(sentence)) return;
        said << sentence;
        LedgerRow row = textRow(LedgerRowKind::warning, sentence);
        row.segment = segment;
        rows.push_back(row);
    };
    for (const Warning &warning : path.warnings) add(placed(warning, snapshot.units), segmentOf(warning.pointer));
    for (std::size_t k = 0; k < path.segments.size(); ++k)
        for (const Message &message : path.segments[k].warnings) {
            const int segment = static_cast<int>(k);
            const QString sentence = say("Segment %1: %2").arg(segment + 1).arg(sentenceOf(message, snapshot.units));
            add(sentence, segment);
        }
    if (!rows.empty()) rows.insert(rows.begin(), textRow(LedgerRowKind::section, say("Warnings")));
    return rows;
}

std::vector<LedgerRow> ledgerRows(const Snapshot &snapshot, int selected, const LedgerOpen &open,
                                  const Snapshot *before)
{
    if (!snapshot.evaluation) {
        LedgerRow heading = textRow(LedgerRowKind::heading, say("Ledger"));
        if (!snapshot.failure) return {heading};
        return {heading, textRow(LedgerRowKind::fault, sentenceOf(*snapshot.failure, snapshot.units))};
    }
    const path::PathResult &path = snapshot.evaluation->path;
    std::vector<LedgerRow> rows = accountRows(snapshot, open);
    if (path.startFailure)
        rows.push_back(textRow(LedgerRowKind::fault, sentenceOf(*path.startFailure, snapshot.units)));
    for (std::size_t k = 0; k < path.failures.size(); ++k) {
        const auto &failure = path.failures[k];
        if (!failure || failure->reason == Reason::notReached) continue;
        const QString sentence = say("Segment %1: %2").arg(k + 1).arg(sentenceOf(*failure, snapshot.units));
        rows.push_back(textRow(LedgerRowKind::fault, sentence));
    }
    if (path.failures.empty())
        rows.push_back(textRow(LedgerRowKind::sentence, say("The path has no segments yet: place the first one.")));
    if (before) {
        LedgerRow change{.kind = LedgerRowKind::sentence};
        change.id = QStringLiteral("modelChange");
        change.label = modelChangeWords(*before, snapshot);
        change.strong = true;
        rows.push_back(change);
    }
    append(rows, segmentFigureRows(snapshot, selected, open));
    append(rows, spreadRows(snapshot, open));
    append(rows, pathFigureRows(snapshot, open));
    append(rows, envelopeRows(snapshot));
    append(rows, warningRows(snapshot));
    return rows;
}

} // namespace quasistat::ui
