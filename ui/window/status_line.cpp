#include "ui/window/status_line.h"

#include "ui/look/figure_text.h"
#include "ui/look/mark.h"
#include "ui/look/type.h"

#include <QPainter>

#include <algorithm>

namespace quasistat::ui
{

StatusLine::StatusLine(Session &session, QWidget *parent)
    : QWidget(parent), m_session(session), m_look(ui::palette(Scheme::light))
{
    setFixedHeight(height);
    m_fade.setSingleShot(true);
    m_fade.setInterval(12000);
    connect(&m_fade, &QTimer::timeout, this, [this] { say({}); });
    connect(&session, &Session::remarked, this, &StatusLine::say);
    connect(&session, &Session::snapshotChanged, this, [this] {
        setAccessibleName(auditWords() + QStringLiteral(", ") + envelopeWords());
        update();
    });
}

void StatusLine::setLook(const Palette &look)
{
    m_look = look;
    update();
}

void StatusLine::say(const QString &sentence)
{
    m_sentence = sentence;
    setAccessibleDescription(sentence);
    if (!sentence.isEmpty()) m_fade.start();
    update();
}

void StatusLine::setHint(const QString &hint)
{
    m_hint = hint;
    update();
}

QString StatusLine::auditWords() const
{
    const auto &evaluation = m_session.now().evaluation;
    if (!evaluation || evaluation->path.segments.empty()) return {};
    const auto &segments = evaluation->path.segments;
    const auto agree =
        std::count_if(segments.begin(), segments.end(), [](const auto &segment) { return segment.audit.ok; });
    return tr("audit: %1 of %2 agree").arg(agree).arg(segments.size());
}

QString StatusLine::envelopeWords() const
{
    const auto &evaluation = m_session.now().evaluation;
    if (!evaluation || evaluation->verdicts.empty()) return {};
    const auto &verdicts = evaluation->verdicts;
    const auto broken =
        std::count_if(verdicts.begin(), verdicts.end(), [](const auto &verdict) { return !verdict.ok; });
    return broken == 0 ? tr("envelope: holds") : tr("envelope: %1 of %2 exceeded").arg(broken).arg(verdicts.size());
}

void StatusLine::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.setRenderHint(QPainter::Antialiasing);
    painter.fillRect(rect(), m_look.panel);
    painter.fillRect(QRect(0, 0, width(), 1), m_look.rule());
    double right = width() - 16;
    const auto put = [&](const QString &words, StateMark mark, const QColor &colour) {
        if (words.isEmpty()) return;
        painter.setPen(m_look.ink);
        drawText(painter, {right, 16.5}, words, labelFace(), Align::right);
        right -= textWidth(words, labelFace()) + 13;
        drawMark(painter, mark, {right, 12}, colour, m_look.panel);
        right -= 24;
    };
    const auto &evaluation = m_session.now().evaluation;
    const bool holds = !evaluation || evaluation->envelopeHolds();
    const bool agrees = !evaluation || evaluation->auditsAgree();
    put(envelopeWords(), holds ? StateMark::tick : StateMark::warning, holds ? m_look.accent : m_look.warning);
    put(auditWords(), agrees ? StateMark::tick : StateMark::cross, agrees ? m_look.accent : m_look.error);
    painter.setPen(faded(m_look.ink, 0.85));
    drawText(painter, {16, 16.5}, elided(sentence(), labelFace(), right - 24), labelFace());
}

} // namespace quasistat::ui
