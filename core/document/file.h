#pragma once
// Files read and written whole.

#include "core/outcome/outcome.h"

#include <filesystem>
#include <string>

namespace quasistat::document
{

/// The file's bytes; "-" is standard input. Fails with Reason::unreadable.
[[nodiscard]] Outcome<std::string> fileText(const std::string &path);

/// Writes a neighbour, flushes it to disk, then renames it over `path`: the old file or the new one, never half of it.
/// Keeps the permissions of an existing file and follows a symbolic link. Fails with Reason::unwritable, the old file
/// untouched.
struct Written {
};
[[nodiscard]] Outcome<Written> writeWhole(const std::string &path, std::string_view bytes);

} // namespace quasistat::document
