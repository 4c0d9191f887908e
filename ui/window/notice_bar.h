#pragma once
// A sentence across the window with what can be done about it: never in the way of the work.

#include "ui/look/palette.h"

#include <QLabel>
#include <QPushButton>
#include <QWidget>

#include <functional>

class QHBoxLayout;

namespace quasistat::ui
{

class NoticeBar : public QWidget
{
    Q_OBJECT
public:
    struct Choice {
        QString name; ///< object name of the button
        QString text;
        std::function<void()> act; ///< after the bar has gone
        bool primary = false;
    };

    explicit NoticeBar(QWidget *parent = nullptr);

    void setLook(const Palette &look);
    /// Replaces what the bar says. Without choices it offers to close itself.
    void say(const QString &sentence, std::vector<Choice> choices = {});
    void close();
    [[nodiscard]] QString sentence() const { return m_sentence->text(); }
    [[nodiscard]] QPushButton *choice(const QString &name) const;

signals:
    void changed(); ///< shown or gone: the window makes room

protected:
    void paintEvent(QPaintEvent *event) override;
    void keyPressEvent(QKeyEvent *event) override;

private:
    Palette m_look;
    QLabel *m_sentence = nullptr;
    QHBoxLayout *m_row = nullptr;
    std::vector<QPushButton *> m_buttons;
};

} // namespace quasistat::ui
