#pragma once
// The sections of the report, each a small unit; `reportSections` is the one place to add another.

#include "ui/report/block.h"
#include "ui/report/report.h"

namespace quasistat::ui
{

/// What a section is written from.
struct ReportContent {
    const Snapshot &snapshot;
    const analysis::Evaluation &evaluation;
    const ReportOrder &order;
    double width; ///< of the text area [page units]
};

using Section = std::vector<Block> (*)(const ReportContent &);

[[nodiscard]] std::vector<Block> titleBlock(const ReportContent &content);
[[nodiscard]] std::vector<Block> basis(const ReportContent &content);
[[nodiscard]] std::vector<Block> notesSection(const ReportContent &content);
[[nodiscard]] std::vector<Block> diagramSection(const ReportContent &content);
[[nodiscard]] std::vector<Block> statesSection(const ReportContent &content);
[[nodiscard]] std::vector<Block> ledgerSection(const ReportContent &content);
[[nodiscard]] std::vector<Block> limitsReachedSection(const ReportContent &content); ///< reversible limits and rod work
[[nodiscard]] std::vector<Block> spreadSection(const ReportContent &content);        ///< nothing where the gas is ideal
[[nodiscard]] std::vector<Block> pathFiguresSection(const ReportContent &content);
[[nodiscard]] std::vector<Block> envelopeSection(const ReportContent &content);
[[nodiscard]] std::vector<Block> warningsSection(const ReportContent &content);
[[nodiscard]] std::vector<Block> assumptionsSection(const ReportContent &content);
[[nodiscard]] std::vector<Block> modelSection(const ReportContent &content);
[[nodiscard]] std::vector<Block> auditSection(const ReportContent &content);
[[nodiscard]] std::vector<Block> cautionSection(const ReportContent &content);

/// In the order of the report.
inline constexpr Section reportSections[]{
    titleBlock,      basis,         diagramSection,  statesSection,      ledgerSection,
    envelopeSection, spreadSection, cautionSection,  pathFiguresSection, limitsReachedSection,
    auditSection,    notesSection,  warningsSection, assumptionsSection, modelSection};

/// Value of a key of the document's title block, or empty: "number".
[[nodiscard]] QString documentField(const document::Design &design, const char *key);

} // namespace quasistat::ui
