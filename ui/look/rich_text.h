#pragma once
// A line of text with the few distinctions of style that quantities need: italic symbols, subscripts, weight.

#include <QList>
#include <QString>

namespace quasistat::ui
{

struct Run {
    QString text;
    bool italic = false;
    bool subscript = false;
    bool bold = false;
    bool operator==(const Run &) const = default;
};

class RichText
{
public:
    RichText() = default;
    /// Text as it stands: for anything a user typed.
    [[nodiscard]] static RichText plain(const QString &text);
    /// Text with the marks <i>, <sub>, <b> and their ends, also nested: "<i>p</i><sub>ext</sub> / bar". Any other '<'
    /// is itself.
    [[nodiscard]] static RichText marked(const QString &markup);

    [[nodiscard]] static RichText styled(const Run &run);

    RichText &operator+=(const RichText &more);
    [[nodiscard]] friend RichText operator+(RichText first, const RichText &second) { return first += second; }
    [[nodiscard]] RichText inBold() const;

    [[nodiscard]] const QList<Run> &runs() const { return m_runs; }
    [[nodiscard]] bool isEmpty() const { return m_runs.isEmpty(); }
    [[nodiscard]] QString unstyled() const;
    bool operator==(const RichText &) const = default;

private:
    QList<Run> m_runs;
};

} // namespace quasistat::ui
