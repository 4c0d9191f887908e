#pragma once
// What a person does to whole segments, each one undo step: from a card, from the menu or by a key.

#include "ui/session/session.h"

namespace quasistat::ui
{

/// `segment` counts from 0; one that does not exist is left alone.
void duplicateSegment(Session &session, int segment);
void deleteSegment(Session &session, int segment);
void moveSegment(Session &session, int from, int to);
void changeKind(Session &session, int segment, path::Kind kind);
/// A new segment of `kind` at `index` (0 to the number of segments), leading to a sensible end from the state there.
void insertSegment(Session &session, int index, path::Kind kind);

} // namespace quasistat::ui
