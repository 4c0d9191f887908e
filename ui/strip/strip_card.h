#pragma once
// A card of the strip: takes the mouse and the keys, and leaves what they mean to the strip.

#include <QWidget>

#include <functional>

namespace quasistat::ui
{

class StripCard : public QWidget
{
    Q_OBJECT
public:
    /// `paint` draws the card into its rectangle, which starts at the origin.
    StripCard(std::function<void(StripCard &)> paint, QWidget *parent);

    void setDraggable(bool draggable) { m_draggable = draggable; }
    [[nodiscard]] bool isHovered() const { return m_hovered; }
    [[nodiscard]] bool isDragged() const { return m_dragging; }

signals:
    void clicked(const QPoint &at);
    void menuRequested(const QPoint &globalAt);
    void hoverChanged(bool hovered);
    void dragged(int dx); ///< from where the button went down [px]
    void dropped(int dx);
    void dragCancelled();

protected:
    void paintEvent(QPaintEvent *event) override;
    void enterEvent(QEnterEvent *event) override;
    void leaveEvent(QEvent *event) override;
    void mousePressEvent(QMouseEvent *event) override;
    void mouseMoveEvent(QMouseEvent *event) override;
    void mouseReleaseEvent(QMouseEvent *event) override;
    void contextMenuEvent(QContextMenuEvent *event) override;
    void focusInEvent(QFocusEvent *event) override;
    void focusOutEvent(QFocusEvent *event) override;
    void keyPressEvent(QKeyEvent *event) override;

private:
    void setHovered(bool hovered);

    std::function<void(StripCard &)> m_paint;
    QPoint m_pressedAt; ///< global: the card itself moves while it is dragged
    bool m_pressed = false;
    bool m_dragging = false;
    bool m_draggable = false;
    bool m_hovered = false;
};

} // namespace quasistat::ui
