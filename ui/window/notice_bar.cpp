#include "ui/window/notice_bar.h"

#include "ui/look/type.h"

#include <QHBoxLayout>
#include <QKeyEvent>
#include <QPainter>

namespace quasistat::ui
{

NoticeBar::NoticeBar(QWidget *parent)
    : QWidget(parent), m_look(ui::palette(Scheme::light)), m_sentence(new QLabel(this)), m_row(new QHBoxLayout(this))
{
    m_row->setContentsMargins(16, 5, 16, 5);
    m_row->setSpacing(8);
    m_sentence->setFont(bodyFace());
    m_sentence->setWordWrap(true);
    m_sentence->setTextFormat(Qt::PlainText);
    m_row->addWidget(m_sentence, 1);
    hide();
}

void NoticeBar::setLook(const Palette &look)
{
    m_look = look;
    update();
}

void NoticeBar::say(const QString &sentence, std::vector<Choice> choices)
{
    for (QPushButton *button : m_buttons) {
        button->hide();
        button->setObjectName(QString());
        button->deleteLater();
    }
    m_buttons.clear();
    if (choices.empty()) choices.push_back({QStringLiteral("noticeClose"), tr("Close"), [] {}});
    m_sentence->setText(sentence);
    for (const Choice &choice : choices) {
        auto *button = new QPushButton(choice.text, this);
        button->setObjectName(choice.name);
        button->setFont(bodyFace());
        if (choice.primary) button->setProperty("role", QStringLiteral("primary"));
        connect(button, &QPushButton::clicked, this, [this, act = choice.act] {
            close();
            act();
        });
        m_row->addWidget(button);
        m_buttons.push_back(button);
        button->show();
    }
    show();
    emit changed();
    m_buttons.front()->setFocus(Qt::OtherFocusReason);
}

void NoticeBar::close()
{
    if (!isVisibleTo(parentWidget())) return;
    hide();
    emit changed();
}

QPushButton *NoticeBar::choice(const QString &name) const
{
    for (QPushButton *button : m_buttons)
        if (button->objectName() == name) return button;
    return nullptr;
}

void NoticeBar::paintEvent(QPaintEvent *)
{
    QPainter painter(this);
    painter.fillRect(rect(), m_look.ground);
    painter.fillRect(rect(), faded(m_look.accent, 0.12));
    painter.fillRect(QRect(0, 0, 4, height()), m_look.accent);
    painter.fillRect(QRect(0, height() - 1, width(), 1), m_look.rule());
}

void NoticeBar::keyPressEvent(QKeyEvent *event)
{
    if (event->key() == Qt::Key_Escape)
        close();
    else
        QWidget::keyPressEvent(event);
}

} // namespace quasistat::ui
