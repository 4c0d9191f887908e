#pragma once
// A text that a field offers while typing.

#include <QString>

namespace quasistat::ui
{

struct Suggestion {
    QString text;  ///< what is entered
    QString words; ///< what is shown: `text`, perhaps with a remark
    QString keys;  ///< further words it is found by
    bool operator==(const Suggestion &) const = default;
};

} // namespace quasistat::ui
