#include "core/outcome/message.h"

#include <cctype>

namespace quasistat
{

Message because(Message what, const Message &why)
{
    what.text += ": ";
    const std::size_t offset = what.arguments.size();
    // Placeholders of the second template count on from those of the first.
    for (std::size_t i = 0; i < why.text.size(); ++i) {
        what.text += why.text[i];
        if (why.text[i] != '{') continue;
        std::size_t number = 0;
        std::size_t k = i + 1;
        while (k < why.text.size() && std::isdigit(static_cast<unsigned char>(why.text[k])))
            number = 10 * number + static_cast<std::size_t>(why.text[k++] - '0');
        what.text += std::to_string(number + offset);
        i = k - 1;
    }
    what.arguments.insert(what.arguments.end(), why.arguments.begin(), why.arguments.end());
    return what;
}

} // namespace quasistat
