#pragma once
// The one open design: its undo stack, its evaluation, what is selected. Every view reads from here and edits through
// here.

#include "core/analysis/evaluation.h"
#include "core/document/edit.h"
#include "core/document/interpret.h"

#include <QObject>
#include <QUndoStack>

#include <memory>

namespace quasistat::ui
{

using EvaluationPtr = std::shared_ptr<const analysis::Evaluation>;

/// What the views show: a design and what came of it. `evaluation` is null where the document as a whole cannot be
/// computed; `failure` then says why. A faulty segment alone is a failure inside the evaluation.
struct Snapshot {
    document::Design design;
    EvaluationPtr evaluation;
    std::optional<Failure> failure;
    units::DisplayUnits units;
};
using SnapshotPtr = std::shared_ptr<const Snapshot>;

/// `selected` of a session when the start state, not a segment, is chosen.
inline constexpr int startSelected = -2;

class Session : public QObject
{
    Q_OBJECT
public:
    explicit Session(QObject *parent = nullptr);

    [[nodiscard]] const Snapshot &now() const { return *m_snapshot; }
    [[nodiscard]] SnapshotPtr shared() const { return m_snapshot; }
    [[nodiscard]] const gas::Library &library() const { return m_library; }
    [[nodiscard]] QUndoStack &undoStack() { return m_undo; }
    [[nodiscard]] bool hasDesign() const { return m_hasDesign; } ///< false: the welcome state
    [[nodiscard]] bool isModified() const { return m_hasDesign && !m_undo.isClean(); }

    /// Replaces everything: a file opened or a new design. Clears the undo stack; `path` empty for an unsaved one.
    void open(document::Design design, const QString &path);
    /// As open, but the design counts as changed since it was saved: work that was recovered.
    void openUnsaved(document::Design design, const QString &path);
    void close(); ///< back to the welcome state
    [[nodiscard]] const QString &filePath() const { return m_path; }
    void markSaved(const QString &path);

    /// One undo step from the design before the preview (or now) to `design`. Nothing is pushed if they are equal.
    /// Steps with the same `mergeId` ≥ 0 in a row become one.
    void apply(const document::Design &design, const QString &text, int mergeId = -1);
    void apply(const document::Edited &edited, const QString &text); ///< remarks are shown as a status message
    /// Shows `design` without an undo step, while a handle is dragged or a field is typed in.
    void preview(const document::Design &design);
    void cancelPreview();
    [[nodiscard]] bool isPreviewing() const { return m_beforePreview != nullptr; }
    /// The design an edit starts from: the one before the preview, or now.
    [[nodiscard]] const Snapshot &base() const { return m_beforePreview ? *m_beforePreview : *m_snapshot; }
    /// What was shown before the last step, if that step changed the gas alone and gave it another model; else null.
    [[nodiscard]] const Snapshot *beforeModelChange() const
    {
        return isPreviewing() ? nullptr : m_beforeModelChange.get();
    }
    /// Why `design` as a whole, or its start, cannot be computed; none if it can.
    [[nodiscard]] std::optional<Failure> faultIn(const document::Design &design) const;
    void undo(); ///< ends a preview first
    void redo();

    /// Segment index from 0; −1: none; startSelected: the start state.
    [[nodiscard]] int selected() const { return m_selected; }
    [[nodiscard]] int hovered() const { return m_hovered; }
    void select(int segment);
    void hover(int segment);

signals:
    void snapshotChanged(); ///< after any change of design or evaluation, once
    void selectionChanged(int segment);
    void hoverChanged(int segment);
    void fileChanged(); ///< path or saved state
    void remarked(const QString &sentence);

private:
    friend class DesignCommand;
    void show(document::Design design);
    [[nodiscard]] SnapshotPtr snapshotOf(document::Design design) const;
    void replace(document::Design design, const QString &path, bool hasDesign);
    void clampSelection();

    gas::Library m_library;
    QUndoStack m_undo;
    SnapshotPtr m_snapshot;
    SnapshotPtr m_beforePreview;
    SnapshotPtr m_beforeModelChange;
    QString m_path;
    bool m_hasDesign = false;
    int m_selected = -1;
    int m_hovered = -1;
};

} // namespace quasistat::ui
