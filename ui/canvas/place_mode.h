#pragma once

#include "core/document/edit.h"
#include "core/path/kind.h"
#include "ui/canvas/mode.h"
#include "ui/session/session.h"

namespace quasistat::ui
{

/// A new segment runs from the last state towards the pointer; a click sets it.
class PlaceMode : public Mode
{
public:
    PlaceMode(Canvas &canvas, path::Kind kind);
    void enter() override;
    void leave() override;
    void pressed(const QMouseEvent &event) override;
    void moved(const QMouseEvent &event) override;
    void released(const QMouseEvent &event) override;

private:
    void follow(QPointF at);

    path::Kind m_kind;
    SnapshotPtr m_before;
    std::optional<document::Edited> m_result;
    bool m_isDown = false;
};

} // namespace quasistat::ui
