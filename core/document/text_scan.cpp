#include "core/document/text_scan.h"

#include "core/document/pointer.h"

#include <algorithm>
#include <set>

namespace quasistat::document
{

namespace
{

bool isBlank(char c)
{
    return c == ' ' || c == '\t' || c == '\n' || c == '\r';
}

/// The byte after the string that begins at `byte` with a quotation mark.
std::size_t afterString(std::string_view text, std::size_t byte)
{
    for (std::size_t i = byte + 1; i < text.size(); ++i) {
        if (text[i] == '\\')
            ++i;
        else if (text[i] == '"')
            return i + 1;
    }
    return text.size();
}

/// What a quoted key spells once its escapes are resolved.
std::string keyText(std::string_view quoted)
{
    if (quoted.find('\\') == std::string_view::npos) return std::string(quoted.substr(1, quoted.size() - 2));
    const Json key = Json::parse(quoted, nullptr, false);
    return key.is_string() ? key.get<std::string>() : std::string(quoted);
}

class Walk
{
public:
    Walk(std::string_view text, const std::function<bool(const Place &)> &visit) : m_text(text), m_visit(visit) {}

    void run()
    {
        if (m_text.starts_with("\xEF\xBB\xBF")) m_byte = 3;
        skipBlanks();
        value("", m_byte, false);
    }

private:
    [[nodiscard]] char here() const { return m_byte < m_text.size() ? m_text[m_byte] : '\0'; }
    void skipBlanks()
    {
        while (m_byte < m_text.size() && isBlank(m_text[m_byte])) ++m_byte;
    }

    bool value(const std::string &pointer, std::size_t keyByte, bool repeated)
    {
        if (!m_visit({pointer, m_byte, keyByte, repeated})) return false;
        if (here() == '{') return object(pointer);
        if (here() == '[') return array(pointer);
        if (here() == '"') {
            m_byte = afterString(m_text, m_byte);
            return true;
        }
        while (m_byte < m_text.size() && !isBlank(here()) && here() != ',' && here() != ']' && here() != '}') ++m_byte;
        return true;
    }

    bool object(const std::string &pointer)
    {
        std::set<std::string, std::less<>> seen;
        ++m_byte;
        skipBlanks();
        while (here() == '"') {
            const std::size_t keyByte = m_byte;
            m_byte = afterString(m_text, m_byte);
            const std::string key = keyText(m_text.substr(keyByte, m_byte - keyByte));
            skipBlanks();
            ++m_byte; // the colon
            skipBlanks();
            if (!value(pointerTo(pointer, key), keyByte, !seen.insert(key).second)) return false;
            nextElement();
        }
        ++m_byte;
        return true;
    }

    bool array(const std::string &pointer)
    {
        ++m_byte;
        skipBlanks();
        for (std::size_t index = 0; m_byte < m_text.size() && here() != ']'; ++index) {
            if (!value(pointerTo(pointer, index), m_byte, false)) return false;
            nextElement();
        }
        ++m_byte;
        return true;
    }

    void nextElement()
    {
        skipBlanks();
        if (here() == ',') ++m_byte;
        skipBlanks();
    }

    std::string_view m_text;
    const std::function<bool(const Place &)> &m_visit;
    std::size_t m_byte = 0;
};

} // namespace

Position positionAt(std::string_view text, std::size_t byte)
{
    const std::string_view before = text.substr(0, std::min(byte, text.size()));
    const std::size_t lineStart = before.rfind('\n') == std::string_view::npos ? 0 : before.rfind('\n') + 1;
    // Bytes 10xxxxxx continue a character of UTF-8.
    const auto characters = std::ranges::count_if(
        before.substr(lineStart), [](char c) { return (static_cast<unsigned char>(c) & 0xC0) != 0x80; });
    return {.line = static_cast<int>(std::ranges::count(before, '\n')) + 1, .column = static_cast<int>(characters) + 1};
}

int nestingDepth(std::string_view text)
{
    int depth = 0;
    int deepest = 0;
    for (std::size_t i = 0; i < text.size(); ++i) {
        if (text[i] == '"') {
            i = afterString(text, i) - 1;
        } else if (text[i] == '{' || text[i] == '[') {
            deepest = std::max(deepest, ++depth);
        } else if (text[i] == '}' || text[i] == ']') {
            --depth;
        }
    }
    return deepest;
}

void walkPlaces(std::string_view text, const std::function<bool(const Place &)> &visit)
{
    Walk(text, visit).run();
}

} // namespace quasistat::document
