#include "ui/strip/card_face.h"

#include "ui/session/sentences.h"
#include "ui/strip/segment_words.h"

#include <QCoreApplication>

#include <algorithm>

namespace quasistat::ui
{

namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("Strip", text);
}

/// Index of the failed segment that later ones wait for; −1: none.
int firstFailed(const path::PathResult &path)
{
    for (std::size_t k = 0; k < path.failures.size(); ++k)
        if (path.failures[k] && path.failures[k]->reason != Reason::notReached) return static_cast<int>(k);
    return -1;
}

QString exceededLimit(const analysis::Evaluation &evaluation, int segment)
{
    for (const analysis::Verdict &verdict : evaluation.verdicts) {
        if (verdict.ok) continue;
        for (const analysis::Violation &violation : verdict.violations)
            if (violation.segment == segment + 1) return limitName(evaluation.limits[verdict.limit]);
    }
    return {};
}

void giveFailure(CardFace &face, const Failure &failure, const path::PathResult &path, const units::DisplayUnits &units)
{
    if (failure.reason != Reason::notReached) {
        face.standing = CardStanding::error;
        face.sentence = sentenceOf(failure, units);
        return;
    }
    face.standing = CardStanding::waiting;
    const int cause = firstFailed(path);
    face.sentence = cause >= 0 ? say("Waits for segment %1.").arg(cause + 1) : say("Waits for the start state.");
}

void giveFigures(CardFace &face, const path::SegmentResult &result, const Snapshot &snapshot, const units::Scale &scale)
{
    face.work = result.work;
    face.heat = result.heat;
    const double sign = shownSign(snapshot.units);
    face.workText = figureWithUnit(sign * result.work, scale);
    face.heatText = figureWithUnit(sign * result.heat, scale);
    const QString limit = exceededLimit(*snapshot.evaluation, face.segment);
    if (!result.audit.ok) {
        face.standing = CardStanding::failedAudit;
        face.mark = say("audit");
        face.sentence =
            say("The two routes differ by %1.")
                .arg(shownFigure(std::abs(result.audit.firstLawResidual), units::Quantity::energy, snapshot.units));
    } else if (!limit.isEmpty()) {
        face.standing = CardStanding::warned;
        face.mark = limit;
    }
}

CardFace faceOf(const document::Json &segment, int index, const Snapshot &snapshot, const units::Scale &scale)
{
    CardFace face;
    face.segment = index;
    face.kind = path::kindFromKey(typedAt(segment, "/kind").toStdString());
    face.title = segmentTitle(segment);
    face.end = endWords(segment);
    face.endInShort = endWordsInShort(segment);
    const auto at = static_cast<std::size_t>(index);
    const path::PathResult *path = snapshot.evaluation ? &snapshot.evaluation->path : nullptr;
    const path::SegmentResult *result = path && at < path->segments.size() ? &path->segments[at] : nullptr;
    const RichText words = kindWords(segment, result);
    if (words.unstyled() != face.title) face.second = words;
    if (result)
        giveFigures(face, *result, snapshot, scale);
    else if (path && at < path->failures.size() && path->failures[at])
        giveFailure(face, *path->failures[at], *path, snapshot.units);
    else {
        face.standing = CardStanding::waiting;
        face.sentence = say("Waits for the start state.");
    }
    return face;
}

} // namespace

QString CardFace::spoken() const
{
    QStringList parts{say("segment %1").arg(segment + 1), title, second.unstyled(), end.unstyled()};
    if (hasFigures()) parts << say("work %1").arg(workText) << say("heat %1").arg(heatText);
    parts << mark << sentence;
    parts.removeAll(QString());
    return parts.join(QStringLiteral(", "));
}

StripFaces stripFaces(const Snapshot &snapshot)
{
    StripFaces faces;
    std::vector<double> energies;
    if (snapshot.evaluation)
        for (const path::SegmentResult &result : snapshot.evaluation->path.segments) {
            energies.push_back(result.work);
            energies.push_back(result.heat);
        }
    for (const double energy : energies) faces.scale.largest = std::max(faces.scale.largest, std::abs(energy));
    units::Scale scale = units::scaleFor(units::Quantity::energy, energies, snapshot.units);
    if (scale.decimals > 1) --scale.decimals; // the ledger has them all; a card is read at a glance
    if (faces.scale.largest > 0.0)
        faces.scale.caption =
            say("full bar: %1").arg(shownFigure(faces.scale.largest, units::Quantity::energy, snapshot.units, 3));
    for (int k = 0; k < segmentCount(snapshot.design); ++k)
        faces.cards.push_back(faceOf(*segmentAt(snapshot.design, k), k, snapshot, scale));
    return faces;
}

} // namespace quasistat::ui
