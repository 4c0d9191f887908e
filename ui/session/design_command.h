#pragma once
// The one kind of undo step: the design before and after.

#include "core/document/design.h"

#include <QUndoCommand>

namespace quasistat::ui
{

class Session;

/// Steps with the same merge id ≥ 0 in a row become one; a step that changed nothing in the end goes away.
class DesignCommand : public QUndoCommand
{
public:
    struct Change {
        document::Design before;
        document::Design after;
    };
    DesignCommand(Session &session, Change change, const QString &text, int mergeId);

    [[nodiscard]] int id() const override { return m_mergeId; }
    void undo() override;
    void redo() override;
    bool mergeWith(const QUndoCommand *other) override;

private:
    Session &m_session;
    Change m_change;
    int m_mergeId;
};

} // namespace quasistat::ui
