#include "ui/session/session.h"

#include "ui/session/design_command.h"
#include "ui/session/design_reading.h"
#include "ui/session/sentences.h"

namespace quasistat::ui
{

namespace
{

/// The same path in another model of its gas.
bool differsInModelAlone(const document::Design &before, const document::Design &after)
{
    const document::Json *gas = valueAt(after.json, "/gas");
    if (!gas || typedAt(before.json, "/gas/model") == typedAt(after.json, "/gas/model")) return false;
    return withValue(before, "/gas", *gas) == after;
}

} // namespace

Session::Session(QObject *parent) : QObject(parent), m_snapshot(std::make_shared<const Snapshot>())
{
    connect(&m_undo, &QUndoStack::cleanChanged, this, &Session::fileChanged);
}

void Session::open(document::Design design, const QString &path)
{
    replace(std::move(design), path, true);
}

void Session::openUnsaved(document::Design design, const QString &path)
{
    replace(std::move(design), path, true);
    m_undo.resetClean();
}

void Session::close()
{
    replace({}, {}, false);
}

void Session::replace(document::Design design, const QString &path, bool hasDesign)
{
    m_beforePreview.reset();
    m_beforeModelChange.reset();
    m_hasDesign = hasDesign;
    m_path = path;
    m_snapshot = hasDesign ? snapshotOf(std::move(design)) : std::make_shared<const Snapshot>();
    m_undo.clear();
    m_undo.setClean();
    select(-1);
    hover(-1);
    emit snapshotChanged();
    emit fileChanged();
}

void Session::markSaved(const QString &path)
{
    m_path = path;
    m_undo.setClean();
    emit fileChanged();
}

void Session::apply(const document::Design &design, const QString &text, int mergeId)
{
    if (!m_hasDesign) return;
    const document::Design before = base().design;
    if (before == design) {
        cancelPreview();
        return;
    }
    m_undo.push(new DesignCommand(*this, {before, design}, text, mergeId));
}

void Session::apply(const document::Edited &edited, const QString &text)
{
    apply(edited.design, text);
    QStringList sentences;
    for (const Warning &remark : edited.remarks) sentences << sentenceOf(remark.message, m_snapshot->units);
    if (!sentences.isEmpty()) emit remarked(sentences.join(QLatin1Char(' ')));
}

void Session::preview(const document::Design &design)
{
    if (!m_hasDesign || design == m_snapshot->design) return;
    SnapshotPtr before = m_beforePreview ? m_beforePreview : m_snapshot;
    m_snapshot = snapshotOf(design);
    m_beforePreview = std::move(before);
    clampSelection();
    emit snapshotChanged();
}

void Session::cancelPreview()
{
    if (!m_beforePreview) return;
    m_snapshot = std::move(m_beforePreview);
    m_beforePreview.reset();
    clampSelection();
    emit snapshotChanged();
}

std::optional<Failure> Session::faultIn(const document::Design &design) const
{
    const Outcome<analysis::Evaluation> outcome = document::evaluate(design, m_library);
    return outcome ? outcome->path.startFailure : std::optional(outcome.failure());
}

void Session::undo()
{
    cancelPreview();
    m_undo.undo();
}

void Session::redo()
{
    cancelPreview();
    m_undo.redo();
}

void Session::select(int segment)
{
    if (segment == m_selected) return;
    m_selected = segment;
    emit selectionChanged(segment);
}

void Session::hover(int segment)
{
    if (segment == m_hovered) return;
    m_hovered = segment;
    emit hoverChanged(segment);
}

void Session::show(document::Design design)
{
    const SnapshotPtr before = m_beforePreview ? m_beforePreview : m_snapshot;
    m_beforePreview.reset();
    m_snapshot = snapshotOf(std::move(design));
    m_beforeModelChange = differsInModelAlone(before->design, m_snapshot->design) ? before : nullptr;
    clampSelection();
    emit snapshotChanged();
}

SnapshotPtr Session::snapshotOf(document::Design design) const
{
    auto snapshot = std::make_shared<Snapshot>();
    Outcome<analysis::Evaluation> outcome = document::evaluate(design, m_library);
    snapshot->units = document::displayUnits(design);
    snapshot->design = std::move(design);
    if (outcome)
        snapshot->evaluation = std::make_shared<const analysis::Evaluation>(std::move(outcome).value());
    else
        snapshot->failure = outcome.failure();
    return snapshot;
}

void Session::clampSelection()
{
    const int count = segmentCount(m_snapshot->design);
    if (m_selected >= count) select(count - 1);
    if (m_hovered >= count) hover(-1);
}

} // namespace quasistat::ui
