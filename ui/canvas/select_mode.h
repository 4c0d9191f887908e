#pragma once

#include "ui/canvas/mode.h"

namespace quasistat::ui
{

/// Points at segments, selects them, begins to drag a handle; on empty ground the view is dragged.
class SelectMode : public Mode
{
public:
    using Mode::Mode;
    void leave() override;
    void pressed(const QMouseEvent &event) override;
    void moved(const QMouseEvent &event) override;
    void released(const QMouseEvent &event) override;

private:
    void hover(QPointF at);
    [[nodiscard]] int stateToDrag(int handle) const;
    [[nodiscard]] bool isOnRing() const;

    bool m_isDown = false;
    bool m_isPanning = false;
    QPointF m_downAt;
    QPointF m_last;
    int m_handle = -1;  ///< index of the handle under the press
    int m_segment = -1; ///< segment under the press
};

} // namespace quasistat::ui
