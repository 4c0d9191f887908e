#pragma once
// One line of the ledger as it is shown: made from an evaluation, painted and read without knowing where it came from.

#include "ui/look/mark.h"
#include "ui/look/rich_text.h"

#include <QStringList>

#include <optional>

namespace quasistat::ui
{

enum class LedgerRowKind {
    heading,  ///< "Ledger" with the unit and the sign
    columns,  ///< what the rows below name, and the heads of their figures
    segment,  ///< number, name, three figures, audit mark
    total,    ///< the same for the path
    spread,   ///< number, name, three figures of the ideal gas over how far they are off
    formula,  ///< of an opened figure
    route,    ///< a figure found one way, with its unit
    source,   ///< where the formula is published
    sentence, ///< wrapped, of second rank
    section,  ///< a heading of a part; `opens`: with an arrow
    figure,   ///< name, figure at its decimal sign, unit
    limit,    ///< mark, name and terms, worst figure
    warning,  ///< wrapped, with a triangle
    fault,    ///< wrapped, in the error colour
};

struct LedgerRow {
    LedgerRowKind kind = LedgerRowKind::sentence;
    QString id{};   ///< "3", "3.W", "path.lost_work", "envelope"; empty: nothing to click
    QString lead{}; ///< the segment's number
    RichText label{};
    QStringList figures{};
    QStringList remarks{}; ///< one below each figure
    QString unit{};
    std::optional<StateMark> mark{};
    int segment = -1;    ///< from 0; of the rows that belong to one
    bool struck = false; ///< heat that failed its audit: digits struck
    bool opens = false;  ///< has more to show
    bool isOpen = false; ///< and shows it
    bool opened = false; ///< belongs to an opened figure: on its ground
    bool warned = false; ///< in the warning colour
    bool strong = false; ///< a sentence in full ink: it stands until the next edit

    [[nodiscard]] QString spoken() const; ///< the row in words
};

} // namespace quasistat::ui
