#pragma once
// A text file compiled into the program (resources/embed.cmake).

#include <string_view>

namespace quasistat::resources
{

struct EmbeddedText {
    std::string_view name; ///< of the file, without its ending and with blanks for "_"
    std::string_view text;
};

} // namespace quasistat::resources
