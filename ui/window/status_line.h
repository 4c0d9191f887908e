#pragma once
// The lowest line of the window: what was just said, and the standing of audit and envelope.

#include "ui/look/palette.h"
#include "ui/session/session.h"

#include <QTimer>
#include <QWidget>

namespace quasistat::ui
{

class StatusLine : public QWidget
{
    Q_OBJECT
public:
    static constexpr int height = 24;

    explicit StatusLine(Session &session, QWidget *parent = nullptr);

    void setLook(const Palette &look);
    /// Stands until something else is said or for some seconds.
    void say(const QString &sentence);
    /// Stands until it is taken back with an empty one.
    void setHint(const QString &hint);

    [[nodiscard]] QString sentence() const { return m_sentence.isEmpty() ? m_hint : m_sentence; }
    [[nodiscard]] QString auditWords() const;
    [[nodiscard]] QString envelopeWords() const;

protected:
    void paintEvent(QPaintEvent *event) override;

private:
    Session &m_session;
    Palette m_look;
    QString m_sentence;
    QString m_hint;
    QTimer m_fade;
};

} // namespace quasistat::ui
