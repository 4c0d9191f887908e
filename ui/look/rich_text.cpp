#include "ui/look/rich_text.h"

#include <array>

namespace quasistat::ui
{
namespace
{

struct Mark {
    QLatin1String text;
    bool Run::*style;
    bool on;
};

constexpr std::array marks{
    Mark{QLatin1String("<i>"), &Run::italic, true},      Mark{QLatin1String("</i>"), &Run::italic, false},
    Mark{QLatin1String("<sub>"), &Run::subscript, true}, Mark{QLatin1String("</sub>"), &Run::subscript, false},
    Mark{QLatin1String("<b>"), &Run::bold, true},        Mark{QLatin1String("</b>"), &Run::bold, false},
};

const Mark *markAt(QStringView text)
{
    for (const auto &mark : marks)
        if (text.startsWith(mark.text)) return &mark;
    return nullptr;
}

} // namespace

RichText RichText::plain(const QString &text)
{
    RichText result;
    if (!text.isEmpty()) result.m_runs.append(Run{text});
    return result;
}

RichText RichText::styled(const Run &run)
{
    RichText result;
    if (!run.text.isEmpty()) result.m_runs.append(run);
    return result;
}

RichText RichText::marked(const QString &markup)
{
    RichText result;
    Run run;
    const auto finish = [&] {
        if (!run.text.isEmpty()) result.m_runs.append(run);
        run.text.clear();
    };
    for (qsizetype i = 0; i < markup.size();) {
        if (const Mark *mark = markAt(QStringView(markup).mid(i))) {
            finish();
            run.*(mark->style) = mark->on;
            i += mark->text.size();
        } else {
            run.text.append(markup.at(i++));
        }
    }
    finish();
    return result;
}

RichText &RichText::operator+=(const RichText &more)
{
    m_runs.append(more.m_runs);
    return *this;
}

RichText RichText::inBold() const
{
    RichText result = *this;
    for (auto &run : result.m_runs) run.bold = true;
    return result;
}

QString RichText::unstyled() const
{
    QString result;
    for (const auto &run : m_runs) result += run.text;
    return result;
}

} // namespace quasistat::ui
