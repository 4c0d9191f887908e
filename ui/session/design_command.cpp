#include "ui/session/design_command.h"

#include "ui/session/session.h"

namespace quasistat::ui
{

DesignCommand::DesignCommand(Session &session, Change change, const QString &text, int mergeId)
    : QUndoCommand(text), m_session(session), m_change(std::move(change)), m_mergeId(mergeId)
{
}

void DesignCommand::undo()
{
    m_session.show(m_change.before);
}

void DesignCommand::redo()
{
    m_session.show(m_change.after);
}

bool DesignCommand::mergeWith(const QUndoCommand *other)
{
    // The stack only offers commands of the same id, and all commands of one stack are of this class.
    const auto *later = static_cast<const DesignCommand *>(other);
    m_change.after = later->m_change.after;
    setObsolete(m_change.before == m_change.after);
    return true;
}

} // namespace quasistat::ui
