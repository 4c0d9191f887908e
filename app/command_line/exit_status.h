#pragma once
// Exit statuses of the program; scripts rely on them.

namespace quasistat::app
{

enum class ExitStatus {
    done = 0,
    failedCheck = 1,    ///< a limit or an audit failed
    wrongUsage = 64,    ///< the call itself
    wrongDocument = 65, ///< the document is wrong or cannot be computed
    unreadable = 66,    ///< input cannot be read
    unwritable = 73,    ///< output cannot be written
};

} // namespace quasistat::app
