#pragma once
// A field of the header: a caption over a value, to click.

#include "ui/look/palette.h"
#include "ui/look/rich_text.h"

#include <QWidget>

namespace quasistat::ui
{

class HeaderField : public QWidget
{
    Q_OBJECT
public:
    explicit HeaderField(QWidget *parent = nullptr);

    void setText(const QString &caption, const RichText &value);
    void setLook(const Palette &look);
    void setBold(bool bold) { m_bold = bold; }
    /// A dot before the value, filled: saved; a ring: changed since.
    enum class Dot { none, filled, ring };
    void setDot(Dot dot);

    [[nodiscard]] QString text() const { return m_value.unstyled(); }
    [[nodiscard]] QString caption() const { return m_caption; }
    [[nodiscard]] int naturalWidth() const;

signals:
    void clicked(bool onCaption);

protected:
    void paintEvent(QPaintEvent *event) override;
    void mouseReleaseEvent(QMouseEvent *event) override;
    void keyPressEvent(QKeyEvent *event) override;
    void enterEvent(QEnterEvent *event) override;
    void leaveEvent(QEvent *event) override;
    void focusInEvent(QFocusEvent *event) override;
    void focusOutEvent(QFocusEvent *event) override;

private:
    Palette m_look;
    QString m_caption;
    RichText m_value;
    Dot m_dot = Dot::none;
    bool m_bold = false;
    bool m_hovered = false;
};

} // namespace quasistat::ui
