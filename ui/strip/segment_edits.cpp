#include "ui/strip/segment_edits.h"

#include "ui/strip/segment_form.h"

#include <QCoreApplication>

namespace quasistat::ui
{

namespace
{

QString say(const char *text)
{
    return QCoreApplication::translate("SegmentEdits", text);
}

bool exists(const Session &session, int segment)
{
    return segment >= 0 && segment < segmentCount(session.base().design);
}

path::PathResult pathBefore(const Session &session)
{
    const auto &evaluation = session.base().evaluation;
    return evaluation ? evaluation->path : path::PathResult{};
}

QString kindName(path::Kind kind)
{
    const auto words = path::facts(kind).words;
    return QString::fromUtf8(words.data(), static_cast<qsizetype>(words.size()));
}

} // namespace

void duplicateSegment(Session &session, int segment)
{
    if (!exists(session, segment)) return;
    const auto at = static_cast<std::size_t>(segment);
    session.apply(document::segmentDuplicated(session.base().design, at, pathBefore(session)),
                  say("Duplicate segment %1").arg(segment + 1));
    session.select(segment + 1);
}

void deleteSegment(Session &session, int segment)
{
    if (!exists(session, segment)) return;
    const auto at = static_cast<std::size_t>(segment);
    session.apply(document::segmentDeleted(session.base().design, at, pathBefore(session)),
                  say("Delete segment %1").arg(segment + 1));
}

void moveSegment(Session &session, int from, int to)
{
    if (!exists(session, from) || !exists(session, to) || from == to) return;
    session.apply(document::segmentMoved(session.base().design, static_cast<std::size_t>(from),
                                         static_cast<std::size_t>(to), pathBefore(session)),
                  say("Move segment %1").arg(from + 1));
    session.select(to);
}

void changeKind(Session &session, int segment, path::Kind kind)
{
    if (!exists(session, segment)) return;
    session.apply(
        document::kindChanged(session.base().design, static_cast<std::size_t>(segment), kind, pathBefore(session)),
        say("Make segment %1 %2").arg(segment + 1).arg(kindName(kind)));
}

void insertSegment(Session &session, int index, path::Kind kind)
{
    const path::PathResult before = pathBefore(session);
    const auto at = static_cast<std::size_t>(index);
    if (index < 0 || index > segmentCount(session.base().design) || at >= before.states.size()) {
        emit session.remarked(say("The path must be computed up to there before a segment can be added."));
        return;
    }
    const document::Json segment = segmentTemplate(kind, before.states[at].state, session.base().units);
    session.apply(document::segmentInserted(session.base().design, at, segment, before),
                  say("Insert %1 segment").arg(kindName(kind)));
    session.select(index);
}

} // namespace quasistat::ui
