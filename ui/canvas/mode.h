#pragma once
// What the pointer and the keys do on the canvas at a time: one class for each mode; the canvas only forwards.

#include <QKeyEvent>
#include <QMouseEvent>

namespace quasistat::ui
{

class Canvas;

class Mode
{
public:
    explicit Mode(Canvas &canvas) : m_canvas(canvas) {}
    virtual ~Mode() = default;
    Mode(const Mode &) = delete;
    Mode &operator=(const Mode &) = delete;

    virtual void enter() {}
    /// The mode ends without having been finished: everything is as before it.
    virtual void leave() {}
    virtual void pressed(const QMouseEvent &event) = 0;
    virtual void moved(const QMouseEvent &event) = 0;
    virtual void released(const QMouseEvent &event) = 0;

protected:
    [[nodiscard]] Canvas &canvas() const { return m_canvas; }

private:
    Canvas &m_canvas;
};

} // namespace quasistat::ui
