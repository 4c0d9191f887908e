#pragma once
// The report: a design and its evaluation as a PDF that a reviewer can check.

#include "core/outcome/outcome.h"
#include "ui/report/page.h"
#include "ui/session/session.h"

#include <QByteArray>
#include <QString>

namespace quasistat::ui
{

/// What a report needs beside the snapshot.
struct ReportOrder {
    PageSize pageSize = PageSize::a4;
    QString programVersion; ///< "0.1.0"
    QString fileName;       ///< of the design, without folder: names the attachment
};

/// The PDF's bytes: title block, annotated diagram, states, ledger, envelope, assumptions, model and source, warnings,
/// cautions; the design's file attached. Fails with the snapshot's own failure where nothing, or not the whole path,
/// could be computed. Needs a QApplication (the offscreen platform will do).
[[nodiscard]] Outcome<QByteArray> report(const Snapshot &snapshot, const ReportOrder &order);

} // namespace quasistat::ui
