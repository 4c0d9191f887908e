#pragma once
// The left of the window: the canvas, the strip under it and the fields of the selected card over both.

#include "ui/canvas/canvas.h"
#include "ui/strip/card_panel.h"
#include "ui/strip/path_strip.h"

#include <QTimer>

namespace quasistat::ui
{

class Workspace : public QWidget
{
    Q_OBJECT
public:
    explicit Workspace(Session &session, QWidget *parent = nullptr);

    void setLook(const Palette &look);
    [[nodiscard]] Canvas &canvas() { return *m_canvas; }
    [[nodiscard]] PathStrip &strip() { return *m_strip; }
    [[nodiscard]] CardPanel &panel() { return *m_panel; }
    void place(path::Kind kind);

signals:
    void hinted(const QString &hint); ///< what a click does now; empty when it is over

protected:
    void resizeEvent(QResizeEvent *event) override;

private:
    void placePanel();
    void watchMode();

    Session &m_session;
    Canvas *m_canvas = nullptr;
    PathStrip *m_strip = nullptr;
    CardPanel *m_panel = nullptr;
    QTimer m_settle; ///< waits for the mouse button: the view must not move under a handle that was just taken
    QTimer m_mode;
};

} // namespace quasistat::ui
