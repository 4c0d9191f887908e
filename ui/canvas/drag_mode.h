#pragma once

#include "core/document/edit.h"
#include "ui/canvas/mode.h"
#include "ui/session/session.h"

namespace quasistat::ui
{

/// The segment, from 0, that ends in state `number`, as a selection; the start for state 1.
[[nodiscard]] constexpr int segmentEndingIn(int number)
{
    return number == 1 ? startSelected : number - 2;
}

/// A state follows the pointer along its segment's curve; released, the drag is one undo step.
class DragMode : public Mode
{
public:
    /// `number`: the state, from 1. `grabbed`: where the handle was taken, so that it does not jump; `now`: the
    /// pointer.
    DragMode(Canvas &canvas, int number, QPointF grabbed, QPointF now);
    void enter() override;
    void leave() override;
    void pressed(const QMouseEvent &) override {}
    void moved(const QMouseEvent &event) override;
    void released(const QMouseEvent &event) override;

private:
    void follow(QPointF at);

    int m_number;
    QPointF m_offset; ///< from the pointer to the handle
    QPointF m_now;
    SnapshotPtr m_before;
    std::optional<document::Edited> m_result;
};

} // namespace quasistat::ui
