#pragma once
// The rows of the ledger for one state of the session. Pure: no widgets, no painting.

#include "ui/ledger/ledger_row.h"
#include "ui/session/session.h"

#include <vector>

namespace quasistat::ui
{

/// What of the ledger stands open.
struct LedgerOpen {
    QString figure;              ///< id of the opened figure: "3.W", "path.lost_work"
    bool segmentFigures = false; ///< further figures of the selected segment
    bool spread = false;         ///< what an ideal gas would have given, segment by segment
};

/// `before`: what the last step changed the model of; null where it was another step.
[[nodiscard]] std::vector<LedgerRow> ledgerRows(const Snapshot &snapshot, int selected, const LedgerOpen &open,
                                                const Snapshot *before = nullptr);

/// The scale of the account's columns: enough decimals that every row and every column closes as printed, two more than
/// the readable ones at most.
[[nodiscard]] units::Scale accountScale(const path::PathResult &path, const units::DisplayUnits &units);

/// Rows of the account: columns, segments with an opened figure, total, closure.
[[nodiscard]] std::vector<LedgerRow> accountRows(const Snapshot &snapshot, const LedgerOpen &open);
/// Rows of the path's figures and of the selected segment's.
[[nodiscard]] std::vector<LedgerRow> pathFigureRows(const Snapshot &snapshot, const LedgerOpen &open);
[[nodiscard]] std::vector<LedgerRow> segmentFigureRows(const Snapshot &snapshot, int segment, const LedgerOpen &open);
/// The ideal gas beside the real one; nothing where the gas is ideal.
[[nodiscard]] std::vector<LedgerRow> spreadRows(const Snapshot &snapshot, const LedgerOpen &open);
[[nodiscard]] std::vector<LedgerRow> envelopeRows(const Snapshot &snapshot);
[[nodiscard]] std::vector<LedgerRow> warningRows(const Snapshot &snapshot);

} // namespace quasistat::ui
